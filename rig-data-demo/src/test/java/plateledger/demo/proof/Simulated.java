package plateledger.demo.proof;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import plateledger.campaign.Campaign;
import plateledger.campaign.CampaignReader;
import plateledger.campaign.Run;
import plateledger.demo.app.RunMeans;
import plateledger.finding.RefusedException;
import plateledger.quantity.Estimate;

/** Hands simulated window means to the reduction, as it would have them from logs. */
final class Simulated {
    /** Where the demo campaign lies, from the module's folder. */
    static final Path FOLDER = Path.of("cabinet-door");

    /** Spacing of runs on the time axis; only their order matters to the reduction. */
    private static final double SPACING_S = 3600.0;

    private Simulated() {}

    static Campaign campaign() {
        try {
            return CampaignReader.read(FOLDER).campaign();
        } catch (RefusedException e) {
            throw new IllegalStateException(e);
        }
    }

    static List<plateledger.reduce.RunMeans> means(Campaign campaign, List<RunMeans> simulated) {
        List<plateledger.reduce.RunMeans> out = new ArrayList<>();
        for (RunMeans m : simulated) {
            Run run = campaign.run(m.runId()).orElseThrow();
            Map<String, Estimate> means = new LinkedHashMap<>();
            m.mean()
                    .forEach((channel, value) -> means.put(
                            channel, Estimate.of(value, m.standardError().getOrDefault(channel, 0.0))));
            out.add(plateledger.reduce.RunMeans.balanced(
                    run,
                    means,
                    Estimate.of(m.plateSlopeKPerS(), m.plateSlopeStandardError()),
                    new double[0],
                    SPACING_S * out.size()));
        }
        return out;
    }
}
