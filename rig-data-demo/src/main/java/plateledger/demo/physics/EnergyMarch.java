package plateledger.demo.physics;

import java.util.function.DoubleUnaryOperator;

/**
 * Marches the laminar energy equation of a flat plate downstream in similarity variables,
 *
 * <pre>
 *   (1/Pr) T'' + f T'/2 = x f' ∂T/∂x        ' = d/dη, f of Blasius
 * </pre>
 *
 * in scaled units U/ν = 1 and k = 1, so that q_w = −T'(0)/√x. Central differences on a stretched η grid, second-order
 * backward differences in t, x = ξ + (x₂ − ξ) t^p, which resolves the (x − ξ)^(1/3) growth of the thermal layer after a
 * step with p = 3. The wall slope is taken to third order from the equation itself: T''(0) = 0,
 * T'''(0) = Pr x f''(0) dT_w/dx.
 */
final class EnergyMarch {
    private static final double STRETCH = 4.25;

    /** What is prescribed at the wall. */
    enum Wall {
        /** Wall temperature above the stream. */
        TEMPERATURE,
        /** Wall heat flux. */
        FLUX
    }

    /**
     * The solution along the wall at equal steps of t, index 0 at the start.
     *
     * @param x place, scaled
     * @param temperature wall temperature above the stream
     * @param flux wall flux, scaled (k = 1)
     */
    record Solution(double[] x, double[] temperature, double[] flux) {}

    private final double prandtl;
    private final double wallShear;
    private final double[] eta;
    private final double[] stream;
    private final double[] velocity;

    /** A marcher for one Prandtl number with {@code points} intervals across the layer. */
    EnergyMarch(BlasiusFlow flow, double prandtl, int points) {
        this.prandtl = prandtl;
        wallShear = flow.wallShear();
        double end = prandtl < 1.0 ? 12.0 : 8.0;
        eta = new double[points + 1];
        stream = new double[points + 1];
        velocity = new double[points + 1];
        for (int i = 0; i <= points; i++) {
            eta[i] = end * StrictMath.sinh(STRETCH * i / points) / StrictMath.sinh(STRETCH);
            stream[i] = flow.stream(eta[i]);
            velocity[i] = flow.velocity(eta[i]);
        }
    }

    /**
     * Marches from {@code start} to {@code end} in {@code steps} steps.
     *
     * @param wall what {@code value} prescribes
     * @param value the prescribed wall value as a function of x, 0 upstream of the start
     * @param power p of the stretched coordinate
     */
    Solution march(Wall wall, DoubleUnaryOperator value, double start, double end, int steps, double power) {
        int n = eta.length - 1;
        double[] now = new double[n + 1];
        double[] before = new double[n + 1];
        double[] earlier = new double[n + 1];
        double[] xs = new double[steps + 1];
        double[] temperature = new double[steps + 1];
        double[] flux = new double[steps + 1];
        xs[0] = start;
        if (start == 0.0) {
            // At the leading edge x ∂T/∂x = 0: the similarity profile of a uniform wall, or no excess for a flux.
            step(wall, value.applyAsDouble(0.0), 0.0, new double[] {0, 0, 0}, before, earlier, now);
            temperature[0] = now[0];
            System.arraycopy(now, 0, before, 0, n + 1);
        }
        double dt = 1.0 / steps;
        for (int s = 1; s <= steps; s++) {
            double t = s * dt;
            double x = start + (end - start) * StrictMath.pow(t, power);
            double rate = power * (end - start) * StrictMath.pow(t, power - 1.0);
            double c = 1.0 / (rate * dt);
            double[] bdf = s == 1 ? new double[] {c, -c, 0.0} : new double[] {1.5 * c, -2.0 * c, 0.5 * c};
            double slope = step(wall, value.applyAsDouble(x), x, bdf, before, earlier, now);
            xs[s] = x;
            temperature[s] = now[0];
            flux[s] = -slope / StrictMath.sqrt(x);
            double[] spare = earlier;
            earlier = before;
            before = now;
            now = spare;
        }
        return new Solution(xs, temperature, flux);
    }

    /** One implicit step; dT/dx = bdf·(now, before, earlier). Returns T'(0). */
    private double step(
            Wall wall, double value, double x, double[] bdf, double[] before, double[] earlier, double[] now) {
        int n = eta.length - 1;
        double[] lower = new double[n];
        double[] diagonal = new double[n];
        double[] upper = new double[n];
        double[] right = new double[n];
        double h1 = eta[1] - eta[0];
        double third = h1 * h1 / 6.0 * prandtl * x * wallShear;
        double pastWall = bdf[1] * before[0] + bdf[2] * earlier[0];
        if (wall == Wall.TEMPERATURE) {
            diagonal[0] = 1.0;
            right[0] = value;
        } else {
            diagonal[0] = -1.0 / h1 - third * bdf[0];
            upper[0] = 1.0 / h1;
            right[0] = -value * StrictMath.sqrt(x) + third * pastWall;
        }
        for (int i = 1; i < n; i++) {
            double a = eta[i] - eta[i - 1];
            double b = eta[i + 1] - eta[i];
            double sum = a + b;
            double convection = 0.5 * stream[i];
            double along = x * velocity[i];
            lower[i] = 2.0 / (prandtl * a * sum) - convection * b / (a * sum);
            upper[i] = 2.0 / (prandtl * b * sum) + convection * a / (b * sum);
            diagonal[i] = -2.0 / (prandtl * a * b) + convection * (b - a) / (a * b) - along * bdf[0];
            right[i] = along * (bdf[1] * before[i] + bdf[2] * earlier[i]);
        }
        Tridiagonal.solve(lower, diagonal, upper, right, now, n);
        now[n] = 0.0;
        return (now[1] - now[0]) / h1 - third * (bdf[0] * now[0] + pastWall);
    }
}
