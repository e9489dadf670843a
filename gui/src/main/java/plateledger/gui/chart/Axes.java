package plateledger.gui.chart;

import java.awt.BasicStroke;
import java.awt.font.TextAttribute;
import java.text.AttributedString;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.util.Locale;
import java.util.Optional;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTickUnitSource;
import org.jfree.chart.axis.ValueAxis;

/** Makes every axis of the desktop program, so that all read alike and print the same digits in every locale. */
final class Axes {
    private static final double MARGIN = 0.06;

    private Axes() {}

    /** A linear axis whose range follows its data without forcing zero into it. */
    static NumberAxis linear(String title, ChartLook look) {
        NumberAxis axis = new NumberAxis(title);
        DecimalFormat format = new DecimalFormat("0.###", DecimalFormatSymbols.getInstance(Locale.ROOT));
        axis.setStandardTickUnits(new NumberTickUnitSource(false, format));
        axis.setAutoRangeIncludesZero(false);
        axis.setLowerMargin(MARGIN);
        axis.setUpperMargin(MARGIN);
        return dressed(axis, look);
    }

    /** A logarithmic axis over a range, with labels at 1, 2 and 5. */
    static LogAxis logarithmic(String title, double low, double high, ChartLook look) {
        LogAxis axis = dressed(new DecadeAxis(title), look);
        axis.setAutoRange(false);
        axis.setRange(low, high);
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

    private static <A extends ValueAxis> A dressed(A axis, ChartLook look) {
        axis.setLabelFont(look.small());
        Optional.ofNullable(axis.getLabel())
                .flatMap(title -> lowered(title, look))
                .ifPresent(axis::setAttributedLabel);
        axis.setTickLabelFont(look.small());
        axis.setLabelPaint(look.line());
        axis.setTickLabelPaint(look.line());
        axis.setAxisLinePaint(look.thinned(0.6));
        axis.setAxisLineStroke(new BasicStroke(1f));
        axis.setTickMarkPaint(look.thinned(0.6));
        axis.setTickMarkOutsideLength(4f);
        axis.setMinorTickMarkOutsideLength(2f);
        return axis;
    }
}
