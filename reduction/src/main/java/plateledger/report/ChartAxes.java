package plateledger.report;

import java.awt.BasicStroke;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.util.Locale;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTickUnitSource;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.ui.RectangleInsets;

/**
 * The only place where chart axes are made, for report and desktop alike: number formats that no locale changes, labels at
 * 1, 2, 5 on logarithmic axes, the bundled typeface.
 */
public final class ChartAxes {
    private static final float LABEL_SIZE = 12f;
    private static final float TICK_SIZE = 11f;

    private ChartAxes() {}

    /**
     * A linear axis that does not insist on zero.
     *
     * @param label quantity and unit, e.g. {@code x / mm}
     */
    public static NumberAxis linear(String label) {
        NumberAxis axis = new NumberAxis(label);
        DecimalFormatSymbols symbols = DecimalFormatSymbols.getInstance(Locale.ROOT);
        symbols.setMinusSign('−');
        DecimalFormat format = new DecimalFormat("0.########", symbols);
        axis.setStandardTickUnits(new NumberTickUnitSource(false, format));
        axis.setAutoRangeIncludesZero(false);
        dress(axis);
        axis.setMinorTickMarksVisible(false);
        return axis;
    }

    /**
     * A logarithmic axis for positive values.
     *
     * @param label quantity, e.g. {@code Re}
     */
    public static ValueAxis logarithmic(String label) {
        OneTwoFiveAxis axis = new OneTwoFiveAxis(label);
        dress(axis);
        return axis;
    }

    private static void dress(ValueAxis axis) {
        axis.setLabelFont(Fonts.regular(LABEL_SIZE));
        axis.setTickLabelFont(Fonts.regular(TICK_SIZE));
        axis.setLabelPaint(Palette.INK);
        axis.setTickLabelPaint(Palette.INK);
        axis.setAxisLinePaint(Palette.INK);
        axis.setTickMarkPaint(Palette.INK);
        axis.setAxisLineStroke(new BasicStroke(0.8f));
        axis.setTickMarkStroke(new BasicStroke(0.8f));
        axis.setTickMarkInsideLength(0f);
        axis.setTickMarkOutsideLength(4f);
        axis.setMinorTickMarksVisible(true);
        axis.setMinorTickMarkInsideLength(0f);
        axis.setMinorTickMarkOutsideLength(2f);
        axis.setLabelInsets(new RectangleInsets(5, 5, 5, 5));
        axis.setLowerMargin(0.04);
        axis.setUpperMargin(0.04);
    }
}
