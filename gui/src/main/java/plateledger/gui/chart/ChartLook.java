package plateledger.gui.chart;

import java.awt.Color;
import java.awt.Font;

/**
 * Colours and letters of a picture.
 *
 * @param ground behind everything
 * @param ink letters, axes, outlines
 * @param font letters of ordinary size
 * @param brightness whether the ground is light or dark
 * @param strength how strongly things stand out from the ground, 0..1
 */
public record ChartLook(Color ground, Color ink, Font font, Brightness brightness, double strength) {
    private static final double FORMER_STRENGTH = 0.38;

    /** Ground of a theme. */
    public enum Brightness {
        /** Light ground. */
        LIGHT,
        /** Dark ground. */
        DARK
    }

    /** On white, for the light theme and for files. */
    public static ChartLook light(Font font) {
        return new ChartLook(Color.WHITE, new Color(0x22, 0x26, 0x2a), font, Brightness.LIGHT, 1.0);
    }

    /** For the dark theme. */
    public static ChartLook dark(Font font) {
        return new ChartLook(new Color(0x24, 0x27, 0x2b), new Color(0xe2, 0xe4, 0xe6), font, Brightness.DARK, 1.0);
    }

    /** The same, faded: for a result from before. */
    public ChartLook former() {
        return new ChartLook(ground, ink, font, brightness, FORMER_STRENGTH);
    }

    /** A colour of the palette as it is drawn on this ground. Blue is too dark for a dark ground: sky blue stands in. */
    public Color of(OkabeIto hue) {
        OkabeIto drawn = hue == OkabeIto.BLUE && brightness == Brightness.DARK ? OkabeIto.SKY_BLUE : hue;
        return towardsGround(drawn.color(), strength);
    }

    /** Letters and outlines. */
    public Color line() {
        return towardsGround(ink, strength);
    }

    /** Ink thinned to a share, for grid lines and the like. */
    public Color thinned(double share) {
        return towardsGround(ink, share * strength);
    }

    /** Letters of an axis or a legend. */
    Font small() {
        return font.deriveFont(Math.max(9f, font.getSize2D() - 1.5f));
    }

    /** Letters of marks within a picture. */
    Font tiny() {
        return font.deriveFont(Math.max(8f, font.getSize2D() - 3f));
    }

    private Color towardsGround(Color color, double share) {
        return new Color(
                mix(color.getRed(), ground.getRed(), share),
                mix(color.getGreen(), ground.getGreen(), share),
                mix(color.getBlue(), ground.getBlue(), share));
    }

    private static int mix(int front, int back, double share) {
        return (int) Math.round(share * front + (1.0 - share) * back);
    }
}
