package plateledger.reduce;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import plateledger.campaign.Campaign;
import plateledger.campaign.RunType;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.RefusedException;
import plateledger.quantity.Estimate;
import plateledger.rig.Plate;
import plateledger.rig.Rig;

/** Each finding about results is provoked once, and a sound campaign has none. Limits by hand. */
final class ResultFindingsTest {
    private static final Estimate NONE = new Estimate(Double.NaN, Double.NaN, Double.POSITIVE_INFINITY);
    private static final Map<String, Double> AROUND =
            Map.of("TA1", 295.15, "TW1", 295.35, "TW2", 295.45, "TP1", 294.85);

    private final Campaign campaign = campaign();

    private static Campaign campaign() {
        try {
            return ExampleRig.campaign();
        } catch (RefusedException e) {
            throw new AssertionError("the example is good", e);
        }
    }

    /** What of a heated run matters to findings; the sound one is within every limit. */
    private record Sound(
            double h, double residualW, double residualU, double chiSquare, double dof, double en, double reliance) {
        static final Sound RUN = new Sound(20.0, 0.05, 0.04, 12.0, 12.0, 0.6, 0.05);

        RunResult.Values values() {
            Map<LedgerTerm, Estimate> ledger = new EnumMap<>(LedgerTerm.class);
            ledger.put(LedgerTerm.ELECTRICAL, Estimate.of(40.0, 0.04));
            ledger.put(LedgerTerm.RESIDUAL, Estimate.of(residualW, residualU));
            Estimate one = Estimate.of(1.0, 0.01);
            StationResult station = new StationResult(
                    "T01", one, one, one, one, one, one, one, one, one, one, one, one, one, one, one, one, one, one,
                    0.1, reliance);
            return new RunResult.Values(
                    Estimate.of(12.0, 0.05),
                    Estimate.of(295.15, 0.05),
                    Estimate.of(98_000.0, 30.0),
                    Estimate.of(0.01, 0.001),
                    Estimate.of(325.0, 0.1),
                    Estimate.of(3.6e5, 2e3),
                    Estimate.of(380.0, 4.0),
                    Estimate.of(385.0, 4.0),
                    Estimate.of(0.71, 0.003),
                    Estimate.of(h, 0.2),
                    NONE,
                    Estimate.of(0.02, 0.01),
                    en,
                    ledger,
                    List.of(station),
                    0.02,
                    chiSquare,
                    dof,
                    6.0,
                    List.of());
        }
    }

    private static MeansReduction reduced(Sound run) {
        return new MeansReduction(
                Map.of("B01", run.values()),
                Map.of(),
                Map.of(),
                List.of(loss(0.5)),
                List.of(),
                List.of(spread(2.9)),
                List.of());
    }

    /** A back conductance whose uncertainty fell to a share of that declared. */
    private static LossResult loss(double ratio) {
        LossResult.Parameter back = new LossResult.Parameter(
                "back conductance", "W/(m² K)", Estimate.of(0.46, 0.1), Estimate.of(0.48, 0.1 * ratio));
        return new LossResult("baseline", List.of("L01"), List.of(back), new double[] {0.01});
    }

    /** Repeats that spread so many times what their own uncertainties say. */
    private static RepeatSpread spread(double times) {
        return new RepeatSpread("baseline", "T12", List.of("B01", "B02"), 0.004 * times, 0.004);
    }

    private static RunMeans zero(Map<String, Double> readings) {
        return ExampleRig.means(ExampleRig.run("Z02", RunType.ZERO, ExampleRig.DAY, 12.0), 0.0, readings);
    }

    private List<Finding> of(Sound run) {
        return ResultFindings.of(campaign, List.of(zero(AROUND)), reduced(run));
    }

    /** Exactly one finding, of that id and level. */
    private static Finding only(List<Finding> findings, String id, Level level) {
        assertEquals(List.of(id), findings.stream().map(Finding::id).toList());
        Finding finding = findings.get(0);
        assertEquals(level, finding.level());
        assertTrue(!finding.subject().isBlank() && !finding.found().isBlank());
        return finding;
    }

    @Test
    void aSoundCampaignHasNone() {
        assertEquals(List.of(), of(Sound.RUN));
        // no theory, no degree of freedom left for the misfit
        assertEquals(List.of(), of(new Sound(20.0, 0.05, 0.04, 50.0, 0.5, Double.NaN, 0.05)));
    }

    /** 40 W: a remainder counts above 0.2 %, 0.08 W, if it is also more than two standard uncertainties. */
    @Test
    void aRemainderOfTheLedger() {
        Finding finding =
                only(of(new Sound(20.0, -0.09, 0.04, 12.0, 12.0, 0.6, 0.05)), "LEDGER-RESIDUAL", Level.CAUTION);
        assertTrue(finding.found().contains("-0.090 W"), finding.found());
        assertEquals(List.of(), of(new Sound(20.0, -0.09, 0.05, 12.0, 12.0, 0.6, 0.05)));
        assertEquals(List.of(), of(new Sound(20.0, 0.079, 0.001, 12.0, 12.0, 0.6, 0.05)));
    }

    /** χ² of 12 has 0.001 above 32.909 (printed tables). */
    @Test
    void junctionsThatMissTheModel() {
        only(of(new Sound(20.0, 0.05, 0.04, 33.0, 12.0, 0.6, 0.05)), "MODEL-MISFIT", Level.CAUTION);
        assertEquals(List.of(), of(new Sound(20.0, 0.05, 0.04, 32.8, 12.0, 0.6, 0.05)));
    }

    @Test
    void theoryThatDisagrees() {
        Finding finding =
                only(of(new Sound(20.0, 0.05, 0.04, 12.0, 12.0, -1.2, 0.05)), "THEORY-DISAGREES", Level.CAUTION);
        assertTrue(finding.found().contains("1.020"), finding.found()); // e^0.02
    }

    @Test
    void stationsThatLeanOnConduction() {
        Finding finding =
                only(of(new Sound(20.0, 0.05, 0.04, 12.0, 12.0, 0.6, 0.11)), "STATION-CONDUCTION", Level.NOTE);
        assertTrue(finding.found().startsWith("1 of 1"), finding.found());
    }

    /** k t = 14.9·0.5e-3; 5 + 4·0.95·σ·325³ + 0.46 = 12.86 W/(m² K): l = 24.1 mm against 300/16 = 18.8 mm. */
    @Test
    void edgesThatReachFar() {
        Finding finding = only(of(new Sound(5.0, 0.05, 0.04, 12.0, 12.0, 0.6, 0.05)), "EDGE-REACH", Level.NOTE);
        assertTrue(finding.found().contains("24.1 mm"), finding.found());
        assertTrue(finding.expected().contains("18.8 mm"), finding.expected());
    }

    @Test
    void aZeroThatLeansOnThePrediction() {
        MeansReduction sound = reduced(Sound.RUN);
        Map<String, Double> warm = ExampleRig.with(AROUND, Map.of("TW2", 295.75));
        Finding finding =
                only(ResultFindings.of(campaign, List.of(zero(warm)), sound), "ZERO-SURROUNDINGS", Level.CAUTION);
        assertTrue(finding.subject().contains("TW2") && finding.found().contains("0.60 K"), finding.toString());
        Map<String, Double> cold = ExampleRig.with(AROUND, Map.of("TP1", 294.45));
        only(ResultFindings.of(campaign, List.of(zero(cold)), sound), "ZERO-SURROUNDINGS", Level.CAUTION);
        Map<String, Double> noAir = ExampleRig.without(warm, List.of("TA1"));
        assertEquals(List.of(), ResultFindings.of(campaign, List.of(zero(noAir)), sound));
    }

    @Test
    void whatHadToBeAssumed() {
        MeansReduction assumed = new MeansReduction(
                Map.of(), Map.of(), Map.of("B01", "no zero run"), List.of(), List.of(), List.of(), List.of());
        Finding finding = only(ResultFindings.of(campaign, List.of(), assumed), "ZERO-MISSING", Level.CAUTION);
        assertEquals("no zero run", finding.found());
        assertEquals("campaign.toml", finding.place().file());
    }

    @Test
    void lossRunsThatTellNothing() {
        MeansReduction told =
                new MeansReduction(Map.of(), Map.of(), Map.of(), List.of(loss(0.91)), List.of(), List.of(), List.of());
        Finding finding = only(ResultFindings.of(campaign, List.of(), told), "LOSS-NOT-INFORMED", Level.NOTE);
        assertTrue(finding.found().contains("91 %"), finding.found());
    }

    @Test
    void repeatsThatSpread() {
        MeansReduction repeats =
                new MeansReduction(Map.of(), Map.of(), Map.of(), List.of(), List.of(), List.of(spread(3.1)), List.of());
        Finding finding = only(ResultFindings.of(campaign, List.of(), repeats), "REPEAT-SPREAD", Level.CAUTION);
        assertTrue(finding.found().contains("1.24 %"), finding.found());
    }

    @Test
    void edgesNobodyWatches() {
        Rig rig = campaign.rig();
        Plate first = rig.plates().get(0);
        Rig blind = new Rig(
                rig.title(),
                List.of(centreLineOnly(first)),
                rig.surroundings(),
                rig.instruments(),
                rig.limits(),
                rig.protections());
        Campaign other = new Campaign(
                campaign.title(),
                campaign.texts(),
                campaign.zone(),
                blind,
                campaign.definitions(),
                campaign.steady(),
                campaign.loggers(),
                campaign.runs(),
                campaign.fits());
        Finding finding =
                only(ResultFindings.of(other, List.of(), reduced(Sound.RUN)), "EDGE-UNWATCHED", Level.CAUTION);
        assertEquals("plate baseline", finding.subject());
    }

    private static Plate centreLineOnly(Plate p) {
        return new Plate(
                p.id(),
                p.description(),
                p.orientation(),
                p.lengthM(),
                p.widthM(),
                p.heatedStartM(),
                p.heatedEndM(),
                p.sheet(),
                p.coat(),
                p.foam(),
                p.emissivity(),
                p.backConductanceWPerM2K(),
                p.edgeConductanceWPerMK(),
                p.noseConductanceWPerK(),
                p.tailConductanceWPerK(),
                p.coverConductanceWPerK(),
                p.smoothShape(),
                p.heaters(),
                p.stations());
    }

    @Test
    void runsThatWereNotReduced() {
        only(notReduced(RunState.NOT_STEADY, "it drifts"), "RUN-NOT-REDUCED", Level.STOP);
        Finding refused = only(notReduced(RunState.REFUSED, "no barometer"), "RUN-NOT-REDUCED", Level.STOP);
        assertEquals("refused: no barometer", refused.found());
        only(notReduced(RunState.PLANNED, ""), "RUN-PLANNED", Level.NOTE);
        Finding left = only(notReduced(RunState.LEFT_OUT, "cable fault"), "RUN-LEFT-OUT", Level.NOTE);
        assertEquals("left out: cable fault", left.found());
        assertEquals(List.of(), notReduced(RunState.REDUCED, ""));
    }

    private static List<Finding> notReduced(RunState state, String reason) {
        return ResultFindings.notReduced(List.of(new RunResult(
                ExampleRig.run("B01", RunType.HEATED, ExampleRig.DAY, 12.0),
                state,
                reason,
                Optional.empty(),
                Optional.empty())));
    }
}
