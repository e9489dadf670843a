package plateledger.demo.physics;

/**
 * The equations of one span mode along the flow: conduction to both neighbours plus face exchange with everything
 * upstream. Such a matrix has one band above the diagonal; it is eliminated from the last row up, which leaves a lower
 * triangle. Diagonally dominant, so without pivoting.
 */
final class StreamwiseSystem {
    private final int n;
    private final double[] eliminated;
    private final double[][] rows;
    private final boolean banded;

    /**
     * Factorises the system.
     *
     * @param grid the cells
     * @param sheet conductivity times thickness, W/K
     * @param noseConductance from the first cell's centre to the nose per span, W/(m K)
     * @param tailConductance from the last cell's centre to the tail per span, W/(m K)
     * @param coefficient what each cell exchanges besides, W/(m² K)
     * @param face exchange at the face
     */
    StreamwiseSystem(
            PlateGrid grid,
            double sheet,
            double noseConductance,
            double tailConductance,
            double coefficient,
            FaceExchange face) {
        n = grid.along();
        banded = face.isUniform();
        rows = new double[n][];
        eliminated = new double[n];
        double[] up = new double[n];
        double[][] full = new double[banded ? 0 : n][n];
        if (!banded) {
            face.addTo(full);
        }
        for (int i = 0; i < n; i++) {
            double dx = grid.length(i);
            double left = i == 0 ? noseConductance : sheet / (grid.x(i) - grid.x(i - 1));
            double right = i == n - 1 ? tailConductance : sheet / (grid.x(i + 1) - grid.x(i));
            up[i] = i == n - 1 ? 0.0 : -right / dx;
            double diagonal = coefficient + (left + right) / dx;
            double below = i == 0 ? 0.0 : -left / dx;
            if (banded) {
                rows[i] = new double[] {below, diagonal + face.coefficient()};
            } else {
                rows[i] = full[i];
                rows[i][i] += diagonal;
                if (i > 0) {
                    rows[i][i - 1] += below;
                }
            }
        }
        for (int i = n - 2; i >= 0; i--) {
            if (banded) {
                eliminated[i] = up[i] / rows[i + 1][1];
                rows[i][1] -= eliminated[i] * rows[i + 1][0];
            } else {
                eliminated[i] = up[i] / rows[i + 1][i + 1];
                for (int j = 0; j <= i; j++) {
                    rows[i][j] -= eliminated[i] * rows[i + 1][j];
                }
            }
        }
    }

    /** Solves for one right-hand side (W/m²), which is overwritten with the temperatures. */
    void solve(double[] right) {
        for (int i = n - 2; i >= 0; i--) {
            right[i] -= eliminated[i] * right[i + 1];
        }
        for (int i = 0; i < n; i++) {
            if (banded) {
                double below = i == 0 ? 0.0 : rows[i][0] * right[i - 1];
                right[i] = (right[i] - below) / rows[i][1];
            } else {
                double sum = right[i];
                double[] row = rows[i];
                for (int j = 0; j < i; j++) {
                    sum -= row[j] * right[j];
                }
                right[i] = sum / row[i];
            }
        }
    }
}
