package plateledger.validation;

import java.util.Optional;
import org.junit.jupiter.api.Assertions;

/**
 * Assertions of doubles that count into the line of the running {@link Published} test; outside such a test they only assert.
 */
public final class Recorded {
    private static final ThreadLocal<Optional<ValidationRecorder>> CURRENT = ThreadLocal.withInitial(Optional::empty);

    private Recorded() {}

    static void open(ValidationRecorder recorder) {
        CURRENT.set(Optional.of(recorder));
    }

    static ValidationRecorder close() {
        ValidationRecorder recorder = CURRENT.get().orElseThrow();
        CURRENT.remove();
        return recorder;
    }

    /** Asserts |actual − expected| ≤ tolerance and records the deviation, relative where expected is not 0. */
    public static void assertEquals(double expected, double actual, double tolerance) {
        assertEquals(expected, actual, tolerance, "");
    }

    /** The same with a label for the message. */
    public static void assertEquals(double expected, double actual, double tolerance, String label) {
        CURRENT.get()
                .ifPresentOrElse(
                        recorder -> recorder.within(expected, actual, tolerance, label),
                        () -> Assertions.assertEquals(expected, actual, tolerance, label));
    }

    /** Plain equality; not counted. */
    public static void assertEquals(Object expected, Object actual) {
        Assertions.assertEquals(expected, actual);
    }

    /** Plain equality with a label; not counted. */
    public static void assertEquals(Object expected, Object actual, String label) {
        Assertions.assertEquals(expected, actual, label);
    }
}
