package plateledger.cli;

import java.io.PrintWriter;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import plateledger.finding.Finding;
import plateledger.finding.Level;

/**
 * Findings as text for a terminal, gravest first. Folded, a kind that repeats over many channels or runs shows its first
 * findings and how many more there are; findings at stop are always shown each.
 */
final class FindingList {
    /** Findings of one kind shown in full before the rest is counted. */
    private static final int SHOWN_OF_A_KIND = 3;

    /** Places named of those counted. */
    private static final int PLACES_SHOWN = 5;

    /** Folding one line into one line helps nobody. */
    private static final int FOLDED_FROM = SHOWN_OF_A_KIND + 2;

    private final boolean folded;
    private final String whereAll;

    private FindingList(boolean folded, String whereAll) {
        this.folded = folded;
        this.whereAll = whereAll;
    }

    /** Shows every finding. */
    static FindingList full() {
        return new FindingList(false, "");
    }

    /**
     * Folds what repeats.
     *
     * @param whereAll where each can be seen, e.g. {@code all in findings.csv}
     */
    static FindingList folded(String whereAll) {
        return new FindingList(true, whereAll);
    }

    /** Prints the findings under the word of their level. */
    void print(PrintWriter to, List<Finding> findings) {
        List<Finding> sorted = findings.stream().sorted(Finding.ORDER).toList();
        for (Level level : Level.values()) {
            List<Finding> some = sorted.stream().filter(f -> f.level() == level).toList();
            if (some.isEmpty()) {
                continue;
            }
            to.println(level.word() + " (" + some.size() + ")");
            Map<String, List<Finding>> kinds =
                    some.stream().collect(Collectors.groupingBy(Finding::id, LinkedHashMap::new, Collectors.toList()));
            kinds.values().forEach(kind -> print(to, level, kind));
        }
        if (sorted.isEmpty()) {
            to.println("No findings.");
        }
        to.flush();
    }

    private void print(PrintWriter to, Level level, List<Finding> kind) {
        boolean fold = folded && level != Level.STOP && kind.size() >= FOLDED_FROM;
        List<Finding> shown = fold ? kind.subList(0, SHOWN_OF_A_KIND) : kind;
        shown.forEach(finding -> to.println("  " + line(finding)));
        if (fold) {
            to.println("  … and " + rest(kind.subList(SHOWN_OF_A_KIND, kind.size())) + " (" + whereAll + ")");
        }
    }

    /** How many more, and the first places. */
    private static String rest(List<Finding> more) {
        List<String> places = more.stream()
                .map(finding -> finding.place().toString())
                .filter(place -> !place.isEmpty())
                .distinct()
                .limit(PLACES_SHOWN)
                .toList();
        String dots = places.size() < more.size() ? ", …" : "";
        return more.size() + " more of this kind" + (places.isEmpty() ? "" : ": " + String.join(", ", places) + dots);
    }

    private static String line(Finding finding) {
        return finding.message() + (finding.source().isEmpty() ? "" : " [" + finding.source() + "]");
    }

    /** How many of each level, in one line. */
    static String counts(List<Finding> findings) {
        StringBuilder text = new StringBuilder();
        for (Level level : Level.values()) {
            long n = findings.stream().filter(f -> f.level() == level).count();
            text.append(text.isEmpty() ? "" : ", ").append(n).append(' ').append(level.word());
        }
        return text.toString();
    }

    /** Those at stop. */
    static List<Finding> stops(List<Finding> findings) {
        return findings.stream().filter(f -> f.level() == Level.STOP).toList();
    }

    /** True if one of them is a stop. */
    static boolean anyStop(List<Finding> findings) {
        return !stops(findings).isEmpty();
    }
}
