package plateledger.steady;

/** What a coarse reading leaves unknown about a mean, however long it is averaged. */
final class Resolution {
    private Resolution() {}

    /** Smallest change between values in a row; 0 if there is none. */
    static double smallestChange(double[] values) {
        double least = Double.POSITIVE_INFINITY;
        for (int i = 1; i < values.length; i++) {
            double change = Math.abs(values[i] - values[i - 1]);
            least = change > 0.0 ? Math.min(least, change) : least;
        }
        return Double.isInfinite(least) ? 0.0 : least;
    }

    /**
     * Standard uncertainty of a mean from the step q of the reading: q/√12 (JCGM 100:2008, F.2.2.1) where the signal is
     * quieter than the step; noise of σ averages it out as exp(−2π²σ²/q²), the amplitude of the first harmonic of the
     * quantisation error under Gaussian noise (from memory).
     */
    static double floor(double[] values, double step) {
        if (!(step > 0.0) || values.length < 2) {
            return 0.0;
        }
        double sum = 0.0;
        for (int i = 1; i < values.length; i++) {
            double change = values[i] - values[i - 1];
            sum += change * change;
        }
        double noise2 = Math.max(0.0, sum / (values.length - 1) / 2.0 - step * step / 12.0);
        return step / Math.sqrt(12.0) * Math.exp(-2.0 * Math.PI * Math.PI * noise2 / (step * step));
    }
}
