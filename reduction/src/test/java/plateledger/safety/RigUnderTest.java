package plateledger.safety;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.Stream;
import plateledger.campaign.Campaign;
import plateledger.campaign.CampaignReader;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.RefusedException;
import plateledger.log.Series;

/**
 * The example campaign, changed where a test wants it, and invented series for its run B01: 600 s at 1 Hz, two strips at
 * 20 W, plate at 50 °C, 12 m/s. The plate logger's clock is 95 s fast, as declared.
 */
final class RigUnderTest {
    private static final Path EXAMPLE = Path.of("src/test/resources/plateledger/campaign/example");
    static final double START_S = 1_773_134_400.0; // true time of the first sample
    private static final int SAMPLES = 600;
    private static final double PLATE_CLOCK_S = 95.0;

    private final Map<String, String> files = new TreeMap<>();
    private final Map<String, DoubleUnaryOperator> values = new TreeMap<>();
    private final Map<String, Series.Flag> flags = new TreeMap<>();
    private int flagFrom;
    private int flagTo;

    RigUnderTest() {
        for (String name : List.of("campaign.toml", "rig.toml", "instruments.toml")) {
            try {
                files.put(name, Files.readString(EXAMPLE.resolve(name)));
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }
        for (String c : List.of("T01", "T02", "T03")) {
            values.put(c, t -> 323.15);
        }
        for (String c : List.of("TN1", "TT1", "TW1", "TW2", "TP1", "TF1", "TF2", "TC1", "TC2", "TC3", "TC4", "TA1")) {
            values.put(c, t -> 295.15);
        }
        values.put("PB", t -> 98e3);
        values.put("RH", t -> 0.4);
        values.put("PD", t -> 83.0); // ½ · 1.155 · 12²
        values.put("VA", t -> 9.9);
        values.put("V1", t -> 20.0);
        values.put("V2", t -> 20.0);
        values.put("I1", t -> 1.0);
        values.put("I2", t -> 1.0);
    }

    /** Replaces the first occurrence of a text in a file, which must be there. */
    RigUnderTest replace(String file, String old, String replacement) {
        String text = String.valueOf(files.get(file));
        assertTrue(text.contains(old), () -> file + " holds no \"" + old + "\"");
        int at = text.indexOf(old);
        files.put(file, text.substring(0, at) + replacement + text.substring(at + old.length()));
        return this;
    }

    /** A channel over true seconds since the start. */
    RigUnderTest channel(String name, DoubleUnaryOperator value) {
        values.put(name, value);
        return this;
    }

    RigUnderTest without(String name) {
        values.remove(name);
        return this;
    }

    /** Marks a stretch of samples of some channels as not usable. */
    RigUnderTest lose(int from, int to, Series.Flag flag, String... names) {
        flagFrom = from;
        flagTo = to;
        for (String name : names) {
            flags.put(name, flag);
        }
        return this;
    }

    Campaign campaign(Path folder) {
        try {
            try (Stream<Path> logs = Files.list(EXAMPLE.resolve("logs"))) {
                for (Path log : logs.toList()) {
                    Path copy = folder.resolve("logs").resolve(String.valueOf(log.getFileName()));
                    Files.createDirectories(folder.resolve("logs"));
                    Files.copy(log, copy);
                }
            }
            for (Map.Entry<String, String> file : files.entrySet()) {
                Files.writeString(folder.resolve(file.getKey()), file.getValue());
            }
            return CampaignReader.read(folder).campaign();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (RefusedException e) {
            throw new AssertionError("the example must be read: " + e.getMessage(), e);
        }
    }

    List<Finding> findings(Path folder) {
        return SafetyChecks.findings(campaign(folder), Map.of("B01", series()));
    }

    private List<Series> series() {
        List<Series> all = new ArrayList<>();
        values.forEach((name, value) -> all.add(series(name, value)));
        return all;
    }

    private Series series(String name, DoubleUnaryOperator value) {
        boolean power = List.of("V1", "V2", "I1", "I2").contains(name);
        double[] times = new double[SAMPLES];
        double[] si = new double[SAMPLES];
        byte[] codes = new byte[SAMPLES];
        int[] lines = new int[SAMPLES];
        for (int i = 0; i < SAMPLES; i++) {
            times[i] = START_S + i + (power ? 0.0 : PLATE_CLOCK_S);
            si[i] = value.applyAsDouble(i);
            lines[i] = i + 9;
            Series.Flag flag = flags.getOrDefault(name, Series.Flag.VALID);
            if (flag != Series.Flag.VALID && i >= flagFrom && i <= flagTo) {
                codes[i] = flag.code();
                si[i] = Double.NaN;
            }
        }
        return new Series(name, "", power ? "logs/B01-power.csv" : "logs/B01-plate.txt", times, si, codes, lines);
    }

    /** Identifiers at a level. */
    static List<String> ids(List<Finding> findings, Level level) {
        return findings.stream()
                .filter(f -> f.level() == level)
                .map(Finding::id)
                .distinct()
                .toList();
    }
}
