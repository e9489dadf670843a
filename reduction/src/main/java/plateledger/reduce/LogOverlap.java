package plateledger.reduce;

import java.time.Instant;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.Collection;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Collectors;
import plateledger.campaign.Run;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.log.Series;

/** Whether the logs of a run share a stretch of time; without one no moment has every channel. */
final class LogOverlap {
    private static final DateTimeFormatter SECOND = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm:ss", Locale.ROOT);

    /** True times of a file's first and last row, s. */
    private record Span(double startS, double endS) {}

    private LogOverlap() {}

    /**
     * The finding, if there is no common stretch.
     *
     * @param run the run
     * @param series the channels read, on true time; those that a run does not need serve its safety checks
     * @param zone zone to print times in
     */
    static Optional<Finding> missing(Run run, Collection<Series> series, ZoneId zone) {
        Map<String, Span> spans = new TreeMap<>();
        for (Series s : series) {
            if (s.size() > 0) {
                spans.put(s.file(), new Span(s.timesS()[0], s.timesS()[s.size() - 1]));
            }
        }
        double start = spans.values().stream().mapToDouble(Span::startS).max().orElse(0.0);
        double end = spans.values().stream().mapToDouble(Span::endS).min().orElse(0.0);
        if (spans.size() < 2 || start < end) {
            return Optional.empty();
        }
        String found = spans.entrySet().stream()
                .map(e -> e.getKey() + " from " + text(e.getValue().startS(), zone) + " to "
                        + text(e.getValue().endS(), zone))
                .collect(Collectors.joining(", "));
        return Optional.of(new Finding(
                "LOG-NO-OVERLAP",
                Level.STOP,
                run.place(),
                "run " + run.id(),
                "no overlap between loggers: " + found + " (" + zone + ", clocks corrected as declared)",
                "a stretch of time that all logs of a run share",
                "Check that each file belongs to this run, and zone, clock_offset and start time of its logger; or leave"
                        + " the run out with left_out.",
                ""));
    }

    private static String text(double epochS, ZoneId zone) {
        return SECOND.format(Instant.ofEpochSecond(Math.round(epochS)).atZone(zone));
    }
}
