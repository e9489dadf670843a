package plateledger.fit;

import java.util.Arrays;
import java.util.Optional;
import org.apache.commons.math3.linear.NonPositiveDefiniteMatrixException;

/**
 * Generalised least squares with the full covariance V(m). METHODS.md eq. (F-6).
 *
 * @param constants a, m and their absolute covariance
 * @param chiSquare rᵀ V⁻¹ r
 * @param whitened V⁻¹ r
 * @param rows (Xᵀ V⁻¹ X)⁻¹ Xᵀ V⁻¹: what errors of y − m x do to a (row 0) and m (row 1), to first order
 */
record FullCovarianceLine(Constants constants, double chiSquare, double[] whitened, double[][] rows) {
    private static final int MOST_ROUNDS = 200;
    private static final double CLOSE_ENOUGH = 1e-13;

    /**
     * Minimises rᵀ V(m)⁻¹ r, r = y − a − m (x − x_g), over a and m, V differentiated with m.
     *
     * <pre>
     *   w = V⁻¹ r,   x̂ = x − (V_xy − m V_xx) w,   X = [1, x̂ − x_g]
     *   step (δa, δm) = (Xᵀ V⁻¹ X)⁻¹ Xᵀ w;   covariance (Xᵀ V⁻¹ X)⁻¹
     * </pre>
     *
     * Xᵀ w is exactly −½ of the gradient, so the point where the steps end is the minimum.
     *
     * @return empty if the steps do not end or V is not positive definite
     */
    static Optional<FullCovarianceLine> fit(double[] x, double[] y, PointCovariance covariance, BothAxesLine start) {
        double xg = start.centre();
        double a = start.a();
        double m = start.b();
        int n = x.length;
        double[] ones = new double[n];
        Arrays.fill(ones, 1.0);
        try {
            for (int round = 0; round < MOST_ROUNDS; round++) {
                PointCovariance.Solver solver = PointCovariance.solver(covariance.ofResiduals(m));
                double[] r = new double[n];
                for (int i = 0; i < n; i++) {
                    r[i] = y[i] - a - m * (x[i] - xg);
                }
                double[] w = solver.solve(r);
                double[] arm = covariance.adjusted(x, m, w);
                for (int i = 0; i < n; i++) {
                    arm[i] -= xg;
                }
                double[] v1 = solver.solve(ones);
                double[] vx = solver.solve(arm);
                double s11 = dot(ones, v1);
                double s1x = dot(ones, vx);
                double sxx = dot(arm, vx);
                double det = s11 * sxx - s1x * s1x;
                double g1 = dot(ones, w);
                double gx = dot(arm, w);
                double da = (sxx * g1 - s1x * gx) / det;
                double dm = (s11 * gx - s1x * g1) / det;
                if (!Double.isFinite(da) || !Double.isFinite(dm)) {
                    return Optional.empty();
                }
                if (Math.abs(dm) <= CLOSE_ENOUGH * Math.max(1.0, Math.abs(m))
                        && Math.abs(da) <= CLOSE_ENOUGH * Math.max(1.0, Math.abs(a))) {
                    Constants constants = new Constants(xg, a, m, sxx / det, s11 / det, -s1x / det);
                    double[][] rows = new double[2][n];
                    for (int i = 0; i < n; i++) {
                        rows[0][i] = (sxx * v1[i] - s1x * vx[i]) / det;
                        rows[1][i] = (s11 * vx[i] - s1x * v1[i]) / det;
                    }
                    return Optional.of(new FullCovarianceLine(constants, dot(r, w), w, rows));
                }
                a += da;
                m += dm;
            }
        } catch (NonPositiveDefiniteMatrixException notPositive) {
            return Optional.empty();
        }
        return Optional.empty();
    }

    static double dot(double[] p, double[] q) {
        double sum = 0.0;
        for (int i = 0; i < p.length; i++) {
            sum += p[i] * q[i];
        }
        return sum;
    }
}
