package plateledger.reduce;

import java.util.Map;
import java.util.Optional;
import plateledger.campaign.Regime;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.finding.Place;

/** Runs without much to them, for tests. */
final class TestRuns {
    private TestRuns() {}

    static Run planned(String id, RunType type) {
        return run(id, type, Map.of(), Optional.empty());
    }

    static Run logged(String id, RunType type) {
        return run(id, type, Map.of("plate", id + ".txt"), Optional.empty());
    }

    static Run leftOut(String id, RunType type, String reason) {
        return run(id, type, Map.of("plate", id + ".txt"), Optional.of(reason));
    }

    private static Run run(String id, RunType type, Map<String, String> logs, Optional<String> leftOut) {
        return new Run(
                id,
                type,
                "2026-03-10",
                "baseline",
                Regime.LAMINAR,
                Optional.empty(),
                4.0,
                0.0,
                "",
                logs,
                Optional.empty(),
                leftOut,
                "",
                Place.NOWHERE);
    }
}
