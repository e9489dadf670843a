package plateledger.theory;

/**
 * The tool's best forms for a smooth flat plate without pressure gradient: Nu = h x/k with h = q/(T_s − T_aw), momentum
 * thickness, virtual origin and adiabatic wall temperature. METHODS.md (T-2) to (T-7), (T-11). Textbook power laws for
 * comparison are in {@link Correlation}. NaN outside the range of Pr or for Re not above 0; the range of Re is not judged
 * here, because a layer may be tripped or kept laminar.
 */
public final class FlatPlate {
    /** θ √Re_x/x of Blasius's layer, 2 f''(0) (30-digit series 0.664114672430392598). */
    private static final double LAMINAR_MOMENTUM = 2.0 * SimilaritySolution.WALL_SHEAR;

    /** θ Re_x^0.2/x of a turbulent layer (1/5-power friction law 0.0592 Re^−0.2, integrated; 0.036 is also in use). */
    static final double TURBULENT_MOMENTUM = 0.037;

    private FlatPlate() {}

    /** How h is averaged where the wall temperature varies. */
    public enum Mean {
        /** Flux over mean temperature difference, ∫q dx/∫(T_s − T_aw) dx. */
        FLUX_OVER_DIFFERENCE,
        /** Mean of the local h, (1/L) ∫h dx. */
        OF_LOCAL_H
    }

    /** Local Nu_x of a uniform wall temperature: exact laminar, 0.0287 Re^0.8 Pr^0.6 turbulent. */
    public static double uniformTemperature(LayerLaw law, double reynolds, double prandtl) {
        return law.uniformTemperature(prandtl) * Superposition.power(reynolds, law);
    }

    /**
     * Local Nu_x of a uniform flux: exact laminar; turbulent 1.0386 times that of the uniform temperature, the ratio
     * Γ(1/9) Γ(8/9)/B(10/9, 1/9) that the kernel implies (published constants: 1.0405 and 1.0453).
     */
    public static double uniformFlux(LayerLaw law, double reynolds, double prandtl) {
        double coefficient = law == LayerLaw.LAMINAR
                ? LaminarTable.uniformFlux(prandtl)
                : law.uniformTemperature(prandtl) * UnheatedLength.fluxFactor(law, 0.0);
        return coefficient * Superposition.power(reynolds, law);
    }

    /** Average Nu_L of a uniform wall temperature, local value at L divided by the exponent of Re. */
    public static double averageUniformTemperature(LayerLaw law, double reynolds, double prandtl) {
        return uniformTemperature(law, reynolds, prandtl) / law.reynoldsExponent();
    }

    /**
     * Average Nu_L of a uniform flux. The two means differ by 4/3 laminar and 1.042 turbulent, so the mean must be named
     * wherever the number is shown.
     */
    public static double averageUniformFlux(LayerLaw law, double reynolds, double prandtl, Mean mean) {
        double p = law.reynoldsExponent(); // h ∝ x^(p−1), difference ∝ x^(1−p)
        double factor = mean == Mean.OF_LOCAL_H ? 1.0 / p : 2.0 - p;
        return factor * uniformFlux(law, reynolds, prandtl);
    }

    /**
     * Local Nu_x behind a step of wall temperature at ξ, with the corrected kernel in the laminar case (within 0.15 % of the
     * marched energy equation at Pr 0.7 and 7).
     *
     * @param share ξ/x, 0 ≤ share &lt; 1; NaN outside
     */
    public static double stepOfTemperature(LayerLaw law, double reynolds, double prandtl, double share) {
        if (law == LayerLaw.TURBULENT) {
            return uniformTemperature(law, reynolds, prandtl) * UnheatedLength.temperatureFactor(law, share);
        }
        if (!(share >= 0.0 && share < 1.0)) {
            return Double.NaN;
        }
        double u = -Math.expm1(law.a() * Math.log(share));
        double series = LaminarTable.temperatureKernel(0, prandtl)
                + u * (LaminarTable.temperatureKernel(1, prandtl) + u * LaminarTable.temperatureKernel(2, prandtl));
        return series / Math.cbrt(u) * Superposition.power(reynolds, law);
    }

    /**
     * Local Nu_x of a uniform flux from ξ on, with the corrected kernel in the laminar case (within 0.05 %).
     *
     * @param share ξ/x, 0 ≤ share &lt; 1; NaN outside
     */
    public static double stepOfFlux(LayerLaw law, double reynolds, double prandtl, double share) {
        if (!(share >= 0.0 && share < 1.0)) {
            return Double.NaN;
        }
        double[] difference = new double[1];
        Superposition.wallDifference(
                new double[] {share, 1.0},
                new double[] {1.0},
                new double[] {1.0},
                0.0,
                law,
                reynolds,
                prandtl,
                1.0,
                difference);
        return 1.0 / difference[0];
    }

    /**
     * Momentum thickness θ: 0.664115 X/√Re_X laminar (Blasius), 0.037 X Re_X^−0.2 turbulent.
     *
     * @param reach X, distance from the (virtual) origin, m, above 0
     * @param reynoldsPerMetre U/ν, 1/m
     * @return θ, m
     */
    public static double momentumThickness(LayerLaw law, double reach, double reynoldsPerMetre) {
        double reynolds = reach * reynoldsPerMetre;
        if (!(reynolds > 0.0)) {
            return Double.NaN;
        }
        return law == LayerLaw.LAMINAR
                ? LAMINAR_MOMENTUM * reach / Math.sqrt(reynolds)
                : TURBULENT_MOMENTUM * reach * Math.pow(reynolds, -0.2);
    }

    /**
     * Virtual origin of the turbulent layer behind a trip: where a layer turbulent from its start would have begun to have
     * the laminar layer's momentum thickness at the trip, 0.664115 x_t/√Re_t = 0.037 (x_t − x_v)^0.8 (ν/U)^0.2. The drag of
     * the trip itself is left out.
     *
     * @param tripM x_t, m from the leading edge, above 0
     * @param reynoldsPerMetre U/ν, 1/m, above 0
     * @return x_v, m from the leading edge; NaN for arguments not above 0
     */
    public static double virtualOrigin(double tripM, double reynoldsPerMetre) {
        return virtualOrigin(tripM, 0.0, reynoldsPerMetre);
    }

    /**
     * The same with a momentum thickness added by the drag of the trip.
     *
     * @param addedM momentum thickness that the trip adds, m, not negative
     */
    public static double virtualOrigin(double tripM, double addedM, double reynoldsPerMetre) {
        double theta = momentumThickness(LayerLaw.LAMINAR, tripM, reynoldsPerMetre) + addedM;
        if (!(addedM >= 0.0)) {
            return Double.NaN;
        }
        return tripM - Math.pow(theta / TURBULENT_MOMENTUM * Math.pow(reynoldsPerMetre, 0.2), 1.25);
    }

    /**
     * T_aw − T_∞ = r U²/(2 c_p), r = Pr^½ laminar, Pr^⅓ turbulent.
     *
     * @param speed U, m/s
     * @param heatCapacity c_p, J/(kg K)
     * @return difference, K
     */
    public static double adiabaticRise(LayerLaw law, double speed, double prandtl, double heatCapacity) {
        return law.recoveryFactor(prandtl) * speed * speed / (2.0 * heatCapacity);
    }

    /** The exact laminar recovery factor, for comparison with Pr^½; 0.05 ≤ Pr ≤ 1000, NaN outside. */
    public static double exactLaminarRecovery(double prandtl) {
        return SimilaritySolution.recovery(prandtl);
    }
}
