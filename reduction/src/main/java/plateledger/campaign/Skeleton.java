package plateledger.campaign;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import plateledger.log.LogData;
import plateledger.log.LogFormat;
import plateledger.log.Series;
import plateledger.quantity.Unit;
import plateledger.rig.Instrument.SignalKind;
import plateledger.rig.InstrumentReader;
import plateledger.rig.RigReader;

/**
 * Text of a new campaign folder, commented throughout. It passes {@link CampaignReader} as it stands, with planned runs
 * only; what the user has to supply is invented and its line says "replace". From given logs it fills in the loggers with
 * the formats found, and the channels under the instruments that measure such quantities.
 */
public final class Skeleton {
    /** A pressure channel above this reads the barometer, below it a difference: no place with people is so high. */
    private static final double LOWEST_BAROMETER_PA = 30_000.0;

    /** Channels that the skeleton's rig file names. */
    private static final Map<SignalKind, List<String>> INVENTED = Map.of(
            SignalKind.TEMPERATURE, List.of("T01", "T02", "TW1", "TP1", "TF1", "TN1", "TT1", "TA1"),
            SignalKind.VOLTAGE, List.of("V1"),
            SignalKind.CURRENT, List.of("I1"),
            SignalKind.DIFFERENTIAL_PRESSURE, List.of("PD"),
            SignalKind.ABSOLUTE_PRESSURE, List.of("PB"),
            SignalKind.RELATIVE_HUMIDITY, List.of("RH"),
            SignalKind.SPEED, List.of());

    private static final String ANEMOMETER = """

            [instrument.anemometer]
            kind = "speed"
            channels = @speed@
            offset = "0 m/s, u = 0.02 m/s"           # replace
            gain = "0, u = 0.01"                     # replace
            channel_offset = "0 m/s (exact)"         # replace
            channel_gain = "0 (exact)"               # replace
            daily_drift = "0 m/s (exact)"            # replace
            range = ["0 m/s", "50 m/s"]              # replace
            """;

    private Skeleton() {}

    /**
     * The three files.
     *
     * @param logs logs to take loggers and channels from; may be empty
     * @return text by file name
     */
    public static Map<String, String> files(List<LogData> logs) {
        Map<SignalKind, Set<String>> channels = channels(logs);
        String listed = listed(logs);
        Map<String, String> files = new LinkedHashMap<>();
        files.put(CampaignReader.FILE, campaign(logs));
        files.put(RigReader.FILE, template("skeleton-rig.toml").replace("@channels@\n", listed));
        files.put(InstrumentReader.FILE, instruments(channels).replace("@channels@\n", listed));
        return files;
    }

    private static String campaign(List<LogData> logs) {
        Map<String, LogData> loggers = loggers(logs);
        String sections = loggers.isEmpty()
                ? loggerSection("plate", Optional.empty())
                : loggers.entrySet().stream()
                        .map(entry -> loggerSection(entry.getKey(), Optional.of(entry.getValue())))
                        .collect(Collectors.joining());
        Set<String> ids = loggers.isEmpty() ? Set.of("plate") : loggers.keySet();
        String example =
                ids.stream().map(id -> id + " = \"logs/…-" + id + ".csv\"").collect(Collectors.joining(", "));
        return template("skeleton-campaign.toml")
                .replace("@loggers@\n", sections)
                .replace("@logs@", example);
    }

    private static String loggerSection(String id, Optional<LogData> log) {
        String zone = log.filter(LogData::zoned).isPresent()
                ? ""
                : "# zone = \"Europe/Vienna\"               # of its time stamps, where it is not that of the campaign\n";
        return "\n[logger." + id + "]"
                + log.map(found -> " # as in " + oneLine(found.file())).orElse("") + "\n"
                + zone
                + "clock_offset = \"0 s, u = 1 s\"          # replace\n"
                + "clock_rate = \"0, u = 1e-5\"             # replace: seconds gained per second\n"
                + "# columns = { \"Title in the log\" = \"T01\" }  # channel by title, where they differ\n"
                + log.map(found -> formatSection(id, found.format())).orElse("");
    }

    private static String formatSection(String id, LogFormat format) {
        String delimiter = format.delimiter() == '\t' ? "tab" : String.valueOf(format.delimiter());
        return "[logger." + id + ".format]\n"
                + "delimiter = " + quoted(delimiter) + "\n"
                + "decimal_mark = " + quoted(String.valueOf(format.decimalMark())) + "\n"
                + "header_line = " + format.headerLine() + "\n"
                + "units_row = " + format.unitsRow() + "\n"
                + "time = " + quoted(format.time().word()) + "\n"
                + "time_pattern = " + quoted(format.timePattern()) + "\n"
                + "start_key = " + quoted(format.startKey()) + "\n";
    }

    /** One logger for each format and set of channels, named after the first file seen. */
    private static Map<String, LogData> loggers(List<LogData> logs) {
        Map<String, LogData> byLook = new LinkedHashMap<>();
        for (LogData log : logs) {
            String look = log.format() + "|"
                    + log.series().stream().map(Series::channel).toList();
            byLook.putIfAbsent(look, log);
        }
        Map<String, LogData> named = new LinkedHashMap<>();
        for (LogData log : byLook.values()) {
            String id = id(log.file());
            String free = id;
            for (int i = 2; named.containsKey(free); i++) {
                free = id + "-" + i;
            }
            named.put(free, log);
        }
        return named;
    }

    /** A bare key from the name of a log file without folder and ending. */
    private static String id(String file) {
        String name = file.substring(file.lastIndexOf('/') + 1);
        int dot = name.lastIndexOf('.');
        String id = (dot > 0 ? name.substring(0, dot) : name).replaceAll("[^A-Za-z0-9_-]+", "-");
        return id.replace("-", "").isEmpty() ? "logger" : id;
    }

    private static Map<SignalKind, Set<String>> channels(List<LogData> logs) {
        Map<SignalKind, Set<String>> channels = new TreeMap<>();
        Set<String> taken = new LinkedHashSet<>();
        INVENTED.forEach((kind, names) -> {
            channels.put(kind, new LinkedHashSet<>(names));
            taken.addAll(names);
        });
        for (LogData log : logs) {
            for (Series series : log.series()) {
                kind(series)
                        .filter(kind -> taken.add(series.channel()))
                        .ifPresent(kind -> channels.computeIfAbsent(kind, k -> new LinkedHashSet<>())
                                .add(series.channel()));
            }
        }
        return channels;
    }

    /** What a channel measures, by its unit; empty for units that no instrument has. */
    private static Optional<SignalKind> kind(Series series) {
        return Unit.find(series.unit()).flatMap(unit -> switch (unit.dimension()) {
            case TEMPERATURE, TEMPERATURE_DIFFERENCE -> Optional.of(SignalKind.TEMPERATURE);
            case VOLTAGE -> Optional.of(SignalKind.VOLTAGE);
            case CURRENT -> Optional.of(SignalKind.CURRENT);
            case SPEED -> Optional.of(SignalKind.SPEED);
            case PRESSURE -> Optional.of(pressureKind(series));
            case NUMBER -> unit == Unit.PERCENT ? Optional.of(SignalKind.RELATIVE_HUMIDITY) : Optional.empty();
            default -> Optional.empty();
        });
    }

    private static SignalKind pressureKind(Series series) {
        double mean = Arrays.stream(series.values())
                .filter(Double::isFinite)
                .average()
                .orElse(0.0);
        return mean > LOWEST_BAROMETER_PA ? SignalKind.ABSOLUTE_PRESSURE : SignalKind.DIFFERENTIAL_PRESSURE;
    }

    private static String instruments(Map<SignalKind, Set<String>> channels) {
        boolean anemometer = channels.entrySet().stream()
                .anyMatch(entry ->
                        entry.getKey() == SignalKind.SPEED && !entry.getValue().isEmpty());
        String text = template("skeleton-instruments.toml").replace("@anemometer@\n", anemometer ? ANEMOMETER : "");
        for (Map.Entry<SignalKind, Set<String>> entry : channels.entrySet()) {
            String word = entry.getKey().name().toLowerCase(Locale.ROOT).replace('_', '-');
            String list = entry.getValue().stream().map(Skeleton::quoted).collect(Collectors.joining(", ", "[", "]"));
            text = text.replace("@" + word + "@", list + " # replace");
        }
        return text;
    }

    /** Comment lines that list the channels found, so that the user can copy their names. */
    private static String listed(List<LogData> logs) {
        StringBuilder text = new StringBuilder();
        for (LogData log : logs) {
            text.append("# Channels of ").append(oneLine(log.file())).append(":\n");
            log.series()
                    .forEach(series -> text.append("#   ")
                            .append(oneLine(series.channel()))
                            .append(" [")
                            .append(oneLine(series.unit()))
                            .append("]\n"));
        }
        return text.toString();
    }

    /** A text as a TOML string. */
    private static String quoted(String text) {
        StringBuilder out = new StringBuilder("\"");
        text.codePoints().forEach(c -> {
            if (c == '"' || c == '\\') {
                out.append('\\').appendCodePoint(c);
            } else if (Character.isISOControl(c)) {
                out.append(String.format(Locale.ROOT, "\\u%04X", c));
            } else {
                out.appendCodePoint(c);
            }
        });
        return out.append('"').toString();
    }

    private static String oneLine(String text) {
        return text.replaceAll("\\p{Cntrl}", " ");
    }

    private static String template(String name) {
        try (InputStream in = Skeleton.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalStateException("the program lacks its own file " + name);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(name, e);
        }
    }
}
