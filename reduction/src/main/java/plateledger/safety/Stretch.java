package plateledger.safety;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * A stretch of true time.
 *
 * @param fromS start, s since 1970-01-01T00:00Z
 * @param toS end, s
 */
record Stretch(double fromS, double toS) {
    double durationS() {
        return toS - fromS;
    }

    /** What two lists of stretches, each ascending and without overlap, have in common. */
    static List<Stretch> common(List<Stretch> first, List<Stretch> second) {
        List<Stretch> found = new ArrayList<>();
        int i = 0;
        int j = 0;
        while (i < first.size() && j < second.size()) {
            double from = Math.max(first.get(i).fromS(), second.get(j).fromS());
            double to = Math.min(first.get(i).toS(), second.get(j).toS());
            if (from < to) {
                found.add(new Stretch(from, to));
            }
            if (first.get(i).toS() < second.get(j).toS()) {
                i++;
            } else {
                j++;
            }
        }
        return found;
    }

    /** The stretches over which a condition holds at sample after sample, from its first to its last sample. */
    static List<Stretch> where(double[] timesS, boolean[] holds) {
        List<Stretch> found = new ArrayList<>();
        int start = -1;
        for (int i = 0; i <= holds.length; i++) {
            boolean now = i < holds.length && holds[i];
            if (now && start < 0) {
                start = i;
            } else if (!now && start >= 0) {
                found.add(new Stretch(timesS[start], timesS[i - 1]));
                start = -1;
            }
        }
        return found;
    }

    /** The longest stretch at least that long. */
    static Optional<Stretch> longest(List<Stretch> stretches, double aboveS) {
        return stretches.stream()
                .filter(stretch -> stretch.durationS() > aboveS)
                .max(Comparator.comparingDouble(Stretch::durationS));
    }
}
