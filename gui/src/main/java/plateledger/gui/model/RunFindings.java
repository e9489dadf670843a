package plateledger.gui.model;

import java.util.List;
import java.util.regex.Pattern;
import plateledger.campaign.Run;
import plateledger.finding.Finding;

/** Which findings belong to one run: those about it by name, and those that lie in one of its logs. */
public final class RunFindings {
    private RunFindings() {}

    /** The findings of a list that belong to a run, in the list's order. */
    public static List<Finding> of(Run run, List<Finding> all) {
        // The run's id as a word of its own: R1 must not catch R10 or R1-b.
        Pattern word = Pattern.compile("(?<![\\p{L}\\p{N}_-])" + Pattern.quote(run.id()) + "(?![\\p{L}\\p{N}_-])");
        return all.stream()
                .filter(finding -> run.logs().containsValue(finding.place().file())
                        || word.matcher(finding.subject()).find())
                .toList();
    }
}
