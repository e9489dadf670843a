package plateledger.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import plateledger.fit.Constants;
import plateledger.fit.FitPoint;
import plateledger.fit.FitResult;
import plateledger.fit.SharedSource;
import plateledger.quantity.Estimate;
import plateledger.reduce.CampaignResult;

/** The fitted constants with all that qualifies them. */
final class FitSection {
    private static final double PULL_LIMIT = 2.0; // common practice: beyond it a shared source is doubted
    private static final int SOURCES_SHOWN = 12;

    private FitSection() {}

    static List<Map<String, Object>> model(CampaignResult result, List<Figures.Figure> figures) {
        return result.fits().stream().map(fit -> one(result, fit, figures)).toList();
    }

    private static Map<String, Object> one(CampaignResult result, FitResult fit, List<Figures.Figure> figures) {
        Constants c = fit.twoStep();
        double k = fit.coverageFactor();
        Map<String, Object> model = new LinkedHashMap<>();
        model.put("id", fit.problem().id());
        model.put("runs", fit.problem().points().size());
        model.put("c", cValue(c));
        model.put("m", Shown.value(Estimate.of(c.m(), c.uM())));
        model.put("n", Shown.exponent(fit.problem().prandtlExponent()));
        model.put("cInterval", cInterval(c, k));
        model.put("mInterval", mInterval(c, k));
        model.put("k", Shown.fixed(k, 2));
        model.put("reLow", Shown.digits(lowest(fit), 3));
        model.put("reHigh", Shown.digits(highest(fit), 3));
        model.put(
                "prLow",
                Shown.fixed(
                        fit.problem().points().stream()
                                .mapToDouble(FitPoint::pr)
                                .min()
                                .orElse(Double.NaN),
                        3));
        model.put(
                "prHigh",
                Shown.fixed(
                        fit.problem().points().stream()
                                .mapToDouble(FitPoint::pr)
                                .max()
                                .orElse(Double.NaN),
                        3));
        model.put("constants", constants(fit));
        model.put("covariance", covariance(c));
        model.put("quality", quality(fit));
        model.put("exponents", exponents(c, k));
        model.put("sources", sources(fit));
        model.put("sourcesLeft", Math.max(0, fit.problem().sources().size() - SOURCES_SHOWN));
        model.put("leftOut", leftOut(result, fit));
        figures.stream()
                .filter(f -> f.name()
                        .equals("residuals-" + Figures.fileName(fit.problem().id())))
                .findFirst()
                .ifPresent(f -> model.put("figure", Map.of("svg", f.svg(), "caption", f.caption())));
        return model;
    }

    /** C rounded to its standard uncertainty. */
    static String cValue(Constants c) {
        return Shown.value(Estimate.of(c.c(), c.c() * c.uLnC()));
    }

    /** The 95 % interval of C, formed in ln C. */
    static String cInterval(Constants c, double k) {
        double u = c.c() * c.uLnC();
        return Shown.value(Estimate.of(c.c() * Math.exp(-k * c.uLnC()), u))
                + " to "
                + Shown.value(Estimate.of(c.c() * Math.exp(k * c.uLnC()), u));
    }

    /** The 95 % interval of m. */
    static String mInterval(Constants c, double k) {
        return Shown.value(Estimate.of(c.m() - k * c.uM(), c.uM()))
                + " to "
                + Shown.value(Estimate.of(c.m() + k * c.uM(), c.uM()));
    }

    static double lowest(FitResult fit) {
        return fit.problem().points().stream().mapToDouble(FitPoint::re).min().orElse(Double.NaN);
    }

    static double highest(FitResult fit) {
        return fit.problem().points().stream().mapToDouble(FitPoint::re).max().orElse(Double.NaN);
    }

    private static Map<String, Object> constants(FitResult fit) {
        Grid grid = new Grid("", "#C", "#u(ln C)", "#m", "#u(m)");
        addRow(grid, "two-step (used)", fit.twoStep());
        addRow(grid, "its random part alone", fit.randomOnly());
        addRow(grid, "generalised least squares", fit.generalised());
        return grid.model();
    }

    private static void addRow(Grid grid, String name, Constants c) {
        grid.row(
                name,
                cValue(c),
                Shown.digits(c.uLnC(), 2),
                Shown.value(Estimate.of(c.m(), c.uM())),
                Shown.digits(c.uM(), 2));
    }

    private static Map<String, Object> covariance(Constants c) {
        double cov = c.covAM() - c.xg() * c.varM();
        double varLnC = c.uLnC() * c.uLnC();
        double correlation = varLnC > 0 && c.varM() > 0 ? cov / Math.sqrt(varLnC * c.varM()) : Double.NaN;
        return new Grid("", "#ln C", "#m")
                .row("ln C", Shown.digits(varLnC, 4), Shown.digits(cov, 4))
                .row("m", Shown.digits(cov, 4), Shown.digits(c.varM(), 4))
                .row("correlation", "", Shown.fixed(correlation, 4))
                .model();
    }

    private static Map<String, Object> quality(FitResult fit) {
        Grid grid = new Grid("test", "#found", "what it says");
        grid.row(
                "χ² of the random parts, " + fit.dof() + " degrees of freedom",
                Shown.digits(fit.chiSquare(), 3),
                "a larger value had probability " + Shown.digits(fit.chiSquareProbability(), 2));
        if (Double.isFinite(fit.lackOfFitF())) {
            grid.row(
                    "lack of fit against repeats, F",
                    Shown.digits(fit.lackOfFitF(), 3),
                    "a larger value had probability " + Shown.digits(fit.lackOfFitProbability(), 2));
        } else {
            grid.row("lack of fit against repeats, F", Shown.NONE, "not tested: no repeats");
        }
        grid.row(
                "scatter within repeats",
                Double.isFinite(fit.repeatScatter()) ? Shown.percent(fit.repeatScatter(), 2) : Shown.NONE,
                "standard deviation of Nu at one set point");
        return grid.model();
    }

    /** Whether the exponents of boundary-layer theory lie within the interval of m. */
    private static List<String> exponents(Constants c, double k) {
        List<String> lines = new ArrayList<>();
        lines.add(exponent("1/2, laminar layer", 0.5, c, k));
        lines.add(exponent("4/5, turbulent layer", 0.8, c, k));
        return lines;
    }

    private static String exponent(String name, double theory, Constants c, double k) {
        boolean inside = Math.abs(c.m() - theory) <= k * c.uM();
        return "m = " + name + (inside ? ": within" : ": outside") + " the 95 % interval ("
                + Shown.signed((c.m() - theory) / c.uM(), 1) + " standard uncertainties away)";
    }

    private static Map<String, Object> sources(FitResult fit) {
        List<SharedSource> sources = fit.problem().sources();
        List<Integer> order = new ArrayList<>();
        for (int i = 0; i < sources.size(); i++) {
            order.add(i);
        }
        order.sort(java.util.Comparator.comparingDouble(
                (Integer i) -> -Math.hypot(fit.sourceShifts()[i][0], fit.sourceShifts()[i][1])));
        Grid grid = new Grid("shared source", "scope", "#shift of Nu, %", "#shift of m", "#pull", "");
        for (int i : order.subList(0, Math.min(SOURCES_SHOWN, order.size()))) {
            double pull = fit.pulls()[i];
            grid.row(
                    sources.get(i).name(),
                    sources.get(i).scope(),
                    Shown.signed(100.0 * Math.expm1(fit.sourceShifts()[i][0]), 3),
                    Shown.signed(fit.sourceShifts()[i][1], 5),
                    Shown.signed(pull, 2),
                    Math.abs(pull) > PULL_LIMIT ? "beyond 2: doubted" : "");
        }
        return grid.model();
    }

    private static List<String> leftOut(CampaignResult result, FitResult fit) {
        return result.campaign().fits().stream()
                .filter(r -> r.id().equals(fit.problem().id()))
                .flatMap(r -> FitRuns.of(result, r).stream())
                .filter(run -> fit.problem().points().stream()
                        .noneMatch(p -> p.id().equals(run.run().id())))
                .map(run -> run.run().id() + ": " + FitRuns.reason(run))
                .toList();
    }
}
