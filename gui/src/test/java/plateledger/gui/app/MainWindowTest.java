package plateledger.gui.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.awt.GraphicsEnvironment;
import java.awt.Point;
import java.awt.event.KeyEvent;
import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.lang.System.Logger;
import java.lang.System.Logger.Level;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import org.assertj.swing.core.BasicRobot;
import org.assertj.swing.core.MouseButton;
import org.assertj.swing.core.Robot;
import org.assertj.swing.edt.GuiActionRunner;
import org.assertj.swing.fixture.FrameFixture;
import org.assertj.swing.timing.Condition;
import org.assertj.swing.timing.Pause;
import org.jfree.chart.ChartPanel;
import org.jfree.chart.plot.XYPlot;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import plateledger.finding.RefusedException;
import plateledger.gui.SampleCampaign;
import plateledger.gui.model.Freshness;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.Progress;

/** The real window under real clicks and keys. Needs a display. */
final class MainWindowTest {
    private static final Logger LOG = System.getLogger(MainWindowTest.class.getName());
    private static final String NO_DISPLAY = "skipped: the test of the window needs a display, and there is none";
    private static final long WAIT_MS = 30_000;

    @TempDir
    Path folder = Path.of(".");

    private final CountDownLatch slowBegun = new CountDownLatch(1);
    private Optional<Robot> robot = Optional.empty();
    private Optional<MainWindow> opened = Optional.empty();

    @BeforeEach
    void openWindow() throws IOException {
        if (GraphicsEnvironment.isHeadless()) {
            LOG.log(Level.WARNING, NO_DISPLAY);
        }
        assumeFalse(GraphicsEnvironment.isHeadless(), NO_DISPLAY);
        Robot fresh = BasicRobot.robotWithNewAwtHierarchy();
        fresh.settings().componentLookupScope(org.assertj.swing.core.ComponentLookupScope.ALL);
        robot = Optional.of(fresh);
        Path door = Files.createDirectories(folder.resolve("door"));
        Files.createDirectories(folder.resolve("bad"));
        Files.createDirectories(folder.resolve("slow"));
        UserSettings settings = new UserSettings(folder.resolve("window.properties"));
        settings.rememberCampaign(door);
        opened = Optional.ofNullable(GuiActionRunner.execute(() -> new MainWindow(settings, this::reduce)));
        GuiActionRunner.execute(() -> window().show());
    }

    @AfterEach
    void closeWindow() {
        robot.ifPresent(Robot::cleanUp);
    }

    @Test
    void opensTheLastCampaignByKeyAndFollowsTheSelection() {
        FrameFixture frame = frame();
        frame.button("open last campaign").focus().pressAndReleaseKeys(KeyEvent.VK_SPACE);
        waitFor("the campaign", () -> window().model().state().shown().isPresent());
        frame.label("campaign title").requireText("Sample panel test");

        frame.table("runs").requireRowCount(12);
        frame.label("run title").requireText("Run B01 · heated · baseline, laminar · reduced");

        frame.table("runs").selectRows(9);
        frame.label("run title").requireText("Run P04 · heated · product · reduced");
        frame.table("runs").focus().pressAndReleaseKeys(KeyEvent.VK_UP);
        frame.label("run title").requireText("Run P03 · heated · product · not steady");
        frame.list("findings").requireItemCount(1);

        frame.radioButton("findings of whole campaign").click();
        robotNow().waitForIdle();
        frame.list("findings").requireItemCount(4);
        assertTrue(frame.textBox("finding").text().contains("What to do: Run it longer"));
    }

    @Test
    void aClickOnAPointChoosesItsRunInTheTable() {
        openCampaign("door");
        Point at = GuiActionRunner.execute(() -> {
            ChartPanel panel = (ChartPanel) window().nuReChart().component();
            XYPlot plot = panel.getChart().getXYPlot();
            Rectangle2D area = panel.getScreenDataArea();
            double re = 14.0 * 0.5 / 1.6e-5; // P04 of the sample
            double nu = 210.0 * Math.pow(14.0, 0.8);
            return new Point(
                    (int) Math.round(plot.getDomainAxis().valueToJava2D(re, area, plot.getDomainAxisEdge())),
                    (int) Math.round(plot.getRangeAxis().valueToJava2D(nu, area, plot.getRangeAxisEdge())));
        });
        robotNow().click(window().nuReChart().component(), at, MouseButton.LEFT_BUTTON, 1);
        waitFor("run P04", () -> window().model().state().chosenRun().equals(Optional.of("P04")));
        frame().table("runs").requireSelectedRows(9);
    }

    @Test
    void sortingKeepsTheSelectionOnItsRun() {
        openCampaign("door");
        frame().table("runs").tableHeader().clickColumn(6);
        frame().table("runs").requireRowCount(12);
        frame().label("run title").requireText("Run B01 · heated · baseline, laminar · reduced");
        int row = frame().table("runs").target().getSelectedRow();
        assertEquals("B01", frame().table("runs").target().getValueAt(row, 0));
    }

    @Test
    void aRefusalIsReadableAndTheWindowStaysUsable() {
        openCampaign("door");
        GuiActionRunner.execute(() -> window().open(folder.resolve("bad")));
        waitFor("the notice", () -> window().model().state().notice().isPresent());
        frame().label("notice heading").requireText("bad was not reduced: 4 findings");
        String text = frame().textBox("notice text").text();
        assertTrue(text.contains("What is shown is still door."), text);
        assertFalse(text.contains("Exception"), text);
        frame().button("put notice away").click();
        assertFalse(frame().panel("notice").target().isVisible());
        frame().table("runs").selectRows(4);
        frame().label("run title").requireText("Run B03 · heated · baseline, laminar · reduced");
    }

    @Test
    void cancelStopsTheReductionAndTheFormerResultIsGreyedMeanwhile() throws InterruptedException {
        openCampaign("door");
        GuiActionRunner.execute(() -> window().open(folder.resolve("slow")));
        assertTrue(slowBegun.await(WAIT_MS, TimeUnit.MILLISECONDS));
        waitFor("progress", () -> frame().panel("progress").target().isVisible());
        assertEquals(
                Freshness.FORMER,
                GuiActionRunner.execute(() -> window().model().state().freshness()));
        frame().table("runs").requireRowCount(12);
        frame().button("cancel").click();
        waitFor("the end", () -> !window().model().state().activity().busy());
        frame().label("notice heading").requireText("The reduction of slow was stopped");
        assertEquals(
                Freshness.CURRENT,
                GuiActionRunner.execute(() -> window().model().state().freshness()));
    }

    @Test
    void theDarkAppearanceIsChosenInTheMenuAndRemembered() {
        openCampaign("door");
        frame().menuItem("item Dark").target().doClick();
        robotNow().waitForIdle();
        assertTrue(com.formdev.flatlaf.FlatLaf.isLafDark());
        assertEquals(Appearance.DARK, new UserSettings(folder.resolve("window.properties")).appearance());
    }

    private CampaignResult reduce(Path campaign, Progress progress) throws RefusedException {
        if (campaign.endsWith("bad")) {
            throw new RefusedException(SampleCampaign.result().findings());
        }
        if (campaign.endsWith("slow")) {
            progress.step("steady windows", 0.4);
            slowBegun.countDown();
            while (!progress.cancelled()) {
                Thread.onSpinWait();
            }
            throw new CancellationException();
        }
        return SampleCampaign.result();
    }

    private void openCampaign(String name) {
        GuiActionRunner.execute(() -> window().open(folder.resolve(name)));
        waitFor("campaign " + name, () -> window().model().state().shown().isPresent());
        robotNow().waitForIdle();
    }

    private MainWindow window() {
        return opened.orElseThrow();
    }

    private Robot robotNow() {
        return robot.orElseThrow();
    }

    private FrameFixture frame() {
        return new FrameFixture(robotNow(), window().frame());
    }

    private static void waitFor(String what, java.util.concurrent.Callable<Boolean> met) {
        Pause.pause(
                new Condition(what) {
                    @Override
                    public boolean test() {
                        return Boolean.TRUE.equals(GuiActionRunner.execute(met));
                    }
                },
                WAIT_MS);
    }
}
