package plateledger.gui.model;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import plateledger.campaign.Regime;
import plateledger.campaign.Run;
import plateledger.fit.Constants;
import plateledger.fit.FitPoint;
import plateledger.fit.FitResult;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.RunResult;

/**
 * Run averages over Reynolds number, with what theory gives and what was fitted. Pure numbers; intervals at 95 %.
 *
 * @param groups runs of one plate and regime, in campaign order
 * @param fits fitted curves
 * @param form the form of the fits with the exponent of Pr, and what intervals are shown
 */
public record NuRe(List<Group> groups, List<Curve> fits, String form) {
    /** Nothing to draw. */
    public static final NuRe NOTHING = new NuRe(List.of(), List.of(), "");

    private static final int CURVE_POINTS = 41;

    /**
     * Runs of one plate and regime.
     *
     * @param name what they are called
     * @param points the runs in campaign order
     */
    public record Group(String name, List<Point> points) {
        /** Copies the list. */
        public Group {
            points = List.copyOf(points);
        }

        /** The points that have a theoretical value, by rising Re. */
        public List<Point> theory() {
            return points.stream()
                    .filter(p -> Double.isFinite(p.nuTheory()))
                    .sorted(Comparator.comparingDouble(Point::re))
                    .toList();
        }
    }

    /**
     * One run.
     *
     * @param runId run
     * @param re Re_L
     * @param reU half-width of its interval
     * @param nu Nu_L
     * @param nuU half-width of its interval
     * @param nuTheory what theory gives for this rig at this run; NaN without theory
     */
    public record Point(String runId, double re, double reU, double nu, double nuU, double nuTheory) {}

    /**
     * A fitted curve over the range of Re of its points.
     *
     * @param name the fit with its constants
     * @param re Reynolds numbers
     * @param nu curve
     * @param low lower limit of its 95 % band
     * @param high upper limit
     */
    public record Curve(String name, double[] re, double[] nu, double[] low, double[] high) {}

    /** Copies the lists. */
    public NuRe {
        groups = List.copyOf(groups);
        fits = List.copyOf(fits);
    }

    /** The numbers of a campaign. */
    public static NuRe of(CampaignResult result) {
        Map<String, List<Point>> groups = new LinkedHashMap<>();
        for (RunResult run : result.runs()) {
            run.values()
                    .filter(v -> v.reL().isKnown() && v.nuL().isKnown())
                    .ifPresent(v -> groups.computeIfAbsent(RunRow.plateWords(run.run()), name -> new ArrayList<>())
                            .add(point(run.run(), v)));
        }
        List<Group> listed = groups.entrySet().stream()
                .map(entry -> new Group(entry.getKey(), entry.getValue()))
                .toList();
        return new NuRe(
                listed,
                result.fits().stream()
                        .filter(fit -> !fit.problem().points().isEmpty())
                        .map(NuRe::curve)
                        .toList(),
                result.fits().isEmpty()
                        ? "Bars: 95 %"
                        : "Fits: Nu = C·Reᵐ·Pr%s, with 95 %% band. Bars: 95 %%"
                                .formatted(
                                        exponent(result.campaign().definitions().prandtlExponent())));
    }

    /** True if there is nothing to draw. */
    public boolean isEmpty() {
        return groups.isEmpty();
    }

    private static Point point(Run run, RunResult.Values v) {
        double theory =
                run.regime() == Regime.PRODUCT ? Double.NaN : v.nuLTheory().value();
        return new Point(
                run.id(), v.reL().value(), NumberText.u95(v.reL()), v.nuL().value(), NumberText.u95(v.nuL()), theory);
    }

    /** Nu = C Re^m Pr^n at the geometric mean Pr of the points; the band is that of the curve, not of a new point. */
    private static Curve curve(FitResult fit) {
        List<FitPoint> points = fit.problem().points();
        double low = points.stream().mapToDouble(FitPoint::re).min().orElseThrow();
        double high = points.stream().mapToDouble(FitPoint::re).max().orElseThrow();
        double lnPr =
                points.stream().mapToDouble(p -> Math.log(p.pr())).average().orElseThrow();
        double lnPrPart = fit.problem().prandtlExponent() * lnPr;
        Constants constants = fit.twoStep();
        double[] re = new double[CURVE_POINTS];
        double[] nu = new double[CURVE_POINTS];
        double[] lower = new double[CURVE_POINTS];
        double[] upper = new double[CURVE_POINTS];
        for (int i = 0; i < CURVE_POINTS; i++) {
            re[i] = low * Math.pow(high / low, i / (CURVE_POINTS - 1.0));
            double lnNu = constants.lnY(re[i]) + lnPrPart;
            double half = fit.coverageFactor() * constants.uLnY(re[i]);
            nu[i] = Math.exp(lnNu);
            lower[i] = Math.exp(lnNu - half);
            upper[i] = Math.exp(lnNu + half);
        }
        return new Curve(name(fit), re, nu, lower, upper);
    }

    private static String name(FitResult fit) {
        Constants c = fit.twoStep();
        double k = fit.coverageFactor();
        return "fit %s: C = %s, m = %s"
                .formatted(
                        fit.problem().id(),
                        NumberText.withInterval(c.c(), c.c() * k * c.uLnC()),
                        NumberText.withInterval(c.m(), k * c.uM()));
    }

    private static String exponent(double n) {
        return Math.abs(n - 1.0 / 3.0) < 1e-9 ? "¹ᐟ³" : "^" + NumberText.plain(n);
    }
}
