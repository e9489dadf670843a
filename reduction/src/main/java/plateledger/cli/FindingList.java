package plateledger.cli;

import java.io.PrintWriter;
import java.util.List;
import plateledger.finding.Finding;
import plateledger.finding.Level;

/** Findings as text for a terminal, gravest first. */
final class FindingList {
    private FindingList() {}

    /** Prints every finding under the word of its level. */
    static void print(PrintWriter to, List<Finding> findings) {
        List<Finding> sorted = findings.stream().sorted(Finding.ORDER).toList();
        for (Level level : Level.values()) {
            List<Finding> some = sorted.stream().filter(f -> f.level() == level).toList();
            if (some.isEmpty()) {
                continue;
            }
            to.println(level.word() + " (" + some.size() + ")");
            for (Finding finding : some) {
                to.println(
                        "  " + finding.message() + (finding.source().isEmpty() ? "" : " [" + finding.source() + "]"));
            }
        }
        if (sorted.isEmpty()) {
            to.println("No findings.");
        }
        to.flush();
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

    /** True if one of them is a stop. */
    static boolean anyStop(List<Finding> findings) {
        return findings.stream().anyMatch(f -> f.level() == Level.STOP);
    }
}
