package plateledger.gui.app;

import java.lang.System.Logger;
import java.lang.System.Logger.Level;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import javax.swing.SwingUtilities;
import plateledger.gui.task.ReduceCall;

/** Starts the desktop program. */
public final class DesktopProgram {
    private static final Logger LOG = System.getLogger(DesktopProgram.class.getName());

    private DesktopProgram() {}

    static void open(Optional<Path> campaign, UserSettings settings, ReduceCall call) {
        Appearance.registerLetters().forEach(problem -> LOG.log(Level.WARNING, problem));
        SwingUtilities.invokeLater(() -> {
            MainWindow window = new MainWindow(settings, call);
            Thread.setDefaultUncaughtExceptionHandler((thread, fault) -> {
                LOG.log(Level.ERROR, "fault in " + thread.getName(), fault);
                SwingUtilities.invokeLater(() -> window.problem("A fault in the program: " + fault));
            });
            window.show();
            campaign.ifPresent(window::open);
        });
    }

    static UserSettings settings(Map<String, String> environment) {
        return new UserSettings(UserSettings.fileFor(
                System.getProperty("os.name", ""), System.getProperty("user.home", "."), environment));
    }
}
