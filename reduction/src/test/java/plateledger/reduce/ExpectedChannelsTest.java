package plateledger.reduce;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Set;
import org.junit.jupiter.api.Test;
import plateledger.campaign.Campaign;
import plateledger.campaign.RunType;
import plateledger.finding.RefusedException;

/** The channels each type of run needs, listed by hand from the example rig. */
final class ExpectedChannelsTest {
    private static Set<String> of(RunType type) throws RefusedException {
        Campaign campaign = ExampleRig.campaign();
        return ExpectedChannels.of(campaign, ExampleRig.run("R01", type, ExampleRig.DAY, 12.0));
    }

    @Test
    void byTypeOfRun() throws RefusedException {
        assertEquals(Set.of("PD", "VA"), of(RunType.FAN_OFF_ZERO));
        assertEquals(
                Set.of(
                        "T01", "T02", "T03", "TP1", "TF1", "TF2", "TN1", "TT1", "TW1", "TW2", "TA1", "PB", "RH", "PD",
                        "VA"),
                of(RunType.ZERO));
        assertEquals(
                Set.of(
                        "T01", "T02", "T03", "V1", "V2", "I1", "I2", "TP1", "TF1", "TF2", "TN1", "TT1", "TW1", "TW2",
                        "TA1", "PB", "RH", "PD", "VA"),
                of(RunType.HEATED));
        assertEquals(
                Set.of(
                        "T01", "T02", "T03", "V1", "V2", "I1", "I2", "TP1", "TF1", "TF2", "TN1", "TT1", "TC1", "TC2",
                        "TC3", "TC4"),
                of(RunType.LOSS));
    }
}
