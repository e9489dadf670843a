package plateledger.campaign;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plateledger.finding.Finding;
import plateledger.finding.Level;

/** The good example with one thing wrong at a time: one finding, at its line, with words that help. */
final class CampaignRefusalTest {
    private static final String CAMPAIGN = "campaign.toml";
    private static final String RIG = "rig.toml";
    private static final String INSTRUMENTS = "instruments.toml";

    @TempDir
    private Path temporary;

    private ExampleFolder folder;

    @BeforeEach
    void copy() throws IOException {
        folder = ExampleFolder.in(temporary);
    }

    /** Each row: file, text in the good example, what it is replaced by, id, subject, part of the message. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "rig.toml | emissivity = \"0.95 | emisivity = \"0.95 | KEY-UNKNOWN | plate.baseline.emisivity | Did you mean emissivity?",
                "rig.toml | length = \"500 mm ± 0.5 mm | length = \"500 ± 0.5 mm | KEY-UNIT | plate.baseline.length | found \"500\" without a unit",
                "rig.toml | length = \"500 mm | length = \"500 V | KEY-DIMENSION | plate.baseline.length | \"500 V\", which is a voltage; expected a length",
                "rig.toml | ± 0.5 mm (limits) | ± 0.5 mm | KEY-MEANING | plate.baseline.length | Write \"500 mm ± 0.5 mm (k=2)\", \"500 mm ± 0.5 mm (limits)\"",
                "rig.toml | 0.95, u = 0.015 | 0.95 | KEY-UNCERTAINTY | plate.baseline.emissivity | \"0.95 (exact)\"",
                "rig.toml | 0.95, u = 0.015 | 1.95, u = 0.015 | KEY-RANGE | plate.baseline.emissivity | expected above 0, at most 1",
                "rig.toml | x = \"450 mm | x = \"510 mm | RIG-SENSOR-OUTSIDE | plate.baseline.thermocouple[2].x | junction T02 at 510 mm; expected a junction on the heated sheet, 100 mm to 500 mm",
                "rig.toml | z = \"-120 mm\" | z = \"-160 mm\" | RIG-SENSOR-OUTSIDE | plate.baseline.thermocouple[3].z | within 150 mm of the centre line",
                "rig.toml | from = \"300 mm\" | from = \"290 mm\" | RIG-STRIP-OVERLAP | plate.baseline.heater[2].from | the end of strip H1, 300 mm",
                "rig.toml | from = \"300 mm\" | from = \"310 mm\" | RIG-STRIP-GAP | plate.baseline.heater[2].from | the end of strip H1, 300 mm",
                "rig.toml | to = \"500 mm\" | to = \"510 mm\" | RIG-STRIP-OUTSIDE | plate.baseline.heater[2].to | heated span, 100 mm to 500 mm",
                "rig.toml | id = \"H2\" | id = \"H1\" | RIG-ID-TWICE | plate.baseline.heater[2].id | an id of its own",
                "rig.toml | channel = \"T02\" | channel = \"T01\" | RIG-CHANNEL-TWICE | plate.baseline.thermocouple[2].channel | channel T01, used by plate.baseline.thermocouple[1].channel too",
                "rig.toml | plenum = [\"TP1\"] | plenum = [\"TW1\"] | RIG-CHANNEL-TWICE | surroundings.plenum | used by surroundings.walls too",
                "rig.toml | channel = \"T02\" | channel = \"T20\" | RIG-CHANNEL-UNOWNED | plate.baseline.thermocouple[2].channel | which no instrument owns",
                "rig.toml | voltage = \"V2\" | voltage = \"T03\" | RIG-CHANNEL-KIND | plate.baseline.heater[2].voltage | a channel that measures voltage",
                "rig.toml | like = \"baseline\" | like = \"base\" | KEY-LIKE | plate.product.like | one of: baseline, product",
                "rig.toml | heated_end = \"500 mm | heated_end = \"501 mm | KEY-RANGE | plate.baseline.heated_end | at most the length, 500 mm",
                "rig.toml | to = \"5 m/s\" | to = \"6 m/s\" | RIG-METER-OVERLAP | surroundings.speed_meter[1].from | the end of the range of VA",
                "rig.toml | face-up | face-uo | KEY-VALUE | plate.baseline.orientation | Did you mean face-up?",
                "rig.toml | touchable = false | touchable = \"no\" | KEY-TYPE | limits.touchable | true or false without quotation marks",
                "rig.toml | flow_present = \"1 m/s\" | # | KEY-MISSING | limits.flow_present | Add flow_present to limits.",
                "instruments.toml | \"-10 °C\", \"150 °C\" | \"150 °C\", \"-10 °C\" | KEY-RANGE | instrument.thermocouples.range | two values, the lower first",
                "instruments.toml | offset = \"0 K | offset = \"0 °C | KEY-DIMENSION | instrument.thermocouples.offset | A difference of temperatures is written in K.",
                "instruments.toml | [\"I1\", \"I2\"] | [\"I1\", \"I2\", \"I2\"] | INSTRUMENT-CHANNEL-TWICE | instrument.shunts.channels | which instrument shunts owns already",
                "instruments.toml | gain_origin = \"22 °C\" | # | KEY-MISSING | instrument.thermocouples.gain_origin | Add gain_origin",
                "instruments.toml | due = 2027-01-15 | due = 2025-01-15 | KEY-RANGE | instrument.thermocouples.due | a date after the calibration",
                "campaign.toml | logs/B01-plate.txt | logs/B99-plate.txt | CAMPAIGN-LOG-MISSING | run[2].logs.plate | \"logs/B99-plate.txt\", which is not there",
                "campaign.toml | logs/B01-plate.txt | ../B01-plate.txt | CAMPAIGN-LOG-OUTSIDE | run[2].logs.plate | a path inside the campaign folder",
                "campaign.toml | logs/B01-plate.txt | /etc/hostname | CAMPAIGN-LOG-OUTSIDE | run[2].logs.plate | a path inside the campaign folder",
                "campaign.toml | logs/B01-plate.txt | logs\\\\B01-plate.txt | CAMPAIGN-LOG-OUTSIDE | run[2].logs.plate | with /",
                "campaign.toml | { plate = \"logs/B01 | { plat = \"logs/B01 | CAMPAIGN-LOGGER | run[2].logs.plat | one of: plate, power",
                "campaign.toml | id = \"B01\" | id = \"Z01\" | CAMPAIGN-ID-TWICE | run[2].id | the same stands at campaign.toml:",
                "campaign.toml | plate = \"baseline\" | plate = \"basline\" | CAMPAIGN-PLATE | run[2].plate | a plate of rig.toml: baseline, product",
                "campaign.toml | x = \"50 mm\" | x = \"550 mm\" | CAMPAIGN-TRIP-OUTSIDE | run[2].trip | a trip at 550 mm",
                "campaign.toml | speed = \"12 m/s\" | speed = \"45 m/s\" | CAMPAIGN-SPEED | run[2].speed | within the range of a speed meter",
                "campaign.toml | speed = \"12 m/s\" | speed = \"12 m/s ± 1 m/s (limits)\" | KEY-UNCERTAINTY | run[2].speed | since it is a setting",
                "campaign.toml | speed = \"12 m/s\" | # | KEY-MISSING | run[2].speed | Add speed to this run.",
                "campaign.toml | regime = \"turbulent\" | # | KEY-MISSING | run[2].regime | laminar, turbulent or product",
                "campaign.toml | 10:45:00 | 10:15:00 | KEY-RANGE | run[2].window | a time after start",
                "campaign.toml | Europe/Vienna | Europe/Wien | KEY-VALUE | zone | such as \"Europe/Vienna\"",
                "campaign.toml | type = \"heated\" | type = \"heatd\" | KEY-VALUE | run[2].type | Did you mean heated?",
                "campaign.toml | dd.MM.yyyy | bb.MM.yyyy | KEY-VALUE | logger.plate.format.time_pattern | a pattern such as",
                "campaign.toml | decimal_mark = \",\" | decimal_mark = \";\" | KEY-VALUE | logger.plate.format.decimal_mark | one of: \".\" \",\"",
                "campaign.toml | day = 2026-03-10 | day = \"10.3.2026\" | KEY-TYPE | run[2].day | a date such as 2026-03-10",
            })
    void oneFaultGivesOneFindingAtItsLine(String file, String good, String bad, String id, String subject, String words)
            throws IOException {
        long line = folder.lineOf(file, good);
        folder.replace(file, good, bad);
        List<Finding> stops = stops(folder.refused());
        Finding finding = stops.get(0);
        assertEquals(1, stops.size(), stops::toString);
        assertEquals(id, finding.id(), finding::message);
        assertTrue(finding.subject().startsWith(subject), finding::message);
        assertTrue(finding.message().contains(words), finding::message);
        if (!id.equals("KEY-MISSING") && !id.startsWith("INSTRUMENT")) {
            assertTrue(finding.place().toString().startsWith(place(file, line, id)), finding::message);
        }
    }

    /** An overlap of ranges is reported at the faster meter, all else at the line that was changed. */
    private String place(String file, long line, String id) throws IOException {
        long at = id.equals("RIG-METER-OVERLAP") ? folder.lineOf(RIG, "from = \"5 m/s\"") : line;
        return file + ":" + at + ":";
    }

    @Test
    void placesAreTheKeysOwnLineAndColumn() throws IOException {
        folder.replace(RIG, "x = \"450 mm", "  x = \"550 mm");
        Finding finding = folder.refused().get(0);
        assertEquals(
                "rig.toml:" + folder.lineOf(RIG, "  x = \"550 mm") + ":3",
                finding.place().toString());
    }

    @Test
    void faultsOfAllThreeFilesAreSaidAtOnce() throws IOException {
        folder.replace(RIG, "emissivity = \"0.95, u = 0.015\"", "emissivity = \"0.95\"")
                .replace(INSTRUMENTS, "gain = \"0, u = 0.0005\"", "gian = \"0, u = 0.0005\"")
                .replace(CAMPAIGN, "logs/B01-power.csv", "logs/none.csv")
                .replace(CAMPAIGN, "x = \"50 mm\"", "x = \"50 Pa\"");
        List<Finding> stops = stops(folder.refused());
        assertEquals(
                List.of("CAMPAIGN-LOG-MISSING", "KEY-DIMENSION", "KEY-UNKNOWN", "KEY-UNCERTAINTY"),
                stops.stream().map(Finding::id).toList());
    }

    @Test
    void afterASyntaxErrorInOneFileTheOthersAreStillChecked() throws IOException {
        folder.replace(INSTRUMENTS, "bath = \"A\"", "bath = A").replace(RIG, "x = \"450 mm", "x = \"550 mm");
        List<String> ids = folder.refused().stream().map(Finding::id).toList();
        assertEquals(List.of("FILE-SYNTAX", "RIG-SENSOR-OUTSIDE"), ids);
    }

    @Test
    void aMissingFileIsNamed() throws IOException {
        Files.delete(folder.path().resolve(RIG));
        Finding finding = folder.refused().get(0);
        assertEquals("FILE-MISSING", finding.id());
        assertEquals(RIG, finding.place().file());
    }

    @Test
    void aFileInAnotherEncodingIsRefusedWithTheLine() throws IOException {
        long line = folder.lineOf(RIG, "±");
        String text = Files.readString(folder.path().resolve(RIG));
        Files.write(folder.path().resolve(RIG), text.getBytes(StandardCharsets.ISO_8859_1));
        Finding finding = folder.refused().get(0);
        assertEquals("FILE-BYTES", finding.id());
        assertEquals(line, finding.place().line());
    }

    @Test
    void overdueCalibrationIsJudgedByTheDayOfTheRun() throws Exception {
        folder.replace(INSTRUMENTS, "due = 2027-01-15", "due = 2026-03-10");
        List<Finding> notes = folder.read().notes();
        assertEquals(1, notes.size(), notes::toString);
        assertEquals("INSTRUMENT-OVERDUE", notes.get(0).id());
        assertEquals(Level.CAUTION, notes.get(0).level());
        assertTrue(
                notes.get(0).found().contains("run P01 on 2026-03-11"),
                notes.get(0).found());
        assertEquals(folder.lineOf(INSTRUMENTS, "due = "), notes.get(0).place().line());
    }

    @Test
    void whatIsNotSaidIsNoted() throws Exception {
        folder.replace(RIG, "[protection.earth]\ndeclared = true", "[protection.fan_guard]\ndeclared = true")
                .replace(
                        RIG,
                        "[protection.fan_guard]\ndeclared = true\nsetting = \"mesh 12 mm\"\ntested = 2026-02-20",
                        "")
                .replace(CAMPAIGN, "clock_offset = \"0 s, u = 1 s\"", "")
                .replace(INSTRUMENTS, "daily_drift = \"0 K, u = 0.02 K\"", "");
        CampaignReader.Outcome outcome = folder.read();
        assertEquals(
                List.of("CAMPAIGN-CLOCK", "RIG-PROTECTION-SILENT", "INSTRUMENT-NOT-STATED"),
                outcome.notes().stream().map(Finding::id).toList());
        assertEquals("protection.earth", outcome.notes().get(1).subject());
        assertTrue(!outcome.campaign().logger("power").orElseThrow().clockDeclared());
    }

    @Test
    void aLogNamedTwiceAndAFitWithoutRunsAreCautions() throws Exception {
        folder.replace(CAMPAIGN, "logs/B01-plate.txt", "logs/Z01-plate.txt")
                .replace(CAMPAIGN, "id = \"product\"\nplate = \"product\"", "id = \"product\"\nplate = \"baseline\"");
        assertEquals(
                List.of("CAMPAIGN-LOG-TWICE", "CAMPAIGN-FIT-EMPTY"),
                folder.read().notes().stream().map(Finding::id).toList());
    }

    @Test
    void aFaultInABasePlateIsSaidOnce() throws IOException {
        folder.replace(RIG, "conductivity = \"14.9 W/mK, u = 3 %\"", "");
        List<Finding> findings = folder.refused();
        assertEquals(1, findings.size(), findings::toString);
        assertEquals("plate.baseline.sheet.conductivity", findings.get(0).subject());
    }

    private static List<Finding> stops(List<Finding> findings) {
        return findings.stream()
                .filter(finding -> finding.level() == Level.STOP)
                .toList();
    }
}
