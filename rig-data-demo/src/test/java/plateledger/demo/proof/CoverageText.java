package plateledger.demo.proof;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import plateledger.demo.app.Options;
import plateledger.demo.app.WriteCampaign;
import plateledger.fit.FitResult;
import plateledger.reduce.LedgerTerm;
import plateledger.reduce.Progress;
import plateledger.reduce.Reduction;
import plateledger.reduce.ReductionOptions;

/** Makes the text of {@code COVERAGE.md}. */
final class CoverageText {
    private static final long FIRST_SEED = 100_000L;
    private static final long FIRST_FOLDER_SEED = 900_000L;

    private final int campaigns;
    private final int folders;
    private final double bend;
    private final CampaignCoverage exact = new CampaignCoverage(0.0);
    private final CampaignCoverage bent;

    CoverageText(int campaigns, int folders, double bend) {
        this.campaigns = campaigns;
        this.folders = folders;
        this.bend = bend;
        this.bent = new CampaignCoverage(bend);
    }

    List<Score> headline() {
        return List.of(exact.c, exact.m, exact.nu[0], exact.nu[1], exact.nu[2]);
    }

    void write(Path file) throws Exception {
        StringBuilder text = new StringBuilder();
        text.append("# Do the intervals hold?\n\n");
        text.append(
                "Made by `mvn -B verify -Pcoverage`; figures of simulated campaigns of the demo rig, each with its own\n");
        text.append(
                "draw of every error from what the rig and instrument files declare, shared errors drawn once per group.\n\n");
        demo(text);
        new Corrections().append(text);
        exact.run(FIRST_SEED, campaigns);
        text.append("## Constants of the product, exact power law, ")
                .append(campaigns)
                .append(" campaigns on window means\n\n");
        text.append(exact.table(false)).append('\n');
        lack(text, exact);
        save(file, text);
        bent.run(FIRST_SEED + 1_000_000L, Math.max(1, campaigns / 5));
        text.append(String.format(
                Locale.ROOT,
                "## The same with a truth bent by %.0f %% in the log–log plane, %d campaigns%n%n",
                100.0 * bend,
                Math.max(1, campaigns / 5)));
        text.append("All campaigns:\n\n").append(bent.table(false)).append('\n');
        lack(text, bent);
        if (bent.cWhenQuiet.count() > 1) {
            text.append("Campaigns in which nothing was reported:\n\n")
                    .append(bent.table(true))
                    .append('\n');
        }
        save(file, text);
        if (folders > 0) {
            fullLogs(text);
        }
        save(file, text);
    }

    /** Saved after each part, so that a run cut short leaves what it has. */
    private static void save(Path file, StringBuilder text) throws IOException {
        Files.writeString(file, text.toString().replace("\r\n", "\n"), StandardCharsets.UTF_8);
    }

    private static void lack(StringBuilder text, CampaignCoverage coverage) {
        text.append(String.format(
                Locale.ROOT,
                "Lack of fit or a bend was reported in %d of %d campaigns (%.1f %%).%n%n",
                coverage.lackReported.get(),
                coverage.c.count(),
                100.0 * coverage.lackReported.get() / coverage.c.count()));
    }

    private static void demo(StringBuilder text) throws Exception {
        DemoScore score = new DemoScore(
                Reduction.run(Simulated.FOLDER, ReductionOptions.all(), Progress.NONE),
                Truth.read(Simulated.FOLDER.resolve("truth.json")));
        text.append("## The demo campaign against its truth\n\n");
        text.append("One campaign's errors are shared, so its share of intervals that hold wanders.\n\n");
        text.append(Score.HEAD);
        text.append(score.firstStations.row("Nu_x, stations 1–2")).append('\n');
        text.append(score.middleStations.row("Nu_x, stations 3–15")).append('\n');
        text.append(score.lastStation.row("Nu_x, station 16")).append('\n');
        text.append(score.nu.row("Nu_L")).append('\n');
        text.append(score.re.row("Re_L")).append("\n\n");
        text.append("| ledger term | runs with true − booked within 2 u |\n| --- | --- |\n");
        for (LedgerTerm term : LedgerTerm.values()) {
            int[] count = score.ledgerWithin2u.get(term);
            if (count != null) {
                text.append("| ")
                        .append(term.label())
                        .append(" | ")
                        .append(count[0])
                        .append(" of ");
                text.append(count[1]).append(" |\n");
            }
        }
        text.append("| residual against zero | ")
                .append(score.residualWithin2u[0])
                .append(" of ");
        text.append(score.residualWithin2u[1]).append(" |\n\n");
        FitResult fit = score.fit("product").orElseThrow();
        double k = fit.coverageFactor();
        text.append(String.format(
                Locale.ROOT,
                "Product: C = %.4f (95 %%: %.4f to %.4f), true %.4f; m = %.4f ± %.4f (95 %%), true %.4f.%n%n",
                fit.twoStep().c(),
                fit.twoStep().c() * Math.exp(-k * fit.twoStep().uLnC()),
                fit.twoStep().c() * Math.exp(k * fit.twoStep().uLnC()),
                score.truth.get("product/C"),
                fit.twoStep().m(),
                k * fit.twoStep().uM(),
                score.truth.get("product/m")));
    }

    /** Whole campaigns written as log files and reduced from them. */
    private void fullLogs(StringBuilder text) throws Exception {
        Score c = new Score();
        Score m = new Score();
        Options product = new Options(true, 0.0, Options.Errors.DRAWN);
        for (int i = 0; i < folders; i++) {
            Path folder = Files.createTempDirectory("campaign");
            new WriteCampaign(FIRST_FOLDER_SEED + i, product).write(folder);
            DemoScore score = new DemoScore(
                    Reduction.run(folder, ReductionOptions.all(), Progress.NONE),
                    Truth.read(folder.resolve("truth.json")));
            FitResult fit = score.fit("product").orElseThrow();
            double k = fit.coverageFactor();
            c.add(
                    Math.log(fit.twoStep().c() / score.truth.get("product/C")),
                    fit.twoStep().uLnC(),
                    k);
            m.add(
                    fit.twoStep().m() - score.truth.get("product/m"),
                    fit.twoStep().uM(),
                    k);
            delete(folder);
        }
        text.append("## ").append(folders).append(" campaigns through full log files\n\n");
        text.append(Score.HEAD);
        text.append(c.row("C")).append('\n').append(m.row("m (absolute error)")).append("\n\n");
    }

    private static void delete(Path folder) throws IOException {
        try (Stream<Path> all = Files.walk(folder)) {
            for (Path path : all.sorted(Comparator.reverseOrder()).toList()) {
                Files.delete(path);
            }
        }
    }
}
