package plateledger.numeric;

/**
 * Direct solution of a tridiagonal system by elimination without pivoting (Thomas algorithm; Press et al., Numerical
 * Recipes, 3rd ed., §2.4, from memory). Stable for diagonally dominant matrices, which conduction in a plate gives.
 */
public final class Tridiagonal {
    private Tridiagonal() {}

    /**
     * Solves {@code lower[i] x[i-1] + diagonal[i] x[i] + upper[i] x[i+1] = right[i]} for i = 0 … n−1.
     *
     * @param lower sub-diagonal, length n; {@code lower[0]} is not used
     * @param diagonal main diagonal, length n
     * @param upper super-diagonal, length n; {@code upper[n-1]} is not used
     * @param right right-hand side, length n; may be the same array as {@code x}
     * @param work work array, at least n long, overwritten
     * @param x solution, length n; NaN or infinite where a pivot vanishes
     */
    public static void solve(
            double[] lower, double[] diagonal, double[] upper, double[] right, double[] work, double[] x) {
        int n = diagonal.length;
        if (lower.length != n || upper.length != n || right.length != n || x.length != n || work.length < n) {
            throw new IllegalArgumentException("arrays of a tridiagonal system of order " + n + " differ in length");
        }
        if (n == 0) {
            return;
        }
        double pivot = diagonal[0];
        x[0] = right[0] / pivot;
        for (int i = 1; i < n; i++) {
            work[i] = upper[i - 1] / pivot;
            pivot = diagonal[i] - lower[i] * work[i];
            x[i] = (right[i] - lower[i] * x[i - 1]) / pivot;
        }
        for (int i = n - 2; i >= 0; i--) {
            x[i] -= work[i + 1] * x[i + 1];
        }
    }
}
