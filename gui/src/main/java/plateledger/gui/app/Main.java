package plateledger.gui.app;

import plateledger.cli.CommandLineProgram;

/** Start of the program: with arguments the command line, without any the desktop window. */
public final class Main {
    private Main() {}

    /**
     * Starts.
     *
     * @param args arguments of the command line; none for the window
     */
    public static void main(String[] args) {
        if (args.length > 0) {
            // Before any AWT class loads: figures are drawn without a display, and none must be asked for.
            System.setProperty("java.awt.headless", "true");
            System.exit(CommandLineProgram.run(args));
        }
        System.exit(CommandLineProgram.run());
    }
}
