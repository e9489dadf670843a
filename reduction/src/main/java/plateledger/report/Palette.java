package plateledger.report;

import java.awt.Color;
import java.util.List;
import java.util.Locale;
import plateledger.finding.Level;
import plateledger.reduce.LedgerTerm;

/**
 * The colours of figures and report: the colour-blind safe scheme "muted" of Paul Tol, Colour Schemes, SRON technical note
 * SRON/EPS/TN/09-002, issue 3.2, 2021. Nothing is said by colour alone: series differ in shape, findings in word and shape.
 */
public final class Palette {
    /** Muted indigo, also the accent of the report. */
    public static final Color INDIGO = new Color(0x332288);
    /** Muted cyan. */
    public static final Color CYAN = new Color(0x88CCEE);
    /** Muted teal. */
    public static final Color TEAL = new Color(0x44AA99);
    /** Muted green. */
    public static final Color GREEN = new Color(0x117733);
    /** Muted olive. */
    public static final Color OLIVE = new Color(0x999933);
    /** Muted sand. */
    public static final Color SAND = new Color(0xDDCC77);
    /** Muted rose. */
    public static final Color ROSE = new Color(0xCC6677);
    /** Muted wine. */
    public static final Color WINE = new Color(0x882255);
    /** Muted purple. */
    public static final Color PURPLE = new Color(0xAA4499);
    /** Pale grey, the scheme's colour for missing data. */
    public static final Color PALE = new Color(0xDDDDDD);

    /** Text and axes: not of the scheme; a near-black that prints as black. */
    public static final Color INK = new Color(0x22222E);
    /** Grid lines: not of the scheme; fainter than any datum. */
    public static final Color GRID = new Color(0xE6E6EB);
    /** Ground of figures. */
    public static final Color PAPER = Color.WHITE;

    /** Colours of series, in this order. */
    public static final List<Color> SERIES = List.of(INDIGO, ROSE, TEAL, OLIVE, WINE, CYAN, PURPLE, GREEN, SAND);

    private Palette() {}

    /** Colour of the n-th series, from 0; starts again after the ninth. */
    public static Color series(int n) {
        return SERIES.get(Math.floorMod(n, SERIES.size()));
    }

    /** Colour of a ledger entry. */
    public static Color of(LedgerTerm term) {
        return switch (term) {
            case ELECTRICAL -> INK;
            case CONVECTION -> INDIGO;
            case RADIATION -> ROSE;
            case BACK -> SAND;
            case EDGE -> TEAL;
            case NOSE -> CYAN;
            case TAIL -> PURPLE;
            case GUARD -> GREEN;
            case LEAD -> OLIVE;
            case STORAGE -> WINE;
            case RESIDUAL -> PALE;
        };
    }

    /** Colour of a level; its word and shape come first. */
    public static Color of(Level level) {
        return switch (level) {
            case STOP -> WINE;
            case CAUTION -> PURPLE;
            case NOTE -> INDIGO;
            case NOT_CHECKED -> OLIVE;
        };
    }

    /** A colour as {@code #rrggbb}. */
    public static String hex(Color colour) {
        return String.format(Locale.ROOT, "#%06x", colour.getRGB() & 0xFFFFFF);
    }
}
