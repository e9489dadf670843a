package plateledger.safety;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import plateledger.campaign.RunType;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.fluid.MoistAir;
import plateledger.log.Series;
import plateledger.rig.Instrument;
import plateledger.rig.Surroundings;
import plateledger.rig.Surroundings.SpeedMeter;
import plateledger.rig.Surroundings.SpeedPrinciple;
import plateledger.sensor.InstrumentEquation;
import plateledger.sensor.PitotTube;

/**
 * Heater power without flow in a heated run. Flow counts as present when the speed less its expanded uncertainty (k = 2)
 * reaches the limit. Loss runs are heated without flow on purpose and have their own rule, see {@link ProtectionChecks}.
 */
final class FlowChecks {
    private static final double LONGEST_S = 10.0; // own choice
    private static final double FAR_BELOW = 0.2; // share of the set speed: own choice
    private static final double USUAL_DENSITY = 1.2; // kg/m³, where the log does not tell

    private FlowChecks() {}

    static void check(RunLog log, Findings findings) {
        if (log.run().type() != RunType.HEATED) {
            return;
        }
        Optional<SpeedMeter> meter = meter(log);
        if (meter.isEmpty()) {
            findings.notChecked(
                    "FLOW-LOG",
                    log.run().place(),
                    log.name() + ", power without flow",
                    "no speed meter for this run in its logs",
                    "Give the run the log of a speed meter");
            return;
        }
        if (log.strips().isEmpty()) {
            findings.notChecked(
                    "FLOW-LOG",
                    log.run().place(),
                    log.name() + ", power without flow",
                    "no voltage and current of any strip in its logs",
                    "Give the run the log of the heater");
            return;
        }
        double present = log.campaign().rig().limits().flowPresentMPerS();
        List<Stretch> heated = log.heated();
        Speed speed = speed(log, meter.get());
        Optional<Stretch> none = unheeded(heated, speed, present);
        if (none.isPresent()) {
            report(log, speed, none.get(), present, Level.STOP, findings);
            return;
        }
        double low = FAR_BELOW * log.run().speedSetMPerS();
        if (low > present) {
            unheeded(heated, speed, low)
                    .ifPresent(stretch -> report(log, speed, stretch, low, Level.CAUTION, findings));
        }
    }

    /** The meter whose range holds the set speed and whose channel is logged; any logged one if none does. */
    static Optional<SpeedMeter> meter(RunLog log) {
        Surroundings around = log.campaign().rig().surroundings();
        double set = log.run().speedSetMPerS();
        List<SpeedMeter> logged = around.speedMeters().stream()
                .filter(m -> log.channel(m.channel()).isPresent())
                .toList();
        return logged.stream()
                .filter(m -> set >= m.fromMPerS() && set < m.toMPerS())
                .findFirst()
                .or(() -> logged.stream().findFirst());
    }

    /** Lower bound of the speed at the valid samples of a meter. */
    private record Speed(String file, double[] timesS, double[] lowerMPerS, int[] lines) {}

    private static Speed speed(RunLog log, SpeedMeter meter) {
        Series s = log.channel(meter.channel()).orElseThrow();
        Optional<Instrument> instrument = log.campaign().rig().instrumentOf(meter.channel());
        double density = density(log);
        double[] times = log.trueTimes(s);
        List<Integer> used = new ArrayList<>();
        for (int i = 0; i < s.size(); i++) {
            if (RunLog.valid(s, i)) {
                used.add(i);
            }
        }
        double[] t = new double[used.size()];
        double[] lower = new double[used.size()];
        int[] lines = new int[used.size()];
        for (int k = 0; k < t.length; k++) {
            int i = used.get(k);
            double raw = s.values()[i];
            double reading = instrument
                    .map(x -> InstrumentEquation.bestEstimate(x, raw)
                            - 2.0 * InstrumentEquation.standardUncertainty(x, raw))
                    .orElse(raw);
            t[k] = times[i];
            lines[k] = s.lines()[i];
            lower[k] = meter.principle() == SpeedPrinciple.PITOT
                    ? PitotTube.speed(reading, density, meter.factor().value())
                    : meter.factor().value() * reading;
        }
        return new Speed(s.file(), t, lower, lines);
    }

    private static double density(RunLog log) {
        Surroundings around = log.campaign().rig().surroundings();
        double density = MoistAir.state(mean(log, around.airChannel()), mean(log, around.pressureChannel()), 0.0)
                .density();
        return Double.isNaN(density) ? USUAL_DENSITY : density;
    }

    /** Mean of the valid samples of a channel; NaN without any. */
    static double mean(RunLog log, String channel) {
        double sum = 0.0;
        int n = 0;
        Optional<Series> found = log.channel(channel);
        if (found.isPresent()) {
            Series s = found.get();
            for (int i = 0; i < s.size(); i++) {
                if (RunLog.valid(s, i)) {
                    sum += s.values()[i];
                    n++;
                }
            }
        }
        return sum / n;
    }

    private static Optional<Stretch> unheeded(List<Stretch> heated, Speed speed, double limit) {
        boolean[] below = new boolean[speed.timesS().length];
        for (int i = 0; i < below.length; i++) {
            below[i] = speed.lowerMPerS()[i] < limit;
        }
        return Stretch.longest(Stretch.common(heated, Stretch.where(speed.timesS(), below)), LONGEST_S);
    }

    private static void report(RunLog log, Speed speed, Stretch stretch, double limit, Level level, Findings findings) {
        int line = 0;
        for (int i = 0; i < speed.timesS().length && line == 0; i++) {
            if (speed.timesS()[i] >= stretch.fromS()) {
                line = speed.lines()[i];
            }
        }
        LimitTable.Limit rule = LimitTable.get("FLOW-LOG");
        String bound = String.format(Locale.ROOT, "%.2f m/s", limit);
        findings.add(
                level == Level.STOP ? "FLOW-LOG" : "FLOW-LOW",
                level,
                new Place(speed.file(), line, 0),
                log.name() + ", power without flow",
                "heater on for %s from %s with less than %s"
                        .formatted(Findings.seconds(stretch.durationS()), log.time(stretch.fromS()), bound),
                "at most " + Findings.seconds(LONGEST_S),
                level == Level.STOP
                        ? "Find out why the interlock let it pass, and prove it before the next run"
                        : "The flow was far below the set speed: start the fan before the heater",
                rule.citation());
    }
}
