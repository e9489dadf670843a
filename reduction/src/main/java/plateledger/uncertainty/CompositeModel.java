package plateledger.uncertainty;

/**
 * A pure function in two steps: many inputs make the few arguments of each block, and the arguments of a block make its
 * outputs. The first step is cheap, the second is not: propagation perturbs each argument once instead of each input, and
 * carries the inputs through by the chain rule. Threads share one instance.
 */
public interface CompositeModel {
    /** Number of inputs. */
    int inputs();

    /** Number of blocks. */
    int blocks();

    /** Number of arguments of a block. */
    int arguments(int block);

    /** Number of outputs of a block. */
    int outputs(int block);

    /** The blocks that may change with an input, ascending, each once; not written to. */
    int[] blocksOf(int input);

    /** The first step at one input vector. */
    @FunctionalInterface
    interface At {
        /** Computes the arguments of one block; overwritten. */
        void arguments(int block, double[] arguments);
    }

    /**
     * Opens an input vector: stages that blocks share are worked out once for all blocks that follow. Its result is used
     * by one thread.
     *
     * @param in all inputs, SI; neither written to nor changed while the result is in use
     */
    At at(double[] in);

    /**
     * The second step: outputs of one block from its arguments.
     *
     * @param arguments not written to
     * @param out overwritten, NaN where it cannot be evaluated
     */
    void evaluate(int block, double[] arguments, double[] out);
}
