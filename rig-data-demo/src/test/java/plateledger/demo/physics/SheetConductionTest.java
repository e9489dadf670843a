package plateledger.demo.physics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** The sheet against the fin equation's closed forms, the foam against the slab's, the span against the fin. */
@Tag("validation")
final class SheetConductionTest {
    /** What the source of the cases asks of finite volumes with cells of l/20, not extrapolated. */
    private static final double TOLERANCE = 5e-4;

    private static final double AMBIENT = 300.0;
    private static final Surround AROUND = new Surround(AMBIENT, AMBIENT, AMBIENT, AMBIENT, AMBIENT, AMBIENT);

    private static Map<String, Double> outputs(String which) {
        Map<String, Double> out = new HashMap<>();
        for (List<String> row : Table.rows("conduction-cases.csv")) {
            if (row.get(0).equals(which) && row.get(1).equals("output")) {
                out.put(row.get(2), Double.parseDouble(row.get(3)));
            }
        }
        assertTrue(!out.isEmpty(), "case " + which);
        return out;
    }

    /** A bare sheet: no radiation, no back, no edges; the coefficient allows for the half of nothing but the metal. */
    private static PlateState bare(double[] edges, double[] flux, double h, double k, double t, double endPerSpan) {
        double width = 0.3;
        Panel panel = new Panel(
                edges, width, t, k, 1.0, 0.0, 0.0, 0.0, 1.0, 0.0, endPerSpan * width, endPerSpan * width, 1.0);
        double[] watts = new double[flux.length];
        for (int s = 0; s < watts.length; s++) {
            watts[s] = flux[s] * width * (edges[s + 1] - edges[s]);
        }
        // The closed forms put h on the sheet itself; here the metal's own resistance lies between.
        double face = 1.0 / (1.0 / h - t / k);
        return new SteadyPlate(
                        MeshedPanel.of(panel, PlateGrid.Fineness.FINE), new Convection.Uniform(face), 1.0, AMBIENT)
                .solve(watts, AROUND, 0.0);
    }

    private static double[] even(double from, double to, int n) {
        double[] edges = new double[n + 1];
        for (int i = 0; i <= n; i++) {
            edges[i] = from + (to - from) * i / n;
        }
        return edges;
    }

    private static void compare(PlateState state, Map<String, Double> expected, double relative) {
        int checked = 0;
        for (Map.Entry<String, Double> entry : expected.entrySet()) {
            if (entry.getKey().startsWith("theta(")) {
                double x = Double.parseDouble(
                        entry.getKey().substring(6, entry.getKey().indexOf(' ')));
                double found = state.grid().at(state.sheet(), x, 0.0) - AMBIENT;
                assertEquals(entry.getValue(), found, relative * entry.getValue(), entry.getKey());
                checked++;
            }
        }
        assertTrue(checked >= 4, "places checked: " + checked);
    }

    @Test
    void oneStripA1() {
        double[] flux = {0, 0, 1000, 0, 0};
        compare(bare(even(0.0, 0.5, 5), flux, 30.0, 167.0, 0.006, 0.0), outputs("A1"), TOLERANCE);
    }

    @Test
    void endConductanceA2() {
        double[] flux = {600, 600, 600, 600};
        PlateState state = bare(even(0.0, 0.4, 4), flux, 25.0, 167.0, 0.006, 2.0);
        Map<String, Double> expected = outputs("A2");
        compare(state, expected, TOLERANCE);
        double loss = expected.getOrDefault("end_loss_each", Double.NaN);
        assertEquals(loss, state.books().nose() / 0.3, TOLERANCE * loss);
        assertEquals(loss, state.books().tail() / 0.3, TOLERANCE * loss);
    }

    @Test
    void stepOfFluxC1() {
        double[] flux = new double[24];
        for (int s = 6; s < 24; s++) {
            flux[s] = 800.0;
        }
        compare(bare(even(0.0, 0.6, 24), flux, 40.0, 16.0, 0.001, 0.0), outputs("C1"), TOLERANCE);
    }

    @Test
    void sixStripsC2() {
        double[] flux = {300, 500, 700, 900, 600, 400};
        compare(bare(even(0.0, 0.6, 6), flux, 40.0, 167.0, 0.003, 0.0), outputs("C2"), TOLERANCE);
    }

    /** E4: flux into a slab after a step of its warm face, far side insulated, q* = q L/(k ΔT) over Fo = α t/L². */
    @Test
    void foamSoaksLikeASlabE4() {
        double conductance = 0.6;
        double capacity = 45000.0 * 0.05;
        double diffusionS = capacity / conductance;
        int steps = 4000;
        FoamLadder ladder =
                new FoamLadder(conductance, capacity, 60, 2.0 * diffusionS / steps, FoamLadder.FarSide.INSULATED);
        double[] layers = new double[ladder.layers()];
        Map<String, Double> expected = outputs("E4");
        for (int step = 1; step <= steps; step++) {
            double released = ladder.release(layers, 0.0);
            double flux = (ladder.stepConductance() * 1.0 - released) / conductance;
            ladder.complete(layers, 1.0);
            for (String fo : List.of("0.1", "0.5", "1", "2")) {
                if (step == Math.round(Double.parseDouble(fo) / 2.0 * steps)) {
                    double q = expected.getOrDefault("q*(Fo=" + fo + ")", Double.NaN);
                    assertEquals(q, flux, 4e-3 * q, "Fo " + fo);
                }
            }
        }
    }

    /** A held far side: in the end the foam conducts U_b, and a slow rise of the sheet costs a third of its capacity more. */
    @Test
    void foamHasItsTwoLimits() {
        double step = 20.0;
        FoamLadder ladder = new FoamLadder(0.46, 3300.0, 40, step, FoamLadder.FarSide.HELD);
        double[] layers = new double[ladder.layers()];
        double rate = 1e-3;
        double flux = 0.0;
        double sheet = 0.0;
        for (int i = 1; i <= 2000; i++) {
            sheet = rate * step * i;
            double released = ladder.release(layers, 0.0);
            flux = ladder.stepConductance() * sheet - released;
            ladder.complete(layers, sheet);
        }
        assertEquals(0.46 * sheet + 3300.0 / 3.0 * rate, flux, 0.01 * 3300.0 / 3.0 * rate);
    }

    /**
     * Across the span without radiation: θ(z) = θ_∞ [1 − β cosh(z/l)/cosh(W/2l)], β = G/(G + (kt/l) tanh(W/2l)),
     * l = √(kt/h), the fin with a conductance at its edge (closed form).
     */
    @Test
    void spanIsAFin() {
        double width = 0.3;
        double k = 15.0;
        double t = 0.0005;
        double h = 8.0;
        double g = 0.08;
        Panel panel = new Panel(even(0.1, 0.5, 8), width, t, k, 1.0, 0.0, 0.0, 0.0, 1.0, g, 0.0, 0.0, 1.0);
        double[] watts = new double[8];
        java.util.Arrays.fill(watts, 160.0 * width * 0.05);
        double face = 1.0 / (1.0 / h - t / k);
        PlateState state = new SteadyPlate(
                        MeshedPanel.of(panel, PlateGrid.Fineness.FINE), new Convection.Uniform(face), 1.0, AMBIENT)
                .solve(watts, AROUND, 0.0);
        double l = Math.sqrt(k * t / h);
        double beta = g / (g + k * t / l * Math.tanh(0.5 * width / l));
        for (double z : new double[] {0.0, 0.08, -0.12, 0.14}) {
            double closed = 20.0 * (1.0 - beta * Math.cosh(z / l) / Math.cosh(0.5 * width / l));
            assertEquals(closed, state.grid().at(state.sheet(), 0.3, z) - AMBIENT, 0.002, "z " + z);
        }
        double edge = 2.0 * 0.4 * g * 20.0 * (1.0 - beta);
        assertEquals(edge, state.books().edge(), 1e-3 * edge);
        assertEquals(0.0, state.books().residual(), 1e-9 * state.books().electrical());
    }
}
