package plateledger.gui.model;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import plateledger.finding.Level;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.RunState;

/**
 * The two lines at the top of the window.
 *
 * @param title the campaign's title
 * @param status where it lies, how many runs are reduced, how many findings of each level
 */
public record Headline(String title, String status) {
    /** The headline for a state. */
    public static Headline of(WindowState state) {
        if (state.shown().isEmpty()) {
            return new Headline("No campaign open", "");
        }
        WindowState.Shown shown = state.shown().get();
        CampaignResult result = shown.result();
        List<String> parts = new ArrayList<>();
        if (state.freshness() == Freshness.FORMER) {
            parts.add("former result");
        }
        long reduced = result.runs().stream()
                .filter(run -> run.state() == RunState.REDUCED)
                .count();
        parts.add("%d of %d runs reduced".formatted(reduced, result.runs().size()));
        for (Level level : Level.values()) {
            long count =
                    result.findings().stream().filter(f -> f.level() == level).count();
            if (count > 0) {
                parts.add("%d %s".formatted(count, level.word()).toLowerCase(Locale.ROOT));
            }
        }
        parts.add(shown.folder().toString());
        return new Headline(result.campaign().title(), String.join(" · ", parts));
    }
}
