package plateledger.log;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.zone.ZoneOffsetTransition;
import java.time.zone.ZoneRules;
import java.util.List;

/** Local date and time to seconds since 1970-01-01T00:00Z; keeps the last date and the last offset, since rows ascend. */
final class LocalClock {
    private static final long DAY_S = 86_400L;
    /** Offsets change at full quarter hours at the finest in all zones since 1970 (tz database; from memory). */
    private static final long BLOCK_S = 900L;

    private final ZoneRules rules;
    private int lastDate = -1;
    private long lastEpochDay;
    private long lastBlock = Long.MIN_VALUE;
    private long offsetS;
    private long secondOffsetS;

    LocalClock(ZoneId zone) {
        this.rules = zone.getRules();
    }

    /** Seconds since 1970-01-01T00:00 local time; {@link Long#MIN_VALUE} if there is no such date or time. */
    long localSecond(int year, int month, int day, int hour, int minute, int second) {
        boolean endOfDay = hour == 24 && minute == 0 && second == 0; // ISO 8601: the end of that day
        if ((hour > 23 && !endOfDay) || minute > 59 || second > 60 || hour < 0 || minute < 0 || second < 0) {
            return Long.MIN_VALUE;
        }
        int date = (year * 100 + month) * 100 + day;
        if (date != lastDate) {
            try {
                lastEpochDay = LocalDate.of(year, month, day).toEpochDay();
            } catch (DateTimeException e) {
                return Long.MIN_VALUE; // no such day: an unreadable stamp, counted by the caller
            }
            lastDate = date;
        }
        return lastEpochDay * DAY_S + hour * 3600L + minute * 60L + second;
    }

    /**
     * The instant of a local second in the zone. In a repeated hour the earlier instant, unless that would step back
     * behind {@code previous}; in a skipped hour the offset before the change.
     */
    double instant(long localSecond, double fraction, double previous) {
        long block = Math.floorDiv(localSecond, BLOCK_S);
        if (block != lastBlock) {
            lookUp(localSecond);
            lastBlock = block;
        }
        double earlier = localSecond - offsetS + fraction;
        return earlier < previous && secondOffsetS != offsetS ? localSecond - secondOffsetS + fraction : earlier;
    }

    private void lookUp(long localSecond) {
        LocalDateTime local = LocalDateTime.ofEpochSecond(localSecond, 0, ZoneOffset.UTC);
        List<ZoneOffset> valid = rules.getValidOffsets(local);
        if (valid.isEmpty()) {
            ZoneOffsetTransition change = rules.getTransition(local);
            offsetS = change.getOffsetBefore().getTotalSeconds();
            secondOffsetS = offsetS;
        } else {
            offsetS = valid.get(0).getTotalSeconds();
            secondOffsetS = valid.get(valid.size() - 1).getTotalSeconds();
        }
    }
}
