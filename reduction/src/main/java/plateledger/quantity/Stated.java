package plateledger.quantity;

/**
 * A quantity as someone stated it: an SI value with the half-width written beside it and what that half-width means.
 *
 * @param value the value, SI
 * @param halfWidth the number after ± (or the standard uncertainty), SI, 0 for an exact value
 * @param meaning what the half-width is
 * @param coverage the coverage factor k of an {@link Meaning#EXPANDED} statement; 1 otherwise
 * @param dof degrees of freedom behind the statement; infinite where none are stated
 */
public record Stated(double value, double halfWidth, Meaning meaning, double coverage, double dof) {

    /** What the half-width of a statement means. */
    public enum Meaning {
        /** No uncertainty: a definition or a choice. */
        EXACT,
        /** A standard uncertainty. */
        STANDARD,
        /** An expanded uncertainty with a coverage factor. */
        EXPANDED,
        /** Limits within which the value surely lies, nothing more known: rectangular, JCGM 100:2008, 4.3.7. */
        LIMITS
    }

    /** Refuses a value that is not finite, a negative half-width, a coverage factor or dof that is not positive. */
    public Stated {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("stated value must be finite, found " + value);
        }
        if (!(halfWidth >= 0.0) || Double.isInfinite(halfWidth)) {
            throw new IllegalArgumentException("half-width must be finite and not negative, found " + halfWidth);
        }
        if (!(coverage > 0.0) || !(dof > 0.0)) {
            throw new IllegalArgumentException("coverage and dof must be positive, found " + coverage + ", " + dof);
        }
    }

    /** An exact value. */
    public static Stated exact(double value) {
        return new Stated(value, 0.0, Meaning.EXACT, 1.0, Double.POSITIVE_INFINITY);
    }

    /** A value with its standard uncertainty. */
    public static Stated standard(double value, double u) {
        return new Stated(value, u, Meaning.STANDARD, 1.0, Double.POSITIVE_INFINITY);
    }

    /** A value with an expanded uncertainty {@code expanded} at coverage factor {@code k}. */
    public static Stated expanded(double value, double expanded, double k) {
        return new Stated(value, expanded, Meaning.EXPANDED, k, Double.POSITIVE_INFINITY);
    }

    /** A value between limits {@code value ± halfWidth}, rectangular. */
    public static Stated limits(double value, double halfWidth) {
        return new Stated(value, halfWidth, Meaning.LIMITS, 1.0, Double.POSITIVE_INFINITY);
    }

    /** The standard uncertainty: half-width, half-width ÷ k, or half-width ÷ √3 (JCGM 100:2008, 4.3.3 and 4.3.7). */
    public double standardUncertainty() {
        return switch (meaning) {
            case EXACT -> 0.0;
            case STANDARD -> halfWidth;
            case EXPANDED -> halfWidth / coverage;
            case LIMITS -> halfWidth / Math.sqrt(3.0);
        };
    }

    /** This statement as an estimate. */
    public Estimate estimate() {
        return new Estimate(value, standardUncertainty(), dof);
    }
}
