package plateledger.validation;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Order;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Writes {@code docs/VALIDATION.md} from what the published checks recorded, and holds the committed document against the
 * records of an ordinary build. Runs last of all classes, so that there is something to read.
 */
@Order(Integer.MAX_VALUE)
final class ValidationDocumentTest {
    private static final Pattern TEST_NAME = Pattern.compile("\\| `([A-Za-z0-9_.]+)` \\|$", Pattern.MULTILINE);

    @Test
    @Tag("validation-document")
    void writesTheDocument() throws IOException {
        List<ValidationLine> lines = ValidationLine.recorded();
        assertFalse(lines.isEmpty(), "the published checks recorded nothing");
        Files.writeString(ValidationLine.document(), document(lines), StandardCharsets.UTF_8);
    }

    /** Every check made in this build stands in the document with its source, its number of values and its agreement. */
    @Test
    void committedDocumentHoldsEveryCheckRecorded() throws IOException {
        List<ValidationLine> lines = ValidationLine.recorded();
        Assumptions.assumeFalse(lines.isEmpty(), "no published check ran in this build");
        String text = Files.readString(ValidationLine.document(), StandardCharsets.UTF_8);
        for (ValidationLine line : lines) {
            String row = line.row();
            // The deviation itself may differ in its last digits between machines; all before it may not.
            String stable = row.substring(0, row.indexOf(line.deviation()));
            int at = text.indexOf(stable);
            assertTrue(
                    at >= 0,
                    () -> "docs/VALIDATION.md does not hold: " + row
                            + "\nRewrite it: mvn -B verify -pl reduction -Pvalidation-document");
            String documented = text.substring(at + stable.length(), text.indexOf('\n', at));
            if (!Double.isNaN(line.largestRelative())) {
                double value = Double.parseDouble(documented.split("[ ;]", 2)[0]);
                assertTrue(
                        line.largestRelative() <= 1.5 * value + 1e-9,
                        () -> "agreement is worse than docs/VALIDATION.md says: " + row);
            }
        }
    }

    /** The document names no test that is gone. */
    @Test
    void everyTestNamedInTheDocumentExists() throws IOException {
        Matcher names = TEST_NAME.matcher(Files.readString(ValidationLine.document(), StandardCharsets.UTF_8));
        int found = 0;
        while (names.find()) {
            String name = "plateledger." + names.group(1);
            assertDoesNotThrow(() -> Class.forName(name), () -> name + " stands in docs/VALIDATION.md and is gone");
            found++;
        }
        assertTrue(found > 0, "docs/VALIDATION.md names no test");
    }

    private static String document(List<ValidationLine> lines) {
        StringBuilder text = new StringBuilder();
        text.append("# Validation\n\n");
        text.append(
                "What was checked against which published source, and the largest deviation found. Written by a test run\n");
        text.append(
                "(`mvn -B verify -pl reduction -Pvalidation-document`), so that it cannot drift from the code; an ordinary\n");
        text.append(
                "build fails when a check is missing here or agrees less well than stated. Deviations are relative unless\n");
        text.append(
                "marked absolute. Expected values come from the sources named, never from the code under test; they lie in\n");
        text.append("`src/test/resources` with their source.\n");
        String section = "";
        for (ValidationLine line : lines) {
            if (!line.head().section().equals(section)) {
                section = line.head().section();
                text.append("\n## ").append(section).append("\n\n");
                text.append("| what | source | values | largest deviation | test |\n");
                text.append("|---|---|---:|---|---|\n");
            }
            text.append(line.row()).append('\n');
        }
        return text.toString();
    }
}
