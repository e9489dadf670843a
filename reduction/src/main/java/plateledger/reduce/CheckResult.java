package plateledger.reduce;

import java.util.List;
import plateledger.campaign.Campaign;
import plateledger.finding.Finding;
import plateledger.log.LogData;

/**
 * What a check without reduction came to.
 *
 * @param campaign the campaign as declared
 * @param logs the logs read
 * @param findings all findings, sorted
 */
public record CheckResult(Campaign campaign, List<LogData> logs, List<Finding> findings) {
    /** Copies and sorts. */
    public CheckResult {
        logs = List.copyOf(logs);
        findings = findings.stream().sorted(Finding.ORDER).toList();
    }
}
