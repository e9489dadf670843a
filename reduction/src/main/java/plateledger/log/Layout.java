package plateledger.log;

import java.time.ZoneId;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.finding.RefusedException;
import plateledger.quantity.Unit;

/**
 * Which column of a log is what.
 *
 * @param columns number of columns that have a title
 * @param timeColumn column of the time, from 0
 * @param stamps reader of the time cells
 * @param stores the channels
 * @param findings columns that could not be used
 */
record Layout(int columns, int timeColumn, StampReader stamps, List<ColumnStore> stores, List<Finding> findings) {

    static Layout of(TextScan scan, LogFormat format, ZoneId zone, Map<String, String> renamed)
            throws RefusedException {
        int line = format.headerLine();
        int data = line + (format.unitsRow() ? 1 : 0);
        if (line < 1 || scan.head().size() <= data) {
            throw scan.refused(
                    "LOG-FORMAT",
                    0,
                    0,
                    "log file",
                    scan.head().size() + " lines",
                    "column titles in line " + line + " and rows below",
                    "Correct header_line, or export the log again.");
        }
        List<String> titles = TextLine.split(scan.head().get(line - 1), format.delimiter());
        int last = titles.size();
        while (last > 0 && titles.get(last - 1).isBlank()) {
            last--;
        }
        if (last < 2) {
            throw scan.refused(
                    "LOG-FORMAT",
                    line,
                    1,
                    "column titles",
                    "\"" + brief(scan.head().get(line - 1)) + "\"",
                    "at least two titles separated by " + name(format.delimiter()),
                    "Correct delimiter or header_line, or leave the format out to have it detected.");
        }
        List<String> units = format.unitsRow() ? TextLine.split(scan.head().get(line), format.delimiter()) : List.of();
        List<ColumnTitle> row = ColumnTitle.row(titles.subList(0, last), units);
        StampReader stamps = stamps(scan, format, zone);
        int time = timeColumn(scan, format, titles, data, stamps);
        List<Finding> findings = new ArrayList<>();
        List<ColumnStore> stores = stores(scan, row, line, time, renamed, findings);
        if (stores.isEmpty()) {
            throw scan.refused(
                    "LOG-FORMAT",
                    line,
                    1,
                    "column titles",
                    "no column with a known unit",
                    "units " + LogUnit.LIST,
                    "Write the unit into the title, like \"T01 [\u00b0C]\", or into a row below the titles.");
        }
        return new Layout(last, time, stamps, stores, findings);
    }

    private static List<ColumnStore> stores(
            TextScan scan,
            List<ColumnTitle> row,
            int line,
            int time,
            Map<String, String> renamed,
            List<Finding> findings) {
        List<ColumnStore> stores = new ArrayList<>();
        Set<String> taken = new HashSet<>();
        for (int c = 0; c < row.size(); c++) {
            ColumnTitle title = row.get(c);
            if (c == time || title.name().isEmpty()) {
                continue;
            }
            Place place = new Place(scan.file(), line, c + 1);
            Optional<Unit> unit = title.unit().isEmpty() ? Optional.of(Unit.ONE) : LogUnit.of(title.unit());
            String name = renamed.getOrDefault(title.name(), title.name());
            if (unit.isEmpty()) {
                findings.add(new Finding(
                        "LOG-UNIT",
                        Level.CAUTION,
                        place,
                        "channel " + name,
                        "unit \"" + title.unit() + "\"",
                        "one of " + LogUnit.LIST,
                        "The column is left out; export it in a unit listed.",
                        ""));
                continue;
            }
            if (!taken.add(name)) {
                String other = name + " (column " + (c + 1) + ")";
                taken.add(other);
                findings.add(new Finding(
                        "LOG-TITLE",
                        Level.CAUTION,
                        place,
                        "channel " + name,
                        "a second column with this title",
                        "a title of its own for each column",
                        "It is read as \"" + other + "\".",
                        ""));
                name = other;
            }
            stores.add(new ColumnStore(name, title.unit(), unit.get(), c));
        }
        return stores;
    }

    private static StampReader stamps(TextScan scan, LogFormat format, ZoneId zone) throws RefusedException {
        return switch (format.time()) {
            case ISO -> new IsoStamps(zone);
            case PATTERN -> pattern(scan, format, zone);
            case ELAPSED_S -> elapsed(scan, format, zone);
        };
    }

    private static StampReader pattern(TextScan scan, LogFormat format, ZoneId zone) throws RefusedException {
        try {
            return new PatternStamps(format.timePattern(), zone);
        } catch (IllegalArgumentException e) {
            throw scan.refused(
                    "LOG-FORMAT",
                    0,
                    0,
                    "time_pattern",
                    String.valueOf(e.getMessage()),
                    "letters y M d H h m s S a, like dd.MM.yyyy HH:mm:ss",
                    "Correct time_pattern.");
        }
    }

    private static StampReader elapsed(TextScan scan, LogFormat format, ZoneId zone) throws RefusedException {
        List<String> preamble = scan.head().subList(0, format.headerLine() - 1);
        Optional<Preamble.Start> start = Preamble.start(preamble, format.startKey(), zone);
        String key = format.startKey().isEmpty() ? "Start" : format.startKey();
        if (start.isEmpty()) {
            throw scan.refused(
                    "LOG-NO-TIME",
                    1,
                    0,
                    "start time",
                    "no line \"" + key + ": \u2026\" with a date and time above the titles",
                    "a line like \"" + key + ": 2026-03-10 10:20:00\"",
                    "Correct start_key, or export the log with its start time.");
        }
        if (start.get().orderOpen()) {
            throw scan.refused(
                    "LOG-DATE-ORDER",
                    1,
                    0,
                    "start time",
                    "\"" + start.get().value() + "\"",
                    "an order of day and month that can be told",
                    "Export the start time as year-month-day.");
        }
        return new ElapsedStamps(start.get().seconds(), start.get().zoned(), format.decimalMark());
    }

    private static int timeColumn(TextScan scan, LogFormat format, List<String> titles, int data, StampReader stamps)
            throws RefusedException {
        int named = 0;
        for (int c = titles.size() - 1; c >= 0; c--) {
            named = LogUnit.namesTime(titles.get(c)) ? c : named;
        }
        boolean elapsed = format.time() == LogFormat.TimeForm.ELAPSED_S;
        for (String line : scan.head().subList(data, scan.head().size())) {
            List<String> cells = TextLine.split(line, format.delimiter());
            for (int c = elapsed ? named : 0; c < (elapsed ? Math.min(named + 1, cells.size()) : cells.size()); c++) {
                if (!Double.isNaN(stamps.seconds(cells.get(c)))) {
                    return c;
                }
            }
        }
        List<String> cells = TextLine.split(scan.head().get(data), format.delimiter());
        int at = Math.min(named, cells.size() - 1);
        throw scan.refused(
                "LOG-NO-TIME",
                data + 1L,
                at + 1,
                "time",
                "\"" + brief(cells.get(at)) + "\"",
                stamps.expected(),
                "Correct time or time_pattern, or leave the format out to have it detected.");
    }

    private static String brief(String text) {
        String t = text.strip();
        return t.length() > 60 ? t.substring(0, 60) + "\u2026" : t;
    }

    private static String name(char delimiter) {
        return delimiter == '\t' ? "tabs" : "'" + delimiter + "'";
    }
}
