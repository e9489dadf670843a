package plateledger.reduce;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plateledger.campaign.RunType;
import plateledger.fluid.FormulationUncertainty;
import plateledger.quantity.Estimate;
import plateledger.quantity.Stated;
import plateledger.rig.Instrument;
import plateledger.rig.Plate;
import plateledger.rig.Rig;
import plateledger.rig.Surroundings;
import plateledger.uncertainty.Distribution;
import plateledger.uncertainty.Input;
import plateledger.uncertainty.InputList;
import plateledger.uncertainty.Scope;

/** Fills the input list of a campaign: every uncertain number once, under the scope within which it is shared. */
final class InputBook {
    private final Rig rig;
    private final InputList.Builder list = new InputList.Builder();
    private final Map<String, Integer> known = new HashMap<>();

    InputBook(Rig rig) {
        this.rig = rig;
    }

    InputList build() {
        return list.build();
    }

    /** Adds an input unless one of that name is there; its position either way. */
    int put(Input input) {
        Integer at = known.get(input.name());
        if (at == null) {
            at = list.add(input);
            known.put(input.name(), at);
        }
        return at;
    }

    int stated(String name, Stated value, Scope scope) {
        return put(Input.of(name, value, scope));
    }

    int normal(String name, double value, double u, Scope scope) {
        return put(new Input(
                name, value, u, u > 0 ? Distribution.NORMAL : Distribution.EXACT, Double.POSITIVE_INFINITY, scope));
    }

    private int mean(String run, String channel, Estimate mean) {
        Distribution shape = Double.isInfinite(mean.dof()) ? Distribution.NORMAL : Distribution.T;
        return put(new Input(run + "/" + channel + ".mean", mean.value(), mean.u(), shape, mean.dof(), Scope.run(run)));
    }

    /** The drift of the plate in a run. */
    int drift(RunMeans run) {
        Estimate drift = run.drift();
        Distribution shape = Double.isInfinite(drift.dof()) ? Distribution.NORMAL : Distribution.T;
        String id = run.run().id();
        return put(new Input(id + "/plate.drift", drift.value(), drift.u(), shape, drift.dof(), Scope.run(id)));
    }

    /** A channel in a run, if it was read there. */
    Optional<Signal> signal(RunMeans run, String channel) {
        Optional<Instrument> owner = rig.instrumentOf(channel);
        Estimate mean = run.means().get(channel);
        if (owner.isEmpty() || mean == null) {
            return Optional.empty();
        }
        Instrument i = owner.get();
        boolean bath = !i.bath().isEmpty();
        Scope wide = bath ? Scope.bath(i.bath()) : Scope.instrument(i.id());
        Scope own = Scope.instrument(i.id() + "/" + channel);
        return Optional.of(new Signal(
                mean(run.run().id(), channel, mean),
                stated((bath ? "bath " + i.bath() : i.id()) + ".offset", i.offset(), wide),
                stated(channel + ".offset", i.channelOffset(), own),
                stated(i.id() + ".gain", i.gain(), Scope.instrument(i.id())),
                stated(channel + ".gain", i.channelGain(), own),
                drift(run, channel, i),
                i.gainOrigin()));
    }

    /**
     * A temperature's drift counts from the day's zero run, so that run itself has none: taken there too, the drift of the
     * air channel would cancel between zero and heated run, which it does not.
     */
    private int drift(RunMeans run, String channel, Instrument i) {
        String day = run.run().day();
        return run.run().type() == RunType.ZERO && i.kind() == Instrument.SignalKind.TEMPERATURE
                ? normal("at zero/" + channel + ".drift", 0.0, 0.0, Scope.day(day))
                : stated(day + "/" + channel + ".drift", i.dailyDrift(), Scope.day(day));
    }

    /** Those of the channels that were read in a run. */
    Signal[] signals(RunMeans run, List<String> channels) {
        return channels.stream()
                .flatMap(channel -> signal(run, channel).stream())
                .toArray(Signal[]::new);
    }

    /** Positions of a plate's constants. */
    PlateIndex plate(Plate plate) {
        String p = "plate." + plate.id() + ".";
        Scope panel = Scope.panel(plate.id());
        int n = plate.heaters().size();
        int m = plate.thermocouples().size();
        int[] lead = new int[n];
        int[] place = new int[m];
        int[] stem = new int[m];
        for (int j = 0; j < n; j++) {
            Plate.Heater heater = plate.heaters().get(j);
            lead[j] = stated(p + heater.id() + ".lead_resistance", heater.leadResistanceOhm(), panel);
        }
        for (int t = 0; t < m; t++) {
            Plate.Thermocouple tc = plate.thermocouples().get(t);
            place[t] = stated(p + tc.channel() + ".x", tc.xM(), panel);
            stem[t] = stated(p + tc.channel() + ".stem_fraction", tc.stemFraction(), panel);
        }
        Stated depth = plate.thermocouples().get(0).depthM();
        int[] prior = {
            stated(p + "back_conductance", plate.backConductanceWPerM2K(), panel),
            stated(p + "edge_conductance", plate.edgeConductanceWPerMK(), panel),
            stated(p + "nose_conductance", plate.noseConductanceWPerK(), panel),
            stated(p + "tail_conductance", plate.tailConductanceWPerK(), panel),
            stated(p + "cover_conductance", plate.coverConductanceWPerK(), panel)
        };
        return new PlateIndex(
                stated(p + "heated_start", plate.heatedStartM(), panel),
                stated(p + "heated_end", plate.heatedEndM(), panel),
                stated(p + "width", plate.widthM(), panel),
                stated(p + "sheet.thickness", plate.sheet().thicknessM(), panel),
                stated(p + "sheet.conductivity", plate.sheet().conductivityWPerMK(), panel),
                stated(p + "sheet.heat_capacity", plate.sheet().heatCapacityJPerM3K(), panel),
                stated(p + "coat.thickness", plate.coat().thicknessM(), panel),
                stated(p + "coat.conductivity", plate.coat().conductivityWPerMK(), panel),
                stated(p + "junction_depth", depth, panel),
                stated(p + "emissivity", plate.emissivity(), panel),
                stated(p + "foam.thickness", plate.foam().thicknessM(), panel),
                stated(p + "foam.heat_capacity", plate.foam().heatCapacityJPerM3K(), panel),
                normal(p + "smoothing", 0.0, 1.0, panel),
                prior,
                lead,
                place,
                stem);
    }

    /**
     * Positions of a plate's constants.
     *
     * @param prior declared conductances in the order of {@link plateledger.ledger.LossCalibration.Parameter}
     */
    record PlateIndex(
            int start,
            int end,
            int width,
            int sheetThickness,
            int sheetConductivity,
            int sheetCapacity,
            int coatThickness,
            int coatConductivity,
            int depth,
            int emissivity,
            int foamThickness,
            int foamCapacity,
            int smoothing,
            int[] prior,
            int[] lead,
            int[] place,
            int[] stem) {}

    /** Positions of what belongs to the tunnel and the fluid. */
    TunnelIndex tunnel(double temperatureK, double pressurePa, double vapourFraction) {
        Surroundings s = rig.surroundings();
        FormulationUncertainty u = FormulationUncertainty.of(temperatureK, pressurePa, vapourFraction);
        int[] factors = s.speedMeters().stream()
                .mapToInt(meter -> stated("speed." + meter.channel() + ".factor", meter.factor(), Scope.RIG))
                .toArray();
        return new TunnelIndex(
                stated("tunnel.exchange_factor", s.exchangeFactor(), Scope.RIG),
                stated("tunnel.blockage", s.blockage(), Scope.RIG),
                stated("air_probe.recovery_factor", s.airProbe().recoveryFactor(), Scope.RIG),
                stated("air_probe.radiation_fraction", s.airProbe().radiationFraction(), Scope.RIG),
                factors,
                normal("fluid.density.factor", 1.0, u.density(), Scope.CAMPAIGN),
                normal("fluid.viscosity.factor", 1.0, u.viscosity(), Scope.CAMPAIGN),
                normal("fluid.conductivity.factor", 1.0, u.conductivity(), Scope.CAMPAIGN),
                normal("fluid.heat_capacity.factor", 1.0, u.heatCapacity(), Scope.CAMPAIGN),
                normal("zero.h_factor", 1.0, 0.2, Scope.RIG));
    }

    /** Positions of what belongs to the tunnel and the fluid. */
    record TunnelIndex(
            int exchange,
            int blockage,
            int recovery,
            int radiation,
            int[] speedFactor,
            int density,
            int viscosity,
            int conductivity,
            int heatCapacity,
            int zeroH) {}
}
