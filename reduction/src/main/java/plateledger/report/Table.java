package plateledger.report;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import plateledger.quantity.Estimate;

/**
 * A result table as comma-separated text: RFC 4180 quoting, LF, UTF-8, '.' as decimal mark in every locale, numbers with
 * all digits that bring the same double back, an empty cell where there is no number.
 */
final class Table {
    private static final CSVFormat FORMAT =
            CSVFormat.RFC4180.builder().setRecordSeparator('\n').get();

    private final StringBuilder text = new StringBuilder();
    private final CSVPrinter printer;
    private final List<String> cells = new ArrayList<>();
    private final int columns;

    /** Starts a table with its column titles. */
    Table(List<String> titles) {
        columns = titles.size();
        try {
            printer = new CSVPrinter(text, FORMAT);
            printer.printRecord(titles);
        } catch (IOException e) {
            throw new UncheckedIOException(e); // a StringBuilder does not fail
        }
    }

    /**
     * Adds a cell of text. A spreadsheet runs text that begins with one of {@code = + - @} as a formula; such text gets
     * an apostrophe in front, which spreadsheets show as text.
     */
    Table text(String value) {
        cells.add(neutral(value));
        return this;
    }

    /** Adds a number. */
    Table number(double value) {
        cells.add(digits(value));
        return this;
    }

    /** Adds a value and, in the next cell, its standard uncertainty. */
    Table estimate(Estimate value) {
        return number(value.value()).number(value.isKnown() ? value.u() : Double.NaN);
    }

    /** Adds empty cells. */
    Table empty(int count) {
        for (int i = 0; i < count; i++) {
            cells.add("");
        }
        return this;
    }

    /** Ends the row. */
    void endRow() {
        if (cells.size() != columns) {
            throw new IllegalStateException("row has " + cells.size() + " cells, the table " + columns + " columns");
        }
        try {
            printer.printRecord(cells);
        } catch (IOException e) {
            throw new UncheckedIOException(e); // a StringBuilder does not fail
        }
        cells.clear();
    }

    /** The table so far. */
    byte[] bytes() {
        return text.toString().getBytes(StandardCharsets.UTF_8);
    }

    /** All digits of a number; {@code inf} for infinity, empty for NaN. */
    static String digits(double value) {
        if (Double.isNaN(value)) {
            return "";
        }
        if (Double.isInfinite(value)) {
            return value > 0 ? "inf" : "-inf";
        }
        return Double.toString(value); // the same in every locale
    }

    private static String neutral(String value) {
        if (value.isEmpty()) {
            return value;
        }
        char first = value.charAt(0);
        boolean formula =
                first == '=' || first == '+' || first == '-' || first == '@' || first == '\t' || first == '\r';
        return formula ? "'" + value : value;
    }
}
