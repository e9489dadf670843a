package plateledger.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TimeZone;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import plateledger.audit.AuditRecord;
import plateledger.audit.Program;

final class ReportPageTest {
    private static Map<String, byte[]> files() {
        AuditRecord audit = new AuditRecord(
                new Program("0.0.0", "ab".repeat(32)),
                Map.of("runs", "all"),
                List.of(new AuditRecord.HashedFile("campaign.toml", 12, "cd".repeat(32))));
        Map<String, byte[]> files = new TreeMap<>();
        ResultFiles.of(
                        InventedCampaign.result(),
                        audit,
                        new ResultFiles.Written(Instant.EPOCH, Duration.ofSeconds(3), Path.of("campaign")))
                .forEach(f -> files.put(f.name(), f.content()));
        return files;
    }

    private static String page() {
        byte[] page = files().get("report.html");
        return page == null ? "" : new String(page, StandardCharsets.UTF_8);
    }

    @Test
    void allFilesOfTheAgreementAreThere() {
        Map<String, byte[]> files = files();
        assertTrue(files.keySet()
                .containsAll(List.of(
                        "stations.csv",
                        "runs.csv",
                        "budget.csv",
                        "fit.json",
                        "findings.csv",
                        "audit.json",
                        "written.json",
                        "report.html",
                        "figures/nu-re.svg",
                        "figures/residuals-product.svg",
                        "figures/theory-runs.svg",
                        "figures/theory-stations.svg")));
    }

    @Test
    void everyFileButWrittenJsonIsTheSameBytesInEveryLocaleAndTimeZone() {
        Map<String, byte[]> before = files();
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            for (Locale other : List.of(Locale.GERMANY, Locale.forLanguageTag("ar-EG-u-nu-arab"))) {
                Locale.setDefault(other);
                TimeZone.setDefault(TimeZone.getTimeZone("Asia/Kathmandu"));
                Map<String, byte[]> after = files();
                assertEquals(before.keySet(), after.keySet());
                before.forEach(
                        (name, content) -> assertArrayEquals(content, after.get(name), name + " under " + other));
            }
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
    }

    @Test
    void thePageStandsAlone() {
        String page = page();
        assertFalse(page.contains("<script"), "no scripts");
        assertFalse(
                Pattern.compile("(src|href)=\"(?!#|data:)").matcher(page).find(), "nothing is loaded from elsewhere");
        assertFalse(page.contains("@import"));
        Matcher urls = Pattern.compile("url\\((?!data:|#)").matcher(page);
        assertFalse(urls.find(), "no address in the style");
    }

    @Test
    void idsAreUniqueAndLinksLeadSomewhere() {
        String page = page();
        List<String> ids = Pattern.compile("\\sid=\"([^\"]+)\"")
                .matcher(page)
                .results()
                .map(m -> m.group(1))
                .toList();
        assertEquals(ids.size(), ids.stream().distinct().count(), ids.toString());
        Pattern.compile("href=\"#([^\"]+)\"")
                .matcher(page)
                .results()
                .forEach(m -> assertTrue(ids.contains(m.group(1)), m.group(1)));
    }

    @Test
    void textOfTheCampaignIsNeverMarkup() {
        String page = page();
        assertTrue(page.contains("Panels &lt;A&gt; &amp; &quot;B&quot;"), "title");
        assertFalse(page.contains("<tunnel>"));
        assertTrue(page.contains("Maker of &lt;boxes&gt; &amp; lids"));
    }

    @Test
    void whatIsMissingIsSaidToBeMissing() {
        String page = page();
        assertTrue(page.contains("<dd class=\"missing\">not stated</dd>"));
        assertTrue(page.contains("P04: not steady, storage bound 2.3 % of the power"), "deviations");
        assertTrue(page.contains("P05: left out, door was open"));
        assertTrue(page.contains("not informed by these runs"));
        assertTrue(page.contains("not tested: no repeats"), "lack of fit without repeats");
    }

    @Test
    void numbersAreRoundedToTheirUncertainty() {
        String page = page();
        assertTrue(page.contains("160.0 ± 1.8"), "Nu 160, u 1.76");
        assertTrue(page.contains("345\u202f000 ± 2\u202f100") || page.contains("345\u202f000 ± 2100"), "Re");
        assertTrue(page.contains("−0.050 ± 0.080"), "storage with the true minus sign");
    }

    @Test
    void figuresAreVectorsWithTheBundledTypeface() {
        byte[] figure = files().get("figures/nu-re.svg");
        String svg = figure == null ? "" : new String(figure, StandardCharsets.UTF_8);
        assertTrue(svg.startsWith("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<svg"), svg.substring(0, 80));
        assertTrue(svg.contains("viewBox=\"0 0 860 520\""));
        assertTrue(svg.contains("DejaVu Sans"));
        assertFalse(svg.contains("<image"), "no pixels");
        assertTrue(svg.contains("Reynolds"), "a description for readers who do not see it");
    }

    @Test
    void logarithmicAxesAreLabelledAtOneTwoFive() {
        assertEquals(List.of(10000.0, 20000.0, 50000.0, 100000.0, 200000.0), OneTwoFiveAxis.labelled(9e3, 3e5));
        assertEquals(List.of(1.0, 10.0, 100.0, 1000.0), OneTwoFiveAxis.labelled(0.6, 2000.0));
        assertTrue(OneTwoFiveAxis.labelled(2.1e5, 2.6e5).size() >= 3, "a narrow range still gets labels");
        assertEquals("20000", OneTwoFiveAxis.text(20000.0));
        assertEquals("2·10⁵", OneTwoFiveAxis.text(200000.0));
        assertEquals("10⁶", OneTwoFiveAxis.text(1e6));
        assertEquals("0.5", OneTwoFiveAxis.text(0.5));
        assertEquals("5·10⁻⁴", OneTwoFiveAxis.text(5e-4));
    }
}
