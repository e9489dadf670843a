package plateledger.uncertainty;

import plateledger.quantity.Stated;

/**
 * One uncertain scalar input.
 *
 * @param name unique name, e.g. {@code voltmeter.gain}, {@code R07/T05.mean}, {@code plate.product.emissivity}
 * @param value best estimate, SI
 * @param u standard uncertainty, SI, not negative
 * @param distribution shape
 * @param dof degrees of freedom, positive, may be infinite
 * @param scope within which one draw is shared
 */
public record Input(String name, double value, double u, Distribution distribution, double dof, Scope scope) {
    /** Refuses what is not finite or negative. */
    public Input {
        if (!Double.isFinite(value) || !(u >= 0.0) || Double.isInfinite(u) || !(dof > 0.0)) {
            throw new IllegalArgumentException(
                    "input %s: value %s, u %s, dof %s out of range".formatted(name, value, u, dof));
        }
    }

    /** The input for a stated quantity. */
    public static Input of(String name, Stated stated, Scope scope) {
        Distribution shape = switch (stated.meaning()) {
            case EXACT -> Distribution.EXACT;
            case LIMITS -> Distribution.RECTANGULAR;
            case STANDARD, EXPANDED -> Double.isInfinite(stated.dof()) ? Distribution.NORMAL : Distribution.T;
        };
        return new Input(name, stated.value(), stated.standardUncertainty(), shape, stated.dof(), scope);
    }
}
