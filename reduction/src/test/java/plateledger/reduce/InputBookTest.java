package plateledger.reduce;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;
import plateledger.campaign.Campaign;
import plateledger.campaign.CampaignReader;
import plateledger.campaign.RunType;
import plateledger.finding.RefusedException;
import plateledger.quantity.Estimate;
import plateledger.uncertainty.InputList;

/** Which errors are one and the same from run to run, as the definition of the instrument equation says. */
final class InputBookTest {
    private final Campaign campaign = campaign();
    private final String air = campaign.rig().surroundings().airChannel();
    private final String speed =
            campaign.rig().surroundings().speedMeters().get(0).channel();

    private static Campaign campaign() {
        try {
            return CampaignReader.read(Path.of("src/test/resources/plateledger/campaign/example"))
                    .campaign();
        } catch (RefusedException e) {
            throw new IllegalStateException(e);
        }
    }

    private RunMeans means(String id, RunType type) {
        return RunMeans.balanced(
                TestRuns.planned(id, type),
                Map.of(air, Estimate.of(295.0, 0.001), speed, Estimate.of(9.0, 0.01)),
                Estimate.of(0.0, 0.0),
                new double[0],
                0.0);
    }

    /** A temperature's drift is that since the day's zero: none in the zero run, one and the same in all later runs. */
    @Test
    void temperaturesDriftFromTheZeroRunOn() {
        InputBook book = new InputBook(campaign.rig());
        Signal zero = book.signal(means("Z", RunType.ZERO), air).orElseThrow();
        Signal first = book.signal(means("R1", RunType.HEATED), air).orElseThrow();
        Signal second = book.signal(means("R2", RunType.HEATED), air).orElseThrow();
        InputList list = book.build();
        double declared =
                campaign.rig().instrumentOf(air).orElseThrow().dailyDrift().standardUncertainty();
        assertTrue(declared > 0.0, "the example declares a drift");
        assertEquals(0.0, list.get(zero.drift()).u(), 0.0);
        assertEquals(declared, list.get(first.drift()).u(), 0.0);
        assertEquals(first.drift(), second.drift());
        assertEquals(zero.shared(), first.shared());
        assertEquals(zero.own(), first.own());
        assertNotEquals(zero.mean(), first.mean());
    }

    /** A speed meter's zero is that with the fan off, so its drift is the same in the zero run as in any other. */
    @Test
    void otherSignalsDriftAllDay() {
        InputBook book = new InputBook(campaign.rig());
        assertEquals(
                book.signal(means("Z", RunType.ZERO), speed).orElseThrow().drift(),
                book.signal(means("R1", RunType.HEATED), speed).orElseThrow().drift());
    }
}
