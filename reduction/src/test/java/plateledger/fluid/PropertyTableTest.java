package plateledger.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import plateledger.finding.RefusedException;
import plateledger.quantity.Temperature;

/** {@link PropertyTable}: rows, text, refusals. */
final class PropertyTableTest {
    /** Values at 27 °C, 80 % and 101325 Pa: CIPM-2007 gives ρ = 1.16391 kg/m³ and x_v = 0.028289. */
    @Test
    void rowsHoldThePublishedState() throws RefusedException {
        PropertyTable table = PropertyTable.of("air", Temperature.ofCelsius(27.0), 101325.0, 0.8);
        assertEquals(1.16391, table.rows().get(0).value(), 5e-5);
        assertEquals(1.16391 * 0.0005, table.rows().get(0).standardUncertainty(), 1e-7);
        assertEquals(0.028289, table.rows().get(7).value(), 5e-6);
        List<String> lines = table.lines();
        assertEquals("air at 27.00 °C, 101.325 kPa, relative humidity 80.0 %", lines.get(0));
        assertTrue(lines.get(2).matches("density +ρ +1\\.16394? +0\\.00058 +kg/m³ +Lemmon.*"), lines.get(2));
        assertTrue(
                lines.get(4).matches("viscosity +μ +1\\.\\d{3}e-05 +\\d\\.\\de-\\d\\d +Pa s +Lemmon.*"), lines.get(4));
    }

    /** Every fault is named at once. */
    @Test
    void refusesWhatIsOutOfRange() {
        RefusedException refused = assertThrows(
                RefusedException.class, () -> PropertyTable.of("honey", Temperature.ofCelsius(-5.0), 30e3, 1.2));
        assertEquals(4, refused.findings().size());
        assertTrue(
                String.valueOf(refused.getMessage()).contains("pressure: found 30.00 kPa; expected 50 kPa to 200 kPa"));
        RefusedException wet = assertThrows(
                RefusedException.class, () -> PropertyTable.of("air", Temperature.ofCelsius(90.0), 101325.0, 0.9));
        assertTrue(
                String.valueOf(wet.getMessage()).contains("mole fraction of water"), String.valueOf(wet.getMessage()));
    }
}
