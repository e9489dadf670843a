package plateledger.numeric;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.junit.jupiter.api.Test;

/** Hand-worked systems and the defining property, A x = b. */
final class SolversTest {
    /** 2x+y=4, x+3y+z=10, y+2z=8: by hand x=1, y=2, z=3. */
    @Test
    void tridiagonalByHand() {
        double[] x = new double[3];
        Tridiagonal.solve(
                new double[] {9.0, 1.0, 1.0},
                new double[] {2.0, 3.0, 2.0},
                new double[] {1.0, 1.0, 9.0},
                new double[] {4.0, 10.0, 8.0},
                new double[3],
                x);
        assertArrayEquals(new double[] {1.0, 2.0, 3.0}, x, 1e-14);
        assertThrows(
                IllegalArgumentException.class,
                () -> Tridiagonal.solve(new double[2], new double[3], new double[3], new double[3], new double[3], x));
    }

    @Property
    void tridiagonalMeetsItsEquations(
            @ForAll @DoubleRange(min = 0.1, max = 3.0) @Scale(12) double wave,
            @ForAll @DoubleRange(min = -1.0, max = 1.0) @Scale(12) double lower,
            @ForAll @DoubleRange(min = -1.0, max = 1.0) @Scale(12) double upper) {
        int n = 12;
        double[] right = new double[n];
        double[] low = new double[n];
        double[] mid = new double[n];
        double[] up = new double[n];
        for (int i = 0; i < n; i++) {
            low[i] = lower * (i + 1) / n;
            up[i] = upper * (n - i) / n;
            right[i] = Math.sin(wave * (i + 1));
            mid[i] = 2.5 + 0.1 * i;
        }
        double[] x = right.clone();
        Tridiagonal.solve(low, mid, up, x, new double[n], x);
        for (int i = 0; i < n; i++) {
            double left = mid[i] * x[i] + (i > 0 ? low[i] * x[i - 1] : 0.0) + (i < n - 1 ? up[i] * x[i + 1] : 0.0);
            assertEquals(right[i], left, 1e-13);
        }
    }

    /** [[4,2],[2,5]] = L Lᵀ with L = [[2,0],[1,2]]; inverse = [[5,−2],[−2,4]]/16. By hand. */
    @Test
    void choleskyByHand() {
        double[][] a = {{4.0, 2.0}, {2.0, 5.0}};
        assertTrue(SmallCholesky.factor(a, 2));
        assertEquals(2.0, a[0][0], 1e-15);
        assertEquals(1.0, a[1][0], 1e-15);
        assertEquals(2.0, a[1][1], 1e-15);
        double[] b = {8.0, 12.0}; // x = (1, 2)
        SmallCholesky.solve(a, 2, b);
        assertArrayEquals(new double[] {1.0, 2.0}, b, 1e-14);
        double[][] inverse = SmallCholesky.inverse(a, 2);
        assertArrayEquals(new double[] {5.0 / 16.0, -2.0 / 16.0}, inverse[0], 1e-15);
        assertArrayEquals(new double[] {-2.0 / 16.0, 4.0 / 16.0}, inverse[1], 1e-15);
    }

    @Test
    void choleskyRefusesIndefinite() {
        assertFalse(SmallCholesky.factor(new double[][] {{1.0, 0.0}, {2.0, 1.0}}, 2));
        assertFalse(SmallCholesky.factor(new double[][] {{Double.NaN}}, 1));
    }
}
