package plateledger.demo.app;

import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import plateledger.demo.sensor.ChannelErrors;
import plateledger.demo.sensor.ChannelNoise;
import plateledger.demo.sensor.Channels;
import plateledger.demo.sensor.Draws;
import plateledger.demo.sensor.LoggerClock;

/** What one logger writes in one run, each in a text style of its own. */
final class LogText {
    private static final DateTimeFormatter DOTTED = DateTimeFormatter.ofPattern("dd.MM.yyyy HH:mm:ss", Locale.ROOT);
    private static final DateTimeFormatter DASHED = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm:ss", Locale.ROOT);

    /** A logger's way of writing. */
    enum Style {
        /** Semicolons, decimal commas, preamble, units row, day.month.year. */
        PLATE("plate", ".txt", 20, StandardCharsets.ISO_8859_1),
        /** Commas, ISO 8601 with zone, units in the titles. */
        POWER("power", ".csv", 12, StandardCharsets.UTF_8),
        /** Tabs, elapsed seconds from a start in the preamble. */
        TUNNEL("tunnel", ".tsv", 31, StandardCharsets.UTF_8);

        private final String id;
        private final String suffix;
        private final int leadS;
        private final Charset charset;

        Style(String id, String suffix, int leadS, Charset charset) {
            this.id = id;
            this.suffix = suffix;
            this.leadS = leadS;
            this.charset = charset;
        }

        /** The logger's name in the campaign file. */
        String id() {
            return id;
        }

        /** The clock. */
        LoggerClock clock() {
            return switch (this) {
                case PLATE -> LoggerClock.PLATE;
                case POWER -> LoggerClock.POWER;
                case TUNNEL -> LoggerClock.TUNNEL;
            };
        }

        /** File of a run, relative to the campaign folder. */
        String file(String runId) {
            return "logs/" + runId + "-" + id + suffix;
        }

        private List<String> channels(RunHistory history) {
            return switch (this) {
                case PLATE ->
                    history.channels().stream()
                            .filter(Channels.PLATE_AND_COVER::contains)
                            .toList();
                case POWER -> Channels.POWER;
                case TUNNEL -> Channels.TUNNEL;
            };
        }

        private int intervalS(RunPlan plan) {
            return (int) (this == TUNNEL ? plan.tunnelIntervalS() : plan.intervalS());
        }
    }

    private final Style style;
    private final RunHistory history;
    private final RunPlan plan;
    private final Draws draws;
    private final ChannelErrors errors;
    private final List<String> channels;
    private final int intervalS;
    private final long startStamp;
    private final double startTrue;
    private final double rate;

    private LogText(Style style, RunHistory history, Draws draws, ChannelErrors errors) {
        this.style = style;
        this.history = history;
        this.draws = draws;
        this.errors = errors;
        plan = history.plan();
        channels = style.channels(history);
        intervalS = style.intervalS(plan);
        double offset = style.clock().trueOffsetS(draws);
        rate = style.clock().trueRate(draws);
        startStamp = (long) Math.floor(plan.startS() - style.leadS + offset);
        startTrue = startStamp - offset;
    }

    /** The bytes of one log file. */
    static byte[] write(Style style, RunHistory history, Draws draws, ChannelErrors errors) {
        return new LogText(style, history, draws, errors).text().getBytes(style.charset);
    }

    private String text() {
        int rows = 1 + (int) Math.floor((plan.startS() + plan.durationS() - startTrue) * (1.0 + rate) / intervalS);
        double[][] columns = readings(rows);
        StringBuilder out = new StringBuilder(rows * (channels.size() * 8 + 24));
        header(out);
        for (int row = 0; row < rows; row++) {
            if (hit("", row) != null) {
                continue;
            }
            stamp(out, row);
            for (int c = 0; c < channels.size(); c++) {
                cell(out, c, columns[c], row);
            }
            out.append(style == Style.PLATE ? "\r\n" : "\n");
        }
        return out.toString();
    }

    /** What the channels show, in the units of the file. */
    private double[][] readings(int rows) {
        double[] ripple = new double[rows];
        if (style == Style.POWER && !draws.isNone()) {
            ChannelNoise.Sequence sequence =
                    new ChannelNoise(1.0, 0.6).sequence(draws.generator("run:" + plan.id() + "/ripple"), intervalS);
            for (int row = 0; row < rows; row++) {
                ripple[row] = 0.0005 * sequence.next(); // of voltage and of current: 0.1 % of power
            }
        }
        double[][] out = new double[channels.size()][rows];
        for (int c = 0; c < channels.size(); c++) {
            String channel = channels.get(c);
            int source = history.channels().indexOf(channel);
            // Wind and supply noise grow with the signal: taken at the end of the run, where it is established.
            ChannelNoise noise = ChannelNoise.of(channel, history.value(source, plan.durationS()));
            ChannelNoise.Sequence sequence =
                    noise.sequence(draws.generator("run:" + plan.id() + "/" + channel + "/noise"), intervalS);
            double size = draws.isNone() ? 0.0 : noise.deviation();
            for (int row = 0; row < rows; row++) {
                double tau = startTrue + row * intervalS / (1.0 + rate) - plan.startS();
                double truth = history.value(source, tau) * (1.0 + ripple[row]);
                double reading = errors.reading(channel, plan.day(), SimulatedCampaign.moment(plan), truth);
                out[c][row] = inFile(channel, reading + size * sequence.next());
            }
        }
        return out;
    }

    private void header(StringBuilder out) {
        switch (style) {
            case PLATE -> {
                out.append("Messdatenerfassung Platte\r\n");
                out.append("Kanäle: ").append(channels.size()).append("\r\n");
                out.append("Intervall: ").append(intervalS).append(" s\r\n");
                out.append("Lauf: ").append(plan.id()).append("\r\n");
                out.append("Bemerkung: Temperaturen in °C, Vergleichsstelle intern\r\n");
                out.append("\r\n");
                out.append("Zeit");
                channels.forEach(channel -> out.append(';').append(channel));
                out.append("\r\n");
                channels.forEach(channel -> out.append(";°C"));
                out.append("\r\n");
            }
            case POWER -> {
                out.append('\uFEFF').append("Time");
                channels.forEach(channel -> out.append(',')
                        .append(channel)
                        .append(" [")
                        .append(unit(channel))
                        .append(']'));
                out.append('\n');
            }
            case TUNNEL -> {
                out.append("Tunnel data system\n");
                out.append("Run: ").append(plan.id()).append('\n');
                out.append("Start: ")
                        .append(DASHED.format(Schedule.local(startStamp)))
                        .append('\n');
                out.append("Elapsed [s]");
                channels.forEach(channel -> out.append('\t')
                        .append(channel)
                        .append(" [")
                        .append(unit(channel))
                        .append(']'));
                out.append('\n');
            }
        }
    }

    private void stamp(StringBuilder out, int row) {
        long elapsed = (long) row * intervalS;
        switch (style) {
            case PLATE -> out.append(DOTTED.format(Schedule.local(startStamp + elapsed)));
            case POWER -> {
                DateTimeFormatter.ISO_LOCAL_DATE_TIME.formatTo(Schedule.local(startStamp + elapsed), out);
                // ISO_LOCAL_DATE_TIME always writes the seconds.
                out.append("+01:00");
            }
            case TUNNEL -> out.append(elapsed).append(".0");
        }
    }

    private void cell(StringBuilder out, int c, double[] column, int row) {
        char delimiter = style == Style.PLATE ? ';' : style == Style.POWER ? ',' : '\t';
        String channel = channels.get(c);
        out.append(delimiter);
        double value = column[row];
        Blemish blemish = hit(channel, row);
        if (blemish != null) {
            switch (blemish.kind()) {
                case OVER_RANGE -> {
                    out.append(style == Style.PLATE ? "OVER" : "9.9E37");
                    return;
                }
                case EMPTY, GAP -> {
                    return;
                }
                case STUCK -> value = column[blemish.fromRow()];
                case SPIKE -> value += 9.0;
            }
        }
        fixed(out, value, decimals(channel), style == Style.PLATE ? ',' : '.');
    }

    private @org.jspecify.annotations.Nullable Blemish hit(String cell, int row) {
        for (Blemish blemish : Blemish.ALL) {
            if (blemish.hits(plan.id(), style.id, cell, row)) {
                return blemish;
            }
        }
        return null;
    }

    private static String unit(String channel) {
        return switch (channel) {
            case Channels.PITOT -> "Pa";
            case Channels.ANEMOMETER -> "m/s";
            case Channels.PRESSURE -> "hPa";
            case Channels.HUMIDITY -> "%";
            case Channels.AIR -> "°C";
            default -> channel.charAt(0) == 'V' ? "V" : channel.charAt(0) == 'I' ? "A" : "°C";
        };
    }

    private static double inFile(String channel, double si) {
        return switch (unit(channel)) {
            case "°C" -> si - 273.15;
            case "hPa", "%" -> unit(channel).equals("%") ? 100.0 * si : 0.01 * si;
            default -> si;
        };
    }

    /** Decimals that make one step of the file the declared resolution. */
    private int decimals(String channel) {
        double step = errors.resolution(channel);
        double inFile = switch (unit(channel)) {
            case "hPa" -> 0.01 * step;
            case "%" -> 100.0 * step;
            default -> step;
        };
        return (int) Math.round(-Math.log10(inFile));
    }

    /** Writes a number with fixed decimals, rounded half up. */
    static void fixed(StringBuilder out, double value, int decimals, char mark) {
        long scale = 1;
        for (int i = 0; i < decimals; i++) {
            scale *= 10;
        }
        long steps = Math.round(value * scale);
        if (steps < 0) {
            out.append('-');
            steps = -steps;
        }
        out.append(steps / scale);
        if (decimals > 0) {
            out.append(mark);
            String rest = Long.toString(steps % scale);
            out.append("0".repeat(decimals - rest.length())).append(rest);
        }
    }

    /** All files of a run by name relative to the campaign folder. */
    static List<NamedBytes> all(RunHistory history, Draws draws, ChannelErrors errors) {
        List<NamedBytes> out = new ArrayList<>();
        for (Style style : Style.values()) {
            out.add(new NamedBytes(style.file(history.plan().id()), write(style, history, draws, errors)));
        }
        return out;
    }

    /**
     * A file to be.
     *
     * @param file name relative to the campaign folder
     * @param bytes its contents
     */
    record NamedBytes(String file, byte[] bytes) {}
}
