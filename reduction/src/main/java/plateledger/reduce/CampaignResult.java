package plateledger.reduce;

import java.util.List;
import java.util.Optional;
import plateledger.campaign.Campaign;
import plateledger.finding.Finding;
import plateledger.fit.FitResult;
import plateledger.log.LogData;

/**
 * All that a reduction came to.
 *
 * @param campaign the campaign as declared
 * @param logs the logs read, in campaign order
 * @param runs every run, in campaign order
 * @param losses loss calibration per panel
 * @param fits the fits asked for
 * @param repeats spread within repeated set points
 * @param findings all findings, sorted
 */
public record CampaignResult(
        Campaign campaign,
        List<LogData> logs,
        List<RunResult> runs,
        List<LossResult> losses,
        List<FitResult> fits,
        List<RepeatSpread> repeats,
        List<Finding> findings) {
    /** Copies the lists. */
    public CampaignResult {
        logs = List.copyOf(logs);
        runs = List.copyOf(runs);
        losses = List.copyOf(losses);
        fits = List.copyOf(fits);
        repeats = List.copyOf(repeats);
        findings = findings.stream().sorted(Finding.ORDER).toList();
    }

    /** The result of a run. */
    public Optional<RunResult> run(String id) {
        return runs.stream().filter(r -> r.run().id().equals(id)).findFirst();
    }
}
