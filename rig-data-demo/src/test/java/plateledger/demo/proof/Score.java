package plateledger.demo.proof;

import java.util.Locale;

/** How estimates with intervals compare with truth: errors relative, misses to either side, spread against what was stated. */
final class Score {
    private int n;
    private int low;
    private int high;
    private double sumError;
    private double sumZ;
    private double sumZ2;

    /**
     * Takes one estimate.
     *
     * @param error estimate − truth
     * @param u its standard uncertainty
     * @param k coverage factor of its 95 % interval
     */
    synchronized void add(double error, double u, double k) {
        n++;
        sumError += error;
        double z = error / u;
        sumZ += z;
        sumZ2 += z * z;
        if (error < -k * u) {
            low++;
        } else if (error > k * u) {
            high++;
        }
    }

    int count() {
        return n;
    }

    int held() {
        return n - low - high;
    }

    double coverage() {
        return (double) held() / n;
    }

    double meanError() {
        return sumError / n;
    }

    /** Mean of error ÷ u. */
    double meanZ() {
        return sumZ / n;
    }

    /** Root mean square of error ÷ u. */
    double rmsZ() {
        return Math.sqrt(sumZ2 / n);
    }

    /** Standard deviation of error ÷ u. */
    double sdZ() {
        double mean = sumZ / n;
        return Math.sqrt(Math.max(0.0, (sumZ2 - n * mean * mean) / (n - 1)));
    }

    /** A row: coverage, low and high misses, mean error in %, spread. */
    String row(String what) {
        return String.format(
                Locale.ROOT,
                "| %s | %d | %.3f | %d | %d | %+.2f %% | %.2f |",
                what,
                n,
                coverage(),
                low,
                high,
                100.0 * meanError(),
                sdZ());
    }

    static final String HEAD = """
            | quantity | n | 95 % interval holds | too low | too high | mean error | sd(error/u) |
            | --- | --- | --- | --- | --- | --- | --- |
            """;
}
