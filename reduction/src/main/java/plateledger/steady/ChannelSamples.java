package plateledger.steady;

import java.util.Arrays;
import plateledger.log.Series;
import plateledger.quantity.Unit;

/**
 * The valid samples of one channel with running sums, so that mean and slope over any stretch cost two look-ups. Times are
 * counted from an origin and values from the first one, or the sums would lose digits.
 */
final class ChannelSamples {
    private final String name;
    private final String unit;
    private final Series series;
    private final double[] t;
    private final double[] y;
    private final int[] lines;
    private final double base;
    private final double[] st;
    private final double[] sy;
    private final double[] stt;
    private final double[] sty;
    private final double intervalS;

    private ChannelSamples(
            String name, String unit, Series series, double[] t, double[] y, int[] lines, int n, double base) {
        this.name = name;
        this.unit = unit;
        this.series = series;
        this.t = Arrays.copyOf(t, n);
        this.y = Arrays.copyOf(y, n);
        this.lines = Arrays.copyOf(lines, n);
        this.base = base;
        st = new double[n + 1];
        sy = new double[n + 1];
        stt = new double[n + 1];
        sty = new double[n + 1];
        for (int i = 0; i < n; i++) {
            st[i + 1] = st[i] + t[i];
            sy[i + 1] = sy[i] + y[i];
            stt[i + 1] = stt[i] + t[i] * t[i];
            sty[i + 1] = sty[i] + t[i] * y[i];
        }
        intervalS = medianStep(series.timesS());
    }

    /** The valid samples of a series. */
    static ChannelSamples of(Series series, double originS) {
        int n = 0;
        double[] t = new double[series.size()];
        double[] y = new double[series.size()];
        int[] lines = new int[series.size()];
        double base = Double.NaN;
        for (int i = 0; i < series.size(); i++) {
            if (series.flags()[i] == Series.Flag.VALID.code()) {
                base = n == 0 ? series.values()[i] : base;
                t[n] = series.timesS()[i] - originS;
                y[n] = series.values()[i] - base;
                lines[n] = series.lines()[i];
                n++;
            }
        }
        return new ChannelSamples(series.channel(), siUnit(series.unit()), series, t, y, lines, n, base);
    }

    /**
     * The mean of channels of one log that sample together. A channel that misses a sample is left out of that sample only,
     * which is why deviations from each channel's own first value are averaged, not values.
     */
    static ChannelSamples mean(String name, java.util.List<Series> like, double originS) {
        Series first = like.get(0);
        int size = first.size();
        double[] sum = new double[size];
        int[] count = new int[size];
        for (Series s : like) {
            double base = Double.NaN;
            for (int i = 0; i < size; i++) {
                if (s.flags()[i] == Series.Flag.VALID.code()) {
                    base = Double.isNaN(base) ? s.values()[i] : base;
                    sum[i] += s.values()[i] - base;
                    count[i]++;
                }
            }
        }
        int n = 0;
        double[] t = new double[size];
        double[] y = new double[size];
        int[] lines = new int[size];
        for (int i = 0; i < size; i++) {
            if (2 * count[i] > like.size()) {
                t[n] = first.timesS()[i] - originS;
                y[n] = sum[i] / count[i];
                lines[n] = first.lines()[i];
                n++;
            }
        }
        return new ChannelSamples(name, "K", first, t, y, lines, n, 0.0);
    }

    String name() {
        return name;
    }

    /** SI unit of the values; of differences for temperatures. */
    String unit() {
        return unit;
    }

    String file() {
        return series.file();
    }

    /** First time of the log, valid or not. */
    static double firstS(Series series) {
        return series.timesS()[0];
    }

    /** Last time of the log. */
    static double lastS(Series series) {
        return series.timesS()[series.size() - 1];
    }

    /** Index of the first valid sample at or after a time from the origin. */
    int from(double time) {
        int i = Arrays.binarySearch(t, time);
        int at = i < 0 ? -i - 1 : i;
        while (at > 0 && t[at - 1] >= time) {
            at--;
        }
        return at;
    }

    /** Index after the last valid sample at or before a time. */
    int to(double time) {
        int i = Arrays.binarySearch(t, time);
        int at = i < 0 ? -i - 1 : i + 1;
        while (at < t.length && t[at] <= time) {
            at++;
        }
        return at;
    }

    /** Share of the samples expected in a stretch that are there and valid; above 1 only by rounding. */
    double share(double start, double end) {
        double expected = (end - start) / intervalS;
        return Math.min(1.0, (to(end) - from(start)) / Math.max(1.0, Math.floor(expected)));
    }

    double mean(int a, int b) {
        return base + (sy[b] - sy[a]) / (b - a);
    }

    /** Least-squares slope over samples a to b exclusive, at least two at different times. */
    double slope(int a, int b) {
        double n = b - a;
        double ct = st[b] - st[a];
        double cy = sy[b] - sy[a];
        double var = stt[b] - stt[a] - ct * ct / n;
        return var > 0.0 ? (sty[b] - sty[a] - ct * cy / n) / var : 0.0;
    }

    double[] times(int a, int b) {
        return Arrays.copyOfRange(t, a, b);
    }

    /** Values less {@link #base()}. */
    double[] values(int a, int b) {
        return Arrays.copyOfRange(y, a, b);
    }

    /** What the values are counted from. */
    double base() {
        return base;
    }

    int line(int i) {
        return lines[i];
    }

    /** Samples of the log in a stretch, valid or not; the origin is that of this object. */
    int allSamples(double startS, double endS) {
        int n = 0;
        for (double time : series.timesS()) {
            n += time >= startS && time <= endS ? 1 : 0;
        }
        return n;
    }

    private static double medianStep(double[] times) {
        if (times.length < 2) {
            return 1.0;
        }
        double[] steps = new double[times.length - 1];
        for (int i = 0; i < steps.length; i++) {
            steps[i] = times[i + 1] - times[i];
        }
        Arrays.sort(steps);
        return Math.max(steps[steps.length / 2], 1e-6);
    }

    private static String siUnit(String written) {
        return Unit.find(written)
                .map(unit -> unit == Unit.CELSIUS
                        ? Unit.KELVIN.symbol()
                        : unit.dimension().siUnit().symbol())
                .orElse(written);
    }
}
