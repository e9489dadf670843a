package plateledger.fluid;

/**
 * The dry part of the mixture: second virial coefficient and ideal-gas heat capacity of the equation of state of Lemmon,
 * Jacobsen, Penoncello and Friend, J. Phys. Chem. Ref. Data 29 (2000) 331 (the virial form is its low-density limit: no
 * new fit), and viscosity and conductivity of Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21.
 *
 * <p>The critical enhancement of the conductivity is left out: at 200–500 K and 50–200 kPa it is below 1.4e-5 of k.
 */
final class DryAir {
    /** Molar mass for mass units, kg/mol: Picard, Davis, Gläser, Fujii, Metrologia 45 (2008) 149 (CIPM-2007). */
    static final double MOLAR_MASS = 28.96546e-3;

    // Maxcondentherm, the reducing point of the 2000 equation.
    private static final double T_REDUCING = 132.6312; // K
    private static final double RHO_REDUCING = 10447.7; // mol/m³

    // Terms n τ^t of the residual Helmholtz energy that are linear in δ (i = 1, 2, 3, 11, 15, 18 of table 13).
    private static final double[] B_FACTOR = {
        0.118160747229, 0.713116392079, -1.61824192067, -0.101365037912, -0.146629609713, 0.0148287891978
    };
    private static final double[] B_EXPONENT = {0.0, 0.33, 1.01, 1.6, 3.6, 3.5};

    // Viscosity: collision integral and residual terms, tables I and II of Lemmon and Jacobsen.
    private static final double VISCOSITY_MOLAR_MASS = 28.9586; // g/mol, as in the 2004 formula
    private static final double[] OMEGA = {0.431, -0.4623, 0.08406, 0.005341, -0.00331};
    private static final Residual[] VISCOSITY = {
        new Residual(10.72, 0.2, 1, 0),
        new Residual(1.122, 0.05, 4, 0),
        new Residual(0.002019, 2.4, 9, 0),
        new Residual(-8.876, 0.6, 1, 1),
        new Residual(-0.02916, 3.6, 8, 1),
    };
    private static final Residual[] CONDUCTIVITY = {
        new Residual(8.743, 0.1, 1, 0),
        new Residual(14.76, 0.0, 2, 0),
        new Residual(-16.62, 0.5, 3, 2),
        new Residual(3.793, 2.7, 7, 2),
        new Residual(-6.142, 0.3, 7, 2),
        new Residual(-0.3778, 1.3, 11, 2),
    };

    private DryAir() {}

    /** One term N τ^t δ^d e^(−δ^l), the exponential being 1 for l = 0. */
    private record Residual(double factor, double t, int d, int l) {
        double value(double lnTau, double delta) {
            double term = factor * power(delta, d);
            // High powers of δ vanish at the densities of a wind tunnel: 1e-10 µPa s or mW/(m K) is 1e-11 of the
            // result.
            if (Math.abs(term) < 1e-10) {
                return 0.0;
            }
            if (t != 0.0) {
                term *= Math.exp(t * lnTau);
            }
            return l == 0 ? term : term * Math.exp(-power(delta, l));
        }
    }

    /** Second virial coefficient of air with itself at T in K. */
    static Virial virial(double t) {
        double lnTau = Math.log(T_REDUCING / t);
        double value = 0.0;
        double curvature = 0.0;
        for (int i = 0; i < B_FACTOR.length; i++) {
            double m = B_EXPONENT[i];
            double term = B_FACTOR[i] * Math.exp(m * lnTau);
            value += term;
            curvature += m * (m + 1.0) * term;
        }
        return new Virial(value / RHO_REDUCING, curvature / RHO_REDUCING);
    }

    /** Ideal-gas molar heat capacity ÷ R, the form of the 2000 paper. */
    static double idealHeatCapacityOverR(double t) {
        double w = 11580.4 / t;
        double ew = Math.exp(-w);
        double denominator = 1.0 + 2.0 / 3.0 * ew;
        return 3.490888032
                + t * (2.395525583e-6 + t * (7.172111248e-9 - t * 3.115413101e-13))
                + 0.223806688 / (t * Math.sqrt(t))
                + 0.791309509 * einstein(3364.011 / t)
                + 0.212236768 * einstein(2242.45 / t)
                + 0.197938904 * (2.0 / 3.0) * w * w * ew / (denominator * denominator);
    }

    /** u² e^u/(e^u − 1)². */
    static double einstein(double u) {
        double e = Math.exp(-u);
        double d = 1.0 - e;
        return u * u * e / (d * d);
    }

    /** Viscosity, Pa s, at T in K and molar density in mol/m³. */
    static double viscosity(double t, double molarDensity) {
        return (diluteViscosity(t) + residual(VISCOSITY, t, molarDensity)) * 1e-6;
    }

    /** Conductivity without the critical enhancement, W/(m K), at T in K and molar density in mol/m³. */
    static double conductivity(double t, double molarDensity) {
        double lnTau = Math.log(T_REDUCING / t);
        double dilute = 1.308 * diluteViscosity(t) + 1.405 * Math.exp(-1.1 * lnTau) - 1.036 * Math.exp(-0.3 * lnTau);
        return (dilute + residual(CONDUCTIVITY, t, molarDensity)) * 1e-3;
    }

    /** η⁰, µPa s. */
    private static double diluteViscosity(double t) {
        double lnReduced = Math.log(t / 103.3); // ε/k of air, K
        double lnOmega = 0.0;
        for (int i = OMEGA.length - 1; i >= 0; i--) {
            lnOmega = lnOmega * lnReduced + OMEGA[i];
        }
        double sigma = 0.360; // nm
        return 0.0266958 * Math.sqrt(VISCOSITY_MOLAR_MASS * t) / (sigma * sigma * Math.exp(lnOmega));
    }

    private static double residual(Residual[] terms, double t, double molarDensity) {
        double lnTau = Math.log(T_REDUCING / t);
        double delta = molarDensity / RHO_REDUCING;
        double sum = 0.0;
        for (Residual term : terms) {
            sum += term.value(lnTau, delta);
        }
        return sum;
    }

    private static double power(double base, int exponent) {
        double result = 1.0;
        for (int i = 0; i < exponent; i++) {
            result *= base;
        }
        return result;
    }
}
