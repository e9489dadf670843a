package plateledger.demo.physics;

/**
 * Turbulent convection of one plate grid as a matrix, from the step kernel of a turbulent layer
 *
 * <pre>
 *   q(x) = h(x) { θ(x₀) K(x₀) + ∫ K(ξ) dθ },  K(ξ) = [1 − (ξ/x)^(9/10)]^(−1/9),  h(x) = C (k/x) Re_x^0.8 Pr^0.6
 * </pre>
 *
 * (Reynolds, Kays and Kline 1958, from memory), x and ξ counted from the virtual origin, θ piecewise linear between cell
 * centres, the integrals by Gauss quadrature with the singularity at ξ = x substituted away. This rig's own C is 4 %
 * above the 0.0287 commonly used.
 */
public final class TurbulentLayer {
    /** C of this rig: 1.04 × 0.0287, dimensionless. */
    public static final double COEFFICIENT = 1.04 * 0.0287;

    private static final double[] NODE = {
        -0.9061798459386640, -0.5384693101056831, 0.0, 0.5384693101056831, 0.9061798459386640
    };
    private static final double[] WEIGHT = {
        0.2369268850561891, 0.4786286704993665, 0.5688888888888889, 0.4786286704993665, 0.2369268850561891
    };

    private static final double LAMINAR_MOMENTUM = 2.0 * new BlasiusFlow().wallShear();

    private TurbulentLayer() {}

    /**
     * Virtual origin behind a trip, by equal momentum thickness at the trip: laminar 2 f''(0) x_t/√Re_t against
     * 0.037 (x_t − x_v) Re^(−1/5) (1/5-power layer, from memory).
     *
     * @param trip place of the trip from the leading edge, m
     * @param unitReynolds U/ν, 1/m
     * @return place of the virtual origin from the leading edge, m
     */
    public static double virtualOrigin(double trip, double unitReynolds) {
        double laminar = LAMINAR_MOMENTUM * Math.sqrt(trip / unitReynolds);
        double run = 0.0;
        double high = 10.0 * trip;
        double low = 0.0;
        for (int i = 0; i < 60; i++) {
            run = 0.5 * (low + high);
            double turbulent = 0.037 * run * Math.pow(unitReynolds * run, -0.2);
            if (turbulent < laminar) {
                low = run;
            } else {
                high = run;
            }
        }
        return trip - run;
    }

    /**
     * The convection matrix, W/(m² K).
     *
     * @param faces cell faces from the leading edge, m
     * @param origin virtual origin, m from the leading edge, below the first face
     * @param conductivity of the air, W/(m K)
     * @param unitReynolds U/ν, 1/m
     * @param prandtl Prandtl number
     */
    public static double[][] matrix(
            double[] faces, double origin, double conductivity, double unitReynolds, double prandtl) {
        int n = faces.length - 1;
        double[] centre = new double[n];
        for (int i = 0; i < n; i++) {
            centre[i] = 0.5 * (faces[i] + faces[i + 1]) - origin;
        }
        double start = faces[0] - origin;
        double[][] out = new double[n][n];
        for (int i = 0; i < n; i++) {
            double x = centre[i];
            double h = COEFFICIENT * conductivity / x * Math.pow(unitReynolds * x, 0.8) * Math.pow(prandtl, 0.6);
            out[i][0] += h * kernel(start, x);
            for (int j = 1; j <= i; j++) {
                double a = centre[j - 1];
                double b = centre[j];
                double mean = (j == i ? lastMean(a, x) : mean(a, b, x)) * h;
                out[i][j] += mean;
                out[i][j - 1] -= mean;
            }
        }
        return out;
    }

    private static double kernel(double from, double x) {
        return Math.pow(1.0 - Math.pow(from / x, 0.9), -1.0 / 9.0);
    }

    private static double mean(double a, double b, double x) {
        double sum = 0.0;
        for (int g = 0; g < NODE.length; g++) {
            sum += 0.5 * WEIGHT[g] * kernel(0.5 * (a + b) + 0.5 * (b - a) * NODE[g], x);
        }
        return sum;
    }

    /** Mean over a..x with ξ = x − (x − a) s^(9/8), which makes the integrand smooth at ξ = x. */
    private static double lastMean(double a, double x) {
        double sum = 0.0;
        for (int g = 0; g < NODE.length; g++) {
            double s = 0.5 + 0.5 * NODE[g];
            double root = Math.pow(s, 0.125);
            sum += 0.5 * WEIGHT[g] * 1.125 * root * kernel(x - (x - a) * s * root, x);
        }
        return sum;
    }
}
