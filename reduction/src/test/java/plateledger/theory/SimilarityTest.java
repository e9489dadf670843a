package plateledger.theory;

import static org.junit.jupiter.api.Assertions.assertTrue;
import static plateledger.validation.Recorded.assertEquals;

import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import plateledger.validation.Published;

/** The laminar similarity solution and its interpolation against an independent 12-digit tabulation. */
@Tag("validation")
final class SimilarityTest {
    /** Tolerance 2e-7 relative: fourth-order steps and cubic interpolation; nothing in this tool needs more. */
    private static final double RELATIVE = 2e-7;

    @Test
    @Published(
            section = "Theory",
            what = "laminar similarity solution: uniform temperature, uniform flux, recovery",
            source = "independent 12-digit integration")
    void tableMeetsTheTabulationOverItsRange() {
        int checked = 0;
        for (CSVRecord row : Reference.rows("similarity.csv")) {
            double prandtl = Reference.number(row, "Pr");
            double temperature = Reference.number(row, "UWT_Nu_over_sqrtRe");
            double flux = Reference.number(row, "UHF_Nu_over_sqrtRe");
            double recovery = Reference.number(row, "recovery_factor_laminar");
            if (prandtl < LaminarTable.LOWEST_PRANDTL || prandtl > LaminarTable.HIGHEST_PRANDTL) {
                assertTrue(Double.isNaN(LaminarTable.uniformFlux(prandtl)), "outside the range at Pr " + prandtl);
                continue;
            }
            assertEquals(
                    temperature, LaminarTable.uniformTemperature(prandtl), RELATIVE * temperature, "Pr " + prandtl);
            assertEquals(flux, LaminarTable.uniformFlux(prandtl), RELATIVE * flux, "Pr " + prandtl);
            assertEquals(recovery, FlatPlate.exactLaminarRecovery(prandtl), RELATIVE * recovery, "Pr " + prandtl);
            checked++;
        }
        assertTrue(checked >= 20, "rows in range: " + checked);
    }

    @Test
    @Published(
            section = "Theory",
            what = "laminar similarity solution: power-law walls",
            source = "independent integration")
    void powerLawWallsMeetTheTabulation() {
        double[] exponents = {0.0, 0.25, 0.5, 0.75, 1.0, 1.5, 2.0, 3.0};
        for (CSVRecord row : Reference.rows("power-law-walls.csv")) {
            double prandtl = Reference.number(row, "Pr");
            if (prandtl < 0.05 || prandtl > 1000.0) {
                continue;
            }
            for (double n : exponents) {
                String column = "n=" + (n == Math.rint(n) ? String.valueOf((int) n) : String.valueOf(n));
                double expected = Reference.number(row, column);
                assertEquals(
                        expected,
                        SimilaritySolution.coefficient(prandtl, n),
                        5e-8 * expected,
                        "Pr " + prandtl + ", n " + n);
            }
        }
    }

    /** High-Prandtl-number limit of c Pr^(−⅓), Lighthill 1950; ten digits. */
    @Test
    @Published(
            section = "Theory",
            what = "limit of the laminar coefficient at high Pr",
            source = "Lighthill, Proc. R. Soc. A 202 (1950) 359")
    void leadingConstantIsLighthills() {
        assertEquals(0.338716055593, LaminarTable.LIGHTHILL, 5e-13);
    }

    @Test
    void outsideItsRangeThereIsNoNumber() {
        assertTrue(Double.isNaN(SimilaritySolution.coefficient(0.01, 0.0)));
        assertTrue(Double.isNaN(SimilaritySolution.coefficient(0.7, -0.1)));
        assertTrue(Double.isNaN(SimilaritySolution.recovery(2000.0)));
        assertTrue(Double.isNaN(LaminarTable.fluxKernel(0, 0.49)));
        assertTrue(Double.isNaN(LayerLaw.TURBULENT.uniformTemperature(Double.NaN)));
    }
}
