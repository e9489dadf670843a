package plateledger.theory;

import org.apache.commons.math3.special.Beta;
import org.apache.commons.math3.special.Gamma;

/**
 * Coefficients of the laminar layer over Prandtl number, computed once from {@link SimilaritySolution} and interpolated
 * by cubics in ln Pr (interpolation error below 1e-7 relative). Range 0.5 ≤ Pr ≤ 100, NaN outside.
 *
 * <p>Besides c(n, Pr) it holds the <em>corrected step kernel</em>, METHODS.md eqs. (T-9) to (T-11). The classical kernel
 * (1 − s^¾)^(−⅔), s = ξ/x, is the exact high-Prandtl-number solution (Lighthill 1950) and becomes exact at any Pr for
 * s → 1, with the coefficient 0.338716 Pr^⅓. Away from the step the curvature of the velocity profile adds a series in
 * u = 1 − s^¾. Two terms of it are kept,
 * <pre>
 *   (T_s − T_aw)(x) = 1/(k Re_x^½) ∫_0^x q(ξ) g(ξ/x) dξ,   g(s) = K_0 [u^(−⅔) + α_1 u^(⅓) + α_2 u^(4/3)],
 *   K_0 = a/(0.338716 Pr^⅓ Γ(⅓) Γ(⅔)),  a = ¾,
 * </pre>
 * with α_1, α_2 such that two exact solutions are met: uniform flux, ∫_0^1 g ds = 1/c(½), and a wall difference
 * ∝ x (flux ∝ x^½), ∫_0^1 g s^½ ds = 1/c(1). For a step of temperature likewise h(ξ; x) = (k/x) Re_x^½ C_0 u^(−⅓)
 * [1 + β_1 u + β_2 u²], C_0 = 0.338716 Pr^⅓, with the exact h at ξ = 0 and for uniform flux.
 */
final class LaminarTable {
    static final double LOWEST_PRANDTL = 0.5;
    static final double HIGHEST_PRANDTL = 100.0;

    /** (f''(0)/12)^⅓ / Γ(4/3): coefficient of c Pr^(−⅓) in the high-Prandtl-number limit (Lighthill 1950). */
    static final double LIGHTHILL = Math.cbrt(SimilaritySolution.WALL_SHEAR / 12.0) / Gamma.gamma(4.0 / 3.0);

    private static final double SPACING = 0.1;
    private static final double FIRST = Math.log(LOWEST_PRANDTL) - SPACING; // one node of margin on either side
    private static final int NODES = (int) Math.ceil((Math.log(HIGHEST_PRANDTL) - FIRST) / SPACING) + 3;

    private static final double[] UNIFORM_TEMPERATURE = new double[NODES];
    private static final double[] UNIFORM_FLUX = new double[NODES];
    private static final double[] RAMP = new double[NODES];
    private static final double[][] FLUX_KERNEL = new double[3][NODES];
    private static final double[][] TEMPERATURE_KERNEL = new double[3][NODES];

    static {
        for (int i = 0; i < NODES; i++) {
            double prandtl = Math.exp(FIRST + i * SPACING);
            double scale = Math.cbrt(prandtl); // dividing by the main trend leaves a nearly flat function
            double atZero = SimilaritySolution.coefficient(prandtl, 0.0) / scale;
            double atHalf = SimilaritySolution.coefficient(prandtl, 0.5) / scale;
            double atOne = SimilaritySolution.coefficient(prandtl, 1.0) / scale;
            UNIFORM_TEMPERATURE[i] = atZero;
            UNIFORM_FLUX[i] = atHalf;
            RAMP[i] = atOne;
            put(FLUX_KERNEL, i, fluxKernel(atHalf, atOne));
            put(TEMPERATURE_KERNEL, i, temperatureKernel(atZero, atHalf));
        }
    }

    private LaminarTable() {}

    /** c(0, Pr): Nu_x/√Re_x for uniform wall temperature. */
    static double uniformTemperature(double prandtl) {
        return Math.cbrt(prandtl) * at(UNIFORM_TEMPERATURE, prandtl);
    }

    /** c(½, Pr): Nu_x/√Re_x for uniform flux. */
    static double uniformFlux(double prandtl) {
        return Math.cbrt(prandtl) * at(UNIFORM_FLUX, prandtl);
    }

    /** c(1, Pr): Nu_x/√Re_x for a wall difference ∝ x. */
    static double ramp(double prandtl) {
        return Math.cbrt(prandtl) * at(RAMP, prandtl);
    }

    /** Coefficient of u^(j − ⅔) in the flux kernel g, j = 0, 1, 2. */
    static double fluxKernel(int j, double prandtl) {
        return at(FLUX_KERNEL[j], prandtl) / Math.cbrt(prandtl);
    }

    /** Coefficient of u^(j − ⅓) in the temperature kernel, j = 0, 1, 2. */
    static double temperatureKernel(int j, double prandtl) {
        return at(TEMPERATURE_KERNEL[j], prandtl) * Math.cbrt(prandtl);
    }

    private static double[] fluxKernel(double atHalf, double atOne) {
        double k0 = 0.75 / (LIGHTHILL * Gamma.gamma(1.0 / 3.0) * Gamma.gamma(2.0 / 3.0));
        double[] terms = meet(
                k0,
                1.0 / atHalf,
                new double[] {moment(0.0, 0), moment(0.0, 1), moment(0.0, 2)},
                1.0 / atOne,
                new double[] {moment(0.5, 0), moment(0.5, 1), moment(0.5, 2)});
        return terms;
    }

    private static double[] temperatureKernel(double atZero, double atHalf) {
        // c(n) = n ∫ s^(n−1) h ds; with z = s^¾ the term j gives (4/3) n B(4n/3, j + ⅔).
        double[] half = new double[3];
        for (int j = 0; j < 3; j++) {
            half[j] = 4.0 / 3.0 * 0.5 * beta(2.0 / 3.0, j + 2.0 / 3.0);
        }
        return meet(LIGHTHILL, atZero, new double[] {1.0, 1.0, 1.0}, atHalf, half);
    }

    /** {k0, k1, k2} with Σ k_j m_j equal to the two given values. */
    private static double[] meet(double k0, double value1, double[] m1, double value2, double[] m2) {
        double rest1 = value1 - k0 * m1[0];
        double rest2 = value2 - k0 * m2[0];
        double determinant = m1[1] * m2[2] - m1[2] * m2[1];
        return new double[] {
            k0, (rest1 * m2[2] - rest2 * m1[2]) / determinant, (m1[1] * rest2 - m2[1] * rest1) / determinant
        };
    }

    /** ∫_0^1 s^m (1 − s^¾)^(j − ⅔) ds. */
    private static double moment(double m, int j) {
        return 4.0 / 3.0 * beta(4.0 / 3.0 * (m + 1.0), j + 1.0 / 3.0);
    }

    private static double beta(double p, double q) {
        return Math.exp(Beta.logBeta(p, q));
    }

    private static void put(double[][] table, int node, double[] values) {
        for (int j = 0; j < values.length; j++) {
            table[j][node] = values[j];
        }
    }

    /** Cubic through the four nearest nodes. */
    private static double at(double[] table, double prandtl) {
        if (!(prandtl >= LOWEST_PRANDTL && prandtl <= HIGHEST_PRANDTL)) {
            return Double.NaN;
        }
        double place = (Math.log(prandtl) - FIRST) / SPACING;
        int i = Math.min(Math.max((int) place, 1), NODES - 3);
        double t = place - i;
        double before = table[i - 1];
        double left = table[i];
        double right = table[i + 1];
        double after = table[i + 2];
        return left * (1.0 + t) * (1.0 - t) * (2.0 - t) / 2.0
                + right * t * (1.0 + t) * (2.0 - t) / 2.0
                - before * t * (1.0 - t) * (2.0 - t) / 6.0
                - after * t * (1.0 + t) * (1.0 - t) / 6.0;
    }
}
