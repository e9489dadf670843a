package plateledger.log;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import plateledger.finding.Finding;
import plateledger.finding.RefusedException;

/** What can be told from a log itself, and what is asked instead of guessed. */
final class FormatDetectionTest {
    @TempDir
    Path folder;

    private LogFormat detect(String text) throws Exception {
        return FormatDetection.detect(folder, LogFixtures.write(folder, "log.txt", text, UTF_8));
    }

    private Finding refusal(String text) {
        return assertThrows(RefusedException.class, () -> detect(text))
                .findings()
                .get(0);
    }

    @Test
    void dayFirstIsDecidedOverTheWholeColumn() throws Exception {
        StringBuilder s = new StringBuilder("time,A [V]\n");
        for (int i = 0; i < 600; i++) {
            s.append("03/02/2024 10:%02d:%02d,1.%d\n".formatted(i / 60, i % 60, i % 10));
        }
        Finding open = refusal(s.toString());
        assertEquals("LOG-DATE-ORDER", open.id());
        assertTrue(
                open.remedy().contains("dd/MM/yyyy HH:mm:ss") && open.remedy().contains("MM/dd/yyyy HH:mm:ss"));
        assertEquals(
                "MM/dd/yyyy HH:mm:ss", detect(s + "03/14/2024 00:00:00,1.0\n").timePattern());
        assertEquals(
                "dd/MM/yyyy HH:mm:ss", detect(s + "14/03/2024 00:00:00,1.0\n").timePattern());
    }

    @Test
    void knowsOtherWritingsOfTime() throws Exception {
        assertEquals(
                "yyyy/MM/dd HH:mm",
                detect("t;A\n;V\n2026/03/10 10:20;1,5\n2026/03/10 10:21;1,5\n").timePattern());
        assertEquals(
                "dd.MM.yy HH:mm:ss",
                detect("t;A [V]\n10.03.26 10:20:01,5;1,5\n10.03.26 10:21:02,0;1,5\n")
                        .timePattern());
        assertEquals(
                "MM/dd/yyyy hh:mm:ss a",
                detect("t\tA [V]\n03/20/2026 12:05:00 AM\t1.5\n03/20/2026 12:06:00 AM\t1.5\n")
                        .timePattern());
        assertEquals(
                LogFormat.TimeForm.ISO,
                detect("no,t,A [V]\n1,2026-03-10 10:20:01.250,1.5\n2,2026-03-10 10:20:01.500,1.5\n")
                        .time());
    }

    @Test
    void asksWhenACommaMayMeanEither() throws Exception {
        assertEquals(
                "LOG-DECIMAL",
                refusal("t;A [V]\n2026-03-10 10:20:00;1,234\n2026-03-10 10:20:01;1,235\n")
                        .id());
        assertEquals(
                ',',
                detect("t;A [V]\n2026-03-10 10:20:00;1,234\n2026-03-10 10:20:01;0,235\n")
                        .decimalMark());
    }

    @Test
    void findsTitlesBelowAPreambleThatHoldsDelimiters() throws Exception {
        LogFormat f = detect(LogFixtures.lines(
                "a;b;c;d",
                "Serial;12;;",
                "",
                "t;T01;T02;T03",
                ";\u00b0C;\u00b0C;\u00b0C",
                "10.03.2026 10:00:00;20,1;OVER;20,3",
                "10.03.2026 10:00:01;20,1;;20,3"));
        assertEquals(4, f.headerLine());
        assertTrue(f.unitsRow());
        assertEquals(';', f.delimiter());
        assertEquals(',', f.decimalMark());
    }

    @Test
    void asksForTitles() {
        assertEquals(
                "column titles",
                refusal("2026-03-10 10:20:00,1.5\n2026-03-10 10:20:01,1.5\n").subject());
    }
}
