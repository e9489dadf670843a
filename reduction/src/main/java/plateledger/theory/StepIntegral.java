package plateledger.theory;

import plateledger.numeric.IncompleteBetaTable;

/** Integral of the flux kernel over a stretch of plate, METHODS.md (T-8). */
public final class StepIntegral {
    private static final int CORRECTED_TERMS = 3;
    private static final IncompleteBetaTable LAMINAR =
            IncompleteBetaTable.of(LayerLaw.LAMINAR.a(), LayerLaw.LAMINAR.b(), CORRECTED_TERMS);
    private static final IncompleteBetaTable TURBULENT =
            IncompleteBetaTable.of(LayerLaw.TURBULENT.a(), LayerLaw.TURBULENT.b(), 1);

    private StepIntegral() {}

    static IncompleteBetaTable table(LayerLaw law) {
        return law == LayerLaw.LAMINAR ? LAMINAR : TURBULENT;
    }

    /**
     * ∫_{x1}^{x2} [1 − (ξ/x)^a]^(−(1−b)) dξ in closed form, (x/a) [B_{z2}(1/a, b) − B_{z1}(1/a, b)], z = (ξ/x)^a, from a
     * table; absolute error below 2e-9 of the integral from 0 to x.
     *
     * @param law the layer, which gives a and b
     * @param x1 start of the stretch, m from the (virtual) origin; below 0 is taken as 0, above x as x
     * @param x2 end of the stretch, m, not below x1; above x is taken as x, since nothing is felt upstream
     * @param x where the effect is felt, m, above 0
     * @return the integral, m; NaN if x is not above 0
     */
    public static double between(LayerLaw law, double x1, double x2, double x) {
        if (!(x > 0.0)) {
            return Double.NaN;
        }
        return x
                * (table(law).sum(x2 / x, (x - x2) / x, 1.0, 0.0, 0.0)
                        - table(law).sum(x1 / x, (x - x1) / x, 1.0, 0.0, 0.0));
    }
}
