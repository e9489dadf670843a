package plateledger.demo.sensor;

/**
 * What is declared about the tunnel.
 *
 * @param exchangeFactor F of radiation between face and walls
 * @param blockage relative rise of the speed over the plate
 * @param probeRecovery recovery factor of the air probe
 * @param probeRadiation radiation fraction of the air probe
 * @param pitotFactor C of U = C √(2 Δp/ρ)
 * @param anemometerFactor factor on the indicated speed
 * @param changeOverMPerS speed below which the anemometer counts, m/s
 */
public record RigDeclaration(
        Declared exchangeFactor,
        Declared blockage,
        Declared probeRecovery,
        Declared probeRadiation,
        Declared pitotFactor,
        Declared anemometerFactor,
        double changeOverMPerS) {

    /** The tunnel of this rig. */
    public static RigDeclaration standard() {
        return new RigDeclaration(
                Declared.standard("0.97", "", 1.0, "0.01"),
                Declared.standard("1.5", "%", 0.01, "0.3"),
                Declared.limits("0.80", "", 1.0, "0.15"),
                Declared.limits("0.010", "", 1.0, "0.005"),
                Declared.standard("1.000", "", 1.0, "0.004"),
                Declared.standard("1.000", "", 1.0, "0.008"),
                5.0);
    }
}
