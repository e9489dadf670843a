package plateledger.numeric;

/**
 * Cholesky factor of a small symmetric positive definite matrix, in place, for the least-squares systems of the kernel
 * (Golub &amp; Van Loan, Matrix Computations, 4th ed., §4.2, from memory). Only the lower triangle is read and written.
 */
public final class SmallCholesky {
    private SmallCholesky() {}

    /**
     * Replaces the lower triangle of {@code a} by L with A = L Lᵀ.
     *
     * @param a symmetric matrix, n × n at least; only its lower triangle counts
     * @param n order
     * @return true if the matrix is positive definite; otherwise false, and {@code a} holds no usable factor
     */
    public static boolean factor(double[][] a, int n) {
        for (int j = 0; j < n; j++) {
            double[] row = a[j];
            double pivot = row[j];
            for (int k = 0; k < j; k++) {
                pivot -= row[k] * row[k];
            }
            if (!(pivot > 0.0) || Double.isInfinite(pivot)) {
                return false;
            }
            double root = Math.sqrt(pivot);
            row[j] = root;
            for (int i = j + 1; i < n; i++) {
                double[] below = a[i];
                double sum = below[j];
                for (int k = 0; k < j; k++) {
                    sum -= below[k] * row[k];
                }
                below[j] = sum / root;
            }
        }
        return true;
    }

    /**
     * Solves A x = b with the factor of {@link #factor}.
     *
     * @param factor L in the lower triangle
     * @param n order
     * @param b right-hand side on entry, solution on return
     */
    public static void solve(double[][] factor, int n, double[] b) {
        for (int i = 0; i < n; i++) {
            double sum = b[i];
            for (int k = 0; k < i; k++) {
                sum -= factor[i][k] * b[k];
            }
            b[i] = sum / factor[i][i];
        }
        for (int i = n - 1; i >= 0; i--) {
            double sum = b[i];
            for (int k = i + 1; k < n; k++) {
                sum -= factor[k][i] * b[k];
            }
            b[i] = sum / factor[i][i];
        }
    }
}
