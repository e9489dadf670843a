package plateledger.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import plateledger.audit.Program;
import plateledger.campaign.CampaignReader;
import plateledger.finding.Level;

final class CommandLineProgramTest {
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

    @Test
    void withoutArgumentsItPrintsTheHelp() {
        Said said = run();
        assertEquals(0, said.status);
        assertTrue(said.out.contains("Usage: plateledger"), said.out);
        assertTrue(said.out.contains("Example:"), said.out);
    }

    @Test
    void versionIsThatOfTheBuild() {
        Said said = run("--version");
        assertEquals(0, said.status);
        assertTrue(said.out.strip().matches("plateledger \\d+\\.\\d+\\.\\d+.*"), said.out);
        assertFalse(Program.versionOnly().contains("$"), "the build puts the version in");
    }

    @Test
    void everyCommandHasHelpWithAnExample() {
        StringWriter nothing = new StringWriter();
        CommandLine line =
                CommandLineProgram.commandLine(new Terminal(new PrintWriter(nothing), new PrintWriter(nothing), false));
        List<String> names = line.getSubcommands().keySet().stream()
                .filter(name -> !name.equals("completion"))
                .toList();
        assertTrue(names.containsAll(List.of("reduce", "check", "new", "properties")), names.toString());
        for (String name : names) {
            Said said = run(name, "--help");
            assertEquals(0, said.status, name);
            assertTrue(said.out.contains("Example"), said.out);
            assertTrue(said.out.contains("plateledger " + name + " "), said.out);
            assertEquals("", said.err);
        }
    }

    @Test
    void completionScriptNamesTheCommands() {
        Said said = run("completion");
        assertEquals(0, said.status);
        assertTrue(said.out.contains("complete -F _complete_plateledger"), "a bash completion");
        assertTrue(said.out.contains("properties"));
    }

    @Test
    void aTypingErrorGetsAHintAndStatusTwo() {
        Said said = run("propertis", "--fluid", "air");
        assertEquals(2, said.status);
        assertTrue(said.err.contains("Did you mean: plateledger properties"), said.err);
        assertEquals("", said.out);
        Said option = run("properties", "--flud", "air");
        assertEquals(2, option.status);
        assertTrue(option.err.contains("--fluid"), option.err);
    }

    @Test
    void aFaultInTheProgramHasStatusThree() {
        StringWriter err = new StringWriter();
        CommandLine line = CommandLineProgram.commandLine(
                new Terminal(new PrintWriter(new StringWriter()), new PrintWriter(err, true), false));
        line.addSubcommand(new Faulty());
        assertEquals(3, line.execute("faulty"));
        assertTrue(err.toString().contains("IllegalStateException: a bug"), err.toString());
    }

    @Command(name = "faulty")
    private static final class Faulty implements Runnable {
        @Override
        public void run() {
            throw new IllegalStateException("a bug");
        }
    }

    @Test
    void propertiesPrintsATableWithUncertainty() {
        Said said = run("properties", "--fluid", "air", "--temperature", "35C", "--pressure", "98kPa");
        assertEquals(0, said.status, said.err);
        assertTrue(said.out.contains("density"), said.out);
        assertTrue(said.out.contains("kg/m³"), said.out);
        assertEquals("", said.err);
    }

    @Test
    void propertiesAreTheSameTextInEveryLocale() {
        String[] args = {
            "properties", "--fluid", "air", "--temperature", "35 °C", "--pressure", "980 hPa", "--humidity", "40 %"
        };
        String before = run(args).out;
        Locale locale = Locale.getDefault();
        try {
            for (Locale other : List.of(Locale.GERMANY, Locale.forLanguageTag("ar-EG-u-nu-arab"))) {
                Locale.setDefault(other);
                assertEquals(before, run(args).out);
            }
        } finally {
            Locale.setDefault(locale);
        }
    }

    @Test
    void propertiesRefusesWhatItCannotAnswer() {
        assertEquals(2, run("properties", "--fluid", "air", "--temperature", "35", "--pressure", "98kPa").status);
        Said range = run("properties", "--fluid", "air", "--temperature", "900C", "--pressure", "98kPa");
        assertEquals(2, range.status);
        assertTrue(range.err.contains("expected"), range.err);
        assertEquals(2, run("properties", "--fluid", "helium", "--temperature", "35C", "--pressure", "98kPa").status);
        assertEquals(
                2,
                run("properties", "--fluid", "air", "--temperature", "35C", "--pressure", "98kPa", "--humidity", "140%")
                        .status);
    }

    @Test
    void newWritesASkeletonThatTheReaderAccepts() throws Exception {
        Path campaign = folder.resolve("spring-panel");
        Said said = run("new", campaign.toString());
        assertEquals(0, said.status, said.err);
        CampaignReader.Outcome outcome = CampaignReader.read(campaign);
        assertFalse(outcome.campaign().runs().isEmpty(), "planned runs to start from");
        assertTrue(outcome.notes().stream().noneMatch(f -> f.level() == Level.STOP));
        assertTrue(Files.isDirectory(campaign.resolve("logs")));
    }

    @Test
    void newFillsInFormatAndColumnsOfGivenLogs() throws Exception {
        Path log = folder.resolve("plate.txt");
        Files.writeString(log, """
                recorder
                site A
                Time;T01;T02
                ;°C;°C
                10.03.2026 10:20:00;21,50;22,75
                10.03.2026 10:20:02;21,51;22,76
                10.03.2026 10:20:04;21,52;22,77
                """, StandardCharsets.UTF_8);
        Path campaign = folder.resolve("fresh");
        Said said = run("new", campaign.toString(), "--from", log.toString());
        assertEquals(0, said.status, said.err);
        String text = Files.readString(campaign.resolve("campaign.toml"));
        assertTrue(text.contains("[logger.plate.format]"), text);
        assertTrue(text.contains("delimiter = \";\""), text);
        assertTrue(text.contains("decimal_mark = \",\""), text);
        assertTrue(text.contains("header_line = 3"), text);
        assertTrue(text.contains("units_row = true"), text);
        assertTrue(text.contains("time_pattern = \"dd.MM.yyyy HH:mm:ss\""), text);
        String instruments = Files.readString(campaign.resolve("instruments.toml"));
        assertTrue(instruments.contains("\"T02\""), instruments);
        assertEquals(1, CampaignReader.read(campaign).campaign().loggers().size(), "the reader accepts it");
    }

    @Test
    void newTouchesNoFolderThatHoldsSomething() throws Exception {
        Files.writeString(folder.resolve("thesis.txt"), "years of work");
        Said said = run("new", folder.toString());
        assertEquals(2, said.status);
        assertTrue(said.err.contains("something in its place"), said.err);
        try (Stream<Path> entries = Files.list(folder)) {
            assertEquals(1, entries.count());
        }
    }

    @Test
    void newFromAMissingLogWritesNothing() {
        Path campaign = folder.resolve("fresh");
        Said said = run(
                "new",
                campaign.toString(),
                "--from",
                folder.resolve("no-such.txt").toString());
        assertEquals(2, said.status);
        assertFalse(Files.exists(campaign));
    }
}
