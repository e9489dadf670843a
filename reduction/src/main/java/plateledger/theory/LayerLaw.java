package plateledger.theory;

/**
 * The state of the boundary layer over the heated part, with the laws that go with it: how Nu of a uniform wall
 * temperature depends on Re and Pr, how a step of temperature or flux is felt downstream, and the recovery factor.
 */
public enum LayerLaw {
    /**
     * Laminar from the leading edge. Nu_x = c(0, Pr) √Re_x with the exact c (METHODS.md (T-2)); kernel a = ¾, b = ⅓
     * (Lighthill 1950; Eckert's integral method) with the correction of {@link LaminarTable}. 0.5 ≤ Pr ≤ 100.
     */
    LAMINAR(0.75, 1.0 / 3.0, 0.5),
    /**
     * Turbulent from its virtual origin. Nu_x = 0.0287 Re_x^0.8 Pr^0.6 (Kays &amp; Crawford, St = 0.0287 Re^−0.2
     * Pr^−0.4, METHODS.md (T-5)); kernel a = 9/10, b = 1/9 (Reynolds, Kays &amp; Kline 1958). Gases, 0.5 ≤ Pr ≤ 1,
     * 5e5 ≤ Re_x ≤ 5e6 published; used below 5e5 for a tripped layer.
     */
    TURBULENT(0.9, 1.0 / 9.0, 0.8);

    /** Coefficient of the turbulent law; Kays &amp; Crawford. The alternative 0.0296 in use is 3.1 % higher. */
    public static final double TURBULENT_COEFFICIENT = 0.0287;

    private static final double TURBULENT_PRANDTL_EXPONENT = 0.6;

    private final double a;
    private final double b;
    private final double reynoldsExponent;

    LayerLaw(double a, double b, double reynoldsExponent) {
        this.a = a;
        this.b = b;
        this.reynoldsExponent = reynoldsExponent;
    }

    /** a in the step kernel [1 − (ξ/x)^a]^(−b). */
    public double a() {
        return a;
    }

    /** b in the step kernel [1 − (ξ/x)^a]^(−b). */
    public double b() {
        return b;
    }

    /** p in Nu_x ∝ Re_x^p. */
    public double reynoldsExponent() {
        return reynoldsExponent;
    }

    /**
     * Pr exponent s of the textbook law: ⅓ laminar (where the tool uses the exact function instead), 0.6 turbulent.
     */
    public double prandtlExponent() {
        return this == LAMINAR ? 1.0 / 3.0 : TURBULENT_PRANDTL_EXPONENT;
    }

    /** C(Pr) in Nu_x = C Re_x^p for uniform wall temperature; NaN for Pr outside the range. */
    public double uniformTemperature(double prandtl) {
        if (this == LAMINAR) {
            return LaminarTable.uniformTemperature(prandtl);
        }
        return prandtl >= LaminarTable.LOWEST_PRANDTL && prandtl <= LaminarTable.HIGHEST_PRANDTL
                ? TURBULENT_COEFFICIENT * Math.pow(prandtl, TURBULENT_PRANDTL_EXPONENT)
                : Double.NaN;
    }

    /**
     * Recovery factor r of T_aw = T_∞ + r U²/(2 c_p) as used throughout: Pr^½ laminar, Pr^⅓ turbulent (common practice;
     * Pr^½ is 0.1 % above the exact laminar value at Pr 0.7).
     */
    public double recoveryFactor(double prandtl) {
        return this == LAMINAR ? Math.sqrt(prandtl) : Math.cbrt(prandtl);
    }

    /** Coefficient of [1 − (ξ/x)^a]^(b − 1 + j) in the flux kernel, times 1/C: K, METHODS.md (T-8), (T-10). */
    double fluxKernel(int j, double prandtl) {
        if (this == LAMINAR) {
            return LaminarTable.fluxKernel(j, prandtl);
        }
        return j == 0 ? classicalConstant() / uniformTemperature(prandtl) : 0.0;
    }

    /** a/(Γ(b) Γ(1−b)) = a sin(πb)/π. */
    double classicalConstant() {
        return a * Math.sin(Math.PI * b) / Math.PI;
    }
}
