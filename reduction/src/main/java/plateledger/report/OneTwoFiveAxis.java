package plateledger.report;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.axis.ValueTick;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/** A logarithmic axis labelled at 1, 2, 5 of each decade (1 alone over many decades), with marks at 2 to 9. */
final class OneTwoFiveAxis extends LogAxis {
    private static final long serialVersionUID = 1L;

    private static final double[][] LABELLED = {{1}, {1, 2, 5}, {1, 2, 3, 4, 5, 6, 7, 8, 9}};
    private static final int FEWEST_LABELS = 3;
    private static final int FINE_STEPS = 20; // of a decade's first figure, where even 1 to 9 gives too few labels
    private static final int LONGEST_PLAIN = 5; // digits of a number written without a power of ten

    OneTwoFiveAxis(String label) {
        super(label);
        setSmallestValue(1e-9);
    }

    @Override
    public List<ValueTick> refreshTicks(Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
        boolean horizontal = RectangleEdge.isTopOrBottom(edge);
        TextAnchor anchor = horizontal
                ? (RectangleEdge.TOP.equals(edge) ? TextAnchor.BOTTOM_CENTER : TextAnchor.TOP_CENTER)
                : (RectangleEdge.LEFT.equals(edge) ? TextAnchor.CENTER_RIGHT : TextAnchor.CENTER_LEFT);
        double low = getRange().getLowerBound();
        double high = getRange().getUpperBound();
        List<Double> labelled = labelled(low, high);
        List<ValueTick> ticks = new ArrayList<>();
        for (double value : labelled) {
            ticks.add(new NumberTick(TickType.MAJOR, value, text(value), anchor, TextAnchor.CENTER, 0.0));
        }
        for (double value : multiples(low, high, LABELLED[LABELLED.length - 1])) {
            if (!labelled.contains(value)) {
                ticks.add(new NumberTick(TickType.MINOR, value, "", anchor, TextAnchor.CENTER, 0.0));
            }
        }
        return ticks;
    }

    /** Values to be labelled in a range: the coarsest pattern that gives at least three. */
    static List<Double> labelled(double low, double high) {
        for (double[] pattern : LABELLED) {
            List<Double> values = multiples(low, high, pattern);
            if (values.size() >= FEWEST_LABELS) {
                return values;
            }
        }
        double[] fine = new double[9 * FINE_STEPS];
        for (int i = 0; i < fine.length; i++) {
            fine[i] = BigDecimal.valueOf(FINE_STEPS + i)
                    .divide(BigDecimal.valueOf(FINE_STEPS))
                    .doubleValue();
        }
        return multiples(low, high, fine);
    }

    private static List<Double> multiples(double low, double high, double[] figures) {
        List<Double> values = new ArrayList<>();
        int first = (int) Math.floor(Math.log10(low));
        int last = (int) Math.floor(Math.log10(high));
        for (int decade = first; decade <= last; decade++) {
            for (double figure : figures) {
                double value =
                        BigDecimal.valueOf(figure).scaleByPowerOfTen(decade).doubleValue();
                if (value >= low && value <= high) {
                    values.add(value);
                }
            }
        }
        return values;
    }

    /** A tick's label: plain up to five digits, else with a power of ten. */
    static String text(double value) {
        BigDecimal exact = BigDecimal.valueOf(value).stripTrailingZeros();
        int exponent = exact.precision() - exact.scale() - 1;
        if (exponent >= -3 && exponent < LONGEST_PLAIN) {
            return exact.toPlainString();
        }
        String power = Shown.powerOfTen(exponent);
        BigDecimal figure = exact.movePointLeft(exponent).stripTrailingZeros();
        return figure.compareTo(BigDecimal.ONE) == 0 ? power : figure.toPlainString() + "·" + power;
    }
}
