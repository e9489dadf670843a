package plateledger.reduce;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import plateledger.campaign.Campaign;
import plateledger.campaign.CampaignReader;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.finding.RefusedException;
import plateledger.log.LogData;
import plateledger.log.Series;
import plateledger.safety.SafetyChecks;

/** The pipeline: campaign folder to results. Reads files, writes none. */
public final class Reduction {
    private static final String NOT_USED = "a cool-down is kept and checked, not used";

    private Reduction() {}

    /** Files of a campaign that a reduction reads, relative to its folder with '/' separators, sorted. */
    public static List<String> inputFiles(Campaign campaign) {
        return Stream.concat(
                        Stream.of("campaign.toml", "rig.toml", "instruments.toml"),
                        campaign.runs().stream().flatMap(run -> run.logs().values().stream()))
                .distinct()
                .sorted()
                .toList();
    }

    /**
     * Reads and checks everything, reduces nothing.
     *
     * @param folder campaign folder
     * @param progress told how far the work is
     * @throws RefusedException if the input cannot be used; carries all findings
     * @throws CancelledException if stopped on request
     */
    public static CheckResult check(Path folder, Progress progress) throws RefusedException, CancelledException {
        Read read = read(folder, ReductionOptions.all(), progress);
        List<Finding> findings = new ArrayList<>(read.findings);
        WindowStage stage = new WindowStage(read.campaign);
        List<RunResult> states = new ArrayList<>();
        for (Run run : read.campaign.runs()) {
            RunLogs logs = read.logs.get(run.id());
            if (logs != null && used(run)) {
                WindowStage.Outcome outcome = stage.find(logs);
                findings.addAll(outcome.findings());
                states.add(new RunResult(
                        run,
                        outcome.means().isPresent() ? RunState.WAITING : RunState.NOT_STEADY,
                        outcome.reason(),
                        outcome.window(),
                        Optional.empty()));
            } else {
                states.add(idle(run, ReductionOptions.all()));
            }
        }
        findings.addAll(ResultFindings.notReduced(states));
        return new CheckResult(read.campaign, read.files(), findings);
    }

    /**
     * Reduces a campaign.
     *
     * @param folder campaign folder
     * @param options choices of this call
     * @param progress told how far the work is
     * @throws RefusedException if the input cannot be used; carries all findings
     * @throws CancelledException if stopped on request
     */
    public static CampaignResult run(Path folder, ReductionOptions options, Progress progress)
            throws RefusedException, CancelledException {
        Read read = read(folder, options, progress);
        Campaign campaign = read.campaign;
        List<Finding> findings = new ArrayList<>(read.findings);
        WindowStage stage = new WindowStage(campaign);
        Map<String, WindowStage.Outcome> outcomes = new LinkedHashMap<>();
        List<RunMeans> means = new ArrayList<>();
        for (RunLogs logs : read.logs.values()) {
            if (progress.cancelled()) {
                throw new CancelledException();
            }
            if (used(logs.run())) {
                WindowStage.Outcome outcome = stage.find(logs);
                outcomes.put(logs.run().id(), outcome);
                findings.addAll(outcome.findings());
                outcome.means().ifPresent(means::add);
                progress.step("finding steady windows", (double) outcomes.size() / read.logs.size());
            }
        }
        MeansReduction reduced = MeansReduction.of(campaign, means, options.threads(), progress);
        List<RunResult> runs = campaign.runs().stream()
                .map(run -> result(run, options, Optional.ofNullable(outcomes.get(run.id())), reduced))
                .toList();
        findings.addAll(reduced.findings());
        findings.addAll(ResultFindings.of(campaign, means, reduced));
        findings.addAll(ResultFindings.notReduced(runs));
        return new CampaignResult(
                campaign, read.files(), runs, reduced.losses(), reduced.fits(), reduced.repeats(), findings);
    }

    private static RunResult result(
            Run run, ReductionOptions options, Optional<WindowStage.Outcome> read, MeansReduction reduced) {
        if (read.isEmpty()) {
            return idle(run, options);
        }
        WindowStage.Outcome outcome = read.get();
        if (outcome.means().isEmpty()) {
            return new RunResult(run, RunState.NOT_STEADY, outcome.reason(), outcome.window(), Optional.empty());
        }
        String refused = reduced.refused().get(run.id());
        if (refused != null) {
            return new RunResult(run, RunState.REFUSED, refused, outcome.window(), Optional.empty());
        }
        return new RunResult(
                run,
                RunState.REDUCED,
                "",
                outcome.window(),
                Optional.ofNullable(reduced.values().get(run.id())));
    }

    /** False for a run that is never steady and feeds no result: its logs are checked and that is all. */
    private static boolean used(Run run) {
        return run.type() != RunType.COOL_DOWN;
    }

    /** A run that is not reduced: planned, left out, not used, or not asked for. */
    static RunResult idle(Run run, ReductionOptions options) {
        if (run.leftOut().isPresent()) {
            return new RunResult(run, RunState.LEFT_OUT, run.leftOut().get(), Optional.empty(), Optional.empty());
        }
        if (!used(run) && !run.planned()) {
            return new RunResult(run, RunState.LEFT_OUT, NOT_USED, Optional.empty(), Optional.empty());
        }
        RunState state = run.planned() || asked(run, options) ? RunState.PLANNED : RunState.WAITING;
        return new RunResult(run, state, "", Optional.empty(), Optional.empty());
    }

    private static boolean asked(Run run, ReductionOptions options) {
        return options.runs().isEmpty()
                || run.type() != RunType.HEATED
                || options.runs().contains(run.id());
    }

    private record Read(Campaign campaign, Map<String, RunLogs> logs, List<Finding> findings) {
        List<LogData> files() {
            return logs.values().stream().flatMap(l -> l.logs().stream()).toList();
        }
    }

    private static Read read(Path folder, ReductionOptions options, Progress progress)
            throws RefusedException, CancelledException {
        CampaignReader.Outcome outcome = CampaignReader.read(folder);
        Campaign campaign = outcome.campaign();
        refuseUnknownRuns(campaign, options);
        List<Run> wanted = campaign.runs().stream()
                .filter(run -> !run.planned() && run.leftOut().isEmpty() && asked(run, options))
                .toList();
        Map<String, RunLogs> logs = LogStage.read(folder, campaign, wanted, options.threads(), progress);
        List<Finding> findings = new ArrayList<>(outcome.notes());
        logs.values().forEach(l -> findings.addAll(l.findings()));
        Map<String, List<Series>> series = new LinkedHashMap<>();
        logs.forEach((id, l) -> series.put(id, List.copyOf(l.series().values())));
        findings.addAll(SafetyChecks.findings(campaign, series));
        return new Read(campaign, logs, findings);
    }

    private static void refuseUnknownRuns(Campaign campaign, ReductionOptions options) throws RefusedException {
        List<String> heated = campaign.runs().stream()
                .filter(run -> run.type() == RunType.HEATED)
                .map(Run::id)
                .toList();
        List<Finding> unknown = options.runs().stream()
                .sorted()
                .filter(id -> !heated.contains(id))
                .map(id -> new Finding(
                        "RUN-UNKNOWN",
                        Level.STOP,
                        Place.of(CampaignReader.FILE),
                        "runs to reduce",
                        campaign.run(id).isPresent() ? id + ", which is no heated run" : id + ", which is not declared",
                        "heated runs: " + String.join(", ", heated),
                        "Name heated runs only; zeros and loss runs are always used.",
                        ""))
                .toList();
        if (!unknown.isEmpty()) {
            throw new RefusedException(unknown);
        }
    }
}
