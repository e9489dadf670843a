package plateledger.report;

import plateledger.fit.FitResult;
import plateledger.quantity.Estimate;

/** A fit in one line of plain text, with the same rounding as the report. */
public final class FitSentence {
    private FitSentence() {}

    /** Form and constants with their 95 % intervals and the range they hold for. */
    public static String of(FitResult fit) {
        var c = fit.twoStep();
        double k = fit.coverageFactor();
        return "Fit " + fit.problem().id() + ": Nu = " + FitSection.cValue(c) + " Re^"
                + Shown.value(Estimate.of(c.m(), c.uM())) + " Pr^"
                + Shown.exponent(fit.problem().prandtlExponent())
                + "; 95 % intervals: C " + FitSection.cInterval(c, k) + ", m " + FitSection.mInterval(c, k)
                + "; Re " + Shown.digits(FitSection.lowest(fit), 3) + " to "
                + Shown.digits(FitSection.highest(fit), 3) + "; "
                + fit.problem().points().size() + " runs.";
    }
}
