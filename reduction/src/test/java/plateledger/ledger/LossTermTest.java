package plateledger.ledger;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import plateledger.validation.Published;
import plateledger.validation.PublishedTable;
import plateledger.validation.Recorded;

/** Each loss by hand, radiation against published examples, soaking against the series of a slab. */
final class LossTermTest {
    /** 0.97·0.95·5.670374419e-8·(333.15⁴ − 295.15⁴): 333.15⁴ = 1.23185409e10, 295.15⁴ = 7.5887658e9. */
    @Test
    void radiationByHand() {
        double perKelvinFourth = 0.9215 * 5.670374419e-8;
        assertEquals(
                perKelvinFourth * (1.23185409e10 - 7.5887658e9),
                LossTerm.Radiation.flux(0.97, 0.95, 333.15, 295.15),
                1e-4);
        assertEquals(0.0, LossTerm.Radiation.flux(0.97, 0.95, 300.0, 300.0), 0.0);
        assertEquals(
                -LossTerm.Radiation.flux(1.0, 0.5, 310.0, 290.0), LossTerm.Radiation.flux(1.0, 0.5, 290.0, 310.0), 0.0);
    }

    /** A black face at 300 K: 4·5.670374419e-8·2.7e7 = 6.124 004 4 W/(m² K). */
    @Test
    void radiationSlopeByHand() {
        assertEquals(6.1240044, LossTerm.Radiation.slope(1.0, 1.0, 300.0), 1e-6);
        double difference =
                LossTerm.Radiation.flux(0.9, 0.8, 320.5, 295.0) - LossTerm.Radiation.flux(0.9, 0.8, 319.5, 295.0);
        assertEquals(difference, LossTerm.Radiation.slope(0.9, 0.8, 320.0), 1e-5 * difference);
    }

    @Test
    void conductionAndLeadsByHand() {
        assertEquals(9.2, LossTerm.Back.flux(0.46, 316.15, 296.15), 1e-12); // 0.46·20
        assertEquals(1.5, LossTerm.Edge.rateWPerM(0.05, 310.0, 295.0), 1e-12); // 2·0.05·15
        assertEquals(-0.25, LossTerm.EndConduction.rateW(0.05, 295.0, 300.0), 1e-12); // 0.05·(−5)
        assertEquals(0.0225, LossTerm.Lead.rateW(1.5, 0.01), 1e-15); // 2.25·0.01
    }

    /** 3.77e6·0.5e-3 = 1885 and 6.6e4·0.05/3 = 1100 J/(m² K). */
    @Test
    void storageByHand() {
        assertEquals(2985.0, LossTerm.Storage.capacityJPerM2K(3.77e6, 0.5e-3, 6.6e4, 0.05), 1e-9);
        assertEquals(0.0092, LossTerm.Storage.soakWPerM2K(0.46, 0.01), 1e-15);
    }

    /** Over a window of one τ from t = τ: (e⁻¹ − e⁻²) = 0.232 544 158; a sheet of τ_s = τ/5 makes it 1/0.8 of that. */
    @Test
    void soakingIsTheMeanOverTheWindow() {
        double u = 1.0;
        double foam = 1000.0 * Math.PI * Math.PI; // τ = 1000 s
        assertEquals(0.232544158, LossTerm.Storage.soakShare(u, foam, 0.0, 1000.0, 2000.0), 1e-9);
        assertEquals(0.232544158 / 0.8, LossTerm.Storage.soakShare(u, foam, 200.0, 1000.0, 2000.0), 1e-9);
        assertEquals(
                0.0,
                LossTerm.Storage.soakShare(u, foam, 200.0, Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY),
                0.0);
    }

    @Test
    void everyTermSaysWhatItIs() {
        List<LossTerm> all = LossTerm.all();
        Set<String> numbers = new HashSet<>();
        for (LossTerm term : all) {
            String equation = term.equation();
            assertTrue(equation.matches(".*\\(L-[2-7]\\)"), equation);
            numbers.add(equation.substring(equation.lastIndexOf('(')));
            assertTrue(!term.label().isBlank() && !term.source().isBlank());
        }
        assertEquals(6, numbers.size());
    }

    /**
     * The slab of the cases has its far face insulated, ours has it held. Half its flux, Σ exp(−(n − ½)²π²Fo), is at four
     * times our Fo our slowest mode exp(−π²Fo/4) and exp(−9π²Fo/4), …: the latter is added to the tolerance.
     */
    @Test
    @Tag("validation")
    @Published(
            section = "Heat ledger",
            what = "heat soaking into the insulation after a step",
            source = "series of a slab worked out independently (case E4, see soak-cases.csv)")
    void soakingAgainstTheSlabSeries() {
        Map<String, Double> e4 = new HashMap<>();
        for (CSVRecord row : PublishedTable.rows(LossTermTest.class, "soak-cases.csv")) {
            if (!row.get("name").equals("note")) {
                e4.put(row.get("name"), Double.valueOf(row.get("value")));
            }
        }
        double u = get(e4, "foam_k") / get(e4, "foam_L");
        double foam = get(e4, "foam_rho_c") * get(e4, "foam_L");
        double time = get(e4, "foam_diffusion_time_L2/alpha");
        for (String text : List.of("0.5", "1", "2")) {
            double fo = Double.parseDouble(text);
            double t = 0.25 * time * fo;
            double share = LossTerm.Storage.soakShare(u, foam, 0.0, t - 0.5, t + 0.5);
            double series = 0.5 * get(e4, "q*(Fo=" + text + ")");
            double next = Math.exp(-9.0 * Math.PI * Math.PI * fo / 4.0);
            Recorded.assertEquals(series, share, 1.01 * next + 1e-6 * series, "Fo " + text);
        }
        double t = get(e4, "time_for_soak_flux_to_fall_to_1pct_of_kdT/L") / 4.0;
        Recorded.assertEquals(0.005, LossTerm.Storage.soakShare(u, foam, 0.0, t - 0.5, t + 0.5), 1e-8, "1 %");
    }

    private static double get(Map<String, Double> values, String name) {
        Double value = values.get(name);
        return value == null ? fail("no value " + name) : value;
    }

    @Test
    @Tag("validation")
    @Published(
            section = "Heat ledger",
            what = "textbook examples of radiation",
            source = "published examples RD01, RD02, RD06, RD07, RD08, RD15, RD17, RD20 (see radiation-examples.csv)")
    void radiationAgainstPublishedExamples() {
        Example rd01 = new Example("RD01");
        rd01.check("E", rd01.flux(1.0, rd01.in("eps"), rd01.in("T_s"), 0.0));
        rd01.check("G", rd01.flux(1.0, 1.0, rd01.in("T_sur"), 0.0));
        double both = rd01.in("h") * (rd01.in("T_s") - rd01.in("T_sur"))
                + rd01.flux(1.0, rd01.in("eps"), rd01.in("T_s"), rd01.in("T_sur"));
        rd01.check("q per length", Math.PI * rd01.in("d") * both);

        Example rd02 = new Example("RD02");
        double left = rd02.in("P") / rd02.in("A") - rd02.flux(1.0, rd02.in("eps"), rd02.in("T_s"), rd02.in("T_sur"));
        rd02.check("V", Math.pow(left / rd02.in("C") / (rd02.in("T_s") - rd02.in("T_sur")), 1.25));

        Example rd06 = new Example("RD06");
        rd06.check("q", 1e-3 * rd06.flux(1.0, 1.0, rd06.in("T1"), rd06.in("T2")));

        Example rd07 = new Example("RD07");
        double pipe = rd07.in("h") * (rd07.in("T_w") - rd07.in("T_inf"))
                + rd07.flux(1.0, rd07.in("eps"), rd07.in("T_w"), rd07.in("T_inf"));
        rd07.check("q per length", Math.PI * rd07.in("d") * pipe);

        Example rd08 = new Example("RD08");
        double rectangles = rd08.flux(rd08.in("F12_chart"), 1.0, rd08.in("T1"), rd08.in("T2"));
        rd08.check("q", 1e-3 * rd08.in("L") * rd08.in("W") * rectangles);

        Example rd15 = new Example("RD15");
        double plates = 1.0 / rd15.in("e1") + 1.0 / rd15.in("e2") - 1.0;
        double shield = 2.0 / rd15.in("e_sh") - 1.0;
        rd15.check("q", rd15.flux(1.0, 1.0 / plates, rd15.in("T1"), rd15.in("T2")));
        rd15.check("q with shield", rd15.flux(1.0, 1.0 / (plates + shield), rd15.in("T1"), rd15.in("T2")));

        Example rd17 = new Example("RD17");
        double furnace = rd17.flux(1.0 - rd17.in("F12"), 1.0, rd17.in("T1"), rd17.in("T3"))
                + rd17.flux(rd17.in("F12"), 1.0, rd17.in("T1"), rd17.in("T2"));
        rd17.check("Q", 1e-3 * rd17.in("A") * furnace);

        Example rd20 = new Example("RD20");
        double rod = rd20.flux(1.0, rd20.in("eps"), rd20.in("T1"), rd20.in("T2"));
        rd20.check("q per length", Math.PI * rd20.in("d") * rod);
        rd20.check("h_r", rod / (rd20.in("T1") - rd20.in("T2")));
    }

    /** One published example; its own σ takes the place of ours, so that nothing but the formula is compared. */
    private static final class Example {
        private final String id;
        private final List<CSVRecord> rows;
        private final Map<String, Double> inputs = new HashMap<>();

        Example(String id) {
            this.id = id;
            rows = PublishedTable.rows(LossTermTest.class, "radiation-examples.csv").stream()
                    .filter(row -> row.get("id").equals(id))
                    .toList();
            for (String input : rows.get(0).get("inputs").split("; ", -1)) {
                String[] parts = input.split("[= ]", 3);
                inputs.put(parts[0], Double.valueOf(parts[1]));
            }
        }

        double in(String name) {
            return get(inputs, name);
        }

        double flux(double exchange, double emissivity, double surfaceK, double wallK) {
            return LossTerm.Radiation.flux(exchange, emissivity, surfaceK, wallK)
                    * in("sigma")
                    / LossTerm.Radiation.STEFAN_BOLTZMANN;
        }

        void check(String quantity, double actual) {
            CSVRecord row = rows.stream()
                    .filter(r -> r.get("quantity").equals(quantity))
                    .findFirst()
                    .orElseGet(() -> fail(id + " has no " + quantity));
            assertEquals("OK", row.get("mark"), row.toString());
            String text = row.get("published");
            int decimals = text.contains(".") ? text.length() - text.indexOf('.') - 1 : 0;
            double half = 0.5 * Math.pow(10.0, -decimals);
            Recorded.assertEquals(Double.parseDouble(text), actual, half, row.toString());
            double recomputed = PublishedTable.number(row, "recomputed");
            assertEquals(recomputed, actual, 1e-7 * Math.abs(recomputed), row.toString());
        }
    }
}
