package plateledger.log;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.BigRange;
import net.jqwik.api.constraints.LongRange;
import org.junit.jupiter.api.Test;

/** Numbers and times as loggers write them; expected values by the JDK's own readers or written out by hand. */
final class CellAndStampTest {
    private static double number(String cell, char mark) {
        CellNumber parser = new CellNumber(mark);
        assertEquals(Series.Flag.VALID, flag(parser, cell, ""), cell);
        return parser.value();
    }

    private static double epoch(String instant) {
        return Instant.parse(instant).getEpochSecond();
    }

    private static Series.Flag flag(CellNumber parser, String cell, String unit) {
        String framed = "xx" + cell + "yy";
        return parser.parse(framed.toCharArray(), 2, cell.length(), unit);
    }

    @Test
    void readsNumbersOfEitherMark() {
        assertEquals(1234.5, number("1.234,5", ','));
        assertEquals(1234.5, number("1,234.5", '.'));
        assertEquals(1234.5, number("1\u00a0234,5", ','));
        assertEquals(1234.5, number("1\u202f234,5", ','));
        assertEquals(1234.5, number("1'234.5", '.'));
        assertEquals(-12.5, number("\u221212.5", '.'));
        assertEquals(1500.0, number(" 1.5E+03 ", '.'));
        assertEquals(0.0015, number("1,5E-3", ','));
    }

    @Test
    void tellsWhyACellHoldsNoNumber() {
        CellNumber point = new CellNumber('.');
        assertEquals(Series.Flag.EMPTY, flag(point, "  ", ""));
        for (String over : new String[] {"9.9E37", "+9.9E37", "-9.9E37", "OVER", "ovld", "1e999", "-Inf"}) {
            assertEquals(Series.Flag.OVER_RANGE, flag(point, over, ""), over);
        }
        for (String word : new String[] {"9.91E37", "NaN", "1.5f", "2d", "0x1p3", "1,234", "--", "1.2.3", "e", "on"}) {
            assertEquals(Series.Flag.NOT_A_NUMBER, flag(point, word, ""), word);
            assertTrue(Double.isNaN(point.value()));
        }
        assertEquals(Series.Flag.NOT_A_NUMBER, flag(new CellNumber(','), "1.234", ""));
    }

    @Test
    void takesTheColumnsOwnUnitBehindTheNumber() {
        CellNumber point = new CellNumber('.');
        assertEquals(Series.Flag.VALID, flag(point, "23.4 \u00b0C", "\u00b0C"));
        assertEquals(23.4, point.value());
        assertEquals(Series.Flag.NOT_A_NUMBER, flag(point, "12.1V", "A"));
    }

    @Property(tries = 300)
    void agreesWithTheJdkOnNumbers(@ForAll @BigRange(min = "-1e6", max = "1e6") BigDecimal decimal) {
        String text = decimal.toPlainString();
        assertEquals(Double.parseDouble(text), number(text, '.'));
        assertEquals(Double.parseDouble(text), number(text.replace('.', ','), ','));
    }

    @Property(tries = 300)
    void agreesWithTheJdkOnStamps(@ForAll @LongRange(min = 0, max = 4_000_000_000L) long drawn) {
        ZoneId zone = ZoneId.of("Europe/Vienna");
        Instant instant = Instant.ofEpochSecond(drawn);
        double second = drawn;
        LocalDateTime local = LocalDateTime.ofInstant(instant, zone);
        double expected = local.atZone(zone).toEpochSecond();
        String date = "%02d.%02d.%04d %02d:%02d:%02d"
                .formatted(
                        local.getDayOfMonth(),
                        local.getMonthValue(),
                        local.getYear(),
                        local.getHour(),
                        local.getMinute(),
                        local.getSecond());
        assertEquals(expected, new PatternStamps("dd.MM.yyyy HH:mm:ss", zone).seconds(date));
        assertEquals(second, new IsoStamps(zone).seconds(instant.toString()));
        String offset = local.atOffset(zone.getRules().getOffset(instant)).toString();
        assertEquals(second, new IsoStamps(ZoneOffset.UTC).seconds(offset));
    }

    @Test
    void readsTwelveHourClocksEndOfDayAndFractions() {
        PatternStamps twelve = new PatternStamps("M/d/yyyy h:mm:ss a", ZoneOffset.UTC);
        assertEquals(epoch("2026-03-09T00:05:00Z"), twelve.seconds("3/9/2026 12:05:00 AM"));
        assertEquals(epoch("2026-03-09T12:05:00Z"), twelve.seconds("3/9/2026 12:05:00 PM"));
        IsoStamps iso = new IsoStamps(ZoneOffset.UTC);
        assertEquals(epoch("2026-03-10T00:00:00Z"), iso.seconds("2026-03-09T24:00:00"));
        assertEquals(0.25, iso.seconds("2026-03-09T10:00:00.250+01:00") % 1.0);
        assertEquals(
                0.5, new PatternStamps("dd.MM.yy HH:mm:ss,SSS", ZoneOffset.UTC).seconds("09.03.26 10:00:00,500") % 1.0);
        assertTrue(Double.isNaN(iso.seconds("2026-02-30T10:00:00")));
        assertTrue(Double.isNaN(iso.seconds("2026-03-09T10:61:00")));
        assertTrue(Double.isNaN(iso.seconds("2026-03-09T10:00:00+0x:00")));
        assertThrows(IllegalArgumentException.class, () -> new PatternStamps("HH:mm:ss", ZoneOffset.UTC));
    }

    @Test
    void readsElapsedTimeAsNumberOrAsHours() {
        ElapsedStamps point = new ElapsedStamps(1000.0, false, '.');
        assertEquals(1012.5, point.seconds("12.5"));
        assertEquals(1090.25, point.seconds("00:01:30.250"));
        assertEquals(91605.0, point.seconds("25:10:05"));
        assertTrue(Double.isNaN(point.seconds("soon")));
    }
}
