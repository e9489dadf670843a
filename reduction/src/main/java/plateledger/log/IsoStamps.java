package plateledger.log;

import java.time.ZoneId;

/** ISO 8601 stamps: {@code 2026-03-10T10:20:00[.fff][Z|±hh[:mm]]}, a blank allowed for the T; local time without zone. */
final class IsoStamps implements StampReader {
    private final LocalClock clock;
    private final StampCursor cursor = new StampCursor();
    private boolean zoned;

    IsoStamps(ZoneId zone) {
        this.clock = new LocalClock(zone);
    }

    @Override
    public double seconds(char[] text, int offset, int length, double previous) {
        zoned = false;
        cursor.over(text, offset, length);
        int year = cursor.digits(4, 4);
        if (year < 0 || !cursor.take('-')) {
            return Double.NaN;
        }
        int month = cursor.digits(2, 2);
        if (month < 0 || !cursor.take('-')) {
            return Double.NaN;
        }
        int day = cursor.digits(2, 2);
        if (day < 0 || !(cursor.take('T') || cursor.take(' '))) {
            return Double.NaN;
        }
        int hour = cursor.digits(2, 2);
        if (hour < 0 || !cursor.take(':')) {
            return Double.NaN;
        }
        int minute = cursor.digits(2, 2);
        int second = cursor.take(':') ? cursor.digits(2, 2) : 0;
        double fraction = cursor.fraction();
        long local =
                minute < 0 || second < 0 ? Long.MIN_VALUE : clock.localSecond(year, month, day, hour, minute, second);
        return local == Long.MIN_VALUE ? Double.NaN : withZone(local, fraction, previous);
    }

    private double withZone(long local, double fraction, double previous) {
        if (cursor.atEnd()) {
            return clock.instant(local, fraction, previous);
        }
        zoned = true;
        if (cursor.take('Z')) {
            return cursor.atEnd() ? local + fraction : Double.NaN;
        }
        int sign = cursor.take('+') ? 1 : cursor.take('-') || cursor.take('\u2212') ? -1 : 0;
        int hours = cursor.digits(2, 2);
        cursor.take(':');
        int minutes = cursor.atEnd() ? 0 : cursor.digits(2, 2);
        if (sign == 0 || hours < 0 || hours > 18 || minutes < 0 || minutes > 59 || !cursor.atEnd()) {
            return Double.NaN;
        }
        return local + fraction - sign * (hours * 3600L + minutes * 60L);
    }

    @Override
    public boolean zoned() {
        return zoned;
    }

    @Override
    public String expected() {
        return "a time like 2026-03-10T10:20:00+01:00 (ISO 8601)";
    }
}
