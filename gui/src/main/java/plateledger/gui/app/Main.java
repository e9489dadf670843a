package plateledger.gui.app;

import java.awt.AWTError;
import java.awt.GraphicsEnvironment;
import java.util.Optional;
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
        if (!hasDisplay()) {
            System.exit(CommandLineProgram.run());
        }
        DesktopProgram.open(Optional.empty());
    }

    /** True if a window can be opened; a display that is named but does not answer counts as none. */
    private static boolean hasDisplay() {
        try {
            return !GraphicsEnvironment.isHeadless()
                    && GraphicsEnvironment.getLocalGraphicsEnvironment().getScreenDevices().length > 0;
        } catch (AWTError | java.awt.HeadlessException | NoClassDefFoundError e) {
            return false; // no display answers, or the platform came without its windowing part
        }
    }
}
