package plateledger.theory;

/**
 * How an unheated starting length raises h above that of a plate heated from the leading edge, classical kernel,
 * METHODS.md (T-12) to (T-14). ξ is the start of heating, x (or L) the place looked at; a, b as in {@link LayerLaw}.
 * Laminar at Pr 0.7 the two local factors are 1.0 to 2.7 % low just behind the step (0.1 to 0.3 % at Pr 7), computed
 * against the marched energy equation; {@link FlatPlate} offers the corrected laminar forms.
 */
public final class UnheatedLength {
    private UnheatedLength() {}

    /**
     * h of a step of temperature at ξ divided by h of the uniform temperature: [1 − (ξ/x)^a]^(−b).
     *
     * @param share ξ/x, 0 ≤ share &lt; 1; NaN outside
     */
    public static double temperatureFactor(LayerLaw law, double share) {
        return share >= 0.0 && share < 1.0 ? Math.pow(bracket(law, share), -law.b()) : Double.NaN;
    }

    /**
     * h of a uniform flux from ξ on divided by h of the uniform temperature from the leading edge:
     * Γ(b) Γ(1 − b)/(a ∫_{ξ/x}^1 [1 − s^a]^(−(1−b)) ds). The common shortcut, the factor for temperature times the ratio of
     * the two h without unheated length, is 6 to 13 % high and not offered.
     *
     * @param share ξ/x, 0 ≤ share &lt; 1; NaN outside
     */
    public static double fluxFactor(LayerLaw law, double share) {
        return share >= 0.0 && share < 1.0
                ? 1.0 / (law.classicalConstant() * StepIntegral.between(law, share, 1.0, 1.0))
                : Double.NaN;
    }

    /**
     * Mean h over the heated part ξ … L of a step of temperature divided by the mean h over 0 … L of the uniform
     * temperature: [1 − (ξ/L)^a]^(1−b) L/(L − ξ) (Ameel 1997 and texts, there with p = 2 or 8, a = (p+1)/(p+2), 1 − b =
     * p/(p+1)).
     *
     * @param share ξ/L, 0 ≤ share &lt; 1; NaN outside
     */
    public static double averageTemperatureFactor(LayerLaw law, double share) {
        return share >= 0.0 && share < 1.0 ? Math.pow(bracket(law, share), 1.0 - law.b()) / (1.0 - share) : Double.NaN;
    }

    private static double bracket(LayerLaw law, double share) {
        return -Math.expm1(law.a() * Math.log(share));
    }
}
