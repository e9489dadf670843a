package plateledger.theory;

/**
 * The laminar boundary layer on a flat plate at constant properties, METHODS.md eqs. (T-1) to (T-4):
 * <pre>
 *   f''' + ½ f f'' = 0                        f(0) = f'(0) = 0, f'(∞) = 1         Blasius 1908
 *   θ'' + ½ Pr f θ' − n Pr f' θ = 0           θ(0) = 1, θ(∞) = 0                  wall difference ∝ x^n, Pohlhausen 1921
 *   Nu_x = c(n, Pr) √Re_x,  c = −θ'(0)        n = 0 uniform temperature, n = ½ uniform flux
 *   θ_r'' + ½ Pr f θ_r' + 2 Pr f''² = 0       θ_r'(0) = 0, θ_r(∞) = 0, r = θ_r(0) recovery factor
 * </pre>
 * Integrated here by the classical fourth-order Runge–Kutta method from the wall value f''(0) of
 * Blasius's solution; c(n) from two initial-value solutions, whose common growth cancels in their ratio. Agreement with
 * an independent 12-digit tabulation: better than 2e-8 for 0.5 ≤ Pr ≤ 100 (test). Too slow for the kernel, which uses
 * {@link LaminarTable}.
 */
public final class SimilaritySolution {
    /** f''(0) of Blasius's equation, 30-digit series value 0.332057336215196299. */
    static final double WALL_SHEAR = 0.3320573362151963;

    /** Beyond this growth exponent of the two solutions their ratio no longer changes in double precision. */
    private static final double GROWTH_LIMIT = 30.0;

    /** Velocity layer's outer edge; f''² beyond it is below 1e-14. */
    private static final double VELOCITY_EDGE = 9.0;

    private static final double STEP = 0.04;

    private SimilaritySolution() {}

    /** c(n, Pr) of Nu_x = c √Re_x for a wall temperature difference ∝ x^n; n ≥ 0, 0.05 ≤ Pr ≤ 1000, NaN outside. */
    public static double coefficient(double prandtl, double n) {
        if (!(prandtl >= 0.05 && prandtl <= 1000.0) || !(n >= 0.0)) {
            return Double.NaN;
        }
        Stepper stepper = new Stepper(prandtl, n);
        double step = step(prandtl);
        while (stepper.growth() < GROWTH_LIMIT) {
            stepper.advance(step);
        }
        return stepper.first() / stepper.second(); // θ = θ1 − c θ2 must vanish outside
    }

    /** Recovery factor r of T_aw = T_∞ + r U²/(2 c_p); 0.05 ≤ Pr ≤ 1000, NaN outside. */
    public static double recovery(double prandtl) {
        if (!(prandtl >= 0.05 && prandtl <= 1000.0)) {
            return Double.NaN;
        }
        Stepper stepper = new Stepper(prandtl, 0.0);
        // Explicit steps must resolve the decay rate ½ Pr f, whose largest value is at the outer edge.
        double step = Math.min(step(prandtl), 1.0 / (0.5 * prandtl * VELOCITY_EDGE));
        while (stepper.eta < VELOCITY_EDGE || stepper.growth() < GROWTH_LIMIT) {
            stepper.advance(step);
        }
        return stepper.recovery();
    }

    private static double step(double prandtl) {
        return STEP / Math.max(1.0, Math.cbrt(prandtl));
    }

    /** One fourth-order Runge–Kutta march of all equations from the wall outwards. */
    private static final class Stepper {
        private static final int SIZE = 10;
        private final double prandtl;
        private final double n;
        // f, f', f'', θ1, θ1', θ2, θ2', θ_r', ∫θ_r' dη, ∫f dη
        private final double[] y = {0.0, 0.0, WALL_SHEAR, 1.0, 0.0, 0.0, 1.0, 0.0, 0.0, 0.0};
        private final double[] trial = new double[SIZE];
        private final double[][] k = new double[4][SIZE];
        private double eta;

        Stepper(double prandtl, double n) {
            this.prandtl = prandtl;
            this.n = n;
        }

        /** Exponent of the common growth of the two solutions, and of the decay of the adiabatic one. */
        double growth() {
            return 0.5 * prandtl * y[9];
        }

        double first() {
            return y[3];
        }

        double second() {
            return y[5];
        }

        double recovery() {
            return -y[8];
        }

        void advance(double h) {
            slope(y, k[0]);
            shift(k[0], 0.5 * h);
            slope(trial, k[1]);
            shift(k[1], 0.5 * h);
            slope(trial, k[2]);
            shift(k[2], h);
            slope(trial, k[3]);
            for (int i = 0; i < SIZE; i++) {
                y[i] += h / 6.0 * (k[0][i] + 2.0 * (k[1][i] + k[2][i]) + k[3][i]);
            }
            eta += h;
        }

        private void shift(double[] slope, double h) {
            for (int i = 0; i < SIZE; i++) {
                trial[i] = y[i] + h * slope[i];
            }
        }

        private void slope(double[] v, double[] d) {
            double f = v[0];
            double drift = 0.5 * prandtl * f;
            double source = n * prandtl * v[1];
            d[0] = v[1];
            d[1] = v[2];
            d[2] = -0.5 * f * v[2];
            d[3] = v[4];
            d[4] = -drift * v[4] + source * v[3];
            d[5] = v[6];
            d[6] = -drift * v[6] + source * v[5];
            d[7] = -drift * v[7] - 2.0 * prandtl * v[2] * v[2];
            d[8] = v[7];
            d[9] = f;
        }
    }
}
