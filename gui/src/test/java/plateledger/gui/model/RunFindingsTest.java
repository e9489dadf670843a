package plateledger.gui.model;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import plateledger.campaign.Regime;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;

final class RunFindingsTest {
    @Test
    void aRunOwnsWhatNamesItOrLiesInItsLogs() {
        Finding named = finding("R1: T05", "");
        Finding inLog = finding("T07", "logs/R1-plate.txt");
        Finding ofLongerName = finding("R10", "");
        Finding ofJoinedName = finding("R1-b", "");
        Finding elsewhere = finding("fan guard", "rig.toml");

        List<Finding> own = RunFindings.of(run("R1"), List.of(named, inLog, ofLongerName, ofJoinedName, elsewhere));

        assertEquals(List.of(named, inLog), own);
    }

    private static Finding finding(String subject, String file) {
        return new Finding("X", Level.NOTE, Place.of(file), subject, "", "", "", "");
    }

    private static Run run(String id) {
        return new Run(
                id,
                RunType.HEATED,
                "d",
                "p",
                Regime.PRODUCT,
                Optional.empty(),
                1,
                1,
                "",
                Map.of("plate", "logs/" + id + "-plate.txt"),
                Optional.empty(),
                Optional.empty(),
                "",
                Place.NOWHERE);
    }
}
