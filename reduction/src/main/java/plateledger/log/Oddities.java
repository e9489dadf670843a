package plateledger.log;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;

/** What was odd in a log, one finding per channel and kind, with the first line and the count. */
final class Oddities {
    /** More than this share of rows or cells makes a note a caution. */
    private static final double CAUTION_SHARE = 0.01;

    private final String file;
    private final List<Finding> findings = new ArrayList<>();
    private final int rows;

    Oddities(String file, int rows) {
        this.file = file;
        this.rows = rows;
    }

    List<Finding> findings() {
        return findings;
    }

    void cells(ColumnStore store) {
        cells(store, Series.Flag.EMPTY, "LOG-EMPTY", "empty", "a number in every row");
        cells(store, Series.Flag.OVER_RANGE, "LOG-OVER-RANGE", "over-range", "readings within the logger's range");
        cells(store, Series.Flag.NOT_A_NUMBER, "LOG-NOT-A-NUMBER", "not numbers", "numbers");
    }

    private void cells(ColumnStore store, Series.Flag flag, String id, String what, String expected) {
        int n = store.count(flag);
        if (n == 0) {
            return;
        }
        String text = store.firstText(flag);
        String first = text.isEmpty() ? "" : ", the first \"" + text + "\"";
        String all = n == rows ? "all " + n + " cells " + what : n + " of " + rows + " cells " + what + first;
        add(
                id,
                level(n),
                new Place(file, store.firstLine(flag), store.column() + 1),
                "channel " + store.channel(),
                all,
                expected,
                "They are left out of every mean.");
    }

    void rows(RowSink sink, int columns) {
        row(
                sink.shortRows,
                "LOG-SHORT-ROW",
                "rows with fewer than " + columns + " cells",
                columns + " cells in every row",
                "The missing cells count as empty.");
        row(
                sink.longRows,
                "LOG-LONG-ROW",
                "rows with more than " + columns + " cells",
                columns + " cells in every row",
                "The cells beyond the last title are not read.");
        row(
                sink.noTime,
                "LOG-ROW-TIME",
                "rows without a readable time",
                "a time in every row",
                "These rows are left out.");
        row(
                sink.backward,
                "LOG-BACKWARD",
                "rows with a time before that of the row above",
                "ascending times",
                "These rows are left out; check whether the logger was restarted or its clock was set.");
        row(
                sink.repeated,
                "LOG-REPEATED",
                "rows with the time of the row above",
                "ascending times",
                "They are kept and spread evenly up to the next time.");
        if (sink.cutOff.count > 0) {
            add(
                    "LOG-CUT-OFF",
                    Level.NOTE,
                    new Place(file, sink.cutOff.firstLine, 0),
                    "last row",
                    "a last line without line end",
                    "a complete last line",
                    "The row is left out, since its last number may be cut off.");
        }
    }

    private void row(RowSink.Tally tally, String id, String what, String expected, String remedy) {
        if (tally.count > 0) {
            String first = tally.firstText.isEmpty() ? "" : ", the first \"" + tally.firstText + "\"";
            add(
                    id,
                    level(tally.count),
                    new Place(file, tally.firstLine, 0),
                    "rows",
                    tally.count + " " + what + first,
                    expected,
                    remedy);
        }
    }

    void gaps(Cadence cadence, int[] lines) {
        if (cadence.gaps() > 0) {
            add(
                    "LOG-GAP",
                    Level.NOTE,
                    new Place(file, lines[cadence.firstGap()], 0),
                    "time",
                    String.format(
                            Locale.ROOT,
                            cadence.gaps() == 1 ? "%d gap of %.1f s" : "%d gaps, the longest %.1f s",
                            cadence.gaps(),
                            cadence.longestGapS()),
                    String.format(Locale.ROOT, "steps of about %.3g s", cadence.intervalS()),
                    "Nothing is filled in; means use the samples there are.");
        }
    }

    private Level level(int n) {
        return n > CAUTION_SHARE * rows ? Level.CAUTION : Level.NOTE;
    }

    private void add(
            String id, Level level, Place place, String subject, String found, String expected, String remedy) {
        findings.add(new Finding(id, level, place, subject, found, expected, remedy, ""));
    }
}
