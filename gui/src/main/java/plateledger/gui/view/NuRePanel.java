package plateledger.gui.view;

import java.util.Comparator;
import java.util.Optional;
import javax.swing.JComponent;
import plateledger.gui.chart.ChartLook;
import plateledger.gui.chart.ChartPane;
import plateledger.gui.chart.NuReChart;
import plateledger.gui.model.Freshness;
import plateledger.gui.model.NuRe;
import plateledger.gui.model.WindowState;

/** Nu over Re of all runs; a click near a point chooses its run. */
public final class NuRePanel {
    private static final double NEAR_PX = 12.0;

    private final ChartPane chart;
    private NuRe shown = NuRe.NOTHING;

    /** An empty chart. */
    public NuRePanel(Gestures gestures) {
        chart = new ChartPane("nu-re-chart", gestures::problem);
        chart.onClick(clicked -> nearest(clicked).ifPresent(point -> gestures.choose(point.runId())));
    }

    /** The component to lay out. */
    public JComponent component() {
        return chart.component();
    }

    /** The pane with the chart, to copy it. */
    public ChartPane chart() {
        return chart;
    }

    /** Shows the runs of a state. */
    public void render(WindowState state, ChartLook look) {
        shown = state.shown().map(s -> NuRe.of(s.result())).orElse(NuRe.NOTHING);
        ChartLook drawn = state.freshness() == Freshness.FORMER ? look.former() : look;
        chart.show(
                shown.isEmpty() ? Optional.empty() : Optional.of(NuReChart.of(shown, state.chosenRun(), drawn)), look);
    }

    private Optional<NuRe.Point> nearest(ChartPane.Clicked clicked) {
        return shown.groups().stream()
                .flatMap(group -> group.points().stream())
                .filter(p -> clicked.distanceTo(p.re(), p.nu()) <= NEAR_PX)
                .min(Comparator.comparingDouble(p -> clicked.distanceTo(p.re(), p.nu())));
    }
}
