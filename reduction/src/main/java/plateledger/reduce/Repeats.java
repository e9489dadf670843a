package plateledger.reduce;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import plateledger.campaign.Campaign;
import plateledger.campaign.FitRequest;
import plateledger.campaign.Regime;
import plateledger.fit.FitPoint;
import plateledger.fit.FitProblem;
import plateledger.fit.FitResult;
import plateledger.fit.SharedSource;
import plateledger.rig.Plate;

/**
 * Recognises repeated set points and compares their spread with the one expected: the random parts, and of shared sources
 * what they do unlike to the repeats (the drift of another day). A source that moves all alike adds nothing.
 */
final class Repeats {
    /** Slope used to carry a point to its neighbour's Re where no fit was made: between ½ and ⅘ (common practice). */
    private static final double MIDDLE_SLOPE = 0.65;

    private Repeats() {}

    static List<RepeatSpread> of(Campaign campaign, FitBuilder builder, List<FitResult> fits) {
        List<RepeatSpread> spreads = new ArrayList<>();
        for (Plate plate : campaign.rig().plates()) {
            for (Regime regime : Regime.values()) {
                FitProblem problem = builder.problem(new FitRequest("repeats", plate.id(), regime));
                Map<String, List<FitPoint>> sets = new LinkedHashMap<>();
                for (FitPoint point : problem.points()) {
                    if (!point.set().isEmpty()) {
                        sets.computeIfAbsent(point.set(), s -> new ArrayList<>())
                                .add(point);
                    }
                }
                double slope = slope(campaign, plate.id(), regime, fits);
                sets.forEach((set, points) -> {
                    if (points.size() > 1) {
                        spreads.add(spread(plate.id(), set, points, slope, problem));
                    }
                });
            }
        }
        return spreads;
    }

    private static double slope(Campaign campaign, String plate, Regime regime, List<FitResult> fits) {
        return campaign.fits().stream()
                .filter(r -> r.plate().equals(plate) && r.regime() == regime)
                .flatMap(r -> fits.stream().filter(f -> f.problem().id().equals(r.id())))
                .mapToDouble(f -> f.twoStep().m())
                .findFirst()
                .orElse(MIDDLE_SLOPE);
    }

    /** One set point: ln(Nu/Pr^n) − m ln Re of each point, its standard deviation and the one expected. */
    static RepeatSpread spread(String plate, String set, List<FitPoint> points, double m, FitProblem problem) {
        double n = problem.prandtlExponent();
        double[] y = points.stream()
                .mapToDouble(p -> Math.log(p.nu()) - n * Math.log(p.pr()) - m * Math.log(p.re()))
                .toArray();
        double expected = 0.0;
        for (FitPoint p : points) {
            expected += (p.uLnYRandom() * p.uLnYRandom()
                            + m * m * p.uLnReRandom() * p.uLnReRandom()
                            - 2.0 * m * p.correlationRandom() * p.uLnReRandom() * p.uLnYRandom())
                    / y.length;
        }
        int[] at = points.stream().mapToInt(problem.points()::indexOf).toArray();
        for (SharedSource source : problem.sources()) {
            expected += variance(Arrays.stream(at)
                    .mapToDouble(i -> source.dLnY()[i] - m * source.dLnRe()[i])
                    .toArray());
        }
        return new RepeatSpread(
                plate,
                set,
                points.stream().map(FitPoint::id).toList(),
                Math.sqrt(variance(y)),
                Math.sqrt(Math.max(0.0, expected)));
    }

    /** Σ(v − mean)²/(n − 1). */
    private static double variance(double[] v) {
        double mean = Arrays.stream(v).sum() / v.length;
        return Arrays.stream(v).map(a -> (a - mean) * (a - mean)).sum() / (v.length - 1);
    }
}
