package plateledger.gui.model;

import java.util.List;
import plateledger.finding.Finding;

/**
 * Something the person must be told, shown in the window until it is put away.
 *
 * @param heading one line: what happened
 * @param text what it means for what is shown; may be empty
 * @param findings why, in order of gravity; empty where there are none
 */
public record Notice(String heading, String text, List<Finding> findings) {
    /** Copies and sorts the findings. */
    public Notice {
        findings = findings.stream().sorted(Finding.ORDER).toList();
    }

    /** The whole notice as plain text, for reading and copying. */
    public String body() {
        StringBuilder all = new StringBuilder(text);
        for (Finding finding : findings) {
            if (!all.isEmpty()) {
                all.append("\n\n");
            }
            all.append(finding.level().word()).append(": ").append(finding.message());
        }
        return all.toString();
    }
}
