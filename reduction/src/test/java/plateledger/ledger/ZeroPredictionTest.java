package plateledger.ledger;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import plateledger.ledger.RunLayout.In;
import plateledger.rig.Plate;

/** What an unheated plate should read, by hand. */
final class ZeroPredictionTest {
    private static final double SPEED = 5.0;
    /** 295.15 K + Pr^½ U²/(2 c_p), Pr 0.71, c_p 1012 J/(kg K) for air of 1 % water. */
    private static final double ADIABATIC_WALL_K = 295.15 + Math.sqrt(0.71) * SPEED * SPEED / (2.0 * 1012.0);

    private final Plate plate = TestPlates.plate(Plate.SmoothShape.BOUNDARY_LAYER);
    private final RunLayout l = RunModel.layout(plate);

    /** An unheated plate all of whose surroundings are at the adiabatic wall temperature. */
    private double[] inputs() {
        double[] in = TestPlates.inputs(plate, SPEED, 0.0);
        for (int j = 0; j < l.strips(); j++) {
            in[l.power(j)] = 0.0;
            in[l.lead(j)] = 0.0;
        }
        in[l.at(In.DRIFT)] = 0.0;
        for (In t : new In[] {
            In.WALL_TEMPERATURE, In.PLENUM_TEMPERATURE, In.FRAME_TEMPERATURE, In.NOSE_TEMPERATURE, In.TAIL_TEMPERATURE
        }) {
            in[l.at(t)] = ADIABATIC_WALL_K;
        }
        return in;
    }

    private double[] predict(double[] in, double hFactor) {
        double[] sigma = new double[l.junctions()];
        Arrays.fill(sigma, 0.02);
        RunSetting setting = new RunSetting(plate, RunSetting.Flow.LAMINAR, Optional.empty(), true, true, true, sigma);
        double[] junctions = new double[l.junctions()];
        ZeroPrediction.configure(setting, in).evaluate(in, hFactor, junctions);
        return junctions;
    }

    @Test
    void withoutDifferencesEveryJunctionIsAtTheAdiabaticWall() {
        for (double factor : new double[] {0.5, 1.0, 2.0}) {
            for (double junction : predict(inputs(), factor)) {
                assertEquals(ADIABATIC_WALL_K, junction, 2e-4); // 2 % of the recovery: Pr and c_p by hand
            }
        }
    }

    /**
     * Walls 1 K warmer: h_r/(h + h_r + U_b) with h_r = 4·0.97·0.95·σ·295.65³ and h of a laminar layer with 100 mm unheated,
     * 0.332 Re^½ Pr^⅓ [1 − (0.1/x)^¾]^−⅓ k/x; air at 22 °C and 98 kPa: ν 1.58e-5 m²/s, k 0.0259 W/(m K), Pr 0.71 (common
     * handbook values, 1 %). Stations well inside, where conduction along the sheet and from the edges hardly acts.
     */
    @Test
    void warmerWallsShiftTheJunctions() {
        double[] in = inputs();
        double[] without = predict(in, 1.0);
        in[l.at(In.WALL_TEMPERATURE)] += 1.0;
        double[] with = predict(in, 1.0);
        double radiation = 4.0 * 0.97 * 0.95 * 5.670374419e-8 * Math.pow(295.65, 3);
        int checked = 0;
        for (int p = 0; p < 16; p++) {
            double x = plate.thermocouples().get(p).xM().value();
            if (x > 0.2 && x < 0.42) {
                double h = 0.332
                        * Math.sqrt(SPEED * x / 1.58e-5)
                        * Math.cbrt(0.71)
                        / Math.cbrt(1.0 - Math.pow(0.1 / x, 0.75))
                        * 0.0259
                        / x;
                double byHand = 0.998 * radiation / (h + radiation + 0.46); // the stem sees the plenum: 0.2 %
                assertEquals(byHand, with[p] - without[p], 0.015 * byHand, "x " + x);
                checked++;
            }
        }
        assertEquals(9, checked);
    }

    /** Near the edge the frame, which stayed, holds the sheet: the shift must be smaller there than on the centre line. */
    @Test
    void theFrameHoldsTheEdge() {
        double[] in = inputs();
        double[] without = predict(in, 1.0);
        in[l.at(In.WALL_TEMPERATURE)] += 1.0;
        double[] with = predict(in, 1.0);
        double centre = with[14] - without[14]; // x = 462.5 mm
        double nearEdge = with[19] - without[19]; // x = 475 mm, z = −140 mm
        assertTrue(nearEdge > 0.3 * centre && nearEdge < 0.95 * centre, nearEdge + " K against " + centre + " K");
    }

    /** Half the h lets the walls act more, the double less: it must stand for not knowing h. */
    @Test
    void theFactorScalesH() {
        double[] in = inputs();
        in[l.at(In.WALL_TEMPERATURE)] += 1.0;
        double radiation = 4.0 * 0.97 * 0.95 * 5.670374419e-8 * Math.pow(295.65, 3);
        double[] one = predict(in, 1.0);
        double[] two = predict(in, 2.0);
        double shift = (one[9] - ADIABATIC_WALL_K) / 0.998;
        double h = radiation / shift - radiation - 0.46; // what h the first prediction stands for
        double byHand = 0.998 * radiation / (2.0 * h + radiation + 0.46);
        assertEquals(byHand, two[9] - ADIABATIC_WALL_K, 0.01 * byHand);
    }
}
