package plateledger.rig;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.keyfile.Form;
import plateledger.keyfile.Key;
import plateledger.keyfile.KeyFile;
import plateledger.keyfile.KeyTable;
import plateledger.quantity.Dimension;
import plateledger.quantity.Stated;

/** Reads {@code rig.toml}. */
public final class RigReader {
    /** Name of the file in the campaign folder. */
    public static final String FILE = "rig.toml";

    /** Classes of surface in the contact-burn table. */
    private static final Map<String, String> SURFACE_CLASSES = Stream.of(
                    "bare metal", "coated metal", "ceramic, glass, stone", "plastic", "wood")
            .collect(Collectors.toMap(Function.identity(), Function.identity(), (a, b) -> a, LinkedHashMap::new));

    private final Collection<Finding> findings;
    private final Optional<List<Instrument>> instruments;
    private final Set<String> plateIds = new LinkedHashSet<>();
    private final List<Plate> soundPlates = new ArrayList<>();

    private RigReader(Optional<List<Instrument>> instruments, Collection<Finding> findings) {
        this.instruments = instruments;
        this.findings = findings;
    }

    /**
     * The rig as far as it could be read.
     *
     * @param rig the rig, with placeholders where a finding says so
     * @param plateIds every plate named in the file
     * @param soundPlates the plates about which nothing is wrong
     */
    public record Reading(Rig rig, Set<String> plateIds, List<Plate> soundPlates) {
        /** Copies both. */
        public Reading {
            plateIds = Set.copyOf(plateIds);
            soundPlates = List.copyOf(soundPlates);
        }
    }

    /**
     * Reads the file.
     *
     * @param folder the campaign folder
     * @param instruments the instruments that own the channels; if empty, owners are not checked
     * @param findings where all that is wrong goes
     * @return the rig; empty if the file is missing or unreadable as a whole
     */
    public static Optional<Reading> read(
            Path folder, Optional<List<Instrument>> instruments, Collection<Finding> findings) {
        return KeyFile.read(folder, FILE, findings).map(file -> {
            RigReader reader = new RigReader(instruments, findings);
            Rig rig = reader.rig(file.root());
            file.refuseUnknownKeys();
            return new Reading(rig, reader.plateIds, reader.soundPlates);
        });
    }

    /** Every key this reader accepts. */
    public static List<Key> keys() {
        KeyFile file = KeyFile.dry();
        Rig placeholders = new RigReader(Optional.empty(), new HashSet<>()).rig(file.root());
        if (placeholders.plates().isEmpty()) {
            throw new IllegalStateException("the dry run visited no plate");
        }
        return file.accepted();
    }

    private Rig rig(KeyTable root) {
        String title = root.need("title", Form.text());
        ChannelUse channels = ChannelUse.of(instruments);
        Surroundings surroundings = root.needTable("surroundings", t -> surroundings(t, channels));
        Limits limits = root.needTable("limits", RigReader::limits);
        List<Protection> protections =
                root.findTable("protection", RigReader::protections).orElseGet(List::of);
        noteSilence(protections);
        List<Plate> plates = root.needNamedLike("plate", "id", (id, t) -> plate(id, t, channels.copy()));
        return new Rig(title, plates, surroundings, instruments.orElse(List.of()), limits, protections);
    }

    private Plate plate(String id, KeyTable t, ChannelUse channels) {
        Plate plate = PlateReader.read(id, t, channels);
        plateIds.add(id);
        if (t.sound()) {
            soundPlates.add(plate);
        }
        return plate;
    }

    private static Surroundings surroundings(KeyTable t, ChannelUse channels) {
        Stated exchange = t.need("exchange_factor", Form.measured(Dimension.NUMBER));
        t.require(exchange.value() > 0.0 && exchange.value() <= 1.0, "exchange_factor", "above 0, at most 1");
        Stated blockage = t.need("blockage", Form.measured(Dimension.NUMBER));
        t.require(Math.abs(blockage.value()) < 0.5, "blockage", "between -50 % and 50 %");
        return new Surroundings(
                needed(t, "walls", channels),
                needed(t, "plenum", channels),
                needed(t, "frame", channels),
                needed(t, "nose", channels),
                needed(t, "tail", channels),
                optional(t, "cover_inner", channels),
                optional(t, "cover_outer", channels),
                channel(t, "air", channels, Instrument.SignalKind.TEMPERATURE),
                channel(t, "pressure", channels, Instrument.SignalKind.ABSOLUTE_PRESSURE),
                channel(t, "humidity", channels, Instrument.SignalKind.RELATIVE_HUMIDITY),
                exchange,
                blockage,
                t.needTable("air_probe", RigReader::airProbe),
                speedMeters(t, channels));
    }

    private static List<String> needed(KeyTable t, String key, ChannelUse channels) {
        List<String> named = t.need(key, Form.listOf(Form.text()));
        t.require(!named.isEmpty(), key, "one channel or more");
        channels.useAll(t, key, named, Instrument.SignalKind.TEMPERATURE);
        return named;
    }

    private static List<String> optional(KeyTable t, String key, ChannelUse channels) {
        List<String> named = t.take(key, Form.listOf(Form.text()), List.of(), "[]");
        channels.useAll(t, key, named, Instrument.SignalKind.TEMPERATURE);
        return named;
    }

    private static String channel(KeyTable t, String key, ChannelUse channels, Instrument.SignalKind kind) {
        String named = t.need(key, Form.text());
        channels.use(t, key, named, kind);
        return named;
    }

    private static Surroundings.AirProbe airProbe(KeyTable t) {
        Surroundings.AirProbe probe = new Surroundings.AirProbe(
                t.need("recovery_factor", Form.measured(Dimension.NUMBER)),
                t.need("radiation_fraction", Form.measured(Dimension.NUMBER)));
        t.require(within(probe.recoveryFactor().value()), "recovery_factor", "between 0 and 1");
        t.require(within(probe.radiationFraction().value()), "radiation_fraction", "between 0 and 1");
        return probe;
    }

    private static boolean within(double fraction) {
        return fraction >= 0.0 && fraction <= 1.0;
    }

    private record Meter(KeyTable table, Surroundings.SpeedMeter meter) {}

    private static List<Surroundings.SpeedMeter> speedMeters(KeyTable t, ChannelUse channels) {
        List<Meter> meters = new ArrayList<>(t.needTables("speed_meter", m -> new Meter(m, speedMeter(m, channels))));
        List<Surroundings.SpeedMeter> inFileOrder =
                meters.stream().map(Meter::meter).toList();
        meters.removeIf(m -> !m.table().sound("from", "to"));
        meters.sort(Comparator.comparingDouble(m -> m.meter().fromMPerS()));
        for (int i = 1; i < meters.size(); i++) {
            Surroundings.SpeedMeter slower = meters.get(i - 1).meter();
            if (meters.get(i).meter().fromMPerS() < slower.toMPerS()) {
                meters.get(i)
                        .table()
                        .refuse("from", "RIG-METER-OVERLAP", "the end of the range of " + slower.channel(), "");
            }
        }
        return inFileOrder;
    }

    private static Surroundings.SpeedMeter speedMeter(KeyTable t, ChannelUse channels) {
        Surroundings.SpeedPrinciple principle =
                t.need("principle", Form.choice(Surroundings.SpeedPrinciple.class, InstrumentReader::word));
        Instrument.SignalKind kind = principle == Surroundings.SpeedPrinciple.PITOT
                ? Instrument.SignalKind.DIFFERENTIAL_PRESSURE
                : Instrument.SignalKind.SPEED;
        String channel = t.need("channel", Form.text());
        if (t.sound("principle")) {
            channels.use(t, "channel", channel, kind);
        }
        Surroundings.SpeedMeter meter = new Surroundings.SpeedMeter(
                channel,
                principle,
                t.need("factor", Form.measured(Dimension.NUMBER)),
                t.need("from", Form.setting(Dimension.SPEED)),
                t.need("to", Form.setting(Dimension.SPEED)));
        t.require(meter.factor().value() > 0.0, "factor", "a value above 0");
        t.require(meter.fromMPerS() >= 0.0, "from", "0 m/s or more");
        if (t.sound("from", "to")) {
            t.require(meter.toMPerS() > meter.fromMPerS(), "to", "more than from");
        }
        return meter;
    }

    private static Limits limits(KeyTable t) {
        Limits limits = new Limits(
                t.need("surface", Form.temperature()),
                t.need("touchable", Form.flag()),
                t.need("surface_class", Form.choice(SURFACE_CLASSES)),
                t.need("lowest_material", Form.text()),
                t.need("lowest_material_limit", Form.temperature()),
                t.need("flow_present", Form.setting(Dimension.SPEED)));
        t.require(limits.flowPresentMPerS() > 0.0, "flow_present", "above 0 m/s");
        return limits;
    }

    private static List<Protection> protections(KeyTable t) {
        List<Protection> stated = new ArrayList<>();
        for (Protection.Kind kind : Protection.Kind.values()) {
            t.findTable(key(kind), inner -> protection(kind, inner)).ifPresent(stated::add);
        }
        return stated;
    }

    private static Protection protection(Protection.Kind kind, KeyTable t) {
        return new Protection(
                kind,
                t.need("declared", Form.flag()),
                t.take("setting", Form.anyText(), "", "\"\""),
                t.find("tested", Form.date()));
    }

    private static String key(Protection.Kind kind) {
        return kind.name().toLowerCase(Locale.ROOT);
    }

    private void noteSilence(List<Protection> stated) {
        Set<Protection.Kind> silent = new LinkedHashSet<>(List.of(Protection.Kind.values()));
        stated.forEach(protection -> silent.remove(protection.kind()));
        for (Protection.Kind kind : silent) {
            findings.add(new Finding(
                    "RIG-PROTECTION-SILENT",
                    Level.CAUTION,
                    Place.of(FILE),
                    "protection." + key(kind),
                    "no such table",
                    "a statement whether the rig has it",
                    "Flow interlock and cut-out count as absent then, others as not checked; add [protection."
                            + key(kind) + "] with declared = true or false.",
                    ""));
        }
    }
}
