package plateledger.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import plateledger.log.LogData;
import plateledger.log.LogFormat;
import plateledger.log.Series;
import plateledger.quantity.Dimension;
import plateledger.quantity.Unit;

/** The texts of a new campaign: examples throughout, with the loggers and channels of given logs where there are any. */
final class Skeleton {
    private static final String LOGGERS_MARK = "#@loggers\n";
    private static final String CHANNELS_MARK = "#@channels\n";

    /**
     * A log that was looked at.
     *
     * @param logger name of its logger
     * @param data the log
     */
    record Logged(String logger, LogData data) {}

    private final String title;
    private final List<Logged> logs;

    Skeleton(String title, List<Logged> logs) {
        this.title = title;
        this.logs = List.copyOf(logs);
    }

    /** Text by file name. */
    Map<String, String> files() {
        Map<String, String> files = new LinkedHashMap<>();
        files.put(
                "campaign.toml",
                resource("campaign.toml").replace("@title@", quoted(title)).replace(LOGGERS_MARK, loggers()));
        files.put("rig.toml", resource("rig.toml"));
        files.put("instruments.toml", resource("instruments.toml").replace(CHANNELS_MARK, channels()));
        return files;
    }

    /** A logger's name from a file's: the last word of letters before the ending, e.g. {@code plate} of {@code B03-plate.txt}. */
    static String loggerName(String file) {
        int dot = file.lastIndexOf('.');
        String stem = dot > 0 ? file.substring(0, dot) : file;
        String[] words = stem.split("[^A-Za-z]+", -1);
        for (int i = words.length - 1; i >= 0; i--) {
            if (words[i].length() > 1) {
                return words[i].toLowerCase(Locale.ROOT);
            }
        }
        return "logger";
    }

    private String loggers() {
        StringBuilder text = new StringBuilder();
        for (Logged log : logs) {
            LogFormat f = log.data().format();
            text.append("\n# As found in ")
                    .append(log.data().file())
                    .append(": ")
                    .append(log.data().rows());
            text.append(" rows, one every ")
                    .append(String.format(Locale.ROOT, "%.3g", log.data().intervalS()));
            text.append(" s.\n# logs = { ")
                    .append(log.logger())
                    .append(" = \"logs/")
                    .append(log.data().file());
            text.append("\" } in the run it belongs to.\n");
            text.append("[logger.").append(log.logger()).append("]\n");
            text.append("clock_offset = \"0 s, u = 1 s\"   # its clock minus true time, with what you know of it\n");
            text.append("[logger.").append(log.logger()).append(".format]\n");
            text.append("delimiter = ")
                    .append(quoted(String.valueOf(f.delimiter())))
                    .append('\n');
            text.append("decimal_mark = ")
                    .append(quoted(String.valueOf(f.decimalMark())))
                    .append('\n');
            text.append("header_line = ").append(f.headerLine()).append('\n');
            text.append("units_row = ").append(f.unitsRow()).append('\n');
            text.append("time = ").append(quoted(f.time().word())).append('\n');
            if (!f.timePattern().isEmpty()) {
                text.append("time_pattern = ").append(quoted(f.timePattern())).append('\n');
            }
            if (!f.startKey().isEmpty()) {
                text.append("start_key = ").append(quoted(f.startKey())).append('\n');
            }
        }
        return text.toString();
    }

    private String channels() {
        StringBuilder text = new StringBuilder();
        for (Logged log : logs) {
            Map<String, List<String>> byUnit = new LinkedHashMap<>();
            for (Series series : log.data().series()) {
                byUnit.computeIfAbsent(series.unit(), u -> new ArrayList<>()).add(series.channel());
            }
            text.append("\n# Columns of ").append(log.data().file()).append(", by unit:\n");
            byUnit.forEach((unit, names) -> text.append("#   ")
                    .append(unit.isEmpty() ? "no unit" : unit)
                    .append(" (")
                    .append(kind(unit))
                    .append("): channels = [")
                    .append(names.stream().map(Skeleton::quoted).collect(Collectors.joining(", ")))
                    .append("]\n"));
        }
        return text.toString();
    }

    private static String kind(String unit) {
        Dimension dimension = Unit.find(unit).map(Unit::dimension).orElse(Dimension.NUMBER);
        return switch (dimension) {
            case TEMPERATURE, TEMPERATURE_DIFFERENCE -> "kind = \"temperature\"";
            case VOLTAGE -> "kind = \"voltage\"";
            case CURRENT -> "kind = \"current\"";
            case PRESSURE -> "kind = \"differential-pressure\" or \"absolute-pressure\"";
            case SPEED -> "kind = \"speed\"";
            default -> unit.equals("%") ? "kind = \"relative-humidity\"" : "not a kind that is read";
        };
    }

    private static String quoted(String text) {
        return '"' + text.replace("\\", "\\\\").replace("\"", "\\\"").replace("\t", "\\t") + '"';
    }

    private static String resource(String name) {
        try (InputStream in = Skeleton.class.getResourceAsStream("skeleton/" + name)) {
            if (in == null) {
                throw new IOException("skeleton " + name + " is missing from the program");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
