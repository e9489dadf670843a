package plateledger.ledger;

import plateledger.ledger.RunLayout.In;
import plateledger.rig.Plate;

/**
 * The choice of the smoothing parameter at the best estimate by the discrepancy principle: the strongest smoothing at
 * which χ² of (reading − model) on the centre line does not exceed the number of stations; METHODS.md eq. (P-4).
 *
 * @param solver solver with the smoothing chosen
 * @param state solved state, the start of later evaluations
 * @param effectiveParameters effective number of parameters
 * @param chiSquare χ² reached over all junctions used
 * @param used number of junctions used
 */
record Smoothing(PlateSolver solver, PlateState state, double effectiveParameters, double chiSquare, int used) {
    private static final int PASSES = 60;
    private static final double STRONGEST = 1e7;
    private static final double WEAKEST = 1e-1;
    /**
     * Share of the edges' effect on a junction off the centre line that is not trusted: the edge conductance is seldom
     * known better, and near a corner of the sheet the span profile is not exact (common practice).
     */
    private static final double EDGE_DOUBT = 0.3;

    private static final double STEP = Math.pow(10.0, 0.25);

    static Smoothing choose(
            RunSetting setting, RunLayout layout, PlateGrid grid, double[] best, double adiabaticWallK) {
        Plate plate = setting.plate();
        int m = layout.junctions();
        double[] z = new double[m];
        double[] weight = new double[m];
        int used = 0;
        for (int p = 0; p < m; p++) {
            z[p] = plate.thermocouples().get(p).zM();
            double sigma = setting.sigmaK()[p];
            weight[p] = Double.isFinite(sigma) ? 1.0 / (sigma * sigma) : 0.0;
            used += Double.isFinite(sigma) ? 1 : 0;
        }
        double[] shape = HeatTransferShape.of(setting, grid, best, layout, adiabaticWallK);
        double[] centreOnly = weight.clone();
        int stations = 0;
        for (int p = 0; p < m; p++) {
            centreOnly[p] = plate.thermocouples().get(p).onCentreLine() ? weight[p] : 0.0;
            stations += centreOnly[p] > 0.0 ? 1 : 0;
        }
        PlateState state = firstState(layout, grid, plate, best, setting);
        PlateSolver first = new PlateSolver(grid, layout, shape, z, centreOnly, STRONGEST);
        first.solve(best, adiabaticWallK, state, PASSES);
        for (int p = 0; p < m; p++) {
            if (weight[p] > 0.0 && !plate.thermocouples().get(p).onCentreLine()) {
                double doubt = EDGE_DOUBT * first.edgeDropK(best, adiabaticWallK, state, p);
                weight[p] = 1.0 / (1.0 / weight[p] + doubt * doubt);
            }
        }
        PlateSolver solver = new PlateSolver(grid, layout, shape, z, weight, STRONGEST);
        for (double lambda = STRONGEST; lambda >= WEAKEST; lambda /= STEP) {
            solver = solver.withLambda(lambda);
            solver.solve(best, adiabaticWallK, state, PASSES);
            // the edges' part of a junction off the centre line is too doubtful to judge smoothing by
            if (chiSquare(layout, centreOnly, best, state) <= stations) {
                break;
            }
        }
        return new Smoothing(
                solver,
                state,
                solver.effectiveParameters(best, adiabaticWallK, state),
                chiSquare(layout, weight, best, state),
                used);
    }

    private static double chiSquare(RunLayout layout, double[] weight, double[] best, PlateState state) {
        double chi = 0.0;
        for (int p = 0; p < weight.length; p++) {
            if (weight[p] > 0.0) {
                double miss = best[layout.reading(p)] - state.junctionK[p];
                chi += weight[p] * miss * miss;
            }
        }
        return chi;
    }

    /** Sheet at the readings, interpolated along the centre line; ρ = 1. */
    private static PlateState firstState(
            RunLayout layout, PlateGrid grid, Plate plate, double[] best, RunSetting setting) {
        PlateState state = new PlateState(grid.cells, grid.knots.length, layout.junctions());
        java.util.Arrays.fill(state.rho, 1.0);
        double sum = 0.0;
        int count = 0;
        for (int p = 0; p < layout.junctions(); p++) {
            if (Double.isFinite(setting.sigmaK()[p])
                    && plate.thermocouples().get(p).onCentreLine()) {
                sum += best[layout.reading(p)];
                count++;
            }
        }
        double mean = count > 0 ? sum / count : best[layout.at(In.AIR_TEMPERATURE)] + 1.0;
        java.util.Arrays.fill(state.sheetK, mean);
        java.util.Arrays.fill(state.surfaceK, mean);
        return state;
    }
}
