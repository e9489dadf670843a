package plateledger.report;

import java.time.Instant;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import plateledger.finding.Finding;
import plateledger.reduce.BudgetLine;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.LedgerTerm;
import plateledger.reduce.RunResult;
import plateledger.reduce.StationResult;

/** The result tables, SI, in campaign order. Each measured column is followed by {@code u_…}, its standard uncertainty. */
public final class ResultTables {
    private ResultTables() {}

    /** {@code stations.csv}: a row per reduced run and station. */
    public static byte[] stations(CampaignResult result) {
        List<String> titles = new ArrayList<>(List.of("run", "station"));
        for (String measured : List.of(
                "x_m",
                "T_surface_K",
                "T_ref_K",
                "T_film_K",
                "q_electrical_W_per_m2",
                "q_radiation_W_per_m2",
                "q_back_W_per_m2",
                "q_conduction_W_per_m2",
                "q_conv_W_per_m2",
                "h_W_per_m2K",
                "h_equivalent_uniform_W_per_m2K",
                "Re_x",
                "Nu_x",
                "Pr",
                "Nu_x_theory")) {
            withUncertainty(titles, measured);
        }
        titles.add("En");
        Table table = new Table(titles);
        for (RunResult run : result.runs()) {
            run.values().ifPresent(values -> values.stations().forEach(s -> stationRow(table, run, s)));
        }
        return table.bytes();
    }

    private static void stationRow(Table table, RunResult run, StationResult s) {
        table.text(run.run().id())
                .text(s.channel())
                .estimate(s.x())
                .estimate(s.surface())
                .estimate(s.reference())
                .estimate(s.film())
                .estimate(s.qElectrical())
                .estimate(s.qRadiation())
                .estimate(s.qBack())
                .estimate(s.qConduction())
                .estimate(s.qConvection())
                .estimate(s.h())
                .estimate(s.hEquivalentUniform())
                .estimate(s.reX())
                .estimate(s.nuX())
                .estimate(s.pr())
                .estimate(s.nuXTheory())
                .number(s.en())
                .endRow();
    }

    /** {@code runs.csv}: a row per run, reduced or not. */
    public static byte[] runs(CampaignResult result) {
        List<String> titles = new ArrayList<>(
                List.of("run", "type", "plate", "regime", "set", "state", "reason", "window_start", "window_end"));
        int before = titles.size();
        for (String measured : List.of("U_m_per_s", "Re_L", "Nu_L", "Pr")) {
            withUncertainty(titles, measured);
        }
        for (LedgerTerm term : LedgerTerm.values()) {
            withUncertainty(titles, term.column());
        }
        Table table = new Table(titles);
        ZoneId zone = result.campaign().zone();
        for (RunResult run : result.runs()) {
            table.text(run.run().id())
                    .text(run.run().type().word())
                    .text(run.run().plate())
                    .text(run.run().regime().word())
                    .text(run.run().set())
                    .text(run.state().word())
                    .text(run.reason())
                    .text(run.window().map(w -> stamp(w.startS(), zone)).orElse(""))
                    .text(run.window().map(w -> stamp(w.endS(), zone)).orElse(""));
            if (run.values().isPresent()) {
                RunResult.Values v = run.values().get();
                table.estimate(v.speed()).estimate(v.reL()).estimate(v.nuL()).estimate(v.pr());
                for (LedgerTerm term : LedgerTerm.values()) {
                    table.estimate(v.ledger(term));
                }
            } else {
                table.empty(titles.size() - before);
            }
            table.endRow();
        }
        return table.bytes();
    }

    /** {@code budget.csv}: a row per run and input of its run average. */
    public static byte[] budget(CampaignResult result) {
        Table table = new Table(List.of(
                "run",
                "output",
                "input",
                "share_percent",
                "contribution",
                "u",
                "sensitivity",
                "distribution",
                "dof",
                "scope"));
        for (RunResult run : result.runs()) {
            if (run.values().isEmpty()) {
                continue;
            }
            for (BudgetLine line : run.values().get().budgets()) {
                table.text(run.run().id())
                        .text(line.output())
                        .text(line.input())
                        .number(line.sharePercent())
                        .number(line.contribution())
                        .number(line.u())
                        .number(line.sensitivity())
                        .text(line.distribution())
                        .number(line.dof())
                        .text(line.scope())
                        .endRow();
            }
        }
        return table.bytes();
    }

    /** {@code findings.csv}: gravest first. */
    public static byte[] findings(List<Finding> findings) {
        Table table = new Table(List.of("id", "level", "subject", "place", "found", "expected", "remedy", "source"));
        for (Finding finding : findings) {
            table.text(finding.id())
                    .text(finding.level().word())
                    .text(finding.subject())
                    .text(finding.place().toString())
                    .text(finding.found())
                    .text(finding.expected())
                    .text(finding.remedy())
                    .text(finding.source())
                    .endRow();
        }
        return table.bytes();
    }

    /**
     * A moment as ISO 8601 with the offset of the campaign's zone.
     *
     * @param epochS s since 1970-01-01T00:00Z
     * @param zone zone in which it is printed
     */
    static String stamp(double epochS, ZoneId zone) {
        Instant moment = Instant.ofEpochMilli(Math.round(epochS * 1000.0)).truncatedTo(ChronoUnit.MILLIS);
        return DateTimeFormatter.ISO_OFFSET_DATE_TIME
                .withLocale(Locale.ROOT)
                .format(moment.atZone(zone).toOffsetDateTime());
    }

    private static void withUncertainty(List<String> titles, String measured) {
        titles.add(measured);
        titles.add("u_" + measured);
    }
}
