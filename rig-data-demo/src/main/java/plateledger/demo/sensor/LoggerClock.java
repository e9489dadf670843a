package plateledger.demo.sensor;

import java.util.Optional;

/**
 * A logger's clock as declared: t_true = (c_start − offset) + (c − c_start)/(1 + rate), c its stamps.
 *
 * @param logger name of the logger
 * @param offset logger clock minus true time at the start of each file; empty if nobody declared it
 * @param rate relative rate error; empty if not declared
 * @param hiddenOffsetS true offset of an undeclared clock, s
 */
public record LoggerClock(String logger, Optional<Declared> offset, Optional<Declared> rate, double hiddenOffsetS) {
    /** The plate logger: a minute and a half ahead, set by hand. */
    public static final LoggerClock PLATE = new LoggerClock(
            "plate",
            Optional.of(Declared.limits("95", "s", 1.0, "2")),
            Optional.of(Declared.standard("0", "", 1.0, "1e-5")),
            0.0);
    /** The power logger, whose clock nobody looked at: it is a little behind. */
    public static final LoggerClock POWER = new LoggerClock("power", Optional.empty(), Optional.empty(), -2.6);
    /** The tunnel logger: behind, and its crystal runs fast. */
    public static final LoggerClock TUNNEL = new LoggerClock(
            "tunnel",
            Optional.of(Declared.limits("-41", "s", 1.0, "2")),
            Optional.of(Declared.standard("1.2e-4", "", 1.0, "1e-5")),
            0.0);

    /** The true offset, s. */
    public double trueOffsetS(Draws draws) {
        return offset.map(o -> o.draw(draws, "logger:" + logger + "/offset")).orElse(hiddenOffsetS);
    }

    /** The true rate error. */
    public double trueRate(Draws draws) {
        return rate.map(r -> r.draw(draws, "logger:" + logger + "/rate")).orElse(0.0);
    }
}
