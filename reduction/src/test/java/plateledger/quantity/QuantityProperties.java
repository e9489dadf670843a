package plateledger.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** Laws of units and of quantities written and read again. */
final class QuantityProperties {
    @Property
    void unitsThereAndBack(@ForAll Unit unit, @ForAll("numbers") double number) {
        // two roundings, and for °C the loss of 273.15 K against a small number
        double tolerance = 4e-16 * Math.abs(number) + (unit == Unit.CELSIUS ? 1e-13 : 0.0);
        assertEquals(number, unit.fromSi(unit.toSi(number)), tolerance);
    }

    @Property
    void everyUnitIsFoundByItsSymbolAndItsOtherSpellings(@ForAll Unit unit) {
        assertEquals(unit, Unit.find(unit.symbol()).orElseThrow());
        unit.otherSpellings()
                .forEach(spelling -> assertEquals(unit, Unit.find(spelling).orElseThrow()));
    }

    @Property
    void statementsThereAndBack(@ForAll Unit unit, @ForAll("statements") Stated stated) throws Exception {
        Stated read = QuantityText.parse(QuantityText.text(stated, unit), unit.dimension());
        // two roundings, and for °C those of a number near 273.15
        double tolerance = 1e-15 * stated.value() + (unit == Unit.CELSIUS ? 1e-13 : 0.0);
        assertEquals(stated.value(), read.value(), tolerance);
        assertEquals(stated.halfWidth(), read.halfWidth(), 1e-15 * stated.halfWidth());
        assertEquals(stated.meaning(), read.meaning());
        assertEquals(stated.coverage(), read.coverage());
        assertEquals(stated.dof(), read.dof());
    }

    @Property
    void settingsThereAndBack(@ForAll Unit unit, @ForAll("positive") double si) throws Exception {
        double tolerance = 1e-15 * si + (unit == Unit.CELSIUS ? 1e-13 : 0.0);
        assertEquals(si, QuantityText.setting(QuantityText.text(si, unit), unit.dimension()), tolerance);
    }

    @Property
    void aUnitOfAnotherDimensionIsNeverRead(@ForAll Unit unit, @ForAll Dimension dimension) {
        if (!unit.fits(dimension)) {
            QuantityFormatException refused = assertThrows(
                    QuantityFormatException.class, () -> QuantityText.setting("300 " + unit.symbol(), dimension));
            assertEquals(QuantityFormatException.Fault.DIMENSION, refused.fault());
        }
    }

    @Property
    void anyTextIsReadOrRefusedWithWords(@ForAll String text, @ForAll Dimension dimension) {
        try {
            Stated stated = QuantityText.parse(text, dimension);
            assertEquals(true, Double.isFinite(stated.value()));
        } catch (QuantityFormatException e) {
            assertEquals(false, e.found().isEmpty() || e.expected().isEmpty());
        }
    }

    @Provide
    Arbitrary<Double> numbers() {
        return Arbitraries.doubles().between(-1e9, 1e9);
    }

    @Provide
    Arbitrary<Double> positive() {
        return Arbitraries.doubles().between(1e-9, 1e9).ofScale(12);
    }

    @Provide
    Arbitrary<Stated> statements() {
        Arbitrary<Double> value = Arbitraries.doubles().between(1.0, 1e9);
        Arbitrary<Double> half = Arbitraries.doubles().between(1e-9, 1e3).ofScale(12);
        Arbitrary<Double> dof = Arbitraries.of(Double.POSITIVE_INFINITY, 1.0, 9.0, 12.5);
        Arbitrary<Stated.Meaning> meaning = Arbitraries.of(Stated.Meaning.class);
        return Combinators.combine(value, half, meaning, dof).as((v, h, m, d) -> switch (m) {
            case EXACT -> Stated.exact(v);
            case EXPANDED -> new Stated(v, h, m, 2.26, d);
            default -> new Stated(v, h, m, 1.0, d);
        });
    }
}
