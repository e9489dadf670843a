package plateledger.report;

import java.util.List;
import plateledger.campaign.FitRequest;
import plateledger.campaign.RunType;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.RunResult;

/** Which runs a fit asked for, and why one of them is not among its points. */
final class FitRuns {
    private FitRuns() {}

    /** The heated runs of the plate and regime, in campaign order. */
    static List<RunResult> of(CampaignResult result, FitRequest request) {
        return result.runs().stream()
                .filter(r -> r.run().type() == RunType.HEATED)
                .filter(r -> r.run().plate().equals(request.plate()))
                .filter(r -> r.run().regime() == request.regime())
                .toList();
    }

    /** Why a run that was asked for is not a point. */
    static String reason(RunResult run) {
        if (!run.reason().isEmpty()) {
            return run.reason();
        }
        return run.run().leftOut().orElse(run.state().word());
    }
}
