package plateledger.quantity;

/**
 * A value with its standard uncertainty and degrees of freedom.
 *
 * @param value the value, SI; NaN where it could not be evaluated
 * @param u standard uncertainty, same unit, not negative (NaN allowed where the value is NaN)
 * @param dof effective degrees of freedom; infinite where none are stated
 */
public record Estimate(double value, double u, double dof) {
    /** Refuses a negative uncertainty. */
    public Estimate {
        if (u < 0.0) {
            throw new IllegalArgumentException("standard uncertainty must not be negative, found " + u);
        }
    }

    /** An estimate with infinite degrees of freedom. */
    public static Estimate of(double value, double u) {
        return new Estimate(value, u, Double.POSITIVE_INFINITY);
    }

    /** True if the value is a finite number. */
    public boolean isKnown() {
        return Double.isFinite(value);
    }
}
