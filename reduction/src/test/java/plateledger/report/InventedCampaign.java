package plateledger.report;

import java.time.ZoneId;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plateledger.campaign.Campaign;
import plateledger.campaign.Definitions;
import plateledger.campaign.FitRequest;
import plateledger.campaign.Logger;
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
import plateledger.fit.SharedSource;
import plateledger.log.LogData;
import plateledger.log.LogFormat;
import plateledger.log.Series;
import plateledger.quantity.Estimate;
import plateledger.quantity.Stated;
import plateledger.quantity.Temperature;
import plateledger.reduce.BudgetLine;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.LedgerTerm;
import plateledger.reduce.LossResult;
import plateledger.reduce.RepeatSpread;
import plateledger.reduce.RunResult;
import plateledger.reduce.RunState;
import plateledger.reduce.StationResult;
import plateledger.rig.Limits;
import plateledger.rig.Plate;
import plateledger.rig.Rig;
import plateledger.rig.Surroundings;
import plateledger.steady.ChannelMean;
import plateledger.steady.Evidence;
import plateledger.steady.SteadyWindow;

/**
 * A small campaign result whose every number is invented: nothing in it was measured or computed, it only has the shape
 * of a result. Texts hold what breaks careless writers: quotes, commas, markup, formulas.
 */
public final class InventedCampaign {
    /** 2026-03-10T09:20:00Z. */
    private static final double START_S = 1_773_134_400.0;

    private InventedCampaign() {}

    /** Two baseline runs, three product runs, one of them repeated, one run not steady, one loss run. */
    public static CampaignResult result() {
        Run b1 = run("B01", RunType.HEATED, "baseline", Regime.LAMINAR, 2.0, "L1", Optional.empty());
        Run b2 = run("B02", RunType.HEATED, "baseline", Regime.LAMINAR, 4.0, "L2", Optional.empty());
        Run p1 = run("P01", RunType.HEATED, "product", Regime.PRODUCT, 4.0, "S1", Optional.empty());
        Run p2 = run("P02", RunType.HEATED, "product", Regime.PRODUCT, 10.0, "S2", Optional.empty());
        Run p3 = run("P03", RunType.HEATED, "product", Regime.PRODUCT, 10.0, "S2", Optional.empty());
        Run p4 = run("P04", RunType.HEATED, "product", Regime.PRODUCT, 18.0, "S3", Optional.empty());
        Run p5 = run("P05", RunType.HEATED, "product", Regime.PRODUCT, 14.0, "S4", Optional.of("door was open"));
        Run l1 = run("L01", RunType.LOSS, "baseline", Regime.LAMINAR, Double.NaN, "", Optional.empty());
        List<Run> runs = List.of(l1, b1, b2, p1, p2, p3, p4, p5);
        List<RunResult> results = List.of(
                new RunResult(l1, RunState.REDUCED, "", Optional.of(window(0)), Optional.empty()),
                reduced(b1, 1, 70_000, 160, 155),
                reduced(b2, 2, 140_000, 224, 219),
                reduced(p1, 3, 140_000, 300, Double.NaN),
                reduced(p2, 4, 345_000, 640, Double.NaN),
                reduced(p3, 5, 346_000, 646, Double.NaN),
                new RunResult(
                        p4,
                        RunState.NOT_STEADY,
                        "storage bound 2.3 % of the power, limit 1 %",
                        Optional.empty(),
                        Optional.empty()),
                new RunResult(p5, RunState.LEFT_OUT, "door was open", Optional.empty(), Optional.empty()));
        return new CampaignResult(
                campaign(runs),
                List.of(log()),
                results,
                List.of(new LossResult(
                        "baseline",
                        List.of("L01"),
                        List.of(
                                new LossResult.Parameter(
                                        "back conductance",
                                        "W/(m² K)",
                                        Estimate.of(0.46, 0.069),
                                        Estimate.of(0.481, 0.012)),
                                new LossResult.Parameter(
                                        "emissivity", "1", Estimate.of(0.95, 0.015), Estimate.of(0.95, 0.0149))),
                        new double[] {0.012})),
                List.of(fit()),
                List.of(new RepeatSpread("product", "S2", List.of("P02", "P03"), 0.0061, 0.0055)),
                findings());
    }

    private static List<Finding> findings() {
        return List.of(
                new Finding(
                        "LOG-STUCK",
                        Level.CAUTION,
                        new Place("logs/B01-plate.txt", 412, 9),
                        "B01 channel T09",
                        "the same value 38.41 °C for 600 s",
                        "a changing reading",
                        "The channel is left out; look at its connection.",
                        ""),
                new Finding(
                        "RUN-NOT-STEADY",
                        Level.STOP,
                        Place.NOWHERE,
                        "P04",
                        "no steady window",
                        "storage below 1 % of the power",
                        "Repeat the run and wait longer.",
                        ""),
                new Finding(
                        "CLOCK-ASSUMED",
                        Level.NOTE,
                        Place.of("campaign.toml"),
                        "logger <tunnel> & \"co\"",
                        "=no clock offset",
                        "a declared one",
                        "-declare it",
                        "common practice"),
                new Finding(
                        "HUMIDITY",
                        Level.NOT_CHECKED,
                        Place.NOWHERE,
                        "RH",
                        "nothing, the channel is missing",
                        "",
                        "",
                        ""));
    }

    private static Run run(
            String id, RunType type, String plate, Regime regime, double speed, String set, Optional<String> leftOut) {
        return new Run(
                id,
                type,
                "2026-03-10",
                plate,
                regime,
                Optional.empty(),
                speed,
                40.0,
                set,
                Map.of("plate", "logs/" + id + "-plate.txt"),
                Optional.empty(),
                leftOut,
                "",
                new Place("campaign.toml", 10, 1));
    }

    private static SteadyWindow window(int index) {
        double start = START_S + 3600.0 * index;
        return new SteadyWindow(
                start,
                start + 1200.0,
                false,
                "",
                Map.of(
                        "T01",
                        new ChannelMean("T01", 310.0, 0.01, 40, 1e-6, 2e-6, 600, 3, 120, 720, "logs/R-plate.txt")),
                List.of(
                        new Evidence("storage", "plate and foam", 0.0041, 0.01, "1", true),
                        new Evidence("drift", "T01", 0.004, 0.02, "K", true)));
    }

    private static RunResult reduced(Run run, int index, double re, double nu, double theory) {
        Map<LedgerTerm, Estimate> ledger = new EnumMap<>(LedgerTerm.class);
        ledger.put(LedgerTerm.ELECTRICAL, Estimate.of(40.0, 0.04));
        ledger.put(LedgerTerm.CONVECTION, Estimate.of(31.2, 0.35));
        ledger.put(LedgerTerm.RADIATION, Estimate.of(5.9, 0.2));
        ledger.put(LedgerTerm.BACK, Estimate.of(1.8, 0.1));
        ledger.put(LedgerTerm.EDGE, Estimate.of(0.6, 0.1));
        ledger.put(LedgerTerm.NOSE, Estimate.of(0.25, 0.05));
        ledger.put(LedgerTerm.TAIL, Estimate.of(0.2, 0.05));
        ledger.put(LedgerTerm.LEAD, Estimate.of(0.03, 0.01));
        ledger.put(LedgerTerm.STORAGE, Estimate.of(-0.05, 0.08));
        ledger.put(LedgerTerm.RESIDUAL, Estimate.of(0.07, 0.12));
        List<StationResult> stations = new ArrayList<>();
        for (int i = 0; i < 3; i++) {
            stations.add(station(i, nu, theory));
        }
        boolean compared = Double.isFinite(theory);
        return new RunResult(
                run,
                RunState.REDUCED,
                "",
                Optional.of(window(index)),
                Optional.of(new RunResult.Values(
                        Estimate.of(run.speedSetMPerS() * 1.01, 0.02),
                        Estimate.of(295.2, 0.05),
                        Estimate.of(98_400, 30),
                        Estimate.of(0.011, 0.0004),
                        Estimate.of(318.4, 0.12),
                        Estimate.of(re, re * 0.006),
                        Estimate.of(nu, nu * 0.011),
                        Estimate.of(nu * 1.03, nu * 0.012),
                        Estimate.of(0.7081, 0.0035),
                        Estimate.of(nu * 0.0265 / 0.5, 0.1),
                        new Estimate(theory, compared ? theory * 0.015 : Double.NaN, Double.POSITIVE_INFINITY),
                        new Estimate(
                                compared ? Math.log(nu / theory) : Double.NaN,
                                compared ? 0.01 : Double.NaN,
                                Double.POSITIVE_INFINITY),
                        compared ? 0.9 : Double.NaN,
                        ledger,
                        stations,
                        0.021,
                        11.0,
                        13.0,
                        6.8,
                        budget())));
    }

    private static List<BudgetLine> budget() {
        return List.of(
                new BudgetLine(
                        "Nu_L",
                        "baseline.emissivity",
                        0.95,
                        0.015,
                        "normal",
                        Double.POSITIVE_INFINITY,
                        "panel:baseline",
                        -33,
                        -0.5,
                        61.5),
                new BudgetLine("Nu_L", "T01.mean", 310, 0.02, "t", 41.5, "run:B01", -12.5, -0.25, 30.1),
                new BudgetLine("Nu_L", "rig.blockage", 0.015, 0.003, "normal", 50, "rig", 40, 0.12, 8.4));
    }

    private static StationResult station(int i, double nu, double theory) {
        double local = nu * (0.5 + 0.1 * i);
        boolean compared = Double.isFinite(theory);
        Estimate none = new Estimate(Double.NaN, Double.NaN, Double.POSITIVE_INFINITY);
        return new StationResult(
                "T0" + (i + 1),
                Estimate.of(0.1125 + 0.025 * i, 0.0002),
                Estimate.of(315.25 + i, 0.06),
                Estimate.of(295.25, 0.05),
                Estimate.of(305.25 + 0.5 * i, 0.05),
                Estimate.of(333.3, 0.4),
                Estimate.of(45.1, 1.4),
                Estimate.of(9.2, 0.5),
                Estimate.of(-3.75, 0.8),
                Estimate.of(282.75, 2.1),
                Estimate.of(280.5, 9.0),
                Estimate.of(14.1, 0.12),
                compared ? Estimate.of(13.2, 0.14) : none,
                Estimate.of(30_000 + 10_000 * i, 180),
                Estimate.of(local, local * 0.012),
                Estimate.of(0.7081, 0.0035),
                compared ? Estimate.of(local * 0.98, local * 0.0147) : none,
                compared ? Estimate.of(local * 0.9, 0) : none,
                compared ? Estimate.of(0.0202, 0.01) : none,
                compared ? 0.55 : Double.NaN,
                0.02);
    }

    private static FitResult fit() {
        List<FitPoint> points = List.of(
                new FitPoint("P01", "S1", 140_000, 300, 0.7081, 0.002, 0.003, 0.1),
                new FitPoint("P02", "S2", 345_000, 640, 0.7081, 0.002, 0.003, 0.1),
                new FitPoint("P03", "S2", 346_000, 646, 0.7081, 0.002, 0.003, 0.1));
        Constants constants = new Constants(12.4, 6.3, 0.83, 1e-4, 9e-5, 1e-6);
        return new FitResult(
                new FitProblem(
                        "product",
                        1.0 / 3.0,
                        points,
                        List.of(new SharedSource(
                                "product.emissivity",
                                "panel:product",
                                new double[] {0, 0, 0},
                                new double[] {0.004, 0.002, 0.002},
                                50))),
                constants,
                new Constants(12.4, 6.3, 0.83, 2e-5, 3e-5, 0),
                new Constants(12.4, 6.302, 0.832, 8e-5, 7e-5, 0),
                1.7,
                1,
                0.19,
                Double.NaN,
                Double.NaN,
                0.006,
                new double[] {0.001, -0.004, 0.003},
                new double[] {0.4},
                new double[][] {{0.003, -0.002}},
                2.0,
                List.of());
    }

    private static LogData log() {
        return new LogData(
                "logs/B01-plate.txt",
                new LogFormat(';', ',', 7, true, LogFormat.TimeForm.PATTERN, "dd.MM.yyyy HH:mm:ss", ""),
                2,
                1.0,
                START_S,
                START_S + 1,
                false,
                List.of(new Series(
                        "T01",
                        "°C",
                        "logs/B01-plate.txt",
                        new double[] {START_S, START_S + 1},
                        new double[] {310.0, 310.1},
                        new byte[] {0, 5},
                        new int[] {9, 10})),
                List.of());
    }

    private static Campaign campaign(List<Run> runs) {
        return new Campaign(
                "Panels <A> & \"B\"",
                Map.of("laboratory", "Invented test house", "customer", "Maker of <boxes> & lids"),
                ZoneId.of("Europe/Vienna"),
                new Rig(
                        "Invented rig",
                        List.of(plate("baseline"), plate("product")),
                        surroundings(),
                        List.of(),
                        new Limits(
                                Temperature.ofCelsius(75),
                                false,
                                "coated metal",
                                "adhesive",
                                Temperature.ofCelsius(120),
                                1.0),
                        List.of()),
                new Definitions(
                        Definitions.PropertyTemperature.FILM,
                        Definitions.ReferenceLength.LEADING_EDGE,
                        Definitions.Average.FLUX_OVER_DIFFERENCE,
                        1.0 / 3.0),
                new Campaign.SteadyLimits(0.01, 0.005, 600),
                List.of(new Logger(
                        "plate",
                        Optional.empty(),
                        ZoneId.of("Europe/Vienna"),
                        Stated.limits(95, 2),
                        Stated.standard(0, 1e-5),
                        true,
                        Map.of())),
                runs,
                List.of(new FitRequest("product", "product", Regime.PRODUCT)));
    }

    private static Plate plate(String id) {
        Stated length = Stated.limits(0.5, 0.0005);
        return new Plate(
                id,
                "smooth " + id,
                Plate.Orientation.FACE_UP,
                length,
                Stated.limits(0.3, 0.0005),
                Stated.limits(0.1, 0.0002),
                length,
                new Plate.Sheet(
                        "steel",
                        Stated.limits(0.0005, 1.5e-5),
                        Stated.standard(14.9, 0.45),
                        Stated.standard(3.77e6, 1e5)),
                new Plate.Coat("paint", Stated.limits(5e-5, 1.5e-5), Stated.standard(0.2, 0.02)),
                new Plate.Foam("foam", Stated.limits(0.05, 0.001), Stated.standard(6.6e4, 1e4)),
                Stated.standard(0.95, 0.015),
                Stated.standard(0.46, 0.069),
                Stated.standard(0.05, 0.015),
                Stated.standard(0.05, 0.01),
                Stated.standard(0.05, 0.01),
                Stated.standard(0.075, 0.003),
                Plate.SmoothShape.BOUNDARY_LAYER,
                List.of(),
                List.of());
    }

    private static Surroundings surroundings() {
        return new Surroundings(
                List.of("TW1"),
                List.of("TP1"),
                List.of("TF1"),
                List.of("TN1"),
                List.of("TT1"),
                List.of("TC1"),
                List.of("TC3"),
                "TA1",
                "PB",
                "RH",
                Stated.standard(0.97, 0.01),
                Stated.standard(0.015, 0.003),
                new Surroundings.AirProbe(Stated.limits(0.8, 0.15), Stated.limits(0.01, 0.005)),
                List.of());
    }
}
