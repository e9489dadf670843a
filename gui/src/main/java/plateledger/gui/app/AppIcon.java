package plateledger.gui.app;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Image;
import java.awt.RenderingHints;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.List;
import java.util.stream.Stream;
import javax.swing.Icon;
import javax.swing.ImageIcon;
import plateledger.report.Palette;

/** The program's own mark: a plate, the boundary layer growing above it, the booked heat in columns below it. */
final class AppIcon {
    private static final double UNITS = 32.0;
    private static final Color INK = new Color(0x17, 0x4a, 0x52);

    private AppIcon() {}

    /** The mark in the sizes that window systems ask for. */
    static List<Image> images() {
        return Stream.of(16, 24, 32, 48, 64, 128).<Image>map(AppIcon::image).toList();
    }

    /** The mark in one size, for a label. */
    static Icon icon(int size) {
        return new ImageIcon(image(size));
    }

    private static BufferedImage image(int size) {
        BufferedImage image = new BufferedImage(size, size, BufferedImage.TYPE_INT_ARGB);
        Graphics2D g = image.createGraphics();
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.scale(size / UNITS, size / UNITS);
        g.setColor(Color.WHITE);
        g.fill(new java.awt.geom.RoundRectangle2D.Double(0, 0, UNITS, UNITS, 7, 7));
        g.setColor(INK);
        Path2D layer = new Path2D.Double();
        layer.moveTo(4, 14);
        layer.quadTo(8, 5.5, 28, 4.5);
        g.setStroke(new BasicStroke(2.2f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
        g.draw(layer);
        g.fill(new Rectangle2D.Double(3, 14, 26, 3.2));
        column(g, 4.5, 11);
        column(g, 11, 8.5);
        column(g, 17.5, 7);
        column(g, 24, 6);
        g.dispose();
        return image;
    }

    private static void column(Graphics2D g, double x, double height) {
        double upper = 0.7 * height;
        g.setColor(Palette.INDIGO);
        g.fill(new Rectangle2D.Double(x, 18.2, 4, upper));
        g.setColor(Palette.ROSE);
        g.fill(new Rectangle2D.Double(x, 18.2 + upper, 4, height - upper));
    }
}
