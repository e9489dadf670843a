package plateledger.ledger;

/** Three-point interpolation on the cell centres. */
final class Lagrange {
    private Lagrange() {}

    /** Weights of {@code at[c], at[c+1], at[c+2]} for the value at x. */
    static double[] weights(double[] at, int c, double x) {
        double x0 = at[c];
        double x1 = at[c + 1];
        double x2 = at[c + 2];
        return new double[] {
            (x - x1) * (x - x2) / ((x0 - x1) * (x0 - x2)),
            (x - x0) * (x - x2) / ((x1 - x0) * (x1 - x2)),
            (x - x0) * (x - x1) / ((x2 - x0) * (x2 - x1))
        };
    }

    /** Interpolated value. */
    static double value(double[] at, double[] values, int c, double x) {
        double[] w = weights(at, c, x);
        return w[0] * values[c] + w[1] * values[c + 1] + w[2] * values[c + 2];
    }
}
