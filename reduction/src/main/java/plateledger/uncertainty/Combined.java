package plateledger.uncertainty;

import plateledger.quantity.Estimate;

/**
 * A value with its combined standard uncertainty. METHODS.md eq. (U-2) and (U-5).
 *
 * @param value best estimate
 * @param u combined standard uncertainty, same unit; NaN where an effect could not be evaluated
 * @param dof effective degrees of freedom; infinite where no source has finite ones
 */
public record Combined(double value, double u, double dof) {
    /**
     * Combines the effects of independent sources.
     *
     * <pre>
     *   u²   = Σ g_i²                     g_i = c_i u_i, effect of one standard uncertainty of source i
     *   ν    = u⁴ / Σ (g_i⁴ / ν_i)        Welch–Satterthwaite, JCGM 100:2008, G.4.1
     * </pre>
     *
     * One input is one source whatever number of places it enters, so no two terms are correlated, as the formula needs.
     *
     * @param value best estimate
     * @param effects g_i
     * @param dof ν_i, same length
     */
    public static Combined of(double value, double[] effects, double[] dof) {
        if (effects.length != dof.length) {
            throw new IllegalArgumentException(effects.length + " effects but " + dof.length + " degrees of freedom");
        }
        double variance = 0.0;
        for (double effect : effects) {
            variance += effect * effect;
        }
        if (Double.isNaN(value)) {
            return new Combined(Double.NaN, Double.NaN, Double.POSITIVE_INFINITY);
        }
        double u = Math.sqrt(variance);
        if (!(variance > 0.0)) {
            return new Combined(value, u, Double.POSITIVE_INFINITY);
        }
        double sum = 0.0;
        for (int i = 0; i < effects.length; i++) {
            double share = effects[i] * effects[i] / variance;
            sum += share * share / dof[i];
        }
        return new Combined(value, u, sum > 0.0 ? 1.0 / sum : Double.POSITIVE_INFINITY);
    }

    /** Coverage factor of the 95 % interval. */
    public double coverageFactor() {
        return Coverage.factor(dof);
    }

    /** Half-width of the 95 % interval. */
    public double expanded() {
        return coverageFactor() * u;
    }

    /** The same as an estimate. */
    public Estimate estimate() {
        return new Estimate(value, u, dof);
    }
}
