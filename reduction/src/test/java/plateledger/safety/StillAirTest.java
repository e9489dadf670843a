package plateledger.safety;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static plateledger.validation.PublishedTable.number;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import plateledger.fluid.FluidState;
import plateledger.rig.Plate;
import plateledger.safety.StillAir.Face;
import plateledger.validation.PublishedTable;
import plateledger.validation.ValidationRecorder;

/** {@link StillAir} against a worked case and against its own limits. */
final class StillAirTest {
    private static final double AIR_K = 295.15;

    private static double expected(String name) {
        return PublishedTable.rows(StillAirTest.class, "flow-failure.csv").stream()
                .filter(row ->
                        row.get("kind").equals("output") && row.get("name").equals(name))
                .mapToDouble(row -> number(row, "value"))
                .findFirst()
                .orElseThrow();
    }

    /** 1.0 × 0.3 m face up, 1500 W/m², ε 0.1, U_b 0.6; k 0.0263, ν 1.589e-5, α 2.25e-5 held fixed as in the case. */
    @Test
    @Tag("validation")
    void workedCase() {
        FluidState air = new FluidState(1.17, 1.589e-5 * 1.17, 0.0263, 0.0263 / (1.17 * 2.25e-5));
        Face face = new Face(1.0, 0.3, Plate.Orientation.FACE_UP, 0.10, 0.6);
        try (ValidationRecorder check = ValidationRecorder.of(
                StillAirTest.class,
                "Safety",
                "plate temperature without flow, face up",
                "independent solution of the balance by bracketing; Nu = 0.15 Ra^⅓, Incropera and DeWitt, chapter 9")) {
            double t = StillAir.temperatureK(1500.0, face, AIR_K, film -> air);
            check.relative(expected("T_flow_failure"), t, 1e-10, "T");
            check.relative(expected("h_natural"), StillAir.convection(t, face, AIR_K, film -> air), 1e-9, "h");
            check.relative(
                    expected("q_max_that_keeps_353.15K_without_flow"),
                    StillAir.fluxOut(353.15, face, AIR_K, film -> air),
                    1e-10,
                    "q");
        }
    }

    /** Face down convects least, so it gets hottest; no flux, no rise. */
    @Test
    void orientationAndZero() {
        double up = temperature(Plate.Orientation.FACE_UP, 800.0);
        double down = temperature(Plate.Orientation.FACE_DOWN, 800.0);
        double vertical = temperature(Plate.Orientation.VERTICAL, 800.0);
        assertTrue(down > up && down > vertical, down + " " + up + " " + vertical);
        assertEquals(AIR_K, temperature(Plate.Orientation.FACE_UP, 0.0), 1e-6);
    }

    private static double temperature(Plate.Orientation orientation, double flux) {
        return StillAir.temperatureK(flux, new Face(0.4, 0.3, orientation, 0.95, 0.46), AIR_K, StillAir::air);
    }
}
