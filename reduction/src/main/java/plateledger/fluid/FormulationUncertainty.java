package plateledger.fluid;

/**
 * Relative standard uncertainty of the property formulation itself, apart from that of temperature, pressure and humidity.
 * One error for all points of a campaign: fully correlated over its runs.
 *
 * <p>The authors state 0.1 % on ρ and 1 % on c_p (2000) and "generally within 5 %" on μ and k (2004) for the whole surface,
 * without a coverage factor. Near atmospheric pressure and 250–500 K the independent correlation of Kadoya, Matsunaga and
 * Nagashima, J. Phys. Chem. Ref. Data 14 (1985) 947, lies within 0.2 % in μ and 0.8 % in k; the values here are the
 * tool's own judgement from that: 0.05 % ρ, 0.1 % c_p, 0.5 % μ, 1.0 % k. To μ and k of moist air 20 % of the shift that the
 * humidity makes is added in quadrature (judgement: no uncertainty of the mixing rules for air and water is published).
 *
 * @param density relative standard uncertainty of ρ
 * @param viscosity relative standard uncertainty of μ
 * @param conductivity relative standard uncertainty of k
 * @param heatCapacity relative standard uncertainty of c_p
 */
public record FormulationUncertainty(double density, double viscosity, double conductivity, double heatCapacity) {
    private static final double DENSITY = 0.0005;
    private static final double VISCOSITY = 0.005;
    private static final double CONDUCTIVITY = 0.010;
    private static final double HEAT_CAPACITY = 0.001;
    private static final double HUMID_SHIFT_SHARE = 0.2;

    /**
     * The uncertainty at one state.
     *
     * @param temperatureK T, K
     * @param pressurePa p, Pa
     * @param vapourFraction x_v, dimensionless
     * @return relative standard uncertainties; all NaN outside the range of {@link MoistAir}
     */
    public static FormulationUncertainty of(double temperatureK, double pressurePa, double vapourFraction) {
        if (!MoistAir.inRange(temperatureK, pressurePa, vapourFraction)) {
            return new FormulationUncertainty(Double.NaN, Double.NaN, Double.NaN, Double.NaN);
        }
        FluidState dry = MoistAir.state(temperatureK, pressurePa, 0.0);
        FluidState moist = MoistAir.state(temperatureK, pressurePa, vapourFraction);
        double viscosityShift = moist.viscosity() / dry.viscosity() - 1.0;
        double conductivityShift = moist.conductivity() / dry.conductivity() - 1.0;
        return new FormulationUncertainty(
                DENSITY,
                Math.hypot(VISCOSITY, HUMID_SHIFT_SHARE * viscosityShift),
                Math.hypot(CONDUCTIVITY, HUMID_SHIFT_SHARE * conductivityShift),
                HEAT_CAPACITY);
    }
}
