package plateledger.reduce;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.apache.commons.math3.distribution.ChiSquaredDistribution;
import plateledger.campaign.Campaign;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.ledger.PlateScales;
import plateledger.quantity.Estimate;
import plateledger.rig.Plate;
import plateledger.rig.Surroundings;

/** What the finished numbers themselves say that is doubtful. */
final class ResultFindings {
    private static final double MISFIT_PROBABILITY = 0.001;
    private static final double SURROUNDINGS_DIFF_K = 0.5;
    private static final double NOT_INFORMED = 0.9;
    /** A remainder below this share of the power is not worth a word: the plate model itself closes no better. */
    private static final double RESIDUAL_SHARE = 0.002;

    private static final double SPREAD_EXCESS = 3.0;
    private static final double RELIANCE = 0.1;
    private static final String METHOD = "METHODS.md";

    private final List<Finding> findings = new ArrayList<>();

    private ResultFindings() {}

    /** Findings about results. */
    static List<Finding> of(Campaign campaign, List<RunMeans> means, MeansReduction reduced) {
        ResultFindings f = new ResultFindings();
        reduced.warnings().forEach((id, what) -> f.warning(campaign, id, what));
        means.stream().filter(m -> m.run().type() == RunType.ZERO).forEach(m -> f.zeroRun(campaign, m));
        reduced.values().forEach((id, v) -> campaign.run(id).ifPresent(run -> f.run(run, v)));
        means.forEach(m ->
                Optional.ofNullable(reduced.values().get(m.run().id())).ifPresent(v -> f.stationsLeft(campaign, m, v)));
        reduced.losses().forEach(f::loss);
        reduced.repeats().forEach(f::repeat);
        f.geometry(campaign, reduced);
        return f.findings;
    }

    private void add(
            String id, Level level, Place place, String subject, String found, String expected, String remedy) {
        findings.add(new Finding(id, level, place, subject, found, expected, remedy, METHOD));
    }

    private static String number(String format, Object... values) {
        return String.format(Locale.ROOT, format, values);
    }

    private void warning(Campaign campaign, String id, String what) {
        Place place = campaign.run(id).map(Run::place).orElse(Place.NOWHERE);
        add(
                "ZERO-MISSING",
                Level.CAUTION,
                place,
                "run " + id,
                what,
                "zeros of the same day",
                "Take a zero run and fan-off zeros on each test day.");
    }

    /** Walls or plenum away from the air make the zero lean on the ledger's prediction. */
    private void zeroRun(Campaign campaign, RunMeans zero) {
        Surroundings s = campaign.rig().surroundings();
        Estimate air = zero.means().get(s.airChannel());
        if (air == null) {
            return;
        }
        List<String> around = new ArrayList<>(s.wallChannels());
        around.addAll(s.plenumChannels());
        for (String channel : around) {
            Estimate there = zero.means().get(channel);
            if (there != null && Math.abs(there.value() - air.value()) > SURROUNDINGS_DIFF_K) {
                add(
                        "ZERO-SURROUNDINGS",
                        Level.CAUTION,
                        zero.run().place(),
                        "zero run " + zero.run().id() + ", " + channel,
                        number("%.2f K from the air", there.value() - air.value()),
                        number("within %.1f K", SURROUNDINGS_DIFF_K),
                        "Let the tunnel run longer before the zero; offsets lean on the predicted exchange.");
            }
        }
    }

    private void run(Run run, RunResult.Values v) {
        String subject = "run " + run.id();
        Estimate residual = v.ledger(LedgerTerm.RESIDUAL);
        double material = RESIDUAL_SHARE * v.ledger(LedgerTerm.ELECTRICAL).value();
        if (Math.abs(residual.value()) > Math.max(2.0 * residual.u(), material)) {
            add(
                    "LEDGER-RESIDUAL",
                    Level.CAUTION,
                    run.place(),
                    subject,
                    number("Q_residual %.3f W, standard uncertainty %.3f W", residual.value(), residual.u()),
                    number("within two standard uncertainties or %.1f %% of the power", 100.0 * RESIDUAL_SHARE),
                    "Look at the misfit of each junction; one may read wrong.");
        }
        if (v.misfitDof() >= 1.0) {
            double p = 1.0 - new ChiSquaredDistribution(null, v.misfitDof()).cumulativeProbability(v.misfitChiSquare());
            if (p < MISFIT_PROBABILITY) {
                add(
                        "MODEL-MISFIT",
                        Level.CAUTION,
                        run.place(),
                        subject,
                        number(
                                "junctions miss the plate model by %.3f K rms, χ² %.1f for %.1f",
                                v.misfit(), v.misfitChiSquare(), v.misfitDof()),
                        number("a χ² with probability above %.3f", MISFIT_PROBABILITY),
                        "Look for a junction that reads wrong, or for an effect that the rig file does not declare.");
            }
        }
        if (Math.abs(v.en()) > 1.0) {
            add(
                    "THEORY-DISAGREES",
                    Level.CAUTION,
                    run.place(),
                    subject,
                    number("Nu_L/theory %.3f, E_n %.2f", Math.exp(v.lnRatio().value()), v.en()),
                    "|E_n| at most 1",
                    "Look for a loss not booked, a wrong wall temperature or a layer that is not as declared.");
        }
        long leaning =
                v.stations().stream().filter(s -> s.reliance() > RELIANCE).count();
        if (leaning > 0) {
            add(
                    "STATION-CONDUCTION",
                    Level.NOTE,
                    run.place(),
                    subject,
                    number(
                            "%d of %d stations owe more than %.0f %% of their flux to conduction along the sheet",
                            leaning, v.stations().size(), 100.0 * RELIANCE),
                    "",
                    "Read local h there with its larger uncertainty.");
        }
    }

    /** Stations that were read and are not in the results. */
    private void stationsLeft(Campaign campaign, RunMeans means, RunResult.Values v) {
        Set<String> reported = v.stations().stream().map(StationResult::channel).collect(Collectors.toSet());
        String left = campaign.rig().plate(means.run().plate()).stream()
                .flatMap(plate -> plate.stations().stream())
                .map(Plate.Thermocouple::channel)
                .filter(channel -> means.means().containsKey(channel) && !reported.contains(channel))
                .collect(Collectors.joining(", "));
        if (!left.isEmpty()) {
            add(
                    "STATION-NOT-REPORTED",
                    Level.NOTE,
                    means.run().place(),
                    "run " + means.run().id(),
                    left,
                    number(
                            "a zero of the junction, heat that flows to the stream and |T_s − T_ref| of %.0f"
                                    + " standard uncertainties",
                            ValuesBuilder.LEAST_DIFFERENCE),
                    "Heat more, or take the zero again; the run's average stands.");
        }
    }

    private void loss(LossResult loss) {
        for (LossResult.Parameter p : loss.parameters()) {
            if (p.prior().u() > 0.0 && p.uRatio() > NOT_INFORMED) {
                add(
                        "LOSS-NOT-INFORMED",
                        Level.NOTE,
                        Place.NOWHERE,
                        "panel " + loss.plate() + ", " + p.name(),
                        number("uncertainty after the loss runs %.0f %% of that declared", 100.0 * p.uRatio()),
                        number("below %.0f %%", 100.0 * NOT_INFORMED),
                        "The value stands as declared; these runs say nothing about it.");
            }
        }
    }

    private void repeat(RepeatSpread r) {
        if (r.relativeSpread() > SPREAD_EXCESS * r.expectedSpread()) {
            add(
                    "REPEAT-SPREAD",
                    Level.CAUTION,
                    Place.NOWHERE,
                    "set point " + r.set() + " of " + r.plate() + " (" + String.join(", ", r.runs()) + ")",
                    number("spread %.2f %%", 100.0 * r.relativeSpread()),
                    number(
                            "about %.2f %% from the uncertainties that may differ between them",
                            100.0 * r.expectedSpread()),
                    "Something changed between the repeats that the ledger does not know.");
        }
    }

    /** Findings about runs that were not reduced. */
    static List<Finding> notReduced(List<RunResult> runs) {
        ResultFindings f = new ResultFindings();
        for (RunResult r : runs) {
            if (r.state() == RunState.NOT_STEADY || r.state() == RunState.REFUSED) {
                f.add(
                        "RUN-NOT-REDUCED",
                        Level.STOP,
                        r.run().place(),
                        "run " + r.run().id() + " (" + r.run().type().word() + ")",
                        r.state().word() + ": " + r.reason(),
                        "a steady window with every channel the run needs",
                        "Run it longer, declare a window with a reason, or leave the run out with a reason.");
            } else if (r.state() == RunState.PLANNED) {
                f.add(
                        "RUN-PLANNED",
                        Level.NOTE,
                        r.run().place(),
                        "run " + r.run().id(),
                        "no logs yet",
                        "",
                        "Its safety was judged; it takes no part in the results.");
            } else if (r.state() == RunState.LEFT_OUT) {
                f.add(
                        "RUN-LEFT-OUT",
                        Level.NOTE,
                        r.run().place(),
                        "run " + r.run().id(),
                        "left out: " + r.reason(),
                        "",
                        "");
            }
        }
        return f.findings;
    }

    /** Edge effects reach far, or nothing off the centre line watches them. */
    private void geometry(Campaign campaign, MeansReduction reduced) {
        Map<String, Double> longest = new HashMap<>();
        reduced.values()
                .forEach((id, v) -> campaign.run(id)
                        .flatMap(run -> campaign.rig().plate(run.plate()))
                        .ifPresent(plate -> longest.merge(
                                plate.id(),
                                PlateScales.conductionLengthM(
                                        plate, v.h().value(), v.meanSurface().value()),
                                Math::max)));
        campaign.rig().plates().forEach(plate -> {
            if (plate.offCentre().isEmpty()) {
                add(
                        "EDGE-UNWATCHED",
                        Level.CAUTION,
                        Place.of("rig.toml"),
                        "plate " + plate.id(),
                        "no thermocouple off the centre line",
                        "at least one",
                        "Add one near each side edge; the edge loss is taken on trust.");
            }
            Double l = longest.get(plate.id());
            if (l != null && l > plate.widthM().value() / 16.0) {
                add(
                        "EDGE-REACH",
                        Level.NOTE,
                        Place.of("rig.toml"),
                        "plate " + plate.id(),
                        number("conduction length up to %.1f mm", 1e3 * l),
                        number(
                                "at most a sixteenth of the span, %.1f mm",
                                1e3 * plate.widthM().value() / 16.0),
                        "Averages take the span profile into account; watch the junctions off the centre line.");
            }
        });
    }
}
