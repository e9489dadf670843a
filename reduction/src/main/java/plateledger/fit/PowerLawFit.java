package plateledger.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.finding.RefusedException;
import plateledger.uncertainty.Combined;

/**
 * Fits ln(Nu/Pr^n) = a + m (ln Re − x_g) in two steps: a line with errors in both axes, weighted with the random parts of
 * the points, then every shared source perturbed and its shift of the constants added. Generalised least squares with the
 * full covariance stands beside it. METHODS.md section Fit.
 *
 * <p>All covariances are absolute: they come from the stated uncertainties and are never scaled by the residuals. Scatter
 * beyond what is stated is a finding instead.
 */
public final class PowerLawFit {
    /** What the covariances are, for the results file. */
    public static final String COVARIANCE_KIND = "absolute";

    private static final int FEWEST_POINTS = 3;

    private PowerLawFit() {}

    /**
     * Makes the fit.
     *
     * @throws RefusedException if there are fewer than three points, a point has no random uncertainty or a value that is
     *     not a positive number, the Reynolds numbers do not differ by more than their random uncertainties, or the
     *     solution does not settle
     */
    public static FitResult fit(FitProblem problem) throws RefusedException {
        refuseUnusable(problem);
        List<FitPoint> points = problem.points();
        int n = points.size();
        double[] x = new double[n];
        double[] y = new double[n];
        double xg = 0.0;
        for (int i = 0; i < n; i++) {
            FitPoint p = points.get(i);
            x[i] = Math.log(p.re());
            y[i] = Math.log(p.nu()) - problem.prandtlExponent() * Math.log(p.pr());
            xg += x[i] / n;
        }
        RandomParts parts = RandomParts.of(points);
        BothAxesLine line = BothAxesLine.fit(x, y, parts, xg).orElseThrow(() -> notSolved(problem, "both-axes fit"));
        double[][] shifts = shifts(problem, x, y, parts, xg);
        double[] residuals = new double[n];
        for (int i = 0; i < n; i++) {
            residuals[i] = y[i] - line.a() - line.b() * (x[i] - xg);
        }
        Constants randomOnly = new Constants(xg, line.a(), line.b(), line.varA(), line.varB(), line.covAB());
        Constants twoStep = withShifts(randomOnly, shifts);
        PointCovariance covariance = new PointCovariance(parts, problem.sources());
        FullCovarianceLine full =
                FullCovarianceLine.fit(x, y, covariance, line).orElseThrow(() -> notSolved(problem, "generalised fit"));
        double[] pulls = pulls(problem.sources(), full);
        double[][] v = covariance.ofResiduals(line.b());
        LackOfFit lack = LackOfFit.of(points, x, residuals, line, v);
        List<Finding> findings = FitFindings.of(problem, lack, x, pulls, new Difference(line, full, v), twoStep);
        return new FitResult(
                problem,
                twoStep,
                randomOnly,
                full.constants(),
                lack.chiSquare(),
                lack.dof(),
                lack.probability(),
                lack.f(),
                lack.fProbability(),
                lack.repeatScatter(),
                residuals,
                pulls,
                shifts,
                coverageFactor(randomOnly, shifts, problem.sources()),
                findings);
    }

    /** Half the difference of the constants at +u and −u of each shared source, centre and random parts kept. */
    private static double[][] shifts(FitProblem problem, double[] x, double[] y, RandomParts parts, double xg)
            throws RefusedException {
        double[][] shifts = new double[problem.sources().size()][];
        for (int s = 0; s < shifts.length; s++) {
            SharedSource source = problem.sources().get(s);
            BothAxesLine up = moved(problem, source, 1.0, x, y, parts, xg);
            BothAxesLine down = moved(problem, source, -1.0, x, y, parts, xg);
            shifts[s] = new double[] {0.5 * (up.a() - down.a()), 0.5 * (up.b() - down.b())};
        }
        return shifts;
    }

    private static BothAxesLine moved(
            FitProblem problem, SharedSource source, double by, double[] x, double[] y, RandomParts parts, double xg)
            throws RefusedException {
        double[] movedX = new double[x.length];
        double[] movedY = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            movedX[i] = x[i] + by * source.dLnRe()[i];
            movedY[i] = y[i] + by * source.dLnY()[i];
        }
        return BothAxesLine.fit(movedX, movedY, parts, xg)
                .orElseThrow(() -> notSolved(problem, "fit with " + source.name() + " moved by its u"));
    }

    private static Constants withShifts(Constants random, double[][] shifts) {
        double varA = random.varA();
        double varM = random.varM();
        double covAM = random.covAM();
        for (double[] d : shifts) {
            varA += d[0] * d[0];
            varM += d[1] * d[1];
            covAM += d[0] * d[1];
        }
        return new Constants(random.xg(), random.a(), random.m(), varA, varM, covAM);
    }

    /** Best linear estimate of each source, in units of its u: z_s = A_sᵀ V⁻¹ r, A_s = d ln Y − m d ln Re. */
    private static double[] pulls(List<SharedSource> sources, FullCovarianceLine full) {
        double[] pulls = new double[sources.size()];
        for (int s = 0; s < pulls.length; s++) {
            SharedSource source = sources.get(s);
            for (int i = 0; i < full.whitened().length; i++) {
                pulls[s] += (source.dLnY()[i] - full.constants().m() * source.dLnRe()[i]) * full.whitened()[i];
            }
        }
        return pulls;
    }

    /**
     * The larger of the factors of a, m and ln C: Welch–Satterthwaite over the shared sources, the random part taken as
     * known.
     */
    private static double coverageFactor(Constants random, double[][] shifts, List<SharedSource> sources) {
        double[] dof = new double[shifts.length + 1];
        dof[0] = Double.POSITIVE_INFINITY;
        double[][] effects = new double[3][shifts.length + 1];
        effects[0][0] = Math.sqrt(random.varA());
        effects[1][0] = random.uM();
        effects[2][0] = random.uLnC();
        for (int s = 0; s < shifts.length; s++) {
            dof[s + 1] = sources.get(s).dof();
            effects[0][s + 1] = shifts[s][0];
            effects[1][s + 1] = shifts[s][1];
            effects[2][s + 1] = shifts[s][0] - random.xg() * shifts[s][1];
        }
        double k = 0.0;
        for (double[] g : effects) {
            k = Math.max(k, Combined.of(0.0, g, dof).coverageFactor());
        }
        return k;
    }

    private static void refuseUnusable(FitProblem problem) throws RefusedException {
        List<Finding> findings = new ArrayList<>();
        int n = problem.points().size();
        if (n < FEWEST_POINTS) {
            findings.add(stop(
                    problem, "FIT-FEW", n + " points", "at least " + FEWEST_POINTS, "Add runs, or leave fewer out."));
        }
        for (FitPoint p : problem.points()) {
            if (!positive(p.re()) || !positive(p.nu()) || !positive(p.pr())) {
                findings.add(stop(
                        problem,
                        "FIT-POINT",
                        "run %s with Re %s, Nu %s, Pr %s".formatted(p.id(), p.re(), p.nu(), p.pr()),
                        "positive numbers",
                        "Leave the run out with a reason, or mend it."));
            }
            boolean usable = p.uLnReRandom() >= 0.0
                    && p.uLnYRandom() >= 0.0
                    && positive(p.uLnReRandom() + p.uLnYRandom())
                    && Math.abs(p.correlationRandom()) <= 1.0;
            if (!usable) {
                findings.add(stop(
                        problem,
                        "FIT-RANDOM",
                        "run %s with random u(ln Re) %s, u(ln Y) %s, correlation %s"
                                .formatted(p.id(), p.uLnReRandom(), p.uLnYRandom(), p.correlationRandom()),
                        "a positive random uncertainty, from which the run gets its weight",
                        "State what is drawn anew in each run: setting, mean, mounting."));
            }
        }
        for (SharedSource source : problem.sources()) {
            if (source.dLnRe().length != n || source.dLnY().length != n) {
                throw new IllegalArgumentException(
                        "source " + source.name() + " has not one effect for each of " + n + " points");
            }
            for (int i = 0; i < n; i++) {
                if (!Double.isFinite(source.dLnRe()[i]) || !Double.isFinite(source.dLnY()[i])) {
                    findings.add(stop(
                            problem,
                            "FIT-SOURCE",
                            "no effect of %s on run %s"
                                    .formatted(
                                            source.name(),
                                            problem.points().get(i).id()),
                            "a number",
                            "The run cannot be evaluated at the input's limits: leave it out or narrow the input."));
                }
            }
        }
        if (findings.isEmpty()) {
            refuseWithoutSpread(problem, findings);
        }
        if (!findings.isEmpty()) {
            throw new RefusedException(findings);
        }
    }

    /** The slope has no meaning where Re differs by no more than chance. */
    private static void refuseWithoutSpread(FitProblem problem, List<Finding> findings) {
        double n = problem.points().size();
        double mean =
                problem.points().stream().mapToDouble(p -> Math.log(p.re())).sum() / n;
        double spread = problem.points().stream()
                .mapToDouble(p -> Math.pow(Math.log(p.re()) - mean, 2))
                .sum();
        double noise = problem.points().stream()
                .mapToDouble(p -> p.uLnReRandom() * p.uLnReRandom())
                .sum();
        double rounding = n * Math.pow(1e-9 * Math.max(1.0, Math.abs(mean)), 2);
        if (!(spread > 4.0 * noise + rounding)) {
            findings.add(stop(
                    problem,
                    "FIT-SPREAD",
                    String.format(
                            Locale.ROOT,
                            "standard deviation of ln Re %.3g with random u %.3g",
                            Math.sqrt(spread / n),
                            Math.sqrt(noise / n)),
                    "at least twice that u",
                    "Add runs at other speeds."));
        }
    }

    private static boolean positive(double value) {
        return value > 0.0 && Double.isFinite(value);
    }

    private static RefusedException notSolved(FitProblem problem, String what) {
        return new RefusedException(stop(
                problem,
                "FIT-UNSOLVED",
                what + " without a settled solution",
                "one",
                "Look at the points: one far off, or uncertainties of very different size."));
    }

    private static Finding stop(FitProblem problem, String id, String found, String expected, String remedy) {
        return new Finding(id, Level.STOP, Place.NOWHERE, "fit " + problem.id(), found, expected, remedy, "");
    }
}
