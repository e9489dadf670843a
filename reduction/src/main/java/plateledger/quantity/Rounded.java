package plateledger.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Numbers rounded to their uncertainty: the standard uncertainty to two significant digits and the value to the same
 * place (JCGM 100:2008, 7.2.6). Always with '.' as decimal mark.
 */
public final class Rounded {
    private static final int DIGITS_OF_U = 2;
    private static final int DIGITS_WITHOUT_U =
            6; // common practice: enough to identify a value that has no uncertainty
    private static final int LOWEST_PLAIN = -5;
    private static final int HIGHEST_PLAIN = 9;
    private static final String NOT_KNOWN = "not known";

    private Rounded() {}

    /** Value and standard uncertainty with their unit, e.g. {@code 10.058 Ω, u = 0.027 Ω}; both SI. */
    public static String text(Estimate estimate, String unit) {
        if (!estimate.isKnown()) {
            return NOT_KNOWN;
        }
        String tail = unit.isEmpty() || unit.equals("1") ? "" : " " + unit;
        return estimate.u() > 0.0
                ? value(estimate) + tail + ", u = " + uncertainty(estimate) + tail
                : value(estimate) + tail;
    }

    /** As {@link #text(Estimate, String)}, in a unit other than the SI unit. */
    public static String text(Estimate si, Unit unit) {
        if (!si.isKnown()) {
            return NOT_KNOWN;
        }
        Unit difference = unit == Unit.CELSIUS ? Unit.KELVIN : unit;
        Estimate shown = new Estimate(unit.fromSi(si.value()), difference.fromSi(si.u()), si.dof());
        if (unit == Unit.CELSIUS && si.u() > 0.0) {
            return value(shown) + " °C, u = " + uncertainty(shown) + " K";
        }
        return text(shown, unit.symbol());
    }

    /** The value alone, rounded to its uncertainty; six significant digits where it has none. */
    public static String value(Estimate estimate) {
        if (!estimate.isKnown()) {
            return NOT_KNOWN;
        }
        BigDecimal exact = BigDecimal.valueOf(estimate.value());
        if (!(estimate.u() > 0.0) || !Double.isFinite(estimate.u())) {
            BigDecimal cut = exact.round(new MathContext(DIGITS_WITHOUT_U, RoundingMode.HALF_EVEN));
            return plain(cut.signum() == 0 ? BigDecimal.ZERO : cut.stripTrailingZeros());
        }
        return plain(exact.setScale(roundedU(estimate).scale(), RoundingMode.HALF_EVEN));
    }

    /** The standard uncertainty alone, to two significant digits; {@code 0} where there is none. */
    public static String uncertainty(Estimate estimate) {
        if (!Double.isFinite(estimate.u())) {
            return NOT_KNOWN;
        }
        return estimate.u() == 0.0 ? "0" : plain(roundedU(estimate));
    }

    private static BigDecimal roundedU(Estimate estimate) {
        BigDecimal rounded =
                BigDecimal.valueOf(estimate.u()).round(new MathContext(DIGITS_OF_U, RoundingMode.HALF_EVEN));
        int missing = DIGITS_OF_U - rounded.precision(); // 0.5 is written 0.50
        return missing > 0 ? rounded.setScale(rounded.scale() + missing) : rounded;
    }

    private static String plain(BigDecimal number) {
        if (number.signum() == 0) {
            return number.scale() > 0 && number.scale() <= HIGHEST_PLAIN ? number.toPlainString() : "0";
        }
        int exponent = number.precision() - number.scale() - 1;
        if (exponent >= LOWEST_PLAIN && exponent <= HIGHEST_PLAIN) {
            return number.toPlainString();
        }
        return scientific(number, exponent);
    }

    private static String scientific(BigDecimal number, int exponent) {
        return number.scaleByPowerOfTen(-exponent).toPlainString() + "e" + exponent;
    }
}
