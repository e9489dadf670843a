package plateledger.steady;

/**
 * Mean of an evenly sampled, autocorrelated series with its standard error.
 *
 * <p>Three estimates are made: Geyer's, a first-order autoregression of the samples, and one of 30 block means. The one
 * with the widest 95 % interval counts, because each alone fails where the others do not: white noise of the converter on a
 * slow signal hides the slow part from the autoregression of the samples. Below 120 samples only the latter can be had.
 *
 * @param mean the mean
 * @param standardError its standard error, same unit; NaN below three samples
 * @param dof degrees of freedom of the standard error, at least 1
 * @param tau samples per independent one, at least 1
 */
public record MeanError(double mean, double standardError, double dof, double tau) {
    private static final int BLOCKS = 30;
    /** Fewest samples for Geyer's estimate and for block means. */
    private static final int FEWEST = 120;

    /** The mean of values in the order of time. */
    public static MeanError of(double[] x) {
        if (x.length < 3) {
            double[] c = Autocorrelation.centred(x);
            return new MeanError(x.length == 0 ? Double.NaN : x[0] - c[0], Double.NaN, 1.0, 1.0);
        }
        MeanError samples = autoregressive(x);
        if (x.length < FEWEST) {
            return samples;
        }
        return wider(wider(geyer(x), samples), blocks(x));
    }

    /** Half-width of the 95 % interval. */
    public double halfWidth() {
        return standardError == 0.0 ? 0.0 : StudentT.twoSided95(dof) * standardError;
    }

    private static MeanError wider(MeanError a, MeanError b) {
        return b.halfWidth() > a.halfWidth() ? b : a;
    }

    static MeanError geyer(double[] x) {
        int n = x.length;
        double[] c = Autocorrelation.centred(x);
        Autocorrelation.InitialSequence g = Autocorrelation.geyerOfCentred(c);
        double shrink = Math.max(1.0 - g.tau() / n, 0.5);
        double se = Math.sqrt(g.longRunVariance() / n / shrink);
        return new MeanError(x[0] - c[0], se, Math.max(n / g.tau() - 1.0, 1.0), g.tau());
    }

    static MeanError autoregressive(double[] x) {
        int n = x.length;
        double[] c = Autocorrelation.centred(x);
        double tau = Autocorrelation.autoregressiveTau(Autocorrelation.first(c), n, 3.0);
        double variance = Autocorrelation.covariance(c, 0) * n / (n - 1.0);
        variance *= tau > n / 2.0 ? 2.0 : (n - 1.0) / (n - tau);
        double se = Math.sqrt(variance / Math.max(n / tau, 2.0));
        return new MeanError(x[0] - c[0], se, Math.max(n / tau - 1.0, 1.0), tau);
    }

    /** The autoregression on block means, the oldest samples that fill no block left out; the mean is that of all. */
    static MeanError blocks(double[] x) {
        int size = x.length / BLOCKS;
        int start = x.length - size * BLOCKS;
        double[] means = new double[BLOCKS];
        for (int b = 0; b < BLOCKS; b++) {
            double sum = 0.0;
            for (int i = 0; i < size; i++) {
                sum += x[start + b * size + i];
            }
            means[b] = sum / size;
        }
        MeanError ofBlocks = autoregressive(means);
        double[] c = Autocorrelation.centred(x);
        return new MeanError(x[0] - c[0], ofBlocks.standardError, ofBlocks.dof, ofBlocks.tau * size);
    }
}
