package plateledger.rig;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import plateledger.quantity.Stated;

/**
 * One instrument (or a set of like channels calibrated together) and what its calibration says. A reading R (after the
 * calibration polynomial) is related to the true value X by
 *
 * <pre>  X = R − b − b_i − g (R − R₀) − g_i (R − R₀) − d_i </pre>
 *
 * with R₀ the {@code gainOrigin} (for the plate's thermocouples the zero run's temperature takes its place, since their
 * offsets come from that run).
 *
 * @param id name, used as scope
 * @param kind what it measures
 * @param bath calibration bath shared with other instruments; empty if none
 * @param channels its channels
 * @param polynomial coefficients a₀, a₁, … of the calibration polynomial in SI, empty for the identity
 * @param gainOrigin R₀, SI
 * @param offset b, common to all its channels (to all channels of the bath, where there is one), SI
 * @param gain g, common to all its channels, dimensionless
 * @param channelOffset b_i, own to each channel, SI
 * @param channelGain g_i, own to each channel, dimensionless
 * @param dailyDrift d_i, own to each channel and day: change since that day's zero, SI
 * @param resolution one step of the reading, SI, 0 if negligible
 * @param rangeLow lowest reading that can be right, SI
 * @param rangeHigh highest reading that can be right, SI
 * @param certificate number of the certificate; empty if none
 * @param calibrated date of calibration
 * @param due date when the next calibration is due
 */
public record Instrument(
        String id,
        SignalKind kind,
        String bath,
        List<String> channels,
        List<Double> polynomial,
        double gainOrigin,
        Stated offset,
        Stated gain,
        Stated channelOffset,
        Stated channelGain,
        Stated dailyDrift,
        double resolution,
        double rangeLow,
        double rangeHigh,
        String certificate,
        Optional<LocalDate> calibrated,
        Optional<LocalDate> due) {

    /** What an instrument measures; fixes the SI unit of its channels. */
    public enum SignalKind {
        /** Temperature, K. */
        TEMPERATURE,
        /** Voltage, V. */
        VOLTAGE,
        /** Current, A. */
        CURRENT,
        /** Differential pressure, Pa. */
        DIFFERENTIAL_PRESSURE,
        /** Absolute pressure, Pa. */
        ABSOLUTE_PRESSURE,
        /** Speed, m/s. */
        SPEED,
        /** Relative humidity over liquid water as a fraction 0..1. */
        RELATIVE_HUMIDITY
    }

    /** Copies the lists. */
    public Instrument {
        channels = List.copyOf(channels);
        polynomial = List.copyOf(polynomial);
    }
}
