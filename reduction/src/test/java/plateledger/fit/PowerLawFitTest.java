package plateledger.fit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import plateledger.finding.Finding;
import plateledger.finding.RefusedException;
import plateledger.validation.ValidationRecorder;

final class PowerLawFitTest {
    private static double correlation(Constants c) {
        return c.covAM() / Math.sqrt(c.varA() * c.varM());
    }

    private static FitResult fit(FitProblem problem) {
        try {
            return PowerLawFit.fit(problem);
        } catch (RefusedException refused) {
            throw new AssertionError(refused);
        }
    }

    private static boolean has(List<Finding> findings, String id) {
        return findings.stream().anyMatch(f -> f.id().equals(id));
    }

    private static FitProblem uniform(FitProblem problem) {
        List<FitPoint> points = new ArrayList<>();
        for (FitPoint p : problem.points()) {
            points.add(new FitPoint(p.id(), p.set(), p.re(), p.nu(), p.pr(), 0.0, 0.0111880658, 0.0));
        }
        return new FitProblem(problem.id(), problem.prandtlExponent(), points, List.of());
    }

    /** Without errors in ln Re and with equal ones in ln Nu the fit is ordinary least squares. */
    @Test
    @Tag("validation")
    void ordinaryLeastSquaresAsSpecialCase() {
        try (ValidationRecorder check = ValidationRecorder.of(
                getClass(),
                "Fit",
                "campaign of 24 runs: ordinary least squares, studentised residual",
                "computed in Python and R")) {
            FitResult fit = fit(uniform(Points.nufit()));
            check.relative(13.353766833333, fit.twoStep().xg(), 8e-13, "fit.twoStep().xg()");
            check.relative(7.0579445833, fit.twoStep().a(), 2e-10, "fit.twoStep().a()");
            check.relative(0.8015859546, fit.twoStep().m(), 2e-9, "fit.twoStep().m()");
            // the uncertainty put in is the residual standard deviation, so the usual standard errors come out
            check.relative(0.0022837544, Math.sqrt(fit.twoStep().varA()), 5e-7, "sqrt(fit.twoStep().varA())");
            check.relative(0.0030324587, fit.twoStep().uM(), 4e-7, "fit.twoStep().uM()");
            check.relative(22.0, fit.chiSquare(), 5e-8, "fit.chiSquare()");
            ResidualTests tests = ResidualTests.of(fit);
            check.relative(2.0871167344, tests.largestStudentised(), 5e-8, "tests.largestStudentised()");
            assertEquals("R4", fit.problem().points().get(tests.at()).id());
        }
    }

    /** The random parts alone; expected values computed in SciPy 1.10 by two routes. */
    @Test
    @Tag("validation")
    void bothAxesFitWithRandomParts() {
        try (ValidationRecorder check = ValidationRecorder.of(
                getClass(),
                "Fit",
                "campaign of 24 runs: both-axes fit, random parts",
                "computed by two routes in SciPy")) {
            FitResult fit = fit(Points.nufit());
            check.relative(7.0579030662, fit.randomOnly().a(), 2e-10, "fit.randomOnly().a()");
            check.relative(0.8022665366, fit.randomOnly().m(), 2e-9, "fit.randomOnly().m()");
            check.relative(0.0018540119, Math.sqrt(fit.randomOnly().varA()), 6e-7, "sqrt(fit.randomOnly().varA())");
            check.relative(0.0024576006, fit.randomOnly().uM(), 5e-7, "fit.randomOnly().uM()");
            check.relative(32.272551959, fit.chiSquare(), 4e-9, "fit.chiSquare()");
            assertEquals(22, fit.dof());
        }
    }

    /** The default: random parts and the shifts of six shared sources. */
    @Test
    @Tag("validation")
    void twoStepFit() {
        try (ValidationRecorder check =
                ValidationRecorder.of(getClass(), "Fit", "campaign of 24 runs: two-step fit", "computed in SciPy")) {
            FitResult fit = fit(Points.nufit());
            check.relative(7.0579030662, fit.twoStep().a(), 2e-10, "fit.twoStep().a()");
            check.relative(0.8022665366, fit.twoStep().m(), 2e-9, "fit.twoStep().m()");
            check.relative(0.0140230924, Math.sqrt(fit.twoStep().varA()), 8e-7, "sqrt(fit.twoStep().varA())");
            check.relative(0.0025634769, fit.twoStep().uM(), 4e-7, "fit.twoStep().uM()");
            check.relative(0.0637260759, correlation(fit.twoStep()), 2e-5, "correlation(fit.twoStep())");
            check.relative(1.959963984540054, fit.coverageFactor(), 6e-13, "fit.coverageFactor()");
        }
    }

    /** The two-step band at Re = 10⁶ against refits with drawn errors: u(a) 0.013945, u(m) 0.002572 from 20 000 draws (2 %). */
    @Test
    @Tag("validation")
    void twoStepAgainstDrawnErrors() {
        FitResult fit = fit(Points.nufit());
        assertEquals(0.013945, Math.sqrt(fit.twoStep().varA()), 0.02 * 0.013945);
        assertEquals(0.002572, fit.twoStep().uM(), 0.02 * 0.002572);
    }

    @Test
    @Tag("validation")
    void generalisedFit() {
        try (ValidationRecorder check = ValidationRecorder.of(
                getClass(),
                "Fit",
                "campaign of 24 runs: generalised least squares",
                "computed by two routes in SciPy")) {
            FitResult fit = fit(Points.nufit());
            Constants full = fit.generalised();
            check.relative(7.0576747957, full.a(), 2e-10, "full.a()");
            check.relative(0.8022256408, full.m(), 2e-9, "full.m()");
            check.relative(0.0140222324, Math.sqrt(full.varA()), 8e-8, "sqrt(full.varA())");
            check.relative(0.0025631419, full.uM(), 4e-7, "full.uM()");
            check.relative(0.0635844474, correlation(full), 2e-6, "correlation(full)");
            check.relative(-3.6550593660, Math.log(full.c()), 3e-9, "log(full.c())");
            check.relative(0.0258599622, full.c(), 4e-8, "full.c()");
            check.relative(0.0361540751, full.uLnC(), 3e-7, "full.uLnC()");
            check.relative(7.4280974515, full.lnY(1e6), 2e-10, "full.lnY(1e6)");
            check.relative(0.0141468775, full.uLnY(1e6), 8e-8, "full.uLnY(1e6)");
        }
    }

    /** The wrong way, every error as if independent: the line itself still agrees with the figures computed for it. */
    @Test
    @Tag("validation")
    void everythingAsIfIndependent() {
        FitProblem problem = Points.nufit();
        int n = problem.points().size();
        double[] varX = new double[n];
        double[] varY = new double[n];
        double[] cov = new double[n];
        double[] x = new double[n];
        double[] y = new double[n];
        for (int i = 0; i < n; i++) {
            FitPoint p = problem.points().get(i);
            x[i] = Math.log(p.re());
            y[i] = Math.log(p.nu());
            varX[i] = p.uLnReRandom() * p.uLnReRandom();
            varY[i] = p.uLnYRandom() * p.uLnYRandom();
            for (SharedSource s : problem.sources()) {
                varX[i] += s.dLnRe()[i] * s.dLnRe()[i];
                varY[i] += s.dLnY()[i] * s.dLnY()[i];
                cov[i] += s.dLnRe()[i] * s.dLnY()[i];
            }
        }
        BothAxesLine line = BothAxesLine.fit(x, y, new RandomParts(varX, varY, cov), 13.353766833333)
                .orElseThrow();
        assertEquals(7.0579241067, line.a(), 1e-8);
        assertEquals(0.8017884780, line.b(), 1e-8);
        assertEquals(0.0033905590, Math.sqrt(line.varA()), 1e-8);
        assertEquals(0.0045155828, Math.sqrt(line.varB()), 1e-8);
    }

    /** Curved data with replicates: F(4, 18) = 10.966, p = 1.1e-4; quadratic term F(1, 21) = 32.67. */
    @Test
    @Tag("validation")
    void lackOfFitAgainstReplicates() {
        try (ValidationRecorder check = ValidationRecorder.of(
                getClass(), "Fit", "lack of fit against replicates", "computed in Python and R")) {
            FitResult fit = fit(Points.replicates(0.012));
            check.relative(6.6429494167, fit.twoStep().a(), 2e-10, "fit.twoStep().a()");
            check.relative(0.8005676573, fit.twoStep().m(), 2e-9, "fit.twoStep().m()");
            check.relative(10.9659, fit.lackOfFitF(), 5e-6, "fit.lackOfFitF()");
            check.relative(0.00011032, fit.lackOfFitProbability(), 5e-5, "fit.lackOfFitProbability()");
            check.relative(Math.sqrt(0.002001174387 / 18.0), fit.repeatScatter(), 1e-7, "fit.repeatScatter()");
            check.relative(0.006877770423 / (0.012 * 0.012), fit.chiSquare(), 3e-8, "fit.chiSquare()");
            assertTrue(has(fit.findings(), "FIT-LACK"));
            assertTrue(has(fit.findings(), "FIT-BEND"));
        }
    }

    @Test
    void soundDataRaiseNoFindingOfForm() {
        FitResult fit = fit(Points.nufit());
        assertFalse(has(fit.findings(), "FIT-LACK"));
        assertFalse(has(fit.findings(), "FIT-BEND"));
        assertFalse(has(fit.findings(), "FIT-METHODS"));
        assertFalse(has(fit.findings(), "FIT-PULL"));
    }

    /** A bend of 4 % between the middle and the ends, at a random uncertainty of 1 % per run. */
    @Test
    void aBentTruthIsSeen() {
        List<double[]> rows = Points.table("nufit.csv");
        for (double[] row : rows) {
            double d = (row[1] - 13.35) / 1.15;
            row[2] -= 0.04 * d * d;
        }
        FitResult fit = fit(Points.nufit(rows));
        assertTrue(has(fit.findings(), "FIT-LACK"));
        assertTrue(has(fit.findings(), "FIT-BEND"));
    }

    /** All ln Nu lifted by 6 %: a moves by that, m not at all. */
    @Test
    void aCommonScaleErrorMovesOnlyA() {
        FitResult before = fit(Points.nufit());
        List<double[]> rows = Points.table("nufit.csv");
        rows.forEach(row -> row[2] += 0.06);
        FitResult after = fit(Points.nufit(rows));
        assertEquals(before.twoStep().a() + 0.06, after.twoStep().a(), 1e-11);
        assertEquals(before.twoStep().m(), after.twoStep().m(), 1e-12);
    }

    /** The shift that a pure scale source (k, 1 %) brings is the whole 1 % in a and nothing in m; of U it is −m · 0.8 % in a. */
    @Test
    void shiftsOfScaleSources() {
        FitResult fit = fit(Points.nufit());
        assertEquals(-0.01, fit.sourceShifts()[4][0], 1e-11);
        assertEquals(0.0, fit.sourceShifts()[4][1], 1e-12);
        assertEquals(-0.008 * fit.twoStep().m(), fit.sourceShifts()[0][0], 1e-11);
        assertEquals(0.0, fit.sourceShifts()[0][1], 1e-12);
        // an absolute error of ΔT tilts the line, since ΔT falls along the campaign
        assertTrue(Math.abs(fit.sourceShifts()[5][1]) > 1e-4);
    }

    /** One source of 5 dof far above all else: k is t(5) = 2.5706 (JCGM 100, table G.2: 2.57). */
    @Test
    void finiteDegreesOfFreedomWidenTheInterval() {
        FitProblem p = Points.nufit();
        double[] lift = new double[24];
        java.util.Arrays.fill(lift, 10.0);
        double[] none = new double[24];
        FitProblem loud =
                new FitProblem(p.id(), 0.0, p.points(), List.of(new SharedSource("big", "rig", none, lift, 5.0)));
        assertEquals(2.57, fit(loud).coverageFactor(), 0.005);
    }

    @Property(tries = 30)
    void permutingPointsChangesNothing(@ForAll Random random) {
        List<double[]> rows = Points.table("nufit.csv");
        FitResult before = fit(Points.nufit(rows));
        List<double[]> shuffled = new ArrayList<>(rows);
        Collections.shuffle(shuffled, random);
        FitResult after = fit(Points.nufit(shuffled));
        assertEquals(before.twoStep().a(), after.twoStep().a(), 1e-12);
        assertEquals(before.twoStep().m(), after.twoStep().m(), 1e-12);
        assertEquals(before.twoStep().varA(), after.twoStep().varA(), 1e-12);
        assertEquals(before.generalised().m(), after.generalised().m(), 1e-11);
        assertEquals(before.lackOfFitF(), after.lackOfFitF(), 1e-8);
        for (int s = 0; s < before.pulls().length; s++) {
            assertEquals(before.pulls()[s], after.pulls()[s], 1e-7);
        }
    }

    /** Points on a power law give it back, whatever their errors; n is held, so Nu ∝ Pr^n goes through exactly. */
    @Property(tries = 100)
    void exactPointsGiveTheirConstantsBack(
            @ForAll @DoubleRange(min = 0.02, max = 0.7) double c,
            @ForAll @DoubleRange(min = 0.3, max = 0.9) double m,
            @ForAll @DoubleRange(min = -0.9, max = 0.9) double r) {
        List<FitPoint> points = new ArrayList<>();
        for (int i = 0; i < 6; i++) {
            double re = 1e5 * Math.pow(1.6, i);
            double pr = 0.7 + 0.01 * i;
            points.add(new FitPoint(
                    "R" + i, "", re, c * Math.pow(re, m) * Math.cbrt(pr), pr, 0.004 + 0.001 * i, 0.006, r));
        }
        FitResult fit = fit(new FitProblem("exact", 1.0 / 3.0, points, List.of()));
        assertEquals(c, fit.twoStep().c(), 1e-9 * c);
        assertEquals(m, fit.twoStep().m(), 1e-10);
        assertEquals(m, fit.generalised().m(), 1e-10);
        assertTrue(Double.isNaN(fit.lackOfFitF()));
        assertTrue(Intervals.c(fit).holds(c));
        assertTrue(Intervals.m(fit).holds(m));
    }

    @Test
    void bandsFollowTheConstants() {
        FitResult fit = fit(Points.nufit());
        Intervals.Interval curve = Intervals.curve(fit, 1e6);
        // generalised fit: [1636.590, 1729.910] with k 1.96; the two-step differs from it by less than 0.1 %
        assertEquals(1636.590, curve.low(), 1.0);
        assertEquals(1729.910, curve.high(), 1.0);
        Intervals.Interval run = Intervals.newRun(fit, 1e6);
        assertTrue(run.low() < curve.low() && run.high() > curve.high());
        double m = fit.twoStep().m();
        // the first level of the set: u(ln Re) 0.01, u(ln Nu) 0.006227
        assertEquals(Math.hypot(0.006227180564, m * 0.01), Intervals.uNewRun(fit, 1.9e5), 1e-9);
    }

    /** Residuals of the both-axes fit in the order of the table: 15 runs, expected 12.917, z 0.876. */
    @Test
    @Tag("validation")
    void runsTest() {
        try (ValidationRecorder check =
                ValidationRecorder.of(getClass(), "Fit", "runs of residuals", "computed in Python")) {
            ResidualTests.Runs runs = ResidualTests.of(fit(Points.nufit())).alongPoints();
            assertEquals(15, runs.runs());
            check.relative(12.9166667, runs.expected(), 8e-8, "runs.expected()");
            check.relative(0.8759922, runs.z(), 2e-6, "runs.z()");
        }
    }

    /** A bent truth leaves three runs along Re: by hand, + − + in order of Re though the points come mixed. */
    @Test
    void runsAlongReAreSortedByRe() {
        double[] lnRe = {12.0, 14.0, 13.0, 12.5, 13.5, 11.5};
        List<FitPoint> points = new ArrayList<>();
        for (double x : lnRe) {
            double d = x - 12.75;
            points.add(Points.point("R" + points.size(), "", x, 1.0 + 0.5 * x + 0.1 * d * d, 0.001, 0.01, 0.0));
        }
        ResidualTests tests = ResidualTests.of(fit(new FitProblem("bent", 0.0, points, List.of())));
        assertEquals(3, tests.alongRe().runs());
        assertTrue(tests.alongPoints().runs() > 3);
    }

    @Test
    void refusesWhatCannotBeFitted() {
        FitProblem p = Points.nufit();
        refused("FIT-FEW", new FitProblem("x", 0.0, p.points().subList(0, 2), List.of()));
        FitPoint good = p.points().get(0);
        FitPoint silent = new FitPoint("Z", "", 1e6, 1000.0, 0.7, 0.0, 0.0, 0.0);
        refused("FIT-RANDOM", new FitProblem("x", 0.0, List.of(good, p.points().get(9), silent), List.of()));
        FitPoint unknown = new FitPoint("Z", "", 1e6, Double.NaN, 0.7, 0.01, 0.01, 0.0);
        refused("FIT-POINT", new FitProblem("x", 0.0, List.of(good, p.points().get(9), unknown), List.of()));
        refused("FIT-SPREAD", new FitProblem("x", 0.0, List.of(good, good, good), List.of()));
        double[] hole = new double[24];
        hole[3] = Double.NaN;
        SharedSource broken = new SharedSource("gone", "rig", hole, new double[24], 10.0);
        refused("FIT-SOURCE", new FitProblem("x", 0.0, p.points(), List.of(broken)));
    }

    private static void refused(String id, FitProblem problem) {
        RefusedException seen = assertThrows(RefusedException.class, () -> PowerLawFit.fit(problem));
        assertTrue(has(seen.findings(), id), seen.getMessage());
    }
}
