package plateledger.uncertainty;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import plateledger.validation.ValidationRecorder;

/**
 * Random and systematic parts with a shared reference and a shared tape, in the form of ASME PTC 19.1. A worked case of
 * our own; expected figures computed in Python 3.11 with NumPy from analytic sensitivities to 1e-7 relative. The perturbation
 * is made with a thousandth of each source, so that its own third-order term stays below that.
 */
@Tag("validation")
final class SharedSourceCaseTest {
    private static final double[] BEST = {40.0, 3.0, 6.0, 0.06, 62.0, 22.0, 0.30, 0.0268};

    private static double nusselt(double[] x) {
        return (x[0] * x[1] - x[2]) * x[6] / (x[3] * (x[4] - x[5]) * x[7]);
    }

    private static final double SHRINK = 1e-3;

    private static Input unit(String name) {
        return new Input(name, 0.0, 1.0, Distribution.NORMAL, Double.POSITIVE_INFINITY, Scope.RIG);
    }

    private static double u(double[][] amplitudes) {
        InputList.Builder builder = new InputList.Builder();
        for (int s = 0; s < amplitudes.length; s++) {
            builder.add(unit("z" + s));
        }
        return CompositePropagation.ofFunction(
                                (z, out) -> {
                                    double[] x = BEST.clone();
                                    for (int s = 0; s < z.length; s++) {
                                        for (int i = 0; i < x.length; i++) {
                                            x[i] += SHRINK * amplitudes[s][i] * z[s];
                                        }
                                    }
                                    out[0] = nusselt(x);
                                },
                                1,
                                builder.build())
                        .combined(0, 0)
                        .u()
                / SHRINK;
    }

    private static double[] source(double... pairs) {
        double[] amplitudes = new double[BEST.length];
        for (int k = 0; k < pairs.length; k += 2) {
            amplitudes[(int) pairs[k]] = pairs[k + 1];
        }
        return amplitudes;
    }

    @Test
    void sharedSourcesCancelWhereTheyShould() {
        try (ValidationRecorder check = ValidationRecorder.of(
                getClass(),
                "Uncertainty",
                "shared reference and shared tape",
                "form of ASME PTC 19.1; own case, computed in Python")) {
            double[][] systematic = {
                source(0, 0.04),
                source(1, 0.006),
                source(2, 0.60),
                source(4, 0.10),
                source(5, 0.10),
                source(4, 0.20, 5, 0.20), // common reference of both temperatures
                source(3, 0.06 * 0.002, 6, 0.30 * 0.002), // one tape for length and area
                source(3, 0.06 * 0.0015),
                source(7, 0.000268)
            };
            double[][] random = {source(0, 0.01), source(1, 0.002), source(2, 0.10), source(4, 0.03), source(5, 0.05)};
            check.relative(531.7164179, nusselt(BEST), 1e-7, "nusselt(BEST)");
            double b = u(systematic);
            double s = u(random);
            check.relative(6.468412715, b, 1e-7, "systematic");
            check.relative(0.9885034175, s, 1e-7, "random");
            check.relative(6.543508391, Math.hypot(b, s), 1e-7, "combined");
            check.relative(13.08701678, 2.0 * Math.hypot(b, s), 1e-7, "expanded");
        }
    }

    @Test
    void leavingTheSharingOutWidensIt() {
        double[][] asIfApart = {
            source(0, 0.04),
            source(1, 0.006),
            source(2, 0.60),
            source(4, 0.10),
            source(5, 0.10),
            source(4, 0.20),
            source(5, 0.20),
            source(3, 0.06 * 0.002),
            source(6, 0.30 * 0.002),
            source(3, 0.06 * 0.0015),
            source(7, 0.000268)
        };
        assertEquals(7.631399590, u(asIfApart), 1e-6);
    }
}
