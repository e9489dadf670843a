package plateledger.fit;

import java.util.Optional;

/**
 * A straight line through points with errors in both axes that are correlated within a point and independent between
 * points. METHODS.md eq. (F-2) and (F-3).
 *
 * @param centre x at which a is the ordinate
 * @param a ordinate at the centre
 * @param b slope
 * @param varA variance of a, absolute
 * @param varB variance of b, absolute
 * @param covAB covariance of a and b
 * @param chiSquare Σ W (y − a − b (x − centre))²
 * @param adjustedX x of the adjusted points
 * @param weights W at the solution
 */
record BothAxesLine(
        double centre,
        double a,
        double b,
        double varA,
        double varB,
        double covAB,
        double chiSquare,
        double[] adjustedX,
        double[] weights) {
    private static final int MOST_ROUNDS = 500;
    private static final double CLOSE_ENOUGH = 1e-14;

    /**
     * York, Evensen, Martínez and Delgado, Am. J. Phys. 72 (2004) 367, written with variances in place of weights so that
     * a coordinate may be free of error. The weight's dependence on the slope is differentiated with it (that is what β
     * is); with frozen weights and equal errors the slope would be that of ordinary least squares.
     *
     * <pre>
     *   W_i = 1/(v_y + b² v_x − 2 b v_xy)         U = x − x̄_W,  V = y − ȳ_W
     *   β_i = W_i [U v_y + b V v_x − (b U + V) v_xy]
     *   b   = Σ W β V / Σ W β U                   adjusted x_i = x̄_W + β_i
     * </pre>
     *
     * @return empty if the slope does not settle or a point's effective variance is not positive
     */
    static Optional<BothAxesLine> fit(double[] x, double[] y, RandomParts parts, double centre) {
        int n = x.length;
        double[] w = new double[n];
        double[] beta = new double[n];
        double b = ordinarySlope(x, y);
        for (int round = 0; round < MOST_ROUNDS; round++) {
            double meanX = 0.0;
            double meanY = 0.0;
            double sumW = 0.0;
            for (int i = 0; i < n; i++) {
                w[i] = 1.0 / parts.effective(i, b);
                if (!(w[i] > 0.0) || Double.isInfinite(w[i])) {
                    return Optional.empty();
                }
                sumW += w[i];
                meanX += w[i] * x[i];
                meanY += w[i] * y[i];
            }
            meanX /= sumW;
            meanY /= sumW;
            double up = 0.0;
            double down = 0.0;
            for (int i = 0; i < n; i++) {
                double u = x[i] - meanX;
                double v = y[i] - meanY;
                beta[i] = w[i] * (u * parts.varY()[i] + b * v * parts.varX()[i] - (b * u + v) * parts.covXY()[i]);
                up += w[i] * beta[i] * v;
                down += w[i] * beta[i] * u;
            }
            double next = up / down;
            if (!Double.isFinite(next)) {
                return Optional.empty();
            }
            boolean settled = Math.abs(next - b) <= CLOSE_ENOUGH * Math.max(1.0, Math.abs(b));
            b = next;
            if (settled) {
                return Optional.of(solution(x, y, w, beta, b, centre, meanX, meanY, sumW));
            }
        }
        return Optional.empty();
    }

    private static BothAxesLine solution(
            double[] x,
            double[] y,
            double[] w,
            double[] beta,
            double b,
            double centre,
            double meanX,
            double meanY,
            double sumW) {
        int n = x.length;
        double[] adjusted = new double[n];
        double meanAdjusted = 0.0;
        for (int i = 0; i < n; i++) {
            adjusted[i] = meanX + beta[i];
            meanAdjusted += w[i] * adjusted[i] / sumW;
        }
        double a = meanY + b * (centre - meanX);
        double spread = 0.0;
        double chiSquare = 0.0;
        for (int i = 0; i < n; i++) {
            double d = adjusted[i] - meanAdjusted;
            spread += w[i] * d * d;
            double r = y[i] - a - b * (x[i] - centre);
            chiSquare += w[i] * r * r;
        }
        double varB = 1.0 / spread;
        double arm = centre - meanAdjusted;
        return new BothAxesLine(centre, a, b, 1.0 / sumW + arm * arm * varB, varB, arm * varB, chiSquare, adjusted, w);
    }

    /** (Xᵀ W X)⁻¹ Xᵀ W at the adjusted points: what errors of y − b x do to a (row 0) and b (row 1), to first order. */
    double[][] rows() {
        int n = weights.length;
        double[][] rows = new double[2][n];
        for (int i = 0; i < n; i++) {
            double arm = adjustedX[i] - centre;
            rows[0][i] = weights[i] * (varA + covAB * arm);
            rows[1][i] = weights[i] * (covAB + varB * arm);
        }
        return rows;
    }

    private static double ordinarySlope(double[] x, double[] y) {
        double meanX = 0.0;
        double meanY = 0.0;
        for (int i = 0; i < x.length; i++) {
            meanX += x[i] / x.length;
            meanY += y[i] / x.length;
        }
        double sxx = 0.0;
        double sxy = 0.0;
        for (int i = 0; i < x.length; i++) {
            sxx += (x[i] - meanX) * (x[i] - meanX);
            sxy += (x[i] - meanX) * (y[i] - meanY);
        }
        return sxy / sxx;
    }
}
