package plateledger.report;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.block.BlockBorder;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.DeviationRenderer;
import org.jfree.chart.renderer.xy.XYErrorRenderer;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.title.LegendTitle;
import org.jfree.chart.ui.HorizontalAlignment;
import org.jfree.chart.ui.Layer;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.data.xy.XYIntervalSeries;
import org.jfree.data.xy.XYIntervalSeriesCollection;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;
import org.jfree.data.xy.YIntervalSeries;
import org.jfree.data.xy.YIntervalSeriesCollection;

/** One figure under construction, in the report's look: white ground, faint grid, no frame, marks that differ in shape. */
final class Plot {
    private static final float THIN = 1.2f;
    private static final float LEGEND_SIZE = 11f;
    private static final int BAND_ALPHA = 46;

    private final XYPlot plot;
    private int layers;

    /** A point with the half-widths of its bars. */
    record Mark(double x, double xHalf, double y, double yHalf) {}

    /** A point of a curve with its band; low = high = y where there is none. */
    record CurvePoint(double x, double low, double y, double high) {}

    Plot(ValueAxis x, ValueAxis y) {
        plot = new XYPlot(new XYSeriesCollection(), x, y, new XYLineAndShapeRenderer());
        plot.setBackgroundPaint(Palette.PAPER);
        plot.setOutlineVisible(false);
        plot.setDomainGridlinePaint(Palette.GRID);
        plot.setRangeGridlinePaint(Palette.GRID);
        plot.setDomainGridlineStroke(new BasicStroke(0.8f));
        plot.setRangeGridlineStroke(new BasicStroke(0.8f));
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
    }

    /** Points with bars. Later layers lie on top of earlier ones. */
    Plot marks(String label, Color colour, int shape, List<Mark> marks) {
        XYIntervalSeries series = new XYIntervalSeries(label, false, true);
        for (Mark m : marks) {
            series.add(m.x, m.x - m.xHalf, m.x + m.xHalf, m.y, m.y - m.yHalf, m.y + m.yHalf);
        }
        XYIntervalSeriesCollection data = new XYIntervalSeriesCollection();
        data.addSeries(series);
        XYErrorRenderer renderer = new XYErrorRenderer();
        renderer.setSeriesPaint(0, colour);
        renderer.setSeriesShape(0, shape(shape));
        renderer.setErrorStroke(new BasicStroke(1f));
        renderer.setCapLength(0);
        layer(data, renderer);
        return this;
    }

    /** A curve with a band. */
    Plot curve(String label, Color colour, boolean dashed, boolean inLegend, List<CurvePoint> points) {
        YIntervalSeries series = new YIntervalSeries(label, false, true);
        points.forEach(p -> series.add(p.x, p.y, p.low, p.high));
        YIntervalSeriesCollection data = new YIntervalSeriesCollection();
        data.addSeries(series);
        DeviationRenderer renderer = new DeviationRenderer(true, false);
        renderer.setSeriesPaint(0, colour);
        renderer.setSeriesFillPaint(0, new Color(colour.getRed(), colour.getGreen(), colour.getBlue(), 255));
        renderer.setAlpha(BAND_ALPHA / 255f);
        renderer.setSeriesVisibleInLegend(0, inLegend);
        renderer.setSeriesStroke(
                0,
                dashed
                        ? new BasicStroke(
                                THIN, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1f, new float[] {6f, 4f}, 0f)
                        : new BasicStroke(THIN, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
        layer(data, renderer);
        return this;
    }

    /** A thin line through points, with small marks, left out of the legend unless it has a label. */
    Plot line(String label, Color colour, boolean inLegend, int shape, List<double[]> points) {
        XYSeries series = new XYSeries(label, false, true);
        points.forEach(p -> series.add(p[0], p[1]));
        XYSeriesCollection data = new XYSeriesCollection(series);
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, true);
        renderer.setSeriesPaint(0, colour);
        renderer.setSeriesStroke(0, new BasicStroke(0.8f));
        renderer.setSeriesShape(0, shape(shape));
        renderer.setSeriesVisibleInLegend(0, inLegend);
        layer(data, renderer);
        return this;
    }

    /** A horizontal line over the whole width. */
    Plot level(double value) {
        ValueMarker marker = new ValueMarker(value, Palette.INK, new BasicStroke(0.8f));
        plot.addRangeMarker(marker, Layer.BACKGROUND);
        return this;
    }

    /** The finished chart. */
    JFreeChart chart() {
        JFreeChart chart = new JFreeChart(null, Fonts.regular(LEGEND_SIZE), plot, false);
        chart.setBackgroundPaint(Palette.PAPER);
        chart.setPadding(new RectangleInsets(4, 4, 4, 12));
        LegendTitle legend = new LegendTitle(plot);
        legend.setItemFont(Fonts.regular(LEGEND_SIZE));
        legend.setItemPaint(Palette.INK);
        legend.setFrame(BlockBorder.NONE);
        legend.setBackgroundPaint(Palette.PAPER);
        legend.setPosition(RectangleEdge.TOP);
        legend.setHorizontalAlignment(HorizontalAlignment.LEFT);
        chart.addLegend(legend);
        return chart;
    }

    private void layer(org.jfree.data.xy.XYDataset data, org.jfree.chart.renderer.xy.XYItemRenderer renderer) {
        plot.setDataset(layers, data);
        plot.setRenderer(layers, renderer);
        layers++;
    }

    /** Marks that stay apart in black and white: circle, square, diamond, triangle, inverted triangle. */
    static Shape shape(int n) {
        return switch (Math.floorMod(n, 5)) {
            case 0 -> new Ellipse2D.Double(-3.2, -3.2, 6.4, 6.4);
            case 1 -> new Rectangle2D.Double(-2.9, -2.9, 5.8, 5.8);
            case 2 -> polygon(0, -4.3, 4.3, 0, 0, 4.3, -4.3, 0);
            case 3 -> polygon(0, -4, 4, 3, -4, 3);
            default -> polygon(0, 4, 4, -3, -4, -3);
        };
    }

    private static Shape polygon(double... xy) {
        Path2D path = new Path2D.Double();
        path.moveTo(xy[0], xy[1]);
        for (int i = 2; i < xy.length; i += 2) {
            path.lineTo(xy[i], xy[i + 1]);
        }
        path.closePath();
        return path;
    }
}
