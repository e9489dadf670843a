package plateledger.fit;

import java.util.List;

/**
 * Random variances and covariances of (x, y) = (ln Re, ln(Nu/Pr^n)) of each point.
 *
 * @param varX variance of x
 * @param varY variance of y
 * @param covXY their covariance
 */
record RandomParts(double[] varX, double[] varY, double[] covXY) {
    static RandomParts of(List<FitPoint> points) {
        int n = points.size();
        double[] varX = new double[n];
        double[] varY = new double[n];
        double[] covXY = new double[n];
        for (int i = 0; i < n; i++) {
            FitPoint p = points.get(i);
            varX[i] = p.uLnReRandom() * p.uLnReRandom();
            varY[i] = p.uLnYRandom() * p.uLnYRandom();
            covXY[i] = p.correlationRandom() * p.uLnReRandom() * p.uLnYRandom();
        }
        return new RandomParts(varX, varY, covXY);
    }

    int size() {
        return varX.length;
    }

    /** Variance of y_i − b x_i: v_y + b² v_x − 2 b v_xy. */
    double effective(int i, double b) {
        return varY[i] + b * b * varX[i] - 2.0 * b * covXY[i];
    }
}
