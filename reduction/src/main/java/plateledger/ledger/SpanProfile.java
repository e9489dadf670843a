package plateledger.ledger;

/**
 * Temperature across the span of a thin sheet that loses heat at its two side edges, METHODS.md eq. (L-4).
 *
 * <pre>
 *   T(z) = T₁ − β (T₁ − T_frame) cosh(z/l)/cosh(W/2l)
 *   l = √(k t/h_total)                conduction length                     m
 *   β = G/(G + (k t/l) tanh(W/2l))    drop at the edge as a share of T₁ − T_frame
 * </pre>
 *
 * <p>T₁ is the temperature without edges. Derived from k t T'' = h_total (T − T₁) with −k t ∂T/∂n = G (T − T_frame).
 */
final class SpanProfile {
    private SpanProfile() {}

    /** Conduction length l, m. */
    static double length(double sheetWPerK, double totalWPerM2K) {
        return Math.sqrt(sheetWPerK / totalWPerM2K);
    }

    /** β, dimensionless. */
    static double edgeShare(double edgeWPerMK, double sheetWPerK, double lengthM, double widthM) {
        return edgeWPerMK / (edgeWPerMK + sheetWPerK / lengthM * Math.tanh(0.5 * widthM / lengthM));
    }

    /** cosh(z/l)/cosh(W/2l), without overflow. */
    static double shape(double zM, double lengthM, double widthM) {
        double z = Math.abs(zM) / lengthM;
        double half = 0.5 * widthM / lengthM;
        return Math.exp(z - half) * (1.0 + Math.exp(-2.0 * z)) / (1.0 + Math.exp(-2.0 * half));
    }

    /** Mean over the span of cosh(z/l)/cosh(W/2l). */
    static double meanShape(double lengthM, double widthM) {
        return 2.0 * lengthM / widthM * Math.tanh(0.5 * widthM / lengthM);
    }

    /** Mean over the span of the square of cosh(z/l)/cosh(W/2l). */
    static double meanSquareShape(double lengthM, double widthM) {
        double half = 0.5 * widthM / lengthM;
        double t = Math.tanh(half);
        return 0.5 * (1.0 - t * t) + 0.5 * t / half;
    }
}
