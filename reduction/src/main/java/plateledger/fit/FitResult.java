package plateledger.fit;

import java.util.List;
import plateledger.finding.Finding;

/**
 * A finished fit. Its covariances are absolute: from the stated uncertainties, never scaled by the residuals.
 *
 * @param problem what was fitted
 * @param twoStep the default: both-axes fit weighted with the random parts, shared sources added by perturbation
 * @param randomOnly the same constants with the covariance of the random parts alone
 * @param generalised generalised least squares with the full covariance, for comparison
 * @param chiSquare weighted sum of squares of the two-step fit (random parts only)
 * @param dof its degrees of freedom
 * @param chiSquareProbability probability of a larger value, random parts only; findings allow for the part that shared
 *     sources add when they do not act alike on all points
 * @param lackOfFitF F of lack of fit against repeats; NaN without repeats
 * @param lackOfFitProbability its probability; NaN without repeats
 * @param repeatScatter relative standard deviation within repeats of ln Y; NaN without repeats
 * @param residuals ln Y measured − fitted, in point order
 * @param pulls estimated pull of each shared source in the generalised fit, in units of its u, in source order
 * @param sourceShifts shift (Δa, Δm) of the two-step constants for +1 u of each shared source, in source order
 * @param coverageFactor k of the 95 % intervals
 * @param findings lack of fit, pulls beyond 2, disagreement of the two fits
 */
public record FitResult(
        FitProblem problem,
        Constants twoStep,
        Constants randomOnly,
        Constants generalised,
        double chiSquare,
        int dof,
        double chiSquareProbability,
        double lackOfFitF,
        double lackOfFitProbability,
        double repeatScatter,
        double[] residuals,
        double[] pulls,
        double[][] sourceShifts,
        double coverageFactor,
        List<Finding> findings) {
    /** Copies the findings. */
    public FitResult {
        findings = List.copyOf(findings);
    }
}
