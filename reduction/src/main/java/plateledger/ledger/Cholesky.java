package plateledger.ledger;

/** Small symmetric positive definite systems in place; only the lower triangle is read. */
final class Cholesky {
    private Cholesky() {}

    /** Factors {@code a} in place and solves {@code a x = b}, leaving x in {@code b}. NaN where a is not definite. */
    static void solve(double[][] a, double[] b, int n) {
        for (int j = 0; j < n; j++) {
            double d = a[j][j];
            for (int m = 0; m < j; m++) {
                d -= a[j][m] * a[j][m];
            }
            double root = Math.sqrt(d);
            a[j][j] = root;
            for (int i = j + 1; i < n; i++) {
                double v = a[i][j];
                for (int m = 0; m < j; m++) {
                    v -= a[i][m] * a[j][m];
                }
                a[i][j] = v / root;
            }
        }
        substitute(a, b, n);
    }

    /** Solves with a factor left by {@link #solve}. */
    static void substitute(double[][] factor, double[] b, int n) {
        for (int i = 0; i < n; i++) {
            double v = b[i];
            for (int m = 0; m < i; m++) {
                v -= factor[i][m] * b[m];
            }
            b[i] = v / factor[i][i];
        }
        for (int i = n - 1; i >= 0; i--) {
            double v = b[i];
            for (int m = i + 1; m < n; m++) {
                v -= factor[m][i] * b[m];
            }
            b[i] = v / factor[i][i];
        }
    }
}
