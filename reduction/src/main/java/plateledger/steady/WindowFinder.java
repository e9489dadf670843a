package plateledger.steady;

import java.time.Instant;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Collectors;
import plateledger.log.Series;

/**
 * Finds the steady window of a run by evidence, all of it required over the window and again over the stretch of the same
 * length that begins half a window earlier:
 *
 * <ul>
 *   <li><b>storage</b>: C (|b| + t₀.₉₇₅ SE_b) ÷ P of the plate's mean temperature stays below the limit, an upper bound, so
 *       that a short noisy window cannot pass by ignorance; without power the plate's drift bound over the window must be
 *       harmless instead;
 *   <li><b>drift</b>: of each channel, the power included (channels that follow the room are judged against the stream's
 *       own drift, which means of one window share): the drift bound over the window is below half the channel's
 *       target uncertainty, or no drift can be told (5 % false alarms over all channels of a window together);
 *   <li><b>march</b>: five sub-means do not move strictly one way by more than two standard errors of a sub-mean, unless the
 *       whole way is harmless as above (slow drift of the room moves every channel, and means follow it);
 *   <li><b>samples</b>: 95 % of a channel's samples are there and valid. A channel that misses more than that over the whole
 *       run is left out of the tests and said to be.
 * </ul>
 *
 * Of the windows that pass the longest is taken, and of equally long ones the latest; lengths are tried in steps of 1.2, ends
 * in steps of a sixth of the length. Each mean is taken over its own log's samples inside the window.
 */
public final class WindowFinder {
    private static final double LENGTH_STEP = 1.2;
    private static final double END_STEP = 1.0 / 6.0;
    private static final double WITH_BEFORE = 1.5;
    private static final double ENOUGH_SAMPLES = 0.95;

    private final WindowRequest request;
    private final double originS;
    private final double lengthS;
    private final List<ChannelSamples> all = new ArrayList<>();
    private final List<Evidence> lost = new ArrayList<>();
    private final WindowTests tests;

    private WindowFinder(WindowRequest request, double originS, double endS) {
        this.request = request;
        this.originS = originS;
        this.lengthS = endS - originS;
        List<ChannelSamples> tested = new ArrayList<>();
        Map<String, List<Series>> plateByLog = new LinkedHashMap<>();
        request.channels().forEach((name, series) -> {
            ChannelSamples c = ChannelSamples.of(series, originS);
            all.add(c);
            double share = c.share(0.0, lengthS);
            if (share < ENOUGH_SAMPLES) {
                lost.add(new Evidence("samples of the run", name, share, ENOUGH_SAMPLES, "1", false));
                return;
            }
            tested.add(c);
            if (request.temperatureChannels().contains(name)) {
                plateByLog
                        .computeIfAbsent(series.file() + "#" + series.size(), k -> new ArrayList<>())
                        .add(series);
            }
        });
        Optional<ChannelSamples> power = request.totalPower().map(s -> ChannelSamples.of(s, originS));
        power.ifPresent(all::add);
        power.ifPresent(tested::add);
        double count = plateByLog.values().stream().mapToInt(List::size).sum();
        List<ChannelSamples> plate = new ArrayList<>();
        double[] weights = new double[plateByLog.size()];
        for (List<Series> like : plateByLog.values()) {
            weights[plate.size()] = like.size() / count;
            plate.add(ChannelSamples.mean("plate", like, originS));
        }
        this.tests = new WindowTests(request, tested, plate, weights, power);
    }

    /** Finds the window, or says why there is none. */
    public static WindowOutcome find(WindowRequest request) {
        List<Series> logs = new ArrayList<>(request.channels().values());
        request.totalPower().ifPresent(logs::add);
        Optional<Series> empty = logs.stream().filter(s -> s.size() < 2).findFirst();
        if (logs.isEmpty() || empty.isPresent()) {
            String what =
                    empty.map(s -> "channel " + s.channel() + " has no samples").orElse("no channels");
            return new WindowOutcome(Optional.empty(), List.of(), what);
        }
        Series last = logs.get(0);
        Series first = logs.get(0);
        for (Series s : logs) {
            last = ChannelSamples.firstS(s) > ChannelSamples.firstS(last) ? s : last;
            first = ChannelSamples.lastS(s) < ChannelSamples.lastS(first) ? s : first;
        }
        double start = ChannelSamples.firstS(last);
        double end = ChannelSamples.lastS(first);
        if (!(start < end)) {
            return new WindowOutcome(
                    Optional.empty(),
                    List.of(),
                    "no overlap between loggers: %s (channel %s) begins at %s, after %s (channel %s) has ended at %s"
                            .formatted(
                                    last.file(),
                                    last.channel(),
                                    time(start),
                                    first.file(),
                                    first.channel(),
                                    time(end)));
        }
        WindowFinder finder = new WindowFinder(request, start, end);
        return request.declared().isPresent()
                ? finder.declared(request.declared().get())
                : finder.search();
    }

    private WindowOutcome declared(WindowRequest.Declared wish) {
        double from = wish.startS() - originS;
        double to = wish.endS() - originS;
        if (!(from < to) || from < -1e-6 || to > lengthS + 1e-6) {
            return new WindowOutcome(
                    Optional.empty(),
                    List.of(),
                    "the declared window %s to %s does not lie within what all logs cover, %s to %s"
                            .formatted(time(wish.startS()), time(wish.endS()), time(originS), time(originS + lengthS)));
        }
        List<Evidence> evidence = evidence(from, to);
        return found(from, to, true, wish.reason(), evidence);
    }

    private WindowOutcome search() {
        if (!tests.judgesPlate()
                && (request.totalPower().isPresent()
                        || !request.temperatureChannels().isEmpty())) {
            return new WindowOutcome(
                    Optional.empty(), lost, "no plate temperature with enough valid samples to judge storage by");
        }
        double shortest = request.minimumS();
        if (lengthS < WITH_BEFORE * shortest) {
            List<Evidence> evidence = new ArrayList<>(lost);
            evidence.add(new Evidence("duration", "logs", lengthS, WITH_BEFORE * shortest, "s", false));
            return new WindowOutcome(
                    Optional.empty(),
                    evidence,
                    String.format(
                            Locale.ROOT,
                            "all logs together cover %.0f s; a window of %.0f s and half of it before need %.0f s",
                            lengthS,
                            shortest,
                            WITH_BEFORE * shortest));
        }
        double length = lengthS / WITH_BEFORE;
        while (true) {
            for (double end = lengthS; end - WITH_BEFORE * length >= -1e-6; end -= END_STEP * length) {
                if (tests.pass(end - length, end) && tests.pass(end - WITH_BEFORE * length, end - length / 2.0)) {
                    return found(end - length, end, false, "", evidence(end - length, end));
                }
            }
            if (length <= shortest) {
                return none(evidence(lengthS - shortest, lengthS));
            }
            length = Math.max(length / LENGTH_STEP, shortest);
        }
    }

    private WindowOutcome none(List<Evidence> evidence) {
        String failed = evidence.stream()
                .filter(e -> !e.passed())
                .limit(4)
                .map(e -> String.format(
                        Locale.ROOT,
                        "%s of %s %.3g%s (limit %.3g)",
                        e.test(),
                        e.subject(),
                        e.value(),
                        e.unit().equals("1") ? "" : " " + e.unit(),
                        e.limit()))
                .collect(Collectors.joining("; "));
        return new WindowOutcome(Optional.empty(), evidence, "no steady window; at the end of the run: " + failed);
    }

    /** Every piece of evidence for a window; the stretch before as far as the logs reach. */
    private List<Evidence> evidence(double from, double to) {
        double length = to - from;
        List<Evidence> evidence = new ArrayList<>(lost);
        evidence.add(new Evidence(
                "duration", "window", length, request.minimumS(), "s", length >= request.minimumS() * (1.0 - 1e-9)));
        evidence.addAll(tests.evidence(from, to, ""));
        if (from - length / 2.0 >= -1e-6) {
            evidence.addAll(tests.evidence(from - length / 2.0, to - length / 2.0, " before"));
        } else {
            evidence.add(new Evidence("stretch before", "window", from, length / 2.0, "s", false));
        }
        return evidence;
    }

    private WindowOutcome found(double from, double to, boolean declared, String reason, List<Evidence> evidence) {
        Map<String, ChannelMean> means = new TreeMap<>();
        for (ChannelSamples c : all) {
            if (c.share(from, to) >= ENOUGH_SAMPLES && c.to(to) - c.from(from) >= 3) {
                means.put(c.name(), mean(c, from, to));
            }
        }
        SteadyWindow window = new SteadyWindow(originS + from, originS + to, declared, reason, means, evidence);
        return new WindowOutcome(Optional.of(window), evidence, "");
    }

    private ChannelMean mean(ChannelSamples c, double from, double to) {
        int a = c.from(from);
        int b = c.to(to);
        double[] values = c.values(a, b);
        MeanError error = MeanError.of(values);
        SlopeTest slope = tests.slope(c, a, b);
        double step = request.resolution().getOrDefault(c.name(), Resolution.smallestChange(values));
        double floor = Resolution.floor(values, step);
        boolean coarse = floor > error.standardError();
        return new ChannelMean(
                c.name(),
                c.base() + error.mean(),
                Math.max(error.standardError(), floor),
                coarse ? Double.POSITIVE_INFINITY : error.dof(),
                slope.slope(),
                slope.standardError(),
                b - a,
                c.allSamples(originS + from, originS + to) - (b - a),
                c.line(a),
                c.line(b - 1),
                c.file());
    }

    private static String time(double seconds) {
        return Instant.ofEpochSecond(Math.round(seconds)).toString();
    }
}
