package plateledger.safety;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import plateledger.campaign.Campaign;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.finding.Level;
import plateledger.fluid.FluidState;
import plateledger.rig.Limits;
import plateledger.rig.Plate;
import plateledger.rig.Protection.Kind;

/**
 * What would happen if the flow stopped, for driven and planned runs; and planned runs judged from set power and speed.
 *
 * <p>A planned run's surface: the whole set power convected from the end of the heated part by a laminar layer over uniform
 * flux, Nu_x = 0.453 Re_x^½ Pr^⅓ (Incropera and DeWitt, eq. 7.45, from memory), no unheated length, no losses: each of
 * these makes the estimate higher.
 */
final class PlanChecks {
    private static final double ASSUMED_AIR_K = 298.15; // where no log tells: our own choice
    private static final double MARGIN_K = 10.0; // own choice, as for material limits
    private static final String LAMINAR =
            "laminar layer over uniform flux, Incropera and DeWitt, eq. 7.45 (from memory)";

    private PlanChecks() {}

    /** What a stop of the flow would do to one run. */
    private record Failure(Run run, Plate plate, double powerW, double stillK, double secondsToLimit) {}

    /** The worst run of each plate, with and without the protections it needs. */
    static void flowFailure(Campaign campaign, List<RunLog> logs, Findings findings) {
        for (Plate plate : campaign.rig().plates()) {
            List<Failure> failures = campaign.runs().stream()
                    .filter(run -> run.type() == RunType.HEATED && run.plate().equals(plate.id()))
                    .flatMap(run -> failure(campaign, plate, run, logs).stream())
                    .toList();
            worst(campaign, failures, true).ifPresent(f -> report(campaign, f, true, findings));
            worst(campaign, failures, false).ifPresent(f -> report(campaign, f, false, findings));
        }
    }

    private static Optional<Failure> worst(Campaign campaign, List<Failure> failures, boolean guarded) {
        return failures.stream()
                .filter(f -> guarded == guarded(campaign, f.run()))
                .max(Comparator.comparingDouble(Failure::stillK));
    }

    private static boolean guarded(Campaign campaign, Run run) {
        return ProtectionChecks.inDate(campaign, Kind.FLOW_INTERLOCK, run)
                && ProtectionChecks.inDate(campaign, Kind.CUT_OUT, run);
    }

    private static Optional<Failure> failure(Campaign campaign, Plate plate, Run run, List<RunLog> logs) {
        Optional<RunLog> log =
                logs.stream().filter(l -> l.run().id().equals(run.id())).findFirst();
        double logged = log.map(RunLog::highestPower).orElse(0.0);
        double power = logged > 0.0 ? logged : run.powerSetW();
        if (!(power > 0.0)) {
            return Optional.empty();
        }
        double airK = log.map(
                        l -> FlowChecks.mean(l, campaign.rig().surroundings().airChannel()))
                .filter(Double::isFinite)
                .orElse(ASSUMED_AIR_K);
        StillAir.Face face = StillAir.Face.of(plate);
        double flux = power / face.areaM2();
        double stillK = StillAir.temperatureK(flux, face, airK, StillAir::air);
        double runK =
                log.flatMap(RunLog::hottest).map(RunLog.Peak::value).orElseGet(() -> plannedSurfaceK(plate, run, airK));
        double capacity = plate.sheet().heatCapacityJPerM3K().value()
                * plate.sheet().thicknessM().value();
        double limitK = campaign.rig().limits().lowestMaterialLimit().kelvin();
        // All losses neglected: the shortest time.
        double seconds = Math.max(0.0, capacity * (limitK - runK) / flux);
        return Optional.of(new Failure(run, plate, power, stillK, seconds));
    }

    private static void report(Campaign campaign, Failure failure, boolean guarded, Findings findings) {
        Limits limits = campaign.rig().limits();
        boolean overMaterial = failure.stillK() > limits.lowestMaterialLimit().kelvin();
        boolean overSurface = failure.stillK() > limits.surface().kelvin();
        if (!overMaterial && !overSurface) {
            return;
        }
        String time = overMaterial
                ? " The sheet alone would reach the material limit in about "
                        + Findings.seconds(failure.secondsToLimit()) + "."
                : "";
        String id = overMaterial ? guarded ? "FLOW-T-STILL-CUT" : "FLOW-T-STILL" : "FLOW-T-SURFACE";
        Level level = overMaterial && !guarded ? Level.STOP : Level.CAUTION;
        double limitK = overMaterial
                ? limits.lowestMaterialLimit().kelvin()
                : limits.surface().kelvin();
        String text =
                LimitTable.get(guarded ? "FLOW-T-STILL-CUT" : "FLOW-T-STILL").text();
        findings.add(
                id,
                level,
                failure.run().place(),
                "plate %s, run %s, flow failure"
                        .formatted(failure.plate().id(), failure.run().id()),
                "%s in still air at %s".formatted(Findings.celsius(failure.stillK()), Findings.watts(failure.powerW())),
                "at most %s, the limit of the %s"
                        .formatted(Findings.celsius(limitK), overMaterial ? limits.lowestMaterial() : "surface"),
                text + time,
                StillAir.SOURCE);
    }

    /** Planned heated and loss runs. */
    static void planned(Campaign campaign, Findings findings) {
        for (Run run : campaign.runs()) {
            Optional<Plate> plate = campaign.rig().plate(run.plate());
            boolean heats = run.type() == RunType.HEATED || run.type() == RunType.LOSS;
            if (!run.planned() || !heats || plate.isEmpty()) {
                continue;
            }
            if (!(run.powerSetW() > 0.0)) {
                missing(run, "no set power", "State power = \"… W\"", findings);
                continue;
            }
            ratings(run, plate.get(), findings);
            if (run.type() == RunType.LOSS) {
                continue; // brought to temperature by the supplies: the cut-out guards it
            }
            if (!(run.speedSetMPerS() > 0.0)) {
                missing(run, "no set speed", "State speed = \"… m/s\"", findings);
                continue;
            }
            surface(campaign, run, plate.get(), findings);
        }
    }

    private static void missing(Run run, String what, String remedy, Findings findings) {
        findings.notChecked("PLAN-SURFACE", run.place(), "planned run " + run.id(), what, remedy);
    }

    /** Set power shared among the strips by their length. */
    private static void ratings(Run run, Plate plate, Findings findings) {
        double length = plate.heaters().stream()
                .mapToDouble(heater -> heater.toM() - heater.fromM())
                .sum();
        for (Plate.Heater heater : plate.heaters()) {
            double share = run.powerSetW() * (heater.toM() - heater.fromM()) / length;
            if (heater.ratedW() > 0.0 && share > heater.ratedW()) {
                findings.add(
                        "SUPPLY-RATING",
                        Level.STOP,
                        run.place(),
                        "planned run " + run.id() + ", strip " + heater.id(),
                        Findings.watts(share) + " of the set power",
                        "at most " + Findings.watts(heater.ratedW()),
                        "Lower the set power",
                        LimitTable.get("SUPPLY-RATING").citation());
            }
        }
    }

    private static void surface(Campaign campaign, Run run, Plate plate, Findings findings) {
        double hot = plannedSurfaceK(plate, run, ASSUMED_AIR_K);
        Limits limits = campaign.rig().limits();
        double limit =
                Math.min(limits.surface().kelvin(), limits.lowestMaterialLimit().kelvin());
        if (hot <= limit - MARGIN_K) {
            return;
        }
        boolean over = hot > limit;
        findings.add(
                "PLAN-SURFACE",
                over ? Level.STOP : Level.CAUTION,
                run.place(),
                "planned run " + run.id(),
                "%s expected at most at the end of the heated part, air at 25 °C".formatted(Findings.celsius(hot)),
                "at most " + Findings.celsius(limit) + (over ? "" : ", with 10 K to spare"),
                over ? "Lower the set power or raise the speed" : "Raise the power slowly and watch the last stations",
                LAMINAR);
    }

    /** The hottest surface of a planned run, K. */
    static double plannedSurfaceK(Plate plate, Run run, double airK) {
        double x = plate.heatedEndM().value();
        double flux = run.powerSetW() / StillAir.Face.of(plate).areaM2();
        double surface = airK;
        // The film temperature depends on the answer, weakly: a few rounds settle it.
        for (int i = 0; i < 20; i++) {
            FluidState air = StillAir.air(0.5 * (surface + airK));
            double re = run.speedSetMPerS() * x / air.kinematicViscosity();
            double h = 0.453 * Math.sqrt(re) * Math.cbrt(air.prandtl()) * air.conductivity() / x;
            surface = airK + flux / h;
        }
        return surface;
    }
}
