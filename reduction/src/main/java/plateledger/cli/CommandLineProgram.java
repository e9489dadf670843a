package plateledger.cli;

import java.io.Console;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.time.Clock;
import picocli.AutoComplete;
import picocli.CommandLine;
import picocli.CommandLine.Help.Ansi;
import plateledger.audit.Program;
import plateledger.report.OutputFolder;

/** The program as called from a command line. */
public final class CommandLineProgram {
    private CommandLineProgram() {}

    /**
     * Runs the program on the process's own streams.
     *
     * @param args arguments
     * @return exit status, see {@link ExitStatus}
     */
    public static int run(String... args) {
        PrintWriter out = writer(FileDescriptor.out);
        PrintWriter err = writer(FileDescriptor.err);
        int status = run(new Terminal(out, err, personWatches()), args);
        out.flush();
        err.flush();
        return status;
    }

    /**
     * Runs the program.
     *
     * @param terminal where it speaks
     * @param args arguments
     * @return exit status, see {@link ExitStatus}
     */
    public static int run(Terminal terminal, String... args) {
        return run(terminal, OutputFolder.TO_DISK, args);
    }

    /**
     * Runs the program with another way to write result files, so that a full disk can be tried out.
     *
     * @param terminal where it speaks
     * @param writing how each result file is written
     * @param args arguments
     * @return exit status, see {@link ExitStatus}
     */
    public static int run(Terminal terminal, OutputFolder.Writing writing, String... args) {
        CommandLine line = commandLine(terminal, writing);
        if (args.length == 0) {
            line.usage(terminal.out());
            terminal.out().flush();
            return ExitStatus.DONE;
        }
        try {
            return line.execute(args);
        } catch (Error fault) { // exceptions are told by the handler below
            return tell(terminal, fault);
        }
    }

    private static int tell(Terminal terminal, Throwable fault) {
        terminal.err().print("Fault in the program: ");
        fault.printStackTrace(terminal.err());
        terminal.err().println("Please report this with the lines above. Results are written whole or not at all.");
        return ExitStatus.FAULT;
    }

    /** The commands with their options; for help and completion too. */
    static CommandLine commandLine(Terminal terminal) {
        return commandLine(terminal, OutputFolder.TO_DISK);
    }

    private static CommandLine commandLine(Terminal terminal, OutputFolder.Writing writing) {
        CommandLine line = new CommandLine(new RootCommand());
        line.addSubcommand(new ReduceCommand(terminal, writing, Clock.systemUTC()));
        line.addSubcommand(new CheckCommand(terminal));
        line.addSubcommand(new NewCommand(terminal));
        line.addSubcommand(new PropertiesCommand(terminal));
        line.addSubcommand("completion", new AutoComplete.GenerateCompletion());
        line.setOut(terminal.out());
        line.setErr(terminal.err());
        line.setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF));
        line.setUsageHelpWidth(100);
        line.setCaseInsensitiveEnumValuesAllowed(true);
        line.getCommandSpec().version("plateledger " + Program.versionOnly());
        line.getCommandSpec().exitCodeOnInvalidInput(ExitStatus.NOTHING_WRITTEN);
        line.setExecutionExceptionHandler((fault, command, parsed) -> tell(terminal, fault));
        for (CommandLine sub : line.getSubcommands().values()) {
            sub.getCommandSpec().exitCodeOnExecutionException(ExitStatus.FAULT);
        }
        return line;
    }

    /** True if input and output are a terminal; on Java 22 and later a console exists without one and must be asked. */
    @SuppressWarnings("SystemConsoleNull") // asked below
    private static boolean personWatches() {
        Console console = System.console();
        if (console == null) {
            return false;
        }
        try {
            return Boolean.TRUE.equals(Console.class.getMethod("isTerminal").invoke(console));
        } catch (NoSuchMethodException before22) {
            return true;
        } catch (ReflectiveOperationException e) {
            return false;
        }
    }

    private static PrintWriter writer(FileDescriptor descriptor) {
        return new PrintWriter(new FileOutputStream(descriptor), true, StandardCharsets.UTF_8);
    }
}
