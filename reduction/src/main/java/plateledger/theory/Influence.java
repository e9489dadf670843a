package plateledger.theory;

/**
 * The superposition for one geometry, worked out once: the flux of cell c raises the point i by
 * {@code out[i] = X_i/(k Re_X^p) Σ_c q_c Σ_j g_j(Pr) M_j[i][c]}, where M depends on edges, points, layer and virtual
 * origin only. For loops in which k, U/ν, Pr and the flux change and the geometry does not. Shares no state between
 * calls, so threads may share one instance.
 */
public final class Influence {
    private static final int TERMS = 3;

    private final LayerLaw law;
    private final double[] reach;
    private final double[][][] integrals; // term, point, cell

    private Influence(LayerLaw law, double[] reach, double[][][] integrals) {
        this.law = law;
        this.reach = reach;
        this.integrals = integrals;
    }

    /**
     * Works out the geometry; arguments as in {@link Superposition#wallDifference}.
     *
     * @throws IllegalArgumentException if a cell edge lies upstream of the virtual origin
     */
    public static Influence of(double[] cellEdges, double[] x, double virtualOrigin, LayerLaw law) {
        if (cellEdges.length < 2 || !(cellEdges[0] >= virtualOrigin)) {
            throw new IllegalArgumentException("needs at least one cell, none upstream of the virtual origin at "
                    + virtualOrigin + " m; found " + cellEdges.length + " edges");
        }
        int cells = cellEdges.length - 1;
        int terms = law == LayerLaw.LAMINAR ? TERMS : 1;
        double[] reach = new double[x.length];
        double[][][] integrals = new double[terms][x.length][cells];
        for (int i = 0; i < x.length; i++) {
            reach[i] = x[i] - virtualOrigin;
            for (int j = 0; j < terms; j++) {
                double before = value(law, j, cellEdges[0], x[i], virtualOrigin);
                for (int c = 0; c < cells; c++) {
                    double after = value(law, j, cellEdges[c + 1], x[i], virtualOrigin);
                    integrals[j][i][c] = after - before;
                    before = after;
                }
            }
        }
        return new Influence(law, reach, integrals);
    }

    private static double value(LayerLaw law, int j, double edge, double x, double virtualOrigin) {
        double reach = x - virtualOrigin;
        if (!(reach > 0.0)) {
            return Double.NaN;
        }
        return StepIntegral.table(law)
                .sum(
                        (edge - virtualOrigin) / reach,
                        (x - edge) / reach,
                        j == 0 ? 1.0 : 0.0,
                        j == 1 ? 1.0 : 0.0,
                        j == 2 ? 1.0 : 0.0);
    }

    /** Number of points. */
    public int points() {
        return reach.length;
    }

    /** Number of cells. */
    public int cells() {
        return integrals[0].length == 0 ? 0 : integrals[0][0].length;
    }

    /**
     * T_s − T_aw at the points, K.
     *
     * @param flux flux of each cell, W/m²
     * @param reynoldsPerMetre U/ν, 1/m
     * @param prandtl Pr
     * @param conductivity k of the fluid, W/(m K)
     * @param out one result per point; NaN where Pr is out of range or the point is not downstream of the origin
     */
    public void wallDifference(
            double[] flux, double reynoldsPerMetre, double prandtl, double conductivity, double[] out) {
        for (int i = 0; i < reach.length; i++) {
            out[i] = 0.0;
        }
        for (int j = 0; j < integrals.length; j++) {
            double weight = law.fluxKernel(j, prandtl);
            for (int i = 0; i < reach.length; i++) {
                double[] row = integrals[j][i];
                double part = 0.0;
                for (int c = 0; c < row.length; c++) {
                    part += row[c] * flux[c];
                }
                out[i] += weight * part;
            }
        }
        for (int i = 0; i < reach.length; i++) {
            out[i] *= scale(i, reynoldsPerMetre, conductivity);
        }
    }

    /**
     * The influence coefficients themselves: K at point i per W/m² on cell c.
     *
     * @param out points × cells, overwritten
     */
    public void matrix(double reynoldsPerMetre, double prandtl, double conductivity, double[][] out) {
        double g0 = law.fluxKernel(0, prandtl);
        double g1 = law.fluxKernel(1, prandtl);
        double g2 = law.fluxKernel(2, prandtl);
        boolean corrected = integrals.length == TERMS;
        for (int i = 0; i < reach.length; i++) {
            double scale = scale(i, reynoldsPerMetre, conductivity);
            for (int c = 0; c < cells(); c++) {
                double sum = g0 * integrals[0][i][c];
                if (corrected) {
                    sum += g1 * integrals[1][i][c] + g2 * integrals[2][i][c];
                }
                out[i][c] = scale * sum;
            }
        }
    }

    private double scale(int i, double reynoldsPerMetre, double conductivity) {
        return reach[i] / (conductivity * Superposition.power(reynoldsPerMetre * reach[i], law));
    }
}
