package plateledger.gui.view;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Component;
import java.awt.Font;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import javax.swing.Icon;
import plateledger.finding.Level;
import plateledger.gui.chart.ChartLook;
import plateledger.report.Palette;

/** The shape of a finding's level: a square, a triangle, a disc, an open diamond. The colour only supports the shape. */
public record LevelIcon(Level level, int size) implements Icon {
    private static final int SQUARE = 4;
    private static final int MIDDLE = 3 * 128; // of the sum of red, green and blue
    private static final int TRIANGLE = 3;

    @Override
    public int getIconWidth() {
        return size;
    }

    @Override
    public int getIconHeight() {
        return size;
    }

    @Override
    public void paintIcon(Component on, Graphics graphics, int x, int y) {
        Graphics2D g = (Graphics2D) graphics.create();
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.translate(x + size / 2.0, y + size / 2.0);
        Shape shape = shape();
        if (level != Level.NOT_CHECKED) {
            g.setColor(fill(on.getForeground(), on.getFont()));
            g.fill(shape);
        }
        g.setColor(on.getForeground());
        g.setStroke(new BasicStroke(1.2f));
        g.draw(shape);
        g.dispose();
    }

    /** Light letters mean a dark ground, on which the palette is lightened as in the charts. */
    private Color fill(Color letters, Font font) {
        boolean darkGround = letters.getRed() + letters.getGreen() + letters.getBlue() > MIDDLE;
        return (darkGround ? ChartLook.dark(font) : ChartLook.light(font)).of(Palette.of(level));
    }

    private Shape shape() {
        double r = size / 2.0 - 1.0;
        return switch (level) {
            case STOP -> polygon(SQUARE, 1.15 * r, Math.PI / SQUARE, 0.0);
            case CAUTION -> polygon(TRIANGLE, 1.1 * r, -Math.PI / 2.0, 0.2 * r);
            case NOT_CHECKED -> polygon(SQUARE, r, 0.0, 0.0);
            case NOTE -> new Ellipse2D.Double(-0.8 * r, -0.8 * r, 1.6 * r, 1.6 * r);
        };
    }

    private static Shape polygon(int corners, double radius, double turn, double down) {
        Path2D path = new Path2D.Double();
        for (int i = 0; i < corners; i++) {
            double angle = turn + 2.0 * Math.PI * i / corners;
            double x = radius * Math.cos(angle);
            double y = radius * Math.sin(angle) + down;
            if (i == 0) {
                path.moveTo(x, y);
            } else {
                path.lineTo(x, y);
            }
        }
        path.closePath();
        return path;
    }
}
