package plateledger.demo.app;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Writes the demo campaign folder; from the top of the repository, after {@code mvn -q -DskipTests package}:
 *
 * <pre>java -cp rig-data-demo/target/classes:reduction/target/classes plateledger.demo.app.WriteCampaign</pre>
 */
public final class WriteCampaign {
    private final SimulatedCampaign.Drawn drawn;

    /** A writer of the campaign of one seed. */
    public WriteCampaign(long seed) {
        this(seed, Options.full());
    }

    /** A writer of the campaign of one seed and kind. */
    public WriteCampaign(long seed, Options options) {
        drawn = new SimulatedCampaign().draw(seed, options);
    }

    /**
     * Writes the folder.
     *
     * @param arguments the folder, {@code rig-data-demo/cabinet-door} if none is given, and a seed, the demo's if none
     * @throws IOException if a file cannot be written
     */
    public static void main(String[] arguments) throws IOException {
        Path folder = Path.of(arguments.length > 0 ? arguments[0] : "rig-data-demo/cabinet-door");
        long seed = arguments.length > 1 ? Long.parseLong(arguments[1]) : SimulatedCampaign.DEMO_SEED;
        new WriteCampaign(seed).write(folder);
    }

    /**
     * Writes rig, instruments, campaign, logs and truth into a folder, which is made if it is missing.
     *
     * @throws IOException if a file cannot be written
     */
    public void write(Path folder) throws IOException {
        Files.createDirectories(folder.resolve("logs"));
        texts().forEach((file, text) -> put(folder.resolve(file), text.getBytes(StandardCharsets.UTF_8)));
        Map<String, RunTruth> truths = new LinkedHashMap<>();
        for (RunPlan plan : drawn.plans()) {
            RunHistory history = new RunHistory(drawn.model(plan));
            truths.put(plan.id(), history.truth());
            logs(history).forEach((file, bytes) -> put(folder.resolve(file), bytes));
        }
        put(folder.resolve("truth.json"), TruthText.truth(drawn, truths).getBytes(StandardCharsets.UTF_8));
    }

    /** The three keyed text files by name. */
    public Map<String, String> texts() {
        Map<String, String> texts = new LinkedHashMap<>();
        texts.put("rig.toml", RigText.rig());
        texts.put("instruments.toml", RigText.instruments());
        texts.put("campaign.toml", CampaignText.campaign(drawn.plans()));
        return texts;
    }

    /** The logs of one run by name relative to the folder. */
    public Map<String, byte[]> logs(String runId) {
        return logs(new RunHistory(drawn.model(SimulatedCampaign.plan(drawn.plans(), runId))));
    }

    private Map<String, byte[]> logs(RunHistory history) {
        Map<String, byte[]> files = new LinkedHashMap<>();
        for (LogText.NamedBytes named : LogText.all(history, drawn.draws(), drawn.errors())) {
            files.put(named.file(), named.bytes());
        }
        return files;
    }

    private static void put(Path file, byte[] bytes) {
        try {
            Files.write(file, bytes);
        } catch (IOException failure) {
            throw new java.io.UncheckedIOException("cannot write " + file, failure);
        }
    }
}
