package plateledger.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import plateledger.finding.RefusedException;
import plateledger.reduce.CancelledException;
import plateledger.reduce.CheckResult;
import plateledger.reduce.Reduction;

/** Reads and checks a campaign, reduces nothing, writes nothing. */
@Command(
        name = "check",
        mixinStandardHelpOptions = true,
        description = {
            "Reads and checks everything of a campaign, reduces and writes nothing.",
            "All findings are listed at once. Of many of one kind the first are shown; --all shows each."
        },
        footerHeading = "%nExamples:%n",
        footer = {
            "  plateledger check cabinet-door",
            "  plateledger check cabinet-door --all > findings.txt",
        })
final class CheckCommand implements Callable<Integer> {
    private final Terminal terminal;

    @Parameters(paramLabel = "CAMPAIGN", description = "campaign folder, the one that holds campaign.toml")
    private Path campaign = Path.of("");

    @Option(names = "--all", description = "show every finding, also where many are of one kind")
    private boolean all;

    CheckCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws CancelledException {
        ProgressLine progress = new ProgressLine(terminal, false);
        try {
            CheckResult result = Reduction.check(campaign, progress);
            progress.end();
            FindingList list = all ? FindingList.full() : FindingList.folded("--all shows each");
            list.print(terminal.out(), result.findings());
            terminal.out()
                    .println("Checked " + result.campaign().runs().size() + " runs, "
                            + result.logs().size() + " logs: " + FindingList.counts(result.findings()) + ".");
            terminal.out().flush();
            return FindingList.anyStop(result.findings()) ? ExitStatus.DONE_WITH_STOPS : ExitStatus.DONE;
        } catch (RefusedException e) {
            progress.end();
            FindingList.full().print(terminal.err(), e.findings());
            terminal.err().println("The campaign cannot be used as it is: " + FindingList.counts(e.findings()) + ".");
            return ExitStatus.NOTHING_WRITTEN;
        }
    }
}
