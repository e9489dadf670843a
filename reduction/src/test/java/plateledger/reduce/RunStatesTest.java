package plateledger.reduce;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import plateledger.campaign.RunType;
import plateledger.finding.Finding;
import plateledger.finding.Level;

/** What becomes of runs that are not reduced, and which of them make a stop. */
final class RunStatesTest {
    private static final ReductionOptions ALL = ReductionOptions.all();
    private static final ReductionOptions ONLY_A = ALL.only(Set.of("A"));

    @Test
    void aRunWithoutLogsIsPlannedWhetherAskedForOrNot() {
        assertEquals(
                RunState.PLANNED,
                Reduction.idle(TestRuns.planned("B", RunType.HEATED), ALL).state());
        assertEquals(
                RunState.PLANNED,
                Reduction.idle(TestRuns.planned("B", RunType.HEATED), ONLY_A).state());
        assertEquals(
                RunState.PLANNED,
                Reduction.idle(TestRuns.planned("C", RunType.COOL_DOWN), ALL).state());
    }

    @Test
    void aRunNotAskedForWaits() {
        assertEquals(
                RunState.WAITING,
                Reduction.idle(TestRuns.logged("B", RunType.HEATED), ONLY_A).state());
    }

    /** A cool-down is never steady; that must not make a stop. */
    @Test
    void aCoolDownIsNotUsedAndNoStop() {
        RunResult result = Reduction.idle(TestRuns.logged("C", RunType.COOL_DOWN), ALL);
        assertEquals(RunState.LEFT_OUT, result.state());
        List<Finding> findings = ResultFindings.notReduced(List.of(result));
        assertEquals(1, findings.size());
        assertEquals(Level.NOTE, findings.get(0).level());
    }

    @Test
    void aReasonForLeavingOutIsKept() {
        RunResult result = Reduction.idle(TestRuns.leftOut("D", RunType.HEATED, "door open"), ONLY_A);
        assertEquals(RunState.LEFT_OUT, result.state());
        assertEquals("door open", result.reason());
    }
}
