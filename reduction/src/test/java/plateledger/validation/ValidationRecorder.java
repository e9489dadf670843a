package plateledger.validation;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;

/**
 * Checks values against a published source and records how well they agree, for one line of the validation document.
 *
 * <pre>{@code
 * try (ValidationRecorder check = ValidationRecorder.of(getClass(), "Fluid properties", "density of dry air", "Lemmon 2000")) {
 *     check.relative(expected, actual, 1e-4, "300 K");
 * }
 * }</pre>
 *
 * The line is written on {@link #close}, to {@code target/validation/<section>-<what>.csv}. A failed check throws at once;
 * what was checked so far is recorded, the test fails all the same.
 */
public final class ValidationRecorder implements AutoCloseable {
    private final ValidationLine.Head head;
    private int values;
    private double largestRelative = Double.NaN;
    private double largestAbsolute = Double.NaN;

    private ValidationRecorder(ValidationLine.Head head) {
        this.head = head;
    }

    /**
     * Starts one line of the document.
     *
     * @param test the test class, printed so that the check can be found
     * @param section heading under which the line stands, e.g. {@code Fluid properties}
     * @param what what is checked, unique within the section
     * @param source the published source
     */
    public static ValidationRecorder of(Class<?> test, String section, String what, String source) {
        return new ValidationRecorder(new ValidationLine.Head(section, what, source, test.getName()));
    }

    /**
     * Asserts |actual − expected| ≤ tolerance · |expected| and records |actual − expected|/|expected|.
     *
     * @param expected published value, not 0
     * @param actual value of the code under test
     * @param tolerance largest relative deviation allowed
     * @param label which value, for the message
     */
    public void relative(double expected, double actual, double tolerance, String label) {
        double deviation = Math.abs(actual - expected) / Math.abs(expected);
        values++;
        largestRelative = Double.isNaN(largestRelative) ? deviation : Math.max(largestRelative, deviation);
        assertWithin(deviation, tolerance, expected, actual, label);
    }

    /**
     * Asserts |actual − expected| ≤ tolerance and records |actual − expected|: for values whose zero is arbitrary or near.
     *
     * @param expected published value
     * @param actual value of the code under test
     * @param tolerance largest deviation allowed, same unit
     * @param label which value, for the message
     */
    public void absolute(double expected, double actual, double tolerance, String label) {
        double deviation = Math.abs(actual - expected);
        values++;
        largestAbsolute = Double.isNaN(largestAbsolute) ? deviation : Math.max(largestAbsolute, deviation);
        assertWithin(deviation, tolerance, expected, actual, label);
    }

    /**
     * Asserts |actual − expected| ≤ tolerance like {@link #absolute}, but records the deviation relative to the expected value
     * where that is not 0.
     */
    public void within(double expected, double actual, double tolerance, String label) {
        if (expected == 0.0) {
            absolute(expected, actual, tolerance, label);
            return;
        }
        double deviation = Math.abs(actual - expected);
        values++;
        double relative = deviation / Math.abs(expected);
        largestRelative = Double.isNaN(largestRelative) ? relative : Math.max(largestRelative, relative);
        assertWithin(deviation, tolerance, expected, actual, label);
    }

    private static void assertWithin(double deviation, double tolerance, double expected, double actual, String label) {
        // Written so that NaN fails.
        assertTrue(
                deviation <= tolerance,
                () -> String.format(
                        Locale.ROOT,
                        "%s: expected %.12g, found %.12g, deviation %.3g above %.3g",
                        label,
                        expected,
                        actual,
                        deviation,
                        tolerance));
    }

    /** Writes the line; a line without a single value is a fault of the test. */
    @Override
    public void close() {
        if (values == 0) {
            throw new IllegalStateException("nothing was checked: " + head.what());
        }
        try {
            Path folder = ValidationLine.recordFolder();
            Files.createDirectories(folder);
            Files.writeString(
                    folder.resolve(head.fileName()),
                    new ValidationLine(head, values, largestRelative, largestAbsolute).csv(),
                    StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
