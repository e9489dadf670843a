package plateledger.gui.task;

import java.nio.file.Path;
import java.util.concurrent.CancellationException;
import plateledger.finding.RefusedException;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.Progress;

/** Reduces one campaign; the work that the runner runs. */
@FunctionalInterface
public interface ReduceCall {
    /**
     * Reduces a campaign.
     *
     * @param folder campaign folder
     * @param progress told how far it is, asked whether to go on
     * @return all results
     * @throws RefusedException if the input cannot be used
     * @throws CancellationException if {@link Progress#cancelled()} said so
     */
    CampaignResult reduce(Path folder, Progress progress) throws RefusedException;
}
