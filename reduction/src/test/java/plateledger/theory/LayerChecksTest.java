package plateledger.theory;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;

/** The checks at numbers worked by hand, and the budget of the theory's own uncertainty. */
final class LayerChecksTest {
    private static List<Finding> tripped(double wireM, double perMetre) {
        return LayerChecks.tripped("B01", Place.NOWHERE, 0.05, wireM, 0.1125, perMetre);
    }

    /** U/ν = 1.3e6: wire 1.7 mm gives 2210; X = 0.0913 m at the first station, Re_θ = 0.037 (1.19e5)^0.8 = 425. */
    @Test
    void aSoundTripRaisesNothing() {
        assertEquals(List.of(), tripped(1.7e-3, 1.3e6));
    }

    /** U/ν = 5e5: wire 1.6 mm gives 800 &lt; 850; Re_θ at the first station about 220 &lt; 320. */
    @Test
    void aThinWireAndAYoungLayerAreTold() {
        List<Finding> findings = tripped(1.6e-3, 5e5);
        assertEquals(
                List.of("THEORY-TRIP-WIRE", "THEORY-RE-THETA"),
                findings.stream().map(Finding::id).toList());
        assertEquals(Level.CAUTION, findings.get(0).level());
        assertTrue(findings.get(0).found().contains("800"), findings.get(0).message());
        assertTrue(findings.get(0).remedy().contains("1.7 mm"), findings.get(0).message());
        assertEquals(Level.NOTE, findings.get(1).level());
    }

    @Test
    void anUnknownFlowIsNeverPassed() {
        assertEquals(2, tripped(1.7e-3, Double.NaN).size());
    }

    @Test
    void aLongLaminarLayerIsDoubted() {
        assertEquals(List.of(), LayerChecks.laminar("B02", Place.NOWHERE, 0.5, 9.9e5));
        assertEquals(
                "THEORY-LAMINAR-RE",
                LayerChecks.laminar("B02", Place.NOWHERE, 0.5, 1.01e6).get(0).id());
    }

    /** The declared totals, k = 2: 1.5 % laminar, 6 % turbulent; each part is real. */
    @Test
    void partsOfTheUncertaintyMakeUpItsTotal() {
        assertEquals(0.015, 2.0 * TheoryUncertainty.standard(LayerLaw.LAMINAR), 1e-15);
        assertEquals(0.06, 2.0 * TheoryUncertainty.standard(LayerLaw.TURBULENT), 1e-15);
        for (LayerLaw law : LayerLaw.values()) {
            double sum = 0.0;
            for (TheoryUncertainty.Part part : TheoryUncertainty.parts(law)) {
                assertTrue(part.standard() > 0.0, part.toString());
                sum += part.standard() * part.standard();
            }
            assertEquals(TheoryUncertainty.standard(law), Math.sqrt(sum), 1e-15);
        }
    }
}
