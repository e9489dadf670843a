package plateledger.demo.physics;

/**
 * The discretised energy equation of the sheet
 *
 * <pre>
 *   C ∂T/∂t = q_e − q_s − q_b + kt (∂²T/∂x² + ∂²T/∂z²)
 * </pre>
 *
 * with its edges, shared by the steady and the transient solution. Everything but radiation is linear; the part of
 * radiation beyond a constant coefficient is a correction that the callers iterate.
 */
final class PlateEquations {
    static final double STEFAN_BOLTZMANN = 5.670374419e-8; // W/(m² K⁴), exact, SI Brochure 9th ed., cut

    private final Panel panel;
    private final PlateGrid grid;
    private final SpanModes modes;
    private final FaceExchange face;
    private final double exchange;
    private final double radiationCoefficient;
    private final boolean covered;
    private final double reference;
    private final double nose;
    private final double tail;
    private final double[] ofUnity;
    private final double[] scratch;
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
        modes = mesh.modes();
        covered = convection instanceof Convection.Cover;
        exchange = covered ? 0.0 : panel.emissivity() * exchangeFactor * STEFAN_BOLTZMANN;
        double typical = referenceK + 10.0;
        radiationCoefficient = 4.0 * exchange * typical * typical * typical;
        double r = panel.faceM2KPerW();
        if (convection instanceof Convection.Uniform uniform) {
            face = FaceExchange.uniform(along, uniform.coefficient() + radiationCoefficient, r);
        } else if (convection instanceof Convection.Cover cover) {
            face = FaceExchange.uniform(along, cover.coefficient(), r);
        } else if (convection instanceof Convection.Layer layer) {
            face = FaceExchange.matrix(layer.matrix(), radiationCoefficient, r);
        } else {
            throw new IllegalArgumentException("unknown convection " + convection);
        }
        nose = endConductance(panel.noseWPerK(), grid.length(0));
        tail = endConductance(panel.tailWPerK(), grid.length(along - 1));
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

    int across() {
        return across;
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

    double[][] cells() {
        return new double[across][along];
    }

    /** One factorised system per span mode for a coefficient (back, storage) that all cells have, W/(m² K). */
    StreamwiseSystem[] factorise(double coefficient) {
        StreamwiseSystem[] systems = new StreamwiseSystem[modes.count()];
        for (int m = 0; m < systems.length; m++) {
            systems[m] = new StreamwiseSystem(
                    grid, panel.sheetWPerK(), nose, tail, coefficient + modes.conductance(m), face);
        }
        return systems;
    }

    /** Solves for the sheet temperature above the reference; {@code source} in W/m², both [j][i]. */
    void solve(StreamwiseSystem[] systems, double[][] source, double[][] modal, double[][] out) {
        modes.toModes(source, modal);
        for (int m = 0; m < systems.length; m++) {
            systems[m].solve(modal[m]);
        }
        modes.toCells(modal, out);
    }

    /** Adds strip powers, surroundings and the radiation correction to the sources, W/m². */
    void addSources(double[] stripW, Surround around, double[][] correction, double[][] source) {
        double[] heat = stripFlux(stripW);
        double above = around.adiabaticK() - reference;
        double edge = modes.edgeConductance() * (around.frameK() - reference) / grid.width(across - 1);
        double noseSource = nose * (around.noseK() - reference) / grid.length(0);
        double tailSource = tail * (around.tailK() - reference) / grid.length(along - 1);
        double r = panel.faceM2KPerW();
        for (int j = 0; j < across; j++) {
            face.apply(correction[j], scratch);
            for (int i = 0; i < along; i++) {
                source[j][i] += heat[i] + ofUnity[i] * above - correction[j][i] + r * scratch[i];
            }
            source[j][0] += noseSource;
            source[j][along - 1] += tailSource;
        }
        for (int i = 0; i < along; i++) {
            source[across - 1][i] += edge;
        }
    }

    /**
     * The fluxes that belong to sheet temperatures, and the radiation correction that belongs to them.
     *
     * @return largest change of the correction, W/m²
     */
    double update(double[][] sheet, Surround around, double[][] correction, double[][] flux, double[][] faceK) {
        double r = panel.faceM2KPerW();
        double wall4 = fourth(around.wallK());
        double change = 0.0;
        double[] theta = new double[along];
        for (int j = 0; j < across; j++) {
            for (int i = 0; i < along; i++) {
                theta[i] = sheet[j][i] + reference - around.adiabaticK() - r * correction[j][i];
            }
            face.apply(theta, flux[j]);
            for (int i = 0; i < along; i++) {
                flux[j][i] += correction[j][i];
                double surface = sheet[j][i] + reference - r * flux[j][i];
                faceK[j][i] = surface;
                double next = covered
                        ? 0.0
                        : exchange * (fourth(surface) - wall4) - radiationCoefficient * (surface - around.adiabaticK());
                change = Math.max(change, Math.abs(next - correction[j][i]));
                correction[j][i] = next;
            }
        }
        return change;
    }

    /** The state that belongs to converged fields. {@code stored} is what storage takes per area, W/m². */
    PlateState state(
            double[] stripW, Surround around, double[][] sheet, double[][] flux, double[][] faceK, double[][] stored) {
        double wall4 = fourth(around.wallK());
        double[][] sheetK = cells();
        double[][] radiation = cells();
        double through = 0.0;
        double radiated = 0.0;
        double back = 0.0;
        double storage = 0.0;
        double noseHeat = 0.0;
        double tailHeat = 0.0;
        double edgeHeat = 0.0;
        for (int j = 0; j < across; j++) {
            double w = grid.width(j);
            for (int i = 0; i < along; i++) {
                double a = 2.0 * w * grid.length(i);
                sheetK[j][i] = sheet[j][i] + reference;
                radiation[j][i] = exchange * (fourth(faceK[j][i]) - wall4);
                through += a * flux[j][i];
                radiated += a * radiation[j][i];
                back += a * panel.backWPerM2K() * (sheetK[j][i] - around.plenumK());
                storage += a * stored[j][i];
            }
            noseHeat += 2.0 * w * nose * (sheetK[j][0] - around.noseK());
            tailHeat += 2.0 * w * tail * (sheetK[j][along - 1] - around.tailK());
        }
        for (int i = 0; i < along; i++) {
            edgeHeat += 2.0 * grid.length(i) * modes.edgeConductance() * (sheetK[across - 1][i] - around.frameK());
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
                noseHeat,
                tailHeat,
                storage);
        return new PlateState(panel, grid, sheetK, copy(faceK), copy(flux), radiation, around, books, covered);
    }

    private double[] stripFlux(double[] stripW) {
        double[] edges = panel.stripEdgesM();
        double[] heat = new double[along];
        int strip = 0;
        for (int i = 0; i < along; i++) {
            while (grid.x(i) > edges[strip + 1]) {
                strip++;
            }
            heat[i] = stripW[strip] / ((edges[strip + 1] - edges[strip]) * panel.widthM());
        }
        return heat;
    }

    private static double[][] copy(double[][] field) {
        double[][] out = new double[field.length][];
        for (int j = 0; j < field.length; j++) {
            out[j] = field[j].clone();
        }
        return out;
    }

    private static double fourth(double t) {
        double square = t * t;
        return square * square;
    }
}
