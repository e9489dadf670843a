package plateledger.ledger;

import java.util.function.DoubleUnaryOperator;
import plateledger.ledger.RunLayout.In;
import plateledger.rig.Plate;

/**
 * An independent forward model for tests: the same sheet in plan, x by z, on a fine grid with every loss in its full form
 * (fourth-power radiation at every point, no span profile), solved by line relaxation with Newton steps. Written without
 * any class of the kernel but the names of its inputs.
 */
final class FineSheet {
    private static final double SIGMA = 5.670374419e-8;

    final int nx;
    final int nz;
    final double dx;
    final double dz;
    final double[][] t;
    final double[][] ts;
    private final double[] in;
    private final RunLayout l;
    private final double taw;
    private final double[] h;
    private final double face;

    /** Half the span is solved; z = 0 is a line of symmetry. h is a function of x. */
    FineSheet(Plate plate, double[] in, double taw, DoubleUnaryOperator hOfX, int nx, int nz) {
        this.in = in;
        this.l = RunModel.layout(plate);
        this.taw = taw;
        this.nx = nx;
        this.nz = nz;
        dx = 0.4 / nx;
        dz = 0.15 / nz;
        t = new double[nx][nz];
        ts = new double[nx][nz];
        h = new double[nx];
        for (int i = 0; i < nx; i++) {
            h[i] = hOfX.applyAsDouble(0.1 + (i + 0.5) * dx);
            java.util.Arrays.fill(t[i], taw + 15.0);
            java.util.Arrays.fill(ts[i], taw + 15.0);
        }
        face = get(In.COAT_THICKNESS) / get(In.COAT_CONDUCTIVITY) + get(In.JUNCTION_DEPTH) / get(In.SHEET_CONDUCTIVITY);
        solve();
    }

    private double get(In name) {
        return in[l.at(name)];
    }

    double flux(int i, int j) {
        return h[i] * (ts[i][j] - taw) + radiation(ts[i][j]);
    }

    double radiation(double surface) {
        return get(In.EXCHANGE_FACTOR)
                * get(In.EMISSIVITY)
                * SIGMA
                * (Math.pow(surface, 4) - Math.pow(get(In.WALL_TEMPERATURE), 4));
    }

    double conv(int i, int j) {
        return h[i] * (ts[i][j] - taw);
    }

    private void solve() {
        double kt = get(In.SHEET_CONDUCTIVITY) * get(In.SHEET_THICKNESS);
        double noseG = get(In.NOSE_CONDUCTANCE) / 0.3;
        double tailG = get(In.TAIL_CONDUCTANCE) / 0.3;
        double edgeG = get(In.EDGE_CONDUCTANCE);
        double store = get(In.DRIFT)
                * (get(In.SHEET_HEAT_CAPACITY) * get(In.SHEET_THICKNESS)
                        + get(In.FOAM_HEAT_CAPACITY) * get(In.FOAM_THICKNESS) / 3.0);
        double gx = kt / (dx * dx);
        double gz = kt / (dz * dz);
        double endUp = 1.0 / (1.0 / noseG + 0.5 * dx / kt) / dx;
        double endDown = 1.0 / (1.0 / tailG + 0.5 * dx / kt) / dx;
        double side = 1.0 / (1.0 / edgeG + 0.5 * dz / kt) / dz;
        double[] a = new double[nx];
        double[] b = new double[nx];
        double[] c = new double[nx];
        double[] d = new double[nx];
        for (int sweep = 0; sweep < 4000; sweep++) {
            double change = 0.0;
            for (int j = 0; j < nz; j++) {
                for (int i = 0; i < nx; i++) {
                    int strip = (int) ((i + 0.5) * dx / 0.05);
                    double qe = (in[l.power(strip)] - in[l.lead(strip)]) / (0.05 * 0.3);
                    double s = ts[i][j];
                    double slope = h[i] + 4.0 * get(In.EXCHANGE_FACTOR) * get(In.EMISSIVITY) * SIGMA * Math.pow(s, 3);
                    double q0 = flux(i, j);
                    double damp = 1.0 / (1.0 + slope * face);
                    double k = slope * damp;
                    double constant = (q0 - slope * s) * damp;
                    a[i] = i > 0 ? -gx : 0.0;
                    c[i] = i < nx - 1 ? -gx : 0.0;
                    double diag = k + get(In.BACK_CONDUCTANCE) - a[i] - c[i];
                    double right = qe - constant + get(In.BACK_CONDUCTANCE) * get(In.PLENUM_TEMPERATURE) - store;
                    if (i == 0) {
                        diag += endUp;
                        right += endUp * get(In.NOSE_TEMPERATURE);
                    }
                    if (i == nx - 1) {
                        diag += endDown;
                        right += endDown * get(In.TAIL_TEMPERATURE);
                    }
                    if (j > 0) {
                        diag += gz;
                        right += gz * t[i][j - 1];
                    }
                    if (j < nz - 1) {
                        diag += gz;
                        right += gz * t[i][j + 1];
                    } else {
                        diag += side;
                        right += side * get(In.FRAME_TEMPERATURE);
                    }
                    b[i] = diag;
                    d[i] = right;
                }
                for (int i = 1; i < nx; i++) {
                    double m = a[i] / b[i - 1];
                    b[i] -= m * c[i - 1];
                    d[i] -= m * d[i - 1];
                }
                for (int i = nx - 1; i >= 0; i--) {
                    double x = (d[i] - (i < nx - 1 ? c[i] * d[i + 1] : 0.0)) / b[i];
                    d[i] = x;
                    change = Math.max(change, Math.abs(x - t[i][j]));
                    t[i][j] = x;
                    double s = ts[i][j];
                    double slope = h[i] + 4.0 * get(In.EXCHANGE_FACTOR) * get(In.EMISSIVITY) * SIGMA * Math.pow(s, 3);
                    double q = (flux(i, j) + slope * (x - s)) / (1.0 + slope * face);
                    ts[i][j] = x - q * face;
                }
            }
            if (change < 1e-10) {
                return;
            }
        }
        throw new IllegalStateException("fine sheet did not converge");
    }

    /** Junction reading: linear interpolation in x and z, less the stem. */
    double junction(double x, double z, double stem) {
        double fi = (x - 0.1) / dx - 0.5;
        double fj = Math.max(0.0, Math.abs(z) / dz - 0.5);
        int i = (int) Math.max(0, Math.min(nx - 2, Math.floor(fi)));
        int j = (int) Math.max(0, Math.min(nz - 2, Math.floor(fj)));
        double u = fi - i;
        double v = fj - j;
        double at = (1 - u) * ((1 - v) * t[i][j] + v * t[i][j + 1]) + u * ((1 - v) * t[i + 1][j] + v * t[i + 1][j + 1]);
        return at - stem * (at - get(In.PLENUM_TEMPERATURE));
    }
}
