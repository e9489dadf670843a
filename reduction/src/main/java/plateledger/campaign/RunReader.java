package plateledger.campaign;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.keyfile.Form;
import plateledger.keyfile.KeyTable;
import plateledger.quantity.Dimension;
import plateledger.quantity.Estimate;
import plateledger.quantity.Rounded;
import plateledger.quantity.Unit;
import plateledger.rig.Plate;
import plateledger.rig.RigReader;
import plateledger.rig.Surroundings;

/** Reads the {@code [[run]]} tables of {@code campaign.toml} and checks them against the rig and the folder. */
final class RunReader {
    private final Path folder;
    private final ZoneId zone;
    private final Optional<RigReader.Reading> rig;
    private final Set<String> loggers;
    private final Collection<Finding> findings;
    private final Map<String, Place> ids = new HashMap<>();
    private final Map<String, String> logsInUse = new HashMap<>();

    RunReader(
            Path folder,
            ZoneId zone,
            Optional<RigReader.Reading> rig,
            Set<String> loggers,
            Collection<Finding> findings) {
        this.folder = folder;
        this.zone = zone;
        this.rig = rig;
        this.loggers = loggers;
        this.findings = findings;
    }

    Run run(KeyTable t) {
        String id = t.need("id", Form.text());
        if (t.sound("id")) {
            Place former = ids.putIfAbsent(id, t.place("id"));
            if (former != null) {
                t.refuse("id", "CAMPAIGN-ID-TWICE", "an id of its own; the same stands at " + former, "");
            }
        }
        RunType type = t.need("type", Form.choice(RunType.class, RunType::word));
        LocalDate day = t.need("day", Form.date());
        String plate = plate(t, type);
        Optional<Run.Trip> trip = t.findTable("trip", this::trip);
        trip.ifPresent(wire -> checkTrip(t, plate, wire));
        Regime regime = regime(t, type, trip.isPresent());
        double speed = setting(t, "speed", Dimension.SPEED, type == RunType.HEATED);
        checkSpeed(t, type, speed);
        return new Run(
                id,
                type,
                day.toString(),
                plate,
                regime,
                trip,
                speed,
                setting(t, "power", Dimension.POWER, false),
                t.take("set", Form.text(), id, "the id"),
                logs(t, id),
                t.findTable("window", this::window),
                t.find("left_out", Form.text()),
                t.take("note", Form.anyText(), "", "\"\""),
                t.place());
    }

    private String plate(KeyTable t, RunType type) {
        String plate = t.take("plate", Form.text(), "", "\"\"; required except for fan-off zero");
        if (!t.has("plate") && t.sound("type") && type != RunType.FAN_OFF_ZERO) {
            t.refuse("plate", "KEY-MISSING", "no such key", "the plate mounted", "Add plate = \"…\" to this run.");
        }
        rig.ifPresent(reading -> checkPlate(t, "plate", plate, reading));
        return plate;
    }

    /** Refuses a plate that the rig file does not name. */
    static void checkPlate(KeyTable t, String key, String plate, RigReader.Reading reading) {
        if (t.has(key) && t.sound(key) && !reading.plateIds().contains(plate)) {
            String known =
                    String.join(", ", reading.plateIds().stream().sorted().toList());
            t.refuse(key, "CAMPAIGN-PLATE", "a plate of " + RigReader.FILE + ": " + known, "");
        }
    }

    private static Regime regime(KeyTable t, RunType type, boolean tripped) {
        Regime fallback = tripped ? Regime.TURBULENT : Regime.LAMINAR;
        Regime regime = t.take(
                "regime",
                Form.choice(Regime.class, Regime::word),
                fallback,
                "turbulent with a trip, else laminar; required for heated");
        if (!t.has("regime") && t.sound("type") && type == RunType.HEATED) {
            t.refuse(
                    "regime",
                    "KEY-MISSING",
                    "no such key",
                    "the state of the boundary layer: laminar, turbulent or product",
                    "Add regime = \"…\" to this run.");
        }
        return regime;
    }

    private Run.Trip trip(KeyTable t) {
        Run.Trip trip = new Run.Trip(
                t.need("x", Form.setting(Dimension.LENGTH)), t.need("wire", Form.setting(Dimension.LENGTH)));
        t.require(trip.wireM() > 0.0, "wire", "a diameter above 0");
        return trip;
    }

    private void checkTrip(KeyTable t, String plateId, Run.Trip trip) {
        Optional<Plate> plate = rig.flatMap(reading -> reading.soundPlates().stream()
                .filter(candidate -> candidate.id().equals(plateId))
                .findFirst());
        if (plate.isPresent() && t.sound("trip", "plate")) {
            double endM = plate.get().heatedEndM().value();
            if (trip.xM() < 0.0 || trip.xM() >= endM) {
                t.refuse(
                        "trip",
                        "CAMPAIGN-TRIP-OUTSIDE",
                        "a trip at " + mm(trip.xM()),
                        "a place on plate " + plateId + " before the end of its heated part, " + mm(endM),
                        "Correct x of the trip; it is measured from the leading edge.");
            }
        }
    }

    private double setting(KeyTable t, String key, Dimension dimension, boolean needed) {
        String fallback = needed || key.equals("speed") ? "none; required for heated" : "none";
        double value = t.take(key, Form.setting(dimension), Double.NaN, fallback);
        if (needed && !t.has(key)) {
            t.refuse(key, "KEY-MISSING", "no such key", dimension.word(), "Add " + key + " to this run.");
        }
        t.require(Double.isNaN(value) || value >= 0.0, key, "0 or more");
        return value;
    }

    /** A run in the stream needs a speed meter that covers its set speed. */
    private void checkSpeed(KeyTable t, RunType type, double speed) {
        boolean inStream = type == RunType.HEATED || type == RunType.ZERO;
        if (rig.isEmpty() || !inStream || Double.isNaN(speed) || !t.sound("type", "speed")) {
            return;
        }
        List<Surroundings.SpeedMeter> meters = rig.get().rig().surroundings().speedMeters();
        boolean covered = meters.stream().anyMatch(m -> speed >= m.fromMPerS() && speed <= m.toMPerS());
        if (!meters.isEmpty() && !covered) {
            t.refuse("speed", "CAMPAIGN-SPEED", "a speed within the range of a speed meter of the rig", "");
        }
    }

    private Map<String, String> logs(KeyTable t, String id) {
        Map<String, String> logs = t.textsByName("logs", "logger");
        if (t.sound("logs")) {
            logs.forEach((logger, file) -> checkLog(t, id, logger, file));
        }
        return logs;
    }

    private void checkLog(KeyTable t, String id, String logger, String file) {
        if (!loggers.contains(logger)) {
            report(
                    t,
                    "CAMPAIGN-LOGGER",
                    logger,
                    "logger " + logger + ", which is not declared",
                    "one of: " + String.join(", ", loggers.stream().sorted().toList()),
                    "Add [logger." + logger + "] or correct the name.");
        }
        Optional<Path> inside = insideFolder(file);
        if (inside.isEmpty()) {
            report(
                    t,
                    "CAMPAIGN-LOG-OUTSIDE",
                    logger,
                    "\"" + file + "\"",
                    "a path inside the campaign folder, relative to it, with /",
                    "Copy the log into the folder, for example to logs/.");
        } else if (!Files.isRegularFile(inside.get())) {
            report(
                    t,
                    "CAMPAIGN-LOG-MISSING",
                    logger,
                    "\"" + file + "\", which is not there",
                    "a log file in the campaign folder",
                    "Copy it there, or remove the line while the run is only planned.");
        } else {
            noteSharedLog(t, id, logger, file);
        }
    }

    private void noteSharedLog(KeyTable t, String id, String logger, String file) {
        String former = logsInUse.putIfAbsent(file, id);
        if (former != null) {
            findings.add(new Finding(
                    "CAMPAIGN-LOG-TWICE",
                    Level.CAUTION,
                    t.place("logs"),
                    t.path() + ".logs." + logger,
                    "\"" + file + "\", which run " + former + " names too",
                    "a log of its own for each run",
                    "Correct the name if it was copied.",
                    ""));
        }
    }

    private void report(KeyTable t, String id, String logger, String found, String expected, String remedy) {
        findings.add(new Finding(
                id, Level.STOP, t.place("logs"), t.path() + ".logs." + logger, found, expected, remedy, ""));
    }

    /** The file a relative path means; empty if it is absolute or leads out of the folder, also through a link. */
    private Optional<Path> insideFolder(String file) {
        try {
            Path root = folder.toAbsolutePath().normalize();
            Path resolved = root.resolve(file).normalize();
            boolean leaves = file.indexOf('\\') >= 0 || Path.of(file).isAbsolute() || !resolved.startsWith(root);
            if (leaves || (Files.exists(resolved) && !resolved.toRealPath().startsWith(root.toRealPath()))) {
                return Optional.empty();
            }
            return Optional.of(resolved);
        } catch (InvalidPathException | IOException e) {
            return Optional.empty();
        }
    }

    private Run.DeclaredWindow window(KeyTable t) {
        Instant start = t.need("start", Form.time(zone));
        Instant end = t.need("end", Form.time(zone));
        String reason = t.need("reason", Form.text());
        if (t.sound("start", "end")) {
            t.require(end.isAfter(start), "end", "a time after start");
        }
        return new Run.DeclaredWindow(seconds(start), seconds(end), reason);
    }

    private static double seconds(Instant time) {
        return time.getEpochSecond() + time.getNano() * 1e-9;
    }

    private static String mm(double lengthM) {
        return Rounded.text(Estimate.of(lengthM, 0.0), Unit.MILLIMETRE);
    }
}
