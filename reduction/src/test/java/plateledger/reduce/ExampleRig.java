package plateledger.reduce;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plateledger.campaign.Campaign;
import plateledger.campaign.CampaignReader;
import plateledger.campaign.Regime;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.finding.Place;
import plateledger.finding.RefusedException;
import plateledger.quantity.Estimate;

/** The example campaign of the readers, and runs on its rig with means given by hand. */
final class ExampleRig {
    static final String DAY = "2026-03-10";

    private ExampleRig() {}

    static Campaign campaign() throws RefusedException {
        return CampaignReader.read(Path.of("src/test/resources/plateledger/campaign/example"))
                .campaign();
    }

    static Run run(String id, RunType type, String day, double speed) {
        return new Run(
                id,
                type,
                day,
                "baseline",
                Regime.LAMINAR,
                Optional.empty(),
                speed,
                40.0,
                "",
                Map.of("plate", "logs/" + id + ".txt"),
                Optional.empty(),
                Optional.empty(),
                "",
                new Place("campaign.toml", 7, 1));
    }

    /** Means of channels, exact. */
    static RunMeans means(Run run, double middleS, Map<String, Double> values) {
        Map<String, Estimate> means = new LinkedHashMap<>();
        values.forEach((channel, value) -> means.put(channel, Estimate.of(value, 0.0)));
        return RunMeans.balanced(run, means, Estimate.of(0.0, 0.0), new double[0], middleS);
    }

    /** The same with other channels or other values for some. */
    static Map<String, Double> with(Map<String, Double> values, Map<String, Double> changed) {
        Map<String, Double> all = new LinkedHashMap<>(values);
        all.putAll(changed);
        return all;
    }

    /** Without some channels. */
    static Map<String, Double> without(Map<String, Double> values, List<String> channels) {
        Map<String, Double> all = new LinkedHashMap<>(values);
        channels.forEach(all::remove);
        return all;
    }
}
