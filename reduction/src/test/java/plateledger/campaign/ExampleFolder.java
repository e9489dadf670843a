package plateledger.campaign;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import plateledger.finding.Finding;
import plateledger.finding.RefusedException;

/** A copy of the good example campaign in which a test changes what it wants to be wrong. */
final class ExampleFolder {
    static final Path EXAMPLE = Path.of("src/test/resources/plateledger/campaign/example");

    private final Path folder;

    private ExampleFolder(Path folder) {
        this.folder = folder;
    }

    static ExampleFolder in(Path temporary) throws IOException {
        try (Stream<Path> files = Files.walk(EXAMPLE)) {
            for (Path file : files.filter(Files::isRegularFile).toList()) {
                Path copy = temporary.resolve(EXAMPLE.relativize(file).toString());
                Files.createDirectories(copy.resolveSibling("."));
                Files.copy(file, copy);
            }
        }
        return new ExampleFolder(temporary);
    }

    Path path() {
        return folder;
    }

    /** Replaces the first occurrence of a text, which must be there. */
    ExampleFolder replace(String file, String old, String replacement) throws IOException {
        String text = Files.readString(folder.resolve(file));
        assertTrue(text.contains(old), () -> file + " holds no \"" + old + "\"");
        int at = text.indexOf(old);
        Files.writeString(
                folder.resolve(file), text.substring(0, at) + replacement + text.substring(at + old.length()));
        return this;
    }

    /** Line, from 1, of the first occurrence of a text. */
    long lineOf(String file, String text) throws IOException {
        String whole = Files.readString(folder.resolve(file));
        int at = whole.indexOf(text);
        assertTrue(at >= 0, () -> file + " holds no \"" + text + "\"");
        return 1 + whole.substring(0, at).lines().count() - (at > 0 && whole.charAt(at - 1) != '\n' ? 1 : 0);
    }

    CampaignReader.Outcome read() throws RefusedException {
        return CampaignReader.read(folder);
    }

    /** The findings of a folder that must be refused. */
    List<Finding> refused() {
        try {
            List<Finding> notes = CampaignReader.read(folder).notes();
            throw new AssertionError("read without refusal, notes " + notes);
        } catch (RefusedException e) {
            return e.findings();
        }
    }
}
