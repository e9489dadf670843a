package plateledger.fit;

/**
 * How far the two-step constants lie from the generalised ones, and how far they may by chance: both are linear in the
 * same errors to first order, so that the variance of their difference is D V Dᵀ with D the difference of their rows.
 * METHODS.md eq. (F-7).
 *
 * @param da difference in a
 * @param dm difference in m
 * @param uDa standard uncertainty of the difference in a
 * @param uDm standard uncertainty of the difference in m
 */
record Difference(double da, double dm, double uDa, double uDm) {
    Difference(BothAxesLine line, FullCovarianceLine full, double[][] v) {
        this(
                line.a() - full.constants().a(),
                line.b() - full.constants().m(),
                u(line.rows()[0], full.rows()[0], v),
                u(line.rows()[1], full.rows()[1], v));
    }

    private static double u(double[] p, double[] q, double[][] v) {
        double sum = 0.0;
        for (int i = 0; i < p.length; i++) {
            for (int j = 0; j < p.length; j++) {
                sum += (p[i] - q[i]) * v[i][j] * (p[j] - q[j]);
            }
        }
        return Math.sqrt(Math.max(0.0, sum));
    }
}
