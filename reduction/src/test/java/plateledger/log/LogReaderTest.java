package plateledger.log;

import static java.nio.charset.StandardCharsets.ISO_8859_1;
import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.Charset;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.ZoneId;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.RefusedException;

/** Reading of logs whose contents the test itself computes; expected values come from the fixture, not from the reader. */
final class LogReaderTest {
    private static final ZoneId VIENNA = ZoneId.of("Europe/Vienna");

    @TempDir
    Path folder;

    private LogData read(String text, Charset charset, Optional<LogFormat> declared, Map<String, String> columns)
            throws Exception {
        String file = LogFixtures.write(folder, "log.txt", text, charset);
        return LogReader.read(folder, file, declared, VIENNA, columns);
    }

    private LogData read(String text) throws Exception {
        return read(text, UTF_8, Optional.empty(), Map.of());
    }

    private static Series channel(LogData log, String name) {
        return log.channel(name).orElseThrow();
    }

    private static Finding finding(LogData log, String id) {
        return log.findings().stream()
                .filter(f -> f.id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    private Finding refusal(String text) throws Exception {
        return refusal(text, Optional.empty());
    }

    private Finding refusal(String text, Optional<LogFormat> declared) throws Exception {
        RefusedException e = assertThrows(RefusedException.class, () -> read(text, UTF_8, declared, Map.of()));
        return e.findings().get(0);
    }

    @Test
    void readsSemicolonsDecimalCommasAndUnitsRowInLatin1() throws Exception {
        LogData log = read(LogFixtures.plate(50, 3), ISO_8859_1, Optional.empty(), Map.of("T03", "TN1"));
        assertEquals(
                new LogFormat(';', ',', 7, true, LogFormat.TimeForm.PATTERN, "dd.MM.yyyy HH:mm:ss", ""), log.format());
        assertEquals(50, log.rows());
        assertEquals(LogFixtures.START_S, log.startS());
        assertEquals(LogFixtures.START_S + 49, log.endS());
        assertEquals(1.0, log.intervalS());
        assertFalse(log.zoned());
        assertEquals(
                List.of("T01", "T02", "TN1"),
                log.series().stream().map(Series::channel).toList());
        Series t = channel(log, "TN1");
        assertEquals("\u00b0C", t.unit());
        for (int i = 0; i < 50; i++) {
            assertEquals(LogFixtures.value(i, 2) + 273.15, t.values()[i], 1e-10);
            assertEquals(9 + i, t.lines()[i]);
        }
        assertEquals(List.of(), log.findings());
    }

    @Test
    void readsIsoStampsWithZoneBehindAByteOrderMark() throws Exception {
        LogData log = read("\ufeff" + LogFixtures.power(40));
        assertEquals(new LogFormat(',', '.', 1, false, LogFormat.TimeForm.ISO, "", ""), log.format());
        assertTrue(log.zoned());
        assertEquals(LogFixtures.START_S, log.startS());
        assertEquals(2.0, log.intervalS());
        assertEquals(5.001, channel(log, "V1").values()[1], 1e-12);
        assertEquals(1.5002, channel(log, "I1").values()[2], 1e-12);
        assertEquals("mA", channel(log, "I1").unit());
        assertEquals(4, channel(log, "V1").lines()[2]);
    }

    @Test
    void readsElapsedSecondsFromTheStartAboveTheTitles() throws Exception {
        LogData log = read(LogFixtures.tunnel(20));
        assertEquals(new LogFormat('\t', '.', 4, false, LogFormat.TimeForm.ELAPSED_S, "", "Start"), log.format());
        assertEquals(LogFixtures.START_S, log.startS());
        assertEquals(LogFixtures.START_S + 9.5, log.endS());
        assertEquals(0.5, log.intervalS());
        assertEquals(98120.0, channel(log, "PB").values()[3], 1e-9);
        assertEquals(0.415, channel(log, "RH").values()[3], 1e-15);
        assertEquals(294.275, channel(log, "TA1").values()[3], 1e-12);
    }

    @Test
    void declaredFormatGivesTheSameAsDetection() throws Exception {
        for (String text : List.of(LogFixtures.plate(9, 2), LogFixtures.power(9), LogFixtures.tunnel(9))) {
            LogData detected = read(text);
            LogData declared = read(text, UTF_8, Optional.of(detected.format()), Map.of());
            assertEquals(detected.series(), declared.series());
            assertArrayEquals(
                    detected.series().get(0).timesS(), declared.series().get(0).timesS());
        }
    }

    @Test
    void countsEachKindOfBadCellOncePerChannelWithItsFirstLine() throws Exception {
        String text = LogFixtures.lines(
                "time,A1 [V],B1 [V]",
                "2026-03-10T10:00:00Z,1.0,2.0",
                "2026-03-10T10:00:01Z,,9.9E37",
                "2026-03-10T10:00:02Z,OVER,9.91E37",
                "2026-03-10T10:00:03Z,,broken",
                "2026-03-10T10:00:04Z,1.5,2.5");
        LogData log = read(text);
        Series a = channel(log, "A1");
        assertArrayEquals(new byte[] {0, 1, 2, 1, 0}, a.flags());
        assertArrayEquals(new byte[] {0, 2, 3, 3, 0}, channel(log, "B1").flags());
        assertTrue(Double.isNaN(a.values()[1]));
        Finding empty = finding(log, "LOG-EMPTY");
        assertEquals("log.txt:3:2", empty.place().toString());
        assertTrue(empty.found().startsWith("2 of 5 cells empty"), empty.found());
        assertEquals("channel A1", empty.subject());
        long overRange = log.findings().stream()
                .filter(f -> f.id().equals("LOG-OVER-RANGE"))
                .count();
        assertEquals(2, overRange);
        Finding words = finding(log, "LOG-NOT-A-NUMBER");
        assertEquals(4, words.place().line());
        assertTrue(words.found().contains("2 of 5"), words.found());
    }

    @Test
    void reportsGapsBackwardAndRepeatedTimesShortRowsAndStrayRows() throws Exception {
        String whole = LogFixtures.lines(
                "time,A1 [V],B1 [V]",
                "2026-03-10T10:00:00Z,1.0,2.0",
                "2026-03-10T10:00:01Z,1.1,2.0",
                "2026-03-10T10:00:01Z,1.2,2.0",
                "2026-03-10T10:00:02Z,1.3",
                "alarm: door open",
                "2026-03-10T10:00:00Z,9.0,9.0",
                "2026-03-10T10:00:03Z,1.4,2.0,7",
                "2026-03-10T10:00:30Z,1.5,2.0",
                "2026-03-10T10:00:31Z,1.6,2.");
        String text = whole.substring(0, whole.length() - 1);
        LogData log = read(text);
        Series a = channel(log, "A1");
        assertArrayEquals(new double[] {1.0, 1.1, 1.2, 1.3, 1.4, 1.5}, a.values(), 1e-12);
        assertArrayEquals(new int[] {2, 3, 4, 5, 8, 9}, a.lines());
        assertEquals(0.5, a.timesS()[2] - a.timesS()[1], 1e-6);
        assertEquals(4, finding(log, "LOG-REPEATED").place().line());
        assertEquals(5, finding(log, "LOG-SHORT-ROW").place().line());
        assertEquals(6, finding(log, "LOG-ROW-TIME").place().line());
        assertTrue(finding(log, "LOG-ROW-TIME").found().contains("alarm"));
        assertEquals(7, finding(log, "LOG-BACKWARD").place().line());
        assertEquals(8, finding(log, "LOG-LONG-ROW").place().line());
        assertEquals(9, finding(log, "LOG-GAP").place().line());
        assertTrue(
                finding(log, "LOG-GAP").found().contains("27.0 s"),
                finding(log, "LOG-GAP").found());
        assertEquals(10, finding(log, "LOG-CUT-OFF").place().line());
        assertEquals(Level.NOTE, finding(log, "LOG-GAP").level());
    }

    @Test
    void keepsBothHoursWhenTheClockIsSetBackInAutumn() throws Exception {
        // Summer time ended on 2026-10-25 at 03:00 CEST = 01:00 UTC in central Europe (Directive 2000/84/EC).
        String text = LogFixtures.lines(
                "time;T01",
                "-;K",
                "25.10.2026 02:20:00;300",
                "25.10.2026 02:50:00;301",
                "25.10.2026 02:20:00;302",
                "25.10.2026 02:50:00;303",
                "25.10.2026 03:20:00;304");
        double[] t = channel(read(text), "T01").timesS();
        for (int i = 1; i < t.length; i++) {
            assertEquals(1800.0, t[i] - t[i - 1]);
        }
    }

    @Test
    void leavesOutColumnsWithUnknownUnitsAndColumnsOfWordsAndSaysSo() throws Exception {
        String text = LogFixtures.lines(
                "time,A1 [V],N1 [furlong],State,A1 [V],",
                "2026-03-10T10:00:00Z,1.0,5,on,3,",
                "2026-03-10T10:00:01Z,1.0,5,on,3,");
        LogData log = read(text);
        assertEquals(
                List.of("A1", "A1 (column 5)"),
                log.series().stream().map(Series::channel).toList());
        assertEquals("log.txt:1:3", finding(log, "LOG-UNIT").place().toString());
        assertEquals("log.txt:1:5", finding(log, "LOG-TITLE").place().toString());
        assertEquals("log.txt:1:4", finding(log, "LOG-WORDS").place().toString());
    }

    @Test
    void refusesWhatIsNoLog() throws Exception {
        assertEquals(
                "LOG-MISSING",
                assertThrows(
                                RefusedException.class,
                                () -> LogReader.read(folder, "none.txt", Optional.empty(), VIENNA, Map.of()))
                        .findings()
                        .get(0)
                        .id());
        Files.write(folder.resolve("x.xlsx"), new byte[] {'P', 'K', 3, 4, 0, 0});
        Finding zip = assertThrows(
                        RefusedException.class,
                        () -> LogReader.read(folder, "x.xlsx", Optional.empty(), VIENNA, Map.of()))
                .findings()
                .get(0);
        assertEquals("LOG-BINARY", zip.id());
        Finding binary = refusal("time,A [V]\n2026-03-10T10:00:00Z,1\u00000\n");
        assertEquals("LOG-BINARY", binary.id());
        assertEquals(2, binary.place().line());
        assertEquals("LOG-EMPTY-FILE", refusal("").id());
        assertEquals(
                "LOG-FORMAT",
                refusal("Dear all,\nplease find the logs attached.\n").id());
    }

    @Test
    void refusesALogWithoutReadableTime() throws Exception {
        Finding f = refusal("n,T01 [K]\n5,300.1\n4,300.2\n9,300.3\n");
        assertEquals("LOG-NO-TIME", f.id());
        assertEquals("log.txt:2:1", f.place().toString());
        LogFormat iso = new LogFormat(',', '.', 1, false, LogFormat.TimeForm.ISO, "", "");
        Finding g = refusal("time,T01 [K]\nten past,300.1\nhalf past,300.2\n", Optional.of(iso));
        assertEquals("LOG-NO-TIME", g.id());
        assertTrue(g.message().contains("log.txt:2:1: time: found \"ten past\"; expected a time like 2026-03"));
        LogFormat elapsed = new LogFormat('\t', '.', 2, false, LogFormat.TimeForm.ELAPSED_S, "", "Begin");
        assertEquals(
                "LOG-NO-TIME",
                refusal("Start: 2026-03-10 10:20:00\nElapsed [s]\tT [K]\n0\t300\n1\t300\n", Optional.of(elapsed))
                        .id()
                        .toString());
    }

    @Test
    void saysWhichDecimalMarkItExpected() throws Exception {
        LogFormat point = new LogFormat(';', '.', 1, false, LogFormat.TimeForm.ISO, "", "");
        Finding f =
                refusal("time;T01 [K]\n2026-03-10T10:00:00Z;300,1\n2026-03-10T10:00:01Z;300,2\n", Optional.of(point));
        assertEquals("LOG-NUMBERS", f.id());
        assertTrue(
                f.message()
                        .startsWith("log.txt:2:2: channel T01: found \"300,1\"; expected a number with '.' as decimal"),
                f.message());
    }

    @Test
    void refusesAWrongDeclaration() throws Exception {
        LogFormat delimiter = new LogFormat(';', '.', 1, false, LogFormat.TimeForm.ISO, "", "");
        assertEquals(
                "LOG-FORMAT",
                refusal(LogFixtures.power(5), Optional.of(delimiter)).id());
        LogFormat pattern = new LogFormat(',', '.', 1, false, LogFormat.TimeForm.PATTERN, "dd-QQ", "");
        assertEquals(
                "time_pattern",
                refusal(LogFixtures.power(5), Optional.of(pattern)).subject());
        LogFormat header = new LogFormat(',', '.', 70, false, LogFormat.TimeForm.ISO, "", "");
        assertEquals(
                "LOG-FORMAT", refusal(LogFixtures.power(5), Optional.of(header)).id());
    }
}
