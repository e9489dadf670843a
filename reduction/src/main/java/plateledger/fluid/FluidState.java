package plateledger.fluid;

/**
 * Properties of a fluid at one temperature, pressure and composition. The derived numbers are always formed from the four
 * primaries, never interpolated on their own.
 *
 * @param density ρ, kg/m³
 * @param viscosity μ, dynamic viscosity, Pa s
 * @param conductivity k, thermal conductivity, W/(m K)
 * @param heatCapacity c_p, isobaric heat capacity, J/(kg K)
 */
public record FluidState(double density, double viscosity, double conductivity, double heatCapacity) {
    /** The state outside the range of the formulation: all NaN. */
    public static final FluidState UNKNOWN = new FluidState(Double.NaN, Double.NaN, Double.NaN, Double.NaN);

    /** ν = μ/ρ, m²/s. */
    public double kinematicViscosity() {
        return viscosity / density;
    }

    /** Pr = μ c_p/k. */
    public double prandtl() {
        return viscosity * heatCapacity / conductivity;
    }

    /** α = k/(ρ c_p), thermal diffusivity, m²/s. */
    public double diffusivity() {
        return conductivity / (density * heatCapacity);
    }
}
