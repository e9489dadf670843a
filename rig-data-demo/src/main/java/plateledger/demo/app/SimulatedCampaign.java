package plateledger.demo.app;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import plateledger.demo.app.RunPlan.Kind;
import plateledger.demo.physics.LaminarLayer;
import plateledger.demo.physics.MeshedPanel;
import plateledger.demo.physics.PlateGrid;
import plateledger.demo.physics.PlateState;
import plateledger.demo.sensor.ChannelErrors;
import plateledger.demo.sensor.ChannelNoise;
import plateledger.demo.sensor.Channels;
import plateledger.demo.sensor.Draws;
import plateledger.demo.sensor.InstrumentDeclaration;
import plateledger.demo.sensor.PanelDeclaration;
import plateledger.demo.sensor.RigDeclaration;
import plateledger.demo.sensor.TrueRig;

/**
 * Campaigns on rigs drawn from what the demo campaign's files declare. One instance serves any number of seeds and
 * threads: it keeps only the marched step responses of the laminar layer.
 */
public final class SimulatedCampaign {
    /** Seed of the campaign that is checked in. */
    public static final long DEMO_SEED = 20260310L;

    private static final double REACH = 6.0; // x/ξ up to 0.5003/0.0998, with room

    private final LaminarLayer.Responses responses = new LaminarLayer.Responses(REACH);

    /** Opens the simulator: marches the laminar layer once, about 0.1 s. */
    public SimulatedCampaign() {}

    /** One campaign: its rig as drawn, its runs, its instruments' errors. */
    final class Drawn {
        private final Draws draws;
        private final TrueRig rig;
        private final ChannelErrors errors;
        private final ProductLaw law;
        private final List<RunPlan> plans;
        private final Map<String, MeshedPanel> meshes = new HashMap<>();
        private final Map<String, LaminarLayer> layers = new HashMap<>();

        private Drawn(long seed, Options options, PlateGrid.Fineness fineness) {
            draws = options.errors() == Options.Errors.NONE ? Draws.none() : Draws.of(seed);
            rig = TrueRig.draw(draws, RigDeclaration.standard(), panels());
            errors = new ChannelErrors(draws, InstrumentDeclaration.standard());
            law = ProductLaw.straight().bent(options.bend());
            plans = options.productOnly() ? Schedule.productOnly(draws) : Schedule.full(draws);
            rig.panels().forEach((id, mounted) -> {
                if (id.equals("product") || !options.productOnly()) {
                    MeshedPanel mesh = MeshedPanel.of(mounted.panel(), fineness);
                    meshes.put(id, mesh);
                    if (id.equals("baseline")) {
                        layers.put(id, new LaminarLayer(responses, mesh.grid().faces()));
                    }
                }
            });
        }

        Draws draws() {
            return draws;
        }

        TrueRig rig() {
            return rig;
        }

        ChannelErrors errors() {
            return errors;
        }

        ProductLaw law() {
            return law;
        }

        List<RunPlan> plans() {
            return plans;
        }

        RunModel model(RunPlan plan) {
            MeshedPanel mesh = meshes.get(plan.panel());
            if (mesh == null) {
                throw new IllegalArgumentException("panel " + plan.panel() + " is not part of this campaign");
            }
            LaminarLayer layer = layers.get(plan.panel());
            return layer == null ? new RunModel(rig, mesh, law, plan) : new RunModel(rig, mesh, layer, law, plan);
        }
    }

    /** The panels of the demo rig by id. */
    static Map<String, PanelDeclaration> panels() {
        return Map.of("baseline", PanelDeclaration.standard(), "product", PanelDeclaration.standard());
    }

    /** Draws a campaign to be driven in time. */
    Drawn draw(long seed, Options options) {
        return new Drawn(seed, options, PlateGrid.Fineness.NORMAL);
    }

    /**
     * The truth and the readings of one run of a campaign, driven in time.
     *
     * @throws IllegalArgumentException if the campaign has no such run
     */
    public RunHistory history(long seed, Options options, String runId) {
        Drawn drawn = draw(seed, options);
        return new RunHistory(drawn.model(plan(drawn.plans(), runId)));
    }

    /** The truth of one run from the steady model on a grid of some fineness: how fine is fine enough. */
    RunTruth steadyTruth(long seed, Options options, String runId, PlateGrid.Fineness fineness) {
        Drawn drawn = new Drawn(seed, options, fineness);
        RunModel model = drawn.model(plan(drawn.plans(), runId));
        double middle = 0.5 * (model.plan().truthFromS() + model.plan().durationS());
        return model.truth(model.steady(middle), model.stream(middle), middle);
    }

    /** The product's law under some options. */
    public static ProductLaw law(Options options) {
        return ProductLaw.straight().bent(options.bend());
    }

    static RunPlan plan(List<RunPlan> plans, String runId) {
        return plans.stream()
                .filter(plan -> plan.id().equals(runId))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no run " + runId));
    }

    /** Window means of every run of a campaign, without logs: the plate steady, the room drifting. */
    public List<RunMeans> means(long seed, Options options) {
        Drawn drawn = new Drawn(seed, options, PlateGrid.Fineness.FAST);
        List<RunMeans> out = new ArrayList<>();
        for (RunPlan plan : drawn.plans()) {
            out.add(means(drawn, drawn.model(plan)));
        }
        return List.copyOf(out);
    }

    private static RunMeans means(Drawn drawn, RunModel model) {
        RunPlan plan = model.plan();
        boolean fanOff = plan.kind() == Kind.FAN_OFF_BEFORE || plan.kind() == Kind.FAN_OFF_AFTER;
        double span = fanOff ? 240.0 : plan.kind() == Kind.LOSS ? 2400.0 : RunPlan.TRUTH_WINDOW_S;
        double middle = plan.durationS() - 0.5 * span;
        RunModel.Stream stream = model.stream(middle);
        PlateState state = model.steady(middle);
        double[] values = model.values(state, stream);
        List<String> channels = model.channels();
        Random random = drawn.draws().generator("run:" + plan.id() + "/means");
        double size = drawn.draws().isNone() ? 0.0 : 1.0;
        Map<String, Double> mean = new HashMap<>();
        Map<String, Double> error = new HashMap<>();
        for (int c = 0; c < values.length; c++) {
            String channel = channels.get(c);
            boolean tunnel = Channels.TUNNEL.contains(channel);
            double interval = tunnel ? plan.tunnelIntervalS() : plan.intervalS();
            double se = ChannelNoise.of(channel, values[c]).standardError(span, interval);
            double reading = drawn.errors().reading(channel, plan.day(), moment(plan), values[c]);
            mean.put(channel, reading + size * se * random.nextGaussian());
            error.put(channel, se);
        }
        double slope = plan.kind() == Kind.LOSS ? 0.0 : Climate.roomSlopeKPerS(plan.startS() + middle);
        // Slope of a line through the mean of the 20 junctions: √12 u(mean)/span.
        double slopeError =
                Math.sqrt(12.0 / 20.0) * ChannelNoise.of("T01", 300.0).standardError(span, plan.intervalS()) / span;
        return new RunMeans(
                plan,
                mean,
                error,
                span,
                slope + size * slopeError * random.nextGaussian(),
                slopeError,
                model.truth(state, stream, middle));
    }

    static ChannelErrors.Moment moment(RunPlan plan) {
        return switch (plan.kind()) {
            case FAN_OFF_BEFORE -> ChannelErrors.Moment.FAN_OFF_BEFORE;
            case FAN_OFF_AFTER -> ChannelErrors.Moment.FAN_OFF_AFTER;
            case ZERO -> ChannelErrors.Moment.ZERO_RUN;
            case LOSS, HEATED -> ChannelErrors.Moment.RUN;
        };
    }
}
