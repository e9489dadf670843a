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
 * @param heatedFromS start of the window since the heater was switched on, s; infinite for a plate long in balance
 * @param heatedToS end of the window since then, s
 */
public record RunMeans(
        Run run,
        Map<String, Estimate> means,
        Estimate drift,
        double[] powerCovarianceW,
        double middleS,
        double heatedFromS,
        double heatedToS) {
    /** Means of a plate long in balance with its insulation. */
    public static RunMeans balanced(
            Run run, Map<String, Estimate> means, Estimate drift, double[] powerCovarianceW, double middleS) {
        return new RunMeans(
                run, means, drift, powerCovarianceW, middleS, Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY);
    }

    /** Copies the map. */
    public RunMeans {
        means = Map.copyOf(means);
    }

    /** True if every channel named was read. */
    public boolean has(java.util.Collection<String> channels) {
        return means.keySet().containsAll(channels);
    }
}
