package plateledger.safety;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import plateledger.campaign.RunType;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.log.Series;
import plateledger.rig.Instrument;
import plateledger.rig.Plate;
import plateledger.safety.RunLog.Peak;
import plateledger.safety.RunLog.StripPower;
import plateledger.sensor.InstrumentEquation;

/** Heater power against the rating of each strip, and the voltage at bare terminals. */
final class PowerChecks {
    private PowerChecks() {}

    static void check(RunLog log, Findings findings) {
        RunType type = log.run().type();
        if (type != RunType.HEATED && type != RunType.LOSS) {
            return;
        }
        List<StripPower> strips = log.strips();
        if (strips.size() < log.plate().heaters().size()) {
            findings.notChecked(
                    "SUPPLY-RATING",
                    log.run().place(),
                    log.name() + ", heater power",
                    "voltage or current of " + (log.plate().heaters().size() - strips.size()) + " of "
                            + log.plate().heaters().size() + " strips is not in its logs",
                    "Give the run the log of the heater");
        }
        for (StripPower strip : strips) {
            rating(log, strip, findings);
        }
    }

    private static void rating(RunLog log, StripPower strip, Findings findings) {
        Plate.Heater heater = strip.heater();
        if (!(heater.ratedW() > 0.0)) {
            return; // said once for the plate
        }
        Series watts = strip.watts();
        int at = -1;
        for (int i = 0; i < watts.size(); i++) {
            if (at < 0 || watts.values()[i] > watts.values()[at]) {
                at = i;
            }
        }
        if (at < 0) {
            return;
        }
        double power = watts.values()[at];
        double expanded = 2.0 * power * relativeUncertainty(log, heater);
        if (power + expanded <= heater.ratedW()) {
            return;
        }
        findings.add(
                "SUPPLY-RATING",
                Level.STOP,
                new Place(watts.file(), watts.lines()[at], 0),
                log.name() + ", strip " + heater.id(),
                "%s + %s at %s"
                        .formatted(Findings.watts(power), Findings.watts(expanded), log.time(log.trueTimes(watts)[at])),
                "at most " + Findings.watts(heater.ratedW()),
                "Lower the power of this strip",
                LimitTable.get("SUPPLY-RATING").citation());
    }

    private static double relativeUncertainty(RunLog log, Plate.Heater heater) {
        return Math.hypot(relative(log, heater.voltageChannel()), relative(log, heater.currentChannel()));
    }

    private static double relative(RunLog log, String channel) {
        Optional<Peak> peak = log.peak(channel);
        Optional<Instrument> instrument = log.campaign().rig().instrumentOf(channel);
        if (peak.isEmpty() || instrument.isEmpty() || !(peak.get().value() > 0.0)) {
            return 0.0;
        }
        return InstrumentEquation.standardUncertainty(
                        instrument.get(), peak.get().value())
                / peak.get().value();
    }

    /** Once for the campaign: strips without a rating; the highest voltage against that of bare parts in reach. */
    static void checkCampaign(List<Plate> plates, List<RunLog> logs, Findings findings) {
        for (Plate plate : plates) {
            List<String> unrated = plate.heaters().stream()
                    .filter(heater -> !(heater.ratedW() > 0.0))
                    .map(Plate.Heater::id)
                    .toList();
            if (!unrated.isEmpty()) {
                findings.notChecked(
                        "SUPPLY-RATING",
                        Place.of("rig.toml"),
                        "plate " + plate.id() + ", strips " + String.join(", ", unrated),
                        "no rating declared",
                        "State rated = \"… W\" for each heater");
            }
        }
        LimitTable.Limit limit = LimitTable.get("ELV-DRY-AC");
        LimitTable.Limit direct = LimitTable.get("ELV-DRY-DC");
        OptionalDouble highest = logs.stream()
                .flatMap(log -> log.plate().heaters().stream().map(heater -> log.peak(heater.voltageChannel())))
                .flatMap(Optional::stream)
                .mapToDouble(Peak::upper)
                .max();
        if (highest.isPresent() && highest.getAsDouble() > limit.value()) {
            boolean overDirect = highest.getAsDouble() > direct.value();
            findings.add(
                    overDirect ? direct.id() : limit.id(),
                    Level.CAUTION,
                    Place.NOWHERE,
                    "heater voltage",
                    String.format(Locale.ROOT, "%.1f V", highest.getAsDouble()),
                    "bare parts in reach only up to 25 V AC or 60 V DC, dry",
                    limit.text(),
                    limit.citation());
        }
    }
}
