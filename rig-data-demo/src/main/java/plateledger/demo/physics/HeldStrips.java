package plateledger.demo.physics;

/**
 * The controllers of a loss run: each strip's supply holds the mean of its two centre-line junctions at one temperature.
 * A covered plate is linear, so the powers follow from the plate's idle answer and its answer to one watt per strip.
 */
final class HeldStrips {
    private final PlateEquations equations;
    private final double[][] response;
    private final double centreShare;
    private final int strips;

    HeldStrips(PlateEquations equations, StreamwiseSystem system) {
        this.equations = equations;
        strips = equations.panel().stripEdgesM().length - 1;
        centreShare = equations.centreShare();
        response = new double[strips][strips];
        for (int s = 0; s < strips; s++) {
            double[] unit = new double[strips];
            unit[s] = 1.0;
            double[] field = new double[equations.along()];
            equations.addStrips(unit, field);
            system.solve(field);
            for (int r = 0; r < strips; r++) {
                response[r][s] = junctions(field, r);
            }
        }
    }

    int strips() {
        return strips;
    }

    /** Powers (W, none below 0) that bring the centre line to {@code centreK} over the idle field. */
    double[] powers(double[] idle, double centreK, Surround around) {
        double far = (centreK - centreShare * around.frameK()) / (1.0 - centreShare) - equations.referenceK();
        double[][] a = new double[strips][];
        double[] x = new double[strips];
        for (int r = 0; r < strips; r++) {
            a[r] = response[r].clone();
            x[r] = far - junctions(idle, r);
        }
        // Gauss without pivoting: each strip answers most to its own power.
        for (int p = 0; p < strips; p++) {
            for (int r = p + 1; r < strips; r++) {
                double factor = a[r][p] / a[p][p];
                for (int c = p; c < strips; c++) {
                    a[r][c] -= factor * a[p][c];
                }
                x[r] -= factor * x[p];
            }
        }
        for (int r = strips - 1; r >= 0; r--) {
            for (int c = r + 1; c < strips; c++) {
                x[r] -= a[r][c] * x[c];
            }
            x[r] /= a[r][r];
        }
        for (int r = 0; r < strips; r++) {
            x[r] = Math.max(0.0, x[r]);
        }
        return x;
    }

    private double junctions(double[] field, int strip) {
        double from = equations.panel().stripEdgesM()[strip];
        double length = equations.panel().stripEdgesM()[strip + 1] - from;
        PlateGrid grid = equations.grid();
        return 0.5 * (grid.along(field, from + 0.25 * length) + grid.along(field, from + 0.75 * length));
    }
}
