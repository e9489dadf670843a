package plateledger.reduce;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import plateledger.campaign.Campaign;
import plateledger.campaign.Run;
import plateledger.finding.Finding;
import plateledger.finding.RefusedException;

/** Reads the logs of many runs, several at once; all refusals are collected before any is thrown. */
final class LogStage {
    private LogStage() {}

    /**
     * Reads.
     *
     * @return logs by run id, in the order of the runs
     */
    static Map<String, RunLogs> read(Path folder, Campaign campaign, List<Run> runs, int threads, Progress progress)
            throws RefusedException, CancelledException {
        ExecutorService executor = Executors.newFixedThreadPool(threads, task -> {
            Thread thread = new Thread(task, "logs");
            thread.setDaemon(true);
            return thread;
        });
        try {
            Map<String, Future<RunLogs>> pending = new LinkedHashMap<>();
            for (Run run : runs) {
                pending.put(run.id(), executor.submit(() -> RunLogs.read(folder, campaign, run)));
            }
            Map<String, RunLogs> done = new LinkedHashMap<>();
            List<Finding> refusals = new ArrayList<>();
            for (Map.Entry<String, Future<RunLogs>> entry : pending.entrySet()) {
                if (progress.cancelled()) {
                    throw new CancelledException();
                }
                collect(entry.getKey(), entry.getValue(), done, refusals);
                progress.step("reading logs", (double) done.size() / pending.size());
            }
            if (!refusals.isEmpty()) {
                throw new RefusedException(refusals);
            }
            return done;
        } finally {
            executor.shutdownNow();
        }
    }

    private static void collect(String id, Future<RunLogs> future, Map<String, RunLogs> done, List<Finding> refusals)
            throws CancelledException {
        try {
            done.put(id, future.get());
        } catch (ExecutionException e) {
            if (e.getCause() instanceof RefusedException refused) {
                refusals.addAll(refused.findings());
            } else {
                throw new IllegalStateException("reading the logs of run " + id + " failed", e.getCause());
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new CancelledException();
        }
    }
}
