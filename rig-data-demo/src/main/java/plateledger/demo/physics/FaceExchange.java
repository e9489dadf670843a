package plateledger.demo.physics;

/**
 * Heat from the sheet to the stream (or to the cover) as a linear operator on the sheet temperature above T_aw, with the
 * resistance R between them eliminated: q = S (T − T_aw) + (1 − R S) c, where q = B (T_s − T_aw) + c at the face. B is
 * convection plus a constant radiation coefficient, c what radiation differs from that. B is diagonal (uniform h) or
 * lower triangular (what happens upstream is felt downstream, never the other way).
 */
final class FaceExchange {
    private final int n;
    private final double uniform;
    private final double[][] matrix;

    private FaceExchange(int n, double uniform, double[][] matrix) {
        this.n = n;
        this.uniform = uniform;
        this.matrix = matrix;
    }

    /** Exchange with one coefficient for all cells, W/(m² K), behind a resistance, m² K/W. */
    static FaceExchange uniform(int cells, double coefficient, double resistance) {
        return new FaceExchange(cells, coefficient / (1.0 + resistance * coefficient), new double[0][0]);
    }

    /** Exchange by a lower-triangular convection matrix plus a radiation coefficient, W/(m² K). */
    static FaceExchange matrix(double[][] convection, double radiation, double resistance) {
        int n = convection.length;
        double[][] s = new double[n][n];
        // S (1 + R B) = B, solved column by column from the last.
        for (int i = 0; i < n; i++) {
            for (int j = i; j >= 0; j--) {
                double sum = convection[i][j] + (i == j ? radiation : 0.0);
                for (int k = j + 1; k <= i; k++) {
                    sum -= s[i][k] * resistance * convection[k][j];
                }
                s[i][j] = sum / (1.0 + resistance * (convection[j][j] + radiation));
            }
        }
        return new FaceExchange(n, 0.0, s);
    }

    /** True if the operator is one number. */
    boolean isUniform() {
        return matrix.length == 0;
    }

    /** That number, W/(m² K). */
    double coefficient() {
        return uniform;
    }

    /** Adds S to a square matrix. */
    void addTo(double[][] to) {
        for (int i = 0; i < n; i++) {
            if (isUniform()) {
                to[i][i] += uniform;
            } else {
                for (int j = 0; j <= i; j++) {
                    to[i][j] += matrix[i][j];
                }
            }
        }
    }

    /** S applied to a vector. */
    void apply(double[] vector, double[] out) {
        for (int i = 0; i < n; i++) {
            if (isUniform()) {
                out[i] = uniform * vector[i];
            } else {
                double sum = 0.0;
                double[] row = matrix[i];
                for (int j = 0; j <= i; j++) {
                    sum += row[j] * vector[j];
                }
                out[i] = sum;
            }
        }
    }
}
