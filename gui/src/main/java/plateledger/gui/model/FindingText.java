package plateledger.gui.model;

import plateledger.finding.Finding;

/** A finding in words. */
public final class FindingText {
    private FindingText() {}

    /** One line: level, subject, what was found. */
    public static String line(Finding finding) {
        return finding.level().word() + ": " + finding.subject() + ": " + finding.found();
    }

    /** All of it, a line for each part that is there. */
    public static String full(Finding finding) {
        StringBuilder text = new StringBuilder(finding.level().word() + ": " + finding.subject());
        part(text, "Found", finding.found());
        part(text, "Expected", finding.expected());
        part(text, "What to do", finding.remedy());
        part(text, "Where", finding.place().toString());
        part(text, "Source", finding.source());
        part(text, "Id", finding.id());
        return text.toString();
    }

    private static void part(StringBuilder text, String name, String value) {
        if (!value.isEmpty()) {
            text.append('\n').append(name).append(": ").append(value);
        }
    }
}
