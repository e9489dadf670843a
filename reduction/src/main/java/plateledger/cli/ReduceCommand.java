package plateledger.cli;

import java.nio.file.Path;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import plateledger.audit.AuditRecord;
import plateledger.campaign.RunType;
import plateledger.finding.Finding;
import plateledger.finding.RefusedException;
import plateledger.log.LogData;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.CancelledException;
import plateledger.reduce.Reduction;
import plateledger.reduce.ReductionOptions;
import plateledger.reduce.RunResult;
import plateledger.reduce.RunState;
import plateledger.report.FitSentence;
import plateledger.report.OutputFolder;
import plateledger.report.ResultFile;
import plateledger.report.ResultFiles;

/** Reduces a campaign and writes tables, figures and report. */
@Command(
        name = "reduce",
        mixinStandardHelpOptions = true,
        description = {
            "Reduces a campaign from raw logs to h, Nu, Re, Pr, fitted constants and a report.",
            "From raw logs to booked heat, h, Nu, Re and Pr with uncertainty. The output folder is replaced whole or left as it was."
        },
        footerHeading = "%nExamples:%n",
        footer = {
            "  plateledger reduce cabinet-door                       writes into cabinet-door/out",
            "  plateledger reduce cabinet-door --out first-try --runs P01,P02",
        })
final class ReduceCommand implements Callable<Integer> {
    private static final List<String> KEY_FILES = List.of("campaign.toml", "rig.toml", "instruments.toml");

    private final Terminal terminal;
    private final OutputFolder.Writing writing;
    private final Clock clock;

    @Parameters(paramLabel = "CAMPAIGN", description = "campaign folder, the one that holds campaign.toml")
    private Path campaign = Path.of("");

    @Option(
            names = "--out",
            paramLabel = "DIR",
            description = "where results go; out in the campaign folder if not given")
    private Optional<Path> out = Optional.empty();

    @Option(
            names = "--runs",
            split = ",",
            paramLabel = "RUN",
            description = "heated runs to reduce, with commas between; all if not given. Zeros and loss runs are always"
                    + " used")
    private List<String> runs = new ArrayList<>();

    @Option(names = "--quiet", description = "no progress and no summary; of the findings only those at stop")
    private boolean quiet;

    ReduceCommand(Terminal terminal, OutputFolder.Writing writing, Clock clock) {
        this.terminal = terminal;
        this.writing = writing;
        this.clock = clock;
    }

    @Override
    public Integer call() throws CancelledException {
        ProgressLine progress = new ProgressLine(terminal, quiet);
        try {
            Instant start = clock.instant();
            Set<String> only = new TreeSet<>(runs);
            CampaignResult result =
                    Reduction.run(campaign, ReductionOptions.all().only(only), progress);
            progress.step("writing", 1.0);
            AuditRecord audit = AuditRecord.of(
                    campaign, filesRead(result), Map.of("runs", only.isEmpty() ? "all" : String.join(",", only)));
            Instant end = clock.instant();
            List<ResultFile> files =
                    ResultFiles.of(result, audit, new ResultFiles.Written(end, Duration.between(start, end), campaign));
            OutputFolder folder = OutputFolder.prepare(out.orElseGet(() -> campaign.resolve("out")), writing);
            folder.replace(files);
            progress.end();
            tell(result, folder, files.size());
            return clean(result) ? ExitStatus.DONE : ExitStatus.DONE_WITH_STOPS;
        } catch (RefusedException e) {
            progress.end();
            FindingList.full().print(terminal.err(), e.findings());
            terminal.err().println("Nothing was written; earlier results are as they were.");
            return ExitStatus.NOTHING_WRITTEN;
        }
    }

    private static List<String> filesRead(CampaignResult result) {
        return Stream.concat(KEY_FILES.stream(), result.logs().stream().map(LogData::file))
                .distinct()
                .sorted()
                .toList();
    }

    private void tell(CampaignResult result, OutputFolder folder, int files) {
        List<Finding> findings = result.findings();
        FindingList list = FindingList.folded("all in findings.csv");
        if (quiet) {
            if (FindingList.anyStop(findings)) {
                list.print(terminal.err(), FindingList.stops(findings));
            }
            return;
        }
        list.print(terminal.err(), findings);
        long asked = heated(result).filter(r -> r.state() != RunState.WAITING).count();
        long reduced = heated(result).filter(r -> r.state() == RunState.REDUCED).count();
        terminal.out().println("Reduced " + reduced + " of " + asked + " heated runs.");
        result.fits().forEach(fit -> terminal.out().println(FitSentence.of(fit)));
        terminal.out().println("Findings: " + FindingList.counts(findings) + ".");
        terminal.out().println("Wrote " + files + " files to " + folder.path() + ".");
        terminal.out().flush();
    }

    private static Stream<RunResult> heated(CampaignResult result) {
        return result.runs().stream().filter(r -> r.run().type() == RunType.HEATED);
    }

    /** True if nothing is at stop and every run that was to be reduced was. */
    private static boolean clean(CampaignResult result) {
        return !FindingList.anyStop(result.findings())
                && result.runs().stream()
                        .noneMatch(r -> r.state() == RunState.NOT_STEADY || r.state() == RunState.REFUSED);
    }
}
