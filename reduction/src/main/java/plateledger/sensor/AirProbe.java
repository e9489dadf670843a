package plateledger.sensor;

/** Temperature of the stream from an air probe that recovers part of the dynamic temperature and sees the walls. */
public final class AirProbe {
    private AirProbe() {}

    /**
     * The stream's temperature, solved from T_probe = T_∞ + r U²/(2 c_p) + f (T_w − T_∞).
     *
     * @param probeK T_probe, K
     * @param wallK T_w, temperature of the walls the probe sees, K
     * @param speed U at the probe, m/s
     * @param recoveryFactor r, dimensionless, 0 .. 1 (bare wires about 0.8)
     * @param radiationFraction f, dimensionless, 0 ≤ f &lt; 1
     * @param heatCapacity c_p of the stream, J/(kg K)
     * @return T_∞, static, K
     */
    public static double streamK(
            double probeK,
            double wallK,
            double speed,
            double recoveryFactor,
            double radiationFraction,
            double heatCapacity) {
        double recovery = recoveryFactor * speed * speed / (2.0 * heatCapacity);
        return (probeK - recovery - radiationFraction * wallK) / (1.0 - radiationFraction);
    }
}
