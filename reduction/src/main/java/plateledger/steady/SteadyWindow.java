package plateledger.steady;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * One steady part of a run with the means over it.
 *
 * @param startS start, s since 1970-01-01T00:00Z, true time (clocks corrected)
 * @param endS end
 * @param declared true if a person chose it
 * @param reason the person's reason; empty if it was found
 * @param means mean by channel
 * @param evidence every test made
 */
public record SteadyWindow(
        double startS,
        double endS,
        boolean declared,
        String reason,
        Map<String, ChannelMean> means,
        List<Evidence> evidence) {
    /** Copies the collections. */
    public SteadyWindow {
        if (!(startS < endS)) {
            throw new IllegalArgumentException("a window must start before it ends: " + startS + " .. " + endS);
        }
        means = java.util.Collections.unmodifiableMap(new java.util.TreeMap<>(means));
        evidence = List.copyOf(evidence);
    }

    /** The mean of a channel. */
    public Optional<ChannelMean> mean(String channel) {
        return Optional.ofNullable(means.get(channel));
    }
}
