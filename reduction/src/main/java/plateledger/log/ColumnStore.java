package plateledger.log;

import java.util.ArrayList;
import java.util.List;
import plateledger.quantity.Unit;

/** One channel while it is read: values and flags in chunks, so that nothing is copied as the file grows. */
final class ColumnStore {
    private static final int CHUNK = 4096;

    private final String channel;
    private final String unit;
    private final Unit si;
    private final int column;
    private final List<double[]> values = new ArrayList<>();
    private final List<byte[]> flags = new ArrayList<>();
    private final int[] counts = new int[Series.Flag.values().length];
    private final int[] firstLines = new int[Series.Flag.values().length];
    private final String[] firstTexts = new String[Series.Flag.values().length];
    private double[] lastValues = new double[CHUNK];
    private byte[] lastFlags = new byte[CHUNK];
    private int fill;
    private double pendingValue = Double.NaN;
    private Series.Flag pendingFlag = Series.Flag.EMPTY;
    private String pendingText = "";

    /**
     * A channel of a column.
     *
     * @param channel name
     * @param unit unit as written; empty if none is
     * @param si the unit it stands for
     * @param column column from 0
     */
    ColumnStore(String channel, String unit, Unit si, int column) {
        this.channel = channel;
        this.unit = unit;
        this.si = si;
        this.column = column;
        values.add(lastValues);
        flags.add(lastFlags);
        java.util.Arrays.fill(firstTexts, "");
    }

    String channel() {
        return channel;
    }

    String unit() {
        return unit;
    }

    /** Column from 0. */
    int column() {
        return column;
    }

    /** Forgets the cell of the row before: the cell counts as empty until one is set. */
    void begin() {
        pendingFlag = Series.Flag.EMPTY;
        pendingValue = Double.NaN;
        pendingText = "";
    }

    /** Sets the cell of the row at hand. */
    void set(char[] text, int at, int length, CellNumber parser) {
        pendingFlag = parser.parse(text, at, length, unit);
        if (pendingFlag == Series.Flag.VALID) {
            pendingValue = si.toSi(parser.value());
        } else if (pendingFlag != Series.Flag.EMPTY && counts[pendingFlag.code()] == 0) {
            pendingText = new String(text, at, Math.min(length, 40)).strip();
        }
    }

    /** Keeps the cell of the row at hand. */
    void keep(int line) {
        if (fill == CHUNK) {
            lastValues = new double[CHUNK];
            lastFlags = new byte[CHUNK];
            values.add(lastValues);
            flags.add(lastFlags);
            fill = 0;
        }
        lastValues[fill] = pendingValue;
        lastFlags[fill] = pendingFlag.code();
        fill++;
        int kind = pendingFlag.code();
        if (counts[kind]++ == 0) {
            firstLines[kind] = line;
            firstTexts[kind] = pendingText;
        }
    }

    int count(Series.Flag flag) {
        return counts[flag.code()];
    }

    int firstLine(Series.Flag flag) {
        return firstLines[flag.code()];
    }

    String firstText(Series.Flag flag) {
        return firstTexts[flag.code()];
    }

    /** The channel as a series; times and lines are shared between the channels of a file. */
    Series series(String file, double[] times, int[] lines) {
        int n = times.length;
        double[] v = new double[n];
        byte[] f = new byte[n];
        for (int i = 0, at = 0; at < n; i++, at += CHUNK) {
            int part = Math.min(CHUNK, n - at);
            System.arraycopy(values.get(i), 0, v, at, part);
            System.arraycopy(flags.get(i), 0, f, at, part);
        }
        return new Series(channel, unit.isEmpty() ? "" : si.symbol(), file, times, v, f, lines);
    }
}
