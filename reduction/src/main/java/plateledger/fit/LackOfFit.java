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
 * @param fProbability its probability if shared sources acted alike on all points; NaN without repeats
 * @param fProbabilityShared its probability when what the stated shared sources add is allowed for; NaN without repeats
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
        double fProbabilityShared,
        int[] fDof,
        double repeatScatter,
        double bend,
        double uBend) {

    /**
     * A sum of squares rᵀ Q r under the stated covariance V of r: c χ²_ν with the same mean tr(QV) and variance
     * 2 tr(QVQV). Satterthwaite, Biometrics 2 (1946) 110.
     */
    private record Quadratic(double mean, double dof) {
        static Quadratic of(double[][] qv) {
            double mean = 0.0;
            double square = 0.0;
            for (int i = 0; i < qv.length; i++) {
                mean += qv[i][i];
                for (int j = 0; j < qv.length; j++) {
                    square += qv[i][j] * qv[j][i];
                }
            }
            return new Quadratic(mean, mean * mean / square);
        }

        double probabilityAbove(double value) {
            return Gamma.regularizedGammaQ(0.5 * dof, 0.5 * dof * value / mean);
        }
    }

    /** Scatter within sets of repeats: classic F with its probability, that with shared sources, plain scatter. */
    private record Repeats(
            double f, double probability, double probabilityShared, int lack, int within, double scatter) {}

    /** Tests the residuals of a line. */
    static LackOfFit of(List<FitPoint> points, double[] x, double[] residuals, BothAxesLine line, double[][] v) {
        int n = x.length;
        double[][] p = projector(line);
        double[][] pv = product(p, v);
        Repeats repeats = repeats(points, residuals, line, pv, v);
        double[] bend = n < 4 ? new double[] {Double.NaN, Double.NaN} : bend(x, residuals, line.centre(), p, pv);
        return new LackOfFit(
                line.chiSquare(),
                n - 2,
                Gamma.regularizedGammaQ(0.5 * (n - 2), 0.5 * line.chiSquare()),
                Quadratic.of(pv).probabilityAbove(line.chiSquare()),
                repeats.f(),
                repeats.probability(),
                repeats.probabilityShared(),
                new int[] {repeats.lack(), repeats.within()},
                repeats.scatter(),
                bend[0],
                bend[1]);
    }

    private static Repeats repeats(
            List<FitPoint> points, double[] residuals, BothAxesLine line, double[][] pv, double[][] v) {
        int n = residuals.length;
        Map<String, double[]> sets = new LinkedHashMap<>(); // Σw, Σwr, number, Σr
        for (int i = 0; i < n; i++) {
            double[] sums = sets.computeIfAbsent(setOf(points.get(i), i), key -> new double[4]);
            sums[0] += line.weights()[i];
            sums[1] += line.weights()[i] * residuals[i];
            sums[2] += 1.0;
            sums[3] += residuals[i];
        }
        double pure = 0.0;
        double plain = 0.0;
        double[][] q = new double[n][n]; // pure error as a quadratic form
        for (int i = 0; i < n; i++) {
            String set = setOf(points.get(i), i);
            double[] sums = sets.getOrDefault(set, new double[4]);
            double weighted = residuals[i] - sums[1] / sums[0];
            double unweighted = residuals[i] - sums[3] / sums[2];
            pure += line.weights()[i] * weighted * weighted;
            plain += unweighted * unweighted;
            for (int j = 0; j < n; j++) {
                if (setOf(points.get(j), j).equals(set)) {
                    q[i][j] = line.weights()[i] * ((i == j ? 1.0 : 0.0) - line.weights()[j] / sums[0]);
                }
            }
        }
        int lack = sets.size() - 2;
        int within = n - sets.size();
        double scatter = within > 0 ? Math.sqrt(plain / within) : Double.NaN;
        if (within < 1 || lack < 1 || !(pure > 0.0)) {
            return new Repeats(Double.NaN, Double.NaN, Double.NaN, lack, within, scatter);
        }
        double lackSquares = Math.max(0.0, line.chiSquare() - pure);
        double f = lackSquares / lack / (pure / within);
        double[][] pureV = product(q, v);
        double[][] lackV = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                lackV[i][j] = pv[i][j] - pureV[i][j];
            }
        }
        Quadratic expectedLack = Quadratic.of(lackV);
        Quadratic expectedPure = Quadratic.of(pureV);
        double fShared = lackSquares / expectedLack.mean() / (pure / expectedPure.mean());
        return new Repeats(
                f,
                fTail(f, lack, within),
                fTail(fShared, expectedLack.dof(), expectedPure.dof()),
                lack,
                within,
                scatter);
    }

    /** Probability that F with these degrees of freedom is larger. */
    private static double fTail(double f, double numerator, double denominator) {
        return Beta.regularizedBeta(denominator / (denominator + numerator * f), 0.5 * denominator, 0.5 * numerator);
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
