package plateledger.demo.sensor;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.function.IntToDoubleFunction;
import org.junit.jupiter.api.Test;

/** What is written is what is drawn from. */
final class DeclaredTest {
    private static final int MANY = 4000;

    @Test
    void writesEveryKind() {
        assertEquals(
                "50 mm ± 0.3 mm (limits)",
                Declared.limits("50", "mm", 1e-3, "0.3").text());
        assertEquals(
                "0.46 W/m2K, u = 15 %",
                Declared.relative("0.46", "W/m2K", 1.0, "15").text());
        assertEquals(
                "0.95, u = 0.015", Declared.standard("0.95", "", 1.0, "0.015").text());
        assertEquals("50 mm (exact)", Declared.exact("50", "mm", 1e-3).text());
    }

    /** Standard deviations of the draws against the statement: half-width/√3 for limits. Four standard errors allowed. */
    @Test
    void drawsAsStated() {
        Declared limits = Declared.limits("50", "mm", 1e-3, "0.3");
        assertEquals(0.3e-3 / Math.sqrt(3.0), deviation(i -> limits.draw(Draws.of(i), "x")), 0.01e-3);
        Declared relative = Declared.relative("0.46", "W/m2K", 1.0, "15");
        assertEquals(0.069, deviation(i -> relative.draw(Draws.of(i), "x")), 0.0031);
        double widest = 0.0;
        for (int i = 0; i < MANY; i++) {
            widest = Math.max(widest, Math.abs(limits.draw(Draws.of(i), "x") - 0.05));
        }
        assertTrue(widest <= 0.3e-3 && widest > 0.299e-3, "widest " + widest);
    }

    /** Different names of one campaign are independent. */
    @Test
    void namesAreIndependent() {
        double sum = 0.0;
        for (int i = 0; i < MANY; i++) {
            sum += Draws.of(i).normal("a") * Draws.of(i).normal("b");
        }
        assertEquals(0.0, sum / MANY, 4.0 / Math.sqrt(MANY));
    }

    /** The instrument's equation, solved by hand: 100 °C true, b + b_i = 0.1 K, g = 0.001, R₀ = 22 °C. */
    @Test
    void readingFollowsTheInstrumentsEquation() {
        InstrumentDeclaration meter = InstrumentDeclaration.standard().get(0);
        ChannelErrors none = new ChannelErrors(Draws.none(), InstrumentDeclaration.standard());
        assertEquals(373.15, none.reading("T01", "2026-03-10", ChannelErrors.Moment.RUN, 373.15), 0.0);
        ChannelErrors drawn = new ChannelErrors(Draws.of(3), InstrumentDeclaration.standard());
        double low = drawn.reading("T01", "2026-03-10", ChannelErrors.Moment.RUN, 295.15);
        double high = drawn.reading("T01", "2026-03-10", ChannelErrors.Moment.RUN, 375.15);
        Draws draws = Draws.of(3);
        double gain = 0.0005 * draws.normal("instrument:thermocouples/gain") + 0.0005 * draws.normal("T01/gain");
        assertEquals(80.0, (high - low) * (1.0 - gain), 1e-9);
        double offset = 0.05 * draws.normal("bath:A/offset")
                + 0.03 * draws.normal("T01/offset")
                + 0.02 * draws.normal("T01/2026-03-10/drift");
        assertEquals(295.15, low - offset / (1.0 - gain), 1e-9);
        assertEquals("thermocouples", meter.id());
    }

    /** AR(1) noise: the standard error of a mean formula against simulated means; 8 % is three standard errors. */
    @Test
    void noiseHasTheStandardErrorItClaims() {
        ChannelNoise noise = new ChannelNoise(0.02, 0.85);
        double claimed = noise.standardError(900.0, 2.0);
        double found = deviation(i -> {
            ChannelNoise.Sequence sequence = noise.sequence(Draws.of(i).generator("n"), 2.0);
            double sum = 0.0;
            for (int k = 0; k < 450; k++) {
                sum += 0.02 * sequence.next();
            }
            return sum / 450.0;
        });
        assertEquals(claimed, found, 0.08 * claimed);
    }

    private static double deviation(IntToDoubleFunction of) {
        double sum = 0.0;
        double squares = 0.0;
        for (int i = 0; i < MANY; i++) {
            double v = of.applyAsDouble(i);
            sum += v;
            squares += v * v;
        }
        return Math.sqrt((squares - sum * sum / MANY) / (MANY - 1));
    }
}
