package plateledger.demo.app;

import java.util.Map;

/**
 * What a reduction would have after reading one run's logs: means over a window with their standard errors. SI.
 *
 * @param plan the run
 * @param mean mean reading by channel, instrument errors and the noise of the mean included
 * @param standardError standard error of the mean by channel
 * @param windowS length of the window, s
 * @param plateSlopeKPerS fitted rate of rise of the plate's mean temperature, K/s
 * @param plateSlopeStandardError its standard error, K/s
 * @param truth what was true
 */
public record RunMeans(
        RunPlan plan,
        Map<String, Double> mean,
        Map<String, Double> standardError,
        double windowS,
        double plateSlopeKPerS,
        double plateSlopeStandardError,
        RunTruth truth) {
    /** Copies the maps. */
    public RunMeans {
        mean = Map.copyOf(mean);
        standardError = Map.copyOf(standardError);
    }

    /** Name of the run, as in the campaign folder. */
    public String runId() {
        return plan.id();
    }
}
