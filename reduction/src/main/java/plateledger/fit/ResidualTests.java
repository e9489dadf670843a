package plateledger.fit;

import java.util.Arrays;
import java.util.Comparator;

/**
 * Tests of the residuals of a fit. METHODS.md eq. (F-10) and (F-11).
 *
 * @param alongRe runs test in order of Re
 * @param alongPoints runs test in the order of the points (that of the campaign)
 * @param largestStudentised largest |externally studentised residual|; NaN below four points
 * @param at position of that point
 */
public record ResidualTests(Runs alongRe, Runs alongPoints, double largestStudentised, int at) {

    /**
     * Runs of residuals of equal sign. Wald and Wolfowitz, Ann. Math. Stat. 11 (1940) 147.
     *
     * @param runs their number
     * @param expected its expectation μ = 2 n₁ n₂/n + 1 if signs are random
     * @param z (runs − μ)/√[(μ − 1)(μ − 2)/(n − 1)]; NaN if all residuals have one sign
     */
    public record Runs(int runs, double expected, double z) {
        private static Runs of(double[] residuals) {
            int n = residuals.length;
            int positive = 0;
            int runs = 1;
            for (int k = 0; k < n; k++) {
                if (residuals[k] > 0.0) {
                    positive++;
                }
                if (k > 0 && residuals[k] > 0.0 != residuals[k - 1] > 0.0) {
                    runs++;
                }
            }
            double mu = 2.0 * positive * (n - positive) / n + 1.0;
            double variance = (mu - 1.0) * (mu - 2.0) / (n - 1.0);
            return new Runs(runs, mu, variance > 0.0 ? (runs - mu) / Math.sqrt(variance) : Double.NaN);
        }
    }

    /** The tests on the two-step fit, each residual weighted with the random parts of its point. */
    public static ResidualTests of(FitResult fit) {
        RandomParts parts = RandomParts.of(fit.problem().points());
        int n = parts.size();
        double[] x = new double[n];
        double[] w = new double[n];
        for (int i = 0; i < n; i++) {
            x[i] = Math.log(fit.problem().points().get(i).re());
            w[i] = 1.0 / parts.effective(i, fit.twoStep().m());
        }
        return of(x, fit.residuals(), w);
    }

    /**
     * The tests on the residuals of a weighted straight line.
     *
     * <pre>
     *   h_i = w_i [1/Σw + (x_i − x̄)²/Σw(x − x̄)²],  t_i = e_i √w_i/(s √(1 − h_i)),  s² = Σ w e²/(n − 2)
     *   external t = t_i √((n − 3)/(n − 2 − t_i²))
     * </pre>
     */
    private static ResidualTests of(double[] x, double[] e, double[] w) {
        int n = x.length;
        Integer[] order = new Integer[n];
        Arrays.setAll(order, i -> i);
        Arrays.sort(order, Comparator.comparingDouble(i -> x[i]));
        double[] alongRe = Arrays.stream(order).mapToDouble(i -> e[i]).toArray();

        double sumW = Arrays.stream(w).sum();
        double meanX = 0.0;
        double rss = 0.0;
        for (int i = 0; i < n; i++) {
            meanX += w[i] * x[i] / sumW;
            rss += w[i] * e[i] * e[i];
        }
        double sxx = 0.0;
        for (int i = 0; i < n; i++) {
            sxx += w[i] * (x[i] - meanX) * (x[i] - meanX);
        }
        double s2 = rss / (n - 2.0);
        double largest = Double.NaN;
        int at = 0;
        for (int i = 0; i < n && n > 3; i++) {
            double h = w[i] * (1.0 / sumW + (x[i] - meanX) * (x[i] - meanX) / sxx);
            double t2 = w[i] * e[i] * e[i] / (s2 * (1.0 - h));
            double external = Math.sqrt(t2 * (n - 3.0) / (n - 2.0 - t2));
            if (!(external <= largest)) {
                largest = external;
                at = i;
            }
        }
        return new ResidualTests(Runs.of(alongRe), Runs.of(e), largest, at);
    }
}
