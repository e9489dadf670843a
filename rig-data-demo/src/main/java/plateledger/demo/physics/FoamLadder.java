package plateledger.demo.physics;

/**
 * The foam behind one spot of the sheet as a ladder of equal layers, stepped implicitly in time with a fixed step. The
 * layers' new temperatures are linear in the sheet's, so they are eliminated before the sheet is solved.
 */
final class FoamLadder {
    /** What is behind the last layer. */
    enum FarSide {
        /** Held at the plenum's temperature. */
        HELD,
        /** Passes no heat. */
        INSULATED
    }

    private final int layers;
    private final double half;
    private final double capacity;
    private final double far;
    private final double[] factor;
    private final double[] pivot;
    private final double between;
    private final double[] share;

    /**
     * A ladder.
     *
     * @param conductance through the whole foam, W/(m² K)
     * @param heatCapacity of the whole foam, J/(m² K)
     * @param layers number of layers
     * @param stepS time step, s
     * @param farSide what is behind
     */
    FoamLadder(double conductance, double heatCapacity, int layers, double stepS, FarSide farSide) {
        this.layers = layers;
        between = conductance * layers;
        half = 2.0 * between;
        capacity = heatCapacity / layers / stepS;
        far = farSide == FarSide.HELD ? half : 0.0;
        factor = new double[layers];
        pivot = new double[layers];
        for (int k = 0; k < layers; k++) {
            double toward = k == 0 ? half : between;
            double away = k == layers - 1 ? far : between;
            pivot[k] = capacity + toward + away;
            if (k > 0) {
                factor[k] = between / pivot[k - 1];
                pivot[k] -= factor[k] * between;
            }
        }
        share = new double[layers];
        share[0] = half;
        solve(share);
    }

    /** Number of layers. */
    int layers() {
        return layers;
    }

    /** Conductance that the sheet feels within one step, W/(m² K). */
    double stepConductance() {
        return half * (1.0 - share[0]);
    }

    /**
     * Advances the layers as if the sheet were at 0; returns the flux that the layers would send to it, W/m².
     *
     * @param temperatures of the layers from the sheet on; overwritten
     * @param plenum temperature behind
     */
    double release(double[] temperatures, double plenum) {
        for (int k = 0; k < layers; k++) {
            temperatures[k] *= capacity;
        }
        temperatures[layers - 1] += far * plenum;
        solve(temperatures);
        return half * temperatures[0];
    }

    /** Completes the step that {@link #release} began, with the sheet's new temperature. */
    void complete(double[] temperatures, double sheet) {
        for (int k = 0; k < layers; k++) {
            temperatures[k] += share[k] * sheet;
        }
    }

    private void solve(double[] right) {
        for (int k = 1; k < layers; k++) {
            right[k] += factor[k] * right[k - 1];
        }
        right[layers - 1] /= pivot[layers - 1];
        for (int k = layers - 2; k >= 0; k--) {
            right[k] = (right[k] + between * right[k + 1]) / pivot[k];
        }
    }
}
