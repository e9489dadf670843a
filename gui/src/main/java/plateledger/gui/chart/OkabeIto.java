package plateledger.gui.chart;

import java.awt.Color;

/**
 * The palette of all pictures: eight colours that people with any common colour vision tell apart. Source: M. Okabe and
 * K. Ito, Color Universal Design (2002, revised 2008), the set of eight with their 8-bit values.
 */
public enum OkabeIto {
    /** Black. */
    BLACK(0, 0, 0),
    /** Orange. */
    ORANGE(230, 159, 0),
    /** Sky blue. */
    SKY_BLUE(86, 180, 233),
    /** Bluish green. */
    BLUISH_GREEN(0, 158, 115),
    /** Yellow. */
    YELLOW(240, 228, 66),
    /** Blue. */
    BLUE(0, 114, 178),
    /** Vermillion. */
    VERMILLION(213, 94, 0),
    /** Reddish purple. */
    REDDISH_PURPLE(204, 121, 167);

    private final Color color;

    OkabeIto(int red, int green, int blue) {
        this.color = new Color(red, green, blue);
    }

    /** The colour. */
    public Color color() {
        return color;
    }
}
