package plateledger.fluid;

/**
 * Humidity of air: saturation pressures, enhancement factor, and the ways between relative humidity, dew point and the
 * mole fraction of water. The mole fraction is what is kept when air is heated; the relative humidity is not.
 */
public final class Humidity {
    /** Triple point of water, K: lower end of the saturation formula over liquid. */
    static final double TRIPLE_POINT_K = 273.16;

    private static final double T_CRITICAL = 647.096; // K
    private static final double P_CRITICAL = 22.064e6; // Pa
    private static final double CELSIUS_ZERO_K = 273.15;

    private Humidity() {}

    /**
     * Saturation pressure over liquid water, Wagner and Pruß, IAPWS SR1-86(1992).
     *
     * @param temperatureK T, K, 273.16 .. 647.096
     * @return p_s, Pa; NaN outside the range
     */
    public static double saturationPressurePa(double temperatureK) {
        if (!(temperatureK >= TRIPLE_POINT_K && temperatureK <= T_CRITICAL)) {
            return Double.NaN;
        }
        double v = 1.0 - temperatureK / T_CRITICAL;
        double root = Math.sqrt(v);
        double v3 = v * v * v;
        double sum = -7.85951783 * v
                + 1.84408259 * v * root
                - 11.7866497 * v3
                + 22.6807411 * v3 * root
                - 15.9618719 * v3 * v
                + 1.80122502 * v3 * v3 * v * root;
        return P_CRITICAL * Math.exp(T_CRITICAL / temperatureK * sum);
    }

    /**
     * Pressure of vapour over ice, IAPWS R14-08.
     *
     * @param temperatureK T, K, 190 .. 273.16 (the formula itself holds from 50 K)
     * @return p, Pa; NaN outside the range
     */
    public static double icePressurePa(double temperatureK) {
        if (!(temperatureK >= 190.0 && temperatureK <= TRIPLE_POINT_K)) {
            return Double.NaN;
        }
        double theta = temperatureK / TRIPLE_POINT_K;
        double sum = -21.2144006 * Math.pow(theta, 0.00333333333)
                + 27.3203819 * Math.pow(theta, 1.20666667)
                - 6.10598130 * Math.pow(theta, 1.70333333);
        return 611.657 * Math.exp(sum / theta);
    }

    /**
     * Enhancement factor f of CIPM-2007: how much more vapour saturated air holds than the pure vapour pressure says. Stated
     * for 15–27 °C and 60–110 kPa; at 15–60 °C x_v is then within 2.1e-4 of a full enhancement-factor model.
     *
     * @param pressurePa p, Pa
     * @param temperatureK T, K
     * @return f, dimensionless
     */
    public static double enhancementFactor(double pressurePa, double temperatureK) {
        double t = temperatureK - CELSIUS_ZERO_K;
        return 1.00062 + 3.14e-8 * pressurePa + 5.6e-7 * t * t;
    }

    /**
     * Mole fraction of water for a relative humidity (with respect to liquid water).
     *
     * @param temperatureK T of the air whose humidity is stated, K, 273.16 .. 500
     * @param pressurePa p, Pa, positive
     * @param relativeHumidity h, 0 .. 1
     * @return x_v = h f p_s(T)/p; NaN outside the range
     */
    public static double vapourFraction(double temperatureK, double pressurePa, double relativeHumidity) {
        if (!(relativeHumidity >= 0.0 && relativeHumidity <= 1.0) || !(pressurePa > 0.0)) {
            return Double.NaN;
        }
        return relativeHumidity * saturatedFraction(temperatureK, pressurePa);
    }

    /**
     * Relative humidity (with respect to liquid water) for a mole fraction of water.
     *
     * @param temperatureK T, K, 273.16 .. 500
     * @param pressurePa p, Pa, positive
     * @param vapourFraction x_v, dimensionless
     * @return h; above 1 where water would condense
     */
    public static double relativeHumidity(double temperatureK, double pressurePa, double vapourFraction) {
        return vapourFraction / saturatedFraction(temperatureK, pressurePa);
    }

    /**
     * Dew point; below 0.01 °C the frost point.
     *
     * @param pressurePa p, Pa, positive
     * @param vapourFraction x_v, dimensionless, above 0
     * @return temperature at which the first dew (or frost) forms, K; NaN for dry air and where none is found
     */
    public static double dewPointK(double pressurePa, double vapourFraction) {
        double partial = vapourFraction * pressurePa;
        if (!(partial > 0.0) || !Double.isFinite(partial)) {
            return Double.NaN;
        }
        double low = 190.0;
        double high = 640.0;
        // ln p is almost a straight line in −1/T, so the secant in that variable closes in a few steps; the bracket
        // keeps
        // it safe over the whole range.
        if (!(saturation(low, pressurePa) < partial && saturation(high, pressurePa) > partial)) {
            return Double.NaN;
        }
        double target = Math.log(partial);
        double t = TRIPLE_POINT_K;
        for (int i = 0; i < 200 && high - low > 1e-10; i++) {
            double error = Math.log(saturation(t, pressurePa)) - target;
            if (error > 0.0) {
                high = t;
            } else {
                low = t;
            }
            double step = 1e-3;
            double side = t >= TRIPLE_POINT_K ? step : -step; // the slope changes at the triple point
            double slope = (Math.log(saturation(t + side, pressurePa)) - target - error) / side;
            double next = t / (1.0 + error / (slope * t)); // Newton in 1/T
            if (Math.abs(next - t) < 1e-9) {
                return next;
            }
            t = next > low && next < high ? next : 0.5 * (low + high);
        }
        return t;
    }

    /** Mass fraction of water, kg per kg of moist air, for a mole fraction. */
    public static double massFraction(double vapourFraction) {
        double water = vapourFraction * WaterVapour.MOLAR_MASS;
        return water / (water + (1.0 - vapourFraction) * DryAir.MOLAR_MASS);
    }

    private static double saturatedFraction(double temperatureK, double pressurePa) {
        return enhancementFactor(pressurePa, temperatureK) * saturationPressurePa(temperatureK) / pressurePa;
    }

    private static double saturation(double t, double pressurePa) {
        double pure = t >= TRIPLE_POINT_K ? saturationPressurePa(t) : icePressurePa(t);
        return enhancementFactor(pressurePa, t) * pure;
    }
}
