package plateledger.gui.chart;

import java.awt.Component;
import java.awt.Point;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JFileChooser;
import javax.swing.JMenuItem;
import javax.swing.JPopupMenu;
import org.jfree.chart.ChartMouseEvent;
import org.jfree.chart.ChartMouseListener;
import org.jfree.chart.ChartPanel;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.plot.XYPlot;

/** A chart in the window: shows the values under the pointer, can be copied and saved. */
public final class ChartPane {
    private static final int ANY_SIZE = 20_000;
    private static final int TIP_DELAY_MS = 150;

    private final ChartPanel panel;
    private final String fileName;
    private final Consumer<String> onProblem;

    /**
     * An empty pane.
     *
     * @param name name of the component, so that a test finds it; also the file name offered
     * @param onProblem told in a sentence what could not be done
     */
    public ChartPane(String name, Consumer<String> onProblem) {
        this.fileName = name;
        this.onProblem = onProblem;
        // Drawn at its real size always: the library would otherwise scale a picture of a standard size.
        panel = new ChartPanel(null, 600, 400, 10, 10, ANY_SIZE, ANY_SIZE, true, false, false, false, false, true);
        panel.setName(name);
        panel.setMouseZoomable(false);
        panel.setInitialDelay(TIP_DELAY_MS);
        panel.setPopupMenu(menu());
        panel.setMinimumSize(new java.awt.Dimension(80, 80));
    }

    /** The component to lay out. */
    public JComponent component() {
        return panel;
    }

    /** Shows a chart in a look; none leaves the pane empty. */
    public void show(Optional<JFreeChart> chart, ChartLook look) {
        panel.setBorder(BorderFactory.createLineBorder(look.thinned(0.2)));
        panel.setBackground(look.ground());
        panel.setChart(chart.orElse(null));
    }

    /** The chart shown. */
    public Optional<JFreeChart> chart() {
        return Optional.ofNullable(panel.getChart());
    }

    /** Copies the chart shown to the clipboard. */
    public void copy() {
        chart().ifPresent(chart -> Picture.copy(chart, panel.getWidth(), panel.getHeight()));
    }

    /** Told where a person clicked, in the values of a plain plot's axes with its scale. */
    public void onClick(Consumer<Clicked> listener) {
        panel.addChartMouseListener(new ChartMouseListener() {
            @Override
            public void chartMouseClicked(ChartMouseEvent event) {
                if (event.getChart().getPlot() instanceof XYPlot plot) {
                    Rectangle2D area = panel.getScreenDataArea();
                    listener.accept(new Clicked(event.getTrigger().getPoint(), plot, area));
                }
            }

            @Override
            public void chartMouseMoved(ChartMouseEvent event) {}
        });
    }

    /**
     * A click.
     *
     * @param at where, px in the pane
     * @param plot the plot clicked into
     * @param area its data area, px in the pane
     */
    public record Clicked(Point at, XYPlot plot, Rectangle2D area) {
        /** Distance from the click to a point given in axis values, px. */
        public double distanceTo(double x, double y) {
            return Point2D.distance(
                    at.getX(),
                    at.getY(),
                    plot.getDomainAxis().valueToJava2D(x, area, plot.getDomainAxisEdge()),
                    plot.getRangeAxis().valueToJava2D(y, area, plot.getRangeAxisEdge()));
        }
    }

    private JPopupMenu menu() {
        JPopupMenu menu = new JPopupMenu();
        JMenuItem copy = new JMenuItem("Copy chart as picture");
        copy.addActionListener(event -> copy());
        JMenuItem save = new JMenuItem("Save chart as PNG or SVG…");
        save.addActionListener(event -> save(panel));
        menu.add(copy);
        menu.add(save);
        return menu;
    }

    private void save(Component parent) {
        JFileChooser chooser = new JFileChooser();
        chooser.setDialogTitle("Save chart: the ending .png or .svg decides");
        chooser.setSelectedFile(new java.io.File(chooser.getCurrentDirectory(), fileName + ".svg"));
        if (chooser.showSaveDialog(parent) == JFileChooser.APPROVE_OPTION) {
            chart().ifPresent(chart -> write(chart, chooser.getSelectedFile().toPath()));
        }
    }

    private void write(JFreeChart chart, Path file) {
        try {
            Picture.write(chart, panel.getWidth(), panel.getHeight(), file);
        } catch (IOException problem) {
            onProblem.accept(
                    "The chart was not saved: %s cannot be written (%s)".formatted(file, problem.getMessage()));
        }
    }
}
