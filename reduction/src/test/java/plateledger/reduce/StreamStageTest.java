package plateledger.reduce;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import plateledger.campaign.RunType;
import plateledger.finding.RefusedException;
import plateledger.rig.Plate;
import plateledger.rig.Rig;

/** Speed and temperature of the stream by hand, on the rig of the example: blockage 1.5 %, r 0.80, f 0.010. */
final class StreamStageTest {
    private static final Map<String, Double> READINGS =
            Map.of("PD", 80.0, "VA", 2.0, "TA1", 300.0, "TW1", 309.0, "TW2", 311.0, "PB", 100_000.0, "RH", 0.0);

    private final Rig rig = rig();
    private final InputBook book = new InputBook(rig);
    private final InputBook.TunnelIndex tunnel = book.tunnel(300.0, 100_000.0, 0.0);

    private static Rig rig() {
        try {
            return ExampleRig.campaign().rig();
        } catch (RefusedException e) {
            throw new AssertionError("the example is good", e);
        }
    }

    private StreamStage stage(double set, Map<String, Double> readings, List<RunMeans> zeros) {
        RunMeans means = ExampleRig.means(ExampleRig.run("R01", RunType.HEATED, ExampleRig.DAY, set), 1000.0, readings);
        Plate plate = rig.plates().get(0);
        RunIndex run = new RunIndex(book, rig, plate, means);
        return StreamStage.choose(book, rig, run, tunnel, zeros).orElseThrow();
    }

    private StreamStage.State state(StreamStage stage) {
        return stage.at(Reads.of(book.build().values()));
    }

    private static RunMeans zero(String id, String day, double middleS, Map<String, Double> readings) {
        return ExampleRig.means(ExampleRig.run(id, RunType.FAN_OFF_ZERO, day, Double.NaN), middleS, readings);
    }

    /**
     * Zeros of 2 Pa at 800 s and 6 Pa at 2000 s make 2 + 4·200/1200 = 2.666 7 Pa at 1000 s, so 77.333 3 Pa. T_∞ about
     * 299.84 K, dry air as an ideal gas ρ = 100 000/(287.05·299.84) = 1.161 85 kg/m³ (its compressibility is 3e-4):
     * √(2·77.333 3/1.161 85) = 11.537 7, with 1.5 % blockage 11.710 8 m/s. c_p 1006.5 J/(kg K):
     * T_∞ = (300 − 0.8·11.710 8²/2013 − 0.01·310)/0.99 = 299.843 9 K.
     */
    @Test
    void pitotTubeAgainstItsZero() {
        StreamStage stage = stage(
                12.0,
                READINGS,
                List.of(
                        zero("Z1", ExampleRig.DAY, 800.0, Map.of("PD", 2.0)),
                        zero("Z2", ExampleRig.DAY, 2000.0, Map.of("PD", 6.0))));
        assertTrue(stage.zeroed());
        StreamStage.State state = state(stage);
        assertEquals(11.7108, state.speed(), 4e-4 * 11.7108);
        assertEquals(299.8439, state.airK(), 2e-4);
        assertEquals(100_000.0, state.pressure(), 0.0);
        assertEquals(0.0, state.vapourFraction(), 0.0);
    }

    /** Without a zero: 80 Pa, √(2·80/1.161 85)·1.015 = 11.911 m/s; and a zero of another day is none. */
    @Test
    void withoutAZeroOfTheDay() {
        StreamStage stage = stage(12.0, READINGS, List.of(zero("Z1", "2026-03-11", 800.0, Map.of("PD", 50.0))));
        assertFalse(stage.zeroed());
        assertEquals(11.911, state(stage).speed(), 4e-4 * 11.911);
    }

    /** One zero stands for the whole day; the nearest before wins over an earlier one. */
    @Test
    void theNearestZerosAreUsed() {
        StreamStage before = stage(
                3.0,
                READINGS,
                List.of(
                        zero("Z1", ExampleRig.DAY, 100.0, Map.of("VA", 0.5)),
                        zero("Z2", ExampleRig.DAY, 900.0, Map.of("VA", 0.05))));
        assertEquals(1.95 * 1.015, state(before).speed(), 1e-9);
        StreamStage after = stage(3.0, READINGS, List.of(zero("Z3", ExampleRig.DAY, 5000.0, Map.of("VA", 0.1))));
        assertEquals(1.90 * 1.015, state(after).speed(), 1e-9);
        StreamStage other = stage(3.0, READINGS, List.of(zero("Z4", ExampleRig.DAY, 5000.0, Map.of("PD", 0.1))));
        assertFalse(other.zeroed());
    }

    /** Anemometer below 5 m/s, 2·1.015 = 2.03; the pitot tube from 5 m/s on; whichever was read where one is missing. */
    @Test
    void theMeterIsChosenBySetSpeed() {
        assertEquals(2.03, state(stage(3.0, READINGS, List.of())).speed(), 1e-9);
        assertTrue(state(stage(5.0, READINGS, List.of())).speed() > 11.0);
        Map<String, Double> noPitot = ExampleRig.without(READINGS, List.of("PD"));
        assertEquals(2.03, state(stage(12.0, noPitot, List.of())).speed(), 1e-9);
        assertTrue(state(stage(Double.NaN, READINGS, List.of())).speed() > 11.0);
    }

    /** RH 50 % at 300 K: saturation pressure 3536.59 Pa (IAPWS-IF97 verification value) and 100 kPa; enhancement is 0.4 %. */
    @Test
    void waterContentFromTheHumidity() {
        StreamStage stage = stage(3.0, ExampleRig.with(READINGS, Map.of("RH", 0.5)), List.of());
        double ideal = 0.5 * 3536.59 / 100_000.0;
        assertEquals(ideal, state(stage).vapourFraction(), 0.006 * ideal);
    }
}
