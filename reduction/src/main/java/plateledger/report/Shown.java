package plateledger.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.time.Instant;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.Map;
import plateledger.quantity.Estimate;
import plateledger.quantity.Rounded;

/** Numbers and moments as the report shows them: rounded to their uncertainty, the same in every locale. */
final class Shown {
    /** Stands where there is no number. */
    static final String NONE = "–";

    private static final double CELSIUS_ZERO_K = 273.15; // exact, SI Brochure 9th ed.
    private static final String NARROW_SPACE = "\u202f";
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final int HIGHEST_PLAIN = 7; // powers of ten from here on
    private static final int LOWEST_PLAIN = -4; // and below here
    private static final int GROUPED_FROM = 5; // digits before the point
    private static final DateTimeFormatter MINUTE = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm", Locale.ROOT);
    private static final DateTimeFormatter CLOCK = DateTimeFormatter.ofPattern("HH:mm:ss", Locale.ROOT);

    private Shown() {}

    /** Value ± standard uncertainty, e.g. {@code 160.0 ± 1.8}. */
    static String pm(Estimate estimate) {
        if (!estimate.isKnown()) {
            return NONE;
        }
        return estimate.u() > 0.0
                ? grouped(Rounded.value(estimate)) + " ± " + grouped(Rounded.uncertainty(estimate))
                : grouped(Rounded.value(estimate));
    }

    /** Value alone, rounded to its uncertainty. */
    static String value(Estimate estimate) {
        return estimate.isKnown() ? grouped(Rounded.value(estimate)) : NONE;
    }

    /** A temperature in °C ± its standard uncertainty. */
    static String celsius(Estimate kelvin) {
        return pm(new Estimate(kelvin.value() - CELSIUS_ZERO_K, kelvin.u(), kelvin.dof()));
    }

    /** An estimate times a factor. */
    static Estimate times(Estimate estimate, double factor) {
        return new Estimate(estimate.value() * factor, estimate.u() * Math.abs(factor), estimate.dof());
    }

    /** A number to so many significant digits. */
    static String digits(double value, int digits) {
        if (!Double.isFinite(value)) {
            return NONE;
        }
        if (value == 0.0) {
            return "0";
        }
        BigDecimal rounded = BigDecimal.valueOf(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
        int exponent = rounded.precision() - rounded.scale() - 1;
        int missing = digits - rounded.precision(); // 0.01 to two digits is written 0.010
        BigDecimal padded = missing > 0 ? rounded.setScale(rounded.scale() + missing) : rounded;
        if (exponent >= HIGHEST_PLAIN || exponent < LOWEST_PLAIN) {
            return grouped(padded.movePointLeft(exponent).toPlainString()) + "·" + powerOfTen(exponent);
        }
        return grouped(padded.toPlainString());
    }

    /** 10 raised to a whole number, e.g. {@code 10⁻⁶}. */
    static String powerOfTen(int exponent) {
        StringBuilder power = new StringBuilder(exponent < 0 ? "10⁻" : "10");
        for (char digit : String.valueOf(Math.abs(exponent)).toCharArray()) {
            power.append(RAISED.charAt(digit - '0'));
        }
        return power.toString();
    }

    /** A number with so many decimals. */
    static String fixed(double value, int decimals) {
        return Double.isFinite(value)
                ? String.format(Locale.ROOT, "%." + decimals + "f", value).replace('-', '−')
                : NONE;
    }

    /** A number with its sign and so many decimals, e.g. {@code +1.3}. */
    static String signed(double value, int decimals) {
        return Double.isFinite(value)
                ? String.format(Locale.ROOT, "%+." + decimals + "f", value).replace('-', '−')
                : NONE;
    }

    /** A share as a percentage. */
    static String percent(double share, int decimals) {
        return fixed(100.0 * share, decimals) + " %";
    }

    /** A moment to the minute in a zone. */
    static String minute(double epochS, ZoneId zone) {
        return MINUTE.format(Instant.ofEpochMilli(Math.round(epochS * 1000)).atZone(zone));
    }

    /** The time of day of a moment in a zone. */
    static String clock(double epochS, ZoneId zone) {
        return CLOCK.format(Instant.ofEpochMilli(Math.round(epochS * 1000)).atZone(zone));
    }

    /** The usual fractions as fractions, other exponents as numbers. */
    static String exponent(double n) {
        for (Map.Entry<String, Double> known :
                Map.of("1/3", 1.0 / 3.0, "1/2", 0.5, "2/5", 0.4).entrySet()) {
            if (Math.abs(known.getValue() - n) < 1e-12) {
                return known.getKey();
            }
        }
        return digits(n, 4);
    }

    /** The true minus sign, and a narrow space between groups of three digits before the point from five digits on. */
    private static String grouped(String number) {
        String sign = number.startsWith("-") ? "−" : "";
        String plain = number.startsWith("-") ? number.substring(1) : number;
        int end = 0;
        while (end < plain.length() && Character.isDigit(plain.charAt(end))) {
            end++;
        }
        if (end < GROUPED_FROM) {
            return sign + plain;
        }
        StringBuilder text = new StringBuilder(sign);
        for (int i = 0; i < end; i++) {
            if (i > 0 && (end - i) % 3 == 0) {
                text.append(NARROW_SPACE);
            }
            text.append(plain.charAt(i));
        }
        return text.append(plain.substring(end)).toString();
    }
}
