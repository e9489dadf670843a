package plateledger.demo.physics;

/**
 * The discretised energy equation of the sheet along the flow, away from the side edges,
 *
 * <pre>
 *   C ∂T/∂t = q_e − q_s − q_b + kt ∂²T/∂x²
 * </pre>
 *
 * shared by the steady and the transient solution; and the span at each place about that far field. Everything but
 * radiation is linear; the part of radiation beyond a constant coefficient is a correction that the callers iterate.
 */
final class PlateEquations {
    static final double STEFAN_BOLTZMANN = 5.670374419e-8; // W/(m² K⁴), exact, SI Brochure 9th ed., cut
    private static final double SMALL_DIFFERENCE_K = 0.5;

    private final Panel panel;
    private final PlateGrid grid;
    private final FaceExchange face;
    private final SpanFin fin;
    private final double exchange;
    private final double radiationCoefficient;
    private final boolean covered;
    private final double reference;
    private final double nose;
    private final double noseShare;
    private final double tailShare;
    private final double tail;
    private final double[] ofUnity;
    private final double[] scratch;
    private final double[] isothermal;
    private final int along;
    private final int across;

    /**
     * The equations.
     *
     * @param mesh the panel in cells
     * @param convection at the face
     * @param exchangeFactor F of F ε σ (T_s⁴ − T_w⁴)
     * @param referenceK temperature from which the unknowns are counted, near the surroundings, K
     */
    PlateEquations(MeshedPanel mesh, Convection convection, double exchangeFactor, double referenceK) {
        panel = mesh.panel();
        grid = mesh.grid();
        reference = referenceK;
        along = grid.along();
        across = grid.across();
        covered = convection instanceof Convection.Cover;
        exchange = covered ? 0.0 : panel.emissivity() * exchangeFactor * STEFAN_BOLTZMANN;
        fin = new SpanFin(panel, grid, exchange);
        double typical = referenceK + 10.0;
        radiationCoefficient = 4.0 * exchange * typical * typical * typical;
        double r = panel.faceM2KPerW();
        isothermal = new double[along];
        if (convection instanceof Convection.Uniform uniform) {
            face = FaceExchange.uniform(along, uniform.coefficient() + radiationCoefficient, r);
            java.util.Arrays.fill(isothermal, uniform.coefficient());
        } else if (convection instanceof Convection.Cover cover) {
            face = FaceExchange.uniform(along, cover.coefficient(), r);
            java.util.Arrays.fill(isothermal, cover.coefficient());
        } else if (convection instanceof Convection.Layer layer) {
            face = FaceExchange.matrix(layer.matrix(), radiationCoefficient, r);
            for (int i = 0; i < along; i++) {
                for (double h : layer.matrix()[i]) {
                    isothermal[i] += h;
                }
            }
        } else {
            throw new IllegalArgumentException("unknown convection " + convection);
        }
        noseShare = spanShare(0);
        tailShare = spanShare(along - 1);
        nose = endConductance(panel.noseWPerK() * (1.0 - noseShare), grid.length(0));
        tail = endConductance(panel.tailWPerK() * (1.0 - tailShare), grid.length(along - 1));
        ofUnity = new double[along];
        scratch = new double[along];
        double[] ones = new double[along];
        java.util.Arrays.fill(ones, 1.0);
        face.apply(ones, ofUnity);
    }

    private double endConductance(double wPerK, double cell) {
        return wPerK == 0.0 ? 0.0 : 1.0 / (panel.widthM() / wPerK + 0.5 * cell / panel.sheetWPerK());
    }

    int along() {
        return along;
    }

    Panel panel() {
        return panel;
    }

    PlateGrid grid() {
        return grid;
    }

    double referenceK() {
        return reference;
    }

    /** The factorised system for a coefficient (back, storage) that all cells have, W/(m² K). */
    StreamwiseSystem factorise(double coefficient) {
        return new StreamwiseSystem(grid, panel.sheetWPerK(), nose, tail, coefficient, face);
    }

    /** Adds strip powers, surroundings and the radiation correction to the sources, W/m². */
    void addSources(double[] stripW, Surround around, double[] correction, double[] source) {
        addStrips(stripW, source);
        double above = around.adiabaticK() - reference;
        double r = panel.faceM2KPerW();
        face.apply(correction, scratch);
        for (int i = 0; i < along; i++) {
            source[i] += ofUnity[i] * above - correction[i] + r * scratch[i];
        }
        source[0] += nose * (noseK(around) - reference) / grid.length(0);
        source[along - 1] += tail * (tailK(around) - reference) / grid.length(along - 1);
    }

    /**
     * What the far field is linked to at an end. Heat leaves an end at the span's mean temperature, T − s (T − T_frame):
     * G [T − s (T − T_frame) − T_nose] = G (1 − s) [T − (T_nose − s T_frame)/(1 − s)].
     */
    private double noseK(Surround around) {
        return (around.noseK() - noseShare * around.frameK()) / (1.0 - noseShare);
    }

    private double tailK(Surround around) {
        return (around.tailK() - tailShare * around.frameK()) / (1.0 - tailShare);
    }

    /** By what share of (T − T_frame) the edges lower the span's mean below the far field, at a cell. */
    private double spanShare(int cell) {
        double coefficient = isothermal[cell] + (covered ? 0.0 : radiationCoefficient);
        Surround cold = new Surround(0.0, 0.0, 0.0, 0.0, 0.0, 0.0);
        double[] line = new double[across];
        SpanFin.FarField far = new SpanFin.FarField(coefficient, 1.0, coefficient);
        fin.solve(far, cold, line);
        double mean = 0.0;
        double span = 0.0;
        for (int j = 0; j < across; j++) {
            mean += grid.width(j) * fin.sheetK(line[j], far, cold);
            span += grid.width(j);
        }
        return 1.0 - mean / span / fin.sheetK(1.0, far, cold);
    }

    /** Adds strip powers (W) to the sources, W/m². */
    void addStrips(double[] stripW, double[] source) {
        double[] edges = panel.stripEdgesM();
        int strip = 0;
        for (int i = 0; i < along; i++) {
            while (grid.x(i) > edges[strip + 1]) {
                strip++;
            }
            source[i] += stripW[strip] / ((edges[strip + 1] - edges[strip]) * panel.widthM());
        }
    }

    /**
     * The fluxes that belong to sheet temperatures, and the radiation correction that belongs to them.
     *
     * @return largest change of the correction, W/m²
     */
    double update(double[] sheet, Surround around, double[] correction, double[] flux, double[] faceK) {
        double r = panel.faceM2KPerW();
        double change = 0.0;
        for (int i = 0; i < along; i++) {
            scratch[i] = sheet[i] + reference - around.adiabaticK() - r * correction[i];
        }
        face.apply(scratch, flux);
        for (int i = 0; i < along; i++) {
            flux[i] += correction[i];
            faceK[i] = sheet[i] + reference - r * flux[i];
            double next = covered
                    ? 0.0
                    : fin.radiation(faceK[i], around) - radiationCoefficient * (faceK[i] - around.adiabaticK());
            change = Math.max(change, Math.abs(next - correction[i]));
            correction[i] = next;
        }
        return change;
    }

    /**
     * What of a far-field temperature the centre line of a covered plate shows: T_centre = T − share × (T − T_frame).
     */
    double centreShare() {
        Surround cold = new Surround(0.0, 0.0, 0.0, 0.0, 0.0, 0.0);
        double[] line = new double[across];
        // At 1 K above surroundings that are all at 0: the covered plate is linear.
        SpanFin.FarField far = new SpanFin.FarField(isothermal[0], 1.0, isothermal[0]);
        fin.solve(far, cold, line);
        double[][] field = new double[across][along];
        for (int j = 0; j < across; j++) {
            java.util.Arrays.fill(field[j], fin.sheetK(line[j], far, cold));
        }
        return 1.0 - grid.at(field, grid.x(along / 2), 0.0) / fin.sheetK(1.0, far, cold);
    }

    /** The state that belongs to converged far fields. {@code stored} is what storage takes per area, W/m². */
    PlateState state(double[] stripW, Surround around, double[] sheet, double[] flux, double[] faceK, double[] stored) {
        double[][] sheetField = new double[across][along];
        double[][] faceField = new double[across][along];
        double[][] fluxField = new double[across][along];
        double[][] radiationField = new double[across][along];
        double[] line = new double[across];
        double through = 0.0;
        double radiated = 0.0;
        double back = 0.0;
        double storage = 0.0;
        double edgeHeat = 0.0;
        for (int i = 0; i < along; i++) {
            SpanFin.FarField far = farField(i, flux[i], faceK[i], around);
            fin.solve(far, around, line);
            for (int j = 0; j < across; j++) {
                faceField[j][i] = line[j];
                radiationField[j][i] = fin.radiation(line[j], around);
                fluxField[j][i] = fin.flux(line[j], far, around);
                sheetField[j][i] = fin.sheetK(line[j], far, around);
                double a = 2.0 * grid.width(j) * grid.length(i);
                through += a * fluxField[j][i];
                radiated += a * radiationField[j][i];
                back += a * panel.backWPerM2K() * (sheetField[j][i] - around.plenumK());
                storage += a * stored[i];
            }
            edgeHeat += 2.0 * grid.length(i) * fin.edgeConductance() * (sheetField[across - 1][i] - around.frameK());
        }
        double electrical = 0.0;
        for (double watts : stripW) {
            electrical += watts;
        }
        HeatBooks books = new HeatBooks(
                electrical,
                covered ? 0.0 : through - radiated,
                radiated,
                covered ? through : 0.0,
                back,
                edgeHeat,
                panel.widthM() * nose * (sheet[0] + reference - noseK(around)),
                panel.widthM() * tail * (sheet[along - 1] + reference - tailK(around)),
                storage);
        return new PlateState(
                panel, grid, sheetField, faceField, fluxField, radiationField, around, books, covered, stripW.clone());
    }

    /**
     * The far field with its local coefficient, flux over difference. Where hardly anything is heated that would be noise
     * over noise, and the isothermal plate's coefficient stands in.
     */
    private SpanFin.FarField farField(int i, double flux, double faceK, Surround around) {
        double difference = faceK - around.adiabaticK();
        double convection = flux - fin.radiation(faceK, around);
        double local = convection / difference;
        boolean clear = Math.abs(difference) > SMALL_DIFFERENCE_K && local > 0.0;
        return new SpanFin.FarField(clear ? local : isothermal[i], faceK, convection);
    }
}
