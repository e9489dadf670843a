package plateledger.gui.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import plateledger.quantity.Estimate;

final class NumberTextTest {
    /** Factors t_95(v): JCGM 100:2008, table G.2, printed to two decimals, hence the tolerance of half a unit. */
    @Test
    void intervalUsesStudentFactorOfTheDegreesOfFreedom() {
        assertEquals(2.57, NumberText.u95(new Estimate(10.0, 1.0, 5.0)), 0.005);
        assertEquals(2.23, NumberText.u95(new Estimate(10.0, 1.0, 10.0)), 0.005);
        assertEquals(1.960, NumberText.u95(Estimate.of(10.0, 1.0)), 0.0005);
    }

    @Test
    void valueIsRoundedToTwoDigitsOfItsInterval() {
        assertEquals("1734 ± 51", NumberText.withInterval(1734.4, 51.3));
        assertEquals("300.0 ± 8.8", NumberText.withInterval(300.0, 8.82));
        assertEquals("62\u202f500 ± 1100", NumberText.withInterval(62_480.0, 1_140.0));
        assertEquals("−0.0120 ± 0.0034", NumberText.withInterval(-0.01203, 0.00341));
    }

    @Test
    void longNumbersAreGrouped() {
        assertEquals("1\u202f250\u202f000 ± 13\u202f000", NumberText.withInterval(1.25e6, 1.3e4));
        assertEquals("12\u202f345.68 ± 0.12", NumberText.withInterval(12_345.678, 0.12));
        assertEquals("1235", NumberText.plain(1_234.6));
    }

    @Test
    void whatIsNotKnownIsADashAndExactValuesStandAlone() {
        assertEquals("–", NumberText.withInterval(Double.NaN, 1.0));
        assertEquals("50", NumberText.withInterval(50.0, 0.0));
        assertTrue(Double.isNaN(NumberText.u95(new Estimate(Double.NaN, 0.0, 5.0))));
    }

    @Test
    void decimalMarkIsAPointInEveryLocale() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            assertEquals("300.0 ± 8.8", NumberText.withInterval(300.0, 8.82));
            Locale.setDefault(Locale.forLanguageTag("ar-EG"));
            assertEquals("300.0 ± 8.8", NumberText.withInterval(300.0, 8.82));
        } finally {
            Locale.setDefault(before);
        }
    }
}
