package plateledger.log;

/** Seconds since a start, as a number or as {@code h:mm:ss[.fff]} with hours that may exceed 24. */
final class ElapsedStamps implements StampReader {
    private final double startS;
    private final boolean startZoned;
    private final CellNumber number;
    private final StampCursor cursor = new StampCursor();

    /** Counts from {@code startS}, s since 1970-01-01T00:00Z. */
    ElapsedStamps(double startS, boolean startZoned, char decimalMark) {
        this.startS = startS;
        this.startZoned = startZoned;
        this.number = new CellNumber(decimalMark);
    }

    @Override
    public double seconds(char[] text, int offset, int length, double previous) {
        if (number.parse(text, offset, length, "s") == Series.Flag.VALID) {
            return startS + number.value();
        }
        cursor.over(text, offset, length);
        int hours = cursor.digits(1, 6);
        if (hours < 0 || !cursor.take(':')) {
            return Double.NaN;
        }
        int minutes = cursor.digits(2, 2);
        if (minutes < 0 || minutes > 59 || !cursor.take(':')) {
            return Double.NaN;
        }
        int seconds = cursor.digits(2, 2);
        double fraction = cursor.fraction();
        if (seconds < 0 || seconds > 59 || !cursor.atEnd()) {
            return Double.NaN;
        }
        return startS + hours * 3600.0 + minutes * 60.0 + seconds + fraction;
    }

    @Override
    public boolean zoned() {
        return startZoned;
    }

    @Override
    public String expected() {
        return "elapsed seconds";
    }
}
