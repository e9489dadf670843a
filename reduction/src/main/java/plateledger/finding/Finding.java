package plateledger.finding;

import java.util.Comparator;

/**
 * One thing that is wrong or doubtful.
 *
 * @param id short stable identifier in capitals, e.g. {@code LOG-STUCK}
 * @param level how grave
 * @param place where
 * @param subject what it is about: a run, a channel, a key
 * @param found what was found, with unit
 * @param expected what was expected, with unit
 * @param remedy what to do
 * @param source the published limit or rule behind the check; empty where the rule is the tool's own
 */
public record Finding(
        String id,
        Level level,
        Place place,
        String subject,
        String found,
        String expected,
        String remedy,
        String source) {

    /** Gravest first, then by place and subject, so that a list is the same on every machine. */
    public static final Comparator<Finding> ORDER = Comparator.comparing(Finding::level)
            .thenComparing(finding -> finding.place().file())
            .thenComparingLong(finding -> finding.place().line())
            .thenComparing(Finding::id)
            .thenComparing(Finding::subject)
            .thenComparing(Finding::found);

    /** One line for a terminal: place, subject, found, expected, remedy. */
    public String message() {
        String where = place.file().isEmpty() ? "" : place + ": ";
        String want = expected.isEmpty() ? "" : "; expected " + expected;
        String act = remedy.isEmpty() ? "" : ". " + remedy;
        return where + subject + ": found " + found + want + act;
    }
}
