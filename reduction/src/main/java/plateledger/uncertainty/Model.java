package plateledger.uncertainty;

/** A pure function of a vector of scalar inputs. Keeps nothing between calls, so threads may share one instance. */
@FunctionalInterface
public interface Model {
    /**
     * Computes all outputs.
     *
     * @param in inputs, SI, in the order of the input list; not written to
     * @param out outputs, SI; overwritten, NaN where they cannot be evaluated
     */
    void evaluate(double[] in, double[] out);
}
