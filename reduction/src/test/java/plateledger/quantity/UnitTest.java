package plateledger.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Spellings and factors; factors from the SI Brochure, 9th ed., tables 7 and 8. */
final class UnitTest {
    @ParameterizedTest
    @CsvSource({
        "W/m2K, WATT_PER_M2_K",
        "W/m²K, WATT_PER_M2_K",
        "W/(m2 K), WATT_PER_M2_K",
        "W/(m²·K), WATT_PER_M2_K",
        "W/m^2 K, WATT_PER_M2_K",
        "W/mK, WATT_PER_M_K",
        "W/(m K), WATT_PER_M_K",
        "W/m·K, WATT_PER_M_K",
        "W / (m K), WATT_PER_M_K",
        "J/m3K, JOULE_PER_M3_K",
        "J/(m³ K), JOULE_PER_M3_K",
        "um, MICROMETRE",
        "µm, MICROMETRE",
        "μm, MICROMETRE",
        "degC, CELSIUS",
        "C, CELSIUS",
        "℃, CELSIUS",
        "ohm, OHM",
        "Ω, OHM",
        "mohm, MILLIOHM",
        "' mbar ', MILLIBAR",
        "h, HOUR",
        "min, MINUTE",
        "%, PERCENT",
        "1, ONE"
    })
    void readsSpellings(String spelling, Unit unit) {
        assertEquals(unit, Unit.find(spelling).orElseThrow());
    }

    @ParameterizedTest
    @CsvSource({
        "°C, 20, 293.15",
        "mV, 5, 0.005",
        "hPa, 1013.25, 101325",
        "kPa, 98, 98000",
        "mbar, 1013.25, 101325",
        "km/h, 36, 10",
        "min, 10, 600",
        "h, 2, 7200",
        "%, 1.5, 0.015",
        "mA, 250, 0.25",
        "µm, 50, 5e-5",
        "mΩ, 10, 0.01"
    })
    void convertsToSi(String spelling, double number, double si) {
        assertEquals(si, Unit.find(spelling).orElseThrow().toSi(number), 1e-15 * Math.abs(si));
    }

    @Test
    void otherSpellingsAreRefused() {
        for (String wrong : new String[] {"", "w", "k", "PA", "m s", "m/s/s", "W/(m2)K", "mmm", "°F", "W/K m2"}) {
            assertTrue(Unit.find(wrong).isEmpty(), wrong);
        }
    }

    @Test
    void kelvinServesTemperaturesAndDifferencesCelsiusOnlyTemperatures() {
        assertTrue(Unit.KELVIN.fits(Dimension.TEMPERATURE));
        assertTrue(Unit.KELVIN.fits(Dimension.TEMPERATURE_DIFFERENCE));
        assertEquals("°C", Unit.CELSIUS.symbol());
        assertTrue(!Unit.CELSIUS.fits(Dimension.TEMPERATURE_DIFFERENCE));
    }
}
