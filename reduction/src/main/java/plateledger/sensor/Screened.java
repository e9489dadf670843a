package plateledger.sensor;

import java.util.List;
import plateledger.finding.Finding;
import plateledger.log.Series;

/**
 * A series after screening.
 *
 * @param series the same values with flags set where a value must not be used
 * @param findings what was flagged, one finding per kind with its first line and count
 */
public record Screened(Series series, List<Finding> findings) {
    /** Copies the list. */
    public Screened {
        findings = List.copyOf(findings);
    }
}
