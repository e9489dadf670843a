package plateledger.demo.app;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import plateledger.campaign.Campaign;
import plateledger.campaign.CampaignReader;
import plateledger.campaign.Logger;
import plateledger.campaign.Run;
import plateledger.demo.sensor.Declared;
import plateledger.demo.sensor.InstrumentDeclaration;
import plateledger.finding.Finding;
import plateledger.finding.RefusedException;
import plateledger.log.LogData;
import plateledger.log.LogReader;
import plateledger.log.Series;
import plateledger.quantity.Stated;
import plateledger.rig.Instrument;
import plateledger.rig.Rig;

/** The folder that is checked in is the one that the simulator writes, and its texts say what the truth was drawn from. */
final class CampaignFolderTest {
    private static final Path FOLDER = Path.of("cabinet-door");

    @Test
    void oneRunIsWrittenAgainByteForByte() throws IOException {
        WriteCampaign writer = new WriteCampaign(SimulatedCampaign.DEMO_SEED);
        for (String run : List.of("B12", "PZ1")) {
            Map<String, byte[]> files = writer.logs(run);
            assertEquals(3, files.size());
            for (Map.Entry<String, byte[]> file : files.entrySet()) {
                assertArrayEquals(Files.readAllBytes(FOLDER.resolve(file.getKey())), file.getValue(), file.getKey());
            }
        }
        for (Map.Entry<String, String> text : writer.texts().entrySet()) {
            assertEquals(
                    Files.readString(FOLDER.resolve(text.getKey()), StandardCharsets.UTF_8),
                    text.getValue(),
                    text.getKey());
        }
    }

    /** The reader, which knows nothing of the simulator, finds the numbers that the errors are drawn from. */
    @Test
    void instrumentsSayWhatTheErrorsAreDrawnFrom() throws RefusedException {
        Rig rig = CampaignReader.read(FOLDER).campaign().rig();
        for (InstrumentDeclaration declared : InstrumentDeclaration.standard()) {
            Instrument read = rig.instruments().stream()
                    .filter(i -> i.id().equals(declared.id()))
                    .findFirst()
                    .orElseThrow();
            assertEquals(declared.channels(), read.channels());
            assertEquals(declared.bath(), read.bath());
            assertEquals(declared.gainOriginSi(), read.gainOrigin(), 1e-9);
            assertEquals(declared.resolutionSi(), read.resolution(), 1e-12);
            same(declared.offset(), read.offset());
            same(declared.gain(), read.gain());
            same(declared.channelOffset(), read.channelOffset());
            same(declared.channelGain(), read.channelGain());
            same(declared.dailyDrift(), read.dailyDrift());
        }
    }

    private static void same(Declared declared, Stated read) {
        assertEquals(declared.si(), read.value(), 1e-12);
        double u = declared.meaning() == Declared.Meaning.LIMITS
                ? declared.spreadSi() / Math.sqrt(3.0)
                : declared.spreadSi();
        assertEquals(u, read.standardUncertainty(), 1e-12, declared.text());
    }

    /** The one clock that is left undeclared is the one thing to note. */
    @Test
    void readerNotesTheClockOnly() throws RefusedException {
        CampaignReader.Outcome outcome = CampaignReader.read(FOLDER);
        assertEquals(44, outcome.campaign().runs().size());
        assertEquals(
                List.of("logger.power.clock_offset"),
                outcome.notes().stream().map(Finding::subject).toList());
    }

    /** Every log reads, by the declared format or by detection; what is odd about them is what was put in. */
    @Test
    void everyLogReads() throws RefusedException {
        Campaign campaign = CampaignReader.read(FOLDER).campaign();
        Map<String, Integer> odd = new TreeMap<>();
        for (Run run : campaign.runs()) {
            for (Map.Entry<String, String> log : run.logs().entrySet()) {
                Logger logger = campaign.logger(log.getKey()).orElseThrow();
                LogData data = LogReader.read(FOLDER, log.getValue(), logger.format(), logger.zone(), logger.columns());
                for (Series series : data.series()) {
                    int lost = series.count(Series.Flag.OVER_RANGE) + series.count(Series.Flag.EMPTY);
                    if (lost > 0) {
                        odd.put(run.id() + " " + series.channel(), lost);
                    }
                    assertEquals(0, series.count(Series.Flag.NOT_A_NUMBER), log.getValue());
                }
            }
        }
        assertEquals(Map.of("B05 I3", 1, "B12 T05", 2, "P04 T11", 1), odd);
    }

    @Test
    void folderIsSmall() throws IOException {
        try (Stream<Path> files = Files.walk(FOLDER.resolve("logs"))) {
            long bytes = files.filter(Files::isRegularFile)
                    .mapToLong(file -> file.toFile().length())
                    .sum();
            assertTrue(bytes > 10_000_000 && bytes < 25_000_000, "logs have " + bytes + " bytes");
        }
    }

    /** Each blemish of the plan can be seen in the text. */
    @Test
    void blemishesAreThere() throws IOException {
        assertEquals(2, count("B12-plate.txt", ";OVER"));
        assertEquals(1, count("P04-plate.txt", ";;"));
        assertEquals(1, count("B05-power.csv", "9.9E37"));
        List<String> tunnel = Files.readAllLines(FOLDER.resolve("logs/P07-tunnel.tsv"), StandardCharsets.UTF_8);
        assertTrue(tunnel.stream().anyMatch(line -> line.startsWith("1499.0\t")));
        assertTrue(tunnel.stream().noneMatch(line -> line.startsWith("1500.0\t") || line.startsWith("1559.0\t")));
        List<String> plate = Files.readAllLines(FOLDER.resolve("logs/P10-plate.txt"), StandardCharsets.ISO_8859_1);
        String last = column(plate.get(plate.size() - 1), 19);
        assertTrue(plate.stream()
                        .filter(line -> line.contains(";") && column(line, 19).equals(last))
                        .count()
                > 500);
    }

    private static String column(String line, int number) {
        return line.split(";", -1)[number];
    }

    private static long count(String file, String what) throws IOException {
        String text = Files.readString(FOLDER.resolve("logs").resolve(file), StandardCharsets.ISO_8859_1);
        return text.lines()
                .mapToLong(line -> (line.length() - line.replace(what, "").length()) / what.length())
                .sum();
    }
}
