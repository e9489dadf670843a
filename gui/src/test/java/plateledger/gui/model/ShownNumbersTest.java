package plateledger.gui.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import plateledger.finding.Level;
import plateledger.gui.SampleCampaign;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.RunResult;
import plateledger.reduce.StationResult;

/** The numbers that tables and charts show, against numbers worked by hand from the sample. */
final class ShownNumbersTest {
    private final CampaignResult result = SampleCampaign.result();

    @Test
    void aLineOfTheListShowsWhatTheRunCameTo() {
        List<RunRow> rows = RunRow.of(result);
        RunRow first =
                rows.stream().filter(r -> r.id().equals("B01")).findFirst().orElseThrow();
        assertEquals("baseline, laminar", first.kind());
        assertEquals("2.00", first.speed().text());
        assertEquals("2.000 ± 0.039", first.speedInterval()); // 1.96 × 1 % of 2 m/s
        assertEquals("300.0 ± 8.8", first.nusselt().text()); // 1.96 × 1.5 % of 300
        assertEquals(1, first.findings());
        assertEquals(Optional.of(Level.CAUTION), first.gravest());

        RunRow unsteady =
                rows.stream().filter(r -> r.id().equals("P03")).findFirst().orElseThrow();
        assertEquals("not steady", unsteady.state());
        assertEquals("set 10", unsteady.speed().text());
        assertEquals("", unsteady.nusselt().text());
        assertEquals("zero", rows.get(0).kind());
        assertEquals("loss, baseline", rows.get(1).kind());
    }

    @Test
    void numbersSortByValueWithUnknownOnesLast() {
        RunRow.Cell small = new RunRow.Cell(9.0, "9.0");
        RunRow.Cell large = new RunRow.Cell(10.0, "10");
        assertTrue(small.compareTo(large) < 0);
        assertTrue(large.compareTo(new RunRow.Cell(Double.NaN, "")) < 0);
    }

    @Test
    void profileIsInMillimetresAndDegreesCelsius() {
        PlateProfile profile = PlateProfile.of(result, run("B01")).orElseThrow();
        assertEquals(16, profile.stations().size());
        PlateProfile.Station first = profile.stations().get(0);
        assertEquals(112.5, first.xMm(), 1e-9);
        assertEquals(21.9, first.referenceC(), 1e-9); // 295.05 K
        assertEquals(100.0, profile.section().heatedFromMm(), 1e-9);
        assertEquals(
                "coat 50 µm matt black paint", profile.section().layers().get(0).words());
        assertEquals(
                "sheet 0.5 mm stainless steel",
                profile.section().layers().get(1).words());
        assertEquals("H1", profile.section().stripAt(112.5).id());
    }

    /** Nu_x is 1/0.97 of theory in the sample, so theory gives a difference larger by that. */
    @Test
    void theoryTemperatureKeepsTheFlux() {
        PlateProfile profile = PlateProfile.of(result, run("B01")).orElseThrow();
        PlateProfile.Station s = profile.stations().get(5);
        assertEquals((s.surfaceC() - s.referenceC()) / 0.97, s.theoryC() - s.referenceC(), 1e-9);
        assertFalse(PlateProfile.of(result, run("P01")).orElseThrow().hasTheory());
    }

    @Test
    void bookedPartsAreThoseOfTheStation() {
        StationResult station = run("B01").values().orElseThrow().stations().get(1);
        PlateProfile.Station shown =
                PlateProfile.of(result, run("B01")).orElseThrow().stations().get(1);
        assertEquals(station.qConvection().value(), shown.part(HeatPart.CONVECTION), 0.0);
        assertEquals(station.qConduction().value(), shown.part(HeatPart.CONDUCTION), 0.0);
        assertTrue(shown.part(HeatPart.CONDUCTION) < 0.0);
        double booked = 0.0;
        for (HeatPart part : HeatPart.values()) {
            booked += shown.part(part);
        }
        assertEquals(shown.electrical(), booked, 1e-9);
    }

    @Test
    void aRunWithoutNumbersStillHasItsPlate() {
        PlateProfile profile = PlateProfile.of(result, run("P03")).orElseThrow();
        assertTrue(profile.stations().isEmpty());
        assertTrue(PlateProfile.of(result, run("Z01")).isEmpty());
    }

    @Test
    void runsAreGroupedByPlateAndRegimeAndTheFitCrossesItsPoints() {
        NuRe numbers = NuRe.of(result);
        assertEquals(
                List.of("baseline, laminar", "product"),
                numbers.groups().stream().map(NuRe.Group::name).toList());
        assertEquals(4, numbers.groups().get(0).theory().size());
        assertTrue(numbers.groups().get(1).theory().isEmpty());
        NuRe.Curve fit = numbers.fits().get(0);
        // The sample's product has Nu = 210 U^0.8 exactly, at 2 and 18 m/s at the ends of the fit.
        assertEquals(210.0 * Math.pow(2.0, 0.8), fit.nu()[0], 1e-6);
        assertEquals(210.0 * Math.pow(18.0, 0.8), fit.nu()[fit.nu().length - 1], 1e-6);
        assertTrue(fit.low()[0] < fit.nu()[0] && fit.nu()[0] < fit.high()[0]);
    }

    @Test
    void summaryBracketsNumbersThatCarryAUnit() {
        RunSummary summary = RunSummary.of(run("B01"));
        assertEquals("Run B01 · heated · baseline, laminar · reduced", summary.title());
        assertEquals("(2.000 ± 0.039) m/s", summary.facts().get(0).text());
        assertEquals(
                "storage bound 4.2 % of power, limit 1 %",
                RunSummary.of(run("P03")).facts().get(0).text());
    }

    @Test
    void layersAreDrawnThickerByPlainFactors() {
        assertEquals(20.0, Exaggeration.factor(0.5, 1.2, 14.0)); // exact 23.3
        assertEquals(100.0, Exaggeration.factor(0.05, 1.2, 6.0)); // exact 100
        assertEquals(1.0, Exaggeration.factor(50.0, 1.2, 60.0));
        assertEquals("×0.5", Exaggeration.words(0.5));
    }

    private RunResult run(String id) {
        return result.run(id).orElseThrow();
    }
}
