package plateledger.log;

import java.time.ZoneId;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The lines above the titles: {@code key: value}, also with {@code =}, semicolon, comma or tab between. */
final class Preamble {
    private static final Pattern ENTRY =
            Pattern.compile("^[\\s#\"]*([^:=;,\\t]+?)[\\s\"]*[:=;,\\t][\\s\"]*(.+?)[\\s;,\"]*$");

    private Preamble() {}

    /**
     * A start time.
     *
     * @param key the key it stands behind
     * @param value the text of the value
     * @param seconds the time, s since 1970-01-01T00:00Z
     * @param zoned true if the text carries its zone
     * @param orderOpen true if day and month cannot be told apart
     */
    record Start(String key, String value, double seconds, boolean zoned, boolean orderOpen) {}

    /** The start time behind the key; for an empty key the first time found, lines that speak of a start before others. */
    static Optional<Start> start(List<String> lines, String key, ZoneId zone) {
        Optional<Start> other = Optional.empty();
        for (String line : lines) {
            Matcher m = ENTRY.matcher(line);
            if (!m.matches()) {
                continue;
            }
            Optional<Start> found = time(m.group(1), m.group(2), zone);
            if (found.isPresent() && !key.isEmpty() && bare(m.group(1)).equals(bare(key))) {
                return found;
            }
            if (found.isPresent() && key.isEmpty()) {
                if (bare(m.group(1)).contains("start")) {
                    return found;
                }
                other = other.isPresent() ? other : found;
            }
        }
        return other;
    }

    private static String bare(String key) {
        String k = key.strip().toLowerCase(Locale.ROOT);
        return k.endsWith(":") || k.endsWith("=")
                ? k.substring(0, k.length() - 1).strip()
                : k;
    }

    private static Optional<Start> time(String key, String value, ZoneId zone) {
        return StampForm.of(value).flatMap(form -> {
            boolean open = form.orderOpen() && form.first() <= 12 && form.second() <= 12 && form.separator() != '.';
            String pattern = form.orderOpen() && form.second() > 12 ? form.monthFirst() : form.pattern();
            StampReader reader =
                    form.time() == LogFormat.TimeForm.ISO ? new IsoStamps(zone) : new PatternStamps(pattern, zone);
            double seconds = reader.seconds(value);
            return Double.isNaN(seconds)
                    ? Optional.empty()
                    : Optional.of(new Start(key.strip(), value.strip(), seconds, reader.zoned(), open));
        });
    }
}
