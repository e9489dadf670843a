package plateledger.numeric;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** Hand-worked systems. */
final class SolversTest {
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
    }

    @Test
    void choleskyRefusesIndefinite() {
        assertFalse(SmallCholesky.factor(new double[][] {{1.0, 0.0}, {2.0, 1.0}}, 2));
        assertFalse(SmallCholesky.factor(new double[][] {{Double.NaN}}, 1));
    }
}
