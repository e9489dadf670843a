package plateledger.reduce;

import java.util.List;
import java.util.Optional;
import plateledger.fluid.MoistAir;
import plateledger.rig.Rig;
import plateledger.rig.Surroundings;
import plateledger.sensor.AirProbe;
import plateledger.sensor.PitotTube;

/**
 * The stream of one run: speed over the plate, temperature, pressure and water content from the run's own channels. Which
 * meter is used, and its fan-off zero, is decided once at the best estimate.
 */
final class StreamStage {
    private static final int REPEATS = 4;

    private final RunIndex run;
    private final InputBook.TunnelIndex tunnel;
    private final Signal meter;
    private final int meterNumber;
    private final boolean pitot;
    private final Optional<FanOff> zero;

    private StreamStage(
            RunIndex run,
            InputBook.TunnelIndex tunnel,
            Signal meter,
            int meterNumber,
            boolean pitot,
            Optional<FanOff> zero) {
        this.run = run;
        this.tunnel = tunnel;
        this.meter = meter;
        this.meterNumber = meterNumber;
        this.pitot = pitot;
        this.zero = zero;
    }

    /**
     * A meter's zero at the time of a run: a straight line between the zeros before and after.
     *
     * @param before the channel in the zero before
     * @param after the channel in the zero after
     * @param share how far the run lies from before to after, 0..1
     */
    record FanOff(Signal before, Signal after, double share) {
        double value(Reads in) {
            return (1.0 - share) * before.raw(in) + share * after.raw(in);
        }
    }

    /** Finds a meter's zero among the fan-off runs of the run's day; empty if the day has none. */
    static Optional<FanOff> fanOff(InputBook book, RunMeans run, String channel, List<RunMeans> zeros) {
        RunMeans before = null;
        RunMeans after = null;
        for (RunMeans zero : zeros) {
            if (!zero.run().day().equals(run.run().day()) || !zero.means().containsKey(channel)) {
                continue;
            }
            if (zero.middleS() <= run.middleS() && (before == null || zero.middleS() > before.middleS())) {
                before = zero;
            }
            if (zero.middleS() > run.middleS() && (after == null || zero.middleS() < after.middleS())) {
                after = zero;
            }
        }
        RunMeans first = before != null ? before : after;
        RunMeans second = after != null ? after : before;
        if (first == null || second == null) {
            return Optional.empty();
        }
        double span = second.middleS() - first.middleS();
        double share = span > 0.0 ? (run.middleS() - first.middleS()) / span : 0.0;
        return book.signal(first, channel)
                .flatMap(a -> book.signal(second, channel).map(b -> new FanOff(a, b, share)));
    }

    /**
     * Chooses the meter: the first whose range holds the set speed, else the one whose range comes nearest; of those that
     * were read, and empty if none was. Without a set speed the first.
     */
    static Optional<StreamStage> choose(
            InputBook book, Rig rig, RunIndex run, InputBook.TunnelIndex tunnel, List<RunMeans> zeros) {
        List<Surroundings.SpeedMeter> meters = rig.surroundings().speedMeters();
        int best = -1;
        double nearest = Double.POSITIVE_INFINITY;
        for (int i = 0; i < meters.size(); i++) {
            double away = away(meters.get(i), run.means.run().speedSetMPerS());
            if (run.means.means().containsKey(meters.get(i).channel()) && (best < 0 || away < nearest)) {
                best = i;
                nearest = away;
            }
        }
        if (best < 0) {
            return Optional.empty();
        }
        int chosen = best;
        Surroundings.SpeedMeter meter = meters.get(chosen);
        return book.signal(run.means, meter.channel())
                .map(signal -> new StreamStage(
                        run,
                        tunnel,
                        signal,
                        chosen,
                        meter.principle() == Surroundings.SpeedPrinciple.PITOT,
                        fanOff(book, run.means, meter.channel(), zeros)));
    }

    /** How far a speed lies outside a meter's range, m/s; below 0 inside, so that the end of a range comes second. */
    static double away(Surroundings.SpeedMeter meter, double setMPerS) {
        if (setMPerS >= meter.fromMPerS() && setMPerS < meter.toMPerS()) {
            return -1.0;
        }
        return Math.max(meter.fromMPerS() - setMPerS, setMPerS - meter.toMPerS());
    }

    /** True if the meter's zero was taken with the fan off. */
    boolean zeroed() {
        return zero.isPresent();
    }

    /** Stream state for an input vector. */
    State at(Reads in) {
        double pressure = run.pressure.orElseThrow().value(in);
        double humidity = run.humidity.orElseThrow().value(in);
        double probeK = run.air.orElseThrow().value(in);
        double wallK = Signal.mean(in, run.wall);
        double recovery = in.get(tunnel.recovery());
        double radiation = in.get(tunnel.radiation());
        double blockage = in.get(tunnel.blockage());
        double factor = in.get(tunnel.speedFactor()[meterNumber]);
        double signal = zero.isPresent()
                ? meter.againstZero(in, zero.get().value(in), zero.get().value(in))
                : meter.value(in);
        double xv = MoistAir.vapourFraction(probeK, pressure, humidity);
        double densityFactor = in.get(tunnel.density());
        double capacityFactor = in.get(tunnel.heatCapacity());
        double airK = probeK;
        double speed = 0.0;
        for (int n = 0; n < REPEATS; n++) {
            var fluid = MoistAir.state(airK, pressure, xv);
            double indicated =
                    pitot ? PitotTube.speed(signal, fluid.density() * densityFactor, factor) : factor * signal;
            speed = indicated * (1.0 + blockage);
            airK = AirProbe.streamK(probeK, wallK, speed, recovery, radiation, fluid.heatCapacity() * capacityFactor);
        }
        return new State(speed, airK, pressure, xv);
    }

    /**
     * The stream.
     *
     * @param speed over the plate, m/s
     * @param airK T_∞, K
     * @param pressure Pa
     * @param vapourFraction mole fraction of water
     */
    record State(double speed, double airK, double pressure, double vapourFraction) {}
}
