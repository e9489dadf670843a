package plateledger.demo.physics;

/**
 * The laminar flat-plate velocity field f(η), f'(η), from f''' + f f''/2 = 0 with f(0) = f'(0) = 0, f'(∞) = 1
 * (η = y √(U/νx), u/U = f').
 *
 * <p>Solved as an initial-value problem with f''(0) = 1 and rescaled: if g solves the equation and g'(∞) = c, then
 * f(η) = g(η/√c)/√c, so f''(0) = c^(−3/2) (Töpfer's transformation; from memory).
 */
final class BlasiusFlow {
    private static final double STEP = 0.005;
    private static final double END = 14.0;

    private final double[] stream;
    private final double[] velocity;
    private final double[] shear;

    BlasiusFlow() {
        double slope = farVelocity(1.0);
        double wall = 1.0 / (slope * StrictMath.sqrt(slope));
        int n = (int) StrictMath.round(END / STEP) + 1;
        stream = new double[n];
        velocity = new double[n];
        shear = new double[n];
        double[] y = {0.0, 0.0, wall};
        for (int i = 0; i < n; i++) {
            stream[i] = y[0];
            velocity[i] = y[1];
            shear[i] = y[2];
            advance(y, STEP);
        }
    }

    /** f''(0), dimensionless. */
    double wallShear() {
        return shear[0];
    }

    /** f(η); beyond the table the outer solution continues with f' = 1. */
    double stream(double eta) {
        return interpolate(stream, velocity, eta);
    }

    /** f'(η). */
    double velocity(double eta) {
        return eta >= END - STEP ? 1.0 : interpolate(velocity, shear, eta);
    }

    private static double interpolate(double[] value, double[] derivative, double eta) {
        int last = value.length - 1;
        double place = eta / STEP;
        if (place >= last) {
            return value[last] + derivative[last] * (eta - last * STEP);
        }
        int i = (int) place;
        double s = place - i;
        double a = value[i];
        double b = value[i + 1];
        double da = derivative[i] * STEP;
        double db = derivative[i + 1] * STEP;
        double rise = b - a;
        return a + s * (da + s * (3.0 * rise - 2.0 * da - db + s * (da + db - 2.0 * rise)));
    }

    private static double farVelocity(double wall) {
        double[] y = {0.0, 0.0, wall};
        for (int i = 0; i < 4000; i++) {
            advance(y, STEP);
        }
        return y[1];
    }

    private static void advance(double[] y, double h) {
        double[] k1 = slope(y[0], y[1], y[2]);
        double[] k2 = slope(y[0] + 0.5 * h * k1[0], y[1] + 0.5 * h * k1[1], y[2] + 0.5 * h * k1[2]);
        double[] k3 = slope(y[0] + 0.5 * h * k2[0], y[1] + 0.5 * h * k2[1], y[2] + 0.5 * h * k2[2]);
        double[] k4 = slope(y[0] + h * k3[0], y[1] + h * k3[1], y[2] + h * k3[2]);
        for (int i = 0; i < 3; i++) {
            y[i] += h / 6.0 * (k1[i] + 2.0 * k2[i] + 2.0 * k3[i] + k4[i]);
        }
    }

    private static double[] slope(double f, double df, double ddf) {
        return new double[] {df, ddf, -0.5 * f * ddf};
    }
}
