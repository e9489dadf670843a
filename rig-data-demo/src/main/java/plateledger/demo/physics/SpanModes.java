package plateledger.demo.physics;

/**
 * Conduction across half the span, symmetric about the centre line, with a conductance to the frame at the edge, brought
 * to diagonal form: in these modes the plate falls apart into independent problems along the flow.
 */
final class SpanModes {
    private final double[] value;
    private final double[][] vector;
    private final double[] root;
    private final double edge;

    /**
     * The modes.
     *
     * @param grid the cells
     * @param sheet conductivity times thickness, W/K
     * @param edgeConductance sheet edge to frame, W/(m K)
     */
    SpanModes(PlateGrid grid, double sheet, double edgeConductance) {
        int n = grid.across();
        root = new double[n];
        for (int j = 0; j < n; j++) {
            root[j] = Math.sqrt(grid.width(j));
        }
        edge = edgeConductance == 0.0 ? 0.0 : 1.0 / (1.0 / edgeConductance + 0.5 * grid.width(n - 1) / sheet);
        double[][] k = new double[n][n];
        for (int j = 0; j < n - 1; j++) {
            double g = sheet / (grid.z(j + 1) - grid.z(j));
            k[j][j] += g;
            k[j + 1][j + 1] += g;
            k[j][j + 1] -= g;
            k[j + 1][j] -= g;
        }
        k[n - 1][n - 1] += edge;
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                k[i][j] /= root[i] * root[j];
            }
        }
        vector = new double[n][n];
        diagonalise(k, vector);
        value = new double[n];
        for (int j = 0; j < n; j++) {
            value[j] = k[j][j];
        }
    }

    /** Number of modes. */
    int count() {
        return value.length;
    }

    /** Conductance that mode m adds, W/(m² K). */
    double conductance(int m) {
        return value[m];
    }

    /** Conductance from the last cell's centre to the frame per length, W/(m K). */
    double edgeConductance() {
        return edge;
    }

    /** From cells [j][i] to modes [m][i]. */
    void toModes(double[][] cells, double[][] modes) {
        int n = value.length;
        for (int m = 0; m < n; m++) {
            java.util.Arrays.fill(modes[m], 0.0);
            for (int j = 0; j < n; j++) {
                add(modes[m], vector[j][m] * root[j], cells[j]);
            }
        }
    }

    /** From modes [m][i] to cells [j][i]. */
    void toCells(double[][] modes, double[][] cells) {
        int n = value.length;
        for (int j = 0; j < n; j++) {
            java.util.Arrays.fill(cells[j], 0.0);
            for (int m = 0; m < n; m++) {
                add(cells[j], vector[j][m] / root[j], modes[m]);
            }
        }
    }

    private static void add(double[] to, double factor, double[] what) {
        for (int i = 0; i < to.length; i++) {
            to[i] += factor * what[i];
        }
    }

    /** Jacobi's rotations: afterwards {@code a} is diagonal and the columns of {@code v} are its eigenvectors. */
    private static void diagonalise(double[][] a, double[][] v) {
        int n = a.length;
        for (int i = 0; i < n; i++) {
            v[i][i] = 1.0;
        }
        for (int sweep = 0; sweep < 30; sweep++) {
            double off = 0.0;
            double all = 0.0;
            for (int p = 0; p < n; p++) {
                all += a[p][p] * a[p][p];
                for (int q = p + 1; q < n; q++) {
                    off += a[p][q] * a[p][q];
                }
            }
            if (off <= 1e-30 * all) {
                return;
            }
            for (int p = 0; p < n - 1; p++) {
                for (int q = p + 1; q < n; q++) {
                    if (a[p][q] != 0.0) {
                        rotate(a, v, p, q);
                    }
                }
            }
        }
    }

    private static void rotate(double[][] a, double[][] v, int p, int q) {
        double tau = (a[q][q] - a[p][p]) / (2.0 * a[p][q]);
        double t = Math.copySign(1.0, tau) / (Math.abs(tau) + Math.sqrt(1.0 + tau * tau));
        double c = 1.0 / Math.sqrt(1.0 + t * t);
        double s = t * c;
        for (int i = 0; i < a.length; i++) {
            double ap = a[i][p];
            double aq = a[i][q];
            a[i][p] = c * ap - s * aq;
            a[i][q] = s * ap + c * aq;
        }
        for (int i = 0; i < a.length; i++) {
            double ap = a[p][i];
            double aq = a[q][i];
            a[p][i] = c * ap - s * aq;
            a[q][i] = s * ap + c * aq;
            double vp = v[i][p];
            double vq = v[i][q];
            v[i][p] = c * vp - s * vq;
            v[i][q] = s * vp + c * vq;
        }
    }
}
