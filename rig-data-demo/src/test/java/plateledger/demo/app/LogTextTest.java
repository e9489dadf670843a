package plateledger.demo.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.ZoneId;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import plateledger.demo.sensor.Declared;
import plateledger.demo.sensor.LoggerClock;
import plateledger.finding.RefusedException;
import plateledger.log.LogData;
import plateledger.log.LogReader;
import plateledger.log.Series;

/** What a logger writes without errors, read back with its declared clock, is the truth to half a step of its text. */
final class LogTextTest {
    private static final String RUN = "B16";

    @TempDir
    private Path folder = Path.of("");

    @Test
    void textAndClockAreAsDeclared() throws IOException, RefusedException {
        Options exact = Options.full().withoutErrors();
        RunHistory history = new SimulatedCampaign().history(1, exact, RUN);
        Files.createDirectories(folder.resolve("logs"));
        for (Map.Entry<String, byte[]> file :
                new WriteCampaign(1, exact).logs(RUN).entrySet()) {
            Files.write(folder.resolve(file.getKey()), file.getValue());
        }
        check(history, LogText.Style.PLATE, LoggerClock.PLATE, List.of("T01", "T16", "T20", "TN1"), 0.0051);
        check(history, LogText.Style.POWER, LoggerClock.POWER, List.of("V1", "V8"), 0.00051);
        check(history, LogText.Style.POWER, LoggerClock.POWER, List.of("I1", "I8"), 0.000051);
        check(history, LogText.Style.TUNNEL, LoggerClock.TUNNEL, List.of("PD"), 0.0051);
        check(history, LogText.Style.TUNNEL, LoggerClock.TUNNEL, List.of("TA1"), 0.00051);
        check(history, LogText.Style.TUNNEL, LoggerClock.TUNNEL, List.of("PB"), 0.51);
    }

    private void check(RunHistory history, LogText.Style style, LoggerClock clock, List<String> channels, double step)
            throws RefusedException {
        LogData data = LogReader.read(folder, style.file(RUN), Optional.empty(), ZoneId.of("Europe/Vienna"), Map.of());
        double offset = clock.offset().map(Declared::si).orElse(clock.hiddenOffsetS());
        double rate = clock.rate().map(Declared::si).orElse(0.0);
        for (String channel : channels) {
            Series series = data.channel(channel).orElseThrow();
            int source = history.channels().indexOf(channel);
            assertTrue(series.size() > 1000, channel);
            for (int i = 0; i < series.size(); i++) {
                double first = series.timesS()[0];
                double time = first - offset + (series.timesS()[i] - first) / (1.0 + rate);
                double truth = history.value(source, time - history.plan().startS());
                assertEquals(truth, series.values()[i], step, style + " " + channel + " row " + i);
            }
        }
    }
}
