package plateledger.ledger;

import java.util.Arrays;
import plateledger.ledger.RunLayout.In;
import plateledger.rig.Plate;

/**
 * An independent forward model of a loss run for tests: the sheet in plan under an isothermal cover, finite volumes, solved
 * directly (band elimination). Each strip's power is what holds its own two centre-line junctions at the set temperature.
 */
final class CoveredSheet {
    private static final int STRIPS = 8;
    private static final int NX = 240;
    private static final int NZ = 12;
    private static final double DX = 0.4 / NX;
    private static final double DZ = 0.15 / NZ;
    private static final double AREA = 0.12;

    private final double[] in;
    private final RunLayout l;
    private final double back;
    private final double edge;
    private final double perArea;
    private final double outerK;
    private final double[] t;

    /** Truth: U_b, G, K_c; everything else from the inputs. Fills powers and readings into the inputs. */
    CoveredSheet(Plate plate, double[] in, double setK, double outerK, double back, double edge, double cover) {
        this.in = in;
        this.l = RunModel.layout(plate);
        this.back = back;
        this.edge = edge;
        this.outerK = outerK;
        double face = get(In.COAT_THICKNESS) / get(In.COAT_CONDUCTIVITY)
                + get(In.JUNCTION_DEPTH) / get(In.SHEET_CONDUCTIVITY);
        perArea = 1.0 / (AREA / cover + face); // face and cover in series, W/(m² K)
        double[][] response = new double[STRIPS + 1][];
        response[STRIPS] = solve(-1);
        for (int j = 0; j < STRIPS; j++) {
            response[j] = solve(j);
        }
        double[] flux = fluxes(response, setK);
        t = response[STRIPS].clone();
        for (int j = 0; j < STRIPS; j++) {
            for (int k = 0; k < t.length; k++) {
                t[k] += flux[j] * response[j][k];
            }
            in[l.power(j)] = flux[j] * 0.05 * 0.3 + in[l.lead(j)];
        }
        for (int p = 0; p < l.junctions(); p++) {
            Plate.Thermocouple junction = plate.thermocouples().get(p);
            double sheet = at(t, junction.xM().value(), Math.abs(junction.zM()));
            double stem = in[l.stem(p)];
            in[l.reading(p)] = sheet - stem * (sheet - get(In.PLENUM_TEMPERATURE));
        }
    }

    private double get(In name) {
        return in[l.at(name)];
    }

    /** Flux of each strip that holds the mean of its junctions. */
    private static double[] fluxes(double[][] response, double setK) {
        double[][] a = new double[STRIPS][STRIPS + 1];
        for (int s = 0; s < STRIPS; s++) {
            for (int j = 0; j <= STRIPS; j++) {
                double x = 0.1 + 0.05 * s;
                double mean = 0.5 * (at(response[j], x + 0.0125, 0.0) + at(response[j], x + 0.0375, 0.0));
                a[s][j] = j < STRIPS ? mean : setK - mean;
            }
        }
        for (int k = 0; k < STRIPS; k++) { // diagonally heavy: no pivots needed
            for (int r = k + 1; r < STRIPS; r++) {
                double m = a[r][k] / a[k][k];
                for (int c = k; c <= STRIPS; c++) {
                    a[r][c] -= m * a[k][c];
                }
            }
        }
        double[] flux = new double[STRIPS];
        for (int k = STRIPS - 1; k >= 0; k--) {
            double v = a[k][STRIPS];
            for (int c = k + 1; c < STRIPS; c++) {
                v -= a[k][c] * flux[c];
            }
            flux[k] = v / a[k][k];
        }
        return flux;
    }

    /** Surroundings alone (strip −1), or unit flux of one strip with all surroundings at 0. */
    private double[] solve(int strip) {
        double on = strip < 0 ? 1.0 : 0.0;
        double kt = get(In.SHEET_CONDUCTIVITY) * get(In.SHEET_THICKNESS);
        double store = get(In.DRIFT)
                * (get(In.SHEET_HEAT_CAPACITY) * get(In.SHEET_THICKNESS)
                        + get(In.FOAM_HEAT_CAPACITY) * get(In.FOAM_THICKNESS) / 3.0);
        double gx = kt / (DX * DX);
        double gz = kt / (DZ * DZ);
        double up = 1.0 / (0.3 / get(In.NOSE_CONDUCTANCE) + 0.5 * DX / kt) / DX;
        double down = 1.0 / (0.3 / get(In.TAIL_CONDUCTANCE) + 0.5 * DX / kt) / DX;
        double side = 1.0 / (1.0 / edge + 0.5 * DZ / kt) / DZ;
        int n = NX * NZ;
        double[][] band = new double[n][NZ + 1]; // band[k][b]: entry (k, k + b) of a symmetric matrix
        double[] right = new double[n];
        for (int i = 0; i < NX; i++) {
            for (int j = 0; j < NZ; j++) {
                int k = i * NZ + j;
                double diagonal = back + perArea;
                double v = on * (back * get(In.PLENUM_TEMPERATURE) + perArea * outerK - store);
                if ((int) ((i + 0.5) * DX / 0.05) == strip) {
                    v += 1.0;
                }
                diagonal +=
                        (i > 0 ? gx : up) + (i < NX - 1 ? gx : down) + (j > 0 ? gz : 0.0) + (j < NZ - 1 ? gz : side);
                v += i == 0 ? on * up * get(In.NOSE_TEMPERATURE) : 0.0;
                v += i == NX - 1 ? on * down * get(In.TAIL_TEMPERATURE) : 0.0;
                v += j == NZ - 1 ? on * side * get(In.FRAME_TEMPERATURE) : 0.0;
                band[k][0] = diagonal;
                if (j < NZ - 1) {
                    band[k][1] = -gz;
                }
                if (i < NX - 1) {
                    band[k][NZ] = -gx;
                }
                right[k] = v;
            }
        }
        eliminate(band, right);
        return right;
    }

    private static void eliminate(double[][] band, double[] right) {
        int n = right.length;
        for (int k = 0; k < n; k++) {
            for (int b = 1; b <= NZ && k + b < n; b++) {
                double m = band[k][b] / band[k][0];
                for (int c = b; c <= NZ && k + c < n; c++) {
                    band[k + b][c - b] -= m * band[k][c];
                }
                right[k + b] -= m * right[k];
            }
        }
        for (int k = n - 1; k >= 0; k--) {
            for (int b = 1; b <= NZ && k + b < n; b++) {
                right[k] -= band[k][b] * right[k + b];
            }
            right[k] /= band[k][0];
        }
    }

    private static double at(double[] t, double x, double z) {
        double fi = (x - 0.1) / DX - 0.5;
        int i = (int) Math.max(0, Math.min(NX - 2, Math.floor(fi)));
        double u = fi - i;
        return (1.0 - u) * across(t, i, z) + u * across(t, i + 1, z);
    }

    /** Parabola through the nearest three cells across the span; even about the centre line. */
    private static double across(double[] t, int i, double z) {
        int m = (int) Math.min(NZ - 2, Math.round(z / DZ - 0.5));
        double w = z / DZ - 0.5 - m;
        double left = t[i * NZ + Math.abs(m - 1) - (m == 0 ? 1 : 0)]; // mirror image of cell 0 is cell 0
        double here = t[i * NZ + m];
        double next = t[i * NZ + m + 1];
        return here + 0.5 * w * (next - left) + 0.5 * w * w * (next - 2.0 * here + left);
    }

    /** Area mean of the sheet, K. */
    double meanK() {
        return Arrays.stream(t).average().orElseThrow();
    }

    /** Area mean of the coat face, K: the cover's isothermal inner face. */
    double coverInnerK(double cover) {
        return outerK + perArea * AREA / cover * (meanK() - outerK);
    }

    double throughBackW() {
        return back * AREA * (meanK() - get(In.PLENUM_TEMPERATURE));
    }

    double throughEdgesW() {
        double kt = get(In.SHEET_CONDUCTIVITY) * get(In.SHEET_THICKNESS);
        double g = 1.0 / (1.0 / edge + 0.5 * DZ / kt);
        double sum = 0.0;
        for (int i = 0; i < NX; i++) {
            sum += 2.0 * DX * g * (t[i * NZ + NZ - 1] - get(In.FRAME_TEMPERATURE));
        }
        return sum;
    }
}
