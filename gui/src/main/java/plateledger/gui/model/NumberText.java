package plateledger.gui.model;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import plateledger.quantity.Estimate;
import plateledger.quantity.Rounded;
import plateledger.uncertainty.Coverage;

/**
 * Numbers as the window shows them: rounded to their 95 % interval U = t_0.975(dof) u (JCGM 100:2008, G.3), with {@code .}
 * as decimal mark and narrow spaces between groups of three digits from five digits on.
 */
public final class NumberText {
    private static final String NOT_KNOWN = "–";
    private static final String NARROW_SPACE = "\u202f";
    private static final int DIGITS_ALONE = 4;
    private static final int GROUPED_FROM = 5;
    private static final int GROUP = 3;

    private NumberText() {}

    /** Half-width of the 95 % interval, in the estimate's unit; NaN where the value or u is not known. */
    public static double u95(Estimate estimate) {
        boolean known = estimate.isKnown() && Double.isFinite(estimate.u());
        return known ? Coverage.factor(estimate.dof()) * estimate.u() : Double.NaN;
    }

    /** Value and 95 % interval, e.g. {@code 512.3 ± 4.1}; an en dash where the value is not known. */
    public static String withInterval(Estimate estimate) {
        return withInterval(estimate.value(), u95(estimate));
    }

    /** Value and half-width, both in the unit shown; the value alone where the half-width is zero or not known. */
    public static String withInterval(double value, double halfWidth) {
        if (!Double.isFinite(value)) {
            return NOT_KNOWN;
        }
        if (!(halfWidth > 0.0) || Double.isInfinite(halfWidth)) {
            return plain(value);
        }
        Estimate shown = Estimate.of(value, halfWidth);
        return grouped(Rounded.value(shown)) + " ± " + grouped(Rounded.uncertainty(shown));
    }

    /** The value alone, to the decimal place of its interval's first significant digit. */
    public static String toInterval(Estimate estimate) {
        double half = u95(estimate);
        if (!estimate.isKnown() || !(half > 0.0) || Double.isInfinite(half)) {
            return plain(estimate.value());
        }
        int scale = BigDecimal.valueOf(half)
                .round(new MathContext(1, RoundingMode.HALF_UP))
                .scale();
        return grouped(BigDecimal.valueOf(estimate.value())
                .setScale(scale, RoundingMode.HALF_EVEN)
                .toPlainString());
    }

    /** A value without interval to four significant digits; an en dash where it is not known. */
    public static String plain(double value) {
        if (!Double.isFinite(value)) {
            return NOT_KNOWN;
        }
        BigDecimal v = BigDecimal.valueOf(value).round(new MathContext(DIGITS_ALONE, RoundingMode.HALF_EVEN));
        return v.signum() == 0 ? "0" : grouped(v.stripTrailingZeros().toPlainString());
    }

    /** The true minus sign, and narrow spaces before the decimal mark. */
    private static String grouped(String number) {
        String sign = number.startsWith("-") ? "−" : "";
        String digits = sign.isEmpty() ? number : number.substring(1);
        int point = digits.indexOf('.') < 0 ? digits.length() : digits.indexOf('.');
        if (point < GROUPED_FROM || digits.indexOf('E') >= 0 || digits.indexOf('·') >= 0) {
            return sign + digits;
        }
        StringBuilder text = new StringBuilder(sign);
        for (int i = 0; i < point; i++) {
            boolean groupEnds = i > 0 && (point - i) % GROUP == 0;
            text.append(groupEnds ? NARROW_SPACE : "").append(digits.charAt(i));
        }
        return text.append(digits.substring(point)).toString();
    }
}
