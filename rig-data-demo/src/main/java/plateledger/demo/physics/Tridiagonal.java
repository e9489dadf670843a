package plateledger.demo.physics;

/** Direct solution of three-banded systems without pivoting, for diagonally dominant matrices. */
final class Tridiagonal {
    private Tridiagonal() {}

    /** Solves the first {@code n} equations; {@code diagonal} and {@code right} are overwritten. */
    static void solve(double[] lower, double[] diagonal, double[] upper, double[] right, double[] out, int n) {
        for (int i = 1; i < n; i++) {
            double factor = lower[i] / diagonal[i - 1];
            diagonal[i] -= factor * upper[i - 1];
            right[i] -= factor * right[i - 1];
        }
        out[n - 1] = right[n - 1] / diagonal[n - 1];
        for (int i = n - 2; i >= 0; i--) {
            out[i] = (right[i] - upper[i] * out[i + 1]) / diagonal[i];
        }
    }
}
