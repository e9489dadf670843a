package plateledger.demo.app;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import plateledger.demo.app.RunPlan.Flow;
import plateledger.demo.app.RunPlan.Kind;
import plateledger.demo.physics.Convection;
import plateledger.demo.physics.LaminarLayer;
import plateledger.demo.physics.MeshedPanel;
import plateledger.demo.physics.Panel;
import plateledger.demo.physics.PlateState;
import plateledger.demo.physics.SteadyPlate;
import plateledger.demo.physics.Surround;
import plateledger.demo.physics.TurbulentLayer;
import plateledger.demo.sensor.Channels;
import plateledger.demo.sensor.TrueRig;
import plateledger.fluid.FluidState;
import plateledger.fluid.MoistAir;

/** One run on the true rig: its surroundings, its flow, and what every channel would show without errors. */
final class RunModel {
    private static final double STILL_AIR = 5.0; // W/(m² K), fan off and all at room temperature: of no consequence

    private final TrueRig rig;
    private final TrueRig.Mounted mounted;
    private final MeshedPanel mesh;
    private final RunPlan plan;
    private final ProductLaw law;
    private final Optional<LaminarLayer> laminar;

    /**
     * A run.
     *
     * @param rig the rig as it is
     * @param mesh the panel mounted, in cells
     * @param laminar laminar convection on that grid
     * @param law the product's law
     * @param plan the run
     */
    RunModel(TrueRig rig, MeshedPanel mesh, LaminarLayer laminar, ProductLaw law, RunPlan plan) {
        this(rig, mesh, Optional.of(laminar), law, plan);
    }

    /** A run that is not laminar. */
    RunModel(TrueRig rig, MeshedPanel mesh, ProductLaw law, RunPlan plan) {
        this(rig, mesh, Optional.empty(), law, plan);
    }

    private RunModel(TrueRig rig, MeshedPanel mesh, Optional<LaminarLayer> laminar, ProductLaw law, RunPlan plan) {
        this.rig = rig;
        this.mounted = rig.mounted(plan.panel());
        this.mesh = mesh;
        this.laminar = laminar;
        this.law = law;
        this.plan = plan;
    }

    /**
     * The stream at one instant.
     *
     * @param streamK T_∞
     * @param pressurePa p
     * @param humidity relative humidity
     * @param vapour water mole fraction
     * @param meterMPerS speed at the meters
     * @param plateMPerS speed over the plate
     * @param fluid properties at T_∞
     * @param dynamicK U²/2c_p
     * @param adiabaticK T_aw
     */
    record Stream(
            double streamK,
            double pressurePa,
            double humidity,
            double vapour,
            double meterMPerS,
            double plateMPerS,
            FluidState fluid,
            double dynamicK,
            double adiabaticK) {}

    /** The run. */
    RunPlan plan() {
        return plan;
    }

    /** The panel mounted. */
    TrueRig.Mounted mounted() {
        return mounted;
    }

    /** The panel in cells. */
    MeshedPanel mesh() {
        return mesh;
    }

    /** F of radiation. */
    double exchangeFactor() {
        return rig.exchangeFactor();
    }

    /** The stream, {@code tau} s after the start. */
    Stream stream(double tau) {
        double time = plan.startS() + tau;
        double meter = plan.speedMPerS();
        double plate = meter * (1.0 + rig.blockage());
        double fan = meter / 20.0;
        double streamK = Climate.roomK(time) + (meter > 0.0 ? 0.15 + 0.3 * fan * fan : 0.0);
        double pressure = Climate.pressurePa(time);
        double humidity = Climate.humidity(time);
        double vapour = MoistAir.vapourFraction(streamK, pressure, humidity);
        FluidState fluid = rig.air().at(streamK, pressure, vapour);
        double dynamic = plate * plate / (2.0 * fluid.heatCapacity());
        double recovery = plan.flow() == Flow.LAMINAR ? Math.sqrt(fluid.prandtl()) : Math.cbrt(fluid.prandtl());
        return new Stream(
                streamK, pressure, humidity, vapour, meter, plate, fluid, dynamic, streamK + recovery * dynamic);
    }

    /** What is around the plate, {@code tau} s after the start. */
    Surround around(Stream stream, double tau) {
        double room = Climate.roomK(plan.startS() + tau);
        double rise = plan.riseK();
        if (plan.kind() == Kind.LOSS) {
            return new Surround(
                    room + 0.22 * rise * warmth(tau, 600.0),
                    room + 0.05,
                    room + 0.2 + 0.03 * rise * warmth(tau, 900.0),
                    room + 0.15 * rise * warmth(tau, 700.0),
                    room + 0.75 * rise * warmth(tau, 400.0),
                    room + 0.75 * rise * warmth(tau, 400.0));
        }
        double heated = plan.kind() == Kind.HEATED ? 1.0 : 0.0;
        return new Surround(
                stream.adiabaticK(),
                stream.streamK() - 0.1 + 0.25 * heated * warmth(tau, 600.0),
                room + 0.25 + 0.6 * heated * warmth(tau, 900.0),
                room + 0.1 + 0.10 * rise * warmth(tau, 500.0),
                stream.streamK() + 0.25 * rise * warmth(tau, 300.0),
                stream.streamK() + 0.60 * rise * warmth(tau, 300.0));
    }

    private static double warmth(double tau, double constant) {
        return tau <= 0.0 ? 0.0 : -Math.expm1(-tau / constant);
    }

    /** Heat into each strip when the supplies hold the set power at the sense points, W. */
    double[] stripW() {
        double[] out = new double[mounted.stripOhm().length];
        for (int s = 0; s < out.length; s++) {
            double strip = mounted.stripOhm()[s];
            out[s] = plan.stripSetW() * strip / (strip + mounted.leadOhm()[s]);
        }
        return out;
    }

    /** Convection for one mean face temperature. */
    Convection convection(Stream stream, double meanFaceK) {
        Panel panel = mounted.panel();
        if (plan.kind() == Kind.LOSS) {
            return new Convection.Cover(panel.coverWPerK() / panel.areaM2());
        } else if (plan.speedMPerS() == 0.0) {
            return new Convection.Uniform(STILL_AIR);
        }
        FluidState film = film(stream, meanFaceK);
        double unitReynolds = stream.plateMPerS() / film.kinematicViscosity();
        return switch (plan.flow()) {
            case LAMINAR ->
                new Convection.Layer(laminar.orElseThrow().matrix(film.conductivity(), unitReynolds, film.prandtl()));
            case TRIPPED ->
                new Convection.Layer(TurbulentLayer.matrix(
                        mesh.grid().faces(),
                        TurbulentLayer.virtualOrigin(RunPlan.TRIP_M, unitReynolds),
                        film.conductivity(),
                        unitReynolds,
                        film.prandtl()));
            case PRODUCT ->
                new Convection.Uniform(
                        film.conductivity() / panel.endM() * law.nusselt(unitReynolds * panel.endM(), film.prandtl()));
        };
    }

    private FluidState film(Stream stream, double faceK) {
        return rig.air().at(0.5 * (faceK + stream.streamK()), stream.pressurePa(), stream.vapour());
    }

    /** The plate in steady state (drifting with the room), {@code tau} s after the start, film temperature consistent. */
    PlateState steady(double tau) {
        Stream stream = stream(tau);
        Surround around = around(stream, tau);
        if (plan.kind() == Kind.LOSS) {
            return new SteadyPlate(mesh, convection(stream, 0.0), rig.exchangeFactor(), around.adiabaticK())
                    .solveHeld(targetK(tau), around);
        }
        double slope = Climate.roomSlopeKPerS(plan.startS() + tau);
        double face = stream.adiabaticK() + 0.9 * plan.riseK();
        PlateState state = solve(stream, around, face, stripW(), slope);
        for (int round = 0; round < 12 && Math.abs(state.meanFaceK() - face) > 1e-5; round++) {
            face = state.meanFaceK();
            state = solve(stream, around, face, stripW(), slope);
        }
        return state;
    }

    private PlateState solve(Stream stream, Surround around, double faceK, double[] stripW, double slope) {
        return new SteadyPlate(mesh, convection(stream, faceK), rig.exchangeFactor(), around.adiabaticK())
                .solve(stripW, around, slope);
    }

    /** Centre-line temperature to which a loss run is brought in ten minutes and then held, K. */
    double targetK(double tau) {
        double room = Climate.roomK(plan.startS());
        return room + plan.riseK() * Math.max(0.0, Math.min(1.0, tau / 600.0));
    }

    /** Channels of this run: plate logger, power logger, tunnel logger. */
    List<String> channels() {
        List<String> all = new ArrayList<>(plan.kind() == Kind.LOSS ? Channels.PLATE_AND_COVER : Channels.PLATE);
        all.addAll(Channels.POWER);
        all.addAll(Channels.TUNNEL);
        return all;
    }

    /** True values of {@link #channels()}, SI. */
    double[] values(PlateState state, Stream stream) {
        double[] stripW = state.stripW();
        Surround around = state.surround();
        double[] out = new double[channels().size()];
        int at = 0;
        for (TrueRig.Junction j : mounted.junctions()) {
            double sheet = state.junctionK(j.xM(), j.zM(), j.depthM());
            out[at++] = sheet - j.stem() * (sheet - around.plenumK());
        }
        out[at++] = around.noseK();
        out[at++] = around.tailK();
        out[at++] = around.wallK() + 0.08;
        out[at++] = around.wallK() - 0.08;
        out[at++] = around.plenumK();
        out[at++] = around.frameK() + 0.06;
        out[at++] = around.frameK() - 0.06;
        if (plan.kind() == Kind.LOSS) {
            double inner = state.meanFaceK();
            out[at++] = inner;
            out[at++] = inner;
            out[at++] = around.adiabaticK();
            out[at++] = around.adiabaticK();
        }
        int strips = stripW.length;
        for (int s = 0; s < strips; s++) {
            double current = Math.sqrt(stripW[s] / mounted.stripOhm()[s]);
            out[at + s] = current * (mounted.stripOhm()[s] + mounted.leadOhm()[s]);
            out[at + strips + s] = current;
        }
        at += 2 * strips;
        double shown = stream.meterMPerS() / rig.pitotFactor();
        out[at++] = 0.5 * stream.fluid().density() * shown * shown;
        out[at++] = stream.meterMPerS() / rig.anemometerFactor();
        out[at++] = stream.streamK()
                + rig.probeRecovery() * stream.dynamicK()
                + rig.probeRadiation() * (around.wallK() - stream.streamK());
        out[at++] = stream.pressurePa();
        out[at] = stream.humidity();
        return out;
    }

    /** The truth at one instant, {@code tau} s after the start. */
    RunTruth truth(PlateState state, Stream stream, double tau) {
        double[] stripW = state.stripW();
        double time = plan.startS() + tau;
        double lead = 0.0;
        for (int s = 0; s < stripW.length; s++) {
            lead += stripW[s] / mounted.stripOhm()[s] * mounted.leadOhm()[s];
        }
        Panel panel = mounted.panel();
        double mean = state.meanFaceK();
        List<StationTruth> stations = new ArrayList<>();
        double h = Double.NaN;
        double reynolds = Double.NaN;
        double nusselt = Double.NaN;
        double prandtl = Double.NaN;
        if (plan.kind() == Kind.HEATED) {
            FluidState film = film(stream, mean);
            h = state.meanCoefficient();
            reynolds = stream.plateMPerS() * panel.endM() / film.kinematicViscosity();
            nusselt = h * panel.endM() / film.conductivity();
            prandtl = film.prandtl();
            for (TrueRig.Junction j : mounted.junctions()) {
                if (j.zM() == 0.0) {
                    stations.add(station(state, stream, j));
                }
            }
        }
        return new RunTruth(
                time,
                time,
                stream.plateMPerS(),
                stream.streamK(),
                stream.adiabaticK(),
                mean,
                h,
                reynolds,
                nusselt,
                prandtl,
                state.books(),
                lead,
                stations);
    }

    private StationTruth station(PlateState state, Stream stream, TrueRig.Junction j) {
        double x = j.xM();
        double face = state.faceK(x, 0.0);
        double convection = state.fluxWPerM2(x, 0.0) - state.radiationWPerM2(x, 0.0);
        double h = convection / (face - stream.adiabaticK());
        FluidState film = film(stream, face);
        return new StationTruth(
                j.channel(),
                x,
                face,
                convection,
                h,
                stream.plateMPerS() * x / film.kinematicViscosity(),
                h * x / film.conductivity(),
                film.prandtl());
    }
}
