package plateledger.gui.app;

import com.formdev.flatlaf.FlatDarkLaf;
import com.formdev.flatlaf.FlatLaf;
import com.formdev.flatlaf.FlatLightLaf;
import java.awt.Font;
import java.awt.FontFormatException;
import java.awt.GraphicsEnvironment;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javax.swing.UIManager;
import javax.swing.plaf.FontUIResource;
import plateledger.gui.chart.ChartLook;
import plateledger.report.Fonts;

/** The appearances of the window: plain light and dark grounds with the program's own accent and letters. */
enum Appearance {
    /** Dark letters on a light ground. */
    LIGHT,
    /** Light letters on a dark ground. */
    DARK;

    private static final String LIGHT_ACCENT = "#14666e";
    private static final String DARK_ACCENT = "#4fa8ad";
    private static final float SIZE = 12f;
    private static final List<String> LETTERS =
            List.of("DejaVuSans.ttf", "DejaVuSans-Bold.ttf", "DejaVuSans-Oblique.ttf");

    /** The word kept between starts. */
    String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** The appearance of a word; light for any other word. */
    static Appearance of(String word) {
        return DARK.word().equals(word) ? DARK : LIGHT;
    }

    /** Dresses all windows that are open and those to come. To be called on the event thread. */
    void apply() {
        FlatLaf.setGlobalExtraDefaults(Map.of("@accentColor", this == DARK ? DARK_ACCENT : LIGHT_ACCENT));
        if (this == DARK) {
            FlatDarkLaf.setup();
        } else {
            FlatLightLaf.setup();
        }
        UIManager.put("defaultFont", new FontUIResource(letters()));
        UIManager.put("Table.showHorizontalLines", true);
        UIManager.put("TitlePane.unifiedBackground", true);
        FlatLaf.updateUI();
    }

    /** The look of charts in this appearance. */
    ChartLook chartLook() {
        return this == DARK ? ChartLook.dark(letters()) : ChartLook.light(letters());
    }

    /** The program's letters; those of the machine where the bundled ones cannot be read. */
    private static Font letters() {
        return new Font(Fonts.FAMILY, Font.PLAIN, Math.round(SIZE));
    }

    /**
     * Makes the bundled letters known to the machine's graphics.
     *
     * @return what went wrong, in words; empty if nothing did
     */
    static List<String> registerLetters() {
        GraphicsEnvironment graphics = GraphicsEnvironment.getLocalGraphicsEnvironment();
        return LETTERS.stream()
                .flatMap(name -> register(graphics, name).stream())
                .toList();
    }

    private static java.util.Optional<String> register(GraphicsEnvironment graphics, String name) {
        try (InputStream bytes = Appearance.class.getResourceAsStream("/plateledger/report/fonts/" + name)) {
            if (bytes == null) {
                return java.util.Optional.of("the letters " + name + " are missing");
            }
            graphics.registerFont(Font.createFont(Font.TRUETYPE_FONT, bytes));
            return java.util.Optional.empty();
        } catch (IOException | FontFormatException problem) {
            return java.util.Optional.of("the letters " + name + " cannot be read: " + problem.getMessage());
        }
    }
}
