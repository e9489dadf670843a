package plateledger.reduce;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import plateledger.campaign.Campaign;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.ledger.PlateScales;
import plateledger.log.Series;
import plateledger.quantity.Estimate;
import plateledger.rig.Instrument;
import plateledger.rig.Plate;
import plateledger.rig.Surroundings;
import plateledger.sensor.HeaterPower;
import plateledger.steady.ChannelMean;
import plateledger.steady.SteadyWindow;
import plateledger.steady.WindowFinder;
import plateledger.steady.WindowOutcome;
import plateledger.steady.WindowRequest;

/** Finds the steady window of a run and takes the means that the reduction needs. */
final class WindowStage {
    private static final String POWER = "power";

    /** A drift of the power below half of this share of it is harmless: as much as storage may be (common practice). */
    private static final double POWER_SHARE = 0.01;

    /** Share of the power that a drift of the surroundings may be worth (common practice). */
    private static final double LOSS_SHARE = 0.001;

    /** Temperature at which the walls' radiation is made linear for that purpose, K. */
    private static final double ROOM_K = 300.0;

    /** Largest share of a window's samples of a channel that may be invalid; beyond, the channel counts as lost there. */
    private static final double LOST_SHARE = 0.05;

    private final Campaign campaign;

    WindowStage(Campaign campaign) {
        this.campaign = campaign;
    }

    /**
     * What became of a run.
     *
     * @param window the window, or the best attempt's evidence is in the reason
     * @param means means, if there is a window
     * @param reason why there is none; empty otherwise
     * @param findings channels lost in the window, tests that a declared window fails
     */
    record Outcome(Optional<SteadyWindow> window, Optional<RunMeans> means, String reason, List<Finding> findings) {}

    Outcome find(RunLogs logs) {
        Run run = logs.run();
        Optional<Plate> plate = campaign.rig().plate(run.plate());
        Map<String, Series> channels = new LinkedHashMap<>();
        for (String name : ExpectedChannels.of(campaign, run)) {
            Series series = logs.series().get(name);
            if (series != null && series.count(Series.Flag.VALID) > 0) {
                channels.put(name, series);
            }
        }
        boolean loss = run.type() == RunType.LOSS;
        boolean powered = loss || run.type() == RunType.HEATED;
        Optional<Series> power = powered ? plate.flatMap(p -> totalPower(p, logs.series())) : Optional.empty();
        WindowOutcome outcome = WindowFinder.find(new WindowRequest(
                channels,
                junctions(plate, channels.keySet()),
                power,
                plate.map(PlateScales::heatCapacityJPerK).orElse(0.0),
                loss ? campaign.steady().storageShareLoss() : campaign.steady().storageShare(),
                minimum(run),
                targets(channels, power, plate),
                resolutions(channels.keySet()),
                run.declaredWindow().map(w -> new WindowRequest.Declared(w.startS(), w.endS(), w.reason())),
                Optional.of(campaign.rig().surroundings().airChannel()).filter(channels::containsKey),
                followers(channels.keySet())));
        if (outcome.window().isEmpty()) {
            return new Outcome(Optional.empty(), Optional.empty(), outcome.reason(), List.of());
        }
        SteadyWindow window = outcome.window().get();
        List<Finding> findings = new ArrayList<>();
        declared(run, window).ifPresent(findings::add);
        Set<String> lost = lost(run, logs, window, findings);
        return new Outcome(Optional.of(window), Optional.of(means(logs, plate, window, lost, power)), "", findings);
    }

    /** Fan-off zeros are short by nature: two minutes and one before (common practice); all else as declared. */
    private double minimum(Run run) {
        return run.type() == RunType.FAN_OFF_ZERO ? 120.0 : campaign.steady().minimumS();
    }

    /** Channels of the plate's junctions among those read. */
    private static Set<String> junctions(Optional<Plate> plate, Set<String> channels) {
        Set<String> names = new HashSet<>();
        plate.ifPresent(p -> p.thermocouples().forEach(t -> names.add(t.channel())));
        names.retainAll(channels);
        return names;
    }

    private Map<String, Double> resolutions(Set<String> channels) {
        Map<String, Double> steps = new HashMap<>();
        for (String channel : channels) {
            campaign.rig()
                    .instrumentOf(channel)
                    .filter(i -> i.resolution() > 0.0)
                    .ifPresent(i -> steps.put(channel, i.resolution()));
        }
        return steps;
    }

    /** The power of all strips, sample by sample; empty where a strip was not logged. */
    private static Optional<Series> totalPower(Plate plate, Map<String, Series> series) {
        Series sum = null;
        for (Plate.Heater heater : plate.heaters()) {
            Series v = series.get(heater.voltageChannel());
            Series i = series.get(heater.currentChannel());
            if (v == null || i == null) {
                return Optional.empty();
            }
            Series p = HeaterPower.series(POWER, v, i);
            sum = sum == null ? p : added(sum, p);
        }
        return Optional.ofNullable(sum).filter(s -> s.size() > 0);
    }

    /** Sum of two series of one log at the times both have. */
    private static Series added(Series a, Series b) {
        int n = 0;
        double[] times = new double[Math.min(a.size(), b.size())];
        double[] values = new double[times.length];
        int[] lines = new int[times.length];
        int j = 0;
        for (int i = 0; i < a.size() && j < b.size(); i++) {
            while (j < b.size() && b.lines()[j] < a.lines()[i]) {
                j++;
            }
            if (j < b.size() && b.lines()[j] == a.lines()[i]) {
                times[n] = a.timesS()[i];
                values[n] = a.values()[i] + b.values()[j];
                lines[n++] = a.lines()[i];
            }
        }
        return new Series(
                POWER,
                "W",
                a.file(),
                java.util.Arrays.copyOf(times, n),
                java.util.Arrays.copyOf(values, n),
                new byte[n],
                java.util.Arrays.copyOf(lines, n));
    }

    /** Temperatures of plate and surroundings: the room drives them together. */
    private Set<String> followers(Set<String> channels) {
        Set<String> names = new HashSet<>();
        for (String channel : channels) {
            campaign.rig()
                    .instrumentOf(channel)
                    .filter(i -> i.kind() == Instrument.SignalKind.TEMPERATURE)
                    .ifPresent(i -> names.add(channel));
        }
        return names;
    }

    /** The uncertainty by which each channel's mean is judged; half of it is harmless as a drift. */
    private Map<String, Double> targets(Map<String, Series> channels, Optional<Series> power, Optional<Plate> plate) {
        Map<String, Double> targets = new HashMap<>();
        double watts = power.map(WindowStage::typical).orElse(0.0);
        power.ifPresent(p -> targets.put(POWER, POWER_SHARE * watts));
        channels.forEach((name, series) ->
                campaign.rig().instrumentOf(name).ifPresent(i -> targets.put(name, target(i, series))));
        plate.ifPresent(p -> lossTargets(p, watts, targets));
        plate.ifPresent(p -> junctionTargets(p, channels, targets));
        speedTargets(channels, targets);
        return targets;
    }

    /** Surroundings matter by their conductance to the sheet: a drift worth a thousandth of the power is harmless. */
    private void lossTargets(Plate plate, double watts, Map<String, Double> targets) {
        var s = campaign.rig().surroundings();
        double heated = plate.heatedEndM().value() - plate.heatedStartM().value();
        double allowed = LOSS_SHARE * watts;
        widen(
                targets,
                s.plenumChannels(),
                allowed
                        / (plate.backConductanceWPerM2K().value()
                                * heated
                                * plate.widthM().value()));
        widen(
                targets,
                s.frameChannels(),
                allowed / (2.0 * plate.edgeConductanceWPerMK().value() * heated));
        widen(
                targets,
                s.wallChannels(),
                allowed
                        / PlateScales.radiationConductanceWPerK(
                                plate, s.exchangeFactor().value(), ROOM_K));
        widen(targets, s.noseChannels(), allowed / plate.noseConductanceWPerK().value());
        widen(targets, s.tailChannels(), allowed / plate.tailConductanceWPerK().value());
    }

    /**
     * A junction's drift is stored heat, which is booked: harmless within the storage limit's own share of its difference
     * from what surrounds it.
     */
    private void junctionTargets(Plate plate, Map<String, Series> channels, Map<String, Double> targets) {
        var s = campaign.rig().surroundings();
        String around = channels.containsKey(s.airChannel())
                ? s.airChannel()
                : s.plenumChannels().stream().findFirst().orElse("");
        Series reference = channels.get(around);
        if (reference == null) {
            return;
        }
        for (Plate.Thermocouple t : plate.thermocouples()) {
            Series series = channels.get(t.channel());
            if (series != null) {
                double difference = Math.abs(typical(series) - typical(reference));
                // half of a target is harmless, hence the two
                widen(targets, List.of(t.channel()), 2.0 * campaign.steady().storageShare() * difference);
            }
        }
    }

    /** A speed meter is not known better than its factor. */
    private void speedTargets(Map<String, Series> channels, Map<String, Double> targets) {
        for (Surroundings.SpeedMeter meter : campaign.rig().surroundings().speedMeters()) {
            Series series = channels.get(meter.channel());
            if (series != null) {
                double power = meter.principle() == Surroundings.SpeedPrinciple.PITOT ? 2.0 : 1.0;
                double relative = power
                        * meter.factor().standardUncertainty()
                        / meter.factor().value();
                widen(targets, List.of(meter.channel()), relative * Math.abs(typical(series)));
            }
        }
    }

    private static void widen(Map<String, Double> targets, List<String> channels, double target) {
        for (String channel : channels) {
            if (Double.isFinite(target)) {
                targets.computeIfPresent(channel, (name, own) -> Math.max(own, target));
            }
        }
    }

    private static double target(Instrument i, Series series) {
        double typical = typical(series);
        double gain = Math.hypot(i.gain().standardUncertainty(), i.channelGain().standardUncertainty());
        double offset =
                Math.hypot(i.offset().standardUncertainty(), i.channelOffset().standardUncertainty());
        double drift = i.dailyDrift().standardUncertainty();
        double whole = Math.sqrt(offset * offset + drift * drift + Math.pow(gain * (typical - i.gainOrigin()), 2));
        double floor = Math.max(whole, i.resolution());
        return switch (i.kind()) {
            case VOLTAGE, CURRENT -> Math.max(floor, 0.5 * POWER_SHARE * Math.abs(typical));
            default -> floor;
        };
    }

    private static double typical(Series series) {
        double sum = 0.0;
        int n = 0;
        for (int k = 0; k < series.size(); k++) {
            if (series.flags()[k] == Series.Flag.VALID.code()) {
                sum += series.values()[k];
                n++;
            }
        }
        return n > 0 ? sum / n : 0.0;
    }

    /** A window that a person chose counts, but not in silence where it fails what a found one must pass. */
    private static Optional<Finding> declared(Run run, SteadyWindow window) {
        List<String> failed = window.evidence().stream()
                .filter(e -> !e.passed())
                .map(e -> e.test() + " of " + e.subject())
                .toList();
        if (!window.declared() || failed.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new Finding(
                "WINDOW-DECLARED",
                Level.CAUTION,
                run.place(),
                "run " + run.id() + ", declared window",
                "fails " + failed.size() + " tests of steadiness, first: " + failed.get(0),
                "a window that passes all",
                "Leave the choice to the evidence, or say in the reason why this window may be used.",
                ""));
    }

    private Set<String> lost(Run run, RunLogs logs, SteadyWindow window, List<Finding> findings) {
        Set<String> lost = new HashSet<>();
        for (String name : ExpectedChannels.of(campaign, run)) {
            Optional<Series> series = Optional.ofNullable(logs.series().get(name));
            double share =
                    series.map(s -> unusable(s, window.startS(), window.endS())).orElse(1.0);
            if (share > LOST_SHARE
                    || window.mean(name).map(m -> !Double.isFinite(m.mean())).orElse(true)) {
                lost.add(name);
                findings.add(new Finding(
                        "CHANNEL-LOST",
                        Level.CAUTION,
                        run.place(),
                        "run " + run.id() + ", channel " + name,
                        (share > LOST_SHARE
                                        ? String.format(
                                                Locale.ROOT,
                                                "%.0f %% of its samples in the window are not usable",
                                                100.0 * share)
                                        : "too few samples in the window for a mean")
                                + series.map(s -> " (" + s.file() + ")").orElse(""),
                        String.format(Locale.ROOT, "at most %.0f %%", 100.0 * LOST_SHARE),
                        "It is left out of this run; repair it before the next.",
                        ""));
            }
        }
        return lost;
    }

    /** Share of a channel's samples within a window that are not valid; 1 if there are none at all. */
    static double unusable(Series series, double fromS, double toS) {
        int all = 0;
        int bad = 0;
        for (int k = 0; k < series.size(); k++) {
            if (series.timesS()[k] >= fromS && series.timesS()[k] <= toS) {
                all++;
                bad += series.flags()[k] == Series.Flag.VALID.code() ? 0 : 1;
            }
        }
        return all == 0 ? 1.0 : (double) bad / all;
    }

    private RunMeans means(
            RunLogs logs, Optional<Plate> plate, SteadyWindow window, Set<String> lost, Optional<Series> power) {
        Map<String, Estimate> means = new LinkedHashMap<>();
        window.means().forEach((name, m) -> {
            if (!lost.contains(name) && !name.equals(POWER)) {
                means.put(name, new Estimate(m.mean(), m.standardError(), m.dof()));
            }
        });
        Estimate drift = plate.map(p -> drift(p, window, lost)).orElse(Estimate.of(0.0, 0.0));
        double[] covariance =
                plate.map(p -> covariance(p, logs.series(), window)).orElse(new double[0]);
        double on = power.map(p -> switchedOn(p, window)).orElse(Double.NEGATIVE_INFINITY);
        return new RunMeans(
                logs.run(),
                means,
                drift,
                covariance,
                0.5 * (window.startS() + window.endS()),
                window.startS() - on,
                window.endS() - on);
    }

    /**
     * When the heater was switched on, s: the first sample above half the window's power. A log that begins with the heater
     * on cannot tell, so its first sample counts: the soak booked is then at most too large.
     */
    private static double switchedOn(Series power, SteadyWindow window) {
        double level = 0.5 * window.mean(POWER).map(ChannelMean::mean).orElse(0.0);
        for (int i = 0; i < power.size(); i++) {
            if (power.values()[i] > level) {
                return power.timesS()[i];
            }
        }
        return power.timesS()[0];
    }

    /** Mean slope of the centre-line junctions; their errors are taken as common, since the room drives them together. */
    private static Estimate drift(Plate plate, SteadyWindow window, Set<String> lost) {
        double slope = 0.0;
        double error = 0.0;
        double dof = Double.POSITIVE_INFINITY;
        int n = 0;
        for (Plate.Thermocouple t : plate.stations()) {
            Optional<ChannelMean> mean = window.mean(t.channel());
            if (mean.isPresent() && !lost.contains(t.channel())) {
                slope += mean.get().slopePerS();
                error += mean.get().slopeStandardError();
                dof = Math.min(dof, mean.get().dof());
                n++;
            }
        }
        return n == 0 ? Estimate.of(0.0, 0.0) : new Estimate(slope / n, error / n, Math.max(1.0, dof));
    }

    private static double[] covariance(Plate plate, Map<String, Series> series, SteadyWindow window) {
        List<Plate.Heater> heaters = plate.heaters();
        double[] covariance = new double[heaters.size()];
        for (int j = 0; j < covariance.length; j++) {
            Series v = series.get(heaters.get(j).voltageChannel());
            Series i = series.get(heaters.get(j).currentChannel());
            if (v == null || i == null) {
                return new double[0];
            }
            covariance[j] =
                    HeaterPower.over(v, i, window.startS(), window.endS()).covariance();
        }
        return covariance;
    }
}
