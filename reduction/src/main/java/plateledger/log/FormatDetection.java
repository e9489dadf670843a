package plateledger.log;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import plateledger.finding.RefusedException;

/**
 * Finds out how a log is written from its own text: the delimiter that gives rows of one length whose cells can be read,
 * the decimal mark, the line of the titles, a units row, and the form of time. What the text leaves open is refused with the
 * question, never guessed.
 */
public final class FormatDetection {
    private static final int JUDGED_ROWS = 40;
    private static final char[] DELIMITERS = {'\t', ';', ','};
    private static final Pattern COMMA_NUMBER = Pattern.compile("[+-]?\\d+,\\d+([eE][+-]?\\d+)?");
    private static final Pattern POINT_NUMBER = Pattern.compile("[+-]?\\d+\\.\\d+([eE][+-]?\\d+)?");
    /** A comma here may set off thousands as well as decimals. */
    private static final Pattern OPEN_NUMBER = Pattern.compile("[+-]?[1-9]\\d{0,2},\\d{3}");

    private FormatDetection() {}

    /**
     * Detects the format of a log.
     *
     * @param campaignFolder folder that {@code file} is relative to
     * @param file the log
     * @throws RefusedException if the file is no text, or has no titles, no readable time, or leaves the order of day and
     *     month or the decimal mark open
     */
    public static LogFormat detect(Path campaignFolder, String file) throws RefusedException {
        return detect(TextScan.of(campaignFolder.resolve(file), file));
    }

    static LogFormat detect(TextScan scan) throws RefusedException {
        Body best = null;
        for (char delimiter : DELIMITERS) {
            Body body = Body.of(scan.head(), delimiter);
            if (body.score > 0.0 && (best == null || body.score > best.score)) {
                best = body;
            }
        }
        if (best == null) {
            throw scan.refused(
                    "LOG-FORMAT",
                    0,
                    0,
                    "log file",
                    "no table (no run of rows with the same number of readable cells)",
                    "rows separated by comma, semicolon or tab",
                    "Declare the format under [logger.<name>.format].");
        }
        int titles = best.titleLine();
        boolean unitsRow = best.hasUnitsRow();
        if (unitsRow) {
            titles = best.lineBefore(titles);
        }
        if (titles < 0) {
            throw scan.refused(
                    "LOG-FORMAT",
                    best.first + 1L,
                    1,
                    "column titles",
                    "data from line " + (best.first + 1) + " without titles above",
                    "a row of titles with as many cells as the data",
                    "Add the titles, or declare header_line.");
        }
        char decimal = decimalMark(scan, best);
        return time(scan, best, titles, unitsRow, decimal);
    }

    private static char decimalMark(TextScan scan, Body body) throws RefusedException {
        if (body.delimiter == ',') {
            return '.';
        }
        int comma = 0;
        int point = 0;
        int open = 0;
        for (List<String> row : body.dataRows()) {
            for (String cell : row) {
                String c = cell.strip();
                comma += COMMA_NUMBER.matcher(c).matches() ? 1 : 0;
                point += POINT_NUMBER.matcher(c).matches() ? 1 : 0;
                open += OPEN_NUMBER.matcher(c).matches() ? 1 : 0;
            }
        }
        if (comma > point && open == comma) {
            throw scan.refused(
                    "LOG-DECIMAL",
                    body.first + 1L,
                    0,
                    "decimal mark",
                    "only numbers like 1,234, which may be one and a bit or above a thousand",
                    "a decimal mark that can be told",
                    "Declare decimal_mark under [logger.<name>.format].");
        }
        return comma > point ? ',' : '.';
    }

    private static LogFormat time(TextScan scan, Body body, int titles, boolean unitsRow, char decimal)
            throws RefusedException {
        List<String> first = body.rows.get(body.first);
        for (int c = 0; c < first.size(); c++) {
            Optional<StampForm> form = StampForm.of(first.get(c));
            if (form.isPresent()) {
                String pattern = form.get().orderOpen()
                        ? settled(scan, body, c, form.get())
                        : form.get().pattern();
                return new LogFormat(
                        body.delimiter,
                        decimal,
                        titles + 1,
                        unitsRow,
                        form.get().time(),
                        pattern,
                        "");
            }
        }
        Optional<Preamble.Start> start = Preamble.start(scan.head().subList(0, titles), "", java.time.ZoneOffset.UTC);
        boolean counts = start.isPresent() && body.ascending(body.elapsedColumn(titles));
        if (!counts) {
            String found = first.get(0).strip();
            throw scan.refused(
                    "LOG-NO-TIME",
                    body.first + 1L,
                    1,
                    "time",
                    "\"" + found + "\" and no start time above the titles",
                    "a column with date and time, or elapsed seconds with a line like \"Start: 2026-03-10 10:20:00\" above",
                    "Export the log with its time, or declare time, time_pattern or start_key.");
        }
        return new LogFormat(
                body.delimiter,
                decimal,
                titles + 1,
                unitsRow,
                LogFormat.TimeForm.ELAPSED_S,
                "",
                start.get().key());
    }

    /** Decides between day first and month first over the whole column; dots without evidence are day first. */
    private static String settled(TextScan scan, Body body, int column, StampForm form) throws RefusedException {
        int first = 0;
        int second = 0;
        try (BufferedReader in = new BufferedReader(scan.open())) {
            String line = in.readLine();
            for (int n = 0; line != null && first <= 12 && second <= 12; n++) {
                if (n >= body.first) {
                    int[] seen = StampForm.leadingNumbers(TextLine.cell(line, body.delimiter, column));
                    first = Math.max(first, seen[0]);
                    second = Math.max(second, seen[1]);
                }
                line = in.readLine();
            }
        } catch (IOException e) {
            throw scan.refused(
                    "LOG-UNREADABLE",
                    0,
                    0,
                    "log file",
                    "a file that cannot be read (" + e.getMessage() + ")",
                    "a readable file",
                    "Check the disk and the permissions.");
        }
        if (second > 12) {
            return form.monthFirst();
        }
        if (first > 12 || form.separator() == '.') {
            return form.pattern(); // dates with dots have the day first (DIN 5008 and its like; common practice)
        }
        throw scan.refused(
                "LOG-DATE-ORDER",
                body.first + 1L,
                column + 1,
                "time",
                "\"" + body.rows.get(body.first).get(column).strip() + "\" and no day above 12 in the whole file",
                "an order of day and month that can be told",
                "Declare time_pattern = \"" + form.pattern() + "\" or \"" + form.monthFirst() + "\".");
    }

    /** The head of a file split by one delimiter: which rows are data, and how well they can be read. */
    private static final class Body {
        private final char delimiter;
        private final List<List<String>> rows = new ArrayList<>();
        private int columns;
        private int first = -1;
        private double score;

        private Body(char delimiter) {
            this.delimiter = delimiter;
        }

        static Body of(List<String> lines, char delimiter) {
            Body body = new Body(delimiter);
            lines.forEach(line -> body.rows.add(TextLine.split(line, delimiter)));
            body.columns = body.commonLength();
            if (body.columns >= 2) {
                body.locate();
            }
            return body;
        }

        /** The most frequent row length in the second half of the head, where the preamble is past. */
        private int commonLength() {
            int best = 0;
            int most = 0;
            for (int i = rows.size() / 2; i < rows.size(); i++) {
                int length = rows.get(i).size();
                int count = 0;
                for (int j = rows.size() / 2; j < rows.size(); j++) {
                    count += rows.get(j).size() == length ? 1 : 0;
                }
                if (count > most) {
                    most = count;
                    best = length;
                }
            }
            return best;
        }

        /** First column with date and time in the last row of the table's length; -1 if there is none. */
        private int stampColumn() {
            for (int i = rows.size() - 1; i >= 0; i--) {
                List<String> row = rows.get(i);
                for (int c = 0; c < row.size() && row.size() == columns; c++) {
                    if (StampForm.of(row.get(c)).isPresent()) {
                        return c;
                    }
                }
            }
            return -1;
        }

        private void locate() {
            int stamp = stampColumn();
            int readable = 0;
            int cells = 0;
            for (int i = 0; i < rows.size(); i++) {
                List<String> row = rows.get(i);
                boolean blank = row.size() == 1 && row.get(0).isBlank();
                boolean timed = row.size() == columns
                        && (stamp < 0 || StampForm.of(row.get(stamp)).isPresent());
                if (first < 0 && timed && isData(row)) {
                    first = i;
                }
                if (first >= 0 && !blank && i < first + JUDGED_ROWS) {
                    cells += Math.max(columns, row.size());
                    readable += row.size() == columns ? readable(row) : 0;
                }
            }
            score = first < 0 ? 0.0 : (double) readable / cells;
        }

        private static boolean isData(List<String> row) {
            boolean number = false;
            for (String cell : row) {
                number |= isNumber(cell) || StampForm.of(cell).isPresent();
            }
            return number && readable(row) * 2 > row.size();
        }

        private static int readable(List<String> row) {
            int n = 0;
            for (String cell : row) {
                n += cell.isBlank() || isNumber(cell) || StampForm.of(cell).isPresent() ? 1 : 0;
            }
            return n;
        }

        private static boolean isNumber(String cell) {
            String c = cell.strip();
            char[] text = c.toCharArray();
            return new CellNumber('.').parse(text, 0, text.length, "") == Series.Flag.VALID
                    || new CellNumber(',').parse(text, 0, text.length, "") == Series.Flag.VALID;
        }

        /** Some rows of data, enough to judge by. */
        List<List<String>> dataRows() {
            return rows.subList(first, Math.min(rows.size(), first + JUDGED_ROWS));
        }

        /** Index of the last row of the table's length above the data; -1 if there is none. */
        int titleLine() {
            return lineBefore(first);
        }

        int lineBefore(int line) {
            for (int i = line - 1; i >= 0; i--) {
                if (rows.get(i).size() == columns) {
                    return i;
                }
            }
            return -1;
        }

        /** True if the row above the data holds units only and there is a row for the titles above it. */
        boolean hasUnitsRow() {
            int line = titleLine();
            if (line < 0 || lineBefore(line) != line - 1) {
                return false;
            }
            int units = 0;
            int others = 0;
            for (String cell : rows.get(line)) {
                units += LogUnit.of(cell).isPresent() ? 1 : 0;
                others += LogUnit.mayStandInUnitsRow(cell) ? 0 : 1;
            }
            return units > 0 && others <= Math.max(1, units); // the time column may show its pattern there
        }

        int elapsedColumn(int titles) {
            List<String> row = rows.get(titles);
            for (int c = 0; c < row.size(); c++) {
                if (LogUnit.namesTime(row.get(c))) {
                    return c;
                }
            }
            return 0;
        }

        boolean ascending(int column) {
            ElapsedStamps point = new ElapsedStamps(0.0, false, '.');
            ElapsedStamps comma = new ElapsedStamps(0.0, false, ',');
            double last = Double.NEGATIVE_INFINITY;
            int steps = 0;
            for (List<String> row : dataRows()) {
                if (row.size() == columns) {
                    double t = point.seconds(row.get(column));
                    double s = Double.isNaN(t) ? comma.seconds(row.get(column)) : t;
                    if (s < last) {
                        return false;
                    }
                    steps += s > last ? 1 : 0;
                    last = Double.isNaN(s) ? last : s;
                }
            }
            return steps >= 2;
        }
    }
}
