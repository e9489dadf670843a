package plateledger.steady;

/**
 * Least-squares slope of a series over time with a standard error that allows for autocorrelated residuals:
 *
 * <pre>  SE_b² = s² (n − 2)/max(n − 2τ, 2) · τ / S_tt,   s² = RSS/(n − 2),   dof = max(n/τ − 2, 1) </pre>
 *
 * with τ the largest of 1, Geyer's and the autoregression's estimate on the residuals.
 *
 * @param slope slope, unit of the values per s
 * @param standardError its standard error
 * @param dof degrees of freedom, at least 1
 * @param tau samples per independent residual, at least 1
 */
public record SlopeTest(double slope, double standardError, double dof, double tau) {
    /** No slope at all, known exactly. */
    static final SlopeTest NONE = new SlopeTest(0.0, 0.0, Double.POSITIVE_INFINITY, 1.0);

    /** This slope less another, their errors taken as independent; the smaller dof. */
    SlopeTest against(SlopeTest other) {
        return new SlopeTest(
                slope - other.slope, Math.hypot(standardError, other.standardError), Math.min(dof, other.dof), tau);
    }

    /**
     * Fits a line.
     *
     * @param timesS ascending times, s
     * @param values values at these times; at least three
     */
    public static SlopeTest of(double[] timesS, double[] values) {
        int n = values.length;
        if (n < 3) {
            throw new IllegalArgumentException("a slope with its error needs three samples, found " + n);
        }
        double[] r = new double[n];
        double[] line = residuals(timesS, values, r);
        double ar = Autocorrelation.autoregressiveTau(Autocorrelation.first(r), n, 4.0);
        double tau = Math.max(ar, Autocorrelation.geyerOfCentred(r).tau());
        return new SlopeTest(line[0], error(r, line[1], tau), Math.max(n / tau - 2.0, 1.0), tau);
    }

    /** The same with the autoregression's τ alone. */
    static SlopeTest autoregressive(double[] timesS, double[] values) {
        int n = values.length;
        double[] r = new double[n];
        double[] line = residuals(timesS, values, r);
        double tau = Autocorrelation.autoregressiveTau(Autocorrelation.first(r), n, 4.0);
        return new SlopeTest(line[0], error(r, line[1], tau), Math.max(n / tau - 2.0, 1.0), tau);
    }

    /** Half-width of the 95 % interval of the slope. */
    public double halfWidth() {
        return standardError == 0.0 ? 0.0 : StudentT.twoSided95(dof) * standardError;
    }

    /** Upper 97.5 % bound of the slope's absolute value. */
    public double bound() {
        return Math.abs(slope) + halfWidth();
    }

    /** |slope| ÷ its standard error; 0 for a slope of 0. */
    public double t() {
        return slope == 0.0 ? 0.0 : Math.abs(slope) / standardError;
    }

    private static double error(double[] residuals, double stt, double tau) {
        int n = residuals.length;
        double rss = Autocorrelation.covariance(residuals, 0) * n;
        return Math.sqrt(rss / Math.max(n - 2.0 * tau, 2.0) * tau / stt);
    }

    /** Fills the residuals; returns slope and S_tt. */
    private static double[] residuals(double[] t, double[] y, double[] r) {
        int n = y.length;
        double[] dt = Autocorrelation.centred(t);
        double[] dy = Autocorrelation.centred(y);
        double stt = 0.0;
        double sty = 0.0;
        for (int i = 0; i < n; i++) {
            stt += dt[i] * dt[i];
            sty += dt[i] * dy[i];
        }
        double slope = stt > 0.0 ? sty / stt : 0.0;
        for (int i = 0; i < n; i++) {
            r[i] = dy[i] - slope * dt[i];
        }
        return new double[] {slope, stt};
    }
}
