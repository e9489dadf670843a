package plateledger.log;

import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;

/**
 * Local stamps of a pattern in the letters of {@link java.time.format.DateTimeFormatter}: y, M, d, H, h, m, s, S, a; any
 * other letter is refused. One or two digits are taken for d, M, H and h whatever their number of letters; a two-digit year
 * lies in 2000..2099; a fraction of a second after the seconds is taken even if the pattern does not show it.
 */
final class PatternStamps implements StampReader {
    private static final String LETTERS = "yMdHhmsSa";

    private final String pattern;
    private final char[] kinds; // a pattern letter, or '\0' for a literal
    private final int[] widths; // its number of letters, or the literal
    private final LocalClock clock;
    private final StampCursor cursor = new StampCursor();

    /**
     * Takes a pattern apart.
     *
     * @throws IllegalArgumentException if the pattern holds a letter that cannot be read, or lacks date or time
     */
    PatternStamps(String pattern, ZoneId zone) {
        this.pattern = pattern;
        this.clock = new LocalClock(zone);
        List<int[]> parts = new ArrayList<>();
        boolean quoted = false;
        StringBuilder seen = new StringBuilder();
        for (int i = 0; i < pattern.length(); i++) {
            char c = pattern.charAt(i);
            if (c == '\'') {
                quoted = !quoted;
            } else if (!quoted && Character.isLetter(c)) {
                if (LETTERS.indexOf(c) < 0) {
                    throw new IllegalArgumentException("letter '" + c + "' in time pattern \"" + pattern + "\"");
                }
                int n = 1;
                while (i + 1 < pattern.length() && pattern.charAt(i + 1) == c) {
                    i++;
                    n++;
                }
                seen.append(c);
                parts.add(new int[] {c, n});
            } else {
                parts.add(new int[] {0, c});
            }
        }
        String letters = seen.toString();
        boolean hours = letters.contains("H") || (letters.contains("h") && letters.contains("a"));
        if (!letters.contains("y") || !letters.contains("M") || !letters.contains("d") || !hours) {
            throw new IllegalArgumentException("time pattern \"" + pattern + "\" lacks year, month, day or hour");
        }
        kinds = new char[parts.size()];
        widths = new int[parts.size()];
        for (int i = 0; i < kinds.length; i++) {
            kinds[i] = (char) parts.get(i)[0];
            widths[i] = parts.get(i)[1];
        }
    }

    @Override
    public double seconds(char[] text, int offset, int length, double previous) {
        cursor.over(text, offset, length);
        int year = 0;
        int month = 0;
        int day = 0;
        int hour = 0;
        int minute = 0;
        int second = 0;
        double fraction = 0.0;
        boolean twelve = false;
        boolean afternoon = false;
        for (int i = 0; i < kinds.length; i++) {
            int got = 0;
            switch (kinds[i]) {
                case 'y' -> {
                    got = widths[i] == 2 ? cursor.digits(2, 2) : cursor.digits(4, 4);
                    year = widths[i] == 2 ? 2000 + got : got;
                }
                case 'M' -> month = got = cursor.digits(1, 2);
                case 'd' -> day = got = cursor.digits(1, 2);
                case 'H' -> hour = got = cursor.digits(1, 2);
                case 'h' -> {
                    hour = got = cursor.digits(1, 2);
                    twelve = true;
                }
                case 'm' -> minute = got = cursor.digits(2, 2);
                case 's' -> {
                    second = got = cursor.digits(2, 2);
                    boolean shown = i + 1 < kinds.length && kinds[i + 1] == 0 && widths[i + 1] == cursor.peek();
                    fraction = shown ? 0.0 : cursor.fraction();
                }
                case 'S' -> fraction = cursor.fractionDigits();
                case 'a' -> {
                    afternoon = cursor.take('P') || cursor.take('p');
                    boolean known = afternoon || cursor.take('A') || cursor.take('a');
                    got = known && (cursor.take('M') || cursor.take('m')) ? 0 : -1;
                }
                default -> got = cursor.take((char) widths[i]) ? 0 : -1;
            }
            if (got < 0) {
                return Double.NaN;
            }
        }
        if (twelve) {
            if (hour < 1 || hour > 12) {
                return Double.NaN;
            }
            hour = hour % 12 + (afternoon ? 12 : 0);
        }
        long local = cursor.atEnd() ? clock.localSecond(year, month, day, hour, minute, second) : Long.MIN_VALUE;
        return local == Long.MIN_VALUE ? Double.NaN : clock.instant(local, fraction, previous);
    }

    @Override
    public boolean zoned() {
        return false;
    }

    @Override
    public String expected() {
        return "a time of the form " + pattern;
    }
}
