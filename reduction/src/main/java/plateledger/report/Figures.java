package plateledger.report;

import java.awt.Color;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import plateledger.fit.Constants;
import plateledger.fit.FitPoint;
import plateledger.fit.FitResult;
import plateledger.reduce.CampaignResult;

/** The figures of a campaign. Bars and bands are 95 % (two standard uncertainties, or the fit's own factor). */
final class Figures {
    private static final int WIDTH = 860;
    private static final int TALL = 520;
    private static final int LOW = 340;
    private static final double K95 = 2.0; // common practice, stated in each caption
    private static final int CURVE_POINTS = 60;

    /**
     * A figure.
     *
     * @param name file name without ending
     * @param caption what it shows
     * @param svg the drawing
     */
    record Figure(String name, String caption, String svg) {}

    private final CampaignResult result;
    private final List<RunGroup> groups;

    Figures(CampaignResult result) {
        this.result = result;
        this.groups = RunGroup.of(result);
    }

    /** All figures that this result has data for. */
    List<Figure> all() {
        List<Figure> figures = new ArrayList<>();
        nusselt().ifPresent(figures::add);
        theoryOfRuns().ifPresent(figures::add);
        theoryOfStations().ifPresent(figures::add);
        result.fits().forEach(fit -> figures.add(residuals(fit)));
        return figures;
    }

    /** Nu over Re with fit and theory; empty without a reduced run. */
    Optional<Figure> nusselt() {
        if (groups.isEmpty()) {
            return Optional.empty();
        }
        Plot plot = new Plot(ChartAxes.logarithmic("Re"), ChartAxes.logarithmic("Nu"));
        boolean theoryNamed = false;
        for (int i = 0; i < groups.size(); i++) {
            RunGroup group = groups.get(i);
            Color colour = Palette.series(i);
            List<Plot.CurvePoint> theory = group.compared().stream()
                    .map(p -> flat(
                            p.values().reL().value(), p.values().nuLTheory().value()))
                    .toList();
            if (theory.size() > 1) {
                plot.curve("theory for this rig", Palette.INK, true, !theoryNamed, theory);
                theoryNamed = true;
            }
            for (FitResult fit : group.fits(result)) {
                plot.curve(fit.problem().id(), colour, false, false, fitted(fit));
            }
        }
        for (int i = 0; i < groups.size(); i++) {
            plot.marks(
                    groups.get(i).label(),
                    Palette.series(i),
                    i,
                    groups.get(i).runs().stream()
                            .map(p -> new Plot.Mark(
                                    p.values().reL().value(),
                                    K95 * p.values().reL().u(),
                                    p.values().nuL().value(),
                                    K95 * p.values().nuL().u()))
                            .toList());
        }
        String caption = "Average Nusselt number over Reynolds number, by the definitions in use. Bars: 95 %, often"
                + " smaller than the mark. Solid: fit with its 95 % band. Dashed: theory for this rig's measured"
                + " heating.";
        return Optional.of(draw("nu-re", caption, plot, TALL));
    }

    /** Measured over theory, run averages; empty without a theory. */
    private Optional<Figure> theoryOfRuns() {
        if (groups.stream().allMatch(g -> g.compared().isEmpty())) {
            return Optional.empty();
        }
        Plot plot = new Plot(ChartAxes.logarithmic("Re"), ChartAxes.linear("Nu / Nu(theory) − 1, %")).level(0);
        for (int i = 0; i < groups.size(); i++) {
            RunGroup group = groups.get(i);
            if (group.compared().isEmpty()) {
                continue;
            }
            plot.curve(
                    group.regime().word(),
                    Palette.series(i),
                    true,
                    false,
                    group.compared().stream()
                            .map(p -> {
                                double u = 100.0
                                        * K95
                                        * p.values().nuLTheory().u()
                                        / p.values().nuLTheory().value();
                                return new Plot.CurvePoint(p.values().reL().value(), -u, 0, u);
                            })
                            .toList());
        }
        for (int i = 0; i < groups.size(); i++) {
            RunGroup group = groups.get(i);
            if (group.compared().isEmpty()) {
                continue;
            }
            plot.marks(
                    group.label(),
                    Palette.series(i),
                    i,
                    group.compared().stream()
                            .map(p -> new Plot.Mark(
                                    p.values().reL().value(),
                                    0,
                                    100.0 * Math.expm1(p.values().lnRatio().value()),
                                    100.0 * K95 * p.values().lnRatio().u()))
                            .toList());
        }
        String caption =
                "Run averages against theory for this rig. Bars: 95 % of the ratio, errors shared by both sides"
                        + " taken out. Shaded: 95 % of the theory itself.";
        return Optional.of(draw("theory-runs", caption, plot, LOW));
    }

    /** E_n along the plate; empty without a theory. */
    private Optional<Figure> theoryOfStations() {
        if (groups.stream().allMatch(g -> g.compared().isEmpty())) {
            return Optional.empty();
        }
        Plot plot = new Plot(ChartAxes.linear("x from the leading edge, mm"), ChartAxes.linear("Eₙ"))
                .level(-1)
                .level(1);
        for (int i = 0; i < groups.size(); i++) {
            RunGroup group = groups.get(i);
            boolean first = true;
            for (RunGroup.Point point : group.compared()) {
                List<double[]> line = point.values().stations().stream()
                        .filter(s -> Double.isFinite(s.en()))
                        .map(s -> new double[] {1000.0 * s.x().value(), s.en()})
                        .toList();
                if (!line.isEmpty()) {
                    plot.line(group.label() + (first ? "" : " " + point.id()), Palette.series(i), first, i, line);
                    first = false;
                }
            }
        }
        String caption = "Stations against theory for this rig, a line per run: between the lines at −1 and +1 the two"
                + " agree within 95 %.";
        return Optional.of(draw("theory-stations", caption, plot, LOW));
    }

    private Figure residuals(FitResult fit) {
        Plot plot = new Plot(ChartAxes.logarithmic("Re"), ChartAxes.linear("measured / fit − 1, %")).level(0);
        List<Plot.CurvePoint> band = fitted(fit).stream()
                .map(p -> new Plot.CurvePoint(
                        p.x(), 100.0 * (p.low() / p.y() - 1.0), 0.0, 100.0 * (p.high() / p.y() - 1.0)))
                .toList();
        plot.curve("band", Palette.TEAL, true, false, band);
        List<Plot.Mark> marks = new ArrayList<>();
        List<FitPoint> points = fit.problem().points();
        for (int i = 0; i < points.size(); i++) {
            marks.add(new Plot.Mark(
                    points.get(i).re(),
                    0,
                    100.0 * Math.expm1(fit.residuals()[i]),
                    100.0 * K95 * points.get(i).uLnYRandom()));
        }
        plot.marks("runs, 95 % of the random parts", Palette.INDIGO, 0, marks);
        String caption =
                "Residuals of fit " + fit.problem().id() + ". Bars hold the parts that are drawn anew in each run;"
                        + " the shaded 95 % band of the fit also holds what runs share.";
        return draw("residuals-" + fileName(fit.problem().id()), caption, plot, LOW);
    }

    private static List<Plot.CurvePoint> fitted(FitResult fit) {
        Constants c = fit.twoStep();
        List<FitPoint> points = fit.problem().points();
        double low = points.stream().mapToDouble(FitPoint::re).min().orElse(1.0);
        double high = points.stream().mapToDouble(FitPoint::re).max().orElse(1.0);
        double pr = points.stream().mapToDouble(FitPoint::pr).average().orElse(1.0);
        double lnPr = fit.problem().prandtlExponent() * Math.log(pr);
        List<Plot.CurvePoint> curve = new ArrayList<>();
        for (int i = 0; i <= CURVE_POINTS; i++) {
            double re = low * Math.pow(high / low, (double) i / CURVE_POINTS);
            double ln = c.lnY(re) + lnPr;
            double half = fit.coverageFactor() * c.uLnY(re);
            curve.add(new Plot.CurvePoint(re, Math.exp(ln - half), Math.exp(ln), Math.exp(ln + half)));
        }
        return curve;
    }

    private static Plot.CurvePoint flat(double x, double y) {
        return new Plot.CurvePoint(x, y, y, y);
    }

    private static Figure draw(String name, String caption, Plot plot, int height) {
        return new Figure(name, caption, SvgDrawing.draw(name, caption, plot.chart(), WIDTH, height));
    }

    /** A name that is safe as a file name and as an id in a page. */
    static String fileName(String id) {
        return id.replaceAll("[^A-Za-z0-9_-]", "_");
    }
}
