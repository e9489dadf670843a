package plateledger.quantity;

import java.util.Arrays;
import java.util.stream.Collectors;

/** What kind of quantity a number is; fixes the units that may stand beside it. */
public enum Dimension {
    /** A pure number; SI unit 1. */
    NUMBER("a number"),
    /** Length, m. */
    LENGTH("a length"),
    /** Duration, s. */
    TIME("a time"),
    /** Thermodynamic temperature, K; written in °C or K. */
    TEMPERATURE("a temperature"),
    /** Difference of two temperatures, K; never written in °C. */
    TEMPERATURE_DIFFERENCE("a temperature difference"),
    /** Speed, m/s. */
    SPEED("a speed"),
    /** Pressure, Pa. */
    PRESSURE("a pressure"),
    /** Voltage, V. */
    VOLTAGE("a voltage"),
    /** Electric current, A. */
    CURRENT("a current"),
    /** Power, W. */
    POWER("a power"),
    /** Electrical resistance, Ω. */
    RESISTANCE("a resistance"),
    /** Heat flux, W/m². */
    HEAT_FLUX("a heat flux"),
    /** Thermal conductance, W/K. */
    CONDUCTANCE("a conductance"),
    /** Thermal conductivity, or conductance per length of an edge, W/(m K). */
    CONDUCTIVITY("a conductivity or a conductance per length"),
    /** Thermal conductance per area, W/(m² K). */
    CONDUCTANCE_PER_AREA("a conductance per area"),
    /** Volumetric heat capacity, J/(m³ K). */
    HEAT_CAPACITY_PER_VOLUME("a heat capacity per volume");

    private final String word;

    Dimension(String word) {
        this.word = word;
    }

    /** The dimension in words with its article, e.g. {@code a length}. */
    public String word() {
        return word;
    }

    /** The units in which it may be written, separated by commas. */
    public String units() {
        return Arrays.stream(Unit.values())
                .filter(unit -> unit.fits(this))
                .map(Unit::symbol)
                .collect(Collectors.joining(", "));
    }

    /** The SI unit in which values of this dimension are kept. */
    public Unit siUnit() {
        return Arrays.stream(Unit.values())
                .filter(unit -> unit.fits(this) && unit.toSi(1.0) == 1.0)
                .findFirst()
                .orElseThrow();
    }

    /** The unit shown in examples of messages. */
    Unit example() {
        return switch (this) {
            case NUMBER -> Unit.ONE;
            case LENGTH -> Unit.MILLIMETRE;
            case TEMPERATURE -> Unit.CELSIUS;
            default ->
                Arrays.stream(Unit.values())
                        .filter(unit -> unit.fits(this))
                        .findFirst()
                        .orElseThrow();
        };
    }
}
