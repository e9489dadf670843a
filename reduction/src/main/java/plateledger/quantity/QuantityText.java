package plateledger.quantity;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import plateledger.quantity.QuantityFormatException.Fault;

/**
 * Reads quantities as campaign files write them, and writes them so. The forms of a measured quantity:
 *
 * <pre>
 *   600 mm ± 0.5 mm (k=2)       expanded uncertainty with its coverage factor; +/- may stand for ±
 *   600 mm ± 0.5 mm (limits)    surely within these limits
 *   600 mm, u = 0.25 mm         standard uncertainty
 *   600 mm (exact)              no uncertainty: a definition or a choice
 * </pre>
 *
 * <p>The half-width has a unit of its own, or {@code %} of the value. Where the value itself is in {@code %}, or is a
 * temperature, {@code %} of the value would be read in two ways: the first is always points of per cent, the second is
 * refused. {@code (k=2, dof=9)} and {@code , u = 0.25 mm, dof = 9} state degrees of freedom. Numbers have a '.' as
 * decimal mark and no thousands mark, whatever the locale.
 */
public final class QuantityText {
    private static final String NUMBER = "[+\\-−]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+\\-−]?\\d+)?";
    private static final Pattern QUANTITY = Pattern.compile("(" + NUMBER + ")\\s*(.*)");
    private static final Pattern EXACT = Pattern.compile("(.*?)\\(\\s*exact\\s*\\)");
    private static final Pattern PLUS_MINUS = Pattern.compile("(.*?)(?:±|\\+/-|\\+/−)(.*)");
    private static final Pattern STANDARD = Pattern.compile("(.*?),\\s*u\\s*=(.*)");
    private static final Pattern DOF = Pattern.compile("(.*?),\\s*dof\\s*=\\s*(" + NUMBER + ")\\s*");
    private static final Pattern MEANING = Pattern.compile(
            "(.*?)\\(\\s*(limits|k\\s*=\\s*(" + NUMBER + "))\\s*(?:,\\s*dof\\s*=\\s*(" + NUMBER + ")\\s*)?\\)");
    private static final Pattern DECIMAL_COMMA = Pattern.compile("[+\\-−]?\\d+,\\d.*");

    private QuantityText() {}

    /**
     * Reads a measured quantity.
     *
     * @return the statement in SI
     * @throws QuantityFormatException if the text is none of the forms, or its unit belongs to another dimension
     */
    public static Stated parse(String text, Dimension dimension) throws QuantityFormatException {
        String whole = text.strip();
        Matcher form = EXACT.matcher(whole);
        if (form.matches()) {
            return Stated.exact(Part.value(form.group(1), dimension).si());
        }
        form = PLUS_MINUS.matcher(whole);
        if (form.matches()) {
            return plusMinus(Part.value(form.group(1), dimension), form.group(2).strip(), dimension);
        }
        form = STANDARD.matcher(whole);
        if (form.matches()) {
            return standard(Part.value(form.group(1), dimension), form.group(2).strip(), dimension);
        }
        Part value = Part.value(whole, dimension);
        throw new QuantityFormatException(
                Fault.UNCERTAINTY,
                "\"" + whole + "\" without its uncertainty",
                dimension.word() + " with its uncertainty",
                ways(value.text(), halfExample(dimension)));
    }

    /**
     * Reads a setting: a number with its unit and no uncertainty.
     *
     * @return the value in SI
     * @throws QuantityFormatException if it is something else
     */
    public static double setting(String text, Dimension dimension) throws QuantityFormatException {
        String whole = text.strip();
        if (EXACT.matcher(whole).matches()
                || PLUS_MINUS.matcher(whole).matches()
                || STANDARD.matcher(whole).matches()) {
            throw new QuantityFormatException(
                    Fault.UNCERTAINTY,
                    "\"" + whole + "\"",
                    dimension.word() + " without uncertainty, since it is a setting",
                    "Write the number and its unit only.");
        }
        return Part.value(whole, dimension).si();
    }

    /** Writes a statement in a unit, in a form that {@link #parse} reads. */
    public static String text(Stated stated, Unit unit) {
        String value = withUnit(unit.fromSi(stated.value()), unit);
        Unit widthUnit = unit == Unit.CELSIUS ? Unit.KELVIN : unit;
        String width = withUnit(widthUnit.fromSi(stated.halfWidth()), widthUnit);
        boolean dofStated = Double.isFinite(stated.dof());
        String dof = dofStated ? ", dof = " + number(stated.dof()) : "";
        return switch (stated.meaning()) {
            case EXACT -> value + " (exact)";
            case STANDARD -> value + ", u = " + width + dof;
            case EXPANDED -> value + " ± " + width + " (k = " + number(stated.coverage()) + dof + ")";
            case LIMITS -> value + " ± " + width + " (limits" + dof + ")";
        };
    }

    /** Writes a setting in a unit, in a form that {@link #setting} reads. */
    public static String text(double si, Unit unit) {
        return withUnit(unit.fromSi(si), unit);
    }

    private static Stated plusMinus(Part value, String right, Dimension dimension) throws QuantityFormatException {
        Matcher meaning = MEANING.matcher(right);
        if (!meaning.matches()) {
            throw new QuantityFormatException(
                    Fault.MEANING,
                    "\"± " + right + "\" without its meaning",
                    "what the number after ± is",
                    ways(value.text(), right.replaceAll("\\s*\\([^()]*\\)$", "")));
        }
        double width = halfWidth(value, meaning.group(1).strip(), dimension);
        double dof = dof(meaning.group(4));
        String k = meaning.group(3);
        if (k == null) {
            return new Stated(value.si(), width, Stated.Meaning.LIMITS, 1.0, dof);
        }
        double coverage = Part.number(k);
        if (!(coverage > 0.0)) {
            throw new QuantityFormatException(
                    Fault.MEANING, "coverage factor k = " + k, "a coverage factor above 0", "Write for example (k=2).");
        }
        return new Stated(value.si(), width, Stated.Meaning.EXPANDED, coverage, dof);
    }

    private static Stated standard(Part value, String right, Dimension dimension) throws QuantityFormatException {
        Matcher withDof = DOF.matcher(right);
        boolean stated = withDof.matches();
        double width = halfWidth(value, stated ? withDof.group(1).strip() : right, dimension);
        return new Stated(value.si(), width, Stated.Meaning.STANDARD, 1.0, dof(stated ? withDof.group(2) : null));
    }

    private static double dof(@Nullable String text) throws QuantityFormatException {
        double dof = text == null ? Double.POSITIVE_INFINITY : Part.number(text);
        if (!(dof > 0.0)) {
            throw new QuantityFormatException(
                    Fault.UNCERTAINTY, "dof = " + text, "degrees of freedom above 0", "Leave dof out if unknown.");
        }
        return dof;
    }

    private static double halfWidth(Part value, String text, Dimension dimension) throws QuantityFormatException {
        Matcher parts = QUANTITY.matcher(text);
        boolean ofValue = parts.matches()
                && value.unit() != Unit.PERCENT
                && Unit.find(parts.group(2)).filter(Unit.PERCENT::equals).isPresent();
        double width;
        if (ofValue) {
            if (dimension == Dimension.TEMPERATURE || value.si() == 0.0) {
                throw new QuantityFormatException(
                        Fault.UNCERTAINTY,
                        "uncertainty \"" + text + "\" of " + value.text(),
                        "an uncertainty with a unit, since a percentage of this value has no meaning",
                        "Write it in " + differenceOf(dimension).units() + ".");
            }
            width = Math.abs(value.si()) * (Part.number(parts.group(1)) / 100.0);
        } else if (parts.matches() && parts.group(2).isEmpty() && value.unit() != Unit.ONE) {
            throw new QuantityFormatException(
                    Fault.UNIT,
                    "uncertainty \"" + text + "\" without a unit",
                    "an uncertainty with its own unit, or a percentage of the value",
                    "Write for example \"" + text + " " + halfUnit(value.unit()).symbol() + "\".");
        } else {
            width = Part.value(text, differenceOf(dimension)).si();
        }
        if (!(width > 0.0)) {
            throw new QuantityFormatException(
                    Fault.UNCERTAINTY,
                    "uncertainty \"" + text + "\"",
                    "an uncertainty above 0",
                    "Write \"" + value.text() + " (exact)\" if there is none.");
        }
        return width;
    }

    private static Dimension differenceOf(Dimension dimension) {
        return dimension == Dimension.TEMPERATURE ? Dimension.TEMPERATURE_DIFFERENCE : dimension;
    }

    private static Unit halfUnit(Unit unit) {
        return unit == Unit.CELSIUS ? Unit.KELVIN : unit;
    }

    private static String halfExample(Dimension dimension) {
        Unit unit = halfUnit(dimension.example());
        return unit == Unit.ONE ? "0.02" : "0.5 " + unit.symbol();
    }

    private static String ways(String value, String half) {
        return String.format(
                Locale.ROOT,
                "Write \"%1$s ± %2$s (k=2)\", \"%1$s ± %2$s (limits)\", \"%1$s, u = %2$s\" or \"%1$s (exact)\".",
                value,
                half);
    }

    private static String withUnit(double number, Unit unit) {
        return unit == Unit.ONE ? number(number) : number(number) + " " + unit.symbol();
    }

    private static String number(double value) {
        String shortest = Double.toString(value);
        return shortest.endsWith(".0") ? shortest.substring(0, shortest.length() - 2) : shortest;
    }

    /** A number with its unit, as one part of a statement. */
    private record Part(String text, double si, Unit unit) {
        static Part value(String text, Dimension dimension) throws QuantityFormatException {
            String stripped = text.strip();
            Matcher parts = QUANTITY.matcher(stripped);
            if (DECIMAL_COMMA.matcher(stripped).matches() || !parts.matches()) {
                throw new QuantityFormatException(
                        Fault.NUMBER,
                        "\"" + stripped + "\"",
                        dimension.word() + ": a number with '.' as decimal mark"
                                + (dimension == Dimension.NUMBER ? "" : " and its unit"),
                        example(dimension));
            }
            Unit unit = unit(stripped, parts.group(2), dimension);
            double si = unit.toSi(number(parts.group(1)));
            if (dimension == Dimension.TEMPERATURE && !(si > 0.0)) {
                throw new QuantityFormatException(Fault.NUMBER, "\"" + stripped + "\"", "a temperature above 0 K", "");
            }
            return new Part(stripped, si, unit);
        }

        static double number(String digits) throws QuantityFormatException {
            double number = Double.parseDouble(digits.replace('−', '-'));
            if (!Double.isFinite(number)) {
                throw new QuantityFormatException(
                        Fault.NUMBER, "\"" + digits + "\"", "a number below 1.8e308 in size", "");
            }
            return number;
        }

        private static Unit unit(String whole, String spelling, Dimension dimension) throws QuantityFormatException {
            if (spelling.isEmpty()) {
                if (dimension == Dimension.NUMBER) {
                    return Unit.ONE;
                }
                throw new QuantityFormatException(
                        Fault.UNIT,
                        "\"" + whole + "\" without a unit",
                        dimension.word() + " with its unit: " + dimension.units(),
                        "Write for example \"" + whole + " "
                                + dimension.example().symbol() + "\".");
            }
            Unit unit = Unit.find(spelling)
                    .orElseThrow(() -> new QuantityFormatException(
                            Fault.UNIT,
                            "unknown unit \"" + spelling + "\" in \"" + whole + "\"",
                            dimension.word() + " in one of: " + dimension.units(),
                            example(dimension)));
            if (!unit.fits(dimension)) {
                throw new QuantityFormatException(
                        Fault.DIMENSION,
                        "\"" + whole + "\", which is " + unit.dimension().word(),
                        dimension.word() + " in one of: " + dimension.units(),
                        unit == Unit.CELSIUS && dimension == Dimension.TEMPERATURE_DIFFERENCE
                                ? "A difference of temperatures is written in K."
                                : example(dimension));
            }
            return unit;
        }

        private static String example(Dimension dimension) {
            Unit unit = dimension.example();
            return "Write for example \"" + (unit == Unit.ONE ? "0.95" : "20.5 " + unit.symbol()) + "\".";
        }
    }
}
