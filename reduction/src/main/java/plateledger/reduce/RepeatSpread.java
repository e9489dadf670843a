package plateledger.reduce;

import java.util.List;

/**
 * Spread of Nu_L/Re_L^m within one repeated set point.
 *
 * @param plate panel
 * @param set set point
 * @param runs its runs
 * @param relativeSpread standard deviation of ln Nu_L within the set, slope removed
 * @param expectedSpread what the uncertainties predict of sources that do not move the repeats alike
 */
public record RepeatSpread(String plate, String set, List<String> runs, double relativeSpread, double expectedSpread) {
    /** Copies the list. */
    public RepeatSpread {
        runs = List.copyOf(runs);
    }
}
