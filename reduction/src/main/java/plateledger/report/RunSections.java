package plateledger.report;

import java.time.ZoneId;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import plateledger.campaign.Campaign;
import plateledger.campaign.Logger;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.log.LogData;
import plateledger.log.Series;
import plateledger.quantity.Estimate;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.RunResult;
import plateledger.reduce.RunState;
import plateledger.reduce.StationResult;
import plateledger.steady.ChannelMean;
import plateledger.steady.Evidence;
import plateledger.steady.SteadyWindow;

/** What was run: test matrix, run averages, stations, windows, clocks, exclusions. */
final class RunSections {
    private RunSections() {}

    /** Every run as declared, and what became of it. */
    static Map<String, Object> matrix(CampaignResult result) {
        Grid grid = new Grid(
                "run",
                "type",
                "day",
                "plate",
                "regime",
                "#speed set, m/s",
                "#power set, W",
                "set point",
                "trip",
                "state");
        for (RunResult r : result.runs()) {
            Run run = r.run();
            boolean heated = run.type() == RunType.HEATED;
            grid.row(
                    run.id(),
                    run.type().word(),
                    run.day(),
                    run.plate(),
                    heated ? run.regime().word() : "",
                    Double.isFinite(run.speedSetMPerS()) ? Shown.digits(run.speedSetMPerS(), 3) : "",
                    Double.isFinite(run.powerSetW()) ? Shown.digits(run.powerSetW(), 3) : "",
                    heated ? run.set() : "",
                    run.trip()
                            .map(t -> Shown.digits(1000 * t.wireM(), 3) + " mm wire at "
                                    + Shown.digits(1000 * t.xM(), 3) + " mm")
                            .orElse(""),
                    r.state().word());
        }
        return grid.model();
    }

    /** Run averages. */
    static Map<String, Object> averages(CampaignResult result) {
        Grid grid = new Grid(
                "run",
                "plate",
                "#U, m/s",
                "#T∞, °C",
                "#mean Tₛ, °C",
                "#Re",
                "#Nu",
                "#Pr",
                "#h, W/(m² K)",
                "#Nu of the length average of h",
                "#misfit, K",
                "#χ² / dof");
        for (RunResult run : result.runs()) {
            run.values()
                    .ifPresent(v -> grid.row(
                            run.run().id(),
                            run.run().plate(),
                            Shown.pm(v.speed()),
                            Shown.celsius(v.airTemperature()),
                            Shown.celsius(v.meanSurface()),
                            Shown.pm(v.reL()),
                            Shown.pm(v.nuL()),
                            Shown.pm(v.pr()),
                            Shown.pm(v.h()),
                            Shown.pm(v.nuLMeanH()),
                            Shown.digits(v.misfit(), 2),
                            Shown.digits(v.misfitChiSquare() / v.misfitDof(), 2)));
        }
        return grid.model();
    }

    /** Stations of every reduced run. */
    static Map<String, Object> stations(CampaignResult result) {
        Grid grid = new Grid(
                "run",
                "station",
                "#x, mm",
                "#Tₛ, °C",
                "#Tₛ − T ref, K",
                "#q electrical, W/m²",
                "#q radiation",
                "#q back",
                "#q conduction",
                "#q convection",
                "#q convection, plain local balance",
                "#h, W/(m² K)",
                "#Re_x",
                "#Nu_x",
                "#Nu_x, theory",
                "#Eₙ");
        for (RunResult run : result.runs()) {
            run.values()
                    .ifPresent(v ->
                            v.stations().forEach(s -> grid.row(station(run.run().id(), s))));
        }
        return grid.model();
    }

    private static List<String> station(String run, StationResult s) {
        return List.of(
                run,
                s.channel(),
                Shown.pm(Shown.times(s.x(), 1000.0)),
                Shown.celsius(s.surface()),
                Shown.value(Estimate.of(
                        s.surface().value() - s.reference().value(), s.surface().u())),
                Shown.pm(s.qElectrical()),
                Shown.pm(s.qRadiation()),
                Shown.pm(s.qBack()),
                Shown.pm(s.qConduction()),
                Shown.pm(s.qConvection()),
                Shown.pm(s.qConvectionLocal()),
                Shown.pm(s.h()),
                Shown.pm(s.reX()),
                Shown.pm(s.nuX()),
                Shown.pm(s.nuXTheory()),
                Shown.signed(s.en(), 2));
    }

    /** Steady windows: when, how found, the evidence nearest to its limit, the log lines used. */
    static Map<String, Object> windows(CampaignResult result) {
        ZoneId zone = result.campaign().zone();
        Grid grid = new Grid(
                "run", "from", "to", "#min", "chosen by", "tests passed", "nearest to its limit", "log lines used");
        for (RunResult run : result.runs()) {
            run.window()
                    .ifPresent(w -> grid.row(
                            run.run().id(),
                            Shown.minute(w.startS(), zone),
                            Shown.clock(w.endS(), zone),
                            Shown.fixed((w.endS() - w.startS()) / 60.0, 1),
                            w.declared() ? "a person: " + w.reason() : "the evidence",
                            w.evidence().stream().filter(Evidence::passed).count() + " of "
                                    + w.evidence().size(),
                            nearest(w),
                            lines(w)));
        }
        return grid.model();
    }

    private static String nearest(SteadyWindow window) {
        return window.evidence().stream()
                .filter(e -> e.limit() != 0.0 && Double.isFinite(e.value()))
                .max(Comparator.comparingDouble(e -> Math.abs(e.value() / e.limit())))
                .map(e -> e.test() + ", " + e.subject() + ": " + Shown.digits(e.value(), 2) + " of "
                        + Shown.digits(e.limit(), 2) + (e.unit().equals("1") ? "" : " " + e.unit()))
                .orElse(Shown.NONE);
    }

    private static String lines(SteadyWindow window) {
        Map<String, int[]> byFile = new TreeMap<>();
        for (ChannelMean mean : window.means().values()) {
            int[] range = byFile.computeIfAbsent(mean.file(), f -> new int[] {mean.firstLine(), mean.lastLine()});
            range[0] = Math.min(range[0], mean.firstLine());
            range[1] = Math.max(range[1], mean.lastLine());
        }
        return byFile.entrySet().stream()
                .map(e -> e.getKey() + ":" + e.getValue()[0] + "–" + e.getValue()[1])
                .collect(Collectors.joining(", "));
    }

    /** Clocks of the loggers. */
    static Map<String, Object> clocks(Campaign campaign) {
        Grid grid = new Grid("logger", "zone of its stamps", "#clock − true time, s", "#rate error", "");
        for (Logger logger : campaign.loggers()) {
            grid.row(
                    logger.id(),
                    logger.zone().getId(),
                    Shown.pm(logger.clockOffsetS().estimate()),
                    Shown.pm(logger.clockRate().estimate()),
                    logger.clockDeclared() ? "declared" : "assumed, not declared");
        }
        return grid.model();
    }

    /** Runs not reduced or not used, windows chosen by a person. */
    static List<String> deviations(CampaignResult result) {
        List<String> lines = new ArrayList<>();
        for (RunResult run : result.runs()) {
            if (run.state() != RunState.REDUCED) {
                lines.add(run.run().id() + ": " + run.state().word()
                        + (run.reason().isEmpty() ? "" : ", " + run.reason()));
            }
            run.window()
                    .filter(SteadyWindow::declared)
                    .ifPresent(w -> lines.add(run.run().id() + ": window chosen by a person, " + w.reason()));
        }
        return lines;
    }

    /** Samples that were not used, by log, channel and reason. */
    static Map<String, Object> notUsed(CampaignResult result) {
        Grid grid = new Grid("log", "channel", "#samples", "#not used", "why");
        for (LogData log : result.logs()) {
            for (Series series : log.series()) {
                Map<String, Integer> counts = new LinkedHashMap<>();
                for (Series.Flag flag : Series.Flag.values()) {
                    int n = flag == Series.Flag.VALID ? 0 : series.count(flag);
                    if (n > 0) {
                        counts.put(flag.word(), n);
                    }
                }
                if (!counts.isEmpty()) {
                    grid.row(
                            log.file(),
                            series.channel(),
                            String.valueOf(series.size()),
                            String.valueOf(counts.values().stream()
                                    .mapToInt(Integer::intValue)
                                    .sum()),
                            counts.entrySet().stream()
                                    .map(e -> e.getValue() + " " + e.getKey())
                                    .collect(Collectors.joining(", ")));
                }
            }
        }
        return grid.model();
    }
}
