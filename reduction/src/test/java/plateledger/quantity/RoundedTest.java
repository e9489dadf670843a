package plateledger.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Locale;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Numbers rounded to their uncertainty. */
final class RoundedTest {
    /** JCGM 100:2008, 7.2.6: 10.057 62 Ω with u_c = 27 mΩ is to be written 10.058 Ω. */
    @Test
    @Tag("validation")
    void roundsTheResistanceOfTheGuide() {
        assertEquals("10.058 Ω, u = 0.027 Ω", Rounded.text(Estimate.of(10.05762, 0.027), Unit.OHM));
    }

    /** JCGM 100:2008, 7.2.2: m_s = 100.021 47 g with u_c = 0.35 mg. Here in kg times 1000, since g is no unit of ours. */
    @Test
    @Tag("validation")
    void roundsTheMassOfTheGuide() {
        assertEquals("100.02147 g, u = 0.00035 g", Rounded.text(Estimate.of(100.02147, 0.00035), "g"));
    }

    @ParameterizedTest
    @CsvSource({
        "20.4567, 0.0321, 20.457, 0.032",
        "20.4567, 0.0996, 20.46, 0.10",
        "20.4567, 0.5, 20.46, 0.50",
        "234567, 1234, 234600, 1200",
        "234567, 12345, 235000, 12000",
        "-0.004, 0.03, -0.004, 0.030",
        "0.0001, 0.03, 0.000, 0.030",
        "1.234567e-7, 3.2e-9, 1.235e-7, 3.2e-9",
        "3.77e12, 1.1e11, 3.77e12, 1.1e11",
        "20.4567891, 0, 20.4568, 0",
        "0, 0, 0, 0"
    })
    void roundsTheValueToThePlaceOfItsUncertainty(double value, double u, String shownValue, String shownU) {
        assertEquals(shownValue, Rounded.value(Estimate.of(value, u)));
        assertEquals(shownU, Rounded.uncertainty(Estimate.of(value, u)));
    }

    @Test
    void aTemperatureShowsItsUncertaintyInKelvin() {
        assertEquals("25.00 °C, u = 0.10 K", Rounded.text(Estimate.of(298.15, 0.1), Unit.CELSIUS));
    }

    @Test
    void whatIsNotKnownSaysSo() {
        assertEquals("not known", Rounded.text(Estimate.of(Double.NaN, Double.NaN), Unit.WATT));
    }

    @Test
    void theDecimalMarkIsAPointInEveryLocale() {
        Locale former = Locale.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            assertEquals("0.50 W, u = 0.10 W", Rounded.text(Estimate.of(0.5, 0.1), Unit.WATT));
            assertEquals("0.5 m", QuantityText.text(0.5, Unit.METRE));
        } finally {
            Locale.setDefault(former);
        }
    }
}
