package plateledger.gui.model;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import org.apache.commons.math3.distribution.TDistribution;
import plateledger.quantity.Estimate;

/**
 * Numbers as text: rounded to their uncertainty, with {@code .} as decimal mark everywhere. An interval shown is the 95 %
 * interval U = t_0.975(dof) u (JCGM 100:2008, G.3); two significant digits of U (JCGM 100:2008, 7.2.6).
 */
public final class Rounded {
    private static final double NORMAL_95 = 1.959964; // 0.975 quantile of the standard normal distribution
    private static final double DOF_TAKEN_AS_INFINITE = 1.0e4;
    private static final int DIGITS_OF_U = 2;
    private static final int DIGITS_ALONE = 4;
    private static final int LONGEST_PLAIN_EXPONENT = 6;

    private Rounded() {}

    /** Half-width of the 95 % interval, in the estimate's unit; NaN where the value or u is not known. */
    public static double u95(Estimate estimate) {
        if (!estimate.isKnown() || !Double.isFinite(estimate.u())) {
            return Double.NaN;
        }
        double dof = estimate.dof();
        boolean large = !(dof < DOF_TAKEN_AS_INFINITE);
        return estimate.u()
                * (large ? NORMAL_95 : new TDistribution(Math.max(1.0, dof)).inverseCumulativeProbability(0.975));
    }

    /** Value and 95 % interval, e.g. {@code 512.3 ± 4.1}; an en dash where the value is not known. */
    public static String withInterval(Estimate estimate) {
        return withInterval(estimate.value(), u95(estimate));
    }

    /** The value alone, to the decimal place of its interval's first significant digit. */
    public static String toInterval(Estimate estimate) {
        double half = u95(estimate);
        if (!estimate.isKnown() || !(half > 0.0) || Double.isInfinite(half)) {
            return plain(estimate.value());
        }
        int scale = new BigDecimal(half)
                .round(new MathContext(1, RoundingMode.HALF_UP))
                .scale();
        return new BigDecimal(estimate.value())
                .setScale(scale, RoundingMode.HALF_EVEN)
                .toPlainString();
    }

    /** Value and half-width, both in the unit shown. */
    public static String withInterval(double value, double halfWidth) {
        if (!Double.isFinite(value)) {
            return "–";
        }
        if (!(halfWidth > 0.0) || Double.isInfinite(halfWidth)) {
            return plain(value);
        }
        BigDecimal u = new BigDecimal(halfWidth).round(new MathContext(DIGITS_OF_U, RoundingMode.HALF_UP));
        BigDecimal v = new BigDecimal(value).setScale(u.scale(), RoundingMode.HALF_EVEN);
        int exponent = v.signum() == 0 ? 0 : v.precision() - v.scale() - 1;
        if (exponent >= LONGEST_PLAIN_EXPONENT) {
            BigDecimal unit = BigDecimal.ONE.scaleByPowerOfTen(exponent);
            int scale = Math.max(0, u.scale() + exponent);
            return "(%s ± %s)·10%s"
                    .formatted(
                            v.divide(unit, scale, RoundingMode.HALF_EVEN).toPlainString(),
                            u.divide(unit, scale, RoundingMode.HALF_UP).toPlainString(),
                            superscript(exponent));
        }
        return v.toPlainString() + " ± " + u.toPlainString();
    }

    /** A value without interval to four significant digits; an en dash where it is not known. */
    public static String plain(double value) {
        if (!Double.isFinite(value)) {
            return "–";
        }
        BigDecimal v = new BigDecimal(value).round(new MathContext(DIGITS_ALONE, RoundingMode.HALF_EVEN));
        return v.signum() == 0 ? "0" : v.stripTrailingZeros().toPlainString();
    }

    private static String superscript(int exponent) {
        String raised = "⁰¹²³⁴⁵⁶⁷⁸⁹";
        StringBuilder text = new StringBuilder();
        for (char digit : Integer.toString(exponent).toCharArray()) {
            text.append(raised.charAt(digit - '0'));
        }
        return text.toString();
    }
}
