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

    /** Cross virial coefficient B_aw, m³/mol. */
    static double crossVirial(double t) {
        double ln = Math.log(t / 100.0);
        double sum = 0.0;
        for (int i = 0; i < CROSS_FACTOR.length; i++) {
            sum += CROSS_FACTOR[i] * Math.exp(CROSS_EXPONENT[i] * ln);
        }
        return sum * 1e-6;
    }

    /** T² d²B_aw/dT², m³/mol. */
    static double crossVirialCurvature(double t) {
        double ln = Math.log(t / 100.0);
        double sum = 0.0;
        for (int i = 0; i < CROSS_FACTOR.length; i++) {
            double n = CROSS_EXPONENT[i];
            sum += n * (n - 1.0) * CROSS_FACTOR[i] * Math.exp(n * ln);
        }
        return sum * 1e-6;
    }

    /**
     * Second virial coefficient B_vv, m³/mol: a compact fit to IAPWS-95 over 273.16–523 K, within 0.07 % of it (and within
     * 3e-4 of the values printed in IAPWS G9-12 at 300 and 400 K).
     */
    static double secondVirial(double t) {
        return -1e-3 * Math.exp(exponent(t / 100.0));
    }

    /** T² d²B_vv/dT², m³/mol. */
    static double secondVirialCurvature(double t) {
        double s = t / 100.0;
        double first = 20.4446 / (s * s) - 2.0 * 69.7687 / (s * s * s) + 3.0 * 45.2846 / (s * s * s * s) - 0.518461;
        double second =
                -2.0 * 20.4446 / (s * s * s) + 6.0 * 69.7687 / (s * s * s * s) - 12.0 * 45.2846 / (s * s * s * s * s);
        return s * s * secondVirial(t) * (first * first + second);
    }

    private static double exponent(double s) {
        return 2.47851 - 20.4446 / s + 69.7687 / (s * s) - 45.2846 / (s * s * s) - 0.518461 * s;
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
