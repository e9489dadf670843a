package plateledger.gui.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;
import plateledger.gui.model.Exaggeration;
import plateledger.gui.model.PlateSection;
import plateledger.gui.model.PlateSection.Junction;
import plateledger.gui.model.PlateSection.Layer;
import plateledger.gui.model.PlateSection.LayerKind;
import plateledger.gui.model.PlateSection.Strip;
import plateledger.report.Palette;

/**
 * The plate in cross-section, to the scale of the x axis along the flow. Layers too thin to be seen at that scale are drawn
 * thicker by a factor that is written in the drawing.
 */
final class SectionDrawing extends AbstractXYAnnotation {
    private static final long serialVersionUID = 1L;
    private static final double COAT_WANTED = 6.0;
    private static final double SHEET_WANTED = 14.0;
    private static final double STRIP_HEIGHT = 5.0;
    private static final double ABOVE = 30.0;
    private static final double BELOW = 3.0;
    private static final double JUNCTION = 5.0;
    private static final double LINE_GAP = 3.0;

    private final transient PlateSection section;
    private final transient ChartLook look;

    SectionDrawing(PlateSection section, ChartLook look) {
        this.section = section;
        this.look = look;
    }

    @Override
    public void draw(
            Graphics2D g2,
            XYPlot plot,
            Rectangle2D area,
            ValueAxis domainAxis,
            ValueAxis rangeAxis,
            int rendererIndex,
            PlotRenderingInfo info) {
        Graphics2D g = (Graphics2D) g2.create();
        g.clip(area);
        DoubleUnaryOperator toX = mm -> domainAxis.valueToJava2D(mm, area, plot.getDomainAxisEdge());
        new Sheet(g, area, toX, rendererIndex, info).draw();
        g.dispose();
    }

    /** One drawing onto one area. */
    private final class Sheet {
        private final Graphics2D g;
        private final Rectangle2D area;
        private final DoubleUnaryOperator toX;
        private final int rendererIndex;
        private final PlotRenderingInfo info;
        private final double pixelsPerMm;
        private final double top;

        Sheet(Graphics2D g, Rectangle2D area, DoubleUnaryOperator toX, int rendererIndex, PlotRenderingInfo info) {
            this.g = g;
            this.area = area;
            this.toX = toX;
            this.rendererIndex = rendererIndex;
            this.info = info;
            this.pixelsPerMm = (toX.applyAsDouble(section.lengthMm()) - toX.applyAsDouble(0.0)) / section.lengthMm();
            this.top = area.getMinY() + ABOVE;
        }

        void draw() {
            double left = toX.applyAsDouble(section.heatedFromMm());
            double width = toX.applyAsDouble(section.heatedToMm()) - left;
            Layer coat = layer(LayerKind.COAT);
            Layer sheet = layer(LayerKind.SHEET);
            Layer foam = layer(LayerKind.FOAM);
            double coatFactor = Exaggeration.factor(coat.thicknessMm(), pixelsPerMm, COAT_WANTED);
            double sheetFactor = Exaggeration.factor(sheet.thicknessMm(), pixelsPerMm, SHEET_WANTED);
            double coatPixels = coat.thicknessMm() * coatFactor * pixelsPerMm;
            double sheetPixels = sheet.thicknessMm() * sheetFactor * pixelsPerMm;
            double room = area.getMaxY() - BELOW - (top + coatPixels + sheetPixels + STRIP_HEIGHT);
            double foamFactor = fitting(foam.thicknessMm(), room);
            double foamPixels = foam.thicknessMm() * foamFactor * pixelsPerMm;

            double sheetTop = top + coatPixels;
            double stripTop = sheetTop + sheetPixels;
            double foamTop = stripTop + STRIP_HEIGHT;
            box(left, foamTop, width, foamPixels, Hatch.DOTS, look.thinned(0.05), look.thinned(0.16));
            strips(stripTop);
            box(left, sheetTop, width, sheetPixels, Hatch.SOLID, look.thinned(0.24), look.ground());
            box(left, top, width, coatPixels, Hatch.SOLID, look.thinned(0.85), look.ground());
            ends(coatPixels + sheetPixels);
            flowArrow();
            junctions(sheetTop, sheetFactor);
            String coatDrawn = Exaggeration.words(coatFactor);
            String sheetDrawn = Exaggeration.words(sheetFactor);
            String foamDrawn = Exaggeration.words(foamFactor);
            words(
                    left,
                    width,
                    foamTop,
                    foamPixels,
                    List.of(
                            List.of(
                                    coat.words() + ", thickness drawn " + coatDrawn,
                                    sheet.words() + ", thickness drawn " + sheetDrawn,
                                    foam.words() + ", thickness drawn " + foamDrawn),
                            List.of(
                                    coat.words() + " " + coatDrawn + ", " + sheet.words() + " " + sheetDrawn,
                                    foam.words() + " " + foamDrawn),
                            List.of("thickness drawn: coat %s, sheet %s, foam %s"
                                    .formatted(coatDrawn, sheetDrawn, foamDrawn))));
        }

        /** The largest of 1, 1/2, 1/5, 1/10 … with which the layer fits. */
        private double fitting(double thicknessMm, double room) {
            double factor = 1.0;
            double[] steps = {0.5, 0.4, 0.5};
            for (int i = 0; factor * thicknessMm * pixelsPerMm > room && factor > 1e-3; i++) {
                factor *= steps[i % steps.length];
            }
            return Math.round(factor * 1e6) / 1e6;
        }

        private Layer layer(LayerKind kind) {
            return section.layers().stream()
                    .filter(layer -> layer.kind() == kind)
                    .findFirst()
                    .orElseThrow();
        }

        private void box(double x, double y, double width, double height, Hatch hatch, Color fill, Color mark) {
            Rectangle2D box = new Rectangle2D.Double(x, y, width, height);
            g.setPaint(hatch.fill(fill, mark));
            g.fill(box);
            g.setPaint(look.thinned(0.55));
            g.setStroke(new BasicStroke(1f));
            g.draw(box);
        }

        private void strips(double y) {
            for (Strip strip : section.strips()) {
                double from = toX.applyAsDouble(strip.fromMm()) + 1.0;
                double to = toX.applyAsDouble(strip.toMm()) - 1.0;
                Rectangle2D box = new Rectangle2D.Double(from, y, to - from, STRIP_HEIGHT);
                g.setPaint(look.of(Palette.WINE));
                g.fill(box);
                tip(
                        box,
                        "heater strip %s, %s to %s mm"
                                .formatted(strip.id(), digits(strip.fromMm()), digits(strip.toMm())));
            }
        }

        /** Unheated pieces up- and downstream of the sheet. */
        private void ends(double thickness) {
            double edge = toX.applyAsDouble(0.0);
            double from = toX.applyAsDouble(section.heatedFromMm());
            double to = toX.applyAsDouble(section.heatedToMm());
            double end = toX.applyAsDouble(section.lengthMm());
            double taper = Math.min(from - edge, 2.0 * thickness);
            if (from - edge > 1.0) {
                piece(PlotFrame.polygon(edge, top, from, top, from, top + thickness, edge + taper, top + thickness));
                label("nose", edge + taper + 2, from, top + thickness);
            }
            if (end - to > 1.0) {
                piece(new Rectangle2D.Double(to, top, end - to, thickness));
                label("tail", to, end, top + thickness);
            }
        }

        private void piece(java.awt.Shape shape) {
            g.setPaint(Hatch.RISING.fill(look.thinned(0.06), look.thinned(0.22)));
            g.fill(shape);
            g.setPaint(look.thinned(0.55));
            g.draw(shape);
        }

        private void label(String word, double from, double to, double bottom) {
            g.setFont(look.tiny());
            FontMetrics metrics = g.getFontMetrics();
            if (metrics.stringWidth(word) < to - from) {
                g.setPaint(look.line());
                g.drawString(word, (float) from, (float) (bottom + metrics.getAscent() + 2));
            }
        }

        private void flowArrow() {
            double y = area.getMinY() + 9.0;
            double x = toX.applyAsDouble(0.0);
            g.setPaint(look.line());
            g.setStroke(PlotFrame.line(1.4f));
            g.setFont(look.tiny());
            g.drawString("flow", (float) x, (float) (y + 4));
            double start = x + g.getFontMetrics().stringWidth("flow") + 5;
            double end = start + 30;
            g.draw(new Line2D.Double(start, y, end - 4, y));
            g.fill(PlotFrame.polygon(end, y, end - 7, y - 3.5, end - 7, y + 3.5));
        }

        private void junctions(double sheetTop, double sheetFactor) {
            List<Junction> ordered = new ArrayList<>(section.junctions());
            ordered.sort(java.util.Comparator.comparingDouble(Junction::xMm));
            g.setFont(look.tiny());
            double lastEnd = Double.NEGATIVE_INFINITY;
            for (Junction junction : ordered) {
                double x = toX.applyAsDouble(junction.xMm());
                double y = sheetTop + Math.max(2.5, junction.depthMm() * sheetFactor * pixelsPerMm);
                Ellipse2D dot = new Ellipse2D.Double(x - JUNCTION / 2, y - JUNCTION / 2, JUNCTION, JUNCTION);
                boolean centre = junction.zMm() == 0.0;
                g.setPaint(centre ? look.line() : look.ground());
                g.fill(dot);
                g.setPaint(look.line());
                g.setStroke(new BasicStroke(1.1f));
                g.draw(dot);
                tip(
                        new Rectangle2D.Double(x - 6, y - 6, 12, 12),
                        "%s, x = %s mm, %s"
                                .formatted(
                                        junction.channel(),
                                        digits(junction.xMm()),
                                        centre ? "centre line" : "z = " + digits(junction.zMm()) + " mm"));
                if (centre) {
                    int width = g.getFontMetrics().stringWidth(junction.channel());
                    if (x - width / 2.0 > lastEnd + 2.0) {
                        g.drawString(junction.channel(), (float) (x - width / 2.0), (float) (top - 4));
                        lastEnd = x + width / 2.0;
                    }
                }
            }
        }

        /** The layers in words inside the foam, shorter where there is less room, each line on a ground of its own. */
        private void words(double left, double width, double foamTop, double foamPixels, List<List<String>> wordings) {
            g.setFont(look.tiny());
            FontMetrics metrics = g.getFontMetrics();
            double pitch = metrics.getHeight();
            List<String> shown = wordings.stream()
                    .filter(lines -> lines.size() * pitch + LINE_GAP <= foamPixels
                            && lines.stream().allMatch(line -> metrics.stringWidth(line) + LINE_GAP < width))
                    .findFirst()
                    .orElse(List.of());
            double y = foamTop + (foamPixels - shown.size() * pitch) / 2.0;
            for (String line : shown) {
                double wide = metrics.stringWidth(line);
                double x = left + (width - wide) / 2.0;
                g.setPaint(look.ground());
                g.fill(new Rectangle2D.Double(x - LINE_GAP, y, wide + 2 * LINE_GAP, pitch));
                g.setPaint(look.line());
                g.drawString(line, (float) x, (float) (y + metrics.getAscent()));
                y += pitch;
            }
        }

        private void tip(java.awt.Shape where, String text) {
            if (info != null) {
                addEntity(info, where, rendererIndex, text, null);
            }
        }
    }

    private static String digits(double mm) {
        return plateledger.gui.model.NumberText.plain(mm);
    }

    @Override
    public boolean equals(Object other) {
        return this == other;
    }

    @Override
    public int hashCode() {
        return System.identityHashCode(this);
    }
}
