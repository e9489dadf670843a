package plateledger.campaign;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import plateledger.finding.RefusedException;
import plateledger.log.LogData;
import plateledger.log.LogFormat;
import plateledger.log.LogFormat.TimeForm;
import plateledger.log.Series;
import plateledger.rig.Instrument.SignalKind;
import plateledger.rig.Rig;

/** A new campaign must be accepted as it is, or nobody could start from it. */
final class SkeletonTest {
    private static final LogFormat PLATE =
            new LogFormat(';', ',', 7, true, TimeForm.PATTERN, "dd.MM.yyyy HH:mm:ss", "");
    private static final LogFormat TUNNEL = new LogFormat('\t', '.', 5, false, TimeForm.ELAPSED_S, "", "Start");

    @TempDir
    private Path temporary;

    @Test
    void passesTheReaderWithoutAnyNoteAndHoldsPlannedRunsOnly() throws Exception {
        CampaignReader.Outcome outcome = write(Skeleton.files(List.of()));
        assertEquals(List.of(), outcome.notes());
        assertFalse(outcome.campaign().runs().isEmpty());
        assertTrue(outcome.campaign().runs().stream().allMatch(Run::planned));
    }

    @Test
    void marksEveryInventedQuantityWithReplace() {
        Skeleton.files(List.of()).values().stream()
                .flatMap(String::lines)
                .filter(line -> !line.startsWith("#") && line.matches(".*\"[^\"]*\\d[^\"]*(u =|limits|exact).*"))
                .forEach(line -> assertTrue(line.contains("# replace"), line));
    }

    @Test
    void takesLoggersAndChannelsFromLogs() throws Exception {
        LogData plate = log("in/R01 plate.txt", PLATE, series("Plate \"01\"", "°C", 300.0), series("T01", "°C", 300.0));
        LogData tunnel = log(
                "in/R01-tunnel.tsv",
                TUNNEL,
                series("dp", "Pa", 12.0),
                series("barometer", "hPa", 98_000.0),
                series("U", "m/s", 4.0),
                series("hum", "%", 0.4),
                series("Elapsed", "s", 1.0));
        CampaignReader.Outcome outcome = write(Skeleton.files(List.of(plate, tunnel)));
        assertEquals(List.of(), outcome.notes());

        Campaign campaign = outcome.campaign();
        assertEquals(
                List.of("R01-plate", "R01-tunnel"),
                campaign.loggers().stream().map(Logger::id).toList());
        assertEquals(PLATE, campaign.loggers().get(0).format().orElseThrow());
        assertEquals(TUNNEL, campaign.loggers().get(1).format().orElseThrow());
        assertEquals(SignalKind.TEMPERATURE, kindOf(campaign.rig(), "Plate \"01\""));
        assertEquals(SignalKind.DIFFERENTIAL_PRESSURE, kindOf(campaign.rig(), "dp"));
        assertEquals(SignalKind.ABSOLUTE_PRESSURE, kindOf(campaign.rig(), "barometer"));
        assertEquals(SignalKind.SPEED, kindOf(campaign.rig(), "U"));
        assertEquals(SignalKind.RELATIVE_HUMIDITY, kindOf(campaign.rig(), "hum"));
        assertTrue(campaign.rig().instrumentOf("Elapsed").isEmpty());
    }

    @Test
    void logsOfOneLoggerGiveOneLogger() throws Exception {
        LogData first = log("R01-plate.txt", PLATE, series("T01", "°C", 300.0));
        LogData second = log("R02-plate.txt", PLATE, series("T01", "°C", 310.0));
        Campaign campaign = write(Skeleton.files(List.of(first, second))).campaign();
        assertEquals(
                List.of("R01-plate"),
                campaign.loggers().stream().map(Logger::id).toList());
    }

    private static SignalKind kindOf(Rig rig, String channel) {
        return rig.instrumentOf(channel).orElseThrow().kind();
    }

    private CampaignReader.Outcome write(Map<String, String> files) throws IOException, RefusedException {
        for (Map.Entry<String, String> file : files.entrySet()) {
            Files.writeString(temporary.resolve(file.getKey()), file.getValue());
        }
        return CampaignReader.read(temporary);
    }

    private static LogData log(String file, LogFormat format, Series... series) {
        return new LogData(file, format, 2, 1.0, 0.0, 1.0, false, Arrays.asList(series), List.of());
    }

    private static Series series(String channel, String unit, double value) {
        return new Series(
                channel, unit, "x", new double[] {0.0, 1.0}, new double[] {value, value}, new byte[] {0, 0}, new int[] {
                    8, 9
                });
    }
}
