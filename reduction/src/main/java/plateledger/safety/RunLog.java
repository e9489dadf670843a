package plateledger.safety;

import java.time.Instant;
import java.time.ZoneId;
import java.time.ZonedDateTime;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import plateledger.campaign.Campaign;
import plateledger.campaign.Logger;
import plateledger.campaign.Run;
import plateledger.finding.Place;
import plateledger.log.Series;
import plateledger.rig.Instrument;
import plateledger.rig.Plate;
import plateledger.sensor.Clock;
import plateledger.sensor.HeaterPower;
import plateledger.sensor.InstrumentEquation;

/** The screened series of one run with what safety needs of them: true times, expanded values, heater power. */
final class RunLog {
    private static final DateTimeFormatter STAMP = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm:ss", Locale.ROOT);
    /** Share of the highest power above which a heater counts as on. */
    private static final double ON_SHARE = 0.05;
    /** Power below which nothing is heated, W. */
    private static final double NOTHING_W = 0.5;

    private final Campaign campaign;
    private final Run run;
    private final Plate plate;
    private final List<Series> series;
    private final List<StripPower> strips;
    private final double highestPowerW;
    private final List<Stretch> heated;
    private final Optional<Peak> hottest;

    /**
     * Looks at the log of one run.
     *
     * @param campaign the campaign
     * @param run the run
     * @param plate the plate mounted
     * @param series its screened series
     */
    RunLog(Campaign campaign, Run run, Plate plate, List<Series> series) {
        this.campaign = campaign;
        this.run = run;
        this.plate = plate;
        this.series = List.copyOf(series);
        this.strips = findStrips();
        TotalPower total = totalPower();
        this.highestPowerW = Arrays.stream(total.watts()).max().orElse(0.0);
        this.heated = findHeated(total);
        this.hottest = plate.thermocouples().stream()
                .map(thermocouple -> peak(thermocouple.channel()))
                .flatMap(Optional::stream)
                .max(Comparator.comparingDouble(Peak::upper));
    }

    Campaign campaign() {
        return campaign;
    }

    Run run() {
        return run;
    }

    Plate plate() {
        return plate;
    }

    /** The power of each strip whose channels are in the log, in strip order. */
    List<StripPower> strips() {
        return strips;
    }

    /** Highest total power, W; 0 without a log of it. */
    double highestPower() {
        return highestPowerW;
    }

    /** When the heater was on: above 5 % of the set power (of the highest logged where none is set). */
    List<Stretch> heated() {
        return heated;
    }

    /** The hottest junction on the plate over the whole log, by its upper bound. */
    Optional<Peak> hottest() {
        return hottest;
    }

    Optional<Series> channel(String name) {
        return series.stream().filter(s -> s.channel().equals(name)).findFirst();
    }

    /** True times of a series, s. */
    double[] trueTimes(Series s) {
        double[] times = new double[s.size()];
        if (times.length == 0) {
            return times;
        }
        Clock clock = clock(s);
        for (int i = 0; i < times.length; i++) {
            times[i] = clock.trueTime(s.timesS()[i]);
        }
        return times;
    }

    private Clock clock(Series s) {
        double start = s.timesS()[0];
        for (Map.Entry<String, String> log : run.logs().entrySet()) {
            Optional<Logger> logger = campaign.logger(log.getKey());
            if (log.getValue().equals(s.file()) && logger.isPresent()) {
                return Clock.of(start, logger.get().clockOffsetS(), logger.get().clockRate());
            }
        }
        return new Clock(start, 0.0, 0.0);
    }

    /**
     * The highest value of a channel.
     *
     * @param channel channel
     * @param value best estimate, SI
     * @param expanded expanded uncertainty, k = 2, SI
     * @param timeS true time, s
     * @param place file and line
     */
    record Peak(String channel, double value, double expanded, double timeS, Place place) {
        double upper() {
            return value + expanded;
        }
    }

    /** The highest valid value of a channel over the whole log; empty without one. */
    Optional<Peak> peak(String channel) {
        return channel(channel).flatMap(s -> {
            int at = -1;
            for (int i = 0; i < s.size(); i++) {
                if (valid(s, i) && (at < 0 || s.values()[i] > s.values()[at])) {
                    at = i;
                }
            }
            if (at < 0) {
                return Optional.empty();
            }
            double raw = s.values()[at];
            Optional<Instrument> instrument = campaign.rig().instrumentOf(channel);
            double value =
                    instrument.map(i -> InstrumentEquation.bestEstimate(i, raw)).orElse(raw);
            double u = instrument
                    .map(i -> InstrumentEquation.standardUncertainty(i, raw))
                    .orElse(0.0);
            return Optional.of(new Peak(
                    channel, value, 2.0 * u, clock(s).trueTime(s.timesS()[at]), new Place(s.file(), s.lines()[at], 0)));
        });
    }

    static boolean valid(Series s, int i) {
        return s.flags()[i] == Series.Flag.VALID.code() && Double.isFinite(s.values()[i]);
    }

    private List<StripPower> findStrips() {
        List<StripPower> found = new ArrayList<>();
        for (Plate.Heater heater : plate.heaters()) {
            Optional<Series> volts = channel(heater.voltageChannel());
            Optional<Series> amps = channel(heater.currentChannel());
            if (volts.isPresent() && amps.isPresent()) {
                found.add(new StripPower(heater, HeaterPower.series(heater.id(), volts.get(), amps.get())));
            }
        }
        return List.copyOf(found);
    }

    /**
     * Power of one strip.
     *
     * @param heater the strip
     * @param watts its power, W
     */
    record StripPower(Plate.Heater heater, Series watts) {}

    /** Total power over true time. */
    private record TotalPower(double[] timesS, double[] watts) {}

    /** A strip without a valid pair at a time counts as 0 there. */
    private TotalPower totalPower() {
        Map<Double, Double> total = new TreeMap<>();
        boolean sameTimes = !strips.isEmpty();
        for (StripPower strip : strips) {
            sameTimes &=
                    Arrays.equals(strips.get(0).watts().timesS(), strip.watts().timesS());
        }
        if (sameTimes) {
            double[] watts = new double[strips.get(0).watts().size()];
            for (StripPower strip : strips) {
                for (int i = 0; i < watts.length; i++) {
                    watts[i] += strip.watts().values()[i];
                }
            }
            return new TotalPower(trueTimes(strips.get(0).watts()), watts);
        }
        for (StripPower strip : strips) {
            double[] times = trueTimes(strip.watts());
            for (int i = 0; i < times.length; i++) {
                total.merge(times[i], strip.watts().values()[i], Double::sum);
            }
        }
        return new TotalPower(
                total.keySet().stream().mapToDouble(t -> t).toArray(),
                total.values().stream().mapToDouble(w -> w).toArray());
    }

    private List<Stretch> findHeated(TotalPower total) {
        double reference = run.powerSetW() > 0.0 ? run.powerSetW() : highestPowerW;
        double threshold = Math.max(NOTHING_W, ON_SHARE * reference);
        boolean[] on = new boolean[total.watts().length];
        for (int i = 0; i < on.length; i++) {
            on[i] = total.watts()[i] > threshold;
        }
        return Stretch.where(total.timesS(), on);
    }

    /** A true time in the campaign's zone. */
    String time(double timeS) {
        ZoneId zone = campaign.zone();
        return STAMP.format(ZonedDateTime.ofInstant(Instant.ofEpochSecond((long) Math.floor(timeS)), zone));
    }

    /** {@code run B03}. */
    String name() {
        return "run " + run.id();
    }
}
