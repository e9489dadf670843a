package plateledger.gui.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.block.BlockBorder;
import org.jfree.chart.plot.Plot;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.title.LegendTitle;
import org.jfree.chart.ui.HorizontalAlignment;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;

/** What all plots share: ground, grid, outline, legend, marks. */
final class PlotFrame {
    private PlotFrame() {}

    /** An empty plot over the axes; {@code domain} is missing in a part of a combined plot. */
    static XYPlot plot(@org.jspecify.annotations.Nullable ValueAxis domain, ValueAxis range, ChartLook look) {
        XYPlot plot = new XYPlot(null, domain, range, null);
        plot.setBackgroundPaint(look.ground());
        plot.setOutlineVisible(false);
        plot.setDomainGridlinePaint(look.thinned(0.14));
        plot.setRangeGridlinePaint(look.thinned(0.14));
        plot.setDomainGridlineStroke(new BasicStroke(1f));
        plot.setRangeGridlineStroke(new BasicStroke(1f));
        plot.setDatasetRenderingOrder(org.jfree.chart.plot.DatasetRenderingOrder.FORWARD);
        plot.setAxisOffset(new RectangleInsets(0, 0, 0, 0));
        return plot;
    }

    /** The finished chart: no title, legend below. */
    static JFreeChart chart(Plot plot, ChartLook look) {
        JFreeChart chart = new JFreeChart(null, look.font(), plot, true);
        chart.setBackgroundPaint(look.ground());
        chart.setBorderVisible(false);
        chart.setPadding(new RectangleInsets(6, 4, 4, 12));
        chart.setAntiAlias(true);
        LegendTitle legend = chart.getLegend();
        legend.setPosition(RectangleEdge.BOTTOM);
        legend.setHorizontalAlignment(HorizontalAlignment.LEFT);
        legend.setFrame(BlockBorder.NONE);
        legend.setBackgroundPaint(look.ground());
        legend.setItemFont(look.small());
        legend.setItemPaint(look.line());
        legend.setItemLabelPadding(new RectangleInsets(1, 2, 1, 10));
        return chart;
    }

    /** A mark of a group of points; the shape goes with the group, so that colour is not needed to tell them apart. */
    static Shape mark(int group, double size) {
        double r = size / 2.0;
        return switch (Math.floorMod(group, 4)) {
            case 0 -> new Ellipse2D.Double(-r, -r, size, size);
            case 1 -> new Rectangle2D.Double(-0.9 * r, -0.9 * r, 0.9 * size, 0.9 * size);
            case 2 -> polygon(0, -1.15 * r, 1.1 * r, 0.85 * r, -1.1 * r, 0.85 * r);
            default -> polygon(0, -1.2 * r, 1.2 * r, 0, 0, 1.2 * r, -1.2 * r, 0);
        };
    }

    static Shape polygon(double... xy) {
        Path2D path = new Path2D.Double();
        path.moveTo(xy[0], xy[1]);
        for (int i = 2; i < xy.length; i += 2) {
            path.lineTo(xy[i], xy[i + 1]);
        }
        path.closePath();
        return path;
    }

    static BasicStroke line(float width) {
        return new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND);
    }

    static BasicStroke dashed(float width) {
        return new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10f, new float[] {6f, 4f}, 0f);
    }

    static Color clear(Color colour, int alpha) {
        return new Color(colour.getRed(), colour.getGreen(), colour.getBlue(), alpha);
    }
}
