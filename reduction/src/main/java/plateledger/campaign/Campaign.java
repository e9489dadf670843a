package plateledger.campaign;

import java.time.ZoneId;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plateledger.rig.Rig;

/**
 * A campaign: what was tested, on which rig, and how it is to be reduced.
 *
 * @param title title of the test
 * @param texts fields of the title block by key: {@code laboratory, customer, object, report_number, author, reviewer,
 *     purpose, issued, tested}; missing ones are absent
 * @param zone zone in which times are printed
 * @param rig the rig
 * @param definitions what the dimensionless numbers mean
 * @param steady limits of the steady-window search
 * @param loggers the loggers
 * @param runs the runs in file order
 * @param fits the fits asked for
 */
public record Campaign(
        String title,
        Map<String, String> texts,
        ZoneId zone,
        Rig rig,
        Definitions definitions,
        SteadyLimits steady,
        List<Logger> loggers,
        List<Run> runs,
        List<FitRequest> fits) {
    /**
     * Limits of the steady-window search.
     *
     * @param storageShare largest upper bound of storage ÷ power for heated runs, dimensionless
     * @param storageShareLoss the same for loss runs
     * @param minimumS shortest window, s
     */
    public record SteadyLimits(double storageShare, double storageShareLoss, double minimumS) {}

    /** Copies the lists. */
    public Campaign {
        texts = java.util.Collections.unmodifiableMap(new java.util.TreeMap<>(texts));
        loggers = List.copyOf(loggers);
        runs = List.copyOf(runs);
        fits = List.copyOf(fits);
    }

    /** The run of that id. */
    public Optional<Run> run(String id) {
        return runs.stream().filter(run -> run.id().equals(id)).findFirst();
    }

    /** The logger of that id. */
    public Optional<Logger> logger(String id) {
        return loggers.stream().filter(logger -> logger.id().equals(id)).findFirst();
    }
}
