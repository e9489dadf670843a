package plateledger.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import plateledger.quantity.QuantityFormatException.Fault;
import plateledger.quantity.Stated.Meaning;

/** Every form of a quantity, and what is said when it is none. Expected numbers are converted by hand. */
final class QuantityTextTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "600 mm ± 0.5 mm (k=2)             | LENGTH   | 0.6     | 0.0005  | EXPANDED | 2",
                "600 mm +/- 0.5 mm (k = 2.0)       | LENGTH   | 0.6     | 0.0005  | EXPANDED | 2",
                "600mm±0.5mm(limits)               | LENGTH   | 0.6     | 0.0005  | LIMITS   | 1",
                "0.6 m ± 0.5 mm (limits)           | LENGTH   | 0.6     | 0.0005  | LIMITS   | 1",
                "600 mm, u = 0.25 mm               | LENGTH   | 0.6     | 0.00025 | STANDARD | 1",
                "600 mm, u = 0.1 %                 | LENGTH   | 0.6     | 0.0006  | STANDARD | 1",
                "600 mm ± 0.1 % (k=2)              | LENGTH   | 0.6     | 0.0006  | EXPANDED | 2",
                "-600 mm, u = 0.1 %                | LENGTH   | -0.6    | 0.0006  | STANDARD | 1",
                "−3 K, u = 0.1 K                   | TEMPERATURE_DIFFERENCE | -3 | 0.1 | STANDARD | 1",
                "50 mm (exact)                     | LENGTH   | 0.05    | 0       | EXACT    | 1",
                "0.95 ± 0.02 (limits)              | NUMBER   | 0.95    | 0.02    | LIMITS   | 1",
                "0.95, u = 2 %                     | NUMBER   | 0.95    | 0.019   | STANDARD | 1",
                "1.5 %, u = 0.3 %                  | NUMBER   | 0.015   | 0.003   | STANDARD | 1",
                "0, u = 0.0005                     | NUMBER   | 0       | 0.0005  | STANDARD | 1",
                "25 °C, u = 0.1 K                  | TEMPERATURE | 298.15 | 0.1  | STANDARD | 1",
                "300 K ± 0.5 K (limits)            | TEMPERATURE | 300  | 0.5     | LIMITS   | 1",
                "3.77e6 J/m3K, u = 3 %             | HEAT_CAPACITY_PER_VOLUME | 3.77e6 | 113100 | STANDARD | 1",
                "0.46 W/(m2 K), u = 0.05 W/m²K     | CONDUCTANCE_PER_AREA | 0.46 | 0.05 | STANDARD | 1",
                "50 um ± 15 µm (limits)            | LENGTH   | 5e-5    | 1.5e-5  | LIMITS   | 1",
            })
    void readsEveryForm(String text, Dimension dimension, double value, double half, Meaning meaning, double k)
            throws QuantityFormatException {
        Stated stated = QuantityText.parse(text, dimension);
        assertEquals(value, stated.value(), 1e-15 * Math.abs(value));
        assertEquals(half, stated.halfWidth(), 1e-15 * half);
        assertEquals(meaning, stated.meaning());
        assertEquals(k, stated.coverage());
        assertEquals(Double.POSITIVE_INFINITY, stated.dof());
    }

    @Test
    void readsDegreesOfFreedom() throws QuantityFormatException {
        assertEquals(
                9.0,
                QuantityText.parse("600 mm, u = 0.25 mm, dof = 9", Dimension.LENGTH)
                        .dof());
        assertEquals(
                9.0,
                QuantityText.parse("600 mm ± 0.6 mm (k=2.26, dof=9)", Dimension.LENGTH)
                        .dof());
    }

    @Test
    void aNumberAfterPlusMinusMustSayWhatItIs() {
        QuantityFormatException refused = refused("600 mm ± 0.5 mm", Dimension.LENGTH);
        assertEquals(Fault.MEANING, refused.fault());
        assertTrue(refused.found().contains("± 0.5 mm"), refused.found());
        for (String way : new String[] {
            "600 mm ± 0.5 mm (k=2)", "600 mm ± 0.5 mm (limits)", "600 mm, u = 0.5 mm", "600 mm (exact)"
        }) {
            assertTrue(refused.remedy().contains("\"" + way + "\""), refused.remedy());
        }
        assertEquals(
                Fault.MEANING,
                refused("600 mm ± 0.5 mm (95 %)", Dimension.LENGTH).fault());
        assertEquals(
                Fault.MEANING,
                refused("600 mm ± 0.5 mm (k=0)", Dimension.LENGTH).fault());
    }

    @Test
    void aMeasuredQuantityNeedsAnUncertaintyAndTheWaysAreShown() {
        QuantityFormatException refused = refused("600 mm", Dimension.LENGTH);
        assertEquals(Fault.UNCERTAINTY, refused.fault());
        assertTrue(refused.remedy().contains("\"600 mm (exact)\""), refused.remedy());
    }

    @Test
    void aWrongDimensionNamesBoth() {
        QuantityFormatException refused = refused("12 V, u = 1 V", Dimension.LENGTH);
        assertEquals(Fault.DIMENSION, refused.fault());
        assertTrue(refused.found().contains("a voltage"), refused.found());
        assertTrue(refused.expected().contains("a length in one of: m, mm, cm, µm"), refused.expected());
    }

    @Test
    void theUncertaintyMustBeOfTheSameDimension() {
        assertEquals(
                Fault.DIMENSION, refused("12 mm, u = 1 V", Dimension.LENGTH).fault());
        assertEquals(
                Fault.DIMENSION,
                refused("25 °C, u = 0.1 °C", Dimension.TEMPERATURE).fault());
    }

    @Test
    void aMissingUnitShowsTheUnits() {
        QuantityFormatException refused = refused("600, u = 0.5 mm", Dimension.LENGTH);
        assertEquals(Fault.UNIT, refused.fault());
        assertTrue(refused.found().contains("\"600\" without a unit"), refused.found());
        assertEquals(Fault.UNIT, refused("600 mm, u = 0.5", Dimension.LENGTH).fault());
        assertEquals(Fault.UNIT, refused("1.5 %, u = 0.003", Dimension.NUMBER).fault());
    }

    @ParameterizedTest
    @ValueSource(strings = {"0 K, u = 5 %", "600 mm, u = 0 mm", "600 mm, u = -1 mm", "600 mm, u = 1 mm, dof = 0"})
    void anUncertaintyMustMeanSomething(String text) {
        Dimension dimension = text.contains("K") ? Dimension.TEMPERATURE_DIFFERENCE : Dimension.LENGTH;
        assertEquals(Fault.UNCERTAINTY, refused(text, dimension).fault());
    }

    @Test
    void aPercentageOfATemperatureIsRefused() {
        assertEquals(
                Fault.UNCERTAINTY,
                refused("25 °C, u = 1 %", Dimension.TEMPERATURE).fault());
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "mm", "600,5 mm (exact)", "1e999 mm (exact)", "NaN mm (exact)"})
    void numbersHaveAPointAndAreFinite(String text) {
        assertEquals(Fault.NUMBER, refused(text, Dimension.LENGTH).fault());
    }

    @ParameterizedTest
    @ValueSource(strings = {"6 furlong", "6 m m", "6 W/m/K", "6 MM", "6 1 000 mm", "6 mm)", "0x10 mm"})
    void unknownUnitsAreRefused(String text) {
        assertEquals(Fault.UNIT, refused(text + ", u = 1 mm", Dimension.LENGTH).fault());
    }

    @Test
    void temperaturesAreAboveAbsoluteZero() {
        assertEquals(
                Fault.NUMBER, refused("-274 °C (exact)", Dimension.TEMPERATURE).fault());
    }

    @Test
    void aSettingHasNoUncertainty() throws QuantityFormatException {
        assertEquals(4.0, QuantityText.setting("4 m/s", Dimension.SPEED));
        assertEquals(10.0, QuantityText.setting("36 km/h", Dimension.SPEED));
        assertEquals(308.15, QuantityText.setting("35C", Dimension.TEMPERATURE), 1e-12);
        assertEquals(98_000.0, QuantityText.setting("98kPa", Dimension.PRESSURE));
        QuantityFormatException refused = assertThrows(
                QuantityFormatException.class, () -> QuantityText.setting("4 m/s, u = 1 %", Dimension.SPEED));
        assertEquals(Fault.UNCERTAINTY, refused.fault());
    }

    private static QuantityFormatException refused(String text, Dimension dimension) {
        return assertThrows(QuantityFormatException.class, () -> QuantityText.parse(text, dimension));
    }
}
