package plateledger.demo.proof;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * The proof of the stated 95 %: thousands of simulated campaigns. Runs under the profile {@code coverage} and writes
 * {@code COVERAGE.md}. {@code -Dcoverage.campaigns=} and {@code -Dcoverage.folders=} set how many.
 */
@Tag("coverage")
final class CoverageDocumentTest {
    private static final int CAMPAIGNS = Integer.getInteger("coverage.campaigns", 2000);
    private static final int FOLDERS = Integer.getInteger("coverage.folders", 50);
    private static final double BEND = 0.02;

    @Test
    void writesTheCoverageDocument() throws Exception {
        CoverageText text = new CoverageText(CAMPAIGNS, FOLDERS, BEND);
        text.write(Path.of("COVERAGE.md"));
        // a band of 1.5 points about 95 %; 2,000 campaigns wander by about 0.01 (binomial, two sigma)
        if (CAMPAIGNS >= 2000) {
            for (Score score : text.headline()) {
                assertTrue(score.coverage() >= 0.935 && score.coverage() <= 0.965, () -> score.row("outside the band"));
            }
        }
    }
}
