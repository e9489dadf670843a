package plateledger.demo.physics;

/**
 * Laminar convection of one plate grid as a matrix: wall flux per cell from wall temperature above T_aw per cell. The
 * flux is taken as constant in each cell, its temperature response at the cell centres is superposed from marched flux
 * steps, and the triangular matrix is inverted. It depends on the Prandtl number and the geometry only: two Prandtl
 * numbers are computed and interpolated between.
 */
public final class LaminarLayer {
    private static final double PRANDTL_LOW = 0.69;
    private static final double PRANDTL_HIGH = 0.73;

    private final double[][] low;
    private final double[][] high;

    /** The marched step responses, the same for all geometries: made once, shared. */
    public static final class Responses {
        private final FluxStepResponse low;
        private final FluxStepResponse high;

        /** Marches the responses for x/ξ up to {@code reach}. */
        public Responses(double reach) {
            BlasiusFlow flow = new BlasiusFlow();
            low = new FluxStepResponse(flow, PRANDTL_LOW, reach);
            high = new FluxStepResponse(flow, PRANDTL_HIGH, reach);
        }
    }

    /** The layer over a grid whose heated part starts at the first face (&gt; 0, the unheated length), m. */
    public LaminarLayer(Responses responses, double[] faces) {
        low = matrix(responses.low, faces);
        high = matrix(responses.high, faces);
    }

    /**
     * The convection matrix, W/(m² K).
     *
     * @param conductivity of the air, W/(m K)
     * @param unitReynolds U/ν, 1/m
     * @param prandtl Prandtl number
     */
    public double[][] matrix(double conductivity, double unitReynolds, double prandtl) {
        // Laminar convection goes nearly with Pr^(1/3): linear in that.
        double base = Math.cbrt(PRANDTL_LOW);
        double share = (Math.cbrt(prandtl) - base) / (Math.cbrt(PRANDTL_HIGH) - base);
        double scale = conductivity * Math.sqrt(unitReynolds);
        int n = low.length;
        double[][] out = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                out[i][j] = scale * (low[i][j] + share * (high[i][j] - low[i][j]));
            }
        }
        return out;
    }

    /** The matrix in units of k √(U/ν) for one Prandtl number. */
    static double[][] matrix(FluxStepResponse step, double[] faces) {
        return invertLower(response(step, faces));
    }

    /** Wall temperature at the cell centres for unit flux in each cell, in units of (1/k) √(ν/U). */
    static double[][] response(FluxStepResponse step, double[] faces) {
        int n = faces.length - 1;
        double[][] response = new double[n][n];
        for (int i = 0; i < n; i++) {
            double x = 0.5 * (faces[i] + faces[i + 1]);
            double left = Math.sqrt(faces[0]) * step.at(x / faces[0]);
            for (int j = 0; j <= i; j++) {
                double right = j == i ? 0.0 : Math.sqrt(faces[j + 1]) * step.at(x / faces[j + 1]);
                response[i][j] = left - right;
                left = right;
            }
        }
        return response;
    }

    private static double[][] invertLower(double[][] m) {
        int n = m.length;
        double[][] inverse = new double[n][n];
        for (int j = 0; j < n; j++) {
            for (int i = j; i < n; i++) {
                double sum = i == j ? 1.0 : 0.0;
                for (int k = j; k < i; k++) {
                    sum -= m[i][k] * inverse[k][j];
                }
                inverse[i][j] = sum / m[i][i];
            }
        }
        return inverse;
    }
}
