package plateledger.gui.chart;

import java.awt.font.TextAttribute;
import java.text.AttributedString;
import java.util.Optional;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.ValueAxis;
import plateledger.report.ChartAxes;

/** Axes of the shared factory, dressed for the look of the window. */
final class Axes {
    private static final double MARGIN = 0.06;

    private Axes() {}

    /** A linear axis whose range follows its data without forcing zero into it. */
    static NumberAxis linear(String title, ChartLook look) {
        NumberAxis axis = ChartAxes.linear(title);
        axis.setLowerMargin(MARGIN);
        axis.setUpperMargin(MARGIN);
        axis.setMinorTickMarksVisible(false);
        dress(axis, look);
        return axis;
    }

    /** A logarithmic axis over a range, with labels at 1, 2 and 5. */
    static ValueAxis logarithmic(String title, double low, double high, ChartLook look) {
        ValueAxis axis = ChartAxes.logarithmic(title);
        axis.setAutoRange(false);
        axis.setRange(low, high);
        dress(axis, look);
        return axis;
    }

    /** A title whose letters after {@code _} are lowered, up to the next blank. */
    private static Optional<AttributedString> lowered(String title, ChartLook look) {
        int at = title.indexOf('_');
        if (at < 0) {
            return Optional.empty();
        }
        int blank = title.indexOf(' ', at);
        int end = (blank < 0 ? title.length() : blank) - 1;
        AttributedString text = new AttributedString(title.substring(0, at) + title.substring(at + 1));
        // By family and size: a font given whole would switch the lowering off.
        text.addAttribute(TextAttribute.FAMILY, look.small().getFamily());
        text.addAttribute(TextAttribute.SIZE, look.small().getSize2D());
        text.addAttribute(TextAttribute.SUPERSCRIPT, TextAttribute.SUPERSCRIPT_SUB, at, end);
        return Optional.of(text);
    }

    private static void dress(ValueAxis axis, ChartLook look) {
        axis.setLabelFont(look.small());
        Optional.ofNullable(axis.getLabel())
                .flatMap(title -> lowered(title, look))
                .ifPresent(axis::setAttributedLabel);
        axis.setTickLabelFont(look.small());
        axis.setLabelPaint(look.line());
        axis.setTickLabelPaint(look.line());
        axis.setAxisLinePaint(look.thinned(0.6));
        axis.setTickMarkPaint(look.thinned(0.6));
    }
}
