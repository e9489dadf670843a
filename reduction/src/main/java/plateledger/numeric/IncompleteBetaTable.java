package plateledger.numeric;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * A fast table of the incomplete beta functions that superposition of steps needs:
 * <pre>
 *   Φ_j(s) = ∫_0^s (1 − σ^a)^(b − 1 + j) dσ = (1/a) B_z(1/a, b + j),  z = s^a,   0 ≤ s ≤ 1,  j = 0 … terms − 1
 * </pre>
 * B_z is the unregularised incomplete beta function; the substitution z = σ^a gives the identity. Φ_0 has an integrable
 * singularity of slope at s = 1, so that half is tabulated as the tail Φ_j(1) − Φ_j(s) over w = 1 − s. Each octave of s
 * (or w) is cut into 64 equal pieces with one cubic each that meets value and slope at both ends; which piece is read
 * from the leading bits of the double, so that no power is computed. Absolute error below 1e-9 of Φ_j(1).
 */
public final class IncompleteBetaTable {
    private static final int MAX_TERMS = 3;
    private static final int OCTAVES = 20;
    private static final int PIECE_BITS = 6;
    private static final int PIECES = 1 << PIECE_BITS;
    private static final int SHIFT = 52 - PIECE_BITS;
    private static final long BASE = (1023L - 1 - OCTAVES) << PIECE_BITS; // the octave that starts at 2^-(OCTAVES+1)
    private static final long FRACTION_MASK = (1L << SHIFT) - 1;
    private static final double FRACTION_SCALE = 1.0 / (1L << SHIFT);
    private static final double SMALLEST = Math.scalb(1.0, -1 - OCTAVES);
    private static final int GAUSS_POINTS = 4;

    private final double a;
    private final double b;
    private final int terms;
    private final double[] head; // cubics of Φ_j(s) over s in [2^-21, 1/2)
    private final double[] tail; // cubics of Φ_j(1) − Φ_j(s) over w = 1 − s in [2^-21, 1/2]
    private final double[] full = new double[MAX_TERMS];

    private IncompleteBetaTable(double a, double b, int terms) {
        this.a = a;
        this.b = b;
        this.terms = terms;
        GaussIntegrator gauss = new GaussIntegratorFactory().legendre(GAUSS_POINTS, 0.0, 1.0);
        head = new double[OCTAVES * PIECES * terms * 4];
        tail = new double[OCTAVES * PIECES * terms * 4];
        for (int j = 0; j < terms; j++) {
            int term = j;
            double headAtHalf =
                    fill(gauss, head, j, nearZero(SMALLEST, j), s -> Math.pow(oneMinusPower(s, a), b - 1.0 + term));
            double tailAtHalf =
                    fill(gauss, tail, j, nearOne(SMALLEST, j), w -> Math.pow(fromOne(w, a), b - 1.0 + term));
            full[j] = headAtHalf + tailAtHalf;
        }
    }

    /**
     * A table.
     *
     * @param a exponent of s inside the bracket, above 0
     * @param b the bracket's exponent plus one, 0 &lt; b ≤ 1
     * @param terms how many of Φ_0, Φ_1, Φ_2, 1 to 3
     */
    public static IncompleteBetaTable of(double a, double b, int terms) {
        if (!(a > 0.0) || !(b > 0.0) || b > 1.0 || terms < 1 || terms > MAX_TERMS) {
            throw new IllegalArgumentException(
                    "table needs a > 0, 0 < b <= 1 and 1 to 3 terms, found " + a + ", " + b + ", " + terms);
        }
        return new IncompleteBetaTable(a, b, terms);
    }

    /** Φ_j(1) = B(1/a, b + j)/a. */
    public double full(int j) {
        return full[j];
    }

    /**
     * g0 Φ_0(s) + g1 Φ_1(s) + g2 Φ_2(s); coefficients of terms that the table does not hold are not used.
     *
     * @param s upper limit; below 0 is taken as 0
     * @param w 1 − s, handed in apart because it is better known than by subtraction; 0 or below is taken as s = 1
     * @return the weighted sum; NaN if s or w is NaN
     */
    public double sum(double s, double w, double g0, double g1, double g2) {
        if (Double.isNaN(s) || Double.isNaN(w)) {
            return Double.NaN;
        }
        if (s <= 0.0) {
            return 0.0;
        }
        if (w <= 0.0) {
            return g0 * full[0] + g1 * full[1] + g2 * full[2];
        }
        if (s < 0.5) {
            return s < SMALLEST ? nearZeroSum(s, g0, g1, g2) : cubics(head, s, g0, g1, g2);
        }
        double whole = g0 * full[0] + g1 * full[1] + g2 * full[2];
        if (w < SMALLEST) {
            return whole - nearOneSum(w, g0, g1, g2);
        }
        // w = 1/2, or just above by rounding, opens the next octave, which the table does not hold.
        return whole - cubics(tail, Math.min(w, Math.nextDown(0.5)), g0, g1, g2);
    }

    /** Φ_j(s). */
    public double lower(int j, double s) {
        if (j < 0 || j >= terms) {
            throw new IllegalArgumentException("table holds terms 0 to " + (terms - 1) + ", asked for " + j);
        }
        return sum(s, 1.0 - s, j == 0 ? 1.0 : 0.0, j == 1 ? 1.0 : 0.0, j == 2 ? 1.0 : 0.0);
    }

    private double nearZeroSum(double s, double g0, double g1, double g2) {
        double sum = g0 * nearZero(s, 0);
        if (terms > 1) {
            sum += g1 * nearZero(s, 1);
        }
        if (terms > 2) {
            sum += g2 * nearZero(s, 2);
        }
        return sum;
    }

    /** Φ_j for small s: ∫_0^s (1 − q σ^a + …) dσ, q = b − 1 + j; relative error of the order of s^(2a). */
    private double nearZero(double s, int j) {
        return s * (1.0 - (b - 1.0 + j) * Math.pow(s, a) / (1.0 + a));
    }

    private double nearOneSum(double w, double g0, double g1, double g2) {
        double sum = g0 * nearOne(w, 0);
        if (terms > 1) {
            sum += g1 * nearOne(w, 1);
        }
        if (terms > 2) {
            sum += g2 * nearOne(w, 2);
        }
        return sum;
    }

    /** The tail for small w: ∫_0^w u^q dw with u = a w [1 + (1 − a) w/2 + …]; relative error of the order of w². */
    private double nearOne(double w, int j) {
        double q = b - 1.0 + j;
        return w * Math.pow(a * w, q) * (1.0 / (q + 1.0) + q * (1.0 - a) * w / (2.0 * (q + 2.0)));
    }

    private double cubics(double[] table, double v, double g0, double g1, double g2) {
        long bits = Double.doubleToRawLongBits(v);
        double t = (bits & FRACTION_MASK) * FRACTION_SCALE;
        int k = (int) ((bits >>> SHIFT) - BASE) * terms * 4;
        double sum = g0 * (table[k] + t * (table[k + 1] + t * (table[k + 2] + t * table[k + 3])));
        if (terms > 1) {
            sum += g1 * (table[k + 4] + t * (table[k + 5] + t * (table[k + 6] + t * table[k + 7])));
        }
        if (terms > 2) {
            sum += g2 * (table[k + 8] + t * (table[k + 9] + t * (table[k + 10] + t * table[k + 11])));
        }
        return sum;
    }

    private interface Slope {
        double at(double v);
    }

    /** Fills the cubics of term j from {@code start} at 2^-21 upwards; returns the value at 1/2. */
    private double fill(GaussIntegrator gauss, double[] table, int j, double start, Slope slope) {
        double value = start;
        double slopeLeft = slope.at(SMALLEST);
        for (int octave = 0; octave < OCTAVES; octave++) {
            double left = Math.scalb(1.0, octave - OCTAVES - 1);
            double width = left / PIECES;
            for (int piece = 0; piece < PIECES; piece++) {
                double from = left + piece * width;
                double rise = width * gauss.integrate(t -> slope.at(from + t * width));
                double slopeRight = slope.at(from + width);
                int k = ((octave * PIECES + piece) * terms + j) * 4;
                table[k] = value;
                table[k + 1] = width * slopeLeft;
                table[k + 2] = 3.0 * rise - width * (2.0 * slopeLeft + slopeRight);
                table[k + 3] = width * (slopeLeft + slopeRight) - 2.0 * rise;
                value += rise;
                slopeLeft = slopeRight;
            }
        }
        return value;
    }

    private static double oneMinusPower(double s, double a) {
        return -Math.expm1(a * Math.log(s));
    }

    private static double fromOne(double w, double a) {
        return -Math.expm1(a * Math.log1p(-w));
    }
}
