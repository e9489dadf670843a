package plateledger.demo.physics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** The turbulent matrix against closed forms of its kernel. */
@Tag("validation")
final class TurbulentLayerTest {
    private static final double UNIT_REYNOLDS = 1.0e6;
    private static final double PRANDTL = 0.71;

    private static double plain(double x) {
        return TurbulentLayer.COEFFICIENT / x * Math.pow(UNIT_REYNOLDS * x, 0.8) * Math.pow(PRANDTL, 0.6);
    }

    private static double[] faces(double start, int n) {
        double[] faces = new double[n + 1];
        for (int i = 0; i <= n; i++) {
            faces[i] = start + (1.0 - start) * Math.pow((double) i / n, 2.0);
        }
        return faces;
    }

    /** Uniform temperature from ξ on: h (1 − (ξ/x)^0.9)^(−1/9), Reynolds, Kays and Kline 1958 (from memory). */
    @Test
    void uniformTemperatureHasTheStepFactor() {
        double[] faces = faces(0.3, 80);
        double[][] m = TurbulentLayer.matrix(faces, 0.1, 1.0, UNIT_REYNOLDS, PRANDTL);
        for (int i = 0; i < m.length; i++) {
            double x = 0.5 * (faces[i] + faces[i + 1]) - 0.1;
            double sum = 0.0;
            for (double a : m[i]) {
                sum += a;
            }
            assertEquals(plain(x) * Math.pow(1.0 - Math.pow(0.2 / x, 0.9), -1.0 / 9.0), sum, 1e-9 * sum);
        }
    }

    /** A ramp from the leading edge raises h by (10/9) B(10/9, 8/9) = 1.13400029927 (closed form of the kernel). */
    @Test
    void rampHasTheClosedFactor() {
        double[] faces = faces(1e-9, 300);
        double[][] m = TurbulentLayer.matrix(faces, 0.0, 1.0, UNIT_REYNOLDS, PRANDTL);
        int i = m.length - 1;
        double x = 0.5 * (faces[i] + faces[i + 1]);
        double q = 0.0;
        for (int j = 0; j <= i; j++) {
            q += m[i][j] * 0.5 * (faces[j] + faces[j + 1]);
        }
        assertEquals(1.13400029927, q / (plain(x) * x), 2e-5);
    }

    /** Uniform flux raises h by Γ(1/9) Γ(8/9)/B(10/9, 1/9) = 1.03861653 (closed form of the kernel). */
    @Test
    void uniformFluxHasTheClosedFactor() {
        double[] faces = faces(1e-7, 300);
        double[][] m = TurbulentLayer.matrix(faces, 0.0, 1.0, UNIT_REYNOLDS, PRANDTL);
        double[] theta = new double[m.length];
        for (int i = 0; i < m.length; i++) {
            double rest = 1.0;
            for (int j = 0; j < i; j++) {
                rest -= m[i][j] * theta[j];
            }
            theta[i] = rest / m[i][i];
        }
        int last = m.length - 1;
        double x = 0.5 * (faces[last] + faces[last + 1]);
        assertEquals(1.03861653, 1.0 / theta[last] / plain(x), 3e-4);
    }

    /** Momentum matched at the trip by hand: 0.664115 x/√Re = 0.037 s (ν/(U s))^0.2, Re_t = 5·10⁴, gives s/x_t = 0.6945. */
    @Test
    void virtualOriginMatchesMomentum() {
        double trip = 0.05;
        double run = trip - TurbulentLayer.virtualOrigin(trip, UNIT_REYNOLDS);
        // s^0.8 = 0.664115 x_t/√Re_t · Re_unit^0.2/0.037, solved in closed form.
        double closed = Math.pow(
                0.664114672 * trip / Math.sqrt(UNIT_REYNOLDS * trip) * Math.pow(UNIT_REYNOLDS, 0.2) / 0.037, 1.25);
        assertEquals(closed, run, 1e-9);
        assertTrue(run > 0.0 && run < trip, "origin between leading edge and trip, run " + run);
    }
}
