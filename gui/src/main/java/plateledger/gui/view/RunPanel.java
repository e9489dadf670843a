package plateledger.gui.view;

import java.awt.Color;
import java.awt.Font;
import java.util.Optional;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.UIManager;
import net.miginfocom.swing.MigLayout;
import plateledger.gui.chart.ChartLook;
import plateledger.gui.chart.ChartPane;
import plateledger.gui.chart.PlateChart;
import plateledger.gui.model.Freshness;
import plateledger.gui.model.PlateProfile;
import plateledger.gui.model.RunSummary;
import plateledger.gui.model.WindowState;
import plateledger.reduce.RunResult;

/** The chosen run: its numbers and its plate with temperatures and booked heat. */
public final class RunPanel {
    private final JPanel root = new JPanel(new MigLayout("ins 0, gap 0 4, fill", "[grow,fill]", "[][][grow,fill]"));
    private final JLabel title = new JLabel(" ");
    private final JPanel facts = new JPanel(new MigLayout("ins 0, gap 10 1, wrap 4", "", "[baseline][baseline]"));
    private final ChartPane chart;

    /** An empty panel. */
    public RunPanel(Gestures gestures) {
        chart = new ChartPane("plate-chart", gestures::problem);
        title.setName("run title");
        title.setFont(title.getFont().deriveFont(Font.BOLD, title.getFont().getSize2D() + 1.5f));
        facts.setName("run facts");
        root.add(title, "wmin 0, wrap");
        root.add(facts, "wmin 0, wrap");
        root.add(chart.component(), "wmin 0, hmin 0, grow");
    }

    /** The component to lay out. */
    public JComponent component() {
        return root;
    }

    /** The pane with the chart, to copy it. */
    public ChartPane chart() {
        return chart;
    }

    /** Shows the chosen run. */
    public void render(WindowState state, ChartLook look) {
        Optional<RunResult> chosen = state.chosen();
        boolean former = state.freshness() == Freshness.FORMER;
        Color faded = UIManager.getColor("Label.disabledForeground");
        Color ink = former && faded != null ? faded : UIManager.getColor("Label.foreground");
        title.setForeground(ink);
        facts.removeAll();
        if (chosen.isPresent()) {
            RunSummary summary = RunSummary.of(chosen.get());
            title.setText(summary.title() + (former ? " · former result" : ""));
            for (RunSummary.Fact fact : summary.facts()) {
                JLabel label = new JLabel(fact.symbol().isEmpty() ? fact.text() : html(fact));
                label.setToolTipText(fact.meaning());
                label.setForeground(ink);
                label.setFont(label.getFont().deriveFont(label.getFont().getSize2D() - 1f));
                facts.add(label, fact.symbol().isEmpty() ? "span, wmin 0" : "");
            }
        } else {
            title.setText("No run chosen");
        }
        facts.revalidate();
        facts.repaint();
        chart.show(
                chosen.flatMap(run -> state.shown().flatMap(s -> PlateProfile.of(s.result(), run)))
                        .map(profile -> PlateChart.of(profile, former ? look.former() : look)),
                look);
    }

    /** The symbol with its subscript lowered. */
    private static String html(RunSummary.Fact fact) {
        int low = fact.symbol().indexOf('_');
        String symbol = low < 0
                ? fact.symbol() + "<sub>&#8203;</sub>" // the same height as its neighbours with a lowered index
                : fact.symbol().substring(0, low) + "<sub>" + fact.symbol().substring(low + 1) + "</sub>";
        return "<html><nobr>" + symbol + " = " + fact.text() + "</nobr></html>";
    }
}
