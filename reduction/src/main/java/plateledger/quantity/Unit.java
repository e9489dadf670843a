package plateledger.quantity;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A unit as people write it in campaign files and loggers write it in column titles. Factors follow from the SI prefixes
 * and the units accepted for use with the SI (SI Brochure, 9th ed., tables 7 and 8); 1 mbar = 100 Pa.
 *
 * <p>A spelling is compared after these steps and no others: surrounding blanks are dropped; {@code ²}, {@code ³},
 * {@code ^} read as plain digits; a blank, {@code ·} or {@code *} between factors is a product; {@code /(…)} around all
 * that follows the solidus is opened. {@code W/mK} means W/(m K), as is common practice.
 */
public enum Unit {
    /** The number one. */
    ONE("1", Dimension.NUMBER, 1, 1),
    /** One hundredth. */
    PERCENT("%", Dimension.NUMBER, 1, 100),
    /** Metre. */
    METRE("m", Dimension.LENGTH, 1, 1),
    /** Millimetre. */
    MILLIMETRE("mm", Dimension.LENGTH, 1, 1_000),
    /** Centimetre. */
    CENTIMETRE("cm", Dimension.LENGTH, 1, 100),
    /** Micrometre. */
    MICROMETRE("µm", Dimension.LENGTH, 1, 1_000_000),
    /** Second. */
    SECOND("s", Dimension.TIME, 1, 1),
    /** Minute. */
    MINUTE("min", Dimension.TIME, 60, 1),
    /** Hour. */
    HOUR("h", Dimension.TIME, 3600, 1),
    /** Kelvin, of a temperature or of a difference. */
    KELVIN("K", Dimension.TEMPERATURE_DIFFERENCE, 1, 1),
    /** Degree Celsius, of a temperature only. */
    CELSIUS("°C", Dimension.TEMPERATURE, 1, 1, "degC", "C"),
    /** Metre per second. */
    METRE_PER_SECOND("m/s", Dimension.SPEED, 1, 1),
    /** Kilometre per hour. */
    KILOMETRE_PER_HOUR("km/h", Dimension.SPEED, 1000, 3600),
    /** Pascal. */
    PASCAL("Pa", Dimension.PRESSURE, 1, 1),
    /** Hectopascal. */
    HECTOPASCAL("hPa", Dimension.PRESSURE, 100, 1),
    /** Kilopascal. */
    KILOPASCAL("kPa", Dimension.PRESSURE, 1000, 1),
    /** Millibar. */
    MILLIBAR("mbar", Dimension.PRESSURE, 100, 1),
    /** Volt. */
    VOLT("V", Dimension.VOLTAGE, 1, 1),
    /** Millivolt. */
    MILLIVOLT("mV", Dimension.VOLTAGE, 1, 1000),
    /** Ampere. */
    AMPERE("A", Dimension.CURRENT, 1, 1),
    /** Milliampere. */
    MILLIAMPERE("mA", Dimension.CURRENT, 1, 1000),
    /** Watt. */
    WATT("W", Dimension.POWER, 1, 1),
    /** Kilowatt. */
    KILOWATT("kW", Dimension.POWER, 1000, 1),
    /** Ohm. */
    OHM("Ω", Dimension.RESISTANCE, 1, 1),
    /** Milliohm. */
    MILLIOHM("mΩ", Dimension.RESISTANCE, 1, 1000),
    /** Watt per square metre. */
    WATT_PER_M2("W/m²", Dimension.HEAT_FLUX, 1, 1),
    /** Watt per kelvin. */
    WATT_PER_K("W/K", Dimension.CONDUCTANCE, 1, 1),
    /** Watt per metre and kelvin. */
    WATT_PER_M_K("W/(m K)", Dimension.CONDUCTIVITY, 1, 1, "W/mK"),
    /** Watt per square metre and kelvin. */
    WATT_PER_M2_K("W/(m² K)", Dimension.CONDUCTANCE_PER_AREA, 1, 1, "W/m2K"),
    /** Joule per cubic metre and kelvin. */
    JOULE_PER_M3_K("J/(m³ K)", Dimension.HEAT_CAPACITY_PER_VOLUME, 1, 1, "J/m3K"),
    /** Kilojoule per cubic metre and kelvin. */
    KILOJOULE_PER_M3_K("kJ/(m³ K)", Dimension.HEAT_CAPACITY_PER_VOLUME, 1000, 1, "kJ/m3K"),
    /** Megajoule per cubic metre and kelvin. */
    MEGAJOULE_PER_M3_K("MJ/(m³ K)", Dimension.HEAT_CAPACITY_PER_VOLUME, 1_000_000, 1, "MJ/m3K");

    private static final Map<String, Unit> BY_SPELLING = bySpelling();

    private final String symbol;
    private final Dimension dimension;
    private final long numerator; // SI per unit is numerator ÷ denominator: whole numbers, so that 50 µm is 5e-5 m
    private final long denominator;
    private final String otherSpellings; // separated by blanks: an enum holds nothing that can change

    Unit(String symbol, Dimension dimension, long numerator, long denominator, String... otherSpellings) {
        this.symbol = symbol;
        this.dimension = dimension;
        this.numerator = numerator;
        this.denominator = denominator;
        this.otherSpellings = String.join(" ", otherSpellings);
    }

    /** The unit of that spelling; empty if there is none. */
    public static Optional<Unit> find(String spelling) {
        return Optional.ofNullable(BY_SPELLING.get(normal(spelling)));
    }

    /** The symbol printed. */
    public String symbol() {
        return symbol;
    }

    /** The other spellings read, besides the symbol with its blanks, brackets and superscripts written otherwise. */
    public List<String> otherSpellings() {
        return otherSpellings.isEmpty() ? List.of() : List.of(otherSpellings.split(" ", -1));
    }

    /** What it is a unit of; K is here a unit of differences, and {@link #fits} temperatures too. */
    public Dimension dimension() {
        return dimension;
    }

    /** True if a quantity of that dimension may be written in this unit. */
    public boolean fits(Dimension wanted) {
        return dimension == wanted || (this == KELVIN && wanted == Dimension.TEMPERATURE);
    }

    /** SI value of a number in this unit; NaN gives NaN, and a temperature below 0 K is not refused here. */
    public double toSi(double number) {
        return this == CELSIUS ? Temperature.celsiusToKelvin(number) : number * numerator / denominator;
    }

    /** Number in this unit of an SI value; the inverse of {@link #toSi} to rounding. */
    public double fromSi(double si) {
        return this == CELSIUS ? Temperature.kelvinToCelsius(si) : si * denominator / numerator;
    }

    private static Map<String, Unit> bySpelling() {
        Map<String, Unit> found = new HashMap<>();
        for (Unit unit : values()) {
            found.put(normal(unit.symbol), unit);
            for (String spelling : unit.otherSpellings()) {
                found.put(normal(spelling), unit);
            }
        }
        return Map.copyOf(found);
    }

    private static String normal(String spelling) {
        String text = spelling.strip()
                .replace('²', '2')
                .replace('³', '3')
                .replace("^", "")
                .replace('μ', 'u') // Greek letter
                .replace('µ', 'u') // micro sign
                .replace("Ω", "ohm") // Greek letter
                .replace("\u2126", "ohm") // ohm sign
                .replace("\u2103", "°C") // one-character degree Celsius
                .replaceAll("\\s*/\\s*", "/")
                .replaceAll("\\s*[·⋅*]\\s*|\\s+", ".");
        int solidus = text.indexOf("/(");
        return solidus > 0 && text.indexOf(')') == text.length() - 1
                ? text.substring(0, solidus + 1) + text.substring(solidus + 2, text.length() - 1)
                : text;
    }
}
