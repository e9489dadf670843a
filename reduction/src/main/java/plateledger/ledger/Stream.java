package plateledger.ledger;

import plateledger.fluid.FluidState;
import plateledger.fluid.MoistAir;
import plateledger.ledger.RunLayout.In;

/**
 * The fluid of one evaluation: formulation values times the campaign's factors, at a few temperatures chosen beforehand
 * and interpolated between them (quadratic over a few tens of kelvin: below 1e-6 of any property).
 */
final class Stream {
    private final double t0;
    private final double t1;
    private final double t2;
    private final FluidState s0;
    private final FluidState s1;
    private final FluidState s2;
    private final double density;
    private final double viscosity;
    private final double conductivity;
    private final double heatCapacity;

    Stream(double[] in, RunLayout layout, double lowK, double highK) {
        double p = in[layout.at(In.PRESSURE)];
        double xv = in[layout.at(In.VAPOUR_FRACTION)];
        t0 = lowK;
        t1 = 0.5 * (lowK + highK);
        t2 = highK;
        s0 = MoistAir.state(t0, p, xv);
        s1 = MoistAir.state(t1, p, xv);
        s2 = MoistAir.state(t2, p, xv);
        density = in[layout.at(In.DENSITY_FACTOR)];
        viscosity = in[layout.at(In.VISCOSITY_FACTOR)];
        conductivity = in[layout.at(In.CONDUCTIVITY_FACTOR)];
        heatCapacity = in[layout.at(In.HEAT_CAPACITY_FACTOR)];
    }

    private double at(double t, double a, double b, double c) {
        return a * (t - t1) * (t - t2) / ((t0 - t1) * (t0 - t2))
                + b * (t - t0) * (t - t2) / ((t1 - t0) * (t1 - t2))
                + c * (t - t0) * (t - t1) / ((t2 - t0) * (t2 - t1));
    }

    /** Conductivity, W/(m K). */
    double conductivity(double t) {
        return conductivity * at(t, s0.conductivity(), s1.conductivity(), s2.conductivity());
    }

    /** Kinematic viscosity, m²/s. */
    double kinematicViscosity(double t) {
        return viscosity
                * at(t, s0.viscosity(), s1.viscosity(), s2.viscosity())
                / (density * at(t, s0.density(), s1.density(), s2.density()));
    }

    /** Heat capacity, J/(kg K). */
    double heatCapacity(double t) {
        return heatCapacity * at(t, s0.heatCapacity(), s1.heatCapacity(), s2.heatCapacity());
    }

    /** Prandtl number. */
    double prandtl(double t) {
        return viscosity * at(t, s0.viscosity(), s1.viscosity(), s2.viscosity()) * heatCapacity(t) / conductivity(t);
    }
}
