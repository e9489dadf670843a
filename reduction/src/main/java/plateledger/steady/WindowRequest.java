package plateledger.steady;

import java.util.Collections;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import plateledger.log.Series;

/**
 * What the search for a steady window needs.
 *
 * @param channels every channel whose mean will be used, by name, screened, with clocks corrected to true time
 * @param temperatureChannels those of them whose mean is the plate's temperature; names without a channel are not allowed
 * @param totalPower total heater power, W, clocks corrected; empty for runs without power
 * @param heatCapacityJPerK heat capacity of all that warms with the plate, J/K; not used without power
 * @param shareLimit largest allowed upper bound of storage ÷ power, e.g. 0.01
 * @param minimumS shortest window, s
 * @param targetUncertainty the standard uncertainty by which a channel's mean will be judged, SI; a drift over the window
 *     below half of it is harmless. The total power is found under its own channel name. A channel not listed has no
 *     harmless drift: it passes only if no drift can be told
 * @param resolution one step of a channel's reading, SI; for a channel not listed the smallest change seen
 * @param declared a window chosen by a person; it wins over any search
 * @param common a channel whose slow drift all {@code followers} share (the stream's temperature); its drift is no sign of
 *     unsteadiness, since means of one window follow it together
 * @param followers channels judged by their drift against {@code common}
 */
public record WindowRequest(
        Map<String, Series> channels,
        Set<String> temperatureChannels,
        Optional<Series> totalPower,
        double heatCapacityJPerK,
        double shareLimit,
        double minimumS,
        Map<String, Double> targetUncertainty,
        Map<String, Double> resolution,
        Optional<Declared> declared,
        Optional<String> common,
        Set<String> followers) {

    /**
     * A window chosen by a person.
     *
     * @param startS start, s since 1970-01-01T00:00Z
     * @param endS end
     * @param reason why
     */
    public record Declared(double startS, double endS, String reason) {}

    /** Copies the collections in the order of names. Refuses temperature channels that are not there, and limits of 0. */
    public WindowRequest {
        channels = Collections.unmodifiableMap(new TreeMap<>(channels));
        temperatureChannels = Collections.unmodifiableSet(new TreeSet<>(temperatureChannels));
        targetUncertainty = Map.copyOf(targetUncertainty);
        resolution = Map.copyOf(resolution);
        followers = Set.copyOf(followers);
        if (!channels.keySet().containsAll(temperatureChannels)) {
            throw new IllegalArgumentException("temperature channels without a series: " + temperatureChannels);
        }
        if (!(minimumS > 0.0) || !(shareLimit > 0.0)) {
            throw new IllegalArgumentException("limits must be positive: " + minimumS + " s, " + shareLimit);
        }
    }
}
