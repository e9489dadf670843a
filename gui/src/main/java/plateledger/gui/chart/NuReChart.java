package plateledger.gui.chart;

import java.awt.Color;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.DeviationRenderer;
import org.jfree.chart.renderer.xy.XYErrorRenderer;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.title.TextTitle;
import org.jfree.chart.ui.HorizontalAlignment;
import org.jfree.data.xy.XYIntervalSeries;
import org.jfree.data.xy.XYIntervalSeriesCollection;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;
import org.jfree.data.xy.YIntervalSeries;
import org.jfree.data.xy.YIntervalSeriesCollection;
import plateledger.gui.model.NuRe;
import plateledger.gui.model.NuRe.Curve;
import plateledger.gui.model.NuRe.Group;
import plateledger.gui.model.NuRe.Point;
import plateledger.gui.model.NumberText;
import plateledger.report.Palette;

/** Nu_L over Re_L: runs with their intervals, theory, and fits with their bands, both axes logarithmic. */
public final class NuReChart {
    private static final double RANGE_MARGIN = 1.18;
    private static final double MARK = 7.0;
    private static final double RING = 15.0;
    private static final int BAND_ALPHA = 60;

    private NuReChart() {}

    /** The chart; the chosen run, if it is among the points, is ringed. */
    public static JFreeChart of(NuRe numbers, Optional<String> chosenRun, ChartLook look) {
        ValueAxis re = axis("Reynolds number Re_L", look, points(numbers).flatMapToDouble(p -> ends(p.re(), p.reU())));
        ValueAxis nu = axis(
                "Nusselt number Nu_L",
                look,
                points(numbers)
                        .flatMapToDouble(p -> DoubleStream.concat(
                                ends(p.nu(), p.nuU()),
                                DoubleStream.of(p.nuTheory()).filter(Double::isFinite))));
        XYPlot plot = PlotFrame.plot(re, nu, look);
        band(plot, numbers.fits(), look);
        theory(plot, numbers.groups(), look);
        ring(plot, numbers, chosenRun, look);
        runs(plot, numbers.groups(), look);
        JFreeChart chart = PlotFrame.chart(plot, look);
        chart.addSubtitle(0, form(numbers.form(), look));
        return chart;
    }

    private static TextTitle form(String words, ChartLook look) {
        TextTitle title = new TextTitle(words, look.small());
        title.setPaint(look.line());
        title.setHorizontalAlignment(HorizontalAlignment.LEFT);
        title.setPadding(2, 6, 2, 0);
        return title;
    }

    private static void band(XYPlot plot, List<Curve> fits, ChartLook look) {
        YIntervalSeriesCollection data = new YIntervalSeriesCollection();
        DeviationRenderer renderer = new DeviationRenderer(true, false);
        for (Curve curve : fits) {
            YIntervalSeries series = new YIntervalSeries(curve.name());
            for (int i = 0; i < curve.re().length; i++) {
                series.add(curve.re()[i], curve.nu()[i], curve.low()[i], curve.high()[i]);
            }
            int index = data.getSeriesCount();
            data.addSeries(series);
            renderer.setSeriesPaint(index, look.line());
            renderer.setSeriesStroke(index, PlotFrame.line(1.5f));
            renderer.setSeriesFillPaint(index, PlotFrame.clear(look.line(), 255));
        }
        renderer.setAlpha(BAND_ALPHA / 255f);
        renderer.setDefaultToolTipGenerator(
                (d, series, item) -> fits.get(series).name());
        plot.setRenderer(0, renderer);
        plot.setDataset(0, data);
    }

    private static void theory(XYPlot plot, List<Group> groups, ChartLook look) {
        XYSeriesCollection data = new XYSeriesCollection();
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
        for (int g = 0; g < groups.size(); g++) {
            List<Point> points = groups.get(g).theory();
            if (!points.isEmpty()) {
                XYSeries series =
                        new XYSeries("theory for this rig, " + groups.get(g).name(), false, true);
                points.forEach(p -> series.add(p.re(), p.nuTheory()));
                renderer.setSeriesPaint(data.getSeriesCount(), hue(g, look));
                renderer.setSeriesStroke(data.getSeriesCount(), PlotFrame.dashed(1.4f));
                data.addSeries(series);
            }
        }
        renderer.setDefaultToolTipGenerator((d, series, item) ->
                "%s: Nu_L = %s".formatted(d.getSeriesKey(series), NumberText.plain(d.getYValue(series, item))));
        plot.setRenderer(1, renderer);
        plot.setDataset(1, data);
    }

    private static void ring(XYPlot plot, NuRe numbers, Optional<String> chosenRun, ChartLook look) {
        XYSeries series = new XYSeries("chosen run");
        points(numbers)
                .filter(p -> chosenRun.filter(p.runId()::equals).isPresent())
                .forEach(p -> series.add(p.re(), p.nu()));
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(false, true);
        renderer.setSeriesShape(0, PlotFrame.mark(0, RING));
        renderer.setSeriesShapesFilled(0, false);
        renderer.setSeriesPaint(0, look.line());
        renderer.setSeriesStroke(0, PlotFrame.line(1.8f));
        renderer.setSeriesOutlineStroke(0, PlotFrame.line(1.8f));
        renderer.setSeriesVisibleInLegend(0, !series.isEmpty());
        plot.setRenderer(2, renderer);
        plot.setDataset(2, new XYSeriesCollection(series));
    }

    private static void runs(XYPlot plot, List<Group> groups, ChartLook look) {
        XYIntervalSeriesCollection data = new XYIntervalSeriesCollection();
        XYErrorRenderer renderer = new XYErrorRenderer();
        renderer.setCapLength(4.0);
        renderer.setErrorPaint(look.thinned(0.75));
        renderer.setErrorStroke(PlotFrame.line(1f));
        for (int g = 0; g < groups.size(); g++) {
            XYIntervalSeries series = new XYIntervalSeries(groups.get(g).name(), false, true);
            for (Point p : groups.get(g).points()) {
                double reU = known(p.reU());
                double nuU = known(p.nuU());
                series.add(p.re(), lower(p.re(), reU), p.re() + reU, p.nu(), lower(p.nu(), nuU), p.nu() + nuU);
            }
            renderer.setSeriesShape(g, PlotFrame.mark(g, MARK));
            renderer.setSeriesPaint(g, hue(g, look));
            data.addSeries(series);
        }
        renderer.setDefaultToolTipGenerator((d, series, item) -> {
            Point p = groups.get(series).points().get(item);
            return "%s: Re_L = %s, Nu_L = %s"
                    .formatted(
                            p.runId(),
                            NumberText.withInterval(p.re(), p.reU()),
                            NumberText.withInterval(p.nu(), p.nuU()));
        });
        plot.setRenderer(3, renderer);
        plot.setDataset(3, data);
    }

    private static Color hue(int group, ChartLook look) {
        return look.of(Palette.series(group));
    }

    private static Stream<Point> points(NuRe numbers) {
        return numbers.groups().stream().flatMap(group -> group.points().stream());
    }

    private static ValueAxis axis(String title, ChartLook look, DoubleStream values) {
        double[] all = values.filter(v -> v > 0.0).toArray();
        double low = DoubleStream.of(all).min().orElse(1.0);
        double high = DoubleStream.of(all).max().orElse(10.0);
        return Axes.logarithmic(title, low / RANGE_MARGIN, high * RANGE_MARGIN, look);
    }

    private static DoubleStream ends(double value, double half) {
        return DoubleStream.of(lower(value, known(half)), value + known(half));
    }

    /** The lower end of an interval; a logarithmic axis has no place for zero. */
    private static double lower(double value, double half) {
        return Math.max(value - half, 0.05 * value);
    }

    private static double known(double half) {
        return Double.isFinite(half) ? half : 0.0;
    }
}
