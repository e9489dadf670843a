package plateledger.safety;

import java.util.function.DoubleFunction;
import plateledger.fluid.FluidState;
import plateledger.fluid.MoistAir;
import plateledger.rig.Plate;

/**
 * Temperature a heated plate reaches when the flow stops and the power stays on.
 *
 * <pre>
 *   q = h (T − T_a) + ε σ (T⁴ − T_a⁴) + U_b (T − T_a)
 *   face up      Nu = 0.54 Ra^¼ (Ra &lt; 1e7), 0.15 Ra^⅓ above         on A/perimeter
 *   face down    Nu = 0.27 Ra^¼                                       on A/perimeter
 *   vertical     Nu = {0.825 + 0.387 Ra^⅙/[1 + (0.492/Pr)^(9/16)]^(8/27)}²   on the height
 *   Ra = g β (T − T_a) L³/(ν α), β = 2/(T + T_a), properties at ½ (T + T_a)
 * </pre>
 *
 * Correlations after Incropera and DeWitt, chapter 9 (from memory; stated for Ra 1e4–1e11, face down 1e5–1e10). The
 * surroundings are taken at the air's temperature.
 */
final class StillAir {
    static final String SOURCE =
            "energy balance; natural convection after Incropera and DeWitt, chapter 9 (from memory)";

    private static final double STEFAN_BOLTZMANN = 5.670374419e-8; // W/(m² K⁴), CODATA 2018, exact, cut
    private static final double GRAVITY = 9.80665; // m/s², standard
    private static final double HIGHEST_K = 3000.0;
    private static final double FILM_LIMIT_K = 500.0; // end of the property range; h hardly depends on it beyond

    private StillAir() {}

    /**
     * The face that is heated.
     *
     * @param lengthM heated length, m
     * @param widthM span, m
     * @param orientation how it lies
     * @param emissivity ε
     * @param backConductanceWPerM2K U_b, W/(m² K)
     */
    record Face(
            double lengthM,
            double widthM,
            Plate.Orientation orientation,
            double emissivity,
            double backConductanceWPerM2K) {
        static Face of(Plate plate) {
            return new Face(
                    plate.heatedEndM().value() - plate.heatedStartM().value(),
                    plate.widthM().value(),
                    plate.orientation(),
                    plate.emissivity().value(),
                    plate.backConductanceWPerM2K().value());
        }

        double areaM2() {
            return lengthM * widthM;
        }

        private double convectionLengthM() {
            return orientation == Plate.Orientation.VERTICAL ? lengthM : areaM2() / (2.0 * (lengthM + widthM));
        }
    }

    /** Dry air at a film temperature in K and about one atmosphere. */
    static FluidState air(double filmK) {
        return MoistAir.state(Math.min(filmK, FILM_LIMIT_K), 101325.0, 0.0);
    }

    /**
     * The temperature reached.
     *
     * @param fluxWPerM2 q, W/m², not negative
     * @param face the heated face
     * @param airK T_a, K
     * @param air properties at a film temperature in K
     * @return T, K
     */
    static double temperatureK(double fluxWPerM2, Face face, double airK, DoubleFunction<FluidState> air) {
        double low = airK;
        double high = HIGHEST_K;
        while (high - low > 1e-9) {
            double middle = 0.5 * (low + high);
            if (fluxOut(middle, face, airK, air) < fluxWPerM2) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return 0.5 * (low + high);
    }

    /** Flux that leaves at T, W/m²: also the largest flux that keeps T without flow. */
    static double fluxOut(double surfaceK, Face face, double airK, DoubleFunction<FluidState> air) {
        double diffK = surfaceK - airK;
        double radiation = face.emissivity()
                * STEFAN_BOLTZMANN
                * (surfaceK * surfaceK * surfaceK * surfaceK - airK * airK * airK * airK);
        return convection(surfaceK, face, airK, air) * diffK + radiation + face.backConductanceWPerM2K() * diffK;
    }

    /** h of natural convection, W/(m² K). */
    static double convection(double surfaceK, Face face, double airK, DoubleFunction<FluidState> air) {
        if (surfaceK <= airK) {
            return 0.0;
        }
        FluidState state = air.apply(0.5 * (surfaceK + airK));
        double length = face.convectionLengthM();
        double beta = 2.0 / (surfaceK + airK);
        double ra = GRAVITY
                * beta
                * (surfaceK - airK)
                * length
                * length
                * length
                / (state.kinematicViscosity() * state.diffusivity());
        double nu = switch (face.orientation()) {
            case FACE_UP -> ra < 1e7 ? 0.54 * Math.sqrt(Math.sqrt(ra)) : 0.15 * Math.cbrt(ra);
            case FACE_DOWN -> 0.27 * Math.sqrt(Math.sqrt(ra));
            case VERTICAL -> vertical(ra, state.prandtl());
        };
        return nu * state.conductivity() / length;
    }

    private static double vertical(double ra, double prandtl) {
        double root = 0.825
                + 0.387 * Math.pow(ra, 1.0 / 6.0) / Math.pow(1.0 + Math.pow(0.492 / prandtl, 9.0 / 16.0), 8.0 / 27.0);
        return root * root;
    }
}
