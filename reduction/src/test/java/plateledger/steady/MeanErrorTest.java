package plateledger.steady;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.LongRange;
import net.jqwik.api.constraints.Scale;
import org.apache.commons.math3.distribution.TDistribution;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Standard error of a mean against computed check values and against the truth of simulated series. */
final class MeanErrorTest {
    private static final double REL = 1e-6; // tolerance stated beside the check values

    private static void assertClose(double expected, double actual) {
        assertEquals(expected, actual, REL * Math.abs(expected));
    }

    private static double check(String quantity) throws IOException {
        return ReferenceSets.value("AR1", quantity);
    }

    @Test
    @Tag("validation")
    void reproducesTheCheckValuesOfTheAutoregressiveSet() throws IOException {
        double[] x = ReferenceSets.column("ar1.csv", 1);
        double[] c = Autocorrelation.centred(x);
        assertClose(check("gamma0 (divisor n)"), Autocorrelation.covariance(c, 0));
        assertClose(check("r1"), Autocorrelation.first(c));
        Autocorrelation.InitialSequence g = Autocorrelation.geyer(x);
        assertEquals((int) check("Geyer initial monotone pairs"), g.pairs());
        assertClose(check("Geyer monotone tau"), g.tau());
        MeanError geyer = MeanError.geyer(x);
        assertClose(check("SE Geyer with (1-tau/n)^-1/2"), geyer.standardError());
        assertClose(check("n_eff Geyer") - 1.0, geyer.dof());
        assertClose(check("U95 Geyer"), geyer.halfWidth());
        MeanError ar = MeanError.autoregressive(x);
        assertClose(check("AR1 tau"), ar.tau());
        assertClose(check("SE AR1"), ar.standardError());
        assertClose(check("U95 AR1"), ar.halfWidth());
        MeanError blocks = MeanError.blocks(x);
        assertClose(check("SE AR1 on 30 blocks"), blocks.standardError());
        assertClose(check("U95 AR1 on 30 blocks"), blocks.halfWidth());
        MeanError used = MeanError.of(x);
        assertClose(check("mean"), used.mean());
        assertClose(check("U95 recommended (max of three)"), used.halfWidth());
    }

    @Test
    @Tag("validation")
    void reproducesTheSlopeOfTheAutoregressiveSet() throws IOException {
        double[] t = ReferenceSets.column("ar1.csv", 0);
        double[] x = ReferenceSets.column("ar1.csv", 1);
        SlopeTest ar = SlopeTest.autoregressive(t, x);
        assertClose(check("slope K/s"), ar.slope());
        assertClose(check("SE slope, AR1"), ar.standardError());
        assertClose(check("dof slope AR1"), ar.dof());
    }

    /** Six windows of the approach set: slope to 1 %, its error to 2 %, as the check values are rounded. */
    @Test
    @Tag("validation")
    void reproducesTheStorageBoundsOfTheApproachSet() throws IOException {
        double[] t = ReferenceSets.column("approach.csv", 0);
        double[] x = ReferenceSets.column("approach.csv", 1);
        for (int end : new int[] {1800, 2700, 3000, 3600, 4200, 5400}) {
            String[] e = ReferenceSets.expected("WINDOW 600 s ending " + end, "slope;SE;dof;share;share upper bound")
                    .split(";", -1);
            int to = end / 10 + 1;
            int from = to - 60; // the 60 samples of the last 600 s
            SlopeTest s =
                    SlopeTest.of(java.util.Arrays.copyOfRange(t, from, to), java.util.Arrays.copyOfRange(x, from, to));
            double slope = Double.parseDouble(e[0]);
            assertEquals(slope, s.slope(), 0.01 * Math.abs(slope), "slope " + end);
            assertEquals(1.0, s.standardError() / Double.parseDouble(e[1]), 0.02, "SE " + end);
            assertEquals(Double.parseDouble(e[2]), s.dof(), 0.06, "dof " + end);
            double share = 1756.0976 * s.bound() / 120.0;
            assertEquals(Double.parseDouble(e[4]), share, 0.02 * Double.parseDouble(e[4]) + 5e-5, "share " + end);
        }
    }

    /** AR(1) of given φ and unit sd, with white noise on top. */
    private static double[] series(int n, double phi, double white, Random random) {
        double[] x = new double[n];
        double state = random.nextGaussian();
        for (int i = 0; i < n; i++) {
            x[i] = state + white * random.nextGaussian();
            state = phi * state + Math.sqrt(1.0 - phi * phi) * random.nextGaussian();
        }
        return x;
    }

    private static double coverage(int trials, int n, double phi, double white, long seed) {
        Random random = new Random(seed);
        int covered = 0;
        for (int k = 0; k < trials; k++) {
            MeanError e = MeanError.of(series(n, phi, white, random));
            covered += Math.abs(e.mean()) <= e.halfWidth() ? 1 : 0;
        }
        return (double) covered / trials;
    }

    /**
     * Coverage of the 95 % interval; expected values 0.961, 0.965, 0.965, 0.947 from the statistics reference, section 2
     * (1500 to 4000 series each). With 600 series the binomial sd is 0.009: the band is ±3.5 of it.
     */
    @Test
    void coversTheTruthOfSimulatedSeries() {
        assertEquals(0.961, coverage(600, 600, 0.0, 0.0, 1), 0.031);
        assertEquals(0.965, coverage(600, 600, 0.9, 0.0, 2), 0.031);
        assertEquals(0.965, coverage(600, 600, 0.98, 0.0, 3), 0.031);
        assertEquals(0.947, coverage(600, 600, 0.98, 1.0, 4), 0.031);
    }

    /** False alarms of the corrected slope test at 5 %: 4.5, 4.8, 5.9, 6.8 % (statistics reference, section 3.1, n = 300). */
    @Test
    void slopeTestRaisesFewFalseAlarms() {
        double[] phis = {0.0, 0.5, 0.9, 0.98};
        double[] expected = {0.045, 0.048, 0.059, 0.068};
        double[] t = java.util.stream.IntStream.range(0, 300).asDoubleStream().toArray();
        for (int p = 0; p < phis.length; p++) {
            Random random = new Random(100 + p);
            int alarms = 0;
            for (int k = 0; k < 800; k++) {
                SlopeTest s = SlopeTest.of(t, series(300, phis[p], 0.0, random));
                alarms += s.t() > StudentT.twoSided95(s.dof()) ? 1 : 0;
            }
            assertEquals(expected[p], alarms / 800.0, 0.03, "phi " + phis[p]); // 3.5 binomial sd
        }
    }

    @Property(tries = 200)
    void quantilesAgreeWithTheDistributionFunction(
            @ForAll @DoubleRange(min = 1.0, max = 1e5) double dof,
            @ForAll @Scale(5) @DoubleRange(min = 1e-4, max = 0.5) double p) {
        TDistribution t = new TDistribution(null, dof);
        assertEquals(p / 2.0, t.cumulativeProbability(-StudentT.twoSided(p, dof)), 1e-8);
    }

    @Property(tries = 50)
    void shiftAndScaleCarryOver(@ForAll @LongRange(min = 0, max = 10_000) long seed) {
        double[] x = series(240, 0.8, 0.3, new Random(seed));
        double[] y = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            y[i] = 300.0 - 2.0 * x[i];
        }
        MeanError a = MeanError.of(x);
        MeanError b = MeanError.of(y);
        assertEquals(300.0 - 2.0 * a.mean(), b.mean(), 1e-9);
        assertEquals(2.0 * a.standardError(), b.standardError(), 1e-7 * b.standardError());
        assertEquals(a.dof(), b.dof(), 1e-5 * a.dof());
    }

    @Test
    void constantAndTinySeries() {
        double[] same = new double[200];
        java.util.Arrays.fill(same, 12.3);
        assertEquals(0.0, MeanError.of(same).halfWidth(), 1e-12); // the mean of equal values is rounded
        assertEquals(
                0.0,
                SlopeTest.of(
                                java.util.stream.IntStream.range(0, 200)
                                        .asDoubleStream()
                                        .toArray(),
                                same)
                        .bound(),
                1e-12);
        assertTrue(Double.isNaN(MeanError.of(new double[] {1.0, 2.0}).standardError()));
    }

    /** Resolution 1, no noise: rectangular, 1/√12 (JCGM 100:2008, F.2.2.1); with noise of one step nothing is left. */
    @Test
    void resolutionLeavesAFloor() {
        double[] same = new double[200];
        assertEquals(0.28868, Resolution.floor(same, 1.0), 1e-5);
        Random random = new Random(5);
        double[] noisy = new double[2000];
        for (int i = 0; i < noisy.length; i++) {
            noisy[i] = Math.rint(random.nextGaussian());
        }
        assertTrue(Resolution.floor(noisy, 1.0) < 1e-6);
    }
}
