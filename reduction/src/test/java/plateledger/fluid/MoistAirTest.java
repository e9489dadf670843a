package plateledger.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.junit.jupiter.api.Test;

/** Laws and limits of {@link MoistAir}, {@link Humidity} and {@link FormulationUncertainty}. */
final class MoistAirTest {
    @Test
    void nothingIsKnownOutsideTheRange() {
        assertFalse(MoistAir.inRange(273.0, 101325.0, 0.0));
        assertFalse(MoistAir.inRange(500.1, 101325.0, 0.0));
        assertFalse(MoistAir.inRange(300.0, 49e3, 0.0));
        assertFalse(MoistAir.inRange(300.0, 201e3, 0.0));
        assertFalse(MoistAir.inRange(300.0, 101325.0, 0.21));
        assertFalse(MoistAir.inRange(300.0, 101325.0, -1e-9));
        assertFalse(MoistAir.inRange(Double.NaN, 101325.0, 0.0));
        assertTrue(Double.isNaN(MoistAir.state(272.0, 101325.0, 0.0).density()));
        assertTrue(Double.isNaN(MoistAir.state(300.0, 101325.0, Double.NaN).prandtl()));
        assertTrue(Double.isNaN(MoistAir.vapourFraction(300.0, 101325.0, 1.01)));
        assertTrue(Double.isNaN(MoistAir.vapourFraction(270.0, 101325.0, 0.5)));
        assertTrue(Double.isNaN(MoistAir.dewPointK(101325.0, 0.0)));
        assertTrue(Double.isNaN(FormulationUncertainty.of(600.0, 101325.0, 0.0).density()));
    }

    /** The mole fraction goes to zero smoothly: no step between dry and nearly dry air. */
    @Test
    void dryAirIsTheLimitOfMoistAir() {
        FluidState dry = MoistAir.state(310.0, 98e3, 0.0);
        FluidState nearly = MoistAir.state(310.0, 98e3, 1e-9);
        assertEquals(dry.density(), nearly.density(), 1e-8);
        assertEquals(dry.viscosity(), nearly.viscosity(), 1e-13);
        assertEquals(dry.conductivity(), nearly.conductivity(), 1e-10);
        assertEquals(dry.heatCapacity(), nearly.heatCapacity(), 1e-5);
    }

    /** Dew point and mole fraction are inverse: air cooled to its dew point is saturated. */
    @Property(tries = 200)
    void airAtItsDewPointIsSaturated(
            @ForAll @DoubleRange(min = 274.0, max = 330.0) double t,
            @ForAll @DoubleRange(min = 60e3, max = 110e3) double p,
            @ForAll @DoubleRange(min = 0.02, max = 1.0) double h) {
        double x = MoistAir.vapourFraction(t, p, h);
        double dew = MoistAir.dewPointK(p, x);
        assertTrue(dew <= t + 1e-7, () -> "dew point " + dew + " above " + t);
        if (dew > 273.17) {
            assertEquals(1.0, Humidity.relativeHumidity(dew, p, x), 1e-9);
        } else if (dew < 273.15) {
            double saturated = Humidity.enhancementFactor(p, dew) * Humidity.icePressurePa(dew) / p;
            assertEquals(x, saturated, x * 1e-9);
        }
    }

    /** Moist air is lighter and holds more heat per kg than dry air at the same temperature and pressure. */
    @Property(tries = 200)
    void waterMakesAirLighter(
            @ForAll @DoubleRange(min = 280.0, max = 400.0) double t,
            @ForAll @DoubleRange(min = 60e3, max = 150e3) double p,
            @ForAll @DoubleRange(min = 1e-4, max = 0.15) @Scale(4) double x) {
        FluidState dry = MoistAir.state(t, p, 0.0);
        FluidState moist = MoistAir.state(t, p, x);
        assertTrue(moist.density() < dry.density());
        assertTrue(moist.heatCapacity() > dry.heatCapacity());
        assertTrue(moist.viscosity() < dry.viscosity());
    }

    /**
     * At 25 °C and 50 % the humidity shifts k by −0.50 % and μ by −0.80 %: 20 % of that in quadrature with 1 % and 0.5 %,
     * worked by hand.
     */
    @Test
    void uncertaintyHoldsAFifthOfTheHumidShift() {
        double x = MoistAir.vapourFraction(298.15, 101325.0, 0.5);
        FormulationUncertainty u = FormulationUncertainty.of(298.15, 101325.0, x);
        assertEquals(Math.sqrt(0.010 * 0.010 + 0.0010 * 0.0010), u.conductivity(), 2e-6);
        assertEquals(Math.sqrt(0.005 * 0.005 + 0.0016 * 0.0016), u.viscosity(), 2e-6);
        assertEquals(0.0005, u.density());
        assertEquals(0.001, u.heatCapacity());
    }

    /** ν, α and Pr of the primaries, by hand. */
    @Test
    void derivedNumbersComeFromThePrimaries() {
        FluidState state = new FluidState(2.0, 3.0, 4.0, 5.0);
        assertEquals(1.5, state.kinematicViscosity());
        assertEquals(0.4, state.diffusivity());
        assertEquals(3.75, state.prandtl());
    }
}
