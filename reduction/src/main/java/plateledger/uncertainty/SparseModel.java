package plateledger.uncertainty;

/**
 * A pure function whose outputs fall into blocks of which an input changes only some: a campaign, with one block per run.
 * Stages that blocks share (zero offsets, loss parameters) belong to the model; an input that acts through them names
 * every block it reaches. Threads share one instance.
 */
public interface SparseModel {
    /** Number of inputs. */
    int inputs();

    /** Number of blocks. */
    int blocks();

    /** Number of outputs of a block. */
    int outputs(int block);

    /** The blocks that may change with an input, ascending, each once; not written to. */
    int[] blocksOf(int input);

    /**
     * Computes the outputs of one block.
     *
     * @param block which block
     * @param in all inputs, SI, in the order of the input list; not written to
     * @param out outputs of the block; overwritten, NaN where they cannot be evaluated
     */
    void evaluateBlock(int block, double[] in, double[] out);

    /** The blocks at one fixed input vector. */
    @FunctionalInterface
    interface At {
        /** Computes the outputs of one block, as {@link SparseModel#evaluateBlock}. */
        void evaluate(int block, double[] out);
    }

    /**
     * The blocks at one input vector. A model with shared stages overrides this to work them out once for all blocks
     * that follow; it is called once for each perturbed vector, and its result is used by one thread.
     *
     * @param in all inputs; neither written to nor changed by the caller while the result is in use
     */
    default At at(double[] in) {
        return (block, out) -> evaluateBlock(block, in, out);
    }
}
