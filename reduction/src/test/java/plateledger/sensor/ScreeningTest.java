package plateledger.sensor;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.log.Series;
import plateledger.quantity.Stated;
import plateledger.rig.Instrument;
import plateledger.rig.Instrument.SignalKind;

/** Screening against faults put in on purpose, and against healthy quantised signals that only look suspicious. */
final class ScreeningTest {
    private static Instrument instrument(SignalKind kind, double resolution, double low, double high) {
        Stated none = Stated.exact(0.0);
        return new Instrument(
                "i",
                kind,
                "",
                List.of(),
                List.of(),
                0.0,
                none,
                none,
                none,
                none,
                none,
                resolution,
                low,
                high,
                "",
                Optional.empty(),
                Optional.empty());
    }

    private static final Instrument THERMOCOUPLES = instrument(SignalKind.TEMPERATURE, 0.001, 263.15, 423.15);

    private static Series series(String channel, String unit, double[] values) {
        int n = values.length;
        byte[] flags = new byte[n];
        for (int i = 0; i < n; i++) {
            flags[i] = (Double.isNaN(values[i]) ? Series.Flag.EMPTY : Series.Flag.VALID).code();
        }
        double[] times = IntStream.range(0, n).asDoubleStream().toArray();
        return new Series(
                channel,
                unit,
                "log.csv",
                times,
                values,
                flags,
                IntStream.range(2, n + 2).toArray());
    }

    private static List<Series> channels() throws IOException {
        List<String[]> rows = new ArrayList<>();
        try (BufferedReader in = new BufferedReader(new InputStreamReader(
                Objects.requireNonNull(ScreeningTest.class.getResourceAsStream("/statistics/channels.csv")),
                StandardCharsets.UTF_8))) {
            in.lines().filter(l -> !l.startsWith("#")).forEach(l -> rows.add(l.split(",", -1)));
        }
        List<Series> all = new ArrayList<>();
        for (int c = 1; c < rows.get(0).length; c++) {
            double[] v = new double[rows.size() - 1];
            for (int i = 0; i < v.length; i++) {
                String cell = rows.get(i + 1)[c];
                v[i] = cell.isEmpty() ? Double.NaN : Double.parseDouble(cell) + 273.15;
            }
            all.add(series(rows.get(0)[c], "\u00b0C", v));
        }
        return all;
    }

    private static List<Integer> flagged(Screened s, Series.Flag flag) {
        byte[] flags = s.series().flags();
        return IntStream.range(0, flags.length)
                .filter(i -> flags[i] == flag.code())
                .boxed()
                .toList();
    }

    private static double[] quantised(
            int n, double step, long seed, java.util.function.IntToDoubleFunction signal, double noise) {
        Random random = new Random(seed);
        double[] v = new double[n];
        for (int i = 0; i < n; i++) {
            v[i] = Math.rint((signal.applyAsDouble(i) + noise * random.nextGaussian()) / step) * step;
        }
        return v;
    }

    private static List<String> ids(Screened s) {
        return s.findings().stream().map(Finding::id).toList();
    }

    /** Rows CHANNELS of worked-cases.csv: stuck run of 62 from 89 in TC2, spikes 40, 171, 260 and no other in TC3, 20 blanks. */
    @Test
    @Tag("validation")
    void findsTheFaultsOfTheReferenceSet() throws IOException {
        for (boolean together : new boolean[] {true, false}) {
            List<Series> all = channels();
            List<Screened> screened = together
                    ? Screening.screenAll(all, THERMOCOUPLES)
                    : all.stream().map(s -> Screening.screen(s, THERMOCOUPLES)).toList();
            for (int c = 0; c < 8; c++) {
                List<Integer> stuck = flagged(screened.get(c), Series.Flag.STUCK);
                assertEquals(c == 1 ? IntStream.range(89, 151).boxed().toList() : List.of(), stuck, "TC" + (c + 1));
            }
            assertEquals(List.of(40, 171, 260), flagged(screened.get(2), Series.Flag.SPIKE));
            assertEquals(List.of(), flagged(screened.get(1), Series.Flag.SPIKE));
            assertEquals(20, screened.get(3).series().count(Series.Flag.EMPTY));
            assertEquals(List.of("SENSOR-STUCK"), ids(screened.get(1)));
            assertEquals(91, screened.get(1).findings().get(0).place().line());
            assertTrue(screened.get(1).findings().get(0).found().startsWith("62 readings stuck"));
            assertEquals(List.of("SENSOR-SPIKE"), ids(screened.get(2)));
        }
    }

    @Test
    void neverCallsAQuietQuantisedSignalStuck() {
        // A barometer of 0.1 hPa steps and little noise: flicker near an edge, then half an hour in the middle of a
        // step.
        double[] pressure = quantised(3600, 10.0, 1, i -> i < 900 ? 98105.0 : 98110.0, 1.5);
        Instrument barometer = instrument(SignalKind.ABSOLUTE_PRESSURE, 10.0, 8e4, 1.1e5);
        assertEquals(List.of(), ids(Screening.screen(series("PB", "hPa", pressure), barometer)));
        double[] humidity = quantised(3600, 1e-3, 2, i -> 0.415 + 1e-6 * i, 2e-4);
        Instrument hygrometer = instrument(SignalKind.RELATIVE_HUMIDITY, 1e-3, 0.0, 1.0);
        assertEquals(List.of(), ids(Screening.screen(series("RH", "%", humidity), hygrometer)));
        double[] supply = quantised(1500, 1e-3, 3, i -> i < 20 ? 0.0 : 12.3456, 2e-4);
        Instrument voltmeter = instrument(SignalKind.VOLTAGE, 1e-3, 0.0, 60.0);
        assertEquals(List.of(), ids(Screening.screen(series("V1", "V", supply), voltmeter)));
        List<Series> supplies = new ArrayList<>();
        for (int k = 0; k < 8; k++) {
            double volts = 12.0 + k * 0.1234;
            supplies.add(series("V" + k, "V", quantised(1500, 1e-3, 10 + k, i -> volts, k == 0 ? 1e-5 : 2e-4)));
        }
        Screening.screenAll(supplies, voltmeter).forEach(s -> assertEquals(List.of(), ids(s)));
    }

    @Test
    void healthyNoisyChannelsAreSeldomFlagged() {
        int spikes = 0;
        for (int k = 0; k < 100; k++) {
            double sigma = 0.003 + 0.0005 * k; // from a third of a step to five steps
            double[] v = quantised(1500, 0.01, 100 + k, i -> 300.0 + 20.0 * (1.0 - Math.exp(-i / 300.0)), sigma);
            Screened s = Screening.screen(series("T", "K", v), instrument(SignalKind.TEMPERATURE, 0.01, 263.0, 423.0));
            assertEquals(List.of(), flagged(s, Series.Flag.STUCK), "noise " + sigma);
            spikes += flagged(s, Series.Flag.SPIKE).size();
        }
        // 0.07 % of white noise is flagged at k = 10, t0 = 5 (statistics reference, section 4): 105 of 150 000.
        assertTrue(spikes < 210, "false spikes: " + spikes);
    }

    @Test
    void likeChannelsDecideOnAChannelThatNeverMoves() {
        List<Series> like = new ArrayList<>();
        for (int k = 0; k < 6; k++) {
            like.add(series("T0" + k, "K", quantised(900, 0.01, 50 + k, i -> 310.0, k == 2 ? 0.0 : 0.02)));
        }
        Instrument plate = instrument(SignalKind.TEMPERATURE, 0.01, 263.0, 423.0);
        List<Screened> screened = Screening.screenAll(like, plate);
        assertEquals(900, flagged(screened.get(2), Series.Flag.STUCK).size());
        assertEquals(List.of("SENSOR-STUCK"), ids(screened.get(2)));
        Screened alone = Screening.screen(like.get(2), plate);
        assertEquals(List.of("SENSOR-ONE-VALUE"), ids(alone));
        assertEquals(Level.NOT_CHECKED, alone.findings().get(0).level());
    }

    @Test
    void findsTwoStuckStretchesInOneChannel() {
        double[] v = quantised(1500, 0.01, 7, i -> 310.0, 0.02);
        java.util.Arrays.fill(v, 300, 400, v[299]);
        java.util.Arrays.fill(v, 900, 960, v[899]);
        Screened s = Screening.screen(series("T", "K", v), instrument(SignalKind.TEMPERATURE, 0.01, 263.0, 423.0));
        assertTrue(flagged(s, Series.Flag.STUCK).size() >= 160);
        assertTrue(flagged(s, Series.Flag.STUCK)
                .containsAll(IntStream.range(900, 960).boxed().toList()));
    }

    @Test
    void aStepIsNoSpikeAndRangeComesFirst() {
        double[] step = quantised(400, 0.001, 8, i -> i < 200 ? 0.0 : 12.0, 0.002);
        Instrument voltmeter = instrument(SignalKind.VOLTAGE, 0.001, -1.0, 60.0);
        assertEquals(List.of(), ids(Screening.screen(series("V1", "V", step), voltmeter)));
        step[199] = 3.7; // a reading on the flank
        step[200] = 8.9;
        assertEquals(List.of(), ids(Screening.screen(series("V1", "V", step), voltmeter)));
        double[] v = quantised(400, 0.001, 9, i -> 12.0, 0.002);
        v[100] = 99.0;
        v[101] = 15.0;
        Screened s = Screening.screen(series("V1", "V", v), voltmeter);
        assertEquals(List.of(100), flagged(s, Series.Flag.OUT_OF_RANGE));
        assertTrue(flagged(s, Series.Flag.SPIKE).contains(101)); // chance flags of 0.07 % are bounded in another test
        assertEquals(102, s.findings().get(0).place().line());
    }

    @Test
    void aUnitThatDoesNotFitTheInstrumentStops() {
        double[] v = quantised(50, 0.001, 9, i -> 12.0, 0.002);
        Instrument voltmeter = instrument(SignalKind.VOLTAGE, 0.001, -1.0, 60.0);
        Finding wrong =
                Screening.screen(series("V1", "A", v), voltmeter).findings().get(0);
        assertEquals("SENSOR-UNIT", wrong.id());
        assertEquals(Level.STOP, wrong.level());
        assertEquals(
                Level.CAUTION,
                Screening.screen(series("V1", "", v), voltmeter)
                        .findings()
                        .get(0)
                        .level());
    }
}
