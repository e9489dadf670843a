package plateledger.steady;

import java.util.List;
import java.util.Optional;

/**
 * Result of the search for a steady window.
 *
 * @param window the window; empty if there is none
 * @param bestAttempt evidence of the window found or, where there is none, of the last window of minimum length
 * @param reason why there is no window, in words; empty if there is one
 */
public record WindowOutcome(Optional<SteadyWindow> window, List<Evidence> bestAttempt, String reason) {
    /** Copies the list. */
    public WindowOutcome {
        bestAttempt = List.copyOf(bestAttempt);
    }
}
