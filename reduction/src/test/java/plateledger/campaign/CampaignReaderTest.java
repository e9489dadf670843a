package plateledger.campaign;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.time.ZoneId;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import plateledger.log.LogFormat;
import plateledger.quantity.Stated;
import plateledger.rig.Instrument;
import plateledger.rig.Plate;
import plateledger.rig.Protection;
import plateledger.rig.Surroundings;

/** The good example is read to the values that stand in it; expected values are typed from the files by hand. */
final class CampaignReaderTest {
    @TempDir
    private Path temporary;

    @Test
    void readsTheExampleWithoutAnyNote() throws Exception {
        assertEquals(List.of(), ExampleFolder.in(temporary).read().notes());
    }

    @Test
    void readsTheCampaignFile() throws Exception {
        Campaign campaign = ExampleFolder.in(temporary).read().campaign();
        assertEquals("Door panel, heat transfer to a stream", campaign.title());
        assertEquals(ZoneId.of("Europe/Vienna"), campaign.zone());
        assertEquals("2026-03-20", campaign.texts().get("issued"));
        assertEquals(9, campaign.texts().size());
        assertEquals(1.0 / 3.0, campaign.definitions().prandtlExponent());
        assertEquals(new Campaign.SteadyLimits(0.01, 0.005, 600.0), campaign.steady());

        Logger plate = campaign.logger("plate").orElseThrow();
        assertEquals(Stated.limits(95.0, 2.0), plate.clockOffsetS());
        assertTrue(plate.clockDeclared());
        assertEquals(Map.of("Plate 01", "T01"), plate.columns());
        assertEquals(
                new LogFormat(';', ',', 7, true, LogFormat.TimeForm.PATTERN, "dd.MM.yyyy HH:mm:ss", ""),
                plate.format().orElseThrow());
        assertTrue(campaign.logger("power").orElseThrow().format().isEmpty());

        Run run = campaign.run("B01").orElseThrow();
        assertEquals("2026-03-10", run.day());
        assertEquals(Regime.TURBULENT, run.regime());
        assertEquals(new Run.Trip(0.05, 0.0017), run.trip().orElseThrow());
        assertEquals(12.0, run.speedSetMPerS());
        assertEquals(40.0, run.powerSetW());
        assertEquals(Map.of("plate", "logs/B01-plate.txt", "power", "logs/B01-power.csv"), run.logs());
        // 10:20 in Vienna in March is 09:20 UTC; 20522 days from 1970-01-01 to 2026-03-10
        assertEquals(
                20522.0 * 86400.0 + 33600.0, run.declaredWindow().orElseThrow().startS());
        assertEquals("P01", campaign.run("P01").orElseThrow().set());
        assertTrue(campaign.run("P01").orElseThrow().planned());
        assertEquals("cable fault", campaign.run("P01").orElseThrow().leftOut().orElseThrow());
        assertEquals(List.of(new FitRequest("product", "product", Regime.PRODUCT)), campaign.fits());
    }

    @Test
    void readsTheRigFile() throws Exception {
        var rig = ExampleFolder.in(temporary).read().campaign().rig();
        Surroundings around = rig.surroundings();
        assertEquals(List.of("TC1", "TC2"), around.coverInnerChannels());
        assertEquals(Stated.standard(0.015, 0.003), around.blockage());
        assertEquals(
                new Surroundings.SpeedMeter(
                        "VA", Surroundings.SpeedPrinciple.THERMAL, Stated.standard(1.0, 0.008), 0.0, 5.0),
                around.speedMeters().get(1));
        assertEquals(348.15, rig.limits().surface().kelvin(), 1e-12);
        assertTrue(rig.protections().stream().allMatch(Protection::declared));

        Plate plate = rig.plate("baseline").orElseThrow();
        assertEquals(Stated.limits(0.5, 0.0005), plate.lengthM());
        assertEquals(Stated.standard(0.46, 0.46 * 0.15), plate.backConductanceWPerM2K());
        assertEquals(Stated.limits(5e-5, 1.5e-5), plate.coat().thicknessM());
        assertEquals(Stated.standard(3.77e6, 3.77e6 * 0.03), plate.sheet().heatCapacityJPerM3K());
        assertEquals(
                new Plate.Heater("H2", 0.3, 0.5, Stated.limits(0.01, 0.004), "V2", "I2", 40.0),
                plate.heaters().get(1));
        assertEquals(2, plate.stations().size());
        assertEquals(-0.12, plate.offCentre().get(0).zM());
    }

    @Test
    void aPlateLikeAnotherTakesOverWhatItDoesNotState() throws Exception {
        var rig = ExampleFolder.in(temporary).read().campaign().rig();
        Plate baseline = rig.plate("baseline").orElseThrow();
        Plate product = rig.plate("product").orElseThrow();
        assertEquals("ribbed door panel", product.description());
        assertEquals(Plate.SmoothShape.UNIFORM, product.smoothShape());
        assertEquals(Stated.limits(6e-5, 1.5e-5), product.coat().thicknessM());
        assertEquals("matt black paint", product.coat().material());
        assertEquals(baseline.sheet(), product.sheet());
        assertEquals(baseline.thermocouples(), product.thermocouples());
    }

    @Test
    void readsTheInstrumentFile() throws Exception {
        var rig = ExampleFolder.in(temporary).read().campaign().rig();
        Instrument thermocouples = rig.instrumentOf("T02").orElseThrow();
        assertEquals("thermocouples", thermocouples.id());
        assertEquals("A", thermocouples.bath());
        assertEquals(295.15, thermocouples.gainOrigin(), 1e-12);
        assertEquals(Stated.standard(0.0, 0.02), thermocouples.dailyDrift());
        assertEquals(263.15, thermocouples.rangeLow(), 1e-12);
        assertEquals(List.of(0.0, 1.0), thermocouples.polynomial());
        assertEquals(
                Stated.standard(0.0, 0.015),
                rig.instrumentOf("RH").orElseThrow().offset());
        assertEquals(110_000.0, rig.instrumentOf("PB").orElseThrow().rangeHigh());
    }
}
