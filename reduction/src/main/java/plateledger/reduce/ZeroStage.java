package plateledger.reduce;

import java.util.Optional;
import plateledger.campaign.Campaign;
import plateledger.ledger.RunLayout;
import plateledger.ledger.RunModel;
import plateledger.ledger.ZeroPrediction;

/** One zero run: each junction's offset is its reading less what the ledger predicts there without power. */
final class ZeroStage {
    private final Campaign campaign;
    private final RunIndex index;
    private final StreamStage stream;
    private final InputBook.TunnelIndex tunnel;
    private final RunLayout layout;
    private Optional<ZeroPrediction> prediction = Optional.empty();

    ZeroStage(Campaign campaign, RunIndex index, StreamStage stream, InputBook.TunnelIndex tunnel) {
        this.campaign = campaign;
        this.index = index;
        this.stream = stream;
        this.tunnel = tunnel;
        this.layout = RunModel.layout(index.plate);
    }

    RunIndex index() {
        return index;
    }

    /** Freezes the prediction at the best estimate. */
    void configure(Reads best) {
        prediction = Optional.of(ZeroPrediction.configure(
                HeatedStage.setting(campaign, index, new double[layout.junctions()]), kernel(best)));
    }

    /** Offsets of the junctions, then their zero readings, K; NaN for a junction that was not read. */
    double[] evaluate(Reads v) {
        int m = layout.junctions();
        double[] predicted = new double[m];
        prediction.orElseThrow().evaluate(kernel(v), v.get(tunnel.zeroH()), predicted);
        double[] zero = new double[2 * m];
        for (int t = 0; t < m; t++) {
            double raw = index.junctions.get(t).map(s -> s.raw(v)).orElse(Double.NaN);
            zero[t] = raw - predicted[t];
            zero[m + t] = raw;
        }
        return zero;
    }

    private double[] kernel(Reads v) {
        double[] in = new double[layout.inputs()];
        KernelInputs.plate(v, index, layout, in);
        KernelInputs.power(v, index, layout, false, in);
        KernelInputs.stream(v, index, tunnel, stream.at(v), layout, in);
        // the zero run precedes the loss runs in the chain, so the declared conductances serve here
        KernelInputs.conductances(KernelInputs.prior(v, index), layout, in);
        return in;
    }
}
