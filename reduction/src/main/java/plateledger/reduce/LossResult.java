package plateledger.reduce;

import java.util.List;
import plateledger.quantity.Estimate;

/**
 * What the loss runs of one panel told.
 *
 * @param plate panel
 * @param runs loss runs used
 * @param parameters one line per parameter
 * @param residualsW power measured − modelled of each run, W, in run order
 */
public record LossResult(String plate, List<String> runs, List<Parameter> parameters, double[] residualsW) {
    /**
     * One parameter before and after.
     *
     * @param name e.g. {@code back conductance}
     * @param unit SI unit
     * @param prior as declared
     * @param posterior after the loss runs
     */
    public record Parameter(String name, String unit, Estimate prior, Estimate posterior) {
        /** Posterior over prior standard uncertainty; above 0.9 the runs did not inform it. */
        public double uRatio() {
            return prior.u() > 0 ? posterior.u() / prior.u() : 1.0;
        }
    }

    /** Copies the lists. */
    public LossResult {
        runs = List.copyOf(runs);
        parameters = List.copyOf(parameters);
    }
}
