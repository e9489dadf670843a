package plateledger.sensor;

/**
 * Speed from a pitot-static tube. Both forms keep the sign of the pressure difference, so that readings about zero average
 * to zero.
 */
public final class PitotTube {
    private PitotTube() {}

    /**
     * Incompressible form, U = C √(2 Δp/ρ): reads high by M²/8 of the speed, 0.04 % at 20 m/s in air.
     *
     * @param pressureDifference Δp, Pa, signed
     * @param density ρ of the stream, kg/m³, positive
     * @param factor C, dimensionless
     * @return U, m/s, with the sign of Δp
     */
    public static double speed(double pressureDifference, double density, double factor) {
        return Math.copySign(factor * Math.sqrt(2.0 * Math.abs(pressureDifference) / density), pressureDifference);
    }

    /**
     * Isentropic form of an ideal gas (ISO 3966 scope: Mach up to 0.25).
     *
     * <pre>
     *   M² = 2/(γ − 1) [(1 + C² Δp/p)^((γ−1)/γ) − 1]        U = M √(γ p/ρ)
     * </pre>
     *
     * @param pressureDifference Δp, Pa, signed
     * @param pressure p, static, Pa
     * @param density ρ at the static state, kg/m³
     * @param heatCapacityRatio γ = c_p/c_v, above 1
     * @param factor C on the speed (it acts on Δp as C²), dimensionless
     * @return U, m/s, with the sign of Δp
     */
    public static double compressibleSpeed(
            double pressureDifference, double pressure, double density, double heatCapacityRatio, double factor) {
        double mach = mach(factor * factor * Math.abs(pressureDifference), pressure, heatCapacityRatio);
        return Math.copySign(mach * Math.sqrt(heatCapacityRatio * pressure / density), pressureDifference);
    }

    /**
     * Mach number of the isentropic form.
     *
     * @param pressureDifference Δp after the probe's coefficient, Pa, not negative
     * @param pressure p, static, Pa
     * @param heatCapacityRatio γ, above 1
     * @return M
     */
    public static double mach(double pressureDifference, double pressure, double heatCapacityRatio) {
        double exponent = (heatCapacityRatio - 1.0) / heatCapacityRatio;
        // expm1 and log1p keep the digits at small Δp.
        double rise = Math.expm1(exponent * Math.log1p(pressureDifference / pressure));
        return Math.sqrt(2.0 / (heatCapacityRatio - 1.0) * rise);
    }
}
