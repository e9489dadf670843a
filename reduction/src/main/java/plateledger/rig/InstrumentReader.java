package plateledger.rig;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Collection;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.keyfile.Form;
import plateledger.keyfile.Key;
import plateledger.keyfile.KeyFile;
import plateledger.keyfile.KeyTable;
import plateledger.quantity.Dimension;
import plateledger.quantity.Stated;
import plateledger.quantity.Unit;

/** Reads {@code instruments.toml}. */
public final class InstrumentReader {
    /** Name of the file in the campaign folder. */
    public static final String FILE = "instruments.toml";

    private static final String OF_KIND = "of the kind"; // the unit depends on another key

    private final Collection<Finding> findings;
    private final Map<String, String> owners = new HashMap<>();
    private final Map<String, Place> places = new LinkedHashMap<>();

    private InstrumentReader(Collection<Finding> findings) {
        this.findings = findings;
    }

    /**
     * The instruments as far as they could be read.
     *
     * @param instruments in the order of the file, with placeholders where a finding says so
     * @param places where each instrument's due date (or the instrument) stands
     */
    public record Reading(List<Instrument> instruments, Map<String, Place> places) {
        /** Copies both. */
        public Reading {
            instruments = List.copyOf(instruments);
            places = Map.copyOf(places);
        }
    }

    /** Reads the file; empty if it is missing or unreadable as a whole. All that is wrong goes to the findings. */
    public static Optional<Reading> read(Path folder, Collection<Finding> findings) {
        return KeyFile.read(folder, FILE, findings).map(file -> {
            InstrumentReader reader = new InstrumentReader(findings);
            List<Instrument> instruments = reader.all(file.root());
            file.refuseUnknownKeys();
            return new Reading(instruments, reader.places);
        });
    }

    /** Every key this reader accepts. */
    public static List<Key> keys() {
        KeyFile file = KeyFile.dry();
        List<Instrument> placeholders = new InstrumentReader(new HashSet<>()).all(file.root());
        if (placeholders.isEmpty()) {
            throw new IllegalStateException("the dry run visited no instrument");
        }
        return file.accepted();
    }

    /** The word of a kind in the file, e.g. {@code differential-pressure}. */
    static String word(Enum<?> kind) {
        return kind.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    private List<Instrument> all(KeyTable root) {
        return root.needNamed("instrument", "id", this::instrument);
    }

    private Instrument instrument(String id, KeyTable t) {
        Instrument.SignalKind kind = t.need("kind", Form.choice(Instrument.SignalKind.class, InstrumentReader::word));
        Dimension reading = reading(kind);
        Dimension difference = reading == Dimension.TEMPERATURE ? Dimension.TEMPERATURE_DIFFERENCE : reading;
        t.find("unit", unit(reading));
        List<String> channels = t.need("channels", Form.listOf(Form.text()));
        own(id, t, channels);
        List<Double> range = t.need("range", Form.listOf(Form.setting(reading).unitWord(OF_KIND)));
        t.require(range.size() == 2 && range.get(0) < range.get(1), "range", "two values, the lower first");
        Optional<LocalDate> calibrated = t.find("calibrated", Form.date());
        Optional<LocalDate> due = t.find("due", Form.date());
        t.require(
                calibrated.isEmpty() || due.isEmpty() || calibrated.get().isBefore(due.get()),
                "due",
                "a date after the calibration");
        places.put(id, t.place("due"));
        return new Instrument(
                id,
                kind,
                t.take("bath", Form.anyText(), "", "\"\""),
                channels,
                t.take("polynomial", Form.listOf(Form.number()), List.of(), "[0, 1]"),
                gainOrigin(t, kind, reading),
                error(t, "offset", difference),
                error(t, "gain", Dimension.NUMBER),
                error(t, "channel_offset", difference),
                error(t, "channel_gain", Dimension.NUMBER),
                error(t, "daily_drift", difference),
                resolution(t, difference),
                range.size() == 2 ? range.get(0) : 0.0,
                range.size() == 2 ? range.get(1) : 0.0,
                t.take("certificate", Form.anyText(), "", "\"\""),
                calibrated,
                due);
    }

    private void own(String id, KeyTable t, List<String> channels) {
        t.require(!channels.isEmpty(), "channels", "one channel or more");
        Set<String> own = new HashSet<>();
        for (String channel : channels) {
            String former = owners.putIfAbsent(channel, id);
            if (former != null || !own.add(channel)) {
                t.refuse(
                        "channels",
                        "INSTRUMENT-CHANNEL-TWICE",
                        "channel " + channel + ", which instrument " + (former == null ? id : former) + " owns already",
                        "each channel in one list, once",
                        "Remove it from one of them.");
            }
        }
    }

    private static double gainOrigin(KeyTable t, Instrument.SignalKind kind, Dimension reading) {
        double origin =
                t.take("gain_origin", Form.setting(reading).unitWord(OF_KIND), 0.0, "0; required for temperature");
        if (kind == Instrument.SignalKind.TEMPERATURE && !t.has("gain_origin")) {
            t.refuse(
                    "gain_origin",
                    "KEY-MISSING",
                    "no such key",
                    "the reading at which a gain error has no effect, in °C or K",
                    "Add gain_origin, for example \"22 °C\".");
        }
        return origin;
    }

    private static double resolution(KeyTable t, Dimension difference) {
        double step = t.take("resolution", Form.setting(difference).unitWord(OF_KIND), 0.0, "0");
        t.require(step >= 0.0, "resolution", "a step of 0 or more");
        return step;
    }

    /** An error of the calibration statement; where it is not stated it counts as none, and that is noted. */
    private Stated error(KeyTable t, String key, Dimension dimension) {
        Form<Stated> form = Form.measured(dimension);
        Stated stated = t.take(
                key, dimension == Dimension.NUMBER ? form : form.unitWord(OF_KIND), Stated.exact(0.0), "0 (exact)");
        if (!t.has(key) && t.sound(key)) {
            findings.add(new Finding(
                    "INSTRUMENT-NOT-STATED",
                    Level.NOTE,
                    t.place(),
                    t.path() + "." + key,
                    "no such key",
                    "a calibration statement",
                    "It counts as 0 without uncertainty; state it, or state \"(exact)\".",
                    ""));
        }
        return stated;
    }

    private static Form<Unit> unit(Dimension reading) {
        return Form.of(
                "unit",
                "the unit of its readings: " + reading.units(),
                reading.siUnit(),
                text -> Unit.find(text).filter(unit -> unit.fits(reading)));
    }

    private static Dimension reading(Instrument.SignalKind kind) {
        return switch (kind) {
            case TEMPERATURE -> Dimension.TEMPERATURE;
            case VOLTAGE -> Dimension.VOLTAGE;
            case CURRENT -> Dimension.CURRENT;
            case DIFFERENTIAL_PRESSURE, ABSOLUTE_PRESSURE -> Dimension.PRESSURE;
            case SPEED -> Dimension.SPEED;
            case RELATIVE_HUMIDITY -> Dimension.NUMBER;
        };
    }
}
