package plateledger.ledger;

import plateledger.ledger.RunLayout.In;
import plateledger.numeric.SmallCholesky;

/**
 * The inverse step: fits h(x) = g(x) ρ(x) to the junctions so that the sheet's own energy balance holds in every cell,
 * METHODS.md eqs. (P-1) to (P-4). g is a given shape, ρ is piecewise linear between knots and kept smooth by a penalty on
 * its second difference. Sheet temperatures and ρ are solved together by Gauss–Newton: each pass linearises the balance
 * about the present state, eliminates the temperatures by one tridiagonal solve per knot and solves a small normal
 * system. Instances hold frozen choices only; threads may share one.
 */
final class PlateSolver {
    private static final double TOLERANCE_K = 1e-7;

    private final PlateGrid grid;
    private final RunLayout layout;
    private final double[] shape;
    private final double[] zM;
    private final double[] weight;
    private final double lambda;

    /**
     * A solver.
     *
     * @param grid the grid
     * @param layout positions of the inputs
     * @param shape g in each cell, W/(m² K)
     * @param zM place of each junction across the flow, m
     * @param weight 1/σ² of each junction, 1/K²; 0 for a junction not used
     * @param lambda smoothing: weight of (second difference of ρ)², dimensionless
     */
    PlateSolver(PlateGrid grid, RunLayout layout, double[] shape, double[] zM, double[] weight, double lambda) {
        this.grid = grid;
        this.layout = layout;
        this.shape = shape;
        this.zM = zM;
        this.weight = weight;
        this.lambda = lambda;
    }

    /** The same solver with another smoothing. */
    PlateSolver withLambda(double other) {
        return new PlateSolver(grid, layout, shape, zM, weight, other);
    }

    /**
     * Solves for ρ and the sheet temperatures.
     *
     * @param in kernel inputs
     * @param adiabaticWallK T_aw, K
     * @param state start and result
     * @param most largest number of passes
     * @return passes used; {@code most + 1} if it did not converge
     */
    int solve(double[] in, double adiabaticWallK, PlateState state, int most) {
        Pass pass = new Pass(in, adiabaticWallK, state);
        for (int n = 1; n <= most; n++) {
            if (pass.advance(true) < TOLERANCE_K) {
                pass.finish();
                return n;
            }
        }
        pass.finish();
        return most + 1;
    }

    /** Solves for the sheet temperatures with ρ held: the forward model. */
    void forward(double[] in, double adiabaticWallK, PlateState state, int most) {
        Pass pass = new Pass(in, adiabaticWallK, state);
        for (int n = 1; n <= most; n++) {
            if (pass.advance(false) < TOLERANCE_K) {
                break;
            }
        }
        pass.finish();
    }

    /** By how much the side edges lower a junction at a solved state, K. */
    double edgeDropK(double[] in, double adiabaticWallK, PlateState state, int junction) {
        return new Pass(in, adiabaticWallK, state).edgeDropK(junction);
    }

    /** Effective number of parameters: trace of (A'A + λD'D)⁻¹ A'A at a solved state. */
    double effectiveParameters(double[] in, double adiabaticWallK, PlateState state) {
        Pass pass = new Pass(in, adiabaticWallK, state);
        pass.advance(true);
        return pass.traceOfFit();
    }

    /** One evaluation's working set. */
    private final class Pass {
        private final int n = grid.cells;
        private final int k = grid.knots.length;
        private final double[] in;
        private final double adiabaticWallK;
        private final PlateState s;
        private final double[] link = new double[n + 1];
        private final double[] lower = new double[n];
        private final double[] pivot = new double[n];
        private final double[] upper = new double[n];
        /** Right sides, one row per cell: a column for each knot, then the balance itself; rows keep the passes short. */
        private final double[] rows = new double[grid.cells * (grid.knots.length + 1)];

        private final int across = k + 1;
        private final double[][] normal = new double[k][k];
        private final double[][] dataNormal = new double[k][k];
        private final double[] right = new double[k];
        private final double[] row = new double[k];
        private final SheetInputs sheet;
        private double noseG;
        private double tailG;
        private double noseK;
        private double tailK;

        Pass(double[] in, double adiabaticWallK, PlateState state) {
            this.in = in;
            this.adiabaticWallK = adiabaticWallK;
            this.s = state;
            sheet = new SheetInputs(in, layout, grid);
            double[] dx = sheet.dx;
            for (int f = 1; f < n; f++) {
                link[f] = sheet.sheetWPerK / (0.5 * (dx[f - 1] + dx[f]));
            }
        }

        /**
         * The ends lose heat at the span's mean temperature, which the edges lower by a share of (T₁ − T_frame): for the
         * one-dimensional sheet that is a smaller conductance to a neighbour moved away from the frame's temperature.
         */
        private void linkEnds() {
            double up = endShare(0);
            double down = endShare(n - 1);
            noseG = sheet.noseWPerK * (1.0 - up);
            tailG = sheet.tailWPerK * (1.0 - down);
            noseK = (sheet.noseK - up * sheet.frameK) / (1.0 - up);
            tailK = (sheet.tailK - down * sheet.frameK) / (1.0 - down);
            link[0] = end(noseG, sheet.dx[0]);
            link[n] = end(tailG, sheet.dx[n - 1]);
        }

        private double endShare(int cell) {
            if (!(s.surfaceSlope[cell] > 0.0)) {
                return 0.0;
            }
            double l = SpanProfile.length(sheet.sheetWPerK, s.surfaceSlope[cell] + sheet.behindWPerM2K);
            return SpanProfile.edgeShare(sheet.edgeWPerMK, sheet.sheetWPerK, l, sheet.widthM)
                    * SpanProfile.meanShape(l, sheet.widthM);
        }

        /** Conductance per span from the centre of an end cell to the neighbour beyond the end, W/(m K). */
        private double end(double conductanceWPerK, double cellM) {
            double g = conductanceWPerK / sheet.widthM;
            return g > 0.0 ? 1.0 / (1.0 / g + 0.5 * cellM / sheet.sheetWPerK) : 0.0;
        }

        /** One pass; returns the largest change of a sheet temperature, K. */
        double advance(boolean fit) {
            linkEnds();
            double[] dx = sheet.dx;
            double resistance = sheet.faceM2KPerW;
            java.util.Arrays.fill(rows, 0.0);
            for (int i = 0; i < n; i++) {
                int left = grid.knotLeft[i];
                double w = grid.knotWeight[i];
                double h = shape[i] * (w * s.rho[left] + (1.0 - w) * s.rho[left + 1]);
                double ts = s.surfaceK[i];
                double flux = sheet.faceFlux(h, ts, adiabaticWallK);
                double g = sheet.faceSlope(h, ts);
                double damp = 1.0 / (1.0 + g * resistance);
                double q = (flux + g * (s.sheetK[i] - ts)) * damp; // T_s = T − q R eliminated
                double slope = g * damp;
                s.h[i] = h;
                s.qSurface[i] = q;
                s.surfaceSlope[i] = slope;
                double below = i > 0 ? s.sheetK[i - 1] : noseK;
                double above = i < n - 1 ? s.sheetK[i + 1] : tailK;
                double t = s.sheetK[i];
                int row = i * across;
                rows[row + k] = link[i] * (below - t)
                        + link[i + 1] * (above - t)
                        + dx[i]
                                * (sheet.qe[i]
                                        - q
                                        - LossTerm.Back.flux(sheet.behindWPerM2K, t, sheet.plenumK)
                                        - sheet.store);
                lower[i] = i > 0 ? -link[i] : 0.0;
                upper[i] = i < n - 1 ? -link[i + 1] : 0.0;
                pivot[i] = link[i] + link[i + 1] + dx[i] * (slope + sheet.behindWPerM2K);
                double dq = -dx[i] * shape[i] * (ts - adiabaticWallK) * damp;
                rows[row + left] += w * dq;
                rows[row + left + 1] += (1.0 - w) * dq;
            }
            eliminate(fit ? 0 : k);
            if (fit) {
                step();
            }
            return update(fit);
        }

        /** Solves the tridiagonal system for the right sides from column {@code first} on. */
        private void eliminate(int first) {
            for (int i = 1; i < n; i++) {
                double m = lower[i] / pivot[i - 1];
                pivot[i] -= m * upper[i - 1];
                int here = i * across;
                int before = here - across;
                for (int c = first; c < across; c++) {
                    rows[here + c] -= m * rows[before + c];
                }
            }
            double last = 1.0 / pivot[n - 1];
            for (int c = first; c < across; c++) {
                rows[(n - 1) * across + c] *= last;
            }
            for (int i = n - 2; i >= 0; i--) {
                double inverse = 1.0 / pivot[i];
                double u = upper[i];
                int here = i * across;
                int after = here + across;
                for (int c = first; c < across; c++) {
                    rows[here + c] = (rows[here + c] - u * rows[after + c]) * inverse;
                }
            }
        }

        /** Normal equations of the linearised fit; leaves the step of ρ in {@code right}. */
        private void step() {
            for (int a = 0; a < k; a++) {
                java.util.Arrays.fill(normal[a], 0.0);
                right[a] = 0.0;
            }
            for (int p = 0; p < weight.length; p++) {
                if (weight[p] > 0.0) {
                    observe(p);
                }
            }
            for (int a = 0; a < k; a++) {
                System.arraycopy(normal[a], 0, dataNormal[a], 0, k);
            }
            double strength = lambda * Math.pow(10.0, in[layout.at(In.SMOOTHING)]);
            for (int c = 1; c < k - 1; c++) {
                penalise(c, strength);
            }
            if (SmallCholesky.factor(normal, k)) {
                SmallCholesky.solve(normal, k, right);
            } else {
                java.util.Arrays.fill(right, Double.NaN); // shows as a run that does not converge
            }
        }

        private void observe(int p) {
            double x = sheet.onGrid(in[layout.place(p)]);
            int c0 = grid.stencil(x);
            double[] w = Lagrange.weights(grid.centres, c0, x);
            double e = edgeEffect(c0 + 1, zM[p]);
            double stem = in[layout.stem(p)];
            double metal = (in[layout.reading(p)] - stem * sheet.plenumK) / (1.0 - stem);
            double target = (metal - e * sheet.frameK) / (1.0 - e);
            double miss = target;
            for (int j = 0; j < 3; j++) {
                miss -= w[j] * (s.sheetK[c0 + j] + rows[(c0 + j) * across + k]);
            }
            int r0 = c0 * across;
            for (int a = 0; a < k; a++) {
                row[a] = w[0] * rows[r0 + a] + w[1] * rows[r0 + across + a] + w[2] * rows[r0 + 2 * across + a];
            }
            double ww = weight[p] * (1.0 - e) * (1.0 - e);
            for (int a = 0; a < k; a++) {
                double v = ww * row[a];
                right[a] += v * miss;
                for (int b = 0; b <= a; b++) {
                    normal[a][b] += v * row[b];
                }
            }
        }

        /** Adds λ (second divided difference of ρ at knot c, scaled by the inner knot spacing)². */
        private void penalise(int c, double strength) {
            double h0 = grid.knots[c] - grid.knots[c - 1];
            double h1 = grid.knots[c + 1] - grid.knots[c];
            double unit = grid.knots[2] - grid.knots[1];
            double d0 = 2.0 * unit * unit / (h0 * (h0 + h1));
            double d2 = 2.0 * unit * unit / (h1 * (h0 + h1));
            double[] d = {d0, -d0 - d2, d2};
            double now = 0.0;
            for (int j = 0; j < 3; j++) {
                now += d[j] * s.rho[c - 1 + j];
            }
            for (int j = 0; j < 3; j++) {
                right[c - 1 + j] -= strength * d[j] * now;
                for (int m = 0; m <= j; m++) {
                    normal[c - 1 + j][c - 1 + m] += strength * d[j] * d[m];
                }
            }
        }

        private double update(boolean fit) {
            double largest = 0.0;
            if (fit) {
                for (int a = 0; a < k; a++) {
                    s.rho[a] += right[a];
                }
            }
            for (int i = 0; i < n; i++) {
                int at = i * across;
                double change = rows[at + k];
                if (fit) {
                    for (int a = 0; a < k; a++) {
                        change += rows[at + a] * right[a];
                    }
                }
                s.sheetK[i] += change;
                largest = Math.max(largest, Math.abs(change));
                int left = grid.knotLeft[i];
                double w = grid.knotWeight[i];
                double h = shape[i] * (w * s.rho[left] + (1.0 - w) * s.rho[left + 1]);
                double ts = s.surfaceK[i];
                double g = sheet.faceSlope(h, ts);
                double flux = sheet.faceFlux(h, ts, adiabaticWallK);
                double q = (flux + g * (s.sheetK[i] - ts)) / (1.0 + g * sheet.faceM2KPerW);
                s.surfaceK[i] = s.sheetK[i] - q * sheet.faceM2KPerW;
            }
            return largest;
        }

        /** Junction temperatures as the model has them, end temperatures, final fluxes. */
        void finish() {
            for (int i = 0; i < n; i++) {
                int left = grid.knotLeft[i];
                double w = grid.knotWeight[i];
                s.h[i] = shape[i] * (w * s.rho[left] + (1.0 - w) * s.rho[left + 1]);
                double ts = s.surfaceK[i];
                s.qSurface[i] = sheet.faceFlux(s.h[i], ts, adiabaticWallK);
                double g = sheet.faceSlope(s.h[i], ts);
                s.surfaceSlope[i] = g / (1.0 + g * sheet.faceM2KPerW);
            }
            for (int p = 0; p < weight.length; p++) {
                double x = sheet.onGrid(in[layout.place(p)]);
                int c0 = grid.stencil(x);
                double[] w = Lagrange.weights(grid.centres, c0, x);
                double t = w[0] * s.sheetK[c0] + w[1] * s.sheetK[c0 + 1] + w[2] * s.sheetK[c0 + 2];
                double e = edgeEffect(c0 + 1, zM[p]);
                double at = t - e * (t - sheet.frameK);
                s.junctionK[p] = at - in[layout.stem(p)] * (at - sheet.plenumK);
            }
            s.endUpK = outer(s.sheetK[0], link[0], noseG, noseK);
            s.endDownK = outer(s.sheetK[n - 1], link[n], tailG, tailK);
        }

        private double outer(double cellK, double linkWPerMK, double conductanceWPerK, double neighbourK) {
            return conductanceWPerK > 0.0
                    ? neighbourK + linkWPerMK * (cellK - neighbourK) * sheet.widthM / conductanceWPerK
                    : cellK;
        }

        /** Share of (T₁ − T_frame) by which the edges lower the sheet at z in a cell. */
        private double edgeEffect(int cell, double z) {
            double l = SpanProfile.length(sheet.sheetWPerK, s.surfaceSlope[cell] + sheet.behindWPerM2K);
            return SpanProfile.edgeShare(sheet.edgeWPerMK, sheet.sheetWPerK, l, sheet.widthM)
                    * SpanProfile.shape(z, l, sheet.widthM);
        }

        double edgeDropK(int p) {
            int c = grid.stencil(sheet.onGrid(in[layout.place(p)])) + 1;
            return Math.abs(edgeEffect(c, zM[p]) * (s.sheetK[c] - sheet.frameK));
        }

        double traceOfFit() {
            double trace = 0.0;
            double[] unit = new double[k];
            for (int a = 0; a < k; a++) {
                for (int b = 0; b < k; b++) {
                    unit[b] = b <= a ? dataNormal[a][b] : dataNormal[b][a];
                }
                SmallCholesky.solve(normal, k, unit);
                trace += unit[a];
            }
            return trace;
        }
    }
}
