package plateledger.safety;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import plateledger.campaign.RunType;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.rig.Limits;
import plateledger.rig.Plate;
import plateledger.safety.LimitTable.Limit;
import plateledger.safety.RunLog.Peak;

/**
 * The hottest reading of the whole log, heat-up and cool-down included, plus its expanded uncertainty (k = 2), against the
 * declared limits, the material limits and the contact-burn thresholds.
 */
final class TemperatureChecks {
    private static final double MARGIN_K = 10.0; // caution within 10 K of a material limit: own choice
    private static final String DECLARED = "declared limit of the rig";

    private TemperatureChecks() {}

    static void check(RunLog log, Findings findings) {
        RunType type = log.run().type();
        Optional<Peak> found = log.hottest();
        if (found.isEmpty()) {
            if (type == RunType.HEATED || type == RunType.LOSS) {
                findings.notChecked(
                        "SURFACE-LIMIT",
                        log.run().place(),
                        log.name() + ", surface temperature",
                        "no valid reading of any thermocouple on plate "
                                + log.plate().id(),
                        "Give the run the log that holds them");
            }
            return;
        }
        Peak peak = found.get();
        Limits limits = log.campaign().rig().limits();
        if (peak.upper() > limits.surface().kelvin()) {
            findings.add(
                    "SURFACE-LIMIT",
                    Level.STOP,
                    peak.place(),
                    log.name() + ", " + peak.channel(),
                    words(log, peak),
                    "at most " + Findings.celsius(limits.surface().kelvin()),
                    "Lower the power or raise the speed",
                    DECLARED);
        }
        materials(log, peak, findings);
        if (limits.touchable()) {
            touch(log, peak, findings);
        }
    }

    /** The layer behind the sheet is hotter than the junction by the drop across the sheet. */
    private static void materials(RunLog log, Peak peak, Findings findings) {
        Plate plate = log.plate();
        double area = StillAir.Face.of(plate).areaM2();
        double flux = log.highestPower() / area;
        double drop = flux
                * plate.sheet().thicknessM().value()
                / plate.sheet().conductivityWPerMK().value();
        double layer = peak.upper() + drop;
        Limits limits = log.campaign().rig().limits();
        material(
                log,
                peak,
                layer,
                limits.lowestMaterial(),
                limits.lowestMaterialLimit().kelvin(),
                DECLARED,
                findings);
        LimitTable.material(plate.foam().material())
                .ifPresent(limit -> material(
                        log,
                        peak,
                        layer,
                        plate.foam().material(),
                        limit.temperature().kelvin(),
                        limit.citation(),
                        findings));
    }

    private static void material(
            RunLog log, Peak peak, double layerK, String name, double limitK, String source, Findings findings) {
        boolean over = layerK > limitK;
        if (!over && layerK <= limitK - MARGIN_K) {
            return;
        }
        findings.add(
                "MATERIAL-LIMIT",
                over ? Level.STOP : Level.CAUTION,
                peak.place(),
                log.name() + ", " + name,
                Findings.celsius(layerK) + " at the layer behind " + peak.channel() + " at " + log.time(peak.timeS()),
                "at most " + Findings.celsius(limitK) + (over ? "" : ", with 10 K to spare"),
                over
                        ? "Check the layers for damage before the next run and lower the power"
                        : "Places between the sensors are hotter: lower the power",
                source);
    }

    private static void touch(RunLog log, Peak peak, Findings findings) {
        String surface = log.campaign().rig().limits().surfaceClass();
        Optional<Limit> second = LimitTable.contact(surface, "1s");
        Optional<Limit> minute = LimitTable.contact(surface, "1min");
        if (second.isEmpty() || minute.isEmpty()) {
            return; // said once for the campaign
        }
        boolean stop = peak.upper() > second.get().temperature().kelvin();
        if (!stop && peak.upper() <= minute.get().temperature().kelvin()) {
            return;
        }
        Limit limit = stop ? second.get() : minute.get();
        findings.add(
                limit.id(),
                stop ? Level.STOP : Level.CAUTION,
                peak.place(),
                log.name() + ", touchable surface, " + surface,
                words(log, peak),
                "at most " + Findings.celsius(limit.temperature().kelvin()) + " where it can be touched",
                limit.text(),
                limit.citation());
    }

    /** Once for the campaign: an unknown surface class; for a surface out of reach, how hot it was and when to open. */
    static void checkCampaign(Limits limits, List<RunLog> logs, Findings findings) {
        Optional<Limit> minute = LimitTable.contact(limits.surfaceClass(), "1min");
        Optional<Limit> release = LimitTable.contact(limits.surfaceClass(), "8h");
        if (minute.isEmpty() || release.isEmpty()) {
            findings.notChecked(
                    "TOUCH-CLASS",
                    Place.of("rig.toml"),
                    "limits.surface_class",
                    "no contact-burn threshold for \"" + limits.surfaceClass() + '"',
                    "Name one of: bare metal, coated metal, \"ceramic, glass, stone\", plastic, wood");
            return;
        }
        if (limits.touchable()) {
            return;
        }
        record Hot(RunLog log, Peak peak) {}
        Optional<Hot> hottest = logs.stream()
                .flatMap(log -> log.hottest().stream().map(peak -> new Hot(log, peak)))
                .max(Comparator.comparingDouble(hot -> hot.peak().upper()));
        hottest.filter(hot -> hot.peak().upper() > minute.get().temperature().kelvin())
                .ifPresent(hot -> findings.add(
                        "TOUCH-OUT-OF-REACH",
                        Level.NOTE,
                        hot.peak().place(),
                        hot.log().name() + ", surface declared out of reach",
                        words(hot.log(), hot.peak()),
                        "at most " + Findings.celsius(minute.get().temperature().kelvin()) + " where it can be touched",
                        "Keep the section closed until every junction reads below "
                                + Findings.celsius(release.get().temperature().kelvin()),
                        minute.get().citation()));
    }

    private static String words(RunLog log, Peak peak) {
        return "%s + %s at %s"
                .formatted(
                        Findings.celsius(peak.value()),
                        String.format(Locale.ROOT, "%.2f K", peak.expanded()),
                        log.time(peak.timeS()));
    }
}
