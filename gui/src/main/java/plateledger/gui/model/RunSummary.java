package plateledger.gui.model;

import java.util.ArrayList;
import java.util.List;
import plateledger.campaign.Run;
import plateledger.quantity.Estimate;
import plateledger.reduce.LedgerTerm;
import plateledger.reduce.RunResult;

/**
 * What is said about the chosen run beside its chart.
 *
 * @param title the run in words
 * @param facts numbers with unit and 95 % interval, or why there are none
 */
public record RunSummary(String title, List<Fact> facts) {
    /**
     * One number or sentence.
     *
     * @param symbol short symbol, e.g. {@code Nu_L}; empty for a sentence
     * @param text what is shown
     * @param meaning the symbol in words
     */
    public record Fact(String symbol, String text, String meaning) {}

    /** Copies the list. */
    public RunSummary {
        facts = List.copyOf(facts);
    }

    /** The summary of a run. */
    public static RunSummary of(RunResult result) {
        Run run = result.run();
        StringBuilder title = new StringBuilder("Run ").append(run.id());
        String plate = RunRow.plateWords(run);
        title.append(" · ").append(run.type().word());
        if (!plate.isEmpty()) {
            title.append(" · ").append(plate);
        }
        title.append(" · ").append(result.state().word());
        return new RunSummary(title.toString(), facts(result));
    }

    private static List<Fact> facts(RunResult result) {
        if (result.values().isEmpty()) {
            return List.of(new Fact("", whyNone(result), "why this run has no numbers"));
        }
        RunResult.Values v = result.values().get();
        List<Fact> facts = new ArrayList<>();
        facts.add(fact("U", v.speed(), " m/s", "stream speed over the plate, 95 % interval"));
        facts.add(fact("Re_L", v.reL(), "", "Reynolds number of the run average, 95 % interval"));
        facts.add(fact("Nu_L", v.nuL(), "", "Nusselt number of the run average, 95 % interval"));
        if (v.nuLTheory().isKnown()) {
            facts.add(fact("theory", v.nuLTheory(), "", "Nu_L of theory for this rig, 95 % interval of the theory"));
            facts.add(new Fact(
                    "E_n", NumberText.plain(Math.round(v.en() * 100.0) / 100.0), "agreement with theory is |E_n| ≤ 1"));
        }
        facts.add(fact("h", v.h(), " W/(m²·K)", "average heat transfer coefficient, 95 % interval"));
        facts.add(fact("Q", v.ledger(LedgerTerm.ELECTRICAL), " W", "electrical power, 95 % interval"));
        facts.add(fact(
                "Q_residual",
                v.ledger(LedgerTerm.RESIDUAL),
                " W",
                "power less all that is booked, 95 % interval: it should include zero"));
        return facts;
    }

    private static Fact fact(String symbol, Estimate estimate, String unit, String meaning) {
        String number = NumberText.withInterval(estimate);
        boolean bracket = !unit.isEmpty() && number.contains("±");
        return new Fact(symbol, (bracket ? "(" + number + ")" : number) + unit, meaning);
    }

    private static String whyNone(RunResult result) {
        if (!result.reason().isEmpty()) {
            return result.reason();
        }
        return switch (result.run().type()) {
            case FAN_OFF_ZERO -> "Zeros of pressure transducers and anemometers: no heat is booked.";
            case ZERO -> "Zeros of the plate's thermocouples: no heat is booked.";
            case LOSS -> "Identifies the losses: no run average of its own.";
            case HEATED, COOL_DOWN -> "No numbers.";
        };
    }
}
