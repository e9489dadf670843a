package plateledger.reduce;

import java.util.Set;

/**
 * Choices of one call that are not part of the campaign.
 *
 * @param runs heated runs to reduce; empty for all (zeros and loss runs are always used)
 * @param threads number of threads, at least 1; the result does not depend on it
 */
public record ReductionOptions(Set<String> runs, int threads) {
    /** Copies the set. */
    public ReductionOptions {
        runs = Set.copyOf(runs);
        if (threads < 1) {
            throw new IllegalArgumentException("threads must be at least 1, found " + threads);
        }
    }

    /** All runs, as many threads as there are processors. */
    public static ReductionOptions all() {
        return new ReductionOptions(Set.of(), Math.max(1, Runtime.getRuntime().availableProcessors()));
    }

    /** The same for some runs. */
    public ReductionOptions only(Set<String> some) {
        return new ReductionOptions(some, threads);
    }
}
