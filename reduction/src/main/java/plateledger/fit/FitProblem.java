package plateledger.fit;

import java.util.List;

/**
 * The fit to be made: ln(Nu/Pr^n) = ln C + m ln Re.
 *
 * @param id name of the fit
 * @param prandtlExponent n, held fixed
 * @param points the points
 * @param sources the shared sources
 */
public record FitProblem(String id, double prandtlExponent, List<FitPoint> points, List<SharedSource> sources) {
    /** Copies the lists. */
    public FitProblem {
        points = List.copyOf(points);
        sources = List.copyOf(sources);
    }
}
