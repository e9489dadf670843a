package plateledger.log;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.finding.RefusedException;

/** Reads one log file into series in SI, in one streaming pass over its rows. */
public final class LogReader {
    private static final int BLOCK_ROWS = 1024;

    private LogReader() {}

    /**
     * Reads a log.
     *
     * @param campaignFolder folder that {@code file} is relative to
     * @param file the log, with '/' separators
     * @param declared how it is written; empty to have it detected
     * @param zone zone of its stamps where they carry none
     * @param columns column title (without its unit) to channel name; titles not listed are channel names themselves
     * @return the channels with values in SI, NaN and a flag where a cell holds no usable number, and a finding for each
     *     kind of oddity. A channel whose unit is written nowhere keeps its numbers as they are and an empty unit
     * @throws RefusedException if the file is missing, no text, cannot be understood, or has no readable time or numbers
     */
    public static LogData read(
            Path campaignFolder, String file, Optional<LogFormat> declared, ZoneId zone, Map<String, String> columns)
            throws RefusedException {
        TextScan scan = TextScan.of(campaignFolder.resolve(file), file);
        LogFormat format = declared.isPresent() ? declared.get() : FormatDetection.detect(scan);
        Layout layout = Layout.of(scan, format, zone, columns);
        RowSink sink = new RowSink(
                layout.columns(),
                layout.timeColumn(),
                layout.stamps(),
                new CellNumber(format.decimalMark()),
                layout.stores());
        rows(scan, format, sink);
        refuseUnreadable(scan, format, layout, sink);
        return assemble(scan, format, layout, sink);
    }

    private static void rows(TextScan scan, LogFormat format, RowSink sink) throws RefusedException {
        try (CsvReader<Boolean> reader = CsvReader.builder()
                .fieldSeparator(format.delimiter())
                .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
                .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
                .build(sink, scan.open())) {
            reader.skipLines(format.headerLine() + (format.unitsRow() ? 1 : 0));
            Iterator<Boolean> rows = reader.iterator();
            while (block(rows)) {
                // one call per block: a loop over all rows in one method is compiled late and badly
            }
            sink.finish(scan.lastLineComplete());
        } catch (CsvParseException e) {
            throw scan.refused(
                    "LOG-FORMAT",
                    sink.lastLine(),
                    0,
                    "rows",
                    "text that cannot be split into cells (" + e.getMessage() + ")",
                    "rows of cells, quotes in pairs",
                    "Look for a stray quote or an endless line there.");
        } catch (IOException | UncheckedIOException e) {
            throw scan.refused(
                    "LOG-UNREADABLE",
                    sink.lastLine(),
                    0,
                    "log file",
                    "an error in reading (" + e.getMessage() + ")",
                    "a readable file",
                    "Check the disk and the permissions.");
        }
    }

    private static boolean block(Iterator<Boolean> rows) {
        int n = 0;
        while (n < BLOCK_ROWS && rows.hasNext()) {
            rows.next();
            n++;
        }
        return n == BLOCK_ROWS;
    }

    private static void refuseUnreadable(TextScan scan, LogFormat format, Layout layout, RowSink sink)
            throws RefusedException {
        if (sink.rows() == 0 && sink.noTime.count > 0) {
            throw scan.refused(
                    "LOG-NO-TIME",
                    sink.noTime.firstLine,
                    layout.timeColumn() + 1,
                    "time",
                    "\"" + sink.noTime.firstText + "\"",
                    layout.stamps().expected(),
                    "Correct time or time_pattern.");
        }
        if (sink.rows() < 2 || sink.lastTime() == sink.firstTime()) {
            throw scan.refused(
                    "LOG-EMPTY-FILE",
                    0,
                    0,
                    "log file",
                    sink.rows() + " rows of data",
                    "at least two rows at different times",
                    "Export the log again.");
        }
        boolean any = layout.stores().stream().anyMatch(store -> store.count(Series.Flag.VALID) > 0);
        Optional<ColumnStore> wrong = layout.stores().stream()
                .filter(store -> store.count(Series.Flag.NOT_A_NUMBER) > 0)
                .findFirst();
        if (!any && wrong.isPresent()) {
            ColumnStore store = wrong.get();
            throw scan.refused(
                    "LOG-NUMBERS",
                    store.firstLine(Series.Flag.NOT_A_NUMBER),
                    store.column() + 1,
                    "channel " + store.channel(),
                    "\"" + store.firstText(Series.Flag.NOT_A_NUMBER) + "\"",
                    "a number with '" + format.decimalMark() + "' as decimal mark",
                    "Correct decimal_mark or delimiter, or leave the format out to have it detected.");
        }
    }

    private static LogData assemble(TextScan scan, LogFormat format, Layout layout, RowSink sink) {
        double[] times = sink.times();
        int[] lines = sink.lines();
        Cadence cadence = Cadence.of(times);
        Oddities oddities = new Oddities(scan.file(), sink.rows());
        oddities.rows(sink, layout.columns());
        oddities.gaps(cadence, lines);
        List<Finding> findings = new ArrayList<>(layout.findings());
        List<Series> series = new ArrayList<>();
        for (ColumnStore store : layout.stores()) {
            boolean words = store.unit().isEmpty()
                    && store.count(Series.Flag.VALID) == 0
                    && store.count(Series.Flag.NOT_A_NUMBER) > 0;
            if (words) {
                findings.add(new Finding(
                        "LOG-WORDS",
                        Level.NOTE,
                        new Place(scan.file(), format.headerLine(), store.column() + 1),
                        "column " + store.channel(),
                        "only words",
                        "numbers",
                        "The column is left out.",
                        ""));
            } else {
                oddities.cells(store);
                series.add(store.series(scan.file(), times, lines));
            }
        }
        findings.addAll(oddities.findings());
        findings.sort(Finding.ORDER);
        return new LogData(
                scan.file(),
                format,
                sink.rows(),
                cadence.intervalS(),
                times[0],
                times[times.length - 1],
                sink.zoned(),
                series,
                findings);
    }
}
