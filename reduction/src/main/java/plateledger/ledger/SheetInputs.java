package plateledger.ledger;

import plateledger.ledger.RunLayout.In;

/** The scalars of one evaluation that the sheet's balance needs, taken out of the input vector once. */
final class SheetInputs {
    final double startM;
    final double stretch;
    final double widthM;
    /** Conductivity times thickness, W/K. */
    final double sheetWPerK;
    /** Junction plane to coat face, m² K/W. */
    final double faceM2KPerW;

    final double backWPerM2K;
    /** What the insulation still takes up, W/(m² K). */
    final double soakWPerM2K;
    /** Back and soak together, W/(m² K). */
    final double behindWPerM2K;

    final double edgeWPerMK;
    final double noseWPerK;
    final double tailWPerK;
    final double exchange;
    final double emissivity;
    final double wallK;
    final double plenumK;
    final double frameK;
    final double noseK;
    final double tailK;
    /** Flux into storage, W/m². */
    final double store;
    /** Cell widths, m. */
    final double[] dx;
    /** Heater flux of each cell, W/m². */
    final double[] qe;

    private final PlateGrid grid;

    SheetInputs(double[] in, RunLayout layout, PlateGrid grid) {
        this.grid = grid;
        startM = in[layout.at(In.HEATED_START)];
        stretch = (in[layout.at(In.HEATED_END)] - startM) / (grid.endM - grid.startM);
        widthM = in[layout.at(In.WIDTH)];
        double conductivity = in[layout.at(In.SHEET_CONDUCTIVITY)];
        double thickness = in[layout.at(In.SHEET_THICKNESS)];
        sheetWPerK = conductivity * thickness;
        faceM2KPerW = in[layout.at(In.COAT_THICKNESS)] / in[layout.at(In.COAT_CONDUCTIVITY)]
                + in[layout.at(In.JUNCTION_DEPTH)] / conductivity;
        backWPerM2K = in[layout.at(In.BACK_CONDUCTANCE)];
        soakWPerM2K = LossTerm.Storage.soakWPerM2K(backWPerM2K, in[layout.at(In.SOAK)]);
        behindWPerM2K = backWPerM2K + soakWPerM2K;
        edgeWPerMK = in[layout.at(In.EDGE_CONDUCTANCE)];
        noseWPerK = in[layout.at(In.NOSE_CONDUCTANCE)];
        tailWPerK = in[layout.at(In.TAIL_CONDUCTANCE)];
        exchange = in[layout.at(In.EXCHANGE_FACTOR)];
        emissivity = in[layout.at(In.EMISSIVITY)];
        wallK = in[layout.at(In.WALL_TEMPERATURE)];
        plenumK = in[layout.at(In.PLENUM_TEMPERATURE)];
        frameK = in[layout.at(In.FRAME_TEMPERATURE)];
        noseK = in[layout.at(In.NOSE_TEMPERATURE)];
        tailK = in[layout.at(In.TAIL_TEMPERATURE)];
        store = in[layout.at(In.DRIFT)]
                * LossTerm.Storage.capacityJPerM2K(
                        in[layout.at(In.SHEET_HEAT_CAPACITY)],
                        thickness,
                        in[layout.at(In.FOAM_HEAT_CAPACITY)],
                        in[layout.at(In.FOAM_THICKNESS)]);
        dx = new double[grid.cells];
        qe = new double[grid.cells];
        double[] stripArea = new double[grid.strips];
        for (int i = 0; i < grid.cells; i++) {
            dx[i] = stretch * (grid.faces[i + 1] - grid.faces[i]);
            stripArea[grid.strip[i]] += dx[i] * widthM;
        }
        for (int i = 0; i < grid.cells; i++) {
            int j = grid.strip[i];
            qe[i] = (in[layout.power(j)] - in[layout.lead(j)]) / stripArea[j];
        }
    }

    /** A place on the plate as the frozen grid names it. */
    double onGrid(double x) {
        return grid.startM + (x - startM) / stretch;
    }

    /** A place of the frozen grid on the plate. */
    double onPlate(double gridX) {
        return startM + stretch * (gridX - grid.startM);
    }

    /** Net flux that leaves a coat face at T_s by convection and radiation, W/m². */
    double faceFlux(double h, double surfaceK, double adiabaticWallK) {
        return h * (surfaceK - adiabaticWallK) + LossTerm.Radiation.flux(exchange, emissivity, surfaceK, wallK);
    }

    /** ∂(face flux)/∂T_s, W/(m² K). */
    double faceSlope(double h, double surfaceK) {
        return h + LossTerm.Radiation.slope(exchange, emissivity, surfaceK);
    }
}
