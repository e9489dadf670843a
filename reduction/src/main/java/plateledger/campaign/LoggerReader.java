package plateledger.campaign;

import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.keyfile.Form;
import plateledger.keyfile.KeyTable;
import plateledger.log.LogFormat;
import plateledger.quantity.Dimension;
import plateledger.quantity.Stated;

/** Reads one {@code [logger.<id>]} of {@code campaign.toml}. */
final class LoggerReader {
    private static final Map<String, Character> DELIMITERS = ordered(",", ',', ";", ';', "\t", '\t', "tab", '\t');
    private static final Map<String, Character> DECIMAL_MARKS = ordered(".", '.', ",", ',');

    private LoggerReader() {}

    static Logger read(String id, KeyTable t, ZoneId campaignZone, Collection<Finding> findings) {
        Optional<Stated> offset = t.find("clock_offset", Form.measured(Dimension.TIME));
        if (!t.has("clock_offset")) {
            findings.add(new Finding(
                    "CAMPAIGN-CLOCK",
                    Level.CAUTION,
                    t.place(),
                    t.path() + ".clock_offset",
                    "no such key",
                    "what this logger's clock shows minus true time, with its uncertainty",
                    "The clock counts as right; declare clock_offset if it is not, or \"0 s, u = 1 s\" if it was set.",
                    ""));
        }
        Stated rate = t.take("clock_rate", Form.measured(Dimension.NUMBER), Stated.exact(0.0), "0 (exact)");
        t.require(Math.abs(rate.value()) < 0.01, "clock_rate", "between -0.01 and 0.01");
        return new Logger(
                id,
                t.findTable("format", LoggerReader::format),
                t.take("zone", Form.zone(), campaignZone, "zone of the campaign"),
                offset.orElse(Stated.exact(0.0)),
                rate,
                offset.isPresent(),
                t.textsByName("columns", "title"));
    }

    private static LogFormat format(KeyTable t) {
        LogFormat.TimeForm time = t.need("time", Form.choice(LogFormat.TimeForm.class, LogFormat.TimeForm::word));
        LogFormat format = new LogFormat(
                t.need("delimiter", Form.choice(DELIMITERS)),
                t.need("decimal_mark", Form.choice(DECIMAL_MARKS)),
                t.need("header_line", Form.whole(1)),
                t.take("units_row", Form.flag(), false, "false"),
                time,
                t.take("time_pattern", pattern(), "", "\"\""),
                t.take("start_key", Form.anyText(), "", "\"\""));
        if (t.sound("delimiter", "decimal_mark") && format.delimiter() == format.decimalMark()) {
            t.refuse("decimal_mark", "KEY-RANGE", "another sign than the delimiter", "");
        }
        boolean wantsPattern = t.sound("time") && time == LogFormat.TimeForm.PATTERN;
        if (wantsPattern && format.timePattern().isEmpty()) {
            t.refuse("time_pattern", "KEY-MISSING", "no pattern", "a pattern such as \"dd.MM.yyyy HH:mm:ss\"", "");
        }
        return format;
    }

    private static Form<String> pattern() {
        return Form.of("text", "a pattern such as \"dd.MM.yyyy HH:mm:ss\"", "", text -> {
            try {
                DateTimeFormatter unused = DateTimeFormatter.ofPattern(text, Locale.ROOT);
                return Optional.of(text);
            } catch (IllegalArgumentException e) {
                return Optional.empty();
            }
        });
    }

    private static Map<String, Character> ordered(Object... wordsAndMarks) {
        Map<String, Character> map = new LinkedHashMap<>();
        for (int i = 0; i < wordsAndMarks.length; i += 2) {
            map.put((String) wordsAndMarks[i], (Character) wordsAndMarks[i + 1]);
        }
        return map;
    }
}
