package plateledger.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.awt.geom.AffineTransform;
import java.io.ByteArrayInputStream;
import org.junit.jupiter.api.Test;

/** The platform's own font reader is the judge of the cut-down font. */
final class FontSubsetTest {
    private static final String TEXT = "Nu = 0.332 Re½ Pr⅓ ± é → ∞ α";
    private static final FontRenderContext CONTEXT = new FontRenderContext(new AffineTransform(), true, true);

    private static Font read(byte[] font) throws Exception {
        return Font.createFont(Font.TRUETYPE_FONT, new ByteArrayInputStream(font))
                .deriveFont(100f);
    }

    @Test
    void keepsOutlinesAndWidthsOfTheCharactersOfTheText() throws Exception {
        byte[] whole = Fonts.bytes("DejaVuSans.ttf");
        byte[] cut = FontSubset.of(whole, TEXT);
        assertTrue(cut.length < whole.length / 10, "cut to " + cut.length + " of " + whole.length + " bytes");
        Font before = read(whole);
        Font after = read(cut);
        TEXT.codePoints().forEach(c -> {
            String sign = Character.toString(c);
            assertTrue(after.canDisplay(c), sign);
            assertEquals(
                    before.createGlyphVector(CONTEXT, sign).getGlyphMetrics(0).getAdvance(),
                    after.createGlyphVector(CONTEXT, sign).getGlyphMetrics(0).getAdvance(),
                    sign);
            assertEquals(
                    before.createGlyphVector(CONTEXT, sign).getGlyphOutline(0).getBounds2D(),
                    after.createGlyphVector(CONTEXT, sign).getGlyphOutline(0).getBounds2D(),
                    sign);
        });
        assertFalse(after.canDisplay('Q'), "a character that the text does not use is gone");
    }

    @Test
    void theSameTextGivesTheSameBytes() {
        byte[] whole = Fonts.bytes("DejaVuSans-Bold.ttf");
        assertArrayEquals(FontSubset.of(whole, TEXT), FontSubset.of(whole, TEXT + TEXT));
    }

    @Test
    void theCopyrightNoticeIsKept() {
        byte[] cut = FontSubset.of(Fonts.bytes("DejaVuSans.ttf"), "x");
        String text = new String(cut, java.nio.charset.StandardCharsets.UTF_16BE)
                + new String(cut, 1, cut.length - 1, java.nio.charset.StandardCharsets.UTF_16BE)
                + new String(cut, java.nio.charset.StandardCharsets.ISO_8859_1);
        assertTrue(text.contains("Bitstream"), "name table");
    }

    @Test
    void allSignsOfTheReportAreInTheTypeface() throws Exception {
        Font font = read(Fonts.bytes("DejaVuSans.ttf"));
        assertEquals(-1, font.canDisplayUpTo("ₓₛₚₙ⁻⁰¹²³⁴⁵⁶⁷⁸⁹½⅓∞∫±−·×÷≤→χσενμρδθΔΣ°–…√|"));
    }
}
