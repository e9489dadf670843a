package plateledger.safety;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static plateledger.safety.RigUnderTest.ids;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.log.Series;

/** Each rule of {@link SafetyChecks} passed and failed on an invented run of the example rig. */
final class SafetyChecksTest {
    @TempDir
    @SuppressWarnings("NullAway.Init") // set by the test engine
    Path folder;

    private static final double ZERO_C = 273.15;

    private Finding only(RigUnderTest rig, String id) {
        List<Finding> found =
                rig.findings(folder).stream().filter(f -> f.id().equals(id)).toList();
        assertEquals(1, found.size(), () -> id + ": " + found);
        return found.get(0);
    }

    @Test
    void soundRigHasNoStop() {
        List<Finding> findings = new RigUnderTest().findings(folder);
        assertEquals(List.of(), ids(findings, Level.STOP), findings::toString);
        assertEquals(List.of(), ids(findings, Level.CAUTION), findings::toString);
        // The example plans P01 without power.
        assertEquals(List.of("PLAN-SURFACE"), ids(findings, Level.NOT_CHECKED), findings::toString);
        assertTrue(findings.stream()
                .allMatch(f -> f.level() == Level.NOT_CHECKED || !f.source().isEmpty()));
    }

    /** u² = 0.05² + 0.03² + 2 (0.0005 · 53)² + 0.02² K², U = 0.145 K: 74.80 °C passes 75 °C, 74.90 °C does not. */
    @Test
    void surfaceLimitCountsTheUncertainty() {
        RigUnderTest below = new RigUnderTest().channel("T02", t -> t == 17 ? ZERO_C + 74.80 : 323.15);
        assertEquals(List.of(), ids(below.findings(folder.resolve("a")), Level.STOP));
        RigUnderTest above = new RigUnderTest().channel("T02", t -> t == 17 ? ZERO_C + 74.90 : 323.15);
        Finding stop = only(above, "SURFACE-LIMIT");
        assertEquals(Level.STOP, stop.level());
        assertEquals("logs/B01-plate.txt:26", stop.place().toString());
        assertTrue(stop.found().startsWith("74.9 °C + 0.14 K at 2026-03-10 10:20:17"), stop.found());
    }

    /** Coated metal: 51 °C for a minute, 75 °C for a second (EN 563:1994 table). */
    @Test
    void touchableSurface() {
        RigUnderTest warm = new RigUnderTest()
                .replace("rig.toml", "touchable = false", "touchable = true")
                .channel("T01", t -> ZERO_C + 52.0);
        assertEquals(Level.CAUTION, only(warm, "TOUCH-B2-1min").level());
    }

    @Test
    void hotTouchableSurface() {
        RigUnderTest hot = new RigUnderTest()
                .replace("rig.toml", "touchable = false", "touchable = true")
                .channel("T01", t -> ZERO_C + 74.9);
        Finding stop = only(hot, "TOUCH-B2-1s");
        assertEquals(Level.STOP, stop.level());
        assertTrue(stop.source().contains("EN 563"));
    }

    @Test
    void hotSurfaceOutOfReachIsANote() {
        Finding note = only(new RigUnderTest().channel("T01", t -> ZERO_C + 74.0), "TOUCH-OUT-OF-REACH");
        assertEquals(Level.NOTE, note.level());
        assertTrue(note.remedy().contains("43.0 °C"), note.remedy());
    }

    @Test
    void materialLimit() {
        RigUnderTest near = new RigUnderTest()
                .replace("rig.toml", "lowest_material_limit = \"120 °C\"", "lowest_material_limit = \"59 °C\"");
        // The cut-out of the example, set at 85 °C, lies above that limit: a stop of its own.
        assertEquals(List.of("CUTOUT-SET"), ids(near.findings(folder.resolve("a")), Level.STOP));
        assertEquals(Level.CAUTION, only(near, "MATERIAL-LIMIT").level());
    }

    /** Polystyrene foam stands 73.9 °C (ASTM C578): 74 °C is over it though under the declared limits. */
    @Test
    void publishedLimitOfTheFoam() {
        RigUnderTest foam = new RigUnderTest()
                .replace("rig.toml", "material = \"polyisocyanurate\"", "material = \"polystyrene foam\"")
                .channel("T03", t -> ZERO_C + 74.0);
        Finding stop = only(foam, "MATERIAL-LIMIT");
        assertEquals(Level.STOP, stop.level());
        assertEquals("ASTM C578 scope", stop.source());
    }

    /** Twelve seconds with the heater on and no flow; nine are allowed. */
    @Test
    void powerWithoutFlow() {
        RigUnderTest brief = new RigUnderTest().channel("PD", t -> t >= 300 && t <= 309 ? 0.0 : 83.0);
        assertFalse(ids(brief.findings(folder.resolve("a")), Level.STOP).contains("FLOW-LOG"));
        RigUnderTest failed = new RigUnderTest().channel("PD", t -> t >= 300 && t <= 312 ? 0.0 : 83.0);
        Finding stop = only(failed, "FLOW-LOG");
        assertEquals(Level.STOP, stop.level());
        assertTrue(stop.found().startsWith("heater on for 12 s from 2026-03-10 10:25:00"), stop.found());
        assertEquals("logs/B01-plate.txt:309", stop.place().toString());
    }

    /** The interlock works: with the clocks put right, power and flow end together. Without that they would be 95 s apart. */
    @Test
    void interlockSeenThroughTwoClocks() {
        RigUnderTest rig = new RigUnderTest()
                .channel("PD", t -> t >= 300 && t <= 450 ? 0.0 : 83.0)
                .channel("I1", t -> t >= 300 && t <= 450 ? 0.0 : 1.0)
                .channel("I2", t -> t >= 300 && t <= 450 ? 0.0 : 1.0);
        assertEquals(List.of(), ids(rig.findings(folder), Level.STOP));
    }

    @Test
    void flowFarBelowTheSetSpeedIsACaution() {
        // 1.8 m/s where 12 m/s is set
        Finding caution = only(new RigUnderTest().channel("PD", t -> t < 60 ? 2.0 : 83.0), "FLOW-LOW");
        assertEquals(Level.CAUTION, caution.level());
    }

    @Test
    void lossRunIsHeatedWithoutFlow() {
        RigUnderTest loss = new RigUnderTest()
                .replace("campaign.toml", "type = \"heated\"", "type = \"loss\"")
                .channel("PD", t -> 0.0);
        assertEquals(List.of(), ids(loss.findings(folder), Level.STOP));
    }

    @Test
    void lossRunNeedsTheCutOut() {
        RigUnderTest loss = new RigUnderTest()
                .replace("campaign.toml", "type = \"heated\"", "type = \"loss\"")
                .replace("rig.toml", "[protection.cut_out]\ndeclared = true", "[protection.cut_out]\ndeclared = false");
        assertEquals(Level.STOP, only(loss, "PROTECT-CUT_OUT").level());
    }

    @Test
    void oneOfSeveralSensorsLost() {
        Finding one = only(new RigUnderTest().lose(100, 200, Series.Flag.OVER_RANGE, "T02"), "SENSOR-LOST");
        assertEquals(Level.CAUTION, one.level());
        assertEquals("T02 without a usable value for up to 100 s while heated", one.found());
    }

    @Test
    void allSensorsOfARoleLost() {
        RigUnderTest all = new RigUnderTest().lose(100, 200, Series.Flag.STUCK, "T01", "T02", "T03");
        assertEquals(Level.STOP, only(all, "SENSOR-ROLE-LOST").level());
    }

    @Test
    void lostSensorThatGuardsNobodyIsACaution() {
        Finding humidity = only(new RigUnderTest().without("RH"), "SENSOR-LOST");
        assertEquals(Level.CAUTION, humidity.level());
        assertEquals("run B01, humidity", humidity.subject());
    }

    @Test
    void aLoneSpikeOrEmptyCellIsNoLoss() {
        RigUnderTest spike = new RigUnderTest().lose(100, 100, Series.Flag.EMPTY, "T01", "T02", "T03");
        assertEquals(List.of(), ids(spike.findings(folder), Level.STOP));
    }

    /** 20 V · 2.05 A = 41 W on a strip for 40 W. */
    @Test
    void powerAboveTheRating() {
        Finding stop = only(new RigUnderTest().channel("I2", t -> t == 40 ? 2.05 : 1.0), "SUPPLY-RATING");
        assertEquals(Level.STOP, stop.level());
        assertEquals("run B01, strip H2", stop.subject());
        assertEquals("logs/B01-power.csv:49", stop.place().toString());
    }

    @Test
    void undeclaredInterlockIsAStop() {
        RigUnderTest rig = new RigUnderTest()
                .replace(
                        "rig.toml",
                        "[protection.flow_interlock]\ndeclared = true",
                        "[protection.flow_interlock]\ndeclared = false");
        assertEquals(Level.STOP, only(rig, "PROTECT-FLOW_INTERLOCK").level());
    }

    /** The test of 2025-02-20 is older than twelve months on 2026-03-10; that of 2025-03-10 is not. */
    @Test
    void testsGoOutOfDate() {
        RigUnderTest old = new RigUnderTest().replace("rig.toml", "tested = 2026-02-20", "tested = 2025-02-20");
        List<Finding> found = old.findings(folder.resolve("a")).stream()
                .filter(f -> f.subject().equals("flow interlock"))
                .toList();
        assertEquals(1, found.size());
        assertTrue(
                found.get(0).found().contains("last tested 2025-02-20"),
                found.get(0).found());
        RigUnderTest fresh = new RigUnderTest().replace("rig.toml", "tested = 2026-02-20", "tested = 2025-03-11");
        assertTrue(fresh.findings(folder.resolve("b")).stream()
                .noneMatch(f -> f.subject().equals("flow interlock")));
    }

    @Test
    void aMeasureWithoutTheDateOfATestIsACaution() {
        RigUnderTest rig = new RigUnderTest()
                .replace("rig.toml", "setting = \"mesh 12 mm\"\ntested = 2026-02-20", "setting = \"mesh 12 mm\"");
        Finding caution = only(rig, "PROTECT-TEST");
        assertEquals(Level.CAUTION, caution.level());
        assertEquals("fan guard", caution.subject());
    }

    @Test
    void aMeasureOfWhichNothingIsStatedIsNotChecked() {
        RigUnderTest rig = new RigUnderTest()
                .replace(
                        "rig.toml",
                        "[protection.fan_guard]\ndeclared = true\nsetting = \"mesh 12 mm\"\ntested = 2026-02-20\n",
                        "");
        assertEquals(Level.NOT_CHECKED, only(rig, "PROTECT-FAN_GUARD").level());
    }

    /** 20 V · 1.95 A twice is 650 W/m²: above 60 °C without flow, above the limit set here. */
    @Test
    void flowFailureWithAndWithoutProtection() {
        RigUnderTest guarded = new RigUnderTest()
                .replace("rig.toml", "lowest_material_limit = \"120 °C\"", "lowest_material_limit = \"62 °C\"")
                .replace("rig.toml", "85 °C, own sensor", "60 °C, own sensor")
                .channel("I1", t -> 1.95)
                .channel("I2", t -> 1.95);
        Finding caution = only(guarded, "FLOW-T-STILL-CUT");
        assertEquals(Level.CAUTION, caution.level());
    }

    @Test
    void flowFailureWithoutATestInDate() {
        RigUnderTest bare = new RigUnderTest()
                .replace("rig.toml", "lowest_material_limit = \"120 °C\"", "lowest_material_limit = \"62 °C\"")
                .replace("rig.toml", "85 °C, own sensor", "60 °C, own sensor")
                .replace("rig.toml", "tested = 2026-02-20", "tested = 2024-02-20")
                .channel("I1", t -> 1.95)
                .channel("I2", t -> 1.95);
        assertEquals(Level.STOP, only(bare, "FLOW-T-STILL").level());
    }

    /** 900 W on two strips for 40 W each, at 4 m/s. */
    @Test
    void plannedRun() {
        RigUnderTest plan = new RigUnderTest()
                .replace("campaign.toml", "speed = \"4 m/s\"", "speed = \"4 m/s\"\npower = \"900 W\"");
        List<String> stops = ids(plan.findings(folder), Level.STOP);
        assertTrue(stops.containsAll(List.of("PLAN-SURFACE", "SUPPLY-RATING")), stops::toString);
    }

    @Test
    void runWithoutValuesIsNotChecked() {
        List<Finding> findings = SafetyChecks.findings(new RigUnderTest().campaign(folder), Map.of());
        assertTrue(ids(findings, Level.NOT_CHECKED).contains("RUN-LOG"));
    }

    @Test
    void missingChannelsAreNotChecked() {
        List<Finding> findings = new RigUnderTest()
                .without("PD")
                .without("VA")
                .without("V1")
                .without("T01")
                .without("T02")
                .without("T03")
                .findings(folder);
        List<String> open = ids(findings, Level.NOT_CHECKED);
        assertTrue(open.containsAll(List.of("SURFACE-LIMIT", "FLOW-LOG", "SUPPLY-RATING")), open::toString);
    }

    @Test
    void generalCautionsDefer() {
        List<Cautions.Caution> cautions = Cautions.general();
        assertTrue(cautions.stream().allMatch(c -> !c.source().isBlank()));
        assertTrue(cautions.get(0).text().contains("Local codes"));
        assertTrue(cautions.get(0).text().contains("licensed electrical practice come first"));
        assertTrue(cautions.stream().anyMatch(c -> c.text().contains("A missing finding does not mean safe")));
    }
}
