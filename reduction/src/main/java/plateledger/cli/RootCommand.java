package plateledger.cli;

import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The program without a command. */
@Command(
        name = "plateledger",
        mixinStandardHelpOptions = true,
        synopsisSubcommandLabel = "COMMAND",
        description = {
            "Reduces heated-plate experiments: every watt that enters the plate is booked to where it",
            "left, and what remains is convection: h, Nu, Re and Pr with their uncertainty."
        },
        footerHeading = "%nExample:%n",
        footer = {
            "  plateledger check cabinet-door       reads and checks everything, reduces nothing",
            "  plateledger reduce cabinet-door      writes tables, figures and report into cabinet-door/out",
            "",
            "Without any argument the desktop window opens.",
            "",
            "Exit status: 0 done; 1 done, with a finding at stop or a run not reduced; 2 nothing written;",
            "3 a fault in the program."
        })
final class RootCommand implements Runnable {
    @Spec
    @SuppressWarnings("NullAway.Init") // set by the command line parser before anything runs
    private CommandSpec spec;

    @Override
    public void run() {
        throw new ParameterException(
                spec.commandLine(),
                "Missing command: one of "
                        + String.join(", ", spec.subcommands().keySet()) + ".");
    }
}
