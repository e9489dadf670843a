package plateledger.gui.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Color;
import java.awt.Font;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import javax.imageio.ImageIO;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.XYPlot;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import plateledger.gui.SampleCampaign;
import plateledger.gui.model.NuRe;
import plateledger.gui.model.PlateProfile;
import plateledger.reduce.CampaignResult;
import plateledger.report.Palette;

/** Charts are drawn into memory, so no display is needed. */
final class ChartTest {
    private static final ChartLook LOOK = ChartLook.light(new Font(Font.SANS_SERIF, Font.PLAIN, 12));
    private final CampaignResult result = SampleCampaign.result();

    @Test
    void axesPrintTheSameDigitsInEveryLocale() {
        Locale before = Locale.getDefault();
        try {
            for (String tag : List.of("de-DE", "ar-EG")) {
                Locale.setDefault(Locale.forLanguageTag(tag));
                String label = Axes.linear("x, mm", LOOK)
                        .getStandardTickUnits()
                        .getCeilingTickUnit(0.3)
                        .valueToString(1234.5);
                assertEquals("1234.5", label);
            }
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void everyAxisOfAChartHasATitleWithItsUnit() {
        CombinedDomainXYPlot plate = (CombinedDomainXYPlot) plateChart("B01").getPlot();
        assertEquals(
                "distance from the leading edge x, mm", plate.getDomainAxis().getLabel());
        assertEquals(
                List.of("temperature, °C", "", "booked heat flux, W/m²"),
                plate.getSubplots().stream()
                        .map(p -> p.getRangeAxis().getLabel())
                        .toList());
    }

    @Test
    void heatIsStackedFromZeroAndNegativePartsBelowIt() {
        CombinedDomainXYPlot plate = (CombinedDomainXYPlot) plateChart("B01").getPlot();
        XYPlot heat = plate.getSubplots().get(2);
        double flux = 32.0 / 0.12; // W over m², B01 of the sample
        assertTrue(heat.getRangeAxis().getRange().contains(flux));
        assertTrue(heat.getRangeAxis().getLowerBound() < -0.05 * flux + 1e-9, "conduction of −5 % at T02");
        assertTrue(heat.getRangeAxis().getUpperBound() < 1.3 * flux);
    }

    @Test
    void aRunWithoutStationsShowsItsPlateAlone() {
        CombinedDomainXYPlot plate = (CombinedDomainXYPlot) plateChart("P03").getPlot();
        assertEquals(1, plate.getSubplots().size());
    }

    @Test
    void rangesHoldAllIntervals() {
        NuRe numbers = NuRe.of(result);
        XYPlot plot = NuReChart.of(numbers, Optional.of("B01"), LOOK).getXYPlot();
        numbers.groups().stream().flatMap(g -> g.points().stream()).forEach(p -> {
            assertTrue(plot.getDomainAxis().getRange().contains(p.re() + p.reU()));
            assertTrue(plot.getRangeAxis().getRange().contains(p.nu() - p.nuU()));
        });
        assertEquals(1, plot.getDataset(2).getItemCount(0), "the chosen run is ringed");
        assertFalse(NuReChart.of(numbers, Optional.empty(), LOOK)
                        .getXYPlot()
                        .getDataset(2)
                        .getItemCount(0)
                > 0);
    }

    @Test
    void partsDifferInPatternNotOnlyInColour() {
        Set<Class<?>> fills = new HashSet<>();
        fills.add(Hatch.SOLID.fill(Palette.INDIGO, LOOK.ground()).getClass());
        fills.add(Hatch.DOTS.fill(Palette.INDIGO, LOOK.ground()).getClass());
        assertEquals(2, fills.size());
    }

    @Test
    void coloursStayVisibleOnADarkGround() {
        ChartLook dark = ChartLook.dark(LOOK.font());
        for (Color hue : Palette.SERIES) {
            assertTrue(contrast(dark.of(hue), dark.ground()) >= 3.0, "contrast of " + Palette.hex(hue));
        }
    }

    /** Contrast of graphics, at least 3 to 1: W3C WCAG 2.1 (2018), 1.4.11, with relative luminance as defined there. */
    private static double contrast(Color a, Color b) {
        double light = Math.max(luminance(a), luminance(b));
        double dark = Math.min(luminance(a), luminance(b));
        return (light + 0.05) / (dark + 0.05);
    }

    private static double luminance(Color c) {
        return 0.2126 * linear(c.getRed()) + 0.7152 * linear(c.getGreen()) + 0.0722 * linear(c.getBlue());
    }

    private static double linear(int channel) {
        double v = channel / 255.0;
        return v <= 0.03928 ? v / 12.92 : Math.pow((v + 0.055) / 1.055, 2.4);
    }

    @Test
    void formerLookIsNearerToTheGround() {
        assertTrue(LOOK.former().line().getRed() > LOOK.line().getRed() + 80);
    }

    @Test
    void picturesAreWrittenAsPngAndSvg(@TempDir Path folder) throws IOException {
        Path png = folder.resolve("plate.png");
        Picture.write(plateChart("B01"), 700, 500, png);
        BufferedImage read = ImageIO.read(png.toFile());
        assertEquals(1400, read.getWidth());
        assertEquals(1000, read.getHeight());

        Path svg = folder.resolve("plate.SVG");
        Picture.write(plateChart("B01"), 700, 500, svg);
        String text = Files.readString(svg);
        assertTrue(text.contains("<svg") && text.contains("width=\"700\""));
        assertTrue(text.contains("polyisocyanurate"), "the layers are named in the section");
        assertTrue(text.contains("thickness drawn"), "exaggeration is stated");
    }

    private JFreeChart plateChart(String run) {
        return PlateChart.of(
                PlateProfile.of(result, result.run(run).orElseThrow()).orElseThrow(), LOOK);
    }
}
