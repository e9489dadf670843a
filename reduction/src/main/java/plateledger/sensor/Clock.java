package plateledger.sensor;

import plateledger.quantity.Stated;

/**
 * A logger's clock in one file: its offset at the file's first stamp and its rate.
 *
 * <pre>
 *   t = (c₀ − o) + (c − c₀)/(1 + e)
 *   t   true time            s since 1970-01-01T00:00Z
 *   c   logger's time        s, the same origin;  c₀ its first stamp in the file
 *   o   logger minus true at c₀      s
 *   e   (logger seconds − true seconds) per true second      -
 * </pre>
 *
 * @param startS c₀, s
 * @param offsetS o, s
 * @param rate e, above −1
 */
public record Clock(double startS, double offsetS, double rate) {
    /** Refuses a clock that stands still or runs backwards. */
    public Clock {
        if (!(rate > -1.0)) {
            throw new IllegalArgumentException("clock rate error must be above -1, found " + rate);
        }
    }

    /** The clock with offset and rate at their stated values. */
    public static Clock of(double startS, Stated offsetS, Stated rate) {
        return new Clock(startS, offsetS.value(), rate.value());
    }

    /** True time for a logger time, s. */
    public double trueTime(double loggerTime) {
        return startS - offsetS + (loggerTime - startS) / (1.0 + rate);
    }

    /** Logger time for a true time, s. */
    public double loggerTime(double trueTime) {
        return startS + (trueTime - startS + offsetS) * (1.0 + rate);
    }
}
