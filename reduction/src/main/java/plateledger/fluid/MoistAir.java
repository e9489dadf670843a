package plateledger.fluid;

/**
 * Dry and moist air at 273.16–500 K, 50–200 kPa, mole fraction of water 0–0.2; dry air is x_v = 0.
 *
 * <pre>
 *   B = x_a² B_aa + 2 x_a x_v B_av + x_v² B_vv        Z = 1 + B p/(R T)        ρ = p M/(Z R T)
 *   c_p = [x_a c_pa⁰ + x_v c_pv⁰ − T B″ p]/M
 *   μ = x_a μ_a/(x_a + x_v Φ_av) + x_v μ_v/(x_v + x_a Φ_va)        k likewise with the same Φ
 *   Φ_ij = [1 + (μ_i/μ_j)^½ (M_j/M_i)^¼]² / [8 (1 + M_i/M_j)]^½
 * </pre>
 *
 * Dry part: Lemmon et al. 2000 and Lemmon and Jacobsen 2004 ({@link DryAir}); vapour: IAPWS ({@link WaterVapour}); mixing:
 * Wilke, J. Chem. Phys. 18 (1950) 517 for μ, Mason and Saxena, Phys. Fluids 1 (1958) 361 with factor 1 for k. Against the
 * full equation of state of dry air Z is within 1.5e-5 and c_p within 1e-4 over 200–500 K and 50–200 kPa.
 */
public final class MoistAir {
    /** Molar gas constant, J/(mol K), exact since 2019 (SI Brochure 9th ed.), cut to ten digits. */
    private static final double GAS_CONSTANT = 8.314462618;

    private static final double T_LOW = 273.16;
    private static final double T_HIGH = 500.0;
    private static final double P_LOW = 50e3;
    private static final double P_HIGH = 200e3;
    private static final double X_HIGH = 0.2;

    // Factors of Φ that depend on the molar masses alone.
    private static final double MASS_RATIO = DryAir.MOLAR_MASS / WaterVapour.MOLAR_MASS;
    private static final double QUARTER_ROOT = Math.sqrt(Math.sqrt(1.0 / MASS_RATIO));
    private static final double AIR_DENOMINATOR = Math.sqrt(8.0 * (1.0 + MASS_RATIO));
    private static final double VAPOUR_DENOMINATOR = Math.sqrt(8.0 * (1.0 + 1.0 / MASS_RATIO));

    private MoistAir() {}

    /** True where {@link #state} holds: 273.16–500 K, 50–200 kPa, x_v 0–0.2. */
    public static boolean inRange(double temperatureK, double pressurePa, double vapourFraction) {
        return temperatureK >= T_LOW
                && temperatureK <= T_HIGH
                && pressurePa >= P_LOW
                && pressurePa <= P_HIGH
                && vapourFraction >= 0.0
                && vapourFraction <= X_HIGH;
    }

    /**
     * Properties of moist air.
     *
     * @param temperatureK T, K
     * @param pressurePa p, absolute, Pa
     * @param vapourFraction x_v, mole fraction of water, dimensionless; that of the free stream also in a heated film
     * @return the state; all NaN outside the range
     */
    public static FluidState state(double temperatureK, double pressurePa, double vapourFraction) {
        if (!inRange(temperatureK, pressurePa, vapourFraction)) {
            return FluidState.UNKNOWN;
        }
        double xv = vapourFraction;
        double xa = 1.0 - xv;
        double rt = GAS_CONSTANT * temperatureK;
        double molarMass = xa * DryAir.MOLAR_MASS + xv * WaterVapour.MOLAR_MASS;

        Virial air = DryAir.virial(temperatureK);
        double airMolarDensity = pressurePa / (rt + air.value() * pressurePa);
        double airViscosity = DryAir.viscosity(temperatureK, airMolarDensity);
        double airConductivity = DryAir.conductivity(temperatureK, airMolarDensity);

        double virial = xa * xa * air.value();
        double curvature = xa * xa * air.curvature();
        double heat = xa * GAS_CONSTANT * DryAir.idealHeatCapacityOverR(temperatureK);
        double viscosity = airViscosity;
        double conductivity = airConductivity;
        if (xv > 0.0) {
            Virial cross = WaterVapour.crossVirial(temperatureK);
            Virial water = WaterVapour.virial(temperatureK);
            virial += 2.0 * xa * xv * cross.value() + xv * xv * water.value();
            curvature += 2.0 * xa * xv * cross.curvature() + xv * xv * water.curvature();
            heat += xv * WaterVapour.MOLAR_MASS * WaterVapour.idealHeatCapacity(temperatureK);
            double vapourViscosity = WaterVapour.viscosity(temperatureK);
            double root = Math.sqrt(airViscosity / vapourViscosity);
            double airSum = 1.0 + root * QUARTER_ROOT;
            double vapourSum = 1.0 + 1.0 / (root * QUARTER_ROOT);
            double airShare = xa / (xa + xv * airSum * airSum / AIR_DENOMINATOR);
            double vapourShare = xv / (xv + xa * vapourSum * vapourSum / VAPOUR_DENOMINATOR);
            viscosity = airShare * airViscosity + vapourShare * vapourViscosity;
            conductivity = airShare * airConductivity + vapourShare * WaterVapour.conductivity(temperatureK);
        }
        double density = pressurePa * molarMass / (rt + virial * pressurePa);
        double heatCapacity = (heat - curvature * pressurePa / temperatureK) / molarMass;
        return new FluidState(density, viscosity, conductivity, heatCapacity);
    }

    /**
     * Mole fraction of water for a relative humidity, see {@link Humidity#vapourFraction}.
     *
     * @param temperatureK T of the air whose humidity is stated, K
     * @param pressurePa p, Pa
     * @param relativeHumidity h over liquid water, 0 .. 1
     * @return x_v; NaN outside the range
     */
    public static double vapourFraction(double temperatureK, double pressurePa, double relativeHumidity) {
        return Humidity.vapourFraction(temperatureK, pressurePa, relativeHumidity);
    }

    /**
     * Dew point (below 0.01 °C the frost point), see {@link Humidity#dewPointK}.
     *
     * @param pressurePa p, Pa
     * @param vapourFraction x_v, dimensionless
     * @return dew point, K; NaN for dry air
     */
    public static double dewPointK(double pressurePa, double vapourFraction) {
        return Humidity.dewPointK(pressurePa, vapourFraction);
    }
}
