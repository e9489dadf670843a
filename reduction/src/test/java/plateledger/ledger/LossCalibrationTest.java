package plateledger.ledger;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import plateledger.ledger.LossCalibration.LossRun;
import plateledger.ledger.RunLayout.In;
import plateledger.rig.Plate;

/** Loss runs made by an independent two-dimensional sheet ({@link CoveredSheet}) whose conductances are known. */
final class LossCalibrationTest {
    private static final double BACK = 0.52;
    private static final double EDGE = 0.06;
    private static final double COVER = 0.075;
    private static final double NOISE_W = 0.005;
    private static final double ENDS = 1e-6;
    private static final double[] TRUTH = {BACK, EDGE, ENDS, ENDS, COVER};

    private final Plate plate = TestPlates.plate(Plate.SmoothShape.BOUNDARY_LAYER);
    private final List<CoveredSheet> sheets = new ArrayList<>();
    private final List<LossRun> runs = new ArrayList<>();

    /** Plates 15, 30 and 45 K above a room at 22 °C, the two ends all but insulated. */
    LossCalibrationTest() {
        for (double above : new double[] {15.0, 30.0, 45.0}) {
            runs.add(run(above, ENDS));
        }
    }

    private LossRun run(double above, double ends) {
        double[] in = TestPlates.inputs(plate, 0.0, 0.0);
        RunLayout l = RunModel.layout(plate);
        in[l.at(In.NOSE_CONDUCTANCE)] = ends;
        in[l.at(In.TAIL_CONDUCTANCE)] = ends;
        CoveredSheet sheet = new CoveredSheet(plate, in, 295.15 + above, 295.15, BACK, EDGE, COVER);
        sheets.add(sheet);
        return new LossRun(in, sheet.coverInnerK(COVER), 295.15);
    }

    private LossCalibration calibration(double[] priorU, double noiseW, int m) {
        boolean[] used = new boolean[plate.thermocouples().size()];
        Arrays.fill(used, true);
        double[] noise = new double[m];
        Arrays.fill(noise, noiseW);
        return LossCalibration.configure(plate, used, priorU, noise);
    }

    /** The balance at the true conductances gives the true power: face, back and edges with the span profile. */
    @Test
    void theTrueConductancesCloseTheBalance() {
        LossCalibration calibration = calibration(new double[5], NOISE_W, 3);
        for (LossRun run : runs) {
            double power = power(run);
            assertTrue(power > 1.0, "power " + power);
            assertEquals(0.0, calibration.residual(run, TRUTH), 0.001 * power);
            assertEquals(power, calibration.balance(run, TRUTH), 0.001 * power);
        }
    }

    /**
     * Ends that conduct to pieces some 25 K colder: the profile across the span is not developed there, so the end heat is booked low by
     * a few per cent of itself (a known limit of a fin at each x of its own). It must stay far below the 20 % to which end
     * conductances are usually known.
     */
    @Test
    void coldEndsAreBookedWithinTheirOwnUncertainty() {
        LossCalibration calibration = calibration(new double[5], NOISE_W, 1);
        LossRun cold = run(30.0, 0.05);
        CoveredSheet sheet = sheets.get(sheets.size() - 1);
        double cover = COVER * (cold.coverInnerK() - cold.coverOuterK());
        double store = 2e-5 * 2985.0 * 0.12; // drift × (1885 + 1100) J/(m² K) × area
        double ends = power(cold) - cover - sheet.throughBackW() - sheet.throughEdgesW() - store;
        assertTrue(ends > 1.5, "end heat " + ends);
        assertEquals(0.0, calibration.residual(cold, new double[] {BACK, EDGE, 0.05, 0.05, COVER}), 0.08 * ends);
    }

    private double power(LossRun run) {
        RunLayout l = RunModel.layout(plate);
        double power = 0.0;
        for (int j = 0; j < l.strips(); j++) {
            power += run.in()[l.power(j)] - run.in()[l.lead(j)];
        }
        return power;
    }

    /** Back and edge 30 % and 50 % off, the others known: the heat through both comes back, which is all that power tells. */
    @Test
    void aPriorFarOffIsPulledToTheTruthInTheSum() {
        double[] prior = {0.7 * BACK, 0.5 * EDGE, ENDS, ENDS, COVER};
        double[] priorU = {0.3 * BACK, 0.5 * EDGE, 0.0, 0.0, 0.0};
        double[] posterior = new double[5];
        calibration(priorU, NOISE_W, 3).evaluate(runs, prior, posterior);
        CoveredSheet hottest = sheets.get(2);
        double truth = hottest.throughBackW() + hottest.throughEdgesW();
        double before = sum(prior);
        double after = sum(posterior);
        assertTrue(Math.abs(before - truth) > 0.2 * truth, before + " W against " + truth + " W at the start");
        assertEquals(truth, after, 0.005 * truth);
        assertArrayEquals(new double[] {ENDS, ENDS, COVER}, Arrays.copyOfRange(posterior, 2, 5), 0.0);
    }

    /** Heat through back and edges of a sheet with other conductances, held 45 K above the room, W. */
    private double sum(double[] parameters) {
        double[] in = runs.get(2).in().clone();
        CoveredSheet sheet = new CoveredSheet(plate, in, 340.15, 295.15, parameters[0], parameters[1], COVER);
        return sheet.throughBackW() + sheet.throughEdgesW();
    }

    /** One unknown, three runs and hardly any noise: the back conductance itself. */
    @Test
    void aSingleUnknownIsFound() {
        double[] prior = {2.0 * BACK, EDGE, ENDS, ENDS, COVER};
        double[] posterior = new double[5];
        calibration(new double[] {BACK, 0.0, 0.0, 0.0, 0.0}, NOISE_W, 3).evaluate(runs, prior, posterior);
        assertEquals(BACK, posterior[0], 0.005 * BACK);
    }

    @Test
    void withoutInformationTheDeclaredValuesStand() {
        double[] prior = {0.3, 0.02, 0.04, 0.06, 0.08};
        double[] priorU = {0.05, 0.006, 0.01, 0.01, 0.003};
        double[] posterior = new double[5];
        calibration(priorU, NOISE_W, 0).evaluate(List.of(), prior, posterior);
        assertArrayEquals(prior, posterior, 0.0);
        calibration(priorU, 1e9, 3).evaluate(runs, prior, posterior);
        assertArrayEquals(prior, posterior, 1e-12);
        calibration(new double[5], NOISE_W, 3).evaluate(runs, prior, posterior);
        assertArrayEquals(prior, posterior, 0.0);
    }

    @Test
    void theOrderOfTheRunsDoesNotMatter() {
        double[] prior = {0.7 * BACK, 0.5 * EDGE, 0.04, 0.06, 0.08};
        double[] priorU = {0.15, 0.03, 0.01, 0.01, 0.003};
        double[] forward = new double[5];
        double[] backward = new double[5];
        calibration(priorU, NOISE_W, 3).evaluate(runs, prior, forward);
        calibration(priorU, NOISE_W, 3).evaluate(List.of(runs.get(2), runs.get(0), runs.get(1)), prior, backward);
        for (int a = 0; a < 5; a++) {
            // nearly proportional runs with little noise: the gain matrix costs some digits
            assertEquals(forward[a], backward[a], 1e-7 * Math.abs(forward[a]));
            assertTrue(Math.abs(forward[a] - prior[a]) > 0.0, "parameter " + a + " was moved");
        }
    }
}
