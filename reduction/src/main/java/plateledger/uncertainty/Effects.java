package plateledger.uncertainty;

import java.util.Arrays;

/**
 * What one standard uncertainty of each input does to each output: c_i u_i, kept only for the inputs that reach a block.
 * Since an input is one source wherever it enters, covariances between outputs of any blocks follow from it. Immutable.
 */
public final class Effects {
    /**
     * One block.
     *
     * @param values outputs at the best estimates
     * @param inputs positions of the inputs that reach the block and are uncertain, ascending
     * @param effects by input, then output
     * @param curvatures by input, then output
     */
    record Block(double[] values, int[] inputs, double[][] effects, float[][] curvatures) {}

    private static final double[] NOTHING = new double[0];

    private final InputList inputs;
    private final Block[] blocks;

    Effects(InputList inputs, Block[] blocks) {
        this.inputs = inputs;
        this.blocks = blocks;
    }

    /** The inputs. */
    public InputList inputs() {
        return inputs;
    }

    /** Number of blocks. */
    public int blocks() {
        return blocks.length;
    }

    /** Number of outputs of a block. */
    public int outputs(int block) {
        return blocks[block].values().length;
    }

    /** Positions of the uncertain inputs that reach a block, ascending. */
    public int[] inputsOf(int block) {
        return blocks[block].inputs().clone();
    }

    /** An output at the best estimates; NaN where it cannot be evaluated. */
    public double value(int block, int output) {
        return blocks[block].values()[output];
    }

    /** c_i u_i in the output's unit, signed; 0 where the input does not reach the block. */
    public double effect(int block, int output, int input) {
        int at = Arrays.binarySearch(blocks[block].inputs(), input);
        return at < 0 ? 0.0 : blocks[block].effects()[at][output];
    }

    /**
     * |f(+u) + f(−u) − 2f|/2 in the output's unit; 0 where the input does not reach the block, NaN where one side could
     * not be evaluated. Kept in single precision.
     */
    public double curvature(int block, int output, int input) {
        int at = Arrays.binarySearch(blocks[block].inputs(), input);
        return at < 0 ? 0.0 : blocks[block].curvatures()[at][output];
    }

    /** Largest curvature of an output over all inputs, where both sides could be evaluated. */
    public double largestCurvature(int block, int output) {
        double largest = 0.0;
        for (float[] curvature : blocks[block].curvatures()) {
            if (curvature[output] > largest) {
                largest = curvature[output];
            }
        }
        return largest;
    }

    /** Value, combined standard uncertainty and effective degrees of freedom of an output. */
    public Combined combined(int block, int output) {
        Block b = blocks[block];
        int n = b.inputs().length;
        double[] g = n == 0 ? NOTHING : new double[n];
        double[] dof = n == 0 ? NOTHING : new double[n];
        for (int k = 0; k < n; k++) {
            g[k] = b.effects()[k][output];
            dof[k] = inputs.get(b.inputs()[k]).dof();
        }
        return Combined.of(b.values()[output], g, dof);
    }

    /**
     * Covariance of two outputs through the inputs they share: Σ_i g_i h_i. METHODS.md eq. (U-4).
     */
    public double covariance(int blockA, int outputA, int blockB, int outputB) {
        Block a = blocks[blockA];
        Block b = blocks[blockB];
        double sum = 0.0;
        int i = 0;
        int j = 0;
        while (i < a.inputs().length && j < b.inputs().length) {
            int order = Integer.compare(a.inputs()[i], b.inputs()[j]);
            if (order == 0) {
                sum += a.effects()[i][outputA] * b.effects()[j][outputB];
            }
            if (order <= 0) {
                i++;
            }
            if (order >= 0) {
                j++;
            }
        }
        return sum;
    }

    /** Correlation of two outputs; NaN where one has no uncertainty. */
    public double correlation(int blockA, int outputA, int blockB, int outputB) {
        return covariance(blockA, outputA, blockB, outputB)
                / Math.sqrt(
                        covariance(blockA, outputA, blockA, outputA) * covariance(blockB, outputB, blockB, outputB));
    }
}
