package plateledger.demo.proof;

import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.LongStream;
import plateledger.campaign.Campaign;
import plateledger.demo.app.Options;
import plateledger.demo.app.ProductLaw;
import plateledger.demo.app.SimulatedCampaign;
import plateledger.fit.FitResult;
import plateledger.reduce.CancelledException;
import plateledger.reduce.MeansReduction;
import plateledger.reduce.Progress;

/** Many simulated campaigns of the product, each with its own errors: do the intervals of the constants hold? */
final class CampaignCoverage {
    static final double[] RE = {7e4, 2e5, 5.5e5};
    private static final double PR = 0.71;

    final Score c = new Score();
    final Score m = new Score();
    final Score[] nu = {new Score(), new Score(), new Score()};
    final Score cWhenQuiet = new Score();
    final Score mWhenQuiet = new Score();
    final Score[] nuWhenQuiet = {new Score(), new Score(), new Score()};
    final AtomicInteger lackReported = new AtomicInteger();

    private final Campaign campaign = Simulated.campaign();
    private final SimulatedCampaign simulator = new SimulatedCampaign();
    private final Options options;

    CampaignCoverage(double bend) {
        options = new Options(true, bend, Options.Errors.DRAWN);
    }

    CampaignCoverage run(long firstSeed, int campaigns) {
        LongStream.range(firstSeed, firstSeed + campaigns).parallel().forEach(this::one);
        return this;
    }

    private void one(long seed) {
        MeansReduction reduced;
        try {
            reduced = MeansReduction.of(
                    campaign, Simulated.means(campaign, simulator.means(seed, options)), 1, Progress.NONE);
        } catch (CancelledException e) {
            throw new IllegalStateException(e);
        }
        FitResult fit = reduced.fits().stream()
                .filter(f -> f.problem().id().equals("product"))
                .findFirst()
                .orElseThrow();
        ProductLaw law = SimulatedCampaign.law(options);
        boolean lack = fit.findings().stream()
                .anyMatch(f -> List.of("FIT-LACK", "FIT-BEND").contains(f.id()));
        double k = fit.coverageFactor();
        var t = fit.twoStep();
        add(c, cWhenQuiet, lack, Math.log(t.c() / law.c()), t.uLnC(), k);
        add(m, mWhenQuiet, lack, t.m() - law.m(), t.uM(), k);
        for (int i = 0; i < RE.length; i++) {
            double truth = Math.log(law.nusselt(RE[i], PR) / Math.cbrt(PR));
            add(nu[i], nuWhenQuiet[i], lack, t.lnY(RE[i]) - truth, t.uLnY(RE[i]), k);
        }
        if (lack) {
            lackReported.incrementAndGet();
        }
    }

    private static void add(Score all, Score quiet, boolean lack, double error, double u, double k) {
        all.add(error, u, k);
        if (!lack) {
            quiet.add(error, u, k);
        }
    }

    String table(boolean quietOnly) {
        StringBuilder text = new StringBuilder(Score.HEAD);
        text.append((quietOnly ? cWhenQuiet : c).row("C")).append('\n');
        text.append((quietOnly ? mWhenQuiet : m).row("m (absolute error)")).append('\n');
        for (int i = 0; i < RE.length; i++) {
            text.append((quietOnly ? nuWhenQuiet : nu)[i].row("Nu at Re " + (long) RE[i]))
                    .append('\n');
        }
        return text.toString();
    }
}
