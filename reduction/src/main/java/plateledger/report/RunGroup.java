package plateledger.report;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import plateledger.campaign.Regime;
import plateledger.fit.FitResult;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.RunResult;

/**
 * Reduced heated runs of one plate and regime: one series of a figure.
 *
 * @param plate plate
 * @param regime regime
 * @param runs runs in order of Re
 */
record RunGroup(String plate, Regime regime, List<Point> runs) {
    /**
     * A run with its numbers.
     *
     * @param id run
     * @param run the run
     * @param values its numbers
     */
    record Point(String id, RunResult run, RunResult.Values values) {}

    /** Groups in campaign order. */
    static List<RunGroup> of(CampaignResult result) {
        Map<String, List<Point>> groups = new LinkedHashMap<>();
        for (RunResult run : result.runs()) {
            run.values()
                    .ifPresent(values -> groups.computeIfAbsent(
                                    run.run().plate() + "\n"
                                            + run.run().regime().word(),
                                    k -> new java.util.ArrayList<>())
                            .add(new Point(run.run().id(), run, values)));
        }
        return groups.values().stream()
                .map(points -> new RunGroup(
                        points.get(0).run().run().plate(),
                        points.get(0).run().run().regime(),
                        points.stream()
                                .sorted(java.util.Comparator.comparingDouble(
                                        p -> p.values().reL().value()))
                                .toList()))
                .toList();
    }

    /** Name shown, e.g. {@code baseline, laminar}; the plate alone where the regime says nothing more. */
    String label() {
        return plate.equals(regime.word()) ? plate : plate + ", " + regime.word();
    }

    /** Runs that have a theory to compare with. */
    List<Point> compared() {
        return runs.stream().filter(p -> p.values().nuLTheory().isKnown()).toList();
    }

    /** The fits made over this group. */
    List<FitResult> fits(CampaignResult result) {
        return result.fits().stream()
                .filter(fit -> result.campaign().fits().stream()
                        .anyMatch(request -> request.id().equals(fit.problem().id())
                                && request.plate().equals(plate)
                                && request.regime() == regime))
                .toList();
    }
}
