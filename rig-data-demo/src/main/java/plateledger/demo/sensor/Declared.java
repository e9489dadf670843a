package plateledger.demo.sensor;

/**
 * A quantity as the campaign's files declare it; the truth is drawn from the same numbers.
 *
 * @param value the number as written
 * @param unit unit as written, empty for a pure number
 * @param scale SI units in one unit
 * @param spread the number after ± or u =, as written; empty if exact
 * @param meaning what the spread is
 */
public record Declared(String value, String unit, double scale, String spread, Meaning meaning) {
    /** What the spread is. */
    public enum Meaning {
        /** Standard uncertainty of a normal distribution. */
        STANDARD,
        /** The same in % of the value. */
        RELATIVE,
        /** Limits of an even distribution. */
        LIMITS,
        /** No uncertainty. */
        EXACT
    }

    /** A value with a standard uncertainty in the same unit. */
    public static Declared standard(String value, String unit, double scale, String u) {
        return new Declared(value, unit, scale, u, Meaning.STANDARD);
    }

    /** A value with a standard uncertainty in %. */
    public static Declared relative(String value, String unit, double scale, String percent) {
        return new Declared(value, unit, scale, percent, Meaning.RELATIVE);
    }

    /** A value within limits. */
    public static Declared limits(String value, String unit, double scale, String halfWidth) {
        return new Declared(value, unit, scale, halfWidth, Meaning.LIMITS);
    }

    /** An exact value. */
    public static Declared exact(String value, String unit, double scale) {
        return new Declared(value, unit, scale, "", Meaning.EXACT);
    }

    /** The declared value, SI. */
    public double si() {
        return Double.parseDouble(value) * scale;
    }

    /** Standard uncertainty or half-width, SI. */
    public double spreadSi() {
        return switch (meaning) {
            case EXACT -> 0.0;
            case RELATIVE -> Double.parseDouble(spread) * 0.01 * Math.abs(si());
            case STANDARD, LIMITS -> Double.parseDouble(spread) * scale;
        };
    }

    /** The true value that belongs to a name, SI. */
    public double draw(Draws draws, String name) {
        return switch (meaning) {
            case EXACT -> si();
            case LIMITS -> si() + spreadSi() * draws.even(name);
            case STANDARD, RELATIVE -> si() + spreadSi() * draws.normal(name);
        };
    }

    /** The text in the campaign's files. */
    public String text() {
        String gap = unit.isEmpty() ? "" : " " + unit;
        return switch (meaning) {
            case EXACT -> value + gap + " (exact)";
            case RELATIVE -> value + gap + ", u = " + spread + " %";
            case STANDARD -> value + gap + ", u = " + spread + gap;
            case LIMITS -> value + gap + " ± " + spread + gap + " (limits)";
        };
    }
}
