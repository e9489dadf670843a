package plateledger.reduce;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import plateledger.ledger.LossCalibration;
import plateledger.ledger.RunLayout;
import plateledger.ledger.RunModel;
import plateledger.rig.Plate;

/** The loss runs of one panel: its conductances after them. */
final class LossStage {
    /** Number of conductances. */
    static final int OUTPUTS = LossCalibration.Parameter.values().length;

    /** Share of the power by which a loss run's balance may miss apart from the parameters: meters and drifts. */
    private static final double POWER_SHARE = 0.003;

    /** Temperature error of a loss run's own readings, K, turned into watts by the declared conductances. */
    private static final double TEMPERATURE_K = 0.05;

    private final List<RunIndex> runs;
    private final int[] zeroStages;
    private final RunLayout layout;
    private Optional<LossCalibration> calibration = Optional.empty();

    LossStage(List<RunIndex> runs, int[] zeroStages) {
        this.runs = List.copyOf(runs);
        this.zeroStages = zeroStages;
        this.layout = RunModel.layout(runs.get(0).plate);
    }

    Plate plate() {
        return runs.get(0).plate;
    }

    List<String> runIds() {
        return runs.stream().map(r -> r.means.run().id()).toList();
    }

    RunIndex first() {
        return runs.get(0);
    }

    /** Zero stages that this stage reads, each once. */
    int[] zeroStages() {
        return Arrays.stream(zeroStages).filter(z -> z >= 0).distinct().toArray();
    }

    /** Freezes weights at the best estimate. */
    void configure(Reads best, List<double[]> offsets) {
        Plate p = plate();
        double[] priorU = {
            p.backConductanceWPerM2K().standardUncertainty(),
            p.edgeConductanceWPerMK().standardUncertainty(),
            p.noseConductanceWPerK().standardUncertainty(),
            p.tailConductanceWPerK().standardUncertainty(),
            p.coverConductanceWPerK().standardUncertainty()
        };
        double length = p.heatedEndM().value() - p.heatedStartM().value();
        double perK = p.backConductanceWPerM2K().value() * length * p.widthM().value()
                + 2.0 * p.edgeConductanceWPerMK().value() * length
                + p.noseConductanceWPerK().value()
                + p.tailConductanceWPerK().value()
                + p.coverConductanceWPerK().value();
        boolean[] used = new boolean[layout.junctions()];
        Arrays.fill(used, true);
        double[] noise = new double[runs.size()];
        for (int r = 0; r < runs.size(); r++) {
            RunIndex run = runs.get(r);
            for (int t = 0; t < used.length; t++) {
                used[t] &= run.used[t] && zeroKnown(r, t, offsets);
            }
            double power = 0.0;
            double[] in = kernel(best, r, offsets);
            for (int j = 0; j < layout.strips(); j++) {
                power += in[layout.power(j)];
            }
            noise[r] = Math.hypot(POWER_SHARE * power, TEMPERATURE_K * perK);
        }
        calibration = Optional.of(LossCalibration.configure(p, used, priorU, noise));
    }

    private boolean zeroKnown(int run, int junction, List<double[]> offsets) {
        return zeroStages[run] < 0 || Double.isFinite(offsets.get(zeroStages[run])[junction]);
    }

    /** Conductances in parameter order. */
    double[] evaluate(Reads v, List<double[]> offsets) {
        double[] posterior = new double[OUTPUTS];
        calibration.orElseThrow().evaluate(lossRuns(v, offsets), KernelInputs.prior(v, runs.get(0)), posterior);
        return posterior;
    }

    private List<LossCalibration.LossRun> lossRuns(Reads v, List<double[]> offsets) {
        List<LossCalibration.LossRun> list = new ArrayList<>();
        for (int r = 0; r < runs.size(); r++) {
            RunIndex run = runs.get(r);
            list.add(new LossCalibration.LossRun(
                    kernel(v, r, offsets), Signal.mean(v, run.coverInner), Signal.mean(v, run.coverOuter)));
        }
        return list;
    }

    /** Power measured − modelled of each run, W. */
    double[] residuals(Reads v, List<double[]> offsets, double[] posterior) {
        return lossRuns(v, offsets).stream()
                .mapToDouble(run -> calibration.orElseThrow().residual(run, posterior))
                .toArray();
    }

    private double[] kernel(Reads v, int r, List<double[]> offsets) {
        RunIndex run = runs.get(r);
        double[] in = new double[layout.inputs()];
        KernelInputs.plate(v, run, layout, in);
        KernelInputs.power(v, run, layout, true, in);
        double[] zero = zeroStages[r] >= 0 ? offsets.get(zeroStages[r]) : new double[0];
        KernelInputs.readings(v, run, layout, zero, in);
        return in;
    }
}
