package plateledger.demo.physics;

/**
 * Temperatures across half the span at one place along the flow: a fin of finite cells between the centre line and the
 * side edge, about the far field that the place would have without edges,
 *
 * <pre>
 *   kt ∂²T/∂z² = loss(T) − loss(T_far),   loss = q_s + U_b T,   −kt ∂T/∂n = G (T − T_frame) at the edge
 * </pre>
 *
 * with radiation kept to the fourth power. Sources and storage are those of the far field.
 */
final class SpanFin {
    private static final int MOST_ROUNDS = 30;
    private static final double TIGHT_K = 1e-9;

    private final PlateGrid grid;
    private final double back;
    private final double resistance;
    private final double exchange;
    private final double[] between;
    private final double edge;
    private final double[] lower;
    private final double[] diagonal;
    private final double[] upper;
    private final double[] right;
    private final double[] change;

    /**
     * A fin.
     *
     * @param panel the panel
     * @param grid its cells
     * @param exchange F ε σ, W/(m² K⁴)
     */
    SpanFin(Panel panel, PlateGrid grid, double exchange) {
        this.grid = grid;
        this.exchange = exchange;
        back = panel.backWPerM2K();
        resistance = panel.faceM2KPerW();
        int n = grid.across();
        between = new double[n];
        for (int j = 0; j < n - 1; j++) {
            between[j] = panel.sheetWPerK() / (grid.z(j + 1) - grid.z(j));
        }
        edge = panel.edgeWPerMK() == 0.0
                ? 0.0
                : 1.0 / (1.0 / panel.edgeWPerMK() + 0.5 * grid.width(n - 1) / panel.sheetWPerK());
        lower = new double[n];
        diagonal = new double[n];
        upper = new double[n];
        right = new double[n];
        change = new double[n];
    }

    /** Conductance from the last cell's centre to the frame per length, W/(m K). */
    double edgeConductance() {
        return edge;
    }

    /**
     * The far field of one place along the flow.
     *
     * @param coefficient by which convection (or the cover's flux) changes with the face temperature, W/(m² K)
     * @param faceK face temperature without edges, K
     * @param convection there, W/m²
     */
    record FarField(double coefficient, double faceK, double convection) {}

    /**
     * Solves for the face temperatures of the cells.
     *
     * @param far what the place would be without edges
     * @param around surroundings
     * @param face face temperatures, K; overwritten
     */
    void solve(FarField far, Surround around, double[] face) {
        int n = face.length;
        double h = far.coefficient();
        java.util.Arrays.fill(face, far.faceK());
        double farLoss = loss(far.faceK(), far, around);
        for (int round = 0; round < MOST_ROUNDS; round++) {
            double worst = 0.0;
            for (int j = 0; j < n; j++) {
                double slope = h + 4.0 * exchange * face[j] * face[j] * face[j];
                double local = slope / (1.0 + resistance * slope) + back;
                double inward = j == 0 ? 0.0 : between[j - 1];
                double outward = j == n - 1 ? edge : between[j];
                double t = sheetK(face[j], far, around);
                double flow = (j == 0 ? 0.0 : inward * (t - sheetK(face[j - 1], far, around)))
                        + outward * (t - (j == n - 1 ? around.frameK() : sheetK(face[j + 1], far, around)));
                lower[j] = -inward;
                upper[j] = j == n - 1 ? 0.0 : -outward;
                diagonal[j] = inward + outward + grid.width(j) * local;
                right[j] = -flow - grid.width(j) * (loss(face[j], far, around) - farLoss);
            }
            Tridiagonal.solve(lower, diagonal, upper, right, change, n);
            for (int j = 0; j < n; j++) {
                double slope = h + 4.0 * exchange * face[j] * face[j] * face[j];
                face[j] += change[j] / (1.0 + resistance * slope);
                worst = Math.max(worst, Math.abs(change[j]));
            }
            if (worst < TIGHT_K) {
                return;
            }
        }
        throw new IllegalStateException("the span did not converge in " + MOST_ROUNDS + " rounds");
    }

    /** Heat through the face at a face temperature, W/m². */
    double flux(double faceK, FarField far, Surround around) {
        return far.convection() + far.coefficient() * (faceK - far.faceK()) + radiation(faceK, around);
    }

    /** Radiation at a face temperature, W/m². */
    double radiation(double faceK, Surround around) {
        return exchange * (fourth(faceK) - fourth(around.wallK()));
    }

    /** Sheet temperature behind a face temperature, K. */
    double sheetK(double faceK, FarField far, Surround around) {
        return faceK + resistance * flux(faceK, far, around);
    }

    private double loss(double faceK, FarField far, Surround around) {
        return flux(faceK, far, around) + back * sheetK(faceK, far, around);
    }

    private static double fourth(double t) {
        double square = t * t;
        return square * square;
    }
}
