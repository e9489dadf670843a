package plateledger.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import plateledger.quantity.Estimate;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.LedgerTerm;
import plateledger.reduce.RunResult;

/** Where the watts of each run went: two stacked bars (all of them; all but convection, enlarged) and the numbers. */
final class LedgerSection {
    /** Terms that a bar is made of, in the order they are stacked. */
    private static final List<LedgerTerm> STACKED = List.of(
            LedgerTerm.CONVECTION,
            LedgerTerm.RADIATION,
            LedgerTerm.BACK,
            LedgerTerm.EDGE,
            LedgerTerm.NOSE,
            LedgerTerm.TAIL,
            LedgerTerm.GUARD,
            LedgerTerm.LEAD,
            LedgerTerm.STORAGE,
            LedgerTerm.RESIDUAL);

    private static final double BAR_UNITS = 1000.0; // width of a bar's view box

    private final List<RunResult> runs;
    private final List<LedgerTerm> booked;

    LedgerSection(CampaignResult result) {
        runs = result.runs().stream().filter(r -> r.values().isPresent()).toList();
        booked = STACKED.stream()
                .filter(term -> runs.stream()
                        .anyMatch(r ->
                                entry(r, term).value() != 0.0 || entry(r, term).u() != 0.0))
                .toList();
    }

    Map<String, Object> model() {
        double most = 0.0;
        double mostLost = 0.0;
        for (RunResult run : runs) {
            most = Math.max(most, span(run, booked));
            mostLost = Math.max(mostLost, span(run, losses()));
        }
        List<Map<String, Object>> bars = new ArrayList<>();
        for (RunResult run : runs) {
            Map<String, Object> bar = new LinkedHashMap<>();
            bar.put("run", run.run().id());
            bar.put("speed", Shown.fixed(run.values().orElseThrow().speed().value(), 1));
            bar.put("power", Shown.fixed(entry(run, LedgerTerm.ELECTRICAL).value(), 1));
            bar.put("all", segments(run, booked, most));
            bar.put("losses", segments(run, losses(), mostLost));
            bars.add(bar);
        }
        List<Map<String, Object>> legend = booked.stream()
                .map(term -> Map.<String, Object>of("label", term.label(), "colour", Palette.hex(Palette.of(term))))
                .toList();
        return Map.of(
                "bars",
                bars,
                "legend",
                legend,
                "mostW",
                Shown.digits(most, 3),
                "mostLostW",
                Shown.digits(mostLost, 3),
                "table",
                table());
    }

    private List<LedgerTerm> losses() {
        return booked.stream().filter(t -> t != LedgerTerm.CONVECTION).toList();
    }

    private static double span(RunResult run, List<LedgerTerm> terms) {
        return terms.stream()
                .mapToDouble(t -> Math.max(0.0, entry(run, t).value()))
                .sum();
    }

    private static List<Map<String, Object>> segments(RunResult run, List<LedgerTerm> terms, double full) {
        List<Map<String, Object>> segments = new ArrayList<>();
        double at = 0.0;
        for (LedgerTerm term : terms) {
            double watts = entry(run, term).value();
            if (!(watts > 0.0) || !(full > 0.0)) {
                continue; // what comes in instead of leaving stands in the table with its sign
            }
            double width = BAR_UNITS * watts / full;
            segments.add(Map.of(
                    "x",
                    String.format(Locale.ROOT, "%.1f", at),
                    "width",
                    String.format(Locale.ROOT, "%.1f", width),
                    "colour",
                    Palette.hex(Palette.of(term)),
                    "title",
                    term.label() + " " + Shown.pm(entry(run, term)) + " W"));
            at += width;
        }
        return segments;
    }

    private Map<String, Object> table() {
        List<String> titles = new ArrayList<>(List.of("run", "#" + LedgerTerm.ELECTRICAL.label()));
        booked.forEach(term -> titles.add("#" + term.label()));
        Grid grid = new Grid(titles);
        for (RunResult run : runs) {
            List<String> cells = new ArrayList<>(List.of(run.run().id(), Shown.pm(entry(run, LedgerTerm.ELECTRICAL))));
            booked.forEach(term -> cells.add(Shown.pm(entry(run, term))));
            grid.row(cells);
        }
        return grid.model();
    }

    private static Estimate entry(RunResult run, LedgerTerm term) {
        return run.values().map(v -> v.ledger(term)).orElse(Estimate.of(0.0, 0.0));
    }
}
