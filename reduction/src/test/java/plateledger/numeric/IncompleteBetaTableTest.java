package plateledger.numeric;

import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static plateledger.validation.Recorded.assertEquals;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.apache.commons.math3.special.Beta;
import org.junit.jupiter.api.Test;
import plateledger.validation.Published;

/** The table against the incomplete beta function of Apache Commons Math 3.6.1, and against published full values. */
final class IncompleteBetaTableTest {
    private static final IncompleteBetaTable LAMINAR = IncompleteBetaTable.of(0.75, 1.0 / 3.0, 3);
    private static final IncompleteBetaTable TURBULENT = IncompleteBetaTable.of(0.9, 1.0 / 9.0, 1);

    private static double expected(double a, double b, int j, double s) {
        double p = 1.0 / a;
        double q = b + j;
        double full = p * Math.exp(Beta.logBeta(p, q));
        if (s < 0.5) {
            return full * Beta.regularizedBeta(Math.pow(s, a), p, q, 1e-14, 100_000);
        }
        double rest = -Math.expm1(a * Math.log(s)); // 1 − z would lose the digits that count near s = 1
        return full * (1.0 - Beta.regularizedBeta(rest, q, p, 1e-14, 100_000));
    }

    /** (4/3) B(4/3, 1/3) and (10/9) B(10/9, 1/9), 14 digits from mpmath 1.3; tolerance: rounding of the summed pieces. */
    @Test
    @Published(section = "Theory", what = "full step integrals, (1/a) B(1/a, b)", source = "mpmath 1.3, 14 digits")
    void fullIntegralsAreTheBetaFunctions() {
        assertEquals(3.5332775005709, LAMINAR.full(0), 1e-12);
        assertEquals(9.8265359472165, TURBULENT.full(0), 1e-9);
    }

    @Property(tries = 2000)
    void agreesWithTheSlowFunction(@ForAll @DoubleRange(min = 0.0, max = 1.0) @Scale(12) double s) {
        for (int j = 0; j < 3; j++) {
            assertEquals(expected(0.75, 1.0 / 3.0, j, s), LAMINAR.lower(j, s), 1e-9 * LAMINAR.full(j));
        }
        assertEquals(expected(0.9, 1.0 / 9.0, 0, s), TURBULENT.lower(0, s), 1e-9 * TURBULENT.full(0));
    }

    /** Where pieces, octaves and the two halves meet, and close to both ends. */
    @Test
    void agreesAtJoinsAndEnds() {
        for (int k = 1; k <= 40; k++) {
            for (double shift : new double[] {-1e-12, 0.0, 1e-12, 0.3}) {
                double s = Math.scalb(1.0 + shift, -k);
                assertEquals(expected(0.75, 1.0 / 3.0, 0, s), LAMINAR.lower(0, s), 1e-9 * Math.max(s, 1e-6));
                double near = 1.0 - s;
                assertEquals(expected(0.9, 1.0 / 9.0, 0, near), TURBULENT.lower(0, near), 1e-9 * TURBULENT.full(0));
            }
        }
    }

    @Property(tries = 500)
    void risesWithItsLimitAndWeighsTermsLinearly(
            @ForAll @DoubleRange(min = 0.0, max = 0.999) @Scale(12) double s,
            @ForAll @DoubleRange(min = -2.0, max = 2.0) @Scale(12) double weight) {
        assertTrue(LAMINAR.lower(0, s + 0.001) > LAMINAR.lower(0, s));
        double together = LAMINAR.sum(s, 1.0 - s, 1.0, weight, -weight);
        double apart = LAMINAR.lower(0, s) + weight * LAMINAR.lower(1, s) - weight * LAMINAR.lower(2, s);
        assertEquals(apart, together, 1e-12);
    }

    @Test
    void limitsOutsideTheUnitIntervalAreTakenAtItsEnds() {
        assertEquals(0.0, LAMINAR.sum(-0.2, 1.2, 1.0, 0.0, 0.0), 0.0);
        assertEquals(LAMINAR.full(0), LAMINAR.sum(1.5, -0.5, 1.0, 0.0, 0.0), 0.0);
        assertTrue(Double.isNaN(LAMINAR.sum(Double.NaN, Double.NaN, 1.0, 0.0, 0.0)));
    }

    @Test
    void refusesExponentsWithoutAnIntegral() {
        assertThrows(IllegalArgumentException.class, () -> IncompleteBetaTable.of(0.75, 0.0, 1));
        assertThrows(IllegalArgumentException.class, () -> IncompleteBetaTable.of(0.75, 0.5, 4));
        assertThrows(IllegalArgumentException.class, () -> TURBULENT.lower(1, 0.5));
    }
}
