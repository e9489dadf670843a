package plateledger.demo.app;

/**
 * The product's law, Nu_L = C Re_L^m Pr^(1/3), with the air's properties at ½ (area mean of T_s + T_∞) and L from the
 * leading edge to the end of the heated part; optionally bent in the log–log plane.
 *
 * @param c C
 * @param m m
 * @param bend how much ln Nu bends: + half of it at both ends of the speed range, − half in its middle
 */
public record ProductLaw(double c, double m, double bend) {
    private static final double MIDDLE_LN_RE = Math.log(1.93e5);
    private static final double HALF_RANGE_LN_RE = 0.5 * Math.log(10.0);

    /** The law of the demo's product. */
    public static ProductLaw straight() {
        return new ProductLaw(0.0871, 0.725, 0.0);
    }

    /** The same, bent. */
    public ProductLaw bent(double by) {
        return new ProductLaw(c, m, by);
    }

    /** Nu_L. */
    public double nusselt(double reynolds, double prandtl) {
        double s = (Math.log(reynolds) - MIDDLE_LN_RE) / HALF_RANGE_LN_RE;
        return c * Math.pow(reynolds, m) * Math.cbrt(prandtl) * Math.exp(bend * (s * s - 0.5));
    }
}
