package plateledger.gui.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Paint;
import java.awt.RenderingHints;
import java.awt.TexturePaint;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;

/** Fills that differ in pattern, not in colour alone. */
enum Hatch {
    /** The colour alone. */
    SOLID {
        @Override
        void marks(Graphics2D g) {}
    },
    /** Lines rising to the right. */
    RISING {
        @Override
        void marks(Graphics2D g) {
            for (int shift = -CELL; shift <= CELL; shift += CELL) {
                g.draw(new Line2D.Double(shift, CELL, shift + CELL, 0));
            }
        }
    },
    /** Dots. */
    DOTS {
        @Override
        void marks(Graphics2D g) {
            g.fill(new Ellipse2D.Double(CELL * 0.5 - 1.2, CELL * 0.5 - 1.2, 2.4, 2.4));
        }
    },
    /** Level lines. */
    LEVEL {
        @Override
        void marks(Graphics2D g) {
            g.draw(new Line2D.Double(0, CELL * 0.5, CELL, CELL * 0.5));
        }
    };

    private static final int CELL = 6;

    abstract void marks(Graphics2D g);

    /** The fill: a colour with this pattern on it in another. */
    Paint fill(Color colour, Color mark) {
        if (this == SOLID) {
            return colour;
        }
        BufferedImage cell = new BufferedImage(CELL, CELL, BufferedImage.TYPE_INT_RGB);
        Graphics2D g = cell.createGraphics();
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setColor(colour);
        g.fillRect(0, 0, CELL, CELL);
        g.setColor(mark);
        g.setStroke(new BasicStroke(1.1f));
        marks(g);
        g.dispose();
        return new TexturePaint(cell, new Rectangle2D.Double(0, 0, CELL, CELL));
    }
}
