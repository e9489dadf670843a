package plateledger.sensor;

import java.util.ArrayList;
import java.util.List;

/**
 * What the other channels of an instrument do, to judge one of them by. A stretch of equal readings has no variance at all,
 * so it lies below a hundredth of the others' variance as soon as their noise is seen there.
 */
final class Like {
    /** No other channels. */
    static final Like NONE = new Like(List.of());

    private static final int FEWEST = 3;
    /** A stuck run is at least so many times the longest run of healthy channels. */
    private static final int TIMES_HEALTHY = 5;

    private final List<Runs> others;
    private final int limit;

    private Like(List<Runs> others) {
        this.others = others;
        int[] longest = others.stream().mapToInt(Runs::longest).sorted().toArray();
        int healthy = longest.length == 0 ? 0 : longest[(longest.length - 1) / 2];
        this.limit = Math.max(Runs.SHORTEST, TIMES_HEALTHY * healthy);
    }

    /** All of the channels but one, as far as their noise is seen at all. */
    static Like others(List<Runs> all, List<Boolean> noisy, int but) {
        List<Runs> others = new ArrayList<>();
        for (int i = 0; i < all.size(); i++) {
            if (i != but && noisy.get(i)) {
                others.add(all.get(i));
            }
        }
        return new Like(others);
    }

    /** True if there are enough others to judge by. */
    boolean decides() {
        return others.size() >= FEWEST;
    }

    /** Run length from which a stretch is stuck: five times the median of the others' longest runs. */
    int limit() {
        return limit;
    }

    /** True if most of the others vary visibly between two samples. */
    boolean othersVary(int from, int to) {
        long varying = others.stream()
                .filter(o -> o.noiseSeen(from, to, Integer.MAX_VALUE))
                .count();
        return 2 * varying > others.size();
    }
}
