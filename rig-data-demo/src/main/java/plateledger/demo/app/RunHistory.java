package plateledger.demo.app;

import java.util.ArrayList;
import java.util.List;
import plateledger.demo.app.RunPlan.Kind;
import plateledger.demo.physics.PlateMarch;
import plateledger.demo.physics.PlateState;
import plateledger.demo.physics.Surround;

/** One run in time: what every channel would show without errors, and the truth, step by step. */
public final class RunHistory {
    private static final double BEFORE_S = 60.0;

    private final RunModel model;
    private final double stepS;
    private final List<double[]> values = new ArrayList<>();
    private final List<RunTruth> truths = new ArrayList<>();

    /** Drives the run from ambient to its end. */
    RunHistory(RunModel model) {
        this.model = model;
        RunPlan plan = model.plan();
        stepS = plan.kind() == Kind.LOSS ? 10.0 : 5.0;
        double middle = 0.5 * (plan.truthFromS() + plan.durationS());
        double face = plan.kind() == Kind.HEATED
                ? model.steady(middle).meanFaceK()
                : model.stream(middle).streamK();
        RunModel.Stream start = model.stream(-BEFORE_S);
        double rest = plan.kind() == Kind.LOSS ? start.streamK() : start.adiabaticK();
        PlateMarch march = new PlateMarch(
                model.mesh(),
                model.convection(model.stream(middle), face),
                model.exchangeFactor(),
                rest,
                model.around(start, -BEFORE_S).plenumK(),
                stepS);
        double[] set = model.stripW();
        double[] off = new double[set.length];
        for (int i = 0; tau(i) <= plan.durationS() + stepS; i++) {
            RunModel.Stream stream = model.stream(tau(i));
            Surround around = model.around(stream, tau(i));
            PlateState state = plan.kind() == Kind.LOSS && tau(i) > 0.0
                    ? march.stepTo(model.targetK(tau(i)), around)
                    : march.step(tau(i) > 0.0 ? set : off, around);
            values.add(model.values(state, stream));
            truths.add(model.truth(state, stream, tau(i)));
        }
    }

    private double tau(int step) {
        return (step + 1) * stepS - BEFORE_S;
    }

    /** The run. */
    public RunPlan plan() {
        return model.plan();
    }

    /** Channels in the order of {@link #value}. */
    public List<String> channels() {
        return model.channels();
    }

    /** What channel number {@code channel} would show without errors, {@code tauS} s after the start, SI. */
    public double value(int channel, double tauS) {
        double place = (tauS + BEFORE_S) / stepS - 1.0;
        int i = Math.max(0, Math.min(values.size() - 2, (int) Math.floor(place)));
        double share = place - i;
        return values.get(i)[channel] + share * (values.get(i + 1)[channel] - values.get(i)[channel]);
    }

    /** The truth averaged over a window given in s since 1970-01-01T00:00Z. */
    public RunTruth truth(double fromS, double toS) {
        List<RunTruth> parts = truths.stream()
                .filter(t -> t.fromS() >= fromS && t.fromS() <= toS)
                .toList();
        if (parts.isEmpty()) {
            throw new IllegalArgumentException("no truth between " + fromS + " and " + toS);
        }
        return RunTruth.mean(parts);
    }

    /** The truth averaged over the run's last quarter of an hour. */
    public RunTruth truth() {
        double start = plan().startS();
        return truth(start + plan().truthFromS(), start + plan().durationS());
    }
}
