package plateledger.fit;

import java.util.Comparator;
import java.util.List;

/**
 * 95 % intervals of a finished fit. C and the curve are handled in logarithms, where their distribution is close to
 * symmetric. METHODS.md eq. (F-8) and (F-9).
 */
public final class Intervals {
    private Intervals() {}

    /**
     * An interval.
     *
     * @param low lower end
     * @param value best estimate
     * @param high upper end
     */
    public record Interval(double low, double value, double high) {
        /** True if the interval holds a value. */
        public boolean holds(double candidate) {
            return low <= candidate && candidate <= high;
        }
    }

    /** The exponent m. */
    public static Interval m(FitResult fit) {
        double half = fit.coverageFactor() * fit.twoStep().uM();
        double m = fit.twoStep().m();
        return new Interval(m - half, m, m + half);
    }

    /** The factor C; C and m are strongly correlated, so this alone says little. */
    public static Interval c(FitResult fit) {
        return around(
                Math.log(fit.twoStep().c()),
                fit.coverageFactor() * fit.twoStep().uLnC());
    }

    /** Nu/Pr^n of the curve at a Reynolds number: confidence band. */
    public static Interval curve(FitResult fit, double re) {
        return around(
                fit.twoStep().lnY(re), fit.coverageFactor() * fit.twoStep().uLnY(re));
    }

    /** Nu/Pr^n of one new run in this rig at a Reynolds number: the curve's uncertainty and a run's random parts. */
    public static Interval newRun(FitResult fit, double re) {
        double u = Math.hypot(fit.twoStep().uLnY(re), uNewRun(fit, re));
        return around(fit.twoStep().lnY(re), fit.coverageFactor() * u);
    }

    /**
     * Random standard uncertainty of ln(Nu/Pr^n) − m ln Re of one new run: that of the points fitted, linear in ln Re
     * between neighbours, that of the last point beyond the ends.
     */
    public static double uNewRun(FitResult fit, double re) {
        double m = fit.twoStep().m();
        List<FitPoint> sorted = fit.problem().points().stream()
                .sorted(Comparator.comparingDouble(FitPoint::re))
                .toList();
        RandomParts parts = RandomParts.of(sorted);
        double x = Math.log(re);
        int above = 0;
        while (above < sorted.size() && Math.log(sorted.get(above).re()) < x) {
            above++;
        }
        if (above == 0) {
            return Math.sqrt(parts.effective(0, m));
        }
        if (above == sorted.size()) {
            return Math.sqrt(parts.effective(above - 1, m));
        }
        double left = Math.log(sorted.get(above - 1).re());
        double right = Math.log(sorted.get(above).re());
        double share = (x - left) / (right - left);
        return Math.sqrt((1.0 - share) * parts.effective(above - 1, m) + share * parts.effective(above, m));
    }

    private static Interval around(double ln, double half) {
        return new Interval(Math.exp(ln - half), Math.exp(ln), Math.exp(ln + half));
    }
}
