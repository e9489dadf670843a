package plateledger.reduce;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import plateledger.fit.FitPoint;
import plateledger.fit.FitProblem;
import plateledger.fit.SharedSource;

/** The spread of one set point, by hand. */
final class RepeatsTest {
    private static FitPoint point(String id, double re, double nu, double pr) {
        return new FitPoint(id, "S", re, nu, pr, 0.02, 0.03, 0.5);
    }

    private static RepeatSpread spread(List<FitPoint> points, double m, double n, SharedSource... sources) {
        return Repeats.spread("panel", "S", points, m, new FitProblem("fit", n, points, List.of(sources)));
    }

    private static SharedSource source(double first, double second) {
        return new SharedSource("source", "rig", new double[2], new double[] {first, second}, 1e9);
    }

    /**
     * Three runs at one Re: ln Nu of ln 100 + (−0.01, 0, 0.01) spreads by 0.01. Random parts with m = 0.8:
     * 0.03² + 0.8²·0.02² − 2·0.8·0.5·0.02·0.03 = 6.76e-4, its root 0.026.
     */
    @Test
    void spreadAndExpectationByHand() {
        RepeatSpread spread = spread(
                List.of(
                        point("A", 1e5, 100.0 * Math.exp(-0.01), 0.7),
                        point("B", 1e5, 100.0, 0.7),
                        point("C", 1e5, 100.0 * Math.exp(0.01), 0.7)),
                0.8,
                1.0 / 3.0);
        assertEquals(0.01, spread.relativeSpread(), 1e-12);
        assertEquals(0.026, spread.expectedSpread(), 1e-12);
        assertEquals(List.of("A", "B", "C"), spread.runs());
        assertEquals("panel", spread.plate());
        assertEquals("S", spread.set());
    }

    /** Points on one power law do not spread, wherever their Re and Pr lie. */
    @Test
    void slopeAndPrandtlNumberAreTakenOut() {
        RepeatSpread spread = spread(
                List.of(
                        point("A", 1.0e5, 0.1 * Math.pow(1.0e5, 0.7) * Math.pow(0.70, 0.4), 0.70),
                        point("B", 1.1e5, 0.1 * Math.pow(1.1e5, 0.7) * Math.pow(0.72, 0.4), 0.72)),
                0.7,
                0.4);
        assertEquals(0.0, spread.relativeSpread(), 1e-12);
        // a slope wrong by 0.1 leaves 0.1·ln 1.1, over √2 for two points
        RepeatSpread tilted = spread(
                List.of(
                        point("A", 1.0e5, 0.1 * Math.pow(1.0e5, 0.7), 0.7),
                        point("B", 1.1e5, 0.1 * Math.pow(1.1e5, 0.7), 0.7)),
                0.6,
                0.4);
        assertEquals(0.1 * 0.0953101798 / 1.41421356, tilted.relativeSpread(), 1e-10);
    }

    /**
     * By hand: random parts 0.026² as above, and (0.01² + 0.01²)/(2 − 1) for a source that moves two repeats apart; one
     * that moves both alike adds nothing.
     */
    @Test
    void sourcesThatMoveRepeatsApartAreExpectedToSpreadThem() {
        List<FitPoint> points = List.of(point("A", 1e5, 100.0, 0.7), point("B", 1e5, 101.0, 0.7));
        assertEquals(0.026, spread(points, 0.8, 0.4, source(0.05, 0.05)).expectedSpread(), 1e-12);
        assertEquals(
                Math.sqrt(0.026 * 0.026 + 2e-4),
                spread(points, 0.8, 0.4, source(0.05, 0.05), source(0.01, -0.01))
                        .expectedSpread(),
                1e-12);
    }
}
