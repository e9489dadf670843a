package plateledger.steady;

/**
 * One piece of evidence for or against a window.
 *
 * @param test name of the test, e.g. {@code storage}
 * @param subject channel or quantity tested
 * @param value what was found
 * @param limit what was allowed
 * @param unit unit of both
 * @param passed true if the window passes
 */
public record Evidence(String test, String subject, double value, double limit, String unit, boolean passed) {}
