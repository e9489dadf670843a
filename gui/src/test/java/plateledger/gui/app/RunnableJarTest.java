package plateledger.gui.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.TimeUnit;
import java.util.jar.JarFile;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.zip.ZipEntry;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The finished jar, as a user has it. Runs after it is packed. */
final class RunnableJarTest {
    private static final Path JAR = Path.of(System.getProperty("plateledger.jar", "target/plateledger.jar"));
    private static final String THIRD_PARTY = "META-INF/third-party/";

    @TempDir
    Path folder;

    private record Said(int status, String out, String err) {}

    private Said run(Map<String, String> environment, String... args) throws IOException, InterruptedException {
        List<String> command = new ArrayList<>(
                List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString(), "-jar", JAR.toString()));
        command.addAll(List.of(args));
        Path out = folder.resolve("out.txt");
        Path err = folder.resolve("err.txt");
        ProcessBuilder builder =
                new ProcessBuilder(command).redirectOutput(out.toFile()).redirectError(err.toFile());
        builder.environment().putAll(environment);
        if (!environment.containsKey("DISPLAY")) {
            builder.environment().remove("DISPLAY");
        }
        Process process = builder.start();
        if (!process.waitFor(120, TimeUnit.SECONDS)) {
            process.destroyForcibly();
            throw new IOException("the program did not end: " + command);
        }
        return new Said(
                process.exitValue(),
                Files.readString(out, StandardCharsets.UTF_8),
                Files.readString(err, StandardCharsets.UTF_8));
    }

    private static List<String> entries() throws IOException {
        try (JarFile jar = new JarFile(JAR.toFile())) {
            return jar.stream().map(ZipEntry::getName).toList();
        }
    }

    @Test
    void withoutArgumentsAndDisplayItPrintsTheHelp() throws Exception {
        Said said = run(Map.of());
        assertEquals(0, said.status, said.err);
        assertTrue(said.out.contains("Usage: plateledger"), said.out);
        assertEquals("", said.err);
    }

    @Test
    void aDisplayThatDoesNotAnswerCountsAsNone() throws Exception {
        Said said = run(Map.of("DISPLAY", ":987"));
        assertEquals(0, said.status, said.err);
        assertTrue(said.out.contains("Usage: plateledger"), said.out);
    }

    @Test
    void withArgumentsItNeedsNoDisplayAndKeepsQuiet() throws Exception {
        Said said = run(
                Map.of("DISPLAY", ":987"),
                "properties",
                "--fluid",
                "air",
                "--temperature",
                "35C",
                "--pressure",
                "98kPa",
                "--humidity",
                "40%");
        assertEquals(0, said.status, said.err);
        assertTrue(said.out.contains("density"), said.out);
        assertEquals("", said.err);
    }

    @Test
    void wrongUsageHasStatusTwo() throws Exception {
        Said said = run(Map.of(), "reduse", "campaign");
        assertEquals(2, said.status);
        assertTrue(said.err.contains("reduse"), said.err);
    }

    @Test
    void holdsNoSignatureAndNoModuleDescriptor() throws Exception {
        for (String name : entries()) {
            assertFalse(name.endsWith("module-info.class"), name);
            assertFalse(name.matches("META-INF/[^/]+\\.(SF|DSA|RSA|EC)"), name);
        }
    }

    @Test
    void holdsNoEntryTwice() throws Exception {
        Set<String> seen = new HashSet<>();
        for (String name : entries()) {
            assertTrue(seen.add(name), name);
        }
    }

    @Test
    void licenceOfThisProgramIsApache() throws Exception {
        try (JarFile jar = new JarFile(JAR.toFile())) {
            ZipEntry entry = Objects.requireNonNull(jar.getEntry("META-INF/LICENSE"));
            try (InputStream in = jar.getInputStream(entry)) {
                String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
                assertTrue(text.contains("Apache License") && text.contains("Version 2.0, January 2004"));
            }
        }
    }

    @Test
    void everyBundledLibraryBringsItsLicence() throws Exception {
        Set<String> bundled = new TreeSet<>();
        Pattern line = Pattern.compile("^\\s+([^:\\s]+):([^:]+):jar:");
        for (String text : Files.readAllLines(Path.of("target/test-classes/bundled-artifacts.txt"))) {
            Matcher matcher = line.matcher(text);
            if (matcher.find() && !matcher.group(1).equals("plateledger")) {
                bundled.add(matcher.group(2));
            }
        }
        assertTrue(bundled.contains("jfreechart") && bundled.contains("picocli"), bundled.toString());
        Set<String> licensed = new TreeSet<>();
        for (String name : entries()) {
            if (name.startsWith(THIRD_PARTY) && name.matches(".*/(LICENSE|LICENSE\\.txt)")) {
                licensed.add(name.substring(THIRD_PARTY.length()).replaceFirst("/.*", ""));
            }
        }
        bundled.add("dejavu-fonts"); // fonts come as files, not as a library
        assertEquals(bundled, licensed);
    }
}
