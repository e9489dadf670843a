package plateledger.reduce;

import java.util.List;
import java.util.Optional;
import plateledger.campaign.Campaign;
import plateledger.campaign.Definitions;
import plateledger.campaign.Run;
import plateledger.ledger.RunLayout;
import plateledger.ledger.RunModel;
import plateledger.ledger.RunSetting;
import plateledger.quantity.Estimate;
import plateledger.rig.Instrument;

/** One heated run in the chain. */
final class HeatedStage {
    /** Floor of a junction's random uncertainty, K: what the model itself cannot promise. */
    private static final double MODEL_K = 0.005;

    private final Campaign campaign;
    private final RunIndex index;
    private final StreamStage stream;
    private final InputBook.TunnelIndex tunnel;
    private final int zeroStage;
    private final int lossStage;
    private final RunLayout layout;
    private Optional<RunModel> kernel = Optional.empty();

    HeatedStage(
            Campaign campaign,
            RunIndex index,
            StreamStage stream,
            InputBook.TunnelIndex tunnel,
            int zeroStage,
            int lossStage) {
        this.campaign = campaign;
        this.index = index;
        this.stream = stream;
        this.tunnel = tunnel;
        this.zeroStage = zeroStage;
        this.lossStage = lossStage;
        this.layout = RunModel.layout(index.plate);
    }

    RunIndex index() {
        return index;
    }

    int zeroStage() {
        return zeroStage;
    }

    int lossStage() {
        return lossStage;
    }

    int outputs() {
        return layout.outputs();
    }

    int arguments() {
        return layout.inputs();
    }

    RunModel kernel() {
        return kernel.orElseThrow();
    }

    /** What is fixed for a run. */
    static RunSetting setting(Campaign campaign, RunIndex index, double[] sigma) {
        Run run = index.means.run();
        Definitions d = campaign.definitions();
        RunSetting.Flow flow = switch (run.regime()) {
            case LAMINAR -> RunSetting.Flow.LAMINAR;
            case TURBULENT -> RunSetting.Flow.TURBULENT;
            case PRODUCT -> RunSetting.Flow.PRODUCT;
        };
        return new RunSetting(
                index.plate,
                flow,
                run.trip().map(Run.Trip::xM),
                d.properties() == Definitions.PropertyTemperature.FILM,
                d.length() == Definitions.ReferenceLength.LEADING_EDGE,
                d.average() == Definitions.Average.FLUX_OVER_DIFFERENCE,
                sigma);
    }

    /** Freezes the kernel's choices at the best estimate. */
    void configure(Reads best, List<double[]> offsets, List<double[]> conductances) {
        double[] in = inputs(best, offsets, conductances);
        kernel = Optional.of(RunModel.configure(setting(campaign, index, sigma(in, offsets)), in));
    }

    /** Random standard uncertainty of each corrected reading: noise, drift since the zero, place times gradient. */
    private double[] sigma(double[] in, List<double[]> offsets) {
        int m = layout.junctions();
        double[] sigma = new double[m];
        int[] stations = java.util.Arrays.stream(RunModel.stationJunctions(index.plate))
                .filter(t -> index.used[t])
                .toArray();
        for (int t = 0; t < m; t++) {
            boolean usable = index.used[t] && (zeroStage < 0 || Double.isFinite(offsets.get(zeroStage)[t]));
            if (!usable) {
                sigma[t] = Double.POSITIVE_INFINITY;
                continue;
            }
            String channel = index.plate.thermocouples().get(t).channel();
            double noise = Optional.ofNullable(index.means.means().get(channel))
                    .map(Estimate::u)
                    .orElse(0.0);
            Optional<Instrument> owner = campaign.rig().instrumentOf(channel);
            double drift = owner.map(i -> i.dailyDrift().standardUncertainty()).orElse(0.0);
            double own = zeroStage < 0
                    ? owner.map(i -> i.channelOffset().standardUncertainty()).orElse(0.0)
                    : 0.0;
            double place = index.plate.thermocouples().get(t).xM().standardUncertainty()
                    * slope(in, stations, in[layout.place(t)]);
            sigma[t] = Math.sqrt(noise * noise + drift * drift + own * own + place * place + MODEL_K * MODEL_K);
        }
        return sigma;
    }

    /** |dT/dx| of the readings along the centre line near x, K/m. */
    private double slope(double[] in, int[] stations, double x) {
        int j = 0;
        while (j < stations.length - 2 && in[layout.place(stations[j + 1])] < x) {
            j++;
        }
        double dt = in[layout.reading(stations[j + 1])] - in[layout.reading(stations[j])];
        return Math.abs(dt / (in[layout.place(stations[j + 1])] - in[layout.place(stations[j])]));
    }

    /** The kernel's inputs for an input vector of the campaign. */
    double[] inputs(Reads v, List<double[]> offsets, List<double[]> conductances) {
        double[] in = new double[layout.inputs()];
        KernelInputs.plate(v, index, layout, in);
        KernelInputs.power(v, index, layout, true, in);
        KernelInputs.stream(v, index, tunnel, stream.at(v), layout, in);
        KernelInputs.conductances(
                lossStage >= 0 ? conductances.get(lossStage) : KernelInputs.prior(v, index), layout, in);
        double[] zero = zeroStage >= 0 ? offsets.get(zeroStage) : new double[0];
        KernelInputs.readings(v, index, layout, zero, in);
        KernelInputs.soak(index, layout, in);
        return in;
    }
}
