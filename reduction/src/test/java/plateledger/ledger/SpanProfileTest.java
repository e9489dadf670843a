package plateledger.ledger;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

/** The fin across the span, by hand and by its own balance. */
final class SpanProfileTest {
    /** k t = 0.01 W/K and 4 W/(m² K): l = 50 mm; a span of 300 mm is six l, so cosh 3 = 10.067 662 and tanh 3 = 0.995 054 75. */
    @Test
    void closedFormByHand() {
        double l = SpanProfile.length(0.01, 4.0);
        assertEquals(0.05, l, 1e-15);
        assertEquals(0.05 / (0.05 + 0.2 * 0.99505475), SpanProfile.edgeShare(0.05, 0.01, l, 0.3), 1e-8);
        assertEquals(1.0 / 10.067662, SpanProfile.shape(0.0, l, 0.3), 1e-8);
        assertEquals(3.76219569 / 10.067662, SpanProfile.shape(0.1, l, 0.3), 1e-8); // cosh 2 = 3.762 195 69
        assertEquals(3.76219569 / 10.067662, SpanProfile.shape(-0.1, l, 0.3), 1e-8);
        assertEquals(1.0, SpanProfile.shape(0.15, l, 0.3), 1e-15);
        assertEquals(0.99505475 / 3.0, SpanProfile.meanShape(l, 0.3), 1e-8);
        // ½ sech²3 + tanh 3/6
        assertEquals(0.5 / (10.067662 * 10.067662) + 0.99505475 / 6.0, SpanProfile.meanSquareShape(l, 0.3), 1e-8);
    }

    @Test
    void limitsOfTheEdgeConductance() {
        assertEquals(0.0, SpanProfile.edgeShare(0.0, 0.01, 0.05, 0.3), 0.0);
        assertEquals(1.0, SpanProfile.edgeShare(1e9, 0.01, 0.05, 0.3), 1e-9);
        // very well conducting sheet: W h against 2 G is all that is left, 0.3·4 against 2·0.05
        double l = SpanProfile.length(1e6, 4.0);
        assertEquals(0.1 / 1.3, SpanProfile.edgeShare(0.05, 1e6, l, 0.3), 1e-6);
    }

    /** A short conduction length must not overflow: one l inside the edge is 1/e, half a span inside is nothing. */
    @Test
    void shortConductionLength() {
        assertEquals(1.0 / Math.E, SpanProfile.shape(0.15 - 1e-5, 1e-5, 0.3), 1e-9);
        assertEquals(0.0, SpanProfile.shape(0.0, 1e-5, 0.3), 1e-300);
        assertEquals(2e-5 / 0.3, SpanProfile.meanShape(1e-5, 0.3), 1e-15);
    }

    /** What the face misses because of the edges leaves through them: h · mean deficit · W = 2 G (T_edge − T_frame). */
    @Property(tries = 200)
    void whatIsMissingOnTheFaceLeavesThroughTheEdges(
            @ForAll @DoubleRange(min = 0.01, max = 2.0) double sheet,
            @ForAll @DoubleRange(min = 1.0, max = 200.0) double h,
            @ForAll @DoubleRange(min = 0.01, max = 2.0) double edge,
            @ForAll @DoubleRange(min = 0.05, max = 1.0) double width) {
        double far = 30.0;
        double l = SpanProfile.length(sheet, h);
        double beta = SpanProfile.edgeShare(edge, sheet, l, width);
        double missing = h * beta * far * SpanProfile.meanShape(l, width) * width;
        double out = 2.0 * edge * (far - beta * far);
        assertEquals(out, missing, 1e-12 * out);
        assertEquals(out, LossTerm.Edge.rateWPerM(edge, far - beta * far, 0.0), 1e-12 * out);
    }

    /** The two means against Simpson's rule on the shape itself. */
    @Property(tries = 50)
    void meansAreThoseOfTheShape(
            @ForAll @DoubleRange(min = 0.02, max = 0.5) double l,
            @ForAll @DoubleRange(min = 0.05, max = 0.6) double width) {
        int n = 2000;
        double mean = 0.0;
        double square = 0.0;
        for (int i = 0; i <= n; i++) {
            double s = SpanProfile.shape(width * (i / (double) n - 0.5), l, width);
            double weight = (i == 0 || i == n ? 1.0 : i % 2 == 0 ? 2.0 : 4.0) / (3.0 * n);
            mean += weight * s;
            square += weight * s * s;
        }
        assertEquals(mean, SpanProfile.meanShape(l, width), 1e-8);
        assertEquals(square, SpanProfile.meanSquareShape(l, width), 1e-8);
        assertTrue(mean > 0.0 && mean < 1.0);
    }
}
