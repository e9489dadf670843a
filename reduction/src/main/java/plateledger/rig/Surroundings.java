package plateledger.rig;

import java.util.List;
import plateledger.quantity.Stated;

/**
 * What surrounds the plates and is measured by channels common to all plates.
 *
 * @param wallChannels tunnel wall temperatures the heated face radiates to; their mean is used
 * @param plenumChannels still air behind the insulation
 * @param frameChannels frame at the side edges
 * @param noseChannels nose at the upstream end of the sheet
 * @param tailChannels tail at the downstream end of the sheet
 * @param coverInnerChannels plate-side face of the loss-run cover
 * @param coverOuterChannels room-side face of the loss-run cover
 * @param airChannel air temperature probe in the stream
 * @param pressureChannel barometer
 * @param humidityChannel relative humidity of the stream, at the air probe's temperature
 * @param exchangeFactor F of F ε σ (T_s⁴ − T_w⁴), dimensionless
 * @param blockage relative increase of the stream speed over the plate against the speed measured, dimensionless
 * @param airProbe corrections of the air probe
 * @param speedMeters how the stream speed is measured
 */
public record Surroundings(
        List<String> wallChannels,
        List<String> plenumChannels,
        List<String> frameChannels,
        List<String> noseChannels,
        List<String> tailChannels,
        List<String> coverInnerChannels,
        List<String> coverOuterChannels,
        String airChannel,
        String pressureChannel,
        String humidityChannel,
        Stated exchangeFactor,
        Stated blockage,
        AirProbe airProbe,
        List<SpeedMeter> speedMeters) {

    /**
     * Corrections of the air probe: T_probe = T_∞ + r U²/(2 c_p) + f (T_wall − T_∞).
     *
     * @param recoveryFactor r, dimensionless
     * @param radiationFraction f, dimensionless
     */
    public record AirProbe(Stated recoveryFactor, Stated radiationFraction) {}

    /** How a speed meter works. */
    public enum SpeedPrinciple {
        /** Pitot-static head: channel is a pressure difference in Pa. */
        PITOT,
        /** Thermal anemometer that indicates m/s at the stream's density. */
        THERMAL
    }

    /**
     * One speed meter.
     *
     * @param channel its channel
     * @param principle how it works
     * @param factor C of U = C √(2 Δp/ρ), or the factor on an indicated speed; dimensionless
     * @param fromMPerS lowest speed for which it is used, m/s
     * @param toMPerS speed at and above which it is not used, m/s
     */
    public record SpeedMeter(
            String channel, SpeedPrinciple principle, Stated factor, double fromMPerS, double toMPerS) {}

    /** Copies the lists. */
    public Surroundings {
        wallChannels = List.copyOf(wallChannels);
        plenumChannels = List.copyOf(plenumChannels);
        frameChannels = List.copyOf(frameChannels);
        noseChannels = List.copyOf(noseChannels);
        tailChannels = List.copyOf(tailChannels);
        coverInnerChannels = List.copyOf(coverInnerChannels);
        coverOuterChannels = List.copyOf(coverOuterChannels);
        speedMeters = List.copyOf(speedMeters);
    }
}
