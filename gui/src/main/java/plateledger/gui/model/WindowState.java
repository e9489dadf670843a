package plateledger.gui.model;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import plateledger.finding.Finding;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.RunResult;

/**
 * All that the window shows at one moment.
 *
 * @param shown the campaign shown; empty before the first one
 * @param freshness whether its result is of the last reading
 * @param chosenRun id of the chosen run
 * @param findingScope which findings are listed
 * @param activity what is being done
 * @param notice what the person must be told
 */
public record WindowState(
        Optional<Shown> shown,
        Freshness freshness,
        Optional<String> chosenRun,
        FindingScope findingScope,
        Activity activity,
        Optional<Notice> notice) {

    /** Nothing opened yet. */
    public static final WindowState EMPTY = new WindowState(
            Optional.empty(),
            Freshness.CURRENT,
            Optional.empty(),
            FindingScope.CHOSEN_RUN,
            new Activity.Idle(),
            Optional.empty());

    /**
     * A campaign and what its reduction came to.
     *
     * @param folder campaign folder
     * @param result its result
     * @param revision counts the results that a window has shown, so that views know a new one from the same one
     */
    public record Shown(Path folder, CampaignResult result, long revision) {}

    /** Revision of the result shown; 0 before the first one. */
    public long revision() {
        return shown.map(Shown::revision).orElse(0L);
    }

    /** The chosen run's result. */
    public Optional<RunResult> chosen() {
        return shown.flatMap(s -> chosenRun.flatMap(s.result()::run));
    }

    /** The findings to list, gravest first. */
    public List<Finding> findings() {
        if (shown.isEmpty()) {
            return List.of();
        }
        List<Finding> all = shown.get().result().findings();
        if (findingScope == FindingScope.CAMPAIGN) {
            return all;
        }
        return chosen().map(run -> RunFindings.of(run.run(), all)).orElse(List.of());
    }

    /** True if a campaign can be reduced again. */
    public boolean canReduceAgain() {
        return shown.isPresent() && !activity.busy();
    }

    /** True if there is work that can be told to stop. */
    public boolean canStop() {
        return activity instanceof Activity.Working working && !working.stopping();
    }
}
