package plateledger.sensor;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.junit.jupiter.api.Test;
import plateledger.log.Series;
import plateledger.quantity.Stated;
import plateledger.rig.Instrument;

/** Hand-worked numbers and laws of the sensor conversions. */
final class ConversionTest {
    private static Instrument thermometer(List<Double> polynomial) {
        return new Instrument(
                "t",
                Instrument.SignalKind.TEMPERATURE,
                "",
                List.of("T1"),
                polynomial,
                300.0,
                Stated.standard(0.10, 0.05),
                Stated.standard(0.001, 0.0005),
                Stated.standard(-0.02, 0.03),
                Stated.exact(0.0),
                Stated.standard(0.0, 0.02),
                0.01,
                263.15,
                423.15,
                "",
                Optional.empty(),
                Optional.empty());
    }

    /** R = 320 K: X = 320 − 0.10 + 0.02 − 0.001 · 20 = 319.9 K, by hand. */
    @Test
    void instrumentEquationByHand() {
        assertEquals(319.9, InstrumentEquation.bestEstimate(thermometer(List.of()), 320.0), 1e-12);
        // R = 1 + 0.5 · 638 = 320 K
        assertEquals(319.9, InstrumentEquation.bestEstimate(thermometer(List.of(1.0, 0.5)), 638.0), 1e-12);
        // a₂: 2 + 3 · 4 + 0.5 · 16 = 22
        assertEquals(22.0, InstrumentEquation.polynomial(List.of(2.0, 3.0, 0.5), 4.0));
        // √(0.05² + 0.03² + (0.0005 · 20)² + 0.02² + 0.01²/12) = √0.003908333 K
        assertEquals(0.06251667, InstrumentEquation.standardUncertainty(thermometer(List.of()), 320.0), 1e-8);
    }

    /** Reverse flow and noise about zero keep their sign. */
    @Property(tries = 100)
    void pitotIsOdd(@ForAll @DoubleRange(min = 0.0, max = 3000.0) double dp) {
        assertEquals(-PitotTube.speed(dp, 1.2, 0.99), PitotTube.speed(-dp, 1.2, 0.99));
        double fast = PitotTube.compressibleSpeed(dp, 1e5, 1.2, 1.4, 0.99);
        assertEquals(-fast, PitotTube.compressibleSpeed(-dp, 1e5, 1.2, 1.4, 0.99));
        assertTrue(fast <= PitotTube.speed(dp, 1.2, 0.99) * (1.0 + 1e-12), "compressible above incompressible");
    }

    /** The equation of the probe is met by what comes back. */
    @Property(tries = 100)
    void airProbeMeetsItsEquation(
            @ForAll @DoubleRange(min = 270.0, max = 330.0) double probe,
            @ForAll @DoubleRange(min = 270.0, max = 330.0) double wall,
            @ForAll @DoubleRange(min = 0.0, max = 40.0) double speed,
            @ForAll @DoubleRange(min = 0.0, max = 0.2) @Scale(4) double f) {
        double stream = AirProbe.streamK(probe, wall, speed, 0.8, f, 1006.0);
        assertEquals(probe, stream + 0.8 * speed * speed / 2012.0 + f * (wall - stream), 1e-10);
    }

    /** A clock 95 s fast at its start that gains 1e-5: after 1 h of true time it shows 0.036 s more. */
    @Test
    void clockByHand() {
        Clock clock = Clock.of(1000.0, Stated.limits(95.0, 2.0), Stated.standard(1e-5, 1e-6));
        assertEquals(905.0, clock.trueTime(1000.0), 1e-12);
        assertEquals(4505.0, clock.trueTime(4600.036), 1e-9);
        assertEquals(4600.036, clock.loggerTime(4505.0), 1e-9);
        assertThrows(IllegalArgumentException.class, () -> new Clock(0.0, 0.0, -1.0));
    }

    /** Only samples that are valid in both channels at the same time count; the gap in I does not shift the pairs. */
    @Test
    void powerPairsByTimeAndValidity() {
        byte bad = Series.Flag.OVER_RANGE.code();
        Series volts = new Series(
                "V",
                "V",
                "p.csv",
                new double[] {0, 2, 4, 6, 8},
                new double[] {10, 20, Double.NaN, 40, 50},
                new byte[] {0, 0, bad, 0, 0},
                new int[] {2, 3, 4, 5, 6});
        Series amps = new Series(
                "I", "A", "p.csv", new double[] {0, 4, 6, 8}, new double[] {1, 3, 4, 5}, new byte[4], new int[] {
                    2, 4, 5, 6
                });
        Series watts = HeaterPower.series("P", volts, amps);
        assertArrayEquals(new double[] {0, 6, 8}, watts.timesS());
        assertArrayEquals(new double[] {10, 160, 250}, watts.values());
        assertArrayEquals(new int[] {2, 5, 6}, watts.lines());
        HeaterPower late = HeaterPower.over(volts, amps, 5.0, 9.0);
        assertEquals(2, late.samples());
        assertEquals(205.0, late.meanPower(), 1e-12);
        // R mean(I²) = 0.1 · (16 + 25)/2 = 2.05 W
        assertEquals(202.95, late.stripPower(0.1), 1e-12);
        HeaterPower none = HeaterPower.over(volts, amps, 100.0, 200.0);
        assertEquals(0, none.samples());
        assertTrue(Double.isNaN(none.meanPower()));
    }
}
