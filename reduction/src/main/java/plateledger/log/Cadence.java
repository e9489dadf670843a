package plateledger.log;

import java.util.Arrays;

/**
 * The rhythm of a log.
 *
 * @param intervalS median step between different stamps, s
 * @param gaps steps longer than three median steps
 * @param longestGapS the longest of them, s; 0 if there is none
 * @param firstGap index of the first sample after a gap; -1 if there is none
 */
record Cadence(double intervalS, int gaps, double longestGapS, int firstGap) {
    private static final double GAP_STEPS = 3.0;

    /** The rhythm of ascending times of which at least two differ; repeated stamps are spread first, in place. */
    static Cadence of(double[] times) {
        double median = medianStep(times);
        spread(times, median);
        int gaps = 0;
        int first = -1;
        double longest = 0.0;
        for (int i = 1; i < times.length; i++) {
            double step = times[i] - times[i - 1];
            if (step > GAP_STEPS * median) {
                first = gaps++ == 0 ? i : first;
                longest = Math.max(longest, step);
            }
        }
        return new Cadence(medianStep(times), gaps, longest, first);
    }

    private static double medianStep(double[] times) {
        double[] steps = new double[times.length];
        int n = 0;
        for (int i = 1; i < times.length; i++) {
            double step = times[i] - times[i - 1];
            if (step > 0.0) {
                steps[n++] = step;
            }
        }
        double[] used = Arrays.copyOf(steps, n);
        Arrays.sort(used);
        return n == 0 ? Double.NaN : used[n / 2];
    }

    /** Samples that share a stamp (a clock coarser than the sampling) are spread evenly up to the next stamp. */
    private static void spread(double[] times, double median) {
        int start = 0;
        while (start < times.length) {
            int end = start + 1;
            while (end < times.length && times[end] == times[start]) {
                end++;
            }
            int same = end - start;
            if (same > 1) {
                double room = end < times.length ? Math.min(times[end] - times[start], median) : median;
                double base = times[start];
                for (int i = 1; i < same; i++) {
                    times[start + i] = base + room * i / same;
                }
            }
            start = end;
        }
    }
}
