package plateledger.log;

import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The form in which a time is written, as seen from one cell.
 *
 * @param time ISO or pattern
 * @param pattern the pattern, day first where the cell leaves it open; empty for ISO
 * @param orderOpen true if day and month could be exchanged
 * @param first first number of an open form; 0 otherwise
 * @param second second number of an open form; 0 otherwise
 * @param separator separator of the date
 */
record StampForm(LogFormat.TimeForm time, String pattern, boolean orderOpen, int first, int second, char separator) {
    private static final String CLOCK = "([ T])(\\d{1,2}):(\\d{2})(:\\d{2})?([.,]\\d+)?( ?[AaPp][Mm])?$";
    private static final Pattern DAY_MONTH_YEAR =
            Pattern.compile("^(\\d{1,2})([./-])(\\d{1,2})\\2(\\d{4}|\\d{2})" + CLOCK);
    private static final Pattern YEAR_MONTH_DAY = Pattern.compile("^(\\d{4})([./])(\\d{1,2})\\2(\\d{1,2})" + CLOCK);

    /** The form of a cell; empty if it holds no date and time. */
    static Optional<StampForm> of(String cell) {
        String text = cell.strip();
        if (text.length() < 12 || text.indexOf(':') < 0 || !Character.isDigit(text.charAt(0))) {
            return Optional.empty(); // most cells are numbers: do not ask the patterns
        }
        if (!Double.isNaN(new IsoStamps(ZoneOffset.UTC).seconds(text))) {
            return Optional.of(new StampForm(LogFormat.TimeForm.ISO, "", false, 0, 0, '-'));
        }
        Matcher dmy = DAY_MONTH_YEAR.matcher(text);
        if (dmy.matches()) {
            String year = dmy.group(4).length() == 4 ? "yyyy" : "yy";
            char sep = dmy.group(2).charAt(0);
            String date = dmy.group(1).length() == 2 || dmy.group(3).length() == 2
                    ? "dd" + sep + "MM" + sep + year
                    : "d" + sep + "M" + sep + year;
            return Optional.of(new StampForm(
                    LogFormat.TimeForm.PATTERN,
                    date + clock(dmy, 5),
                    true,
                    Integer.parseInt(dmy.group(1)),
                    Integer.parseInt(dmy.group(3)),
                    sep));
        }
        Matcher ymd = YEAR_MONTH_DAY.matcher(text);
        if (ymd.matches()) {
            char sep = ymd.group(2).charAt(0);
            return Optional.of(new StampForm(
                    LogFormat.TimeForm.PATTERN, "yyyy" + sep + "MM" + sep + "dd" + clock(ymd, 5), false, 0, 0, sep));
        }
        return Optional.empty();
    }

    /** First and second number of a date like 3/14/2026, without reading the rest; zeros if the cell begins otherwise. */
    static int[] leadingNumbers(String cell) {
        StampCursor cursor = new StampCursor();
        char[] text = cell.toCharArray();
        cursor.over(text, 0, text.length);
        int first = cursor.digits(1, 2);
        boolean separated = cursor.take('.') || cursor.take('/') || cursor.take('-');
        int second = cursor.digits(1, 2);
        return first < 0 || second < 0 || !separated ? new int[2] : new int[] {first, second};
    }

    /** The pattern with the month first. */
    String monthFirst() {
        int date = pattern.indexOf('y');
        return pattern.substring(0, date).replace('d', '#').replace('M', 'd').replace('#', 'M')
                + pattern.substring(date);
    }

    /** A reader for this form with this pattern. */
    StampReader reader(ZoneId zone) {
        return time == LogFormat.TimeForm.ISO ? new IsoStamps(zone) : new PatternStamps(pattern, zone);
    }

    private static String clock(Matcher m, int at) {
        boolean twelve = m.group(at + 5) != null;
        String blank = "T".equals(m.group(at)) ? "'T'" : " ";
        String hours = twelve ? "hh" : "HH";
        String seconds = m.group(at + 3) != null ? ":ss" : "";
        String half = twelve ? (m.group(at + 5).startsWith(" ") ? " a" : "a") : "";
        return blank + hours + ":mm" + seconds + half;
    }
}
