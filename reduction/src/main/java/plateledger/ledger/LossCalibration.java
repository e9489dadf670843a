package plateledger.ledger;

import java.util.List;
import plateledger.ledger.RunLayout.In;
import plateledger.numeric.SmallCholesky;
import plateledger.rig.Plate;

/**
 * Loss conductances of one panel from its loss runs, METHODS.md eqs. (C-1) to (C-3). The declared values enter as prior
 * rows, so that what the runs cannot tell stays as declared.
 *
 * <pre>
 *   P − ΣI²R = ∫∫ [U_b (T − T_plenum) + C dT/dt] dA + 2 ∫ G (T_edge − T_frame) dx
 *              + G_n (T(x₀) − T_nose) + G_t (T(x₁) − T_tail) + K_c (T_ci − T_co)
 * </pre>
 *
 * <p>The gain matrix is frozen at the best estimate; the estimate itself is repeated with every perturbed input, so that
 * the conductances stay correlated with the readings, the prior values and the instruments that made them.
 */
public final class LossCalibration {
    /** The parameters in vector order. */
    public enum Parameter {
        /** U_b, W/(m² K). */
        BACK("back conductance", "W/(m² K)"),
        /** G, W/(m K). */
        EDGE("edge conductance", "W/(m K)"),
        /** G_n, W/K. */
        NOSE("nose conductance", "W/K"),
        /** G_t, W/K. */
        TAIL("tail conductance", "W/K"),
        /** K_c, W/K. */
        COVER("cover conductance", "W/K");

        private final String label;
        private final String unit;

        Parameter(String label, String unit) {
            this.label = label;
            this.unit = unit;
        }

        /** Name shown. */
        public String label() {
            return label;
        }

        /** SI unit. */
        public String unit() {
            return unit;
        }
    }

    /**
     * One loss run's numbers.
     *
     * @param in inputs in layout order
     * @param coverInnerK T_ci, K
     * @param coverOuterK T_co, K
     */
    public record LossRun(double[] in, double coverInnerK, double coverOuterK) {}

    private static final int N = Parameter.values().length;
    private static final int REPEATS = 3;

    private final RunLayout layout;
    private final PlateGrid grid;
    private final int[] stations;
    private final double[] priorVariance;
    private final double[] noiseVariance;

    private LossCalibration(Plate plate, boolean[] junctionUsed, double[] priorU, double[] noiseU) {
        layout = RunModel.layout(plate);
        grid = PlateGrid.of(plate);
        stations = java.util.Arrays.stream(RunModel.stationJunctions(plate))
                .filter(p -> junctionUsed[p])
                .toArray();
        priorVariance = squares(priorU);
        noiseVariance = squares(noiseU);
    }

    private static double[] squares(double[] u) {
        return java.util.Arrays.stream(u).map(v -> v * v).toArray();
    }

    /**
     * A calibration.
     *
     * @param plate the panel
     * @param junctionUsed which junctions are used
     * @param priorU standard uncertainties of the declared values, in parameter order
     * @param noiseU standard uncertainty of each run's power balance apart from the parameters, W
     */
    public static LossCalibration configure(Plate plate, boolean[] junctionUsed, double[] priorU, double[] noiseU) {
        return new LossCalibration(plate, junctionUsed, priorU, noiseU);
    }

    /**
     * The posterior parameters.
     *
     * @param runs the loss runs
     * @param prior declared values in parameter order
     * @param posterior overwritten
     */
    public void evaluate(List<LossRun> runs, double[] prior, double[] posterior) {
        System.arraycopy(prior, 0, posterior, 0, N);
        int m = runs.size();
        double[][] j = new double[m][N];
        double[] miss = new double[m];
        for (int repeat = 0; repeat < REPEATS; repeat++) {
            for (int r = 0; r < m; r++) {
                LossRun run = runs.get(r);
                double f = balance(run, posterior);
                double[] moved = posterior.clone();
                double along = 0.0;
                for (int a = 0; a < N; a++) {
                    double step = 1e-4 * Math.max(Math.abs(prior[a]), Math.sqrt(priorVariance[a]));
                    moved[a] += step;
                    j[r][a] = (balance(run, moved) - f) / step;
                    moved[a] = posterior[a];
                    along += j[r][a] * (prior[a] - posterior[a]);
                }
                miss[r] = powerW(run) - f - along;
            }
            gain(j, miss, prior, posterior);
        }
    }

    /** posterior = prior + P Jᵀ (J P Jᵀ + R)⁻¹ miss. */
    private void gain(double[][] j, double[] miss, double[] prior, double[] posterior) {
        int m = miss.length;
        double[][] s = new double[m][m];
        for (int r = 0; r < m; r++) {
            for (int c = 0; c <= r; c++) {
                double v = r == c ? noiseVariance[r] : 0.0;
                for (int a = 0; a < N; a++) {
                    v += j[r][a] * priorVariance[a] * j[c][a];
                }
                s[r][c] = v;
            }
        }
        double[] y = miss.clone();
        if (!SmallCholesky.factor(s, m)) {
            java.util.Arrays.fill(posterior, Double.NaN); // NaN readings: no number rather than a wrong one
            return;
        }
        SmallCholesky.solve(s, m, y);
        for (int a = 0; a < N; a++) {
            double v = prior[a];
            for (int r = 0; r < m; r++) {
                v += priorVariance[a] * j[r][a] * y[r];
            }
            posterior[a] = v;
        }
    }

    private double powerW(LossRun run) {
        double power = 0.0;
        for (int i = 0; i < layout.strips(); i++) {
            power += run.in()[layout.power(i)] - run.in()[layout.lead(i)];
        }
        return power;
    }

    /** Power measured − modelled of one run, W. */
    public double residual(LossRun run, double[] parameters) {
        return powerW(run) - balance(run, parameters);
    }

    /** Modelled heat of one loss run, W. */
    public double balance(LossRun run, double[] parameters) {
        double[] in = run.in();
        double start = in[layout.at(In.HEATED_START)];
        double stretch = (in[layout.at(In.HEATED_END)] - start) / (grid.endM - grid.startM);
        double width = in[layout.at(In.WIDTH)];
        double kt = in[layout.at(In.SHEET_CONDUCTIVITY)] * in[layout.at(In.SHEET_THICKNESS)];
        double frame = in[layout.at(In.FRAME_TEMPERATURE)];
        double plenum = in[layout.at(In.PLENUM_TEMPERATURE)];
        double store = in[layout.at(In.DRIFT)]
                * LossTerm.Storage.capacityJPerM2K(
                        in[layout.at(In.SHEET_HEAT_CAPACITY)],
                        in[layout.at(In.SHEET_THICKNESS)],
                        in[layout.at(In.FOAM_HEAT_CAPACITY)],
                        in[layout.at(In.FOAM_THICKNESS)]);
        double area = (in[layout.at(In.HEATED_END)] - start) * width;
        double back = parameters[0];
        double edge = parameters[1];
        double cover = parameters[4];
        double total = cover * (run.coverInnerK() - run.coverOuterK());
        double l = SpanProfile.length(kt, back + cover / area);
        double beta = SpanProfile.edgeShare(edge, kt, l, width);
        double centre = SpanProfile.shape(0.0, l, width);
        double mean = SpanProfile.meanShape(l, width);
        for (int i = 0; i < grid.cells; i++) {
            double dx = stretch * (grid.faces[i + 1] - grid.faces[i]);
            double x = start + stretch * (grid.centres[i] - grid.startM);
            double far = frame + (alongCentre(in, x) - frame) / (1.0 - beta * centre);
            double drop = beta * (far - frame);
            total += dx * width * (LossTerm.Back.flux(back, far - drop * mean, plenum) + store);
            total += dx * LossTerm.Edge.rateWPerM(edge, far - drop, frame);
        }
        double meanPerCentre = (1.0 - beta * mean) / (1.0 - beta * centre);
        double end = in[layout.at(In.HEATED_END)];
        double loss = back + cover / area;
        double outside = (back * plenum + cover / area * run.coverOuterK()) / loss;
        double up =
                frame + (alongCentre(in, start) + bend(in, 0, start, kt, loss, outside, width) - frame) * meanPerCentre;
        double down = frame
                + (alongCentre(in, end) + bend(in, layout.strips() - 1, end, kt, loss, outside, width) - frame)
                        * meanPerCentre;
        total += LossTerm.EndConduction.rateW(parameters[2], up, in[layout.at(In.NOSE_TEMPERATURE)]);
        total += LossTerm.EndConduction.rateW(parameters[3], down, in[layout.at(In.TAIL_TEMPERATURE)]);
        return total;
    }

    /**
     * What the straight line through the two outer junctions misses at the sheet's end, K: there the strip's flux and the
     * losses bend the temperature by a known k t T'' = h (T − T_outside) − q_e.
     */
    private double bend(double[] in, int strip, double x, double kt, double loss, double outside, double width) {
        int a = strip == 0 ? stations[0] : stations[stations.length - 2];
        int b = strip == 0 ? stations[1] : stations[stations.length - 1];
        double stretch = (in[layout.at(In.HEATED_END)] - in[layout.at(In.HEATED_START)]) / (grid.endM - grid.startM);
        double stripLength = 0.0;
        for (int i = 0; i < grid.cells; i++) {
            stripLength += grid.strip[i] == strip ? stretch * (grid.faces[i + 1] - grid.faces[i]) : 0.0;
        }
        double flux = (in[layout.power(strip)] - in[layout.lead(strip)]) / (stripLength * width);
        double mean = 0.5 * (sheet(in, a) + sheet(in, b));
        double curvature = (loss * (mean - outside) - flux) / kt;
        return 0.5 * curvature * (x - in[layout.place(a)]) * (x - in[layout.place(b)]);
    }

    /** Sheet temperature on the centre line, straight lines between junctions and beyond the outer ones, K. */
    private double alongCentre(double[] in, double x) {
        int n = stations.length;
        int j = 0;
        while (j < n - 2 && in[layout.place(stations[j + 1])] < x) {
            j++;
        }
        double xa = in[layout.place(stations[j])];
        double xb = in[layout.place(stations[j + 1])];
        double w = (x - xa) / (xb - xa);
        return (1.0 - w) * sheet(in, stations[j]) + w * sheet(in, stations[j + 1]);
    }

    private double sheet(double[] in, int p) {
        double stem = in[layout.stem(p)];
        return (in[layout.reading(p)] - stem * in[layout.at(In.PLENUM_TEMPERATURE)]) / (1.0 - stem);
    }
}
