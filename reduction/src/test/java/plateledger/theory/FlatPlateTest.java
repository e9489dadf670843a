package plateledger.theory;

import static org.junit.jupiter.api.Assertions.assertTrue;
import static plateledger.validation.Recorded.assertEquals;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import plateledger.validation.Published;

/** Formulas of the flat plate against cases worked independently, and against each other. */
final class FlatPlateTest {
    private static final LayerLaw LAMINAR = LayerLaw.LAMINAR;
    private static final LayerLaw TURBULENT = LayerLaw.TURBULENT;

    private static void meets(String id, double actual, double relative) {
        double expected = Reference.worked(id);
        assertEquals(expected, actual, relative * expected, id);
    }

    /** 11 to 12 digits given; tolerance 1e-10 for closed forms. */
    @Test
    @Published(
            section = "Theory",
            what = "textbook correlations",
            source = "independent computation of the published formulas")
    void textbookFormulasMeetTheWorkedCases() {
        meets("W01", Correlation.POHLHAUSEN_LOCAL.nusselt(1.2e5, 0.71), 1e-10);
        meets("W03", Correlation.KAYS_FLUX_LOCAL.nusselt(1.2e5, 0.71), 1e-10);
        meets("W05", Correlation.LIENHARD_FLUX_LOCAL.nusselt(1.2e5, 0.71), 1e-10);
        meets("W06", Correlation.CHURCHILL_OZOE_TEMPERATURE.nusselt(1.2e5, 0.71), 1e-10);
        meets("W07", Correlation.CHURCHILL_OZOE_FLUX.nusselt(1.2e5, 0.71), 1e-10);
        meets("W08", Correlation.CHURCHILL_OZOE_TEMPERATURE.nusselt(4.0e4, 6.1), 1e-10);
        meets("W09", Correlation.POHLHAUSEN_AVERAGE.nusselt(3.0e5, 0.70), 1e-10);
        meets("W10", Correlation.FLUX_AVERAGE_OVER_DIFFERENCE.nusselt(3.0e5, 0.70), 1e-10);
        meets("W11", Correlation.FLUX_AVERAGE_OF_H.nusselt(3.0e5, 0.70), 1e-10);
        meets("W12", Correlation.COLBURN_LOCAL.nusselt(2.5e6, 0.70), 1e-10);
        meets("W13", Correlation.COLBURN_FLUX.nusselt(2.5e6, 0.70), 1e-10);
        meets("W14", Correlation.KAYS_CRAWFORD_TEMPERATURE.nusselt(2.5e6, 0.70), 1e-10);
        meets("W15", Correlation.KAYS_CRAWFORD_FLUX.nusselt(2.5e6, 0.70), 1e-10);
        meets("W16", Correlation.GAS_TEMPERATURE.nusselt(2.5e6, 0.70), 1e-10);
        meets("W29", Correlation.COLBURN_AVERAGE.nusselt(2.0e6, 0.71), 1e-10);
    }

    /** The tool's own forms; 2e-7 is the interpolation of the laminar table, 1e-9 that of the beta table. */
    @Test
    @Published(
            section = "Theory",
            what = "forms used by the tool",
            source = "independent computation of the published formulas")
    void ownFormsMeetTheWorkedCases() {
        meets("W02", FlatPlate.uniformTemperature(LAMINAR, 1.2e5, 0.71), 2e-7);
        meets("W04", FlatPlate.uniformFlux(LAMINAR, 1.2e5, 0.71), 2e-7);
        meets("W14", FlatPlate.uniformTemperature(TURBULENT, 2.5e6, 0.70), 1e-10);
        meets(
                "K5",
                FlatPlate.uniformFlux(TURBULENT, 1e6, 0.7) / FlatPlate.uniformTemperature(TURBULENT, 1e6, 0.7),
                3e-9);
    }

    @Test
    @Published(
            section = "Theory",
            what = "unheated starting lengths",
            source = "independent computation with SciPy special functions")
    void unheatedLengthsMeetTheWorkedCases() {
        double temperature = Correlation.POHLHAUSEN_LOCAL.nusselt(1.2e5, 0.71);
        meets("W33", temperature * UnheatedLength.temperatureFactor(LAMINAR, 0.30), 1e-10);
        meets("S7", temperature * UnheatedLength.fluxFactor(LAMINAR, 0.30), 3e-9);
        double gas = Correlation.GAS_TEMPERATURE.nusselt(1.2e6, 0.71);
        meets("W34", gas * UnheatedLength.temperatureFactor(TURBULENT, 0.30), 1e-10);
        meets("S9", gas * UnheatedLength.fluxFactor(TURBULENT, 0.30), 3e-9);
        double average = Correlation.POHLHAUSEN_AVERAGE.nusselt(1.2e5, 0.71);
        meets("W35", average * UnheatedLength.averageTemperatureFactor(LAMINAR, 0.30), 1e-10);
        double turbulentAverage = 0.037 * Math.pow(1.2e6, 0.8) * Math.pow(0.71, 0.6);
        meets("W36", turbulentAverage * UnheatedLength.averageTemperatureFactor(TURBULENT, 0.30), 1e-10);
        meets("K4", UnheatedLength.fluxFactor(LAMINAR, 0.0), 3e-9);
    }

    /** Cases S1 and S2: 10 K at 0, 5 K at 0.10 m, −8 K at 0.25 m, by adding steps; digits as given. */
    @Test
    @Published(section = "Theory", what = "added steps of temperature", source = "independent computation")
    void addedStepsOfTemperatureMeetTheWorkedCases() {
        double[] places = {0.0, 0.10, 0.25};
        double[] steps = {10.0, 5.0, -8.0};
        int checked = 0;
        for (CSVRecord row : Reference.rows("worked-cases.csv")) {
            String id = row.get("id");
            if (!id.equals("S1") && !id.equals("S2")) {
                continue;
            }
            String output = row.get("output");
            double x = Double.parseDouble(output.substring(output.indexOf('=') + 1, output.indexOf(" m)")));
            LayerLaw law = id.equals("S1") ? LAMINAR : TURBULENT;
            Correlation form = id.equals("S1") ? Correlation.POHLHAUSEN_LOCAL : Correlation.GAS_TEMPERATURE;
            double h = form.extrapolated((id.equals("S1") ? 3.2e5 : 2.0e6) * x, 0.71) * 0.026 / x;
            double flux = 0.0;
            for (int i = 0; i < places.length; i++) {
                if (places[i] < x) {
                    flux += h * steps[i] * UnheatedLength.temperatureFactor(law, places[i] / x);
                }
            }
            double expected = Reference.number(row, "value");
            assertEquals(expected, flux, 1e-9 * Math.max(expected, 100.0), row.toString());
            checked++;
        }
        assertEquals(10, checked);
    }

    /** Case A: step of temperature at 0.3 L. Tolerance 0.15 %; the classical kernel misses by 2.7 %. */
    @Test
    @Published(
            section = "Theory",
            what = "step of temperature",
            source = "laminar energy equation marched independently")
    void stepOfTemperatureMeetsTheMarchedSolution() {
        int checked = 0;
        for (CSVRecord row : Reference.rows("marching-checks.csv")) {
            if (!row.get("case").startsWith("A")) {
                continue;
            }
            double x = Reference.number(row, "x_over_L");
            double nusselt = FlatPlate.stepOfTemperature(LAMINAR, 1.0, Reference.number(row, "Pr"), 0.3 / x);
            double expected = Reference.number(row, "numeric_value");
            assertEquals(expected, nusselt, 1.5e-3 * expected, row.toString());
            checked++;
        }
        assertEquals(14, checked);
    }

    /** r(0.71) = 0.841736280, r(0.72) = 0.847711684 from the tabulated similarity solution; rises R1 to R3. */
    @Test
    @Published(
            section = "Theory",
            what = "recovery factors and adiabatic rises",
            source = "independent similarity solution")
    void recoveryMeetsTheTabulation() {
        assertEquals(0.841736280, FlatPlate.exactLaminarRecovery(0.71), 2e-7);
        assertEquals(0.847711684, FlatPlate.exactLaminarRecovery(0.72), 2e-7);
        meets("R1", FlatPlate.exactLaminarRecovery(0.71) * 60.0 * 60.0 / (2.0 * 1006.0), 2e-7);
        meets("R2", FlatPlate.adiabaticRise(LAMINAR, 60.0, 0.71, 1006.0), 1e-10);
        meets("R3", FlatPlate.adiabaticRise(TURBULENT, 60.0, 0.71, 1006.0), 1e-10);
    }

    /** By hand at U/ν = 1e6, x_t = 0.1 m: θ = 0.664115·0.1/√1e5 = 2.10012e-4 m; (θ/0.037·15.8489)^1.25 = 0.0492665 m. */
    @Test
    void virtualOriginByHand() {
        assertEquals(0.1 - 0.0492665, FlatPlate.virtualOrigin(0.1, 1e6), 1e-7);
        assertTrue(Double.isNaN(FlatPlate.virtualOrigin(-0.1, 1e6)));
        assertTrue(Double.isNaN(FlatPlate.virtualOrigin(0.1, -1e-4, 1e6)));
        assertTrue(FlatPlate.virtualOrigin(0.1, 1e-4, 1e6) < FlatPlate.virtualOrigin(0.1, 1e6));
    }

    @Property
    void momentumIsContinuousAtTheTrip(
            @ForAll @DoubleRange(min = 0.01, max = 0.3) @Scale(6) double trip,
            @ForAll @DoubleRange(min = 1e5, max = 3e6) double perMetre) {
        double before = FlatPlate.momentumThickness(LAMINAR, trip, perMetre);
        double after = FlatPlate.momentumThickness(TURBULENT, trip - FlatPlate.virtualOrigin(trip, perMetre), perMetre);
        assertEquals(before, after, 1e-12);
    }

    @Property
    void aStepAtTheLeadingEdgeIsNoStep(@ForAll @DoubleRange(min = 0.5, max = 100.0) @Scale(6) double prandtl) {
        for (LayerLaw law : LayerLaw.values()) {
            double temperature = FlatPlate.uniformTemperature(law, 2e5, prandtl);
            double flux = FlatPlate.uniformFlux(law, 2e5, prandtl);
            assertEquals(temperature, FlatPlate.stepOfTemperature(law, 2e5, prandtl, 0.0), 1e-6 * temperature);
            assertEquals(flux, FlatPlate.stepOfFlux(law, 2e5, prandtl, 0.0), 1e-6 * flux);
            assertTrue(FlatPlate.stepOfFlux(law, 2e5, prandtl, 0.5) > flux);
        }
    }

    /** ∫h over the plate by midpoint sums of the local law against the closed averages. */
    @Test
    void averagesAreIntegralsOfTheLocalLaw() {
        int cells = 200_000;
        for (LayerLaw law : LayerLaw.values()) {
            double meanH = 0.0;
            double meanDifference = 0.0;
            for (int i = 0; i < cells; i++) {
                double x = (i + 0.5) / cells;
                double h = FlatPlate.uniformFlux(law, 1e5 * x, 0.7) / x;
                meanH += h / cells;
                meanDifference += 1.0 / h / cells;
            }
            double closedH = FlatPlate.averageUniformFlux(law, 1e5, 0.7, FlatPlate.Mean.OF_LOCAL_H);
            double closedRatio = FlatPlate.averageUniformFlux(law, 1e5, 0.7, FlatPlate.Mean.FLUX_OVER_DIFFERENCE);
            assertEquals(closedH, meanH, 2e-3 * closedH); // the first cell holds the singular end
            assertEquals(closedRatio, 1.0 / meanDifference, 1e-5 * closedRatio);
            double temperature = FlatPlate.averageUniformTemperature(law, 1e5, 0.7);
            assertEquals(
                    FlatPlate.uniformTemperature(law, 1e5, 0.7) / law.reynoldsExponent(),
                    temperature,
                    1e-12 * temperature);
        }
    }

    @Test
    void outsideTheRangeThereIsNoNumber() {
        assertTrue(Double.isNaN(Correlation.COLBURN_LOCAL.nusselt(1e5, 0.7)));
        assertTrue(Double.isNaN(Correlation.KAYS_CRAWFORD_FLUX.nusselt(1e6, 6.0)));
        assertTrue(Double.isNaN(FlatPlate.stepOfFlux(LAMINAR, 1e5, 0.7, 1.0)));
        assertTrue(Double.isNaN(FlatPlate.stepOfTemperature(LAMINAR, 1e5, 0.7, -0.1)));
        assertTrue(Double.isNaN(FlatPlate.uniformTemperature(TURBULENT, 0.0, 0.7)));
        assertTrue(Double.isNaN(UnheatedLength.averageTemperatureFactor(LAMINAR, 1.0)));
        assertEquals(
                (long) Correlation.ALL.size(),
                Correlation.ALL.stream().map(Correlation::name).distinct().count());
    }
}
