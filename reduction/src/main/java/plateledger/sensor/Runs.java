package plateledger.sensor;

import java.util.Arrays;
import plateledger.log.Series;

/**
 * Runs of equal consecutive valid readings of one channel, and what they say about its noise. A gap in validity ends no
 * run, but invalid samples do not count.
 */
final class Runs {
    /** No run shorter than this is ever called stuck. */
    static final int SHORTEST = 10;

    /** Blocks over which the range of the readings tells whether noise is seen through the resolution. */
    private static final int BLOCK = 20;
    /** With noise of half a step or more a block of 20 readings spans at least two steps. */
    private static final double RESOLVED_STEPS = 1.5;
    /** A run so long by chance is expected less than once in a thousand logs. */
    private static final double CHANCE = 1e-3;
    /** Allowance for noise that is correlated or sits in the middle of a step. */
    private static final double ALLOWANCE = 1.5;

    private final int[] starts;
    private final int[] ends;
    private final int[] lengths;
    private final int count;
    private final int samples;
    private final double step;
    private final double[] values;
    private final byte[] flags;

    private Runs(double[] values, byte[] flags, double step) {
        this.values = values;
        this.flags = flags;
        int n = values.length;
        int[] s = new int[n];
        int[] e = new int[n];
        int[] l = new int[n];
        int runs = 0;
        int valid = 0;
        double smallest = Double.POSITIVE_INFINITY;
        double last = Double.NaN;
        for (int i = 0; i < n; i++) {
            if (flags[i] != Series.Flag.VALID.code()) {
                continue;
            }
            valid++;
            if (values[i] == last) {
                l[runs - 1]++;
            } else {
                smallest = Math.min(smallest, runs == 0 ? smallest : Math.abs(values[i] - last));
                s[runs] = i;
                l[runs] = 1;
                runs++;
                last = values[i];
            }
            e[runs - 1] = i + 1;
        }
        starts = Arrays.copyOf(s, runs);
        ends = Arrays.copyOf(e, runs);
        lengths = Arrays.copyOf(l, runs);
        count = runs;
        samples = valid;
        this.step = Math.max(step, Double.isInfinite(smallest) ? 0.0 : smallest);
    }

    static Runs of(Series series, double resolution) {
        return new Runs(series.values(), series.flags(), resolution);
    }

    int count() {
        return count;
    }

    /** Index of the first sample of a run. */
    int start(int run) {
        return starts[run];
    }

    /** Index after the last sample of a run. */
    int end(int run) {
        return ends[run];
    }

    /** Valid samples in a run. */
    int length(int run) {
        return lengths[run];
    }

    /** Valid samples of the channel. */
    int samples() {
        return samples;
    }

    /** One step of the reading: the resolution, or the smallest change seen if that is coarser. */
    double step() {
        return step;
    }

    boolean singleValue() {
        return count == 1 && samples >= SHORTEST;
    }

    int longest() {
        int longest = 0;
        for (int l : lengths) {
            longest = Math.max(longest, l);
        }
        return longest;
    }

    /**
     * The run length from which a stretch is stuck, judged by the channel's other runs: with a mean run of m readings, runs
     * of L happen with probability (1 − 1/m)^(L−1). {@link Integer#MAX_VALUE} where the noise is hidden by the resolution or
     * too little is left to judge by.
     */
    int ownLimit() {
        int limit = Integer.MAX_VALUE;
        for (int pass = 0; pass < 3; pass++) { // each pass leaves out what the pass before called stuck
            int next = limitWithout(limit);
            if (next == limit) {
                break;
            }
            limit = next;
        }
        return limit != Integer.MAX_VALUE && noiseSeen(0, values.length, limit) ? limit : Integer.MAX_VALUE;
    }

    private int limitWithout(int stuckFrom) {
        int[] rest = Arrays.stream(lengths).filter(l -> l < stuckFrom).sorted().toArray();
        if (rest.length < 2 * BLOCK) {
            return Integer.MAX_VALUE;
        }
        // The longest hundredth is left out too, or one stuck stretch would hide itself in the mean.
        int kept = rest.length - Math.max(1, rest.length / 100);
        double sum = 0.0;
        for (int i = 0; i < kept; i++) {
            sum += rest[i];
        }
        double stay = Math.max(0.5, 1.0 - kept / sum);
        double length = 1.0 + Math.log(CHANCE / rest.length) / Math.log(stay);
        return (int) Math.max(SHORTEST, Math.ceil(ALLOWANCE * length));
    }

    /** True if noise is seen through the resolution over the whole log. */
    boolean noiseSeen() {
        return noiseSeen(0, values.length, Integer.MAX_VALUE);
    }

    /**
     * True if noise is seen through the resolution in a part of the log: the median range of blocks spans two steps.
     *
     * @param from first index
     * @param to index after the last
     * @param stuckFrom runs of this length or more are left out
     */
    boolean noiseSeen(int from, int to, int stuckFrom) {
        if (!(step > 0.0)) {
            return false;
        }
        double[] ranges = new double[samples / BLOCK + 1];
        int blocks = 0;
        int n = 0;
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int r = 0; r < count; r++) {
            if (lengths[r] >= stuckFrom || starts[r] >= to || ends[r] <= from) {
                continue;
            }
            for (int i = Math.max(starts[r], from); i < Math.min(ends[r], to); i++) {
                if (flags[i] != Series.Flag.VALID.code()) {
                    continue;
                }
                low = Math.min(low, values[i]);
                high = Math.max(high, values[i]);
                if (++n == BLOCK) {
                    ranges[blocks++] = high - low;
                    n = 0;
                    low = Double.POSITIVE_INFINITY;
                    high = Double.NEGATIVE_INFINITY;
                }
            }
        }
        if (blocks == 0) {
            return n >= SHORTEST && high - low > RESOLVED_STEPS * step;
        }
        Arrays.sort(ranges, 0, blocks);
        return ranges[blocks / 2] > RESOLVED_STEPS * step;
    }
}
