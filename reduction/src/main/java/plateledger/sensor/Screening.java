package plateledger.sensor;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.log.Series;
import plateledger.quantity.Dimension;
import plateledger.quantity.Unit;
import plateledger.rig.Instrument;
import plateledger.rig.Instrument.SignalKind;

/**
 * Flags readings that must not be used: outside the instrument's range, part of a stuck stretch, spikes. Values are never
 * changed or removed, and everything flagged is reported. Physics first (range), then stuck stretches, then spikes among
 * what is left, since the edge of a stuck stretch looks like a spike.
 */
public final class Screening {
    private Screening() {}

    /**
     * Screens one channel by itself. A stuck stretch is told from the channel's own noise elsewhere in the log; a channel
     * whose noise is hidden by its resolution (a barometer, a steady supply) is never called stuck.
     *
     * @param series the channel as read
     * @param instrument the instrument it belongs to
     */
    public static Screened screen(Series series, Instrument instrument) {
        return screen(series, instrument, Like.NONE);
    }

    /**
     * Screens channels of one instrument that sample together; whether a stretch is stuck is decided by what the others
     * do at the same time. Needs at least three others whose noise can be seen, else each is screened by itself.
     *
     * @param like channels of one instrument from one log
     * @param instrument that instrument
     * @return one result for each series, in the same order
     */
    public static List<Screened> screenAll(List<Series> like, Instrument instrument) {
        List<Runs> runs = new ArrayList<>(like.size());
        for (Series series : like) {
            runs.add(Runs.of(series, instrument.resolution()));
        }
        List<Boolean> noisy = runs.stream().map(Runs::noiseSeen).toList();
        List<Screened> screened = new ArrayList<>(like.size());
        for (int i = 0; i < like.size(); i++) {
            screened.add(screen(like.get(i), instrument, Like.others(runs, noisy, i)));
        }
        return screened;
    }

    private static Screened screen(Series series, Instrument instrument, Like like) {
        byte[] flags = series.flags().clone();
        List<Finding> findings = new ArrayList<>();
        unit(series, instrument, findings);
        range(series, instrument, flags, findings);
        Series ranged = with(series, flags);
        Runs runs = Runs.of(ranged, instrument.resolution());
        stuck(ranged, runs, like, flags, findings);
        spikes(ranged, runs.step(), flags, findings);
        if (instrument.kind() == SignalKind.TEMPERATURE && runs.singleValue() && count(flags, Series.Flag.STUCK) == 0) {
            findings.add(finding(
                    "SENSOR-ONE-VALUE",
                    Level.NOT_CHECKED,
                    series,
                    0,
                    "one value in all " + runs.samples() + " samples",
                    "some noise",
                    "Quiet or stuck cannot be told from this channel alone; look at its neighbours."));
        }
        return new Screened(with(series, flags), findings);
    }

    private static void unit(Series series, Instrument instrument, List<Finding> findings) {
        Dimension wanted = dimension(instrument.kind());
        if (series.unit().isEmpty()) {
            findings.add(finding(
                    "SENSOR-UNIT",
                    Level.CAUTION,
                    series,
                    0,
                    "no unit in the log",
                    wanted.word() + " in " + wanted.units(),
                    "The numbers are taken as SI; write the unit into the title or a units row."));
        } else if (Unit.find(series.unit()).filter(unit -> unit.fits(wanted)).isEmpty()) {
            findings.add(finding(
                    "SENSOR-UNIT",
                    Level.STOP,
                    series,
                    0,
                    "unit " + series.unit(),
                    wanted.word() + " in " + wanted.units(),
                    "Give the channel to the right instrument, or correct the unit in the log's titles."));
        }
    }

    private static Dimension dimension(SignalKind kind) {
        return switch (kind) {
            case TEMPERATURE -> Dimension.TEMPERATURE;
            case VOLTAGE -> Dimension.VOLTAGE;
            case CURRENT -> Dimension.CURRENT;
            case DIFFERENTIAL_PRESSURE, ABSOLUTE_PRESSURE -> Dimension.PRESSURE;
            case SPEED -> Dimension.SPEED;
            case RELATIVE_HUMIDITY -> Dimension.NUMBER;
        };
    }

    private static void range(Series series, Instrument instrument, byte[] flags, List<Finding> findings) {
        double[] v = series.values();
        int n = 0;
        int first = 0;
        for (int i = 0; i < v.length; i++) {
            if (flags[i] == Series.Flag.VALID.code()
                    && (v[i] < instrument.rangeLow() || v[i] > instrument.rangeHigh())) {
                flags[i] = Series.Flag.OUT_OF_RANGE.code();
                first = n++ == 0 ? i : first;
            }
        }
        if (n > 0) {
            findings.add(finding(
                    "SENSOR-RANGE",
                    Level.CAUTION,
                    series,
                    first,
                    counted(n, "reading") + " out of range, the first " + si(series, v[first]),
                    si(series, instrument.rangeLow()) + " to " + si(series, instrument.rangeHigh()),
                    "They are left out; check the sensor and its wiring."));
        }
    }

    private static void stuck(Series series, Runs runs, Like like, byte[] flags, List<Finding> findings) {
        int limit = like.decides() ? like.limit() : runs.ownLimit();
        int n = 0;
        int first = 0;
        int longest = 0;
        for (int r = 0; r < runs.count(); r++) {
            if (runs.length(r) >= limit && (!like.decides() || like.othersVary(runs.start(r), runs.end(r)))) {
                first = n == 0 ? runs.start(r) : first;
                n += runs.length(r);
                longest = Math.max(longest, runs.length(r));
                for (int i = runs.start(r); i < runs.end(r); i++) {
                    flags[i] = flags[i] == Series.Flag.VALID.code() ? Series.Flag.STUCK.code() : flags[i];
                }
            }
        }
        if (n > 0) {
            findings.add(finding(
                    "SENSOR-STUCK",
                    Level.CAUTION,
                    series,
                    first,
                    counted(n, "reading") + " stuck, up to " + longest + " in a row at "
                            + si(series, series.values()[first]),
                    "runs of equal readings shorter than " + limit,
                    "They are left out; check the sensor and the logger's channel."));
        }
    }

    private static void spikes(Series series, double step, byte[] flags, List<Finding> findings) {
        int[] spikes = Hampel.spikes(series.values(), flags, step);
        for (int i : spikes) {
            flags[i] = Series.Flag.SPIKE.code();
        }
        if (spikes.length > 0) {
            findings.add(finding(
                    "SENSOR-SPIKE",
                    Level.NOTE,
                    series,
                    spikes[0],
                    counted(spikes.length, "spike") + ", the first " + si(series, series.values()[spikes[0]]),
                    "readings near those before and after",
                    "They are left out."));
        }
    }

    private static String counted(int n, String what) {
        return n + " " + what + (n == 1 ? "" : "s");
    }

    /** A value in the channel's SI unit. */
    private static String si(Series series, double value) {
        return String.format(Locale.ROOT, "%.6g", value)
                + (series.unit().isEmpty() || series.unit().equals("1") ? "" : " " + series.unit());
    }

    private static int count(byte[] flags, Series.Flag flag) {
        int n = 0;
        for (byte f : flags) {
            n += f == flag.code() ? 1 : 0;
        }
        return n;
    }

    private static Series with(Series s, byte[] flags) {
        return new Series(s.channel(), s.unit(), s.file(), s.timesS(), s.values(), flags, s.lines());
    }

    private static Finding finding(
            String id, Level level, Series series, int index, String found, String expected, String remedy) {
        int line = index < series.size() ? series.lines()[index] : 0;
        return new Finding(
                id,
                level,
                new Place(series.file(), line, 0),
                "channel " + series.channel(),
                found,
                expected,
                remedy,
                "");
    }
}
