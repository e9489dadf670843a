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
    private static final double DARK_GROUND_LIGHTNESS = 0.5;

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

    /**
     * A colour of the palette as it is drawn on this ground. On a dark ground the scheme's darkest hues would vanish: they
     * are lightened, each by as much as it needs, so that their order of hues stays.
     */
    public Color of(Color hue) {
        return towardsGround(brightness == Brightness.DARK ? lightened(hue) : hue, strength);
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

    /** Mixed with white until it is as light as {@link #DARK_GROUND_LIGHTNESS} at least. */
    private static Color lightened(Color hue) {
        double lightness = lightness(hue);
        if (lightness >= DARK_GROUND_LIGHTNESS) {
            return hue;
        }
        double white = (DARK_GROUND_LIGHTNESS - lightness) / (1.0 - lightness);
        return new Color(
                mix(255, hue.getRed(), white), mix(255, hue.getGreen(), white), mix(255, hue.getBlue(), white));
    }

    /** Luma by the weights of ITU-R BT.709, 0..1. */
    private static double lightness(Color c) {
        return (0.2126 * c.getRed() + 0.7152 * c.getGreen() + 0.0722 * c.getBlue()) / 255.0;
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
