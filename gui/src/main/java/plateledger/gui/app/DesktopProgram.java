package plateledger.gui.app;

import java.lang.System.Logger;
import java.lang.System.Logger.Level;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import javax.swing.SwingUtilities;
import plateledger.finding.RefusedException;
import plateledger.gui.task.ReduceCall;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.CancelledException;
import plateledger.reduce.Progress;
import plateledger.reduce.Reduction;
import plateledger.reduce.ReductionOptions;

/** Starts the desktop program. */
public final class DesktopProgram {
    private static final Logger LOG = System.getLogger(DesktopProgram.class.getName());

    private DesktopProgram() {}

    /**
     * Opens the window.
     *
     * @param campaign campaign folder to reduce and show; empty to ask for one in the window
     */
    public static void open(Optional<Path> campaign) {
        open(campaign, settings(System.getenv()), DesktopProgram::reduce);
    }

    /** The reduction itself; stopping on request is the one end that the runner knows under another name. */
    static CampaignResult reduce(Path folder, Progress progress) throws RefusedException {
        try {
            return Reduction.run(folder, ReductionOptions.all(), progress);
        } catch (CancelledException stopped) {
            CancellationException told = new CancellationException(stopped.getMessage());
            told.initCause(stopped);
            throw told;
        }
    }

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
