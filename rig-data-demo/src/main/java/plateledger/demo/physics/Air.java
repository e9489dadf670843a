package plateledger.demo.physics;

import plateledger.fluid.FluidState;
import plateledger.fluid.MoistAir;

/**
 * The campaign's air: the published formulation, each property off by a factor drawn once.
 *
 * @param density factor on ρ
 * @param viscosity factor on μ
 * @param conductivity factor on k
 * @param heatCapacity factor on c_p
 */
public record Air(double density, double viscosity, double conductivity, double heatCapacity) {
    /** The formulation as published. */
    public static final Air AS_PUBLISHED = new Air(1.0, 1.0, 1.0, 1.0);

    /**
     * Properties at a temperature (K), pressure (Pa) and water mole fraction.
     *
     * @throws IllegalArgumentException outside the range of the formulation
     */
    public FluidState at(double temperatureK, double pressurePa, double vapourFraction) {
        FluidState s = MoistAir.state(temperatureK, pressurePa, vapourFraction);
        if (Double.isNaN(s.density())) {
            throw new IllegalArgumentException(
                    "no air properties at %s K, %s Pa, x_v %s".formatted(temperatureK, pressurePa, vapourFraction));
        }
        return new FluidState(
                s.density() * density,
                s.viscosity() * viscosity,
                s.conductivity() * conductivity,
                s.heatCapacity() * heatCapacity);
    }
}
