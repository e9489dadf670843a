package plateledger.reduce;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import plateledger.campaign.Campaign;
import plateledger.campaign.Logger;
import plateledger.campaign.Run;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.RefusedException;
import plateledger.log.LogData;
import plateledger.log.LogReader;
import plateledger.log.Series;
import plateledger.rig.Instrument;
import plateledger.sensor.Clock;
import plateledger.sensor.InstrumentEquation;
import plateledger.sensor.Screening;

/**
 * The logs of one run as read: channels in SI after their calibration polynomial, on true time, screened.
 *
 * @param run the run
 * @param logs the files
 * @param series channels by name
 * @param findings what was odd in files and channels
 */
record RunLogs(Run run, List<LogData> logs, Map<String, Series> series, List<Finding> findings) {

    /** Reads the logs of a run. */
    static RunLogs read(Path folder, Campaign campaign, Run run) throws RefusedException {
        List<LogData> logs = new ArrayList<>();
        List<Finding> findings = new ArrayList<>();
        List<Finding> refusals = new ArrayList<>();
        Map<String, Series> series = new LinkedHashMap<>();
        Map<String, List<Series>> byInstrument = new LinkedHashMap<>();
        for (Map.Entry<String, String> entry : run.logs().entrySet()) {
            Optional<Logger> logger = campaign.logger(entry.getKey());
            if (logger.isEmpty()) {
                continue; // the campaign reader has refused an unknown logger
            }
            try {
                LogData log = LogReader.read(
                        folder,
                        entry.getValue(),
                        logger.get().format(),
                        logger.get().zone(),
                        logger.get().columns());
                logs.add(log);
                findings.addAll(log.findings());
                Clock clock = Clock.of(
                        log.startS(), logger.get().clockOffsetS(), logger.get().clockRate());
                for (Series s : log.series()) {
                    campaign.rig()
                            .instrumentOf(s.channel())
                            .ifPresent(i -> byInstrument
                                    .computeIfAbsent(i.id(), id -> new ArrayList<>())
                                    .add(corrected(s, clock, i)));
                }
            } catch (RefusedException e) {
                refusals.addAll(e.findings());
            }
        }
        for (Map.Entry<String, List<Series>> entry : byInstrument.entrySet()) {
            Instrument instrument = campaign.rig().instruments().stream()
                    .filter(i -> i.id().equals(entry.getKey()))
                    .findFirst()
                    .orElseThrow();
            for (var screened : Screening.screenAll(entry.getValue(), instrument)) {
                series.put(screened.series().channel(), screened.series());
                findings.addAll(screened.findings());
            }
        }
        if (refusals.isEmpty()) {
            missing(campaign, run, logs, series).ifPresent(refusals::add);
            LogOverlap.missing(run, series.values(), campaign.zone()).ifPresent(refusals::add);
        }
        if (!refusals.isEmpty()) {
            throw new RefusedException(refusals);
        }
        return new RunLogs(run, logs, series, findings);
    }

    /** One finding for all channels that no column holds, with the columns that no channel takes: one may be the other. */
    private static Optional<Finding> missing(
            Campaign campaign, Run run, List<LogData> logs, Map<String, Series> series) {
        List<String> missing = ExpectedChannels.of(campaign, run).stream()
                .filter(channel -> !series.containsKey(channel))
                .toList();
        if (missing.isEmpty()) {
            return Optional.empty();
        }
        String unclaimed = logs.stream()
                .flatMap(log -> log.series().stream())
                .filter(s -> campaign.rig().instrumentOf(s.channel()).isEmpty())
                .map(s -> "\"" + s.channel() + "\" in " + s.file())
                .collect(Collectors.joining(", "));
        boolean one = missing.size() == 1;
        return Optional.of(new Finding(
                "LOG-CHANNEL-MISSING",
                Level.STOP,
                run.place(),
                "run " + run.id() + (one ? ", channel " : ", channels ") + String.join(", ", missing),
                "no column of " + (one ? "that name" : "those names") + " in "
                        + String.join(", ", run.logs().values())
                        + (unclaimed.isEmpty() ? "" : "; columns of no channel: " + unclaimed),
                "a column for every channel that rig.toml names",
                "Correct the name in rig.toml, or map the column's title under [logger.<id>] columns.",
                ""));
    }

    /** Times from logger to true time; values through the calibration polynomial. */
    private static Series corrected(Series s, Clock clock, Instrument instrument) {
        double[] times = Arrays.stream(s.timesS()).map(clock::trueTime).toArray();
        double[] values = instrument.polynomial().isEmpty()
                ? s.values()
                : Arrays.stream(s.values())
                        .map(v -> InstrumentEquation.polynomial(instrument.polynomial(), v))
                        .toArray();
        return new Series(s.channel(), s.unit(), s.file(), times, values, s.flags(), s.lines());
    }
}
