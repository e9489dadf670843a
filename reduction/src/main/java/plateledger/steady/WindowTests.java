package plateledger.steady;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The tests a steady stretch must pass. Storage comes first, since it is cheap to refuse by; the channel that failed last is
 * asked first the next time, since it will most likely fail again.
 */
final class WindowTests {
    private static final double ENOUGH_SAMPLES = 0.95;
    private static final double HARMLESS = 0.5;
    private static final int SUB_WINDOWS = 5;
    private static final int FEWEST = 10;
    /** All channels together raise a false alarm in one window of twenty. */
    private static final double FALSE_ALARMS = 0.05;

    private final WindowRequest request;
    private final List<ChannelSamples> channels;
    private final List<ChannelSamples> plate;
    private final double[] plateWeights;
    private final Optional<ChannelSamples> power;
    private final List<ChannelSamples> order;
    /** Slopes fitted so far: a window that passes is asked for its evidence and its means after that. */
    private final Map<Stretch, SlopeTest> slopes = new HashMap<>();

    private final Optional<ChannelSamples> common;

    private record Stretch(String channel, int from, int to) {}

    /**
     * Tests over channels.
     *
     * @param channels every channel tested, the power included
     * @param plate mean temperature of the plate, one for each log that holds plate channels
     * @param plateWeights share of the plate channels in each, sum 1
     */
    WindowTests(
            WindowRequest request,
            List<ChannelSamples> channels,
            List<ChannelSamples> plate,
            double[] plateWeights,
            Optional<ChannelSamples> power) {
        this.request = request;
        this.channels = List.copyOf(channels);
        this.plate = List.copyOf(plate);
        this.plateWeights = plateWeights.clone();
        this.power = power;
        this.order = new ArrayList<>(channels);
        this.common = request.common()
                .flatMap(name ->
                        channels.stream().filter(c -> c.name().equals(name)).findFirst());
    }

    /** True if a stretch (times from the origin) passes every test. */
    boolean pass(double start, double end) {
        if (!mayStore(start, end) || !storage(start, end).passed()) {
            return false;
        }
        for (int i = 0; i < order.size(); i++) {
            ChannelSamples c = order.get(i);
            boolean passed = c.share(start, end) >= ENOUGH_SAMPLES
                    && drift(c, start, end).passed()
                    && march(c, start, end).passed();
            if (!passed) {
                order.remove(i);
                order.add(0, c);
                return false;
            }
        }
        return true;
    }

    /** True if there is a plate temperature to judge storage by. */
    boolean judgesPlate() {
        return !plate.isEmpty();
    }

    /** The slope of a channel over samples a to b exclusive. */
    SlopeTest slope(ChannelSamples c, int a, int b) {
        return slopes.computeIfAbsent(
                new Stretch(c.name() + "@" + c.file(), a, b), k -> SlopeTest.of(c.times(a, b), c.values(a, b)));
    }

    /** Every test over a stretch; the names of tests get the suffix. */
    List<Evidence> evidence(double start, double end, String suffix) {
        List<Evidence> all = new ArrayList<>();
        if (judgesPlate()) {
            all.add(storage(start, end));
        }
        for (ChannelSamples c : channels) {
            double share = c.share(start, end);
            if (share < ENOUGH_SAMPLES) {
                all.add(new Evidence("samples", c.name(), share, ENOUGH_SAMPLES, "1", false));
            }
            all.add(drift(c, start, end));
            all.add(march(c, start, end));
        }
        return suffix.isEmpty()
                ? all
                : all.stream()
                        .map(e -> new Evidence(
                                e.test() + suffix, e.subject(), e.value(), e.limit(), e.unit(), e.passed()))
                        .toList();
    }

    /** False if the plain slope already stores too much; the bound can only be larger. */
    private boolean mayStore(double start, double end) {
        double slope = 0.0;
        for (int i = 0; i < plate.size(); i++) {
            ChannelSamples c = plate.get(i);
            int a = c.from(start);
            int b = c.to(end);
            if (b - a < FEWEST) {
                return false;
            }
            slope += plateWeights[i] * Math.abs(c.slope(a, b));
        }
        return slope <= slopeLimit(start, end);
    }

    /** The slope of the plate, K/s, that is just allowed; infinite where neither power nor plate are there to judge by. */
    private double slopeLimit(double start, double end) {
        if (plate.isEmpty()) {
            return Double.POSITIVE_INFINITY;
        }
        if (power.isPresent()) {
            double watts = mean(power.get(), start, end);
            return watts > 0.0 ? request.shareLimit() * watts / request.heatCapacityJPerK() : 0.0;
        }
        return common.isPresent() ? Double.POSITIVE_INFINITY : HARMLESS * plateTarget() / (end - start);
    }

    /** Target of the plate's mean temperature: that of its best channel. */
    private double plateTarget() {
        double least = Double.POSITIVE_INFINITY;
        for (String name : request.temperatureChannels()) {
            least = Math.min(least, target(name));
        }
        return least;
    }

    private double target(String channel) {
        return request.targetUncertainty().getOrDefault(channel, 0.0);
    }

    /** With power: upper bound of storage ÷ power. Without: upper bound of the plate's own drift over the window. */
    private Evidence storage(double start, double end) {
        double bound = 0.0;
        for (int i = 0; i < plate.size(); i++) {
            ChannelSamples c = plate.get(i);
            int a = c.from(start);
            int b = c.to(end);
            bound += b - a < FEWEST
                    ? Double.POSITIVE_INFINITY
                    : plateWeights[i]
                            * SlopeTest.of(c.times(a, b), c.values(a, b)).bound();
        }
        if (power.isPresent() && !plate.isEmpty()) {
            double watts = mean(power.get(), start, end);
            double share = watts > 0.0 ? request.heatCapacityJPerK() * bound / watts : Double.POSITIVE_INFINITY;
            return new Evidence("storage", "plate", share, request.shareLimit(), "1", share <= request.shareLimit());
        }
        double allowed = plate.isEmpty() ? 0.0 : HARMLESS * plateTarget();
        double travel = plate.isEmpty() ? 0.0 : plateTravel(start, end);
        return new Evidence("plate drift", "plate", travel, allowed, "K", travel <= allowed);
    }

    /** Bound of the plate's own drift over a stretch, beyond what it shares with the room, K. */
    private double plateTravel(double start, double end) {
        double bound = 0.0;
        for (int i = 0; i < plate.size(); i++) {
            ChannelSamples c = plate.get(i);
            int a = c.from(start);
            int b = c.to(end);
            bound += b - a < FEWEST
                    ? Double.POSITIVE_INFINITY
                    : plateWeights[i]
                            * SlopeTest.of(c.times(a, b), c.values(a, b))
                                    .against(commonSlope(start, end))
                                    .bound();
        }
        return bound * (end - start);
    }

    /** Slope of the common channel over a stretch; none where there is no such channel. */
    private SlopeTest commonSlope(double start, double end) {
        if (common.isEmpty()) {
            return SlopeTest.NONE;
        }
        ChannelSamples c = common.get();
        int a = c.from(start);
        int b = c.to(end);
        return b - a < FEWEST ? SlopeTest.NONE : slope(c, a, b);
    }

    private Evidence drift(ChannelSamples c, double start, double end) {
        int a = c.from(start);
        int b = c.to(end);
        double harmless = HARMLESS * target(c.name());
        if (b - a < FEWEST) {
            return new Evidence("drift", c.name(), Double.POSITIVE_INFINITY, harmless, c.unit(), false);
        }
        if (common.isPresent() && c == common.get()) {
            return new Evidence("drift", c.name() + " (common)", 0.0, harmless, c.unit(), true);
        }
        SlopeTest slope = slope(c, a, b);
        if (request.followers().contains(c.name())) {
            slope = slope.against(commonSlope(start, end));
        }
        double travel = slope.bound() * (end - start);
        if (travel <= harmless) {
            return new Evidence("drift", c.name(), travel, harmless, c.unit(), true);
        }
        double critical = StudentT.twoSided(FALSE_ALARMS / channels.size(), slope.dof());
        return new Evidence("drift significance", c.name(), slope.t(), critical, "1", slope.t() <= critical);
    }

    /** The range of five sub-means counts only if they march one way, which happens by chance in one window of sixty. */
    private Evidence march(ChannelSamples c, double start, double end) {
        double harmless = HARMLESS * target(c.name());
        double part = (end - start) / SUB_WINDOWS;
        int[] edges = new int[SUB_WINDOWS + 1];
        for (int i = 0; i < SUB_WINDOWS; i++) {
            edges[i] = c.from(start + i * part);
        }
        edges[SUB_WINDOWS] = c.to(end);
        double follow =
                request.followers().contains(c.name()) ? commonSlope(start, end).slope() * part : 0.0;
        if (common.isPresent() && c == common.get()) {
            return new Evidence("march", c.name() + " (common)", 0.0, harmless, c.unit(), true);
        }
        int up = 0;
        int down = 0;
        for (int i = 0; i < SUB_WINDOWS; i++) {
            if (edges[i + 1] - edges[i] < 2) {
                return new Evidence("march", c.name(), Double.POSITIVE_INFINITY, harmless, c.unit(), false);
            }
            if (i > 0) {
                double step = c.mean(edges[i], edges[i + 1]) - c.mean(edges[i - 1], edges[i]) - follow;
                up += step > 0.0 ? 1 : 0;
                down += step < 0.0 ? 1 : 0;
            }
        }
        boolean marches = up == SUB_WINDOWS - 1 || down == SUB_WINDOWS - 1;
        if (!marches) {
            return new Evidence("march", c.name(), 0.0, harmless, c.unit(), true);
        }
        double range = Math.abs(c.mean(edges[SUB_WINDOWS - 1], edges[SUB_WINDOWS])
                - c.mean(edges[0], edges[1])
                - (SUB_WINDOWS - 1) * follow);
        double limit = harmless;
        if (range > harmless) {
            double error = 0.0;
            for (int i = 0; i < SUB_WINDOWS; i++) {
                error += MeanError.of(c.values(edges[i], edges[i + 1])).standardError() / SUB_WINDOWS;
            }
            limit = Math.max(harmless, 2.0 * error);
        }
        return new Evidence("march", c.name(), range, limit, c.unit(), range <= limit);
    }

    private static double mean(ChannelSamples c, double start, double end) {
        int a = c.from(start);
        int b = c.to(end);
        return b > a ? c.mean(a, b) : Double.NaN;
    }
}
