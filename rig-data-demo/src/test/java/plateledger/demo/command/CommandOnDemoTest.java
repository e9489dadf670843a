package plateledger.demo.command;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import plateledger.cli.CommandLineProgram;
import plateledger.cli.Terminal;

/** What a user sees and gets from {@code reduce} and {@code check} on the demo campaign. */
final class CommandOnDemoTest {
    private static final Path DEMO = Path.of("cabinet-door");

    @TempDir
    Path folder;

    private record Said(int status, String out, String err) {}

    private static Said run(String... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int status = CommandLineProgram.run(
                new Terminal(new PrintWriter(out, true), new PrintWriter(err, true), false), args);
        return new Said(status, out.toString(), err.toString());
    }

    private static Map<String, byte[]> files(Path root) throws IOException {
        Map<String, byte[]> files = new TreeMap<>();
        try (Stream<Path> all = Files.walk(root)) {
            for (Path file : all.filter(Files::isRegularFile).toList()) {
                files.put(root.relativize(file).toString().replace('\\', '/'), Files.readAllBytes(file));
            }
        }
        return files;
    }

    /** Copies the three keyed files; of the logs only those asked for. */
    private Path copy(String name, boolean logs) throws IOException {
        Path copy = folder.resolve(name);
        try (Stream<Path> all = Files.walk(DEMO)) {
            for (Path file : all.filter(Files::isRegularFile).toList()) {
                Path relative = DEMO.relativize(file);
                if (relative.startsWith("out") || (relative.startsWith("logs") && !logs)) {
                    continue;
                }
                Path target = copy.resolve(relative);
                Files.createDirectories(target.getParent() == null ? copy : target.getParent());
                Files.copy(file, target);
            }
        }
        return copy;
    }

    @Test
    void reduceTwiceGivesTheSameBytesInAnyLocale() throws Exception {
        Path first = folder.resolve("first");
        Path second = folder.resolve("second");
        Said said = run("reduce", DEMO.toString(), "--out", first.toString());
        assertEquals(0, said.status, said.err);
        assertTrue(said.out.contains("Reduced 32 of 32 heated runs."), said.out);
        assertTrue(said.out.contains("Fit product: Nu = "), said.out);
        assertTrue(said.out.contains("Findings: 0 stop, "), said.out);
        assertTrue(said.out.contains(first.toString()), said.out);
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            Said quiet = run("reduce", DEMO.toString(), "--out", second.toString(), "--quiet");
            assertEquals(0, quiet.status, quiet.err);
            assertEquals("", quiet.out);
            assertEquals("", quiet.err);
        } finally {
            Locale.setDefault(before);
        }
        Map<String, byte[]> once = files(first);
        Map<String, byte[]> twice = files(second);
        assertEquals(once.keySet(), twice.keySet());
        assertTrue(once.keySet()
                .containsAll(List.of(
                        "stations.csv",
                        "runs.csv",
                        "budget.csv",
                        "fit.json",
                        "findings.csv",
                        "audit.json",
                        "written.json",
                        "report.html",
                        "figures/nu-re.svg")));
        once.forEach((name, content) -> {
            if (!name.equals("written.json")) {
                assertArrayEquals(content, twice.get(name), name);
            }
        });
        String audit = Files.readString(first.resolve("audit.json"));
        assertFalse(audit.contains(folder.toString()), "no path of the machine");
        assertTrue(audit.contains("\"logs/B01-plate.txt\""), audit.substring(0, 400));
    }

    @Test
    void aFolderThatHoldsSomethingElseIsRefusedAndLeftAlone() throws Exception {
        Path out = folder.resolve("taken");
        Files.createDirectory(out);
        Files.writeString(out.resolve("thesis.txt"), "years of work");
        Said said = run("reduce", DEMO.toString(), "--runs", "P16", "--out", out.toString(), "--quiet");
        assertEquals(2, said.status);
        assertTrue(said.err.contains("holds something else than results"), said.err);
        assertEquals(1, files(out).size());
    }

    @Test
    void aRunThatTheCampaignDoesNotHaveIsRefused() {
        Said said = run(
                "reduce",
                DEMO.toString(),
                "--runs",
                "P99",
                "--out",
                folder.resolve("o").toString());
        assertEquals(2, said.status);
        assertTrue(said.err.contains("P99, which is not declared"), said.err);
        assertTrue(said.err.contains("P16"), "what there is: " + said.err);
        assertFalse(Files.exists(folder.resolve("o")));
    }

    @Test
    void missingLogsAreListedAllAtOnceAndNothingIsWritten() throws Exception {
        Path campaign = copy("no-logs", false);
        Said said = run("reduce", campaign.toString());
        assertEquals(2, said.status);
        assertTrue(said.err.contains("logs/B01-plate.txt"), said.err);
        assertTrue(said.err.contains("logs/P16-tunnel.tsv"), said.err);
        assertTrue(said.err.contains("Nothing was written;"), said.err);
        assertFalse(Files.exists(campaign.resolve("out")));
        assertEquals(2, run("check", campaign.toString()).status);
    }

    @Test
    void anUnknownKeyIsNamedWithItsPlace() throws Exception {
        Path campaign = copy("unknown-key", true);
        Path file = campaign.resolve("campaign.toml");
        String text = Files.readString(file, StandardCharsets.UTF_8);
        Files.writeString(file, text.replaceFirst("zone =", "zoen = \"x\"\nzone ="), StandardCharsets.UTF_8);
        Said said = run("reduce", campaign.toString());
        assertEquals(2, said.status);
        assertTrue(said.err.contains("campaign.toml:") && said.err.contains("zoen"), said.err);
    }

    @Test
    void checkFindsTheBlemishesOfTheDemoAndNoStop() {
        Said said = run("check", DEMO.toString());
        assertEquals(0, said.status, said.out + said.err);
        assertTrue(said.out.contains("0 stop, "), said.out);
        for (String blemish : List.of("stuck", "spike", "over-range", "clock_offset")) {
            assertTrue(said.out.contains(blemish), blemish);
        }
        assertEquals("", said.err);
    }
}
