package plateledger.gui.view;

import java.awt.CardLayout;
import java.awt.Dimension;
import java.awt.Font;
import java.nio.file.Path;
import java.util.Optional;
import javax.swing.Icon;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JSplitPane;
import net.miginfocom.swing.MigLayout;
import plateledger.gui.chart.ChartLook;
import plateledger.gui.chart.ChartPane;
import plateledger.gui.model.Freshness;
import plateledger.gui.model.Headline;
import plateledger.gui.model.WindowState;

/** The one page: the campaign on the left (runs, Nu over Re), the chosen run on the right (plate, findings). */
public final class MainPanel {
    private static final String START = "start";
    private static final String CAMPAIGN = "campaign";
    private static final double LEFT_SHARE = 0.3;
    private static final double UPPER_SHARE = 0.5;
    private static final double PLATE_SHARE = 0.85;
    private static final Dimension RUNS = new Dimension(556, 330);
    private static final Dimension NU_RE = new Dimension(556, 330);
    private static final Dimension PLATE = new Dimension(690, 560);

    private final JPanel root = new JPanel(new MigLayout("ins 0, gap 0, fill, hidemode 3", "[grow,fill]"));
    private final CardLayout cards = new CardLayout();
    private final JPanel pages = new JPanel(cards);
    private final JLabel title = new JLabel(" ");
    private final JLabel status = new JLabel(" ");
    private final NoticePanel notice;
    private final ProgressPanel progress;
    private final RunTable runs;
    private final NuRePanel nuRe;
    private final RunPanel run;
    private final FindingsPanel findings;
    private ChartLook look;
    private WindowState state = WindowState.EMPTY;
    private Optional<Drawn> drawn = Optional.empty();

    /** What the charts last drew; they are drawn anew only when one of these changes, not at each step of progress. */
    private record Drawn(long revision, Freshness freshness, Optional<String> chosenRun, ChartLook look) {}

    /** The page before anything is open. */
    public MainPanel(Gestures gestures, ChartLook look, Icon icon, Optional<Path> last) {
        this.look = look;
        notice = new NoticePanel(gestures);
        progress = new ProgressPanel(gestures);
        runs = new RunTable(gestures);
        nuRe = new NuRePanel(gestures);
        run = new RunPanel(gestures);
        findings = new FindingsPanel(gestures);
        pages.add(new StartPanel(gestures, icon, last).component(), START);
        pages.add(campaign(), CAMPAIGN);
        root.add(notice.component(), "wmin 0, wrap");
        root.add(header(), "wmin 0, wrap");
        root.add(pages, "wmin 0, hmin 0, push, grow, wrap");
        root.add(progress.component(), "wmin 0");
        root.setMinimumSize(new Dimension(640, 420));
    }

    /** The component to lay out. */
    public JComponent component() {
        return root;
    }

    /** The chart of the chosen run's plate. */
    public ChartPane plateChart() {
        return run.chart();
    }

    /** The chart of Nu over Re. */
    public ChartPane nuReChart() {
        return nuRe.chart();
    }

    /** Draws in another look from now on. */
    public void appearance(ChartLook next) {
        look = next;
        render(state);
    }

    /** Shows a state. */
    public void render(WindowState next) {
        state = next;
        Headline headline = Headline.of(next);
        title.setText(headline.title());
        status.setText(headline.status().isEmpty() ? " " : headline.status());
        status.setToolTipText(headline.status().isEmpty() ? null : headline.status());
        notice.render(next);
        progress.render(next);
        cards.show(pages, next.shown().isPresent() ? CAMPAIGN : START);
        title.getParent().setVisible(next.shown().isPresent());
        runs.render(next);
        findings.render(next);
        Drawn now = new Drawn(next.revision(), next.freshness(), next.chosenRun(), look);
        if (!drawn.equals(Optional.of(now))) {
            drawn = Optional.of(now);
            nuRe.render(next, look);
            run.render(next, look);
        }
    }

    private JComponent header() {
        JPanel header = new JPanel(new MigLayout("ins 8 12 4 12, gap 14 0", "[][grow,fill]"));
        title.setName("campaign title");
        status.setName("status");
        title.setFont(title.getFont().deriveFont(Font.BOLD, title.getFont().getSize2D() * 1.3f));
        status.putClientProperty("FlatLaf.styleClass", "small");
        header.add(title, "wmin 0, wrap");
        header.add(status, "span, wmin 0");
        return header;
    }

    private JComponent campaign() {
        runs.component().setPreferredSize(RUNS);
        nuRe.component().setPreferredSize(NU_RE);
        run.component().setPreferredSize(PLATE);
        JSplitPane left = split(JSplitPane.VERTICAL_SPLIT, runs.component(), nuRe.component(), UPPER_SHARE);
        JSplitPane right = split(JSplitPane.VERTICAL_SPLIT, run.component(), findings.component(), PLATE_SHARE);
        JSplitPane both = split(JSplitPane.HORIZONTAL_SPLIT, left, right, LEFT_SHARE);
        JPanel page = new JPanel(new MigLayout("ins 4 12 10 12, fill", "[grow,fill]", "[grow,fill]"));
        page.add(both, "wmin 0, hmin 0, grow");
        return page;
    }

    private static JSplitPane split(int direction, JComponent first, JComponent second, double share) {
        JSplitPane split = new JSplitPane(direction, true, first, second);
        split.setResizeWeight(share);
        split.setBorder(null);
        split.setDividerSize(8);
        return split;
    }
}
