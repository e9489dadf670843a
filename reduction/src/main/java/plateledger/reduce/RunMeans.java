package plateledger.reduce;

import java.util.Map;
import plateledger.campaign.Run;
import plateledger.quantity.Estimate;

/**
 * What one run's logs came to over its steady window: all that the reduction needs of it.
 *
 * @param run the run as declared
 * @param means mean reading of each channel in SI after its calibration polynomial, with standard error and degrees of
 *     freedom; a channel that was lost is absent
 * @param drift fitted common drift of the plate's junctions, K/s
 * @param powerCovarianceW mean(V I) − mean V mean I of each strip, W; empty where no heater was logged
 * @param middleS middle of the window, s since 1970-01-01T00:00Z
 */
public record RunMeans(
        Run run, Map<String, Estimate> means, Estimate drift, double[] powerCovarianceW, double middleS) {
    /** Copies the map. */
    public RunMeans {
        means = Map.copyOf(means);
    }

    /** True if every channel named was read. */
    public boolean has(java.util.Collection<String> channels) {
        return means.keySet().containsAll(channels);
    }
}
