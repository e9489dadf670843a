package plateledger.log;

import ch.randelshofer.fastdoubleparser.JavaDoubleParser;
import java.util.Locale;
import java.util.Set;

/**
 * Reads the number in a cell in place. One instance serves one file and one thread; {@link #value()} belongs to the last
 * {@link #parse}.
 *
 * <p>Beyond plain numbers it takes a decimal comma, group marks where a decimal mark follows them ({@code 1.234,5}), blanks
 * and apostrophes as group marks, the minus sign U+2212, and the column's own unit glued to the number. Letters that a Java
 * number may carry (hexadecimal, trailing d or f, NaN) are no numbers here.
 */
final class CellNumber {
    /** IEEE 488.2 / SCPI-99: 9.9E37 stands for infinity, 9.91E37 for not a number. */
    private static final double SCPI_NOT_A_NUMBER = 9.91e37;
    /** Anything this large is an over-range mark; no channel of a rig comes near it. */
    private static final double OVER_RANGE_FROM = 9.9e36;

    private static final int LONGEST = 64;

    /** Words that loggers write for an over-range reading, in capitals; common practice. */
    private static final Set<String> OVER_WORDS = Set.of(
            "OVER",
            "+OVER",
            "-OVER",
            "OVERRANGE",
            "OVER-RANGE",
            "OVER RANGE",
            "OVERLOAD",
            "OVERFLOW",
            "OVLD",
            "+OVLD",
            "-OVLD",
            "OL",
            "+OL",
            "-OL",
            "O.L",
            "OFL",
            "OPEN",
            "INF",
            "+INF",
            "-INF",
            "INFINITY",
            "+INFINITY",
            "-INFINITY",
            "***",
            "****",
            "*****",
            "******");

    private final char decimalMark;
    private final char otherMark;
    private final char[] plain = new char[LONGEST];
    private double value = Double.NaN;

    CellNumber(char decimalMark) {
        this.decimalMark = decimalMark;
        this.otherMark = decimalMark == ',' ? '.' : ',';
    }

    /** The number of the last cell parsed; NaN unless that cell was {@link Series.Flag#VALID}. */
    double value() {
        return value;
    }

    /** Parses a cell of a column with the given unit (which may stand behind the number). */
    Series.Flag parse(char[] text, int offset, int length, String unit) {
        value = Double.NaN;
        int from = offset;
        int to = offset + length;
        while (from < to && isBlank(text[from])) {
            from++;
        }
        while (to > from && isBlank(text[to - 1])) {
            to--;
        }
        if (from == to) {
            return Series.Flag.EMPTY;
        }
        int n = normalise(text, from, to);
        if (n < 0) {
            return word(new String(text, from, to - from), unit);
        }
        double v;
        try {
            v = JavaDoubleParser.parseDouble(plain, 0, n);
        } catch (NumberFormatException e) {
            return Series.Flag.NOT_A_NUMBER; // e.g. two signs; counted and reported with the text by the caller
        }
        if (Math.abs(v) >= OVER_RANGE_FROM) {
            return v == SCPI_NOT_A_NUMBER ? Series.Flag.NOT_A_NUMBER : Series.Flag.OVER_RANGE;
        }
        value = v;
        return Series.Flag.VALID;
    }

    /** Writes the number with '.' into {@link #plain}; -1 if there is anything that no number holds. */
    private int normalise(char[] text, int from, int to) {
        if (to - from > LONGEST) {
            return -1;
        }
        int n = 0;
        int marks = 0;
        int groups = 0;
        for (int i = from; i < to; i++) {
            char c = text[i];
            if ((c >= '0' && c <= '9') || c == '-' || c == '+' || c == 'e' || c == 'E') {
                plain[n++] = c;
            } else if (c == decimalMark) {
                plain[n++] = '.';
                marks++;
            } else if (c == '\u2212') {
                plain[n++] = '-';
            } else if (c == otherMark && marks == 0) {
                groups++;
            } else if (marks > 0 || !(c == '\u00a0' || c == '\u202f' || c == '\'')) {
                return -1; // the three named are group marks that cannot be taken for anything else
            }
        }
        // "1.234" under a decimal comma may mean either: no number. "1.234,5" can mean only one thing.
        boolean clear = marks <= 1 && (groups == 0 || marks == 1);
        return clear && n > 0 ? n : -1;
    }

    private Series.Flag word(String cell, String unit) {
        if (OVER_WORDS.contains(cell.toUpperCase(Locale.ROOT))) {
            return Series.Flag.OVER_RANGE;
        }
        if (!unit.isEmpty() && cell.endsWith(unit) && cell.length() > unit.length()) {
            char[] rest = cell.substring(0, cell.length() - unit.length()).toCharArray();
            Series.Flag flag = parse(rest, 0, rest.length, "");
            return flag == Series.Flag.EMPTY ? Series.Flag.NOT_A_NUMBER : flag;
        }
        return Series.Flag.NOT_A_NUMBER;
    }

    private static boolean isBlank(char c) {
        return c == ' ' || c == '\t' || c == '\u00a0';
    }
}
