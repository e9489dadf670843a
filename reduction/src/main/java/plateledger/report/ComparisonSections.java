package plateledger.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import plateledger.quantity.Estimate;
import plateledger.reduce.BudgetLine;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.LossResult;
import plateledger.reduce.RepeatSpread;

/** Comparison with theory, loss calibration, repeats and uncertainty budgets. */
final class ComparisonSections {
    private static final double NOT_INFORMED = 0.9; // posterior over prior uncertainty
    private static final int BUDGET_LINES = 10;

    private ComparisonSections() {}

    /** Run averages against theory for this rig. */
    static Map<String, Object> theory(List<RunGroup> groups) {
        Grid grid = new Grid("run", "regime", "#Re", "#Nu", "#Nu, theory", "#Nu / theory − 1, %", "#Eₙ", "");
        List<String> verdicts = new ArrayList<>();
        for (RunGroup group : groups) {
            List<RunGroup.Point> compared = group.compared();
            if (compared.isEmpty()) {
                continue;
            }
            verdicts.add(verdict(group));
            for (RunGroup.Point p : compared) {
                Estimate ratio = Shown.times(p.values().lnRatio(), 100.0);
                grid.row(
                        p.id(),
                        group.regime().word(),
                        Shown.pm(p.values().reL()),
                        Shown.pm(p.values().nuL()),
                        Shown.pm(p.values().nuLTheory()),
                        Shown.pm(new Estimate(
                                100.0 * Math.expm1(p.values().lnRatio().value()), ratio.u(), ratio.dof())),
                        Shown.signed(p.values().en(), 2),
                        Math.abs(p.values().en()) <= 1.0 ? "agree" : "differ");
            }
        }
        return Map.of("table", grid.model(), "verdicts", verdicts);
    }

    /** One sentence: how a group compares with theory. */
    static String verdict(RunGroup group) {
        List<RunGroup.Point> compared = group.compared();
        double mean = compared.stream()
                .mapToDouble(p -> p.values().lnRatio().value())
                .average()
                .orElse(Double.NaN);
        long agree =
                compared.stream().filter(p -> Math.abs(p.values().en()) <= 1.0).count();
        return String.format(
                Locale.ROOT,
                "%s: Nu lies on average %s %% from theory for this rig; %d of %d run averages agree with it within"
                        + " 95 %% (|Eₙ| ≤ 1).",
                capital(group.label()),
                Shown.signed(100.0 * Math.expm1(mean), 1),
                agree,
                compared.size());
    }

    static String capital(String text) {
        return text.isEmpty() ? text : text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }

    /** Loss parameters before and after the loss runs. */
    static List<Map<String, Object>> losses(CampaignResult result) {
        List<Map<String, Object>> all = new ArrayList<>();
        for (LossResult loss : result.losses()) {
            Grid grid = new Grid("parameter", "unit", "#declared", "#after the loss runs", "#u after ÷ u declared", "");
            for (LossResult.Parameter p : loss.parameters()) {
                grid.row(
                        p.name(),
                        p.unit().equals("1") ? "" : p.unit(),
                        Shown.pm(p.prior()),
                        Shown.pm(p.posterior()),
                        Shown.fixed(p.uRatio(), 2),
                        p.uRatio() > NOT_INFORMED ? "not informed by these runs" : "informed");
            }
            Grid residuals = new Grid("loss run", "#power measured − modelled, W");
            for (int i = 0; i < loss.residualsW().length && i < loss.runs().size(); i++) {
                residuals.row(loss.runs().get(i), Shown.signed(loss.residualsW()[i], 4));
            }
            all.add(Map.of("plate", loss.plate(), "table", grid.model(), "residuals", residuals.model()));
        }
        return all;
    }

    /** Spread within repeated set points. */
    static Map<String, Object> repeats(CampaignResult result) {
        Grid grid = new Grid("plate", "set point", "runs", "#spread found, %", "#spread expected, %", "");
        for (RepeatSpread r : result.repeats()) {
            grid.row(
                    r.plate(),
                    r.set(),
                    String.join(", ", r.runs()),
                    Shown.fixed(100.0 * r.relativeSpread(), 2),
                    Shown.fixed(100.0 * r.expectedSpread(), 2),
                    r.relativeSpread() > 2.0 * r.expectedSpread() ? "more than twice what was expected" : "");
        }
        return grid.model();
    }

    /** Budgets of the slowest and the fastest run of each group. */
    static List<Map<String, Object>> budgets(List<RunGroup> groups) {
        List<Map<String, Object>> all = new ArrayList<>();
        for (RunGroup group : groups) {
            RunGroup.Point slow = group.runs().get(0);
            RunGroup.Point fast = group.runs().get(group.runs().size() - 1);
            all.add(budget(group, slow));
            if (!fast.id().equals(slow.id())) {
                all.add(budget(group, fast));
            }
        }
        return all;
    }

    private static Map<String, Object> budget(RunGroup group, RunGroup.Point point) {
        List<BudgetLine> lines = point.values().budgets().stream()
                .filter(line -> line.output().equals("Nu_L"))
                .toList();
        List<BudgetLine> shown = lines.subList(0, Math.min(BUDGET_LINES, lines.size()));
        List<Map<String, Object>> rows = new ArrayList<>();
        double rest = 100.0;
        for (BudgetLine line : shown) {
            rest -= line.sharePercent();
            rows.add(Map.of(
                    "input", line.input(),
                    "scope", line.scope(),
                    "u", Shown.digits(line.u(), 2),
                    "contribution",
                            Shown.signed(
                                    100.0
                                            * line.contribution()
                                            / point.values().nuL().value(),
                                    3),
                    "share", Shown.fixed(line.sharePercent(), 1),
                    "width", width(line.sharePercent())));
        }
        if (lines.size() > shown.size()) {
            rows.add(Map.of(
                    "input",
                    (lines.size() - shown.size()) + " more",
                    "scope",
                    "",
                    "u",
                    "",
                    "contribution",
                    "",
                    "share",
                    Shown.fixed(Math.max(0.0, rest), 1),
                    "width",
                    width(rest)));
        }
        Map<String, Object> model = new LinkedHashMap<>();
        model.put("run", point.id());
        model.put("group", group.label());
        model.put("speed", Shown.fixed(point.values().speed().value(), 1));
        model.put("nu", Shown.pm(point.values().nuL()));
        model.put(
                "relative",
                Shown.percent(point.values().nuL().u() / point.values().nuL().value(), 2));
        model.put("rows", rows);
        return model;
    }

    private static String width(double percent) {
        return String.format(Locale.ROOT, "%.1f", Math.min(100.0, Math.max(0.0, percent)));
    }
}
