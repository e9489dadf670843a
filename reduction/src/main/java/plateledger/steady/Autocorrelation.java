package plateledger.steady;

/**
 * Autocovariance of an evenly sampled series and the integrated correlation time τ in samples: the variance of the mean of
 * n samples is σ² τ / n. Autocovariances have the divisor n and the mean removed.
 */
public final class Autocorrelation {
    private static final double PHI_MOST = 0.999;

    private Autocorrelation() {}

    /**
     * Geyer's initial monotone sequence (Geyer, Statistical Science 7 (1992) 473, from memory).
     *
     * @param variance γ₀
     * @param longRunVariance γ₀ τ, not below γ₀: anticorrelation is not used to sharpen a mean
     * @param tau τ, samples, at least 1
     * @param pairs number of pairs γ₂ₖ + γ₂ₖ₊₁ summed
     */
    public record InitialSequence(double variance, double longRunVariance, double tau, int pairs) {}

    /** The values less their mean. */
    static double[] centred(double[] x) {
        double sum = 0.0;
        for (double v : x) {
            sum += v;
        }
        double mean = sum / x.length;
        double[] c = new double[x.length];
        for (int i = 0; i < c.length; i++) {
            c[i] = x[i] - mean;
        }
        return c;
    }

    /** γₖ of centred values. */
    static double covariance(double[] centred, int lag) {
        int n = centred.length - lag;
        double s0 = 0.0;
        double s1 = 0.0;
        double s2 = 0.0;
        double s3 = 0.0;
        int i = 0;
        for (; i + 3 < n; i += 4) { // four sums, since one would wait for itself at every step
            s0 += centred[i] * centred[i + lag];
            s1 += centred[i + 1] * centred[i + 1 + lag];
            s2 += centred[i + 2] * centred[i + 2 + lag];
            s3 += centred[i + 3] * centred[i + 3 + lag];
        }
        for (; i < n; i++) {
            s0 += centred[i] * centred[i + lag];
        }
        return (s0 + s1 + (s2 + s3)) / centred.length;
    }

    /** Geyer's estimate for a series; the mean is removed here. */
    public static InitialSequence geyer(double[] x) {
        return geyerOfCentred(centred(x));
    }

    static InitialSequence geyerOfCentred(double[] centred) {
        double variance = covariance(centred, 0);
        double sum = 0.0;
        double least = Double.POSITIVE_INFINITY;
        int pairs = 0;
        for (int lag = 0; lag + 1 < centred.length; lag += 2) {
            double pair = (lag == 0 ? variance : covariance(centred, lag)) + covariance(centred, lag + 1);
            if (!(pair > 0.0)) {
                break;
            }
            least = Math.min(least, pair);
            sum += least;
            pairs++;
        }
        if (!(variance > 0.0)) {
            return new InitialSequence(0.0, 0.0, 1.0, pairs);
        }
        double longRun = Math.max(variance, 2.0 * sum - variance);
        return new InitialSequence(variance, longRun, longRun / variance, pairs);
    }

    /** First autocorrelation; 0 for constant values. */
    static double first(double[] centred) {
        double variance = covariance(centred, 0);
        return variance > 0.0 ? covariance(centred, 1) / variance : 0.0;
    }

    /**
     * τ of a first-order autoregression, (1 + φ)/(1 − φ), with φ = r₁ + (1 + {@code bias} r₁)/n held in 0..0.999. The bias
     * of r₁ is −(1 + 4φ)/n to first order (Kendall, Biometrika 41 (1954) 403, from memory).
     *
     * @param r1 first autocorrelation
     * @param n samples
     * @param bias 3 for a mean, 4 for residuals of a line: the conventions of this program's statistics
     */
    static double autoregressiveTau(double r1, int n, double bias) {
        double phi = Math.min(Math.max(r1 + (1.0 + bias * r1) / n, 0.0), PHI_MOST);
        return (1.0 + phi) / (1.0 - phi);
    }
}
