package plateledger.log;

import java.util.Arrays;
import java.util.EnumSet;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import plateledger.quantity.Dimension;
import plateledger.quantity.Unit;

/** Units as loggers write them in titles and units rows. */
final class LogUnit {
    /** What a channel of a rig may be. */
    private static final Set<Dimension> DIMENSIONS = EnumSet.of(
            Dimension.NUMBER,
            Dimension.TIME,
            Dimension.TEMPERATURE,
            Dimension.TEMPERATURE_DIFFERENCE,
            Dimension.SPEED,
            Dimension.PRESSURE,
            Dimension.VOLTAGE,
            Dimension.CURRENT,
            Dimension.POWER);

    /** The units that can be read, for messages. */
    static final String LIST = Arrays.stream(Unit.values())
            .filter(unit -> DIMENSIONS.contains(unit.dimension()))
            .map(Unit::symbol)
            .collect(Collectors.joining(", "));

    private LogUnit() {}

    /** The unit written so; brackets around it are allowed; empty if it is not known. */
    static Optional<Unit> of(String text) {
        String t = bare(text).replace('\u00ba', '\u00b0'); // the ordinal sign stands for the degree sign in some logs
        String plain = t.startsWith("%")
                        && t.substring(1).strip().toLowerCase(Locale.ROOT).equals("rh")
                ? "%"
                : t;
        return Unit.find(plain).filter(unit -> DIMENSIONS.contains(unit.dimension()));
    }

    /** True if the cell may stand in a units row: a known unit, nothing, or a dash. */
    static boolean mayStandInUnitsRow(String cell) {
        String bare = bare(cell);
        return bare.isEmpty() || "-".equals(bare) || of(bare).isPresent();
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
