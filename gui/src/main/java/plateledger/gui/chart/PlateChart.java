package plateledger.gui.chart;

import java.awt.Color;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.StackedXYBarRenderer;
import org.jfree.chart.renderer.xy.StandardXYBarPainter;
import org.jfree.chart.renderer.xy.XYErrorRenderer;
import org.jfree.chart.renderer.xy.XYItemRenderer;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.data.xy.DefaultTableXYDataset;
import org.jfree.data.xy.XYDataset;
import org.jfree.data.xy.XYIntervalSeries;
import org.jfree.data.xy.XYIntervalSeriesCollection;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;
import plateledger.gui.model.HeatPart;
import plateledger.gui.model.NumberText;
import plateledger.gui.model.PlateProfile;
import plateledger.gui.model.PlateProfile.Station;
import plateledger.gui.model.PlateSection.Strip;
import plateledger.reduce.LedgerTerm;
import plateledger.report.Palette;

/** One run along the plate: temperatures above, the plate in section, booked heat below, on one x axis. */
public final class PlateChart {
    private static final int TEMPERATURE_SHARE = 34;
    private static final int SECTION_SHARE = 33;
    private static final int HEAT_SHARE = 34;
    private static final double X_MARGIN = 0.03;
    private static final double BAR_SHARE = 0.62;

    private PlateChart() {}

    /** The chart of a profile; without stations only the section is drawn. */
    public static JFreeChart of(PlateProfile profile, ChartLook look) {
        NumberAxis x = Axes.linear("distance from the leading edge x, mm", look);
        double length = profile.section().lengthMm();
        x.setRange(-X_MARGIN * length, (1.0 + X_MARGIN) * length);
        CombinedDomainXYPlot combined = new CombinedDomainXYPlot(x);
        combined.setGap(6.0);
        combined.setBackgroundPaint(look.ground());
        combined.setOutlineVisible(false);
        if (!profile.stations().isEmpty()) {
            combined.add(temperatures(profile, look), TEMPERATURE_SHARE);
        }
        combined.add(section(profile, look), SECTION_SHARE);
        if (!profile.stations().isEmpty()) {
            combined.add(heat(profile, look), HEAT_SHARE);
        }
        return PlotFrame.chart(combined, look);
    }

    private static XYPlot temperatures(PlateProfile profile, ChartLook look) {
        List<Station> stations = profile.stations();
        XYPlot plot = PlotFrame.plot(null, Axes.linear("temperature, °C", look), look);
        if (profile.hasTheory()) {
            XYSeries theory = new XYSeries("surface by theory, same flux");
            stations.forEach(s -> theory.add(s.xMm(), s.theoryC()));
            XYLineAndShapeRenderer line = new XYLineAndShapeRenderer(true, false);
            line.setSeriesPaint(0, look.line());
            line.setSeriesStroke(0, PlotFrame.dashed(1.4f));
            line.setDefaultToolTipGenerator((data, series, item) -> at(stations.get(item)) + "T_s of theory "
                    + NumberText.plain(stations.get(item).theoryC()) + " °C");
            layer(plot, 0, new XYSeriesCollection(theory), line);
        }
        XYIntervalSeries reference = new XYIntervalSeries("reference (adiabatic wall)");
        stations.forEach(s -> add(reference, s.xMm(), s.referenceC(), s.referenceU()));
        XYErrorRenderer referenceMarks = marks(1, 5.0, look.line(), look);
        referenceMarks.setSeriesShapesFilled(0, false);
        referenceMarks.setSeriesLinesVisible(0, true);
        referenceMarks.setDefaultToolTipGenerator((data, series, item) -> at(stations.get(item)) + "T_ref "
                + NumberText.withInterval(
                        stations.get(item).referenceC(), stations.get(item).referenceU()) + " °C");
        layer(plot, 1, collection(reference), referenceMarks);

        XYIntervalSeries surface = new XYIntervalSeries("surface measured, 95 %");
        stations.forEach(s -> add(surface, s.xMm(), s.surfaceC(), s.surfaceU()));
        XYErrorRenderer surfaceMarks = marks(0, 6.0, look.of(Palette.WINE), look);
        surfaceMarks.setDefaultToolTipGenerator((data, series, item) -> at(stations.get(item)) + "T_s "
                + NumberText.withInterval(
                        stations.get(item).surfaceC(), stations.get(item).surfaceU()) + " °C");
        layer(plot, 2, collection(surface), surfaceMarks);
        return plot;
    }

    private static XYPlot section(PlateProfile profile, ChartLook look) {
        NumberAxis none = Axes.linear("", look);
        none.setRange(0.0, 1.0);
        none.setVisible(false);
        XYPlot plot = PlotFrame.plot(null, none, look);
        plot.setRangeGridlinesVisible(false);
        plot.setDomainGridlinesVisible(false);
        plot.addAnnotation(new SectionDrawing(profile.section(), look));
        return plot;
    }

    private static XYPlot heat(PlateProfile profile, ChartLook look) {
        List<Station> stations = profile.stations().stream()
                .filter(s -> s.parts().values().stream().allMatch(Double::isFinite))
                .toList();
        NumberAxis axis = Axes.linear("booked heat flux, W/m²", look);
        axis.setAutoRangeIncludesZero(true);
        XYPlot plot = PlotFrame.plot(null, axis, look);
        plot.setRangeZeroBaselineVisible(true);
        plot.setRangeZeroBaselinePaint(look.line());
        layer(plot, 0, stacks(stations), bars(stations, look));

        XYIntervalSeries convection = new XYIntervalSeries("interval of convection");
        stations.forEach(s -> add(convection, s.xMm(), s.part(HeatPart.CONVECTION), s.partU(HeatPart.CONVECTION)));
        // Drawn twice, wide in the colour of the ground below: half of each bar lies on a dark column.
        layer(plot, 1, collection(convection), interval(look.ground(), 3.2f, look));
        layer(plot, 2, collection(convection), interval(look.line(), 1.1f, look));

        XYLineAndShapeRenderer heater = new XYLineAndShapeRenderer(true, false);
        heater.setSeriesPaint(0, look.line());
        heater.setSeriesStroke(0, PlotFrame.line(1.8f));
        heater.setDefaultToolTipGenerator(
                (data, series, item) -> "heater flux " + NumberText.plain(data.getYValue(series, item)) + " W/m²");
        layer(plot, 3, new XYSeriesCollection(heaterFlux(profile, stations)), heater);
        return plot;
    }

    private static XYErrorRenderer interval(Color colour, float width, ChartLook look) {
        XYErrorRenderer interval = marks(0, 1.0, colour, look);
        interval.setErrorPaint(colour);
        interval.setErrorStroke(PlotFrame.line(width));
        interval.setSeriesShapesVisible(0, false);
        interval.setSeriesVisibleInLegend(0, false);
        return interval;
    }

    /** The renderer goes in first: the library asks a data set's range of whatever renderer it finds. */
    private static void layer(XYPlot plot, int index, XYDataset data, XYItemRenderer renderer) {
        plot.setRenderer(index, renderer);
        plot.setDataset(index, data);
    }

    private static DefaultTableXYDataset stacks(List<Station> stations) {
        DefaultTableXYDataset data = new DefaultTableXYDataset(false);
        for (HeatPart part : HeatPart.values()) {
            XYSeries series = new XYSeries(part.label(), false, false);
            stations.forEach(s -> series.add(s.xMm(), s.part(part)));
            data.addSeries(series);
        }
        data.setAutoWidth(false);
        data.setIntervalWidth(BAR_SHARE * closest(stations));
        data.setIntervalPositionFactor(0.5);
        return data;
    }

    private static StackedXYBarRenderer bars(List<Station> stations, ChartLook look) {
        StackedXYBarRenderer bars = new StackedXYBarRenderer();
        bars.setBarPainter(new StandardXYBarPainter());
        bars.setShadowVisible(false);
        bars.setDrawBarOutline(true);
        List<HeatPart> parts = List.of(HeatPart.values());
        for (int series = 0; series < parts.size(); series++) {
            HeatPart part = parts.get(series);
            Color colour = look.of(hue(part));
            bars.setSeriesPaint(series, hatch(part).fill(colour, look.ground()));
            bars.setSeriesOutlinePaint(series, look.thinned(0.7));
        }
        bars.setDefaultToolTipGenerator((data, series, item) -> {
            Station s = stations.get(item);
            HeatPart part = parts.get(series);
            return at(s) + part.label() + " " + NumberText.withInterval(s.part(part), s.partU(part)) + " W/m² of "
                    + NumberText.plain(s.electrical()) + " W/m²";
        });
        return bars;
    }

    private static Color hue(HeatPart part) {
        return switch (part) {
            case CONVECTION -> Palette.of(LedgerTerm.CONVECTION);
            case RADIATION -> Palette.of(LedgerTerm.RADIATION);
            case BACK -> Palette.of(LedgerTerm.BACK);
            case CONDUCTION -> Palette.of(LedgerTerm.NOSE);
        };
    }

    private static Hatch hatch(HeatPart part) {
        return switch (part) {
            case CONVECTION -> Hatch.SOLID;
            case RADIATION -> Hatch.RISING;
            case BACK -> Hatch.DOTS;
            case CONDUCTION -> Hatch.LEVEL;
        };
    }

    /** A level line over each strip that has a station. */
    private static XYSeries heaterFlux(PlateProfile profile, List<Station> stations) {
        XYSeries series = new XYSeries("heater flux", false, true);
        Set<Strip> drawn = new LinkedHashSet<>();
        for (Station s : stations) {
            Strip strip = profile.section().stripAt(s.xMm());
            if (drawn.add(strip)) {
                series.add(strip.fromMm(), s.electrical());
                series.add(strip.toMm(), s.electrical());
                series.add(strip.toMm(), Double.NaN); // lifts the pen
            }
        }
        return series;
    }

    private static double closest(List<Station> stations) {
        double closest = Double.POSITIVE_INFINITY;
        for (int i = 1; i < stations.size(); i++) {
            closest = Math.min(
                    closest, stations.get(i).xMm() - stations.get(i - 1).xMm());
        }
        return Double.isFinite(closest) && closest > 0.0 ? closest : 1.0;
    }

    private static void add(XYIntervalSeries series, double x, double y, double half) {
        double u = Double.isFinite(half) ? half : 0.0;
        series.add(x, x, x, y, y - u, y + u);
    }

    private static XYIntervalSeriesCollection collection(XYIntervalSeries series) {
        XYIntervalSeriesCollection data = new XYIntervalSeriesCollection();
        data.addSeries(series);
        return data;
    }

    private static XYErrorRenderer marks(int shape, double size, Color colour, ChartLook look) {
        XYErrorRenderer marks = new XYErrorRenderer();
        marks.setDrawXError(false);
        marks.setCapLength(5.0);
        marks.setErrorPaint(look.thinned(0.8));
        marks.setErrorStroke(PlotFrame.line(1.1f));
        marks.setSeriesShape(0, PlotFrame.mark(shape, size));
        marks.setSeriesPaint(0, colour);
        return marks;
    }

    private static String at(Station station) {
        return "%s, x = %s mm: ".formatted(station.channel(), NumberText.plain(station.xMm()));
    }
}
