package plateledger.demo.physics;

/**
 * Wall temperature downstream of a step of wall heat flux in a laminar layer, from one march: the response to a unit
 * flux from ξ on is √ξ W(x/ξ) in units of (1/k) √(ν/U), by the scaling of the equations.
 */
final class FluxStepResponse {
    private static final int POINTS = 300;
    private static final int STEPS = 600;

    private final double reach;
    private final double[] table;

    /** The response for one Prandtl number and x/ξ up to {@code reach}. */
    FluxStepResponse(BlasiusFlow flow, double prandtl, double reach) {
        this.reach = reach;
        // Two grids and extrapolation of the second-order error.
        double[] coarse = new EnergyMarch(flow, prandtl, POINTS / 2)
                .march(EnergyMarch.Wall.FLUX, x -> 1.0, 1.0, reach, STEPS / 2, 3.0)
                .temperature();
        double[] fine = new EnergyMarch(flow, prandtl, POINTS)
                .march(EnergyMarch.Wall.FLUX, x -> 1.0, 1.0, reach, STEPS, 3.0)
                .temperature();
        table = new double[coarse.length];
        for (int i = 0; i < table.length; i++) {
            table[i] = (4.0 * fine[2 * i] - coarse[i]) / 3.0;
        }
    }

    /** W(x/ξ); 0 upstream of the step. */
    double at(double ratio) {
        if (ratio <= 1.0) {
            return 0.0;
        }
        if (ratio > reach) {
            throw new IllegalArgumentException("x/xi must not exceed " + reach + ", found " + ratio);
        }
        int n = table.length - 1;
        double place = StrictMath.cbrt((ratio - 1.0) / (reach - 1.0)) * n;
        int i = Math.max(1, Math.min(n - 2, (int) place));
        double s = place - i;
        return -s * (s - 1.0) * (s - 2.0) / 6.0 * table[i - 1]
                + (s + 1.0) * (s - 1.0) * (s - 2.0) / 2.0 * table[i]
                - (s + 1.0) * s * (s - 2.0) / 2.0 * table[i + 1]
                + (s + 1.0) * s * (s - 1.0) / 6.0 * table[i + 2];
    }
}
