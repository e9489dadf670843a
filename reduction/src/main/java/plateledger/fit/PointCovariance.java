package plateledger.fit;

import java.util.List;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.CholeskyDecomposition;
import org.apache.commons.math3.linear.DecompositionSolver;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * The covariance of the points' errors, shared ones included: V_xx, V_xy, V_yy by point and point. METHODS.md eq. (F-5).
 */
final class PointCovariance {
    private final double[][] xx;
    private final double[][] xy;
    private final double[][] yy;

    PointCovariance(RandomParts parts, List<SharedSource> sources) {
        int n = parts.size();
        xx = new double[n][n];
        xy = new double[n][n];
        yy = new double[n][n];
        for (SharedSource source : sources) {
            double[] dx = source.dLnRe();
            double[] dy = source.dLnY();
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    xx[i][j] += dx[i] * dx[j];
                    xy[i][j] += dx[i] * dy[j];
                    yy[i][j] += dy[i] * dy[j];
                }
            }
        }
        for (int i = 0; i < n; i++) {
            xx[i][i] += parts.varX()[i];
            xy[i][i] += parts.covXY()[i];
            yy[i][i] += parts.varY()[i];
        }
    }

    /** V(m) = m² V_xx + V_yy − m (V_xy + V_xyᵀ): the covariance of y − m x. */
    double[][] ofResiduals(double m) {
        int n = xx.length;
        double[][] v = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                v[i][j] = m * m * xx[i][j] + yy[i][j] - m * (xy[i][j] + xy[j][i]);
            }
        }
        return v;
    }

    /** x − Cov(x, r) w, the adjusted x, with Cov(x, r) = V_xy − m V_xx and w = V⁻¹ r. */
    double[] adjusted(double[] x, double m, double[] w) {
        double[] out = x.clone();
        for (int i = 0; i < x.length; i++) {
            for (int j = 0; j < x.length; j++) {
                out[i] -= (xy[i][j] - m * xx[i][j]) * w[j];
            }
        }
        return out;
    }

    /** Solver for V; scaled by the mean variance, because the library's positivity threshold is absolute. */
    static Solver solver(double[][] v) {
        double scale = 0.0;
        for (int i = 0; i < v.length; i++) {
            scale += v[i][i] / v.length;
        }
        RealMatrix matrix = new Array2DRowRealMatrix(v).scalarMultiply(1.0 / scale);
        return new Solver(new CholeskyDecomposition(matrix, 1e-9, 1e-14).getSolver(), scale);
    }

    /** V⁻¹ applied to vectors. */
    static final class Solver {
        private final DecompositionSolver solver;
        private final double scale;

        private Solver(DecompositionSolver solver, double scale) {
            this.solver = solver;
            this.scale = scale;
        }

        double[] solve(double[] b) {
            double[] out = solver.solve(new ArrayRealVector(b, false)).toArray();
            for (int i = 0; i < out.length; i++) {
                out[i] /= scale;
            }
            return out;
        }
    }
}
