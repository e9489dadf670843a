package plateledger.demo.badinput;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestReporter;

/** The checks on the whole demo campaign: they find what was done to its logs, and raise no stop on a sound rig. */
final class DemoCheckTest {
    /** More lines than this nobody reads. */
    private static final int READABLE = 60;

    @Test
    void findsEveryBlemishAndRaisesNoStop(TestReporter reporter) {
        Called said = Called.with("check", SmallCampaign.DEMO.toString());
        reporter.publishEntry("check, status " + said.status(), said.out());
        assertAll(
                () -> assertEquals(0, said.status(), said::everythingSaid),
                () -> assertEquals("", said.err()),
                () -> assertTrue(said.out().contains(": 0 stop, "), said.out()),
                () -> found(said, "logs/P10-plate.txt:309", "T19", "stuck"),
                () -> found(said, "logs/B07-plate.txt:629", "", ""),
                () -> found(said, "logs/B05-power.csv:702", "I3", "over-range"),
                () -> found(said, "logs/B12-plate.txt:609", "T05", "over-range"),
                () -> found(said, "logs/P04-plate.txt:1209", "T11", "empty"),
                () -> found(said, "logs/P07-tunnel.tsv:1505", "", "gap"),
                () -> found(said, "campaign.toml:41:1", "logger.power.clock_offset", "The clock counts as right"),
                () -> assertTrue(said.out().lines().count() < READABLE, said.out()));
        Called each = Called.with("check", SmallCampaign.DEMO.toString(), "--all");
        assertTrue(
                each.out()
                        .lines()
                        .anyMatch(line -> line.contains("logs/B07-plate.txt:629: channel T08: found 1 spike")),
                each.out());
    }

    private static void found(Called said, String place, String subject, String what) {
        assertTrue(
                said.out()
                        .lines()
                        .anyMatch(line -> line.contains(place) && line.contains(subject) && line.contains(what)),
                () -> place + " " + subject + " " + what + " in:\n" + said.out());
    }
}
