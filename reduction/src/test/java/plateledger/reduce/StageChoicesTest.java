package plateledger.reduce;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import plateledger.log.Series;
import plateledger.quantity.Stated;
import plateledger.rig.Surroundings;

final class StageChoicesTest {
    private static Surroundings.SpeedMeter meter(double from, double to) {
        return new Surroundings.SpeedMeter("U", Surroundings.SpeedPrinciple.PITOT, Stated.exact(1.0), from, to);
    }

    /** At the top of the last range its own meter is nearest, not the first of the list. */
    @Test
    void aSpeedAtTheEndOfARangeStaysWithItsMeter() {
        assertTrue(StreamStage.away(meter(5.0, 20.0), 20.0) < StreamStage.away(meter(0.0, 5.0), 20.0));
        assertTrue(StreamStage.away(meter(5.0, 20.0), 5.0) < StreamStage.away(meter(0.0, 5.0), 5.0));
        assertEquals(2.0, StreamStage.away(meter(5.0, 20.0), 22.0), 0.0);
        assertEquals(3.0, StreamStage.away(meter(5.0, 20.0), 2.0), 0.0);
    }

    @Test
    void theShareOfUnusableSamplesIsThatOfTheWindow() {
        byte valid = Series.Flag.VALID.code();
        byte spike = Series.Flag.SPIKE.code();
        Series series = new Series(
                "T01",
                "K",
                "a.txt",
                new double[] {0, 1, 2, 3, 4},
                new double[5],
                new byte[] {spike, valid, spike, valid, valid},
                new int[] {1, 2, 3, 4, 5});
        assertEquals(0.25, WindowStage.unusable(series, 1.0, 4.0), 0.0);
        assertEquals(1.0, WindowStage.unusable(series, 7.0, 9.0), 0.0);
    }
}
