package plateledger.sensor;

import java.util.Arrays;
import plateledger.log.Series;

/**
 * The Hampel identifier: a value is a spike if it differs from the median of its window by more than t₀ · 1.4826 · MAD.
 * Window ±10 samples and t₀ = 5 flag about 0.07 % of white Gaussian noise. The MAD is floored at half a step of the
 * reading, else quantised signals would flag every change, and at the channel's own median MAD, since the MAD of 21 values
 * is now and then small by chance: that alone would flag a dozen good readings in a day. A flagged stretch longer than half a window is a step, no spike, and so
 * is one that lies between the levels before and after it.
 * (Hampel, J. Am. Stat. Assoc. 69 (1974) 383, from memory; window and limit are common practice.)
 */
final class Hampel {
    private static final int HALF_WINDOW = 10;
    private static final double LIMIT = 5.0;
    private static final double MAD_TO_SIGMA = 1.4826; // 1/Φ⁻¹(3/4)

    private Hampel() {}

    /**
     * Indices of the spikes among the valid values.
     *
     * @param values readings
     * @param flags flags of the readings; only {@link Series.Flag#VALID} ones are looked at
     * @param step one step of the reading, same unit, 0 if none
     */
    static int[] spikes(double[] values, byte[] flags, double step) {
        int[] at = new int[values.length];
        int n = 0;
        for (int i = 0; i < values.length; i++) {
            if (flags[i] == Series.Flag.VALID.code()) {
                at[n++] = i;
            }
        }
        double[] x = new double[n];
        for (int i = 0; i < n; i++) {
            x[i] = values[at[i]] + 0.0; // -0.0 becomes 0.0, which a binary search tells apart
        }
        boolean[] flagged = flagged(x, step);
        int[] spikes = new int[n];
        int count = 0;
        int i = 0;
        while (i < n) {
            int end = i;
            while (end < n && flagged[end]) {
                end++;
            }
            if (end > i && end - i <= HALF_WINDOW && !isEdge(x, i, end)) {
                for (int j = i; j < end; j++) {
                    spikes[count++] = at[j];
                }
            }
            i = Math.max(end, i + 1);
        }
        return Arrays.copyOf(spikes, count);
    }

    /**
     * True if the stretch leads from the level before it to the level after it (a supply switched on), or stands at an end of
     * the log, where a spike cannot be told from a step.
     */
    private static boolean isEdge(double[] x, int from, int to) {
        if (from == 0 || to == x.length) {
            return true;
        }
        double before = middle(x, Math.max(0, from - 3), from);
        double after = middle(x, to, Math.min(x.length, to + 3));
        for (int i = from; i < to; i++) {
            if (x[i] < Math.min(before, after) || x[i] > Math.max(before, after)) {
                return false;
            }
        }
        return true;
    }

    private static double middle(double[] x, int from, int to) {
        double[] part = Arrays.copyOfRange(x, from, to);
        Arrays.sort(part);
        return part[part.length / 2];
    }

    /** Walks a sorted window along the values: one value leaves, one enters, the median is read off. */
    private static boolean[] flagged(double[] x, double step) {
        int n = x.length;
        boolean[] flagged = new boolean[n];
        if (n <= 2 * HALF_WINDOW) {
            return flagged;
        }
        double[] sorted = new double[2 * HALF_WINDOW + 1];
        int size = 0;
        for (int i = 0; i < HALF_WINDOW; i++) {
            size = insert(sorted, size, x[i]);
        }
        double[] medians = new double[n];
        double[] mads = new double[n];
        for (int i = 0; i < n; i++) {
            if (i > HALF_WINDOW) {
                size = remove(sorted, size, x[i - HALF_WINDOW - 1]);
            }
            if (i + HALF_WINDOW < n) {
                size = insert(sorted, size, x[i + HALF_WINDOW]);
            }
            double median = size % 2 == 1 ? sorted[size / 2] : (sorted[size / 2 - 1] + sorted[size / 2]) / 2.0;
            medians[i] = median;
            mads[i] = mad(sorted, size, median);
        }
        double[] ascending = mads.clone();
        Arrays.sort(ascending);
        double floor = Math.max(step / 2.0, ascending[n / 2]);
        for (int i = 0; i < n; i++) {
            flagged[i] = Math.abs(x[i] - medians[i]) > LIMIT * MAD_TO_SIGMA * Math.max(floor, mads[i]);
        }
        return flagged;
    }

    /** Median of the distances from the median: the distances ascend outwards from the middle on both sides. */
    private static double mad(double[] sorted, int size, double median) {
        int right = size / 2;
        int left = right - 1;
        double last = 0.0;
        double before = 0.0;
        for (int taken = 0; taken <= size / 2; taken++) {
            before = last;
            boolean fromLeft = right >= size || (left >= 0 && median - sorted[left] <= sorted[right] - median);
            last = fromLeft ? median - sorted[left--] : sorted[right++] - median;
        }
        return size % 2 == 1 ? last : (before + last) / 2.0;
    }

    private static int insert(double[] sorted, int size, double value) {
        int i = size;
        while (i > 0 && sorted[i - 1] > value) {
            sorted[i] = sorted[i - 1];
            i--;
        }
        sorted[i] = value;
        return size + 1;
    }

    private static int remove(double[] sorted, int size, double value) {
        int i = Arrays.binarySearch(sorted, 0, size, value);
        System.arraycopy(sorted, i + 1, sorted, i, size - i - 1);
        return size - 1;
    }
}
