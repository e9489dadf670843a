package plateledger.fit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.uncertainty.Coverage;

/** What is doubtful about a fit that could be made. The limits are common practice (5 %), chosen before looking. */
final class FitFindings {
    private static final double SIGNIFICANT = 0.05;
    private static final double PULL_LIMIT = 2.0;
    /** A pair of differences at 5 % together: 97.5 % each, two-sided normal. */
    private static final double PAIR_LIMIT = 2.2414;
    /** Differences below this share of the stated uncertainty do not matter, significant or not. */
    private static final double IMMATERIAL = 0.1;

    private final List<Finding> findings = new ArrayList<>();
    private final String subject;

    private FitFindings(FitProblem problem) {
        subject = "fit " + problem.id();
    }

    static List<Finding> of(
            FitProblem problem, LackOfFit lack, double[] x, double[] pulls, Difference difference, Constants twoStep) {
        FitFindings out = new FitFindings(problem);
        out.lack(lack, x);
        for (int s = 0; s < pulls.length; s++) {
            if (Math.abs(pulls[s]) > PULL_LIMIT) {
                out.pull(problem.sources().get(s), pulls[s]);
            }
        }
        out.methods(difference, twoStep);
        return out.findings;
    }

    private void lack(LackOfFit lack, double[] x) {
        if (lack.fProbabilityShared() < SIGNIFICANT) {
            caution(
                    "FIT-LACK",
                    text(
                            "F(%d, %d) = %.3g of lack of fit against repeats, probability %.2g with what shared sources"
                                    + " add allowed for",
                            lack.fDof()[0], lack.fDof()[1], lack.f(), lack.fProbabilityShared()),
                    "a probability of at least 0.05",
                    "The power law does not describe the points within the scatter of repeats: look at the residuals, fit"
                            + " a narrower range, or another form.");
        }
        if (lack.probabilityShared() < SIGNIFICANT) {
            caution(
                    "FIT-LACK",
                    text(
                            "χ² = %.4g with %d degrees of freedom, probability %.2g with what shared sources add allowed"
                                    + " for",
                            lack.chiSquare(), lack.dof(), lack.probabilityShared()),
                    "a probability of at least 0.05",
                    "A random part is missing or too small, or the form is wrong. The stated uncertainties are not"
                            + " widened: find the part and state it.");
        } else if (lack.probability() > 1.0 - SIGNIFICANT / 10.0) {
            add(
                    Level.NOTE,
                    "FIT-QUIET",
                    text("χ² = %.4g with %d degrees of freedom", lack.chiSquare(), lack.dof()),
                    text("about %d", lack.dof()),
                    "The points scatter less than stated: the random parts may be too large.");
        }
        if (Math.abs(lack.bend()) > Coverage.NORMAL_95 * lack.uBend()) {
            double range =
                    Arrays.stream(x).max().orElse(0.0) - Arrays.stream(x).min().orElse(0.0);
            caution(
                    "FIT-BEND",
                    text(
                            "a bend of %.2g ± %.1g %% over the range of Re (middle against chord)",
                            -25.0 * lack.bend() * range * range,
                            25.0 * Coverage.NORMAL_95 * lack.uBend() * range * range),
                    "no bend beyond its 95 % interval",
                    "The exponent changes over the range: fit a narrower range, and do not use the constants beyond it.");
        }
    }

    private void pull(SharedSource source, double pull) {
        caution(
                "FIT-PULL",
                text(
                        "the points ask for %s (%s) to be off by %+.1f of its standard uncertainty",
                        source.name(), source.scope(), pull),
                "at most ±2",
                "Check that statement, or whether the form is wrong: a bend looks like such an error. The two-step"
                        + " constants do not use it.");
    }

    private void methods(Difference d, Constants twoStep) {
        boolean a = matters(d.da(), d.uDa(), Math.sqrt(twoStep.varA()));
        boolean m = matters(d.dm(), d.uDm(), twoStep.uM());
        if (a || m) {
            caution(
                    "FIT-METHODS",
                    text(
                            "two-step minus generalised fit: %.2g ± %.1g in a, %.2g ± %.1g in m (standard uncertainties of"
                                    + " the difference)",
                            d.da(), d.uDa(), d.dm(), d.uDm()),
                    "agreement within chance",
                    "The stated uncertainties and the form do not go together: prefer the two-step constants and look for"
                            + " lack of fit.");
        }
    }

    private static boolean matters(double difference, double uDifference, double uStated) {
        return Math.abs(difference) > PAIR_LIMIT * uDifference && Math.abs(difference) > IMMATERIAL * uStated;
    }

    private void caution(String id, String found, String expected, String remedy) {
        add(Level.CAUTION, id, found, expected, remedy);
    }

    private void add(Level level, String id, String found, String expected, String remedy) {
        findings.add(new Finding(id, level, Place.NOWHERE, subject, found, expected, remedy, ""));
    }

    private static String text(String format, Object... values) {
        return String.format(Locale.ROOT, format, values);
    }
}
