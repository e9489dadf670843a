package plateledger.demo.proof;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import plateledger.campaign.Campaign;
import plateledger.campaign.RunType;
import plateledger.demo.app.Options;
import plateledger.demo.app.SimulatedCampaign;
import plateledger.quantity.Estimate;
import plateledger.quantity.Stated;
import plateledger.reduce.LossResult;
import plateledger.reduce.MeansReduction;
import plateledger.reduce.Progress;
import plateledger.reduce.RunMeans;
import plateledger.reduce.RunResult;
import plateledger.rig.Plate;
import plateledger.rig.Rig;

/**
 * What each correction is worth: the demo rig without errors, reduced with one correction wrong or left out. The loss
 * runs are left out too, with their result put in its place, or they would hide the fault.
 */
final class Corrections {
    private static final List<String> RUNS = List.of("B01", "B15", "P01", "P13");

    private final Campaign campaign = Simulated.campaign();
    private final List<RunMeans> means;
    private final Map<String, RunResult.Values> base;
    private final Campaign calibrated;

    Corrections() throws Exception {
        SimulatedCampaign simulator = new SimulatedCampaign();
        means = Simulated.means(campaign, simulator.means(1L, new Options(false, 0.0, Options.Errors.NONE)));
        Map<String, LossResult> losses = new LinkedHashMap<>();
        MeansReduction.of(campaign, means, 2, Progress.NONE).losses().forEach(l -> losses.put(l.plate(), l));
        calibrated = withPlates(campaign, plate -> {
            LossResult loss = losses.get(plate.id());
            if (loss == null) {
                return plate;
            }
            List<LossResult.Parameter> p = loss.parameters();
            return changed(
                    plate,
                    plate.coat(),
                    plate.emissivity(),
                    stated(p.get(0).posterior()),
                    stated(p.get(1).posterior()),
                    stated(p.get(2).posterior()),
                    stated(p.get(3).posterior()));
        });
        base = reduce(calibrated, m -> m);
    }

    private static Stated stated(Estimate e) {
        return Stated.standard(e.value(), e.u());
    }

    private Map<String, RunResult.Values> reduce(Campaign with, UnaryOperator<RunMeans> change) throws Exception {
        List<RunMeans> some = new ArrayList<>();
        for (RunMeans m : means) {
            boolean shown =
                    m.run().type() != RunType.HEATED || RUNS.contains(m.run().id());
            if (m.run().type() != RunType.LOSS && shown) {
                some.add(change.apply(m));
            }
        }
        return MeansReduction.of(with, some, 2, Progress.NONE).values();
    }

    void append(StringBuilder text) throws Exception {
        text.append("## What each correction is worth\n\n");
        text.append(
                "Change of Nu_L when it is wrong or left out (rig without errors), and E_n of the baseline with it.\n\n");
        text.append(
                "| change | baseline 2 m/s | E_n | baseline 20 m/s tripped | E_n | product 2 m/s | product 20 m/s |\n");
        text.append("| --- | --- | --- | --- | --- | --- | --- |\n");
        row(text, "none", base);
        row(
                text,
                "emissivity − 0.1",
                reduce(plates(p -> emissivity(p, p.emissivity().value() - 0.1)), m -> m));
        row(text, "walls + 2 K", reduce(calibrated, this::warmerWalls));
        row(text, "coat left out", reduce(plates(Corrections::bare), m -> m));
        row(text, "edge loss smeared over the span", reduce(plates(Corrections::smeared), m -> m));
        row(text, "end conduction ignored", reduce(plates(p -> ends(p, 0.0)), m -> m));
        row(text, "no losses at all", reduce(plates(Corrections::lossless), Corrections::still));
        text.append('\n');
    }

    private void row(StringBuilder text, String what, Map<String, RunResult.Values> values) {
        text.append("| ").append(what);
        for (String run : RUNS) {
            double change = values.get(run).nuL().value() / base.get(run).nuL().value() - 1.0;
            text.append(String.format(Locale.ROOT, " | %+.2f %%", 100.0 * change));
            if (run.startsWith("B")) {
                text.append(
                        String.format(Locale.ROOT, " | %+.2f", values.get(run).en()));
            }
        }
        text.append(" |\n");
    }

    private Campaign plates(UnaryOperator<Plate> change) {
        return withPlates(calibrated, change);
    }

    private static Campaign withPlates(Campaign c, Function<Plate, Plate> change) {
        Rig r = c.rig();
        Rig rig = new Rig(
                r.title(),
                r.plates().stream().map(change).toList(),
                r.surroundings(),
                r.instruments(),
                r.limits(),
                r.protections());
        return new Campaign(
                c.title(), c.texts(), c.zone(), rig, c.definitions(), c.steady(), c.loggers(), c.runs(), c.fits());
    }

    private static Plate changed(
            Plate p, Plate.Coat coat, Stated emissivity, Stated back, Stated edge, Stated nose, Stated tail) {
        return new Plate(
                p.id(),
                p.description(),
                p.orientation(),
                p.lengthM(),
                p.widthM(),
                p.heatedStartM(),
                p.heatedEndM(),
                p.sheet(),
                coat,
                p.foam(),
                emissivity,
                back,
                edge,
                nose,
                tail,
                p.coverConductanceWPerK(),
                p.smoothShape(),
                p.heaters(),
                p.thermocouples());
    }

    private static Plate emissivity(Plate p, double value) {
        return changed(
                p,
                p.coat(),
                Stated.standard(value, p.emissivity().standardUncertainty()),
                p.backConductanceWPerM2K(),
                p.edgeConductanceWPerMK(),
                p.noseConductanceWPerK(),
                p.tailConductanceWPerK());
    }

    /** A coat of no resistance to speak of. */
    private static Plate bare(Plate p) {
        Plate.Coat none = new Plate.Coat("none", Stated.exact(1e-9), p.coat().conductivityWPerMK());
        return changed(
                p,
                none,
                p.emissivity(),
                p.backConductanceWPerM2K(),
                p.edgeConductanceWPerMK(),
                p.noseConductanceWPerK(),
                p.tailConductanceWPerK());
    }

    /** Both edges' conductance spread evenly over the area as if it were part of the back. */
    private static Plate smeared(Plate p) {
        double even = 2.0 * p.edgeConductanceWPerMK().value() / p.widthM().value();
        return changed(
                p,
                p.coat(),
                p.emissivity(),
                Stated.standard(
                        p.backConductanceWPerM2K().value() + even,
                        p.backConductanceWPerM2K().standardUncertainty()),
                Stated.exact(1e-9),
                p.noseConductanceWPerK(),
                p.tailConductanceWPerK());
    }

    private static Plate ends(Plate p, double value) {
        return changed(
                p,
                p.coat(),
                p.emissivity(),
                p.backConductanceWPerM2K(),
                p.edgeConductanceWPerMK(),
                Stated.exact(value),
                Stated.exact(value));
    }

    private static Plate lossless(Plate p) {
        return changed(
                p,
                p.coat(),
                Stated.exact(1e-12),
                Stated.exact(1e-9),
                Stated.exact(1e-9),
                Stated.exact(0.0),
                Stated.exact(0.0));
    }

    private static RunMeans still(RunMeans m) {
        return RunMeans.balanced(m.run(), m.means(), Estimate.of(0.0, 0.0), m.powerCovarianceW(), m.middleS());
    }

    private RunMeans warmerWalls(RunMeans m) {
        Map<String, Estimate> moved = new LinkedHashMap<>(m.means());
        for (String channel : campaign.rig().surroundings().wallChannels()) {
            moved.computeIfPresent(channel, (name, e) -> new Estimate(e.value() + 2.0, e.u(), e.dof()));
        }
        return RunMeans.balanced(m.run(), moved, m.drift(), m.powerCovarianceW(), m.middleS());
    }
}
