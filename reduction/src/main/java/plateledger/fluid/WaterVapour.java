package plateledger.fluid;

/**
 * The vapour part of the mixture: virial coefficients with itself and with air, ideal-gas heat capacity, viscosity and
 * conductivity at vanishing density.
 */
final class WaterVapour {
    /** Molar mass, kg/mol, IAPWS-95. */
    static final double MOLAR_MASS = 18.015268e-3;

    private static final double T_CRITICAL = 647.096; // K, IAPWS-95
    private static final double GAS_CONSTANT = 461.51805; // J/(kg K), IAPWS-95

    // Ideal part of IAPWS-95 (R6-95): n and γ of the five Einstein terms.
    private static final double[] EINSTEIN_N = {0.012436, 0.97315, 1.27950, 0.96956, 0.24873};
    private static final double[] EINSTEIN_GAMMA = {1.28728967, 3.53734222, 7.74073708, 9.24437796, 27.5075105};

    // Cross virial coefficient with air, 1e-6 m³/mol, terms a (T/100 K)^b: IAPWS G9-12.
    private static final double[] CROSS_FACTOR = {66.5687, -238.834, -176.755};
    private static final double[] CROSS_EXPONENT = {-0.237, -1.048, -3.183};

    private WaterVapour() {}

    /** Cross virial coefficient with air, B_av. */
    static Virial crossVirial(double t) {
        double ln = Math.log(t / 100.0);
        double value = 0.0;
        double curvature = 0.0;
        for (int i = 0; i < CROSS_FACTOR.length; i++) {
            double n = CROSS_EXPONENT[i];
            double term = CROSS_FACTOR[i] * 1e-6 * Math.exp(n * ln);
            value += term;
            curvature += n * (n - 1.0) * term;
        }
        return new Virial(value, curvature);
    }

    /**
     * Second virial coefficient with itself, B_vv: a compact fit to IAPWS-95 over 273.16–523 K, within 0.07 % of it (and
     * within 3e-4 of the values printed in IAPWS G9-12 at 300 and 400 K).
     */
    static Virial virial(double t) {
        double s = t / 100.0;
        double r = 1.0 / s;
        double value = -1e-3 * Math.exp(2.47851 + r * (-20.4446 + r * (69.7687 - r * 45.2846)) - 0.518461 * s);
        // First and second derivative of the exponent with respect to T/100 K.
        double first = r * r * (20.4446 + r * (-2.0 * 69.7687 + r * 3.0 * 45.2846)) - 0.518461;
        double second = r * r * r * (-2.0 * 20.4446 + r * (6.0 * 69.7687 - r * 12.0 * 45.2846));
        return new Virial(value, s * s * value * (first * first + second));
    }

    /** Ideal-gas heat capacity, J/(kg K), ideal part of IAPWS-95. */
    static double idealHeatCapacity(double t) {
        double tau = T_CRITICAL / t;
        double sum = 4.00632;
        for (int i = 0; i < EINSTEIN_N.length; i++) {
            sum += EINSTEIN_N[i] * DryAir.einstein(EINSTEIN_GAMMA[i] * tau);
        }
        return sum * GAS_CONSTANT;
    }

    /** Viscosity at vanishing density, Pa s: IAPWS R12-08, eq. (11). */
    static double viscosity(double t) {
        double s = t / T_CRITICAL;
        return 1e-4 * Math.sqrt(s) / (1.67752 + (2.20462 + (0.6366564 - 0.241605 / s) / s) / s);
    }

    /** Conductivity at vanishing density, W/(m K): IAPWS R15-11, eq. (16). */
    static double conductivity(double t) {
        double s = t / T_CRITICAL;
        return 1e-3
                * Math.sqrt(s)
                / (2.443221e-3 + (1.323095e-2 + (6.770357e-3 + (-3.454586e-3 + 4.096266e-4 / s) / s) / s) / s);
    }
}
