package plateledger.steady;

import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.distribution.TDistribution;

/** Quantiles of Student's t, fast enough to be asked for each channel of each candidate window. */
final class StudentT {
    private static final int NEWTON_STEPS = 3;

    private StudentT() {}

    /** The quantile that is exceeded in absolute value with probability 0.05. */
    static double twoSided95(double dof) {
        return twoSided(0.05, dof);
    }

    /**
     * The quantile exceeded in absolute value with probability {@code p}. Hill, Commun. ACM 13 (1970) 619 (Algorithm 396,
     * from memory), made exact by Newton steps on the distribution function (one alone left 2e-8 of probability
     * at a few degrees of freedom); checked against the latter's own inverse.
     *
     * @param p 0 to 1, exclusive
     * @param dof degrees of freedom, at least 1
     */
    static double twoSided(double p, double dof) {
        if (dof > 1e7) {
            return new NormalDistribution(null, 0.0, 1.0).inverseCumulativeProbability(1.0 - p / 2.0);
        }
        TDistribution t = new TDistribution(null, dof);
        double x = dof < 3.0 ? t.inverseCumulativeProbability(1.0 - p / 2.0) : hill(p, dof);
        for (int step = 0; step < NEWTON_STEPS; step++) {
            // on the lower tail, where the probability is not a difference from one
            x += (t.cumulativeProbability(-x) - p / 2.0) / t.density(x);
        }
        return x;
    }

    private static double hill(double p, double n) {
        double a = 1.0 / (n - 0.5);
        double b = 48.0 / (a * a);
        double c = ((20700.0 * a / b - 98.0) * a - 16.0) * a + 96.36;
        double d = ((94.5 / (b + c) - 3.0) / b + 1.0) * Math.sqrt(a * Math.PI / 2.0) * n;
        double y = Math.pow(d * p, 2.0 / n);
        if (y > 0.05 + a) {
            double x = -new NormalDistribution(null, 0.0, 1.0).inverseCumulativeProbability(p / 2.0);
            y = x * x;
            if (n < 5.0) {
                c += 0.3 * (n - 4.5) * (x + 0.6);
            }
            c = (((0.05 * d * x - 5.0) * x - 7.0) * x - 2.0) * x + b + c;
            y = (((((0.4 * y + 6.3) * y + 36.0) * y + 94.5) / c - y - 3.0) / b + 1.0) * x;
            y = Math.expm1(a * y * y);
        } else {
            y = ((1.0 / (((n + 6.0) / (n * y) - 0.089 * d - 0.822) * (n + 2.0) * 3.0) + 0.5 / (n + 4.0)) * y - 1.0)
                            * (n + 1.0)
                            / (n + 2.0)
                    + 1.0 / y;
        }
        return Math.sqrt(n * y);
    }
}
