package plateledger.gui.app;

import java.awt.Dimension;
import java.awt.GraphicsConfiguration;
import java.awt.Insets;
import java.awt.Rectangle;
import java.awt.Toolkit;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javax.swing.JFileChooser;
import javax.swing.JFrame;
import javax.swing.JOptionPane;
import javax.swing.WindowConstants;
import plateledger.gui.chart.ChartPane;
import plateledger.gui.model.FindingScope;
import plateledger.gui.model.Headline;
import plateledger.gui.model.Notice;
import plateledger.gui.model.WindowModel;
import plateledger.gui.model.WindowState;
import plateledger.gui.task.BackgroundRunner;
import plateledger.gui.task.ReduceCall;
import plateledger.gui.view.Gestures;
import plateledger.gui.view.MainPanel;

/** The window: model, views, menus and the background runner wired together. To be used on the event thread. */
final class MainWindow implements Gestures, Menus.Actions {
    private static final int ICON = 96;
    private static final Dimension WANTED = new Dimension(1440, 900);

    private final WindowModel model = new WindowModel();
    private final JFrame frame = new JFrame("plateledger");
    private final UserSettings settings;
    private final BackgroundRunner runner;
    private final MainPanel page;
    private final Menus menus;

    MainWindow(UserSettings settings, ReduceCall call) {
        this.settings = settings;
        Appearance appearance = settings.appearance();
        appearance.apply();
        runner = new BackgroundRunner(model, call);
        page = new MainPanel(this, appearance.chartLook(), AppIcon.icon(ICON), settings.lastCampaign());
        menus = new Menus(this, appearance, this::appearance);
        frame.setName("plateledger");
        frame.setIconImages(AppIcon.images());
        frame.setJMenuBar(menus.bar());
        frame.setContentPane(page.component());
        frame.setDefaultCloseOperation(WindowConstants.DISPOSE_ON_CLOSE);
        new FolderDrop(this::open, this::problem).on(frame);
        model.observe(this::render);
    }

    JFrame frame() {
        return frame;
    }

    WindowModel model() {
        return model;
    }

    ChartPane nuReChart() {
        return page.nuReChart();
    }

    /** Shows the window, as large as wanted or as the screen allows. */
    void show() {
        GraphicsConfiguration screen = frame.getGraphicsConfiguration();
        Rectangle bounds = screen.getBounds();
        Insets taken = Toolkit.getDefaultToolkit().getScreenInsets(screen);
        int width = Math.min(WANTED.width, bounds.width - taken.left - taken.right);
        int height = Math.min(WANTED.height, bounds.height - taken.top - taken.bottom);
        frame.setSize(width, height);
        frame.setLocation(
                bounds.x + taken.left + (bounds.width - taken.left - taken.right - width) / 2,
                bounds.y + taken.top + (bounds.height - taken.top - taken.bottom - height) / 2);
        frame.setVisible(true);
    }

    /** Reduces and shows a campaign. */
    void open(Path folder) {
        Path absolute = folder.toAbsolutePath().normalize();
        try {
            settings.rememberCampaign(absolute);
        } catch (IOException problem) {
            problem("The campaign will not be remembered: " + problem.getMessage());
        }
        runner.start(absolute);
    }

    @Override
    public void open() {
        JFileChooser chooser = new JFileChooser();
        settings.lastCampaign().map(Path::getParent).ifPresent(parent -> chooser.setCurrentDirectory(parent.toFile()));
        chooser.setName("campaign folder");
        chooser.setDialogTitle("Open a campaign folder");
        chooser.setFileSelectionMode(JFileChooser.DIRECTORIES_ONLY);
        chooser.setApproveButtonText("Open");
        if (chooser.showOpenDialog(frame) == JFileChooser.APPROVE_OPTION) {
            open(chooser.getSelectedFile().toPath());
        }
    }

    @Override
    public void openLast() {
        settings.lastCampaign().ifPresent(this::open);
    }

    @Override
    public void reduceAgain() {
        if (model.state().canReduceAgain()) {
            model.state().shown().ifPresent(shown -> runner.start(shown.folder()));
        }
    }

    @Override
    public void stop() {
        runner.stop();
    }

    @Override
    public void quit() {
        runner.stop();
        frame.dispose();
    }

    @Override
    public void copyPlateChart() {
        page.plateChart().copy();
    }

    @Override
    public void copyNuReChart() {
        page.nuReChart().copy();
    }

    @Override
    public void about() {
        String version = Optional.ofNullable(MainWindow.class.getPackage().getImplementationVersion())
                .map(v -> " " + v)
                .orElse("");
        JOptionPane.showMessageDialog(
                frame,
                "plateledger" + version + "\nReduces heated-plate experiments: every watt booked,"
                        + "\nNu with its uncertainty.\nLicence: Apache-2.0",
                "About plateledger",
                JOptionPane.PLAIN_MESSAGE,
                AppIcon.icon(64));
    }

    @Override
    public void choose(String runId) {
        model.choose(runId);
    }

    @Override
    public void listFindings(FindingScope scope) {
        model.listFindings(scope);
    }

    @Override
    public void dismissNotice() {
        model.dismissNotice();
    }

    @Override
    public void problem(String sentence) {
        model.tell(new Notice(sentence, "", List.of()));
    }

    private void appearance(Appearance appearance) {
        appearance.apply();
        page.appearance(appearance.chartLook());
        try {
            settings.rememberAppearance(appearance);
        } catch (IOException problem) {
            problem("The appearance will not be remembered: " + problem.getMessage());
        }
    }

    private void render(WindowState state) {
        page.render(state);
        menus.render(state);
        frame.setTitle(state.shown().isPresent() ? Headline.of(state).title() + " – plateledger" : "plateledger");
    }
}
