package plateledger.safety;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import plateledger.campaign.Campaign;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.quantity.Temperature;
import plateledger.rig.Protection;
import plateledger.rig.Protection.Kind;

/**
 * Protective measures: declared, and tested within the twelve months before the day of the run. The day is the campaign's;
 * no clock is asked. Heated runs need flow interlock and cut-out, loss runs the cut-out (they are heated without flow).
 */
final class ProtectionChecks {
    private static final Place RIG = Place.of("rig.toml");
    private static final int MONTHS = 12;
    private static final Pattern CELSIUS = Pattern.compile("(-?\\d+(?:[.,]\\d+)?)\\s*°C");
    private static final double ABOVE_RUN_K = 10.0; // own choice

    private ProtectionChecks() {}

    static Optional<Protection> protection(Campaign campaign, Kind kind) {
        return campaign.rig().protections().stream()
                .filter(p -> p.kind() == kind)
                .findFirst();
    }

    /** True if the measure is declared and its test covers the day of the run. */
    static boolean inDate(Campaign campaign, Kind kind, Run run) {
        Optional<LocalDate> day = day(run);
        return protection(campaign, kind)
                .filter(Protection::declared)
                .flatMap(Protection::tested)
                .filter(tested -> day.isPresent() && covers(tested, day.get()))
                .isPresent();
    }

    private static boolean covers(LocalDate tested, LocalDate day) {
        return !tested.isAfter(day) && !tested.plusMonths(MONTHS).isBefore(day);
    }

    private static Optional<LocalDate> day(Run run) {
        try {
            return Optional.of(LocalDate.parse(run.day()));
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }

    static void check(Campaign campaign, List<RunLog> logs, Findings findings) {
        List<Run> heated = runs(campaign, RunType.HEATED);
        List<Run> both = campaign.runs().stream()
                .filter(run -> run.type() == RunType.HEATED || run.type() == RunType.LOSS)
                .toList();
        if (both.isEmpty()) {
            return;
        }
        needed(campaign, Kind.FLOW_INTERLOCK, heated, "heated runs", findings);
        needed(campaign, Kind.CUT_OUT, both, heated.isEmpty() ? "loss runs" : "heated and loss runs", findings);
        other(campaign, Kind.RESIDUAL_CURRENT_DEVICE, Level.STOP, "RCD-30", both, findings);
        other(campaign, Kind.FAN_GUARD, Level.STOP, "FAN-GUARD-H", both, findings);
        other(campaign, Kind.EARTH, Level.CAUTION, "PE-PLATE", both, findings);
        for (Run run : both) {
            if (day(run).isEmpty()) {
                findings.notChecked(
                        "PROTECT-DAY",
                        run.place(),
                        "run " + run.id(),
                        "its day \"" + run.day() + "\" is no date, so no test date can be judged",
                        "Write the day as 2026-03-10");
            }
        }
        cutOutSetting(campaign, logs, findings);
    }

    private static List<Run> runs(Campaign campaign, RunType type) {
        return campaign.runs().stream().filter(run -> run.type() == type).toList();
    }

    private static void needed(Campaign campaign, Kind kind, List<Run> runs, String what, Findings findings) {
        if (runs.isEmpty()) {
            return;
        }
        Optional<Protection> declared = protection(campaign, kind).filter(Protection::declared);
        if (declared.isEmpty()) {
            findings.add(
                    "PROTECT-" + key(kind),
                    Level.STOP,
                    RIG,
                    word(kind),
                    "not declared",
                    "declared, with the date of its last test, for " + what,
                    "Fit and test it, then state [protection." + key(kind).toLowerCase(Locale.ROOT) + "]",
                    "common practice");
            return;
        }
        tested(declared.get(), runs, findings);
    }

    private static void other(
            Campaign campaign, Kind kind, Level level, String limitId, List<Run> runs, Findings findings) {
        Optional<Protection> stated = protection(campaign, kind);
        if (stated.isEmpty()) {
            findings.notChecked(
                    "PROTECT-" + key(kind),
                    RIG,
                    word(kind),
                    "nothing is stated about it",
                    "State [protection." + key(kind).toLowerCase(Locale.ROOT) + "]");
        } else if (!stated.get().declared()) {
            LimitTable.Limit limit = LimitTable.get(limitId);
            findings.add(
                    "PROTECT-" + key(kind),
                    level,
                    RIG,
                    word(kind),
                    "declared as not there",
                    "declared, with the date of its last test",
                    limit.text(),
                    limit.citation());
        } else {
            tested(stated.get(), runs, findings);
        }
    }

    /** One finding for all runs that a test does not cover. */
    private static void tested(Protection protection, List<Run> runs, Findings findings) {
        Optional<LocalDate> tested = protection.tested();
        List<String> uncovered = runs.stream()
                .filter(run -> tested.isEmpty()
                        || day(run).map(day -> !covers(tested.get(), day)).orElse(false))
                .map(Run::id)
                .toList();
        if (uncovered.isEmpty()) {
            return;
        }
        String which = uncovered.size() == runs.size()
                ? "all " + runs.size() + " runs"
                : uncovered.size() + " runs, the first is " + uncovered.get(0);
        findings.add(
                "PROTECT-TEST",
                Level.CAUTION,
                RIG,
                word(protection.kind()),
                tested.map(date -> "last tested " + date).orElse("no date of a test") + ", not covering " + which,
                "a test within the 12 months before each run",
                "Test it and state the date",
                "common practice");
    }

    /** The cut-out is set between the highest run temperature + 10 K and the lowest material limit. */
    private static void cutOutSetting(Campaign campaign, List<RunLog> logs, Findings findings) {
        Optional<Protection> cutOut = protection(campaign, Kind.CUT_OUT).filter(Protection::declared);
        if (cutOut.isEmpty()) {
            return;
        }
        LimitTable.Limit rule = LimitTable.get("CUTOUT-SET");
        Matcher matcher = CELSIUS.matcher(cutOut.get().setting());
        if (!matcher.find()) {
            findings.notChecked(
                    "CUTOUT-SET",
                    RIG,
                    word(Kind.CUT_OUT),
                    "its setting \"" + cutOut.get().setting() + "\" names no temperature in °C",
                    "State setting = \"… °C, hand reset\"");
            return;
        }
        double set = Temperature.ofCelsius(Double.parseDouble(matcher.group(1).replace(',', '.')))
                .kelvin();
        double limit = campaign.rig().limits().lowestMaterialLimit().kelvin();
        if (set > limit) {
            findings.add(
                    "CUTOUT-SET",
                    Level.STOP,
                    RIG,
                    word(Kind.CUT_OUT),
                    "set at " + Findings.celsius(set),
                    "at most the lowest material limit, " + Findings.celsius(limit),
                    "Set it lower",
                    rule.citation());
            return;
        }
        double hottest = logs.stream()
                .flatMap(log -> log.hottest().stream())
                .mapToDouble(RunLog.Peak::value)
                .max()
                .orElse(Double.NaN);
        if (set < hottest + ABOVE_RUN_K) {
            findings.add(
                    "CUTOUT-SET",
                    Level.NOTE,
                    RIG,
                    word(Kind.CUT_OUT),
                    "set at " + Findings.celsius(set) + ", highest run temperature " + Findings.celsius(hottest),
                    "10 K between them",
                    "It may trip during a run",
                    rule.citation());
        }
    }

    private static String word(Kind kind) {
        return switch (kind) {
            case FLOW_INTERLOCK -> "flow interlock";
            case CUT_OUT -> "cut-out";
            case RESIDUAL_CURRENT_DEVICE -> "residual-current device";
            case EARTH -> "earth of the plate";
            case FAN_GUARD -> "fan guard";
        };
    }

    private static String key(Kind kind) {
        return kind.name();
    }
}
