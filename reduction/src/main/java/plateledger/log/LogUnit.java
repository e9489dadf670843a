package plateledger.log;

import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/**
 * A unit that loggers write, with the way to SI: {@code SI = factor · value + offset}.
 *
 * @param factor SI units per unit, exact (SI Brochure, 9th ed.)
 * @param offset SI value of zero
 */
record LogUnit(double factor, double offset) {
    private static final LogUnit SI = new LogUnit(1.0, 0.0);
    private static final LogUnit CELSIUS = new LogUnit(1.0, 273.15);

    private static final Map<String, LogUnit> KNOWN = Map.ofEntries(
            Map.entry("\u00b0C", CELSIUS),
            Map.entry("\u00baC", CELSIUS), // the ordinal sign, which some loggers print for the degree sign
            Map.entry("\u2103", CELSIUS),
            Map.entry("degC", CELSIUS),
            Map.entry("C", CELSIUS),
            Map.entry("K", SI),
            Map.entry("V", SI),
            Map.entry("mV", new LogUnit(1e-3, 0.0)),
            Map.entry("A", SI),
            Map.entry("mA", new LogUnit(1e-3, 0.0)),
            Map.entry("W", SI),
            Map.entry("Pa", SI),
            Map.entry("hPa", new LogUnit(1e2, 0.0)),
            Map.entry("mbar", new LogUnit(1e2, 0.0)),
            Map.entry("kPa", new LogUnit(1e3, 0.0)),
            Map.entry("m/s", SI),
            Map.entry("%", new LogUnit(1e-2, 0.0)),
            Map.entry("%rH", new LogUnit(1e-2, 0.0)),
            Map.entry("1", SI),
            Map.entry("s", SI));

    /** The units that can be read, for messages. */
    static final String LIST = "\u00b0C, K, V, mV, A, mA, W, Pa, hPa, kPa, m/s, %, 1, s";

    /** The unit written so; brackets around it are allowed; empty if it is not known. */
    static Optional<LogUnit> of(String text) {
        return Optional.ofNullable(KNOWN.get(bare(text)));
    }

    /** True if the cell may stand in a units row: a known unit, nothing, or a dash. */
    static boolean mayStandInUnitsRow(String cell) {
        String bare = bare(cell);
        return bare.isEmpty() || "-".equals(bare) || KNOWN.containsKey(bare);
    }

    /** The text without blanks and one pair of brackets around it. */
    static String bare(String text) {
        String t = text.strip();
        if (t.length() >= 2 && ((t.startsWith("[") && t.endsWith("]")) || (t.startsWith("(") && t.endsWith(")")))) {
            return t.substring(1, t.length() - 1).strip();
        }
        return t;
    }

    /** True if the title names a time column. */
    static boolean namesTime(String title) {
        String t = title.toLowerCase(Locale.ROOT);
        return t.contains("elapsed") || t.contains("time") || t.contains("zeit") || "t".equals(t.strip());
    }
}
