package plateledger.report;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** The bundled typeface, DejaVu Sans: the same widths and signs (Greek, superscripts, ⅓) on every machine. */
public final class Fonts {
    /** Name under which figures and pages ask for it. */
    public static final String FAMILY = "DejaVu Sans";

    private static final Font REGULAR = load("DejaVuSans.ttf");

    private Fonts() {}

    /** Regular at a size in px. */
    public static Font regular(float size) {
        return REGULAR.deriveFont(size);
    }

    /**
     * Bytes of a face.
     *
     * @param file {@code DejaVuSans.ttf}, {@code DejaVuSans-Bold.ttf} or {@code DejaVuSans-Oblique.ttf}
     */
    static byte[] bytes(String file) {
        try (InputStream in = open(file)) {
            return in.readAllBytes();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Font load(String file) {
        try (InputStream in = open(file)) {
            return Font.createFont(Font.TRUETYPE_FONT, in);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (FontFormatException e) {
            throw new IllegalStateException("bundled font " + file + " is broken", e);
        }
    }

    private static InputStream open(String file) throws IOException {
        InputStream in = Fonts.class.getResourceAsStream("fonts/" + file);
        if (in == null) {
            throw new IOException("font " + file + " is missing from the program");
        }
        return in;
    }
}
