package plateledger.fit;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.math3.special.Beta;
import org.apache.commons.math3.special.Gamma;

/**
 * Does the form describe the points? METHODS.md eq. (F-4).
 *
 * @param chiSquare weighted sum of squares, random parts only
 * @param dof n − 2
 * @param probability of a larger χ² if shared sources acted alike on all points
 * @param probabilityShared of a larger χ² when what the stated shared sources add to it is allowed for
 * @param f F of lack of fit against the scatter of repeats; NaN without repeats
 * @param fProbability its probability; NaN without repeats
 * @param fDof degrees of freedom of lack of fit and of repeats
 * @param repeatScatter standard deviation of ln(Nu/Pr^n) within repeats, slope removed; NaN without repeats
 * @param bend coefficient of (ln Re − x_g)² left in the residuals; NaN below four points
 * @param uBend its standard uncertainty, shared sources included; NaN below four points
 */
record LackOfFit(
        double chiSquare,
        int dof,
        double probability,
        double probabilityShared,
        double f,
        double fProbability,
        int[] fDof,
        double repeatScatter,
        double bend,
        double uBend) {

    /** Tests the residuals of a line. */
    static LackOfFit of(List<FitPoint> points, double[] x, double[] residuals, BothAxesLine line, double[][] v) {
        int n = x.length;
        double[][] p = projector(line);
        double[][] pv = product(p, v);
        double mean = 0.0;
        double square = 0.0;
        for (int i = 0; i < n; i++) {
            mean += pv[i][i];
            for (int j = 0; j < n; j++) {
                square += pv[i][j] * pv[j][i];
            }
        }
        // S is a weighted sum of χ²₁; mean and variance 2 tr(PVPV) are met by c χ²_ν (Satterthwaite, Biometrics 2
        // (1946) 110)
        double scale = square / mean;
        double shared = Gamma.regularizedGammaQ(0.5 * mean * mean / square, 0.5 * line.chiSquare() / scale);
        double[] repeats = repeats(points, residuals, line);
        double[] bend = n < 4 ? new double[] {Double.NaN, Double.NaN} : bend(x, residuals, line.centre(), p, pv);
        return new LackOfFit(
                line.chiSquare(),
                n - 2,
                Gamma.regularizedGammaQ(0.5 * (n - 2), 0.5 * line.chiSquare()),
                shared,
                repeats[0],
                repeats[1],
                new int[] {(int) repeats[2], (int) repeats[3]},
                repeats[4],
                bend[0],
                bend[1]);
    }

    private static double[] repeats(List<FitPoint> points, double[] residuals, BothAxesLine line) {
        Map<String, double[]> sets = new LinkedHashMap<>(); // Σw, Σwr, number, Σr
        for (int i = 0; i < residuals.length; i++) {
            double[] sums = sets.computeIfAbsent(setOf(points.get(i), i), key -> new double[4]);
            sums[0] += line.weights()[i];
            sums[1] += line.weights()[i] * residuals[i];
            sums[2] += 1.0;
            sums[3] += residuals[i];
        }
        double pure = 0.0;
        double plain = 0.0;
        for (int i = 0; i < residuals.length; i++) {
            double[] sums = sets.getOrDefault(setOf(points.get(i), i), new double[4]);
            double weighted = residuals[i] - sums[1] / sums[0];
            double unweighted = residuals[i] - sums[3] / sums[2];
            pure += line.weights()[i] * weighted * weighted;
            plain += unweighted * unweighted;
        }
        int lack = sets.size() - 2;
        int within = residuals.length - sets.size();
        double scatter = within > 0 ? Math.sqrt(plain / within) : Double.NaN;
        if (within < 1 || lack < 1 || !(pure > 0.0)) {
            return new double[] {Double.NaN, Double.NaN, lack, within, scatter};
        }
        double f = (line.chiSquare() - pure) / lack / (pure / within);
        double probability =
                Beta.regularizedBeta(within / (within + lack * Math.max(0.0, f)), 0.5 * within, 0.5 * lack);
        return new double[] {f, probability, lack, within, scatter};
    }

    /** Points without a set name are repeats of nothing. */
    private static String setOf(FitPoint point, int position) {
        return point.set().isEmpty() ? "\u0000" + position : point.set();
    }

    private static double[] bend(double[] x, double[] residuals, double xg, double[][] p, double[][] pv) {
        int n = x.length;
        double[] q = new double[n];
        for (int i = 0; i < n; i++) {
            q[i] = (x[i] - xg) * (x[i] - xg);
        }
        double[] pq = new double[n];
        double[] vpq = new double[n]; // V P q = (P V)ᵀ q
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                pq[i] += p[i][j] * q[j];
                vpq[i] += pv[j][i] * q[j];
            }
        }
        double qpq = FullCovarianceLine.dot(q, pq);
        if (!(qpq > 1e-9 * p[0][0] * FullCovarianceLine.dot(q, q))) {
            return new double[] {Double.NaN, Double.NaN}; // two distinct Re only: no bend can be seen
        }
        return new double[] {
            FullCovarianceLine.dot(pq, residuals) / qpq, Math.sqrt(FullCovarianceLine.dot(pq, vpq)) / qpq
        };
    }

    /** P = W − W X (Xᵀ W X)⁻¹ Xᵀ W at the adjusted points. */
    private static double[][] projector(BothAxesLine line) {
        double[] w = line.weights();
        double[][] rows = line.rows();
        int n = w.length;
        double[][] p = new double[n][n];
        for (int i = 0; i < n; i++) {
            double arm = line.adjustedX()[i] - line.centre();
            for (int j = 0; j < n; j++) {
                p[i][j] = (i == j ? w[i] : 0.0) - w[i] * (rows[0][j] + arm * rows[1][j]);
            }
        }
        return p;
    }

    private static double[][] product(double[][] a, double[][] b) {
        int n = a.length;
        double[][] c = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int k = 0; k < n; k++) {
                double aik = a[i][k];
                for (int j = 0; j < n; j++) {
                    c[i][j] += aik * b[k][j];
                }
            }
        }
        return c;
    }
}
