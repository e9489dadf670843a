package plateledger.uncertainty;

import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.distribution.TDistribution;

/** Coverage factors of two-sided intervals. JCGM 100:2008, G.3 and G.4. METHODS.md eq. (U-6). */
public final class Coverage {
    /** 97.5 % quantile of the normal distribution. */
    public static final double NORMAL_95 = 1.959963984540054;
    /** From here on the expansion in 1/ν is good to better than 1e-8. */
    private static final double EXPANSION_FROM = 1000.0;

    private Coverage() {}

    /**
     * The factor of a 95 % interval: the 97.5 % quantile of Student's t at real degrees of freedom (not rounded down).
     *
     * @param dof degrees of freedom, positive, may be infinite; NaN gives NaN
     */
    public static double factor(double dof) {
        return quantile(dof, 0.95, NORMAL_95);
    }

    /**
     * The factor of an interval of another coverage.
     *
     * @param dof degrees of freedom, positive, may be infinite; NaN gives NaN
     * @param coverage probability that the interval is meant to hold, between 0 and 1
     */
    public static double factor(double dof, double coverage) {
        if (!(coverage > 0.0 && coverage < 1.0)) {
            throw new IllegalArgumentException("coverage must lie between 0 and 1, found " + coverage);
        }
        double z = new NormalDistribution().inverseCumulativeProbability(0.5 * (1.0 + coverage));
        return quantile(dof, coverage, z);
    }

    private static double quantile(double dof, double coverage, double z) {
        if (Double.isNaN(dof)) {
            return Double.NaN;
        }
        if (!(dof > 0.0)) {
            throw new IllegalArgumentException("degrees of freedom must be positive, found " + dof);
        }
        if (Double.isInfinite(dof)) {
            return z;
        }
        if (dof >= EXPANSION_FROM) {
            return expansion(z, dof);
        }
        return new TDistribution(dof).inverseCumulativeProbability(0.5 * (1.0 + coverage));
    }

    /** Abramowitz and Stegun, Handbook of Mathematical Functions (1964), 26.7.5, first three terms. */
    private static double expansion(double z, double dof) {
        double z3 = z * z * z;
        double z5 = z3 * z * z;
        return z + (z3 + z) / (4.0 * dof) + (5.0 * z5 + 16.0 * z3 + 3.0 * z) / (96.0 * dof * dof);
    }
}
