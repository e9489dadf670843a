package plateledger.demo.proof;

import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** A first look at coverage in every build; the proof with thousands runs under the profile {@code coverage}. */
final class SmallCoverageTest {
    /** 24 campaigns: 18 or fewer held has probability below 1e-3 for a true 95 % (binomial). Fixed seeds. */
    @Test
    void intervalsOfTheConstantsMostlyHold() {
        CampaignCoverage coverage = new CampaignCoverage(0.0).run(500, 24);
        assertTrue(coverage.c.held() > 18, () -> "C held " + coverage.c.held());
        assertTrue(coverage.m.held() > 18, () -> "m held " + coverage.m.held());
        for (Score nu : coverage.nu) {
            assertTrue(nu.held() > 18, () -> "Nu held " + nu.held());
        }
    }
}
