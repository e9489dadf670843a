package plateledger.demo.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import plateledger.campaign.RunType;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.fit.FitResult;
import plateledger.reduce.Progress;
import plateledger.reduce.Reduction;
import plateledger.reduce.ReductionOptions;
import plateledger.reduce.RunState;

/**
 * The demo campaign, logs to constants, against what was true. One campaign's errors are shared, so its intervals hold or
 * miss together: the bounds here catch blunders; {@code COVERAGE.md} holds the proof over thousands.
 */
final class DemoTruthTest {
    private static DemoScore score;

    @BeforeAll
    static void reduceTheDemo() throws Exception {
        score = new DemoScore(
                Reduction.run(Simulated.FOLDER, ReductionOptions.all(), Progress.NONE),
                Truth.read(Simulated.FOLDER.resolve("truth.json")));
    }

    @Test
    void everyRunIsReduced() {
        List<String> not = score.result.runs().stream()
                .filter(r -> r.state() != RunState.REDUCED)
                .map(r -> r.run().id() + " " + r.reason())
                .toList();
        assertEquals(List.of(), not);
        assertEquals(
                32,
                score.result.runs().stream()
                        .filter(r -> r.run().type() == RunType.HEATED)
                        .filter(r -> r.values().isPresent())
                        .count());
    }

    /** Four standard uncertainties: a shared error of a sound campaign stays inside with probability 0.9999. */
    @Test
    void numbersLieWithinFourStandardUncertainties() {
        assertTrue(score.nu.rmsZ() < 4.0, () -> "Nu_L: rms error/u " + score.nu.rmsZ());
        assertTrue(score.re.rmsZ() < 4.0, () -> "Re_L: rms error/u " + score.re.rmsZ());
        assertTrue(score.middleStations.rmsZ() < 4.0, () -> "stations: " + score.middleStations.rmsZ());
        assertTrue(score.firstStations.rmsZ() < 4.0, () -> "stations 1-2: " + score.firstStations.rmsZ());
    }

    @Test
    void errorsAreAFewPerCentAtMost() {
        assertEquals(0.0, score.nu.meanError(), 0.04);
        assertEquals(0.0, score.re.meanError(), 0.03);
        assertEquals(0.0, score.middleStations.meanError(), 0.04);
    }

    @Test
    void productConstantsLieWithinFourStandardUncertainties() {
        FitResult fit = score.fit("product").orElseThrow();
        double c = score.truth.get("product/C");
        double m = score.truth.get("product/m");
        assertEquals(m, fit.twoStep().m(), 4.0 * fit.twoStep().uM());
        assertEquals(
                Math.log(c), Math.log(fit.twoStep().c()), 4.0 * fit.twoStep().uLnC());
        assertTrue(fit.twoStep().uM() < 0.02, "an interval of m wide enough to hold anything proves nothing");
    }

    @Test
    void aSoundRigRaisesNoStop() {
        List<String> stops = score.result.findings().stream()
                .filter(f -> f.level() == Level.STOP)
                .map(Finding::message)
                .toList();
        assertEquals(List.of(), stops);
    }

    /** The blemishes put into the logs: a stuck channel, a spike, an over-range cell, and a clock nobody compared. */
    @Test
    void findsTheBlemishes() {
        List<String> ids = score.result.findings().stream().map(Finding::id).toList();
        assertTrue(ids.contains("SENSOR-STUCK"), () -> "stuck: " + ids);
        assertTrue(ids.contains("SENSOR-SPIKE"), () -> "spike: " + ids);
        assertTrue(ids.contains("LOG-OVER-RANGE"), () -> "over-range: " + ids);
        assertTrue(ids.contains("CAMPAIGN-CLOCK"), () -> "clock: " + ids);
    }
}
