package plateledger.demo.physics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** The marched layer against an independent march (cases A, B, I) and exact similarity solutions (C, D). */
@Tag("validation")
final class LaminarLayerTest {
    private static final BlasiusFlow FLOW = new BlasiusFlow();

    /** f''(0) = 0.332057336215196299, 30-digit series solution of the Blasius equation. */
    @Test
    void wallShearIsThatOfBlasius() {
        assertEquals(0.3320573362151963, FLOW.wallShear(), 1e-11);
    }

    /** One grid without extrapolation must be within 2e-4, the limit that the source of the cases asks of about 200 × 400. */
    @TestFactory
    List<DynamicTest> marchMeetsTheIndependentCases() {
        List<DynamicTest> tests = new ArrayList<>();
        for (List<String> row : Table.rows("marching-checks.csv")) {
            String name = row.get(0);
            double prandtl = Double.parseDouble(row.get(1));
            double x = Double.parseDouble(row.get(2));
            double expected = Double.parseDouble(row.get(4));
            if (name.startsWith("I_")) {
                continue;
            }
            tests.add(DynamicTest.dynamicTest(name + " Pr " + prandtl + " x " + x, () -> {
                double found = nusselt(name, prandtl, x);
                assertEquals(expected, found, 2e-4 * expected);
            }));
        }
        assertEquals(36, tests.size());
        return tests;
    }

    private static double nusselt(String name, double prandtl, double x) {
        EnergyMarch march = new EnergyMarch(FLOW, prandtl, 240);
        boolean flux = name.startsWith("B_") || name.startsWith("D_");
        boolean stepped = name.startsWith("A_") || name.startsWith("B_");
        EnergyMarch.Solution s = march.march(
                flux ? EnergyMarch.Wall.FLUX : EnergyMarch.Wall.TEMPERATURE,
                at -> 1.0,
                stepped ? 0.3 : 0.0,
                x,
                480,
                stepped ? 3.0 : 2.0);
        int last = s.x().length - 1;
        // Scaled units: Nu/√Re = q √x / T, and for unit flux case B is given as Nu/√Re, too.
        return s.flux()[last] * Math.sqrt(x) / s.temperature()[last];
    }

    /** Case A through the matrix: a uniform wall temperature from 0.3 on. Near the step the cells are coarse. */
    @Test
    void matrixMeetsTheStepOfWallTemperature() {
        double[] edges = new double[9];
        for (int i = 0; i < 9; i++) {
            edges[i] = 0.3 + 0.7 * i / 8.0;
        }
        double worst = 0.0;
        for (PlateGrid.Fineness fineness : PlateGrid.Fineness.values()) {
            PlateGrid grid = PlateGrid.of(edges, 0.3, fineness);
            double[][] matrix = LaminarLayer.matrix(new FluxStepResponse(FLOW, 0.7, 3.4), grid.faces());
            double[] nusselt = new double[grid.along()];
            for (int i = 0; i < nusselt.length; i++) {
                for (int j = 0; j <= i; j++) {
                    nusselt[i] += matrix[i][j] * Math.sqrt(grid.x(i));
                }
            }
            assertEquals(0.535492729, grid.along(nusselt, 0.3875), 4e-4 * 0.535, fineness.toString());
            worst = Math.abs(grid.along(nusselt, 1.0) / 0.351587467 - 1.0);
            assertTrue(worst < 8e-4, fineness + " at the end: " + worst);
        }
        assertTrue(worst < 1.2e-4, "the finest grid must come closest, found " + worst);
    }

    /** Case I: five heated strips with adiabatic gaps; wall temperature from the flux response. */
    @Test
    void responseMeetsTheStripArray() {
        // Cell centres on the given places are not possible for strip ends; the flux steps themselves are superposed.
        FluxStepResponse step = new FluxStepResponse(FLOW, 0.7, 10.1);
        int checked = 0;
        for (List<String> row : Table.rows("marching-checks.csv")) {
            if (!row.get(0).startsWith("I_") || !row.get(1).equals("0.7")) {
                continue;
            }
            double x = Double.parseDouble(row.get(2));
            double sum = 0.0;
            for (int edge = 1; edge <= 10; edge++) {
                double xi = 0.1 * edge;
                double sign = edge % 2 == 1 ? 1.0 : -1.0;
                sum += sign * Math.sqrt(xi) * step.at(x / xi);
            }
            double expected = Double.parseDouble(row.get(4));
            assertEquals(expected, sum, 2e-4 * expected, "x " + x);
            checked++;
        }
        assertEquals(18, checked);
    }

    /** Between the two Prandtl numbers marched, interpolation must not show: the exact ratio of uniform walls at 0.71. */
    @Test
    void prandtlInterpolationIsHarmless() {
        double[] faces = PlateGrid.of(new double[] {0.1, 0.15, 0.2, 0.25, 0.3}, 0.3, PlateGrid.Fineness.FAST)
                .faces();
        double[][] interpolated = new LaminarLayer(new LaminarLayer.Responses(4.0), faces).matrix(1.0, 1.0, 0.71);
        double[][] direct = LaminarLayer.matrix(new FluxStepResponse(FLOW, 0.71, 4.0), faces);
        for (int i = 0; i < direct.length; i++) {
            for (int j = 0; j <= i; j++) {
                assertEquals(direct[i][j], interpolated[i][j], 3e-5 * Math.abs(direct[i][i]));
            }
        }
    }
}
