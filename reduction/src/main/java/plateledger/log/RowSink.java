package plateledger.log;

import de.siegmar.fastcsv.reader.AbstractBaseCsvCallbackHandler;
import java.util.Arrays;
import java.util.List;

/**
 * Takes the rows of a log cell by cell. A row is kept only when the next one begins or the file has ended with a line end,
 * so that a row cut off in writing is never taken for a whole one.
 */
final class RowSink extends AbstractBaseCsvCallbackHandler<Boolean> {
    /** What happened in time and how often; lines from 1, 0 if never. */
    static final class Tally {
        int count;
        int firstLine;
        String firstText = "";

        void add(int line, String text) {
            if (count++ == 0) {
                firstLine = line;
                firstText = text;
            }
        }
    }

    final Tally shortRows = new Tally();
    final Tally longRows = new Tally();
    final Tally noTime = new Tally();
    final Tally backward = new Tally();
    final Tally repeated = new Tally();
    final Tally cutOff = new Tally();

    private final int timeColumn;
    private final int columns;
    private final StampReader stamps;
    private final CellNumber number;
    private final List<ColumnStore> stores;
    private final ColumnStore[] byColumn;
    private double[] times = new double[4096];
    private int[] lines = new int[4096];
    private int rows;
    private double last = Double.NaN;
    private boolean zoned = true;

    private boolean pending;
    private int line;
    private int fields;
    private double time = Double.NaN;
    private String timeText = "";
    private boolean extra;
    private boolean blank;

    RowSink(int columns, int timeColumn, StampReader stamps, CellNumber number, List<ColumnStore> stores) {
        this.columns = columns;
        this.timeColumn = timeColumn;
        this.stamps = stamps;
        this.number = number;
        this.stores = stores;
        this.byColumn = new ColumnStore[columns];
        stores.forEach(store -> byColumn[store.column()] = store);
    }

    @Override
    protected void handleBegin(long startingLineNumber) {
        commit();
        line = (int) startingLineNumber;
        fields = 0;
        time = Double.NaN;
        timeText = "";
        extra = false;
        blank = true;
        for (ColumnStore store : stores) {
            store.begin();
        }
    }

    @Override
    protected void handleField(int index, char[] text, int offset, int length, boolean quoted) {
        fields = index + 1;
        blank &= length == 0;
        if (index == timeColumn) {
            time = stamps.seconds(text, offset, length, last);
            if (Double.isNaN(time) && noTime.count == 0) {
                timeText = new String(text, offset, Math.min(length, 40)).strip();
            }
        } else if (index < columns) {
            ColumnStore store = byColumn[index];
            if (store != null) {
                store.set(text, offset, length, number);
            }
        } else {
            extra |= length > 0;
        }
    }

    @Override
    protected Boolean buildRecord() {
        pending = !blank;
        return Boolean.TRUE;
    }

    /** Ends the file: keeps the last row if its line is complete. */
    void finish(boolean lastLineComplete) {
        if (pending && !lastLineComplete) {
            cutOff.add(line, "");
            pending = false;
        }
        commit();
    }

    private void commit() {
        if (!pending) {
            return;
        }
        pending = false;
        if (Double.isNaN(time)) {
            noTime.add(line, timeText);
            return;
        }
        if (time < last) {
            backward.add(line, "");
            return;
        }
        if (time == last) {
            repeated.add(line, "");
        }
        if (fields < columns) {
            shortRows.add(line, fields + " cells");
        } else if (extra) {
            longRows.add(line, fields + " cells");
        }
        if (rows == times.length) {
            times = Arrays.copyOf(times, 2 * rows);
            lines = Arrays.copyOf(lines, 2 * rows);
        }
        times[rows] = time;
        lines[rows] = line;
        rows++;
        last = time;
        zoned &= stamps.zoned();
        for (ColumnStore store : stores) {
            store.keep(line);
        }
    }

    int rows() {
        return rows;
    }

    /** Line of the last row begun, from 1. */
    int lastLine() {
        return line;
    }

    double firstTime() {
        return rows > 0 ? times[0] : Double.NaN;
    }

    double lastTime() {
        return rows > 0 ? times[rows - 1] : Double.NaN;
    }

    boolean zoned() {
        return zoned && rows > 0;
    }

    double[] times() {
        return Arrays.copyOf(times, rows);
    }

    int[] lines() {
        return Arrays.copyOf(lines, rows);
    }
}
