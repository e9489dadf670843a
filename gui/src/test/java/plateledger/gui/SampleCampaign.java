package plateledger.gui;

import java.time.ZoneId;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import plateledger.campaign.Campaign;
import plateledger.campaign.Definitions;
import plateledger.campaign.Regime;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.fit.Constants;
import plateledger.fit.FitPoint;
import plateledger.fit.FitProblem;
import plateledger.fit.FitResult;
import plateledger.quantity.Estimate;
import plateledger.quantity.Stated;
import plateledger.quantity.Temperature;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.LedgerTerm;
import plateledger.reduce.RunResult;
import plateledger.reduce.RunState;
import plateledger.reduce.StationResult;
import plateledger.rig.Limits;
import plateledger.rig.Plate;
import plateledger.rig.Rig;
import plateledger.rig.Surroundings;

/** A result made by hand, so that the window is tested without a reduction. Numbers are plausible, not measured. */
public final class SampleCampaign {
    public static final String FIRST_RUN = "B01";
    public static final String NOT_STEADY_RUN = "P03";
    public static final double NU_OF_FIRST_RUN = 300.0;
    private static final double NU = 1.6e-5;
    private static final double LENGTH = 0.5;

    private SampleCampaign() {}

    /** Four baseline runs, five product runs of which one is not steady, a zero run, a loss run, a planned run. */
    public static CampaignResult result() {
        List<RunResult> runs = new ArrayList<>();
        runs.add(without("Z01", RunType.ZERO, "", RunState.REDUCED, ""));
        runs.add(without("L01", RunType.LOSS, "baseline", RunState.REDUCED, ""));
        for (int i = 0; i < 4; i++) {
            double speed = 2.0 + 2.0 * i;
            double nu = i == 0 ? NU_OF_FIRST_RUN : 212.0 * Math.sqrt(speed);
            runs.add(heated("B0" + (i + 1), "baseline", Regime.LAMINAR, speed, nu, 210.0 * Math.sqrt(speed)));
        }
        for (int i = 0; i < 5; i++) {
            double speed = 2.0 + 4.0 * i;
            String id = "P0" + (i + 1);
            runs.add(
                    id.equals(NOT_STEADY_RUN)
                            ? without(
                                    id,
                                    RunType.HEATED,
                                    "product",
                                    RunState.NOT_STEADY,
                                    "storage bound 4.2 % of power, limit 1 %")
                            : heated(id, "product", Regime.PRODUCT, speed, 210 * Math.pow(speed, 0.8), Double.NaN));
        }
        runs.add(without("P09", RunType.HEATED, "product", RunState.PLANNED, ""));
        return new CampaignResult(
                campaign(runs.stream().map(RunResult::run).toList()),
                List.of(),
                runs,
                List.of(),
                List.of(fit()),
                List.of(),
                findings());
    }

    private static List<Finding> findings() {
        return List.of(
                new Finding(
                        "LOG-STUCK",
                        Level.CAUTION,
                        new Place("logs/B01-plate.txt", 412, 7),
                        "B01: T06",
                        "the same value 31.25 °C over 1200 samples",
                        "noise of at least one step of 0.01 K",
                        "The channel is left out; the others stand in. Look at its connection.",
                        ""),
                new Finding(
                        "STEADY-NONE",
                        Level.STOP,
                        new Place("campaign.toml", 88, 0),
                        NOT_STEADY_RUN,
                        "no steady window: storage bound 4.2 % of power",
                        "at most 1 % over at least 10 min",
                        "Run it longer, or declare a window with a reason.",
                        ""),
                new Finding(
                        "CLOCK-ASSUMED",
                        Level.NOTE,
                        Place.of("campaign.toml"),
                        "logger power",
                        "no clock offset declared; taken as 0 s",
                        "a declared offset with its uncertainty",
                        "Declare clock_offset.",
                        ""),
                new Finding(
                        "GUARD",
                        Level.NOT_CHECKED,
                        Place.of("rig.toml"),
                        "fan guard",
                        "not declared",
                        "declared with the date of its last test",
                        "Declare it under [protection.fan_guard].",
                        ""));
    }

    private static FitResult fit() {
        List<FitPoint> points = new ArrayList<>();
        for (double speed : new double[] {2, 6, 14, 18}) {
            points.add(new FitPoint("P", "", speed * LENGTH / NU, 210 * Math.pow(speed, 0.8), 0.71, 0.01, 0.02, 0.0));
        }
        double xg = points.stream().mapToDouble(p -> Math.log(p.re())).average().orElseThrow();
        double a = Math.log(210) + 0.8 * (xg - Math.log(LENGTH / NU)) - Math.log(0.71) / 3.0;
        Constants constants = new Constants(xg, a, 0.8, 1e-4, 1e-4, 0.0);
        return new FitResult(
                new FitProblem("product", 1.0 / 3.0, points, List.of()),
                constants,
                constants,
                constants,
                2.0,
                2,
                0.4,
                Double.NaN,
                Double.NaN,
                Double.NaN,
                new double[4],
                new double[0],
                new double[0][],
                2.0,
                List.of());
    }

    private static RunResult heated(String id, String plate, Regime regime, double speed, double nu, double theory) {
        double power = 20.0 + 6.0 * speed;
        Map<LedgerTerm, Estimate> ledger = new EnumMap<>(LedgerTerm.class);
        ledger.put(LedgerTerm.ELECTRICAL, Estimate.of(power, 0.05));
        ledger.put(LedgerTerm.CONVECTION, Estimate.of(0.85 * power, 0.2));
        ledger.put(LedgerTerm.RADIATION, Estimate.of(0.1 * power, 0.1));
        ledger.put(LedgerTerm.BACK, Estimate.of(0.04 * power, 0.1));
        ledger.put(LedgerTerm.RESIDUAL, Estimate.of(0.01 * power, 0.02 * power));
        boolean known = Double.isFinite(theory);
        RunResult.Values values = new RunResult.Values(
                Estimate.of(speed, 0.01 * speed),
                Estimate.of(295.0, 0.1),
                Estimate.of(98_000.0, 10.0),
                Estimate.of(0.01, 0.001),
                Estimate.of(315.0, 0.2),
                Estimate.of(speed * LENGTH / NU, 0.008 * speed * LENGTH / NU),
                Estimate.of(nu, 0.015 * nu),
                Estimate.of(0.97 * nu, 0.015 * nu),
                Estimate.of(0.71, 0.002),
                Estimate.of(nu * 0.0265 / LENGTH, 0.015 * nu * 0.0265 / LENGTH),
                Estimate.of(theory, known ? 0.01 * theory : 0.0),
                Estimate.of(known ? Math.log(nu / theory) : Double.NaN, 0.02),
                known ? 0.3 : Double.NaN,
                ledger,
                stations(nu, power / 0.12, known),
                0.04,
                18,
                16,
                6,
                List.of());
        Run run = run(id, RunType.HEATED, plate, regime, speed, power);
        return new RunResult(run, RunState.REDUCED, "", Optional.empty(), Optional.of(values));
    }

    private static List<StationResult> stations(double nu, double flux, boolean theory) {
        List<StationResult> stations = new ArrayList<>();
        for (int i = 0; i < 16; i++) {
            double x = 0.1125 + 0.025 * i;
            double qRadiation = 0.08 * flux * (0.7 + 0.05 * i);
            double qBack = 0.03 * flux;
            double qConduction = i == 0 ? 0.12 * flux : i == 1 ? -0.05 * flux : i == 15 ? 0.04 * flux : 0.002 * flux;
            double qConvection = flux - qRadiation - qBack - qConduction;
            double h = nu * 0.0265 / LENGTH * Math.pow(x / 0.3, -0.4);
            double nuX = h * x / 0.0265;
            double ts = 295.0 + qConvection / h;
            stations.add(new StationResult(
                    String.format(Locale.ROOT, "T%02d", i + 1),
                    Estimate.of(x, 0.0002),
                    Estimate.of(ts, 0.12),
                    Estimate.of(295.05, 0.08),
                    Estimate.of(0.5 * (ts + 295.0), 0.1),
                    Estimate.of(flux, 0.002 * flux),
                    Estimate.of(qRadiation, 0.02 * qRadiation),
                    Estimate.of(qBack, 0.1 * qBack),
                    Estimate.of(qConduction, 0.01 * flux),
                    Estimate.of(qConvection, 0.015 * flux),
                    Estimate.of(qConvection, 0.03 * flux),
                    Estimate.of(h, 0.02 * h),
                    Estimate.of(h, 0.02 * h),
                    Estimate.of(1e5 * x, 1e3 * x),
                    Estimate.of(nuX, 0.02 * nuX),
                    Estimate.of(0.71, 0.002),
                    Estimate.of(theory ? 0.97 * nuX : Double.NaN, 0.015 * nuX),
                    Estimate.of(nuX, 0.0),
                    Estimate.of(0.03, 0.02),
                    0.7,
                    i < 2 ? 0.1 : 0.01));
        }
        return stations;
    }

    private static RunResult without(String id, RunType type, String plate, RunState state, String reason) {
        boolean heated = type == RunType.HEATED;
        Run run = run(id, type, plate, Regime.PRODUCT, heated ? 10.0 : Double.NaN, heated ? 60.0 : Double.NaN);
        return new RunResult(run, state, reason, Optional.empty(), Optional.empty());
    }

    private static Run run(String id, RunType type, String plate, Regime regime, double speed, double power) {
        String set = type == RunType.HEATED ? "S" + Math.round(speed) : "";
        return new Run(
                id,
                type,
                "2026-03-10",
                plate,
                regime,
                Optional.empty(),
                speed,
                power,
                set,
                Map.of("plate", "logs/" + id + "-plate.txt"),
                Optional.empty(),
                Optional.empty(),
                "",
                Place.of("campaign.toml"));
    }

    private static Campaign campaign(List<Run> runs) {
        return new Campaign(
                "Sample panel test",
                Map.of(),
                ZoneId.of("Europe/Vienna"),
                rig(),
                new Definitions(
                        Definitions.PropertyTemperature.FILM,
                        Definitions.ReferenceLength.LEADING_EDGE,
                        Definitions.Average.FLUX_OVER_DIFFERENCE,
                        1.0 / 3.0),
                new Campaign.SteadyLimits(0.01, 0.005, 600),
                List.of(),
                runs,
                List.of());
    }

    private static Rig rig() {
        Surroundings surroundings = new Surroundings(
                List.of("TW1"),
                List.of("TP1"),
                List.of("TF1"),
                List.of("TN1"),
                List.of("TT1"),
                List.of(),
                List.of(),
                "TA1",
                "PB",
                "RH",
                Stated.exact(0.97),
                Stated.exact(0.015),
                new Surroundings.AirProbe(Stated.exact(0.8), Stated.exact(0.01)),
                List.of());
        Limits limits = new Limits(
                Temperature.ofCelsius(75), false, "coated metal", "adhesive", Temperature.ofCelsius(120), 1.0);
        return new Rig(
                "Sample rig", List.of(plate("baseline"), plate("product")), surroundings, List.of(), limits, List.of());
    }

    private static Plate plate(String id) {
        List<Plate.Heater> heaters = new ArrayList<>();
        List<Plate.Thermocouple> junctions = new ArrayList<>();
        for (int i = 0; i < 8; i++) {
            double from = 0.1 + 0.05 * i;
            heaters.add(new Plate.Heater(
                    "H" + (i + 1), from, from + 0.05, Stated.exact(0.01), "V" + (i + 1), "I" + (i + 1), 40));
        }
        for (int i = 0; i < 16; i++) {
            junctions.add(junction(String.format(Locale.ROOT, "T%02d", i + 1), 0.1125 + 0.025 * i, 0.0));
        }
        for (int i = 0; i < 4; i++) {
            junctions.add(junction("T" + (17 + i), 0.175 + 0.1 * i, i % 2 == 0 ? 0.1 : -0.12));
        }
        return new Plate(
                id,
                "sample plate",
                Plate.Orientation.FACE_UP,
                Stated.exact(LENGTH),
                Stated.exact(0.3),
                Stated.exact(0.1),
                Stated.exact(LENGTH),
                new Plate.Sheet("stainless steel", Stated.exact(0.0005), Stated.exact(14.9), Stated.exact(3.77e6)),
                new Plate.Coat("matt black paint", Stated.exact(50e-6), Stated.exact(0.2)),
                new Plate.Foam("polyisocyanurate", Stated.exact(0.05), Stated.exact(6.6e4)),
                Stated.exact(0.95),
                Stated.exact(0.46),
                Stated.exact(0.05),
                Stated.exact(0.05),
                Stated.exact(0.05),
                Stated.exact(0.075),
                Plate.SmoothShape.BOUNDARY_LAYER,
                heaters,
                junctions);
    }

    private static Plate.Thermocouple junction(String channel, double x, double z) {
        return new Plate.Thermocouple(channel, Stated.exact(x), z, Stated.exact(0.0005), Stated.exact(0.002));
    }
}
