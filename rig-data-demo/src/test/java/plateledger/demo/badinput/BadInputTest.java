package plateledger.demo.badinput;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestReporter;
import org.junit.jupiter.api.io.TempDir;
import plateledger.report.OutputFolder;

/**
 * A sound campaign with results, broken in one way per test: what the program says, its exit status, and that nothing in
 * the campaign folder has changed. What was said is published with the test's report.
 */
final class BadInputTest {
    @TempDir
    static Path shared;

    private static SmallCampaign sound;

    @TempDir
    Path own;

    private SmallCampaign campaign;

    @BeforeAll
    static void reduceOnce() throws IOException {
        sound = SmallCampaign.cutFromDemo(shared.resolve("panel"));
        Called called = Called.with("reduce", sound.folder().toString());
        assertEquals(0, called.status(), called::everythingSaid);
        assertTrue(Files.exists(sound.out().resolve("runs.csv")));
    }

    @BeforeEach
    void copy() throws IOException {
        campaign = sound.copy(own.resolve("panel"));
    }

    /** Reduces and checks the broken campaign: the same refusal from both, and not a byte of the folder changed. */
    private Called refused(TestReporter reporter) throws IOException {
        Map<String, String> before = SmallCampaign.everything(campaign.folder());
        Called check = Called.with("check", campaign.folder().toString());
        Called reduce = Called.with("reduce", campaign.folder().toString());
        reporter.publishEntry("reduce, status " + reduce.status(), reduce.err());
        assertEquals(before, SmallCampaign.everything(campaign.folder()), "former results");
        assertEquals(2, check.status(), check::everythingSaid);
        assertEquals(findings(check), findings(reduce));
        return reduce;
    }

    private static List<String> findings(Called called) {
        return called.err().lines().filter(line -> line.startsWith("  ")).toList();
    }

    @Test
    void missingLogFile(TestReporter reporter) throws IOException {
        Files.delete(campaign.folder().resolve("logs/B01-power.csv"));
        int line = campaign.line("campaign.toml", "logs/B01-power.csv");
        refused(reporter)
                .refusedOnce(
                        "campaign.toml:" + line,
                        "\"logs/B01-power.csv\", which is not there",
                        "a log file in the campaign folder",
                        "Copy it there");
    }

    @Test
    void unknownKey(TestReporter reporter) throws IOException {
        campaign.edit("campaign.toml", "storage_share_loss =", "storage_share_los =");
        int line = campaign.line("campaign.toml", "storage_share_los =");
        refused(reporter)
                .refusedOnce(
                        "campaign.toml:" + line + ":1: steady.storage_share_los",
                        "unknown key",
                        "storage_share_loss",
                        "Did you mean storage_share_loss?");
    }

    @Test
    void missingUnit(TestReporter reporter) throws IOException {
        campaign.edit("rig.toml", "width = \"300 mm ± 0.5 mm (limits)\"", "width = \"300 ± 0.5 (limits)\"");
        int line = campaign.line("rig.toml", "width = \"300 ±");
        refused(reporter)
                .refusedOnce(
                        "rig.toml:" + line + ":1: plate.baseline.width",
                        "\"300\" without a unit",
                        "a length with its unit",
                        "\"300 mm\"");
    }

    @Test
    void wrongDimension(TestReporter reporter) throws IOException {
        campaign.edit("rig.toml", "width = \"300 mm ± 0.5 mm (limits)\"", "width = \"300 s ± 0.5 s (limits)\"");
        int line = campaign.line("rig.toml", "width = \"300 s");
        refused(reporter)
                .refusedOnce(
                        "rig.toml:" + line + ":1: plate.baseline.width",
                        "\"300 s\", which is a time",
                        "a length in one of: m, mm",
                        "Write for example");
    }

    @Test
    void uncertaintyWithoutItsMeaning(TestReporter reporter) throws IOException {
        campaign.edit("rig.toml", "width = \"300 mm ± 0.5 mm (limits)\"", "width = \"300 mm ± 0.5 mm\"");
        int line = campaign.line("rig.toml", "width = \"300 mm ± 0.5 mm\"");
        refused(reporter)
                .refusedOnce(
                        "rig.toml:" + line + ":1: plate.baseline.width",
                        "\"± 0.5 mm\" without its meaning",
                        "what the number after ± is",
                        "\"300 mm ± 0.5 mm (limits)\"");
    }

    @Test
    void sensorOutsideThePlate(TestReporter reporter) throws IOException {
        campaign.edit("rig.toml", "x = \"112.5 mm ±", "x = \"1125 mm ±");
        int line = campaign.line("rig.toml", "x = \"1125 mm ±");
        refused(reporter)
                .refusedOnce(
                        "rig.toml:" + line, "T01 at 1125 mm", "100 mm to 500 mm from the leading edge", "Correct x");
    }

    @Test
    void channelsAbsentFromTheirLogs(TestReporter reporter) throws IOException {
        campaign.edit("logs/B01-plate.txt", ";T05;", ";Fuehler 5;").edit("logs/B09-power.csv", "I3 [A]", "I33 [A]");
        Called said = refused(reporter);
        assertAll(
                () -> assertTrue(said.err().startsWith("stop (2)"), said.err()),
                () -> said.names(
                        table("B01") + ": run B01, channel T05",
                        "no column of that name in logs/B01-plate.txt",
                        "a column for every channel that rig.toml names",
                        "[logger.<id>] columns"),
                () -> assertTrue(said.err().contains("\"Fuehler 5\" in logs/B01-plate.txt"), said.err()),
                () -> said.names(
                        table("B09") + ": run B09, channel I3",
                        "\"I33\" in logs/B09-power.csv",
                        "a column for every channel that rig.toml names",
                        "[logger.<id>] columns"),
                said::noTrace);
    }

    @Test
    void declaredTimeFormThatTheLogDoesNotHave(TestReporter reporter) throws IOException {
        campaign.editAll("logs/B01-plate.txt", "(?m)^(\\d\\d)\\.(\\d\\d)\\.(\\d{4}) ", "$3/$2/$1 ");
        refused(reporter)
                .refusedOnce(
                        "logs/B01-plate.txt:9:1: time", "2026/03/10 06:18:13", "dd.MM.yyyy HH:mm:ss", "time_pattern");
    }

    @Test
    void logWithoutReadableTime(TestReporter reporter) throws IOException {
        campaign.editAll("logs/B01-power.csv", "(?m)^2026-03-10T[^,]*,", "morning,");
        refused(reporter).refusedOnce("logs/B01-power.csv:2", "morning", "time", "time");
    }

    @Test
    void noOverlapBetweenLoggers(TestReporter reporter) throws IOException {
        campaign.edit("logs/B01-tunnel.tsv", "Start: 2026-03-10 06:15:47", "Start: 2026-03-11 06:15:47");
        Called said = refused(reporter);
        said.refusedOnce(
                table("B01") + ": run B01",
                "logs/B01-plate.txt",
                "a stretch of time that all logs of a run share",
                "clock_offset");
        said.names(table("B01"), "logs/B01-tunnel.tsv from 2026-03-11 06:16:28", "", "left_out");
        said.names(table("B01"), "logs/B01-plate.txt from 2026-03-10 06:16:38", "", "");
    }

    @Test
    void noSteadyWindow(TestReporter reporter) throws IOException {
        // 18 min from the start: heating up all the time
        campaign.cut("logs/B01-plate.txt", 8 + 540)
                .cut("logs/B01-power.csv", 1 + 540)
                .cut("logs/B01-tunnel.tsv", 4 + 1080);
        Map<String, String> inputs = inputs();
        Called check = Called.with("check", campaign.folder().toString());
        Called said = Called.with("reduce", campaign.folder().toString());
        reporter.publishEntry("reduce, status " + said.status(), said.err());
        assertAll(
                () -> assertEquals(1, check.status(), check::everythingSaid),
                () -> assertEquals(1, said.status(), said::everythingSaid),
                () -> assertTrue(said.err().startsWith("stop (1)"), said.err()),
                () -> said.names(
                        table("B01") + ": run B01",
                        "no steady window",
                        "a steady window with every channel the run needs",
                        "Run it longer"),
                () -> assertTrue(said.out().contains("Reduced 1 of 2 heated runs"), said.out()),
                said::noTrace,
                () -> assertEquals(inputs, inputs(), "inputs"),
                () -> assertTrue(
                        Files.readAllLines(campaign.out().resolve("findings.csv")).stream()
                                .anyMatch(row -> row.startsWith("RUN-NOT-REDUCED,stop,")),
                        "findings.csv"),
                () -> assertTrue(
                        Files.readAllLines(campaign.out().resolve("stations.csv")).stream()
                                .anyMatch(row -> row.startsWith("B09,")),
                        "the other run went on"));
    }

    @Test
    void binaryFileGivenAsLog(TestReporter reporter) throws IOException {
        byte[] bytes = new byte[20_000];
        new Random(7).nextBytes(bytes);
        Files.write(campaign.folder().resolve("logs/B01-power.csv"), bytes);
        refused(reporter).refusedOnce("logs/B01-power.csv", "binary", "text", "xport");
    }

    @Test
    void severalFaultsAreListedAtOnce(TestReporter reporter) throws IOException {
        campaign.edit("logs/B01-plate.txt", ";T05;", ";Fuehler 5;")
                .editAll("logs/B09-power.csv", "(?m)^2026-03-10T[^,]*,", "morning,")
                .edit("logs/BL2-tunnel.tsv", "Start: 2026-03-10", "Start: 2026-04-10");
        Files.write(campaign.folder().resolve("logs/BZ2-plate.txt"), new byte[300]);
        Files.write(campaign.folder().resolve("logs/BZ2-tunnel.tsv"), new byte[0]);
        Called said = refused(reporter);
        assertAll(
                () -> assertTrue(said.err().startsWith("stop (5)"), said.err()),
                () -> assertTrue(said.err().contains("channel T05"), said.err()),
                () -> assertTrue(said.err().contains("logs/B09-power.csv"), said.err()),
                () -> assertTrue(said.err().contains("run BL2"), said.err()),
                () -> assertTrue(said.err().contains("logs/BZ2-plate.txt"), said.err()),
                () -> assertTrue(said.err().contains("logs/BZ2-tunnel.tsv"), said.err()));
    }

    @Test
    void noSuchCampaignFolder(TestReporter reporter) {
        Path nowhere = own.resolve("pannel");
        Called said = Called.with("reduce", nowhere.toString());
        reporter.publishEntry("reduce, status " + said.status(), said.err());
        said.refusedOnce(nowhere.toString(), "no such folder", "campaign.toml", "Correct the name");
        assertFalse(Files.exists(nowhere));
    }

    @Test
    void aFileInsteadOfTheCampaignFolder(TestReporter reporter) {
        Path file = campaign.folder().resolve("campaign.toml");
        Called said = Called.with("check", file.toString());
        reporter.publishEntry("check, status " + said.status(), said.err());
        said.refusedOnce(file.toString(), "a file", "a folder that holds campaign.toml", "Name the folder");
    }

    @Test
    void unknownRun(TestReporter reporter) throws IOException {
        Map<String, String> before = SmallCampaign.everything(campaign.folder());
        Called said = Called.with("reduce", campaign.folder().toString(), "--runs", "B01,B10");
        reporter.publishEntry("reduce, status " + said.status(), said.err());
        said.refusedOnce("campaign.toml: runs to reduce", "B10", "heated runs: B01, B09", "Name heated runs");
        assertEquals(before, SmallCampaign.everything(campaign.folder()));
    }

    @Test
    void wrongUsage(TestReporter reporter) throws IOException {
        Map<String, String> before = SmallCampaign.everything(campaign.folder());
        Called said = Called.with("reduce", campaign.folder().toString(), "--quite");
        reporter.publishEntry("reduce --quite, status " + said.status(), said.err());
        assertAll(
                () -> assertEquals(2, said.status(), said::everythingSaid),
                () -> assertTrue(said.err().startsWith("Unknown option: '--quite'"), said.err()),
                () -> assertTrue(said.err().contains("--quiet"), said.err()),
                said::noTrace,
                () -> assertEquals(before, SmallCampaign.everything(campaign.folder())),
                () -> assertEquals(2, Called.with("reduce").status(), "no campaign named"));
    }

    /** A read-only folder does not stop every user, a file in the way of the folder does. */
    @Test
    void folderNotWritable(TestReporter reporter) throws IOException {
        Path file = own.resolve("results");
        Files.writeString(file, "a file in the way");
        Path out = file.resolve("out");
        Map<String, String> before = SmallCampaign.everything(own);
        Called said = reduceInto(OutputFolder.TO_DISK, out, reporter);
        said.refusedOnce(
                out.toString(),
                "cannot be written",
                "a folder that may be made and written",
                "Give yourself the right");
        assertEquals(before, SmallCampaign.everything(own));
    }

    @Test
    void diskFullDuringWriting(TestReporter reporter) throws IOException {
        OutputFolder.Writing full = (file, content) -> {
            if (file.endsWith("report.html")) {
                Files.write(file, java.util.Arrays.copyOf(content, content.length / 2));
                throw new IOException("No space left on device");
            }
            Files.write(file, content);
        };
        Map<String, String> before = SmallCampaign.everything(own);
        Called said = reduceInto(full, campaign.out(), reporter);
        said.refusedOnce(
                campaign.out().toString(), "the disk is full", "kB free", "Make room, or name a place on another disk");
        assertEquals(before, SmallCampaign.everything(own), "former results, and nothing beside them");
    }

    @Test
    void outputFolderThatHoldsSomethingElse(TestReporter reporter) throws IOException {
        Path out = own.resolve("thesis");
        Files.createDirectory(out);
        Files.writeString(out.resolve("chapter-1.txt"), "years of work");
        Map<String, String> before = SmallCampaign.everything(own);
        Called said = reduceInto(OutputFolder.TO_DISK, out, reporter);
        said.refusedOnce(
                out.toString(),
                "holds something else than results",
                "a folder of earlier results",
                "Name another place");
        assertEquals(before, SmallCampaign.everything(own));
    }

    @Test
    void faultInTheProgram(TestReporter reporter) throws IOException {
        Map<String, String> before = SmallCampaign.everything(own);
        for (Throwable fault : List.of(new IllegalStateException("put in by the test"), new AssertionError("put in"))) {
            Called said = reduceInto(
                    (file, content) -> {
                        Files.write(file, new byte[] {1});
                        if (fault instanceof Error error) {
                            throw error;
                        }
                        throw (RuntimeException) fault;
                    },
                    campaign.out(),
                    reporter);
            assertAll(
                    () -> assertEquals(3, said.status(), said::everythingSaid),
                    () -> assertTrue(said.err().startsWith("Fault in the program: " + fault), said.err()),
                    () -> assertTrue(said.err().contains("Please report this"), said.err()),
                    () -> assertEquals(before, SmallCampaign.everything(own), "former results, nothing beside them"));
        }
    }

    @Test
    void soundResultsReplaceFormerOnes() throws IOException {
        Called said = Called.with("reduce", campaign.folder().toString(), "--runs", "B09");
        assertEquals(0, said.status(), said::everythingSaid);
        Map<String, String> results = SmallCampaign.everything(campaign.out());
        assertNotEquals(SmallCampaign.everything(sound.out()), results, "else the tests above would prove nothing");
    }

    /** Place of a run's table in the campaign file. */
    private String table(String run) throws IOException {
        return "campaign.toml:" + (campaign.line("campaign.toml", "id = \"" + run + "\"") - 1) + ":1";
    }

    private Called reduceInto(OutputFolder.Writing writing, Path out, TestReporter reporter) {
        Called said = Called.with(
                writing, "reduce", campaign.folder().toString(), "--out", out.toString(), "--runs", "B09", "--quiet");
        reporter.publishEntry("reduce, status " + said.status(), said.err());
        return said;
    }

    private Map<String, String> inputs() throws IOException {
        return SmallCampaign.everything(campaign.folder()).entrySet().stream()
                .filter(entry -> !entry.getKey().startsWith("out"))
                .collect(Collectors.toMap(Map.Entry::getKey, Map.Entry::getValue, (a, b) -> a, TreeMap::new));
    }
}
