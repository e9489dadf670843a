package plateledger.gui.model;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import plateledger.finding.Finding;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.RunResult;
import plateledger.reduce.RunState;

/**
 * Holds the state of one window and tells observers of each change. Not safe for several threads: one thread (the event
 * thread, in the program) calls it.
 */
public final class WindowModel {
    private final List<Consumer<WindowState>> observers = new ArrayList<>();
    private WindowState state = WindowState.EMPTY;

    /** The state now. */
    public WindowState state() {
        return state;
    }

    /** Tells the observer the state now and after each change. */
    public void observe(Consumer<WindowState> observer) {
        observers.add(observer);
        observer.accept(state);
    }

    /** A reduction of a campaign has begun; what is shown stays, as a former result. */
    public void started(Path folder) {
        replace(new WindowState(
                state.shown(),
                Freshness.FORMER,
                state.chosenRun(),
                state.findingScope(),
                new Activity.Working(folder, "starting", 0.0, false),
                Optional.empty()));
    }

    /** The reduction has got so far; ignored when none runs. */
    public void progressed(String what, double fraction) {
        if (state.activity() instanceof Activity.Working working) {
            double within = Math.max(0.0, Math.min(1.0, fraction));
            activity(new Activity.Working(working.folder(), what, within, working.stopping()));
        }
    }

    /** The reduction was asked to stop and has not stopped yet. */
    public void stopping() {
        if (state.activity() instanceof Activity.Working working) {
            activity(new Activity.Working(working.folder(), working.what(), working.fraction(), true));
        }
    }

    /** The reduction is done. The chosen run stays chosen if the new result has it. */
    public void finished(Path folder, CampaignResult result) {
        Optional<String> keep = state.chosenRun().filter(id -> result.run(id).isPresent());
        replace(new WindowState(
                Optional.of(new WindowState.Shown(folder, result, state.revision() + 1)),
                Freshness.CURRENT,
                keep.or(() -> firstWorthShowing(result)),
                state.findingScope(),
                new Activity.Idle(),
                Optional.empty()));
    }

    /** The campaign cannot be used; what was shown before stays. */
    public void refused(Path folder, List<Finding> findings) {
        String heading = "%s was not reduced: %s"
                .formatted(nameOf(folder), findings.size() == 1 ? "one finding" : findings.size() + " findings");
        ended(folder, Optional.of(new Notice(heading, whatIsShown(folder), findings)));
    }

    /** The program failed; what was shown before stays. */
    public void failed(Path folder, String message) {
        String heading = "A fault in the program stopped the reduction of " + nameOf(folder);
        String kept = whatIsShown(folder);
        ended(folder, Optional.of(new Notice(heading, kept.isEmpty() ? message : message + "\n" + kept, List.of())));
    }

    /** The reduction stopped as asked; what was shown before stays. */
    public void stopped(Path folder) {
        ended(
                folder,
                Optional.of(new Notice(
                        "The reduction of " + nameOf(folder) + " was stopped", whatIsShown(folder), List.of())));
    }

    /** Tells something that changes nothing else. */
    public void tell(Notice notice) {
        replace(new WindowState(
                state.shown(),
                state.freshness(),
                state.chosenRun(),
                state.findingScope(),
                state.activity(),
                Optional.of(notice)));
    }

    /** Puts the notice away. */
    public void dismissNotice() {
        replace(new WindowState(
                state.shown(),
                state.freshness(),
                state.chosenRun(),
                state.findingScope(),
                state.activity(),
                Optional.empty()));
    }

    /** Chooses a run; ignored if the result has no such run or it is chosen already. */
    public void choose(String runId) {
        boolean known =
                state.shown().filter(s -> s.result().run(runId).isPresent()).isPresent();
        if (known && !state.chosenRun().equals(Optional.of(runId))) {
            replace(new WindowState(
                    state.shown(),
                    state.freshness(),
                    Optional.of(runId),
                    state.findingScope(),
                    state.activity(),
                    state.notice()));
        }
    }

    /** Chooses which findings are listed. */
    public void listFindings(FindingScope scope) {
        if (scope != state.findingScope()) {
            replace(new WindowState(
                    state.shown(), state.freshness(), state.chosenRun(), scope, state.activity(), state.notice()));
        }
    }

    private void ended(Path folder, Optional<Notice> notice) {
        boolean same = isShown(folder);
        replace(new WindowState(
                state.shown(),
                same ? Freshness.FORMER : Freshness.CURRENT,
                state.chosenRun(),
                state.findingScope(),
                new Activity.Idle(),
                notice));
    }

    private boolean isShown(Path folder) {
        return state.shown().filter(s -> s.folder().equals(folder)).isPresent();
    }

    private String whatIsShown(Path folder) {
        if (state.shown().isEmpty()) {
            return "";
        }
        return isShown(folder)
                ? "What is shown is the former result of this campaign."
                : "What is shown is still " + nameOf(state.shown().get().folder()) + ".";
    }

    private static String nameOf(Path folder) {
        Path name = folder.getFileName();
        return name == null ? folder.toString() : name.toString();
    }

    private static Optional<String> firstWorthShowing(CampaignResult result) {
        return result.runs().stream()
                .filter(run -> run.state() == RunState.REDUCED && run.values().isPresent())
                .findFirst()
                .or(() -> result.runs().stream().findFirst())
                .map((RunResult run) -> run.run().id());
    }

    private void activity(Activity activity) {
        replace(new WindowState(
                state.shown(), state.freshness(), state.chosenRun(), state.findingScope(), activity, state.notice()));
    }

    private void replace(WindowState next) {
        state = next;
        for (Consumer<WindowState> observer : List.copyOf(observers)) {
            observer.accept(next);
        }
    }
}
