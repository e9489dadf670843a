package plateledger.gui.model;

import java.util.List;
import java.util.Optional;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.quantity.Estimate;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.LedgerTerm;
import plateledger.reduce.RunResult;

/**
 * One line of the list of runs.
 *
 * @param id run
 * @param type word of its type
 * @param plate plate and regime, e.g. {@code baseline, laminar}; empty without a plate
 * @param state word of its state
 * @param reason why it is in that state; may be empty
 * @param set name of its set point
 * @param speed stream speed, m/s
 * @param power electrical power, W
 * @param speedInterval the same with its interval
 * @param powerInterval the same with its interval
 * @param nusselt Nu_L
 * @param findings number of findings that belong to it
 * @param gravest the gravest level among them
 */
public record RunRow(
        String id,
        String type,
        String plate,
        String state,
        String reason,
        String set,
        Cell speed,
        Cell power,
        String speedInterval,
        String powerInterval,
        Cell nusselt,
        int findings,
        Optional<Level> gravest) {

    /**
     * A number in a column: sorts by value, reads as text; unknown values last.
     *
     * @param value the value in the unit of its column; NaN where it is not known
     * @param text what is shown
     */
    public record Cell(double value, String text) implements Comparable<Cell> {
        private static final Cell NONE = new Cell(Double.NaN, "");

        @Override
        public int compareTo(Cell other) {
            return Double.compare(value, other.value);
        }

        /** The text shown. */
        @Override
        public String toString() {
            return text;
        }
    }

    /** A line per run, in campaign order. */
    public static List<RunRow> of(CampaignResult result) {
        return result.runs().stream().map(run -> of(run, result.findings())).toList();
    }

    /** What the run is, in words: plate and regime of a heated run, else its type and the plate if there is one. */
    public String kind() {
        if (type.equals(RunType.HEATED.word())) {
            return plate;
        }
        return plate.isEmpty() ? type : type + ", " + plate;
    }

    /** What the line says about the plate and the regime. */
    static String plateWords(Run run) {
        if (run.plate().isEmpty() || run.plate().equals(run.regime().word())) {
            return run.plate();
        }
        return switch (run.type()) {
            case HEATED, COOL_DOWN -> run.plate() + ", " + run.regime().word();
            case FAN_OFF_ZERO, ZERO, LOSS -> run.plate();
        };
    }

    private static RunRow of(RunResult result, List<Finding> all) {
        Run run = result.run();
        List<Finding> own = RunFindings.of(run, all);
        Optional<RunResult.Values> values = result.values();
        Optional<Estimate> speed = values.map(RunResult.Values::speed);
        Optional<Estimate> power = values.map(v -> v.ledger(LedgerTerm.ELECTRICAL));
        return new RunRow(
                run.id(),
                run.type().word(),
                plateWords(run),
                result.state().word(),
                result.reason(),
                run.set(),
                speed.map(e -> new Cell(e.value(), NumberText.toInterval(e)))
                        .orElseGet(() -> asSet(run.speedSetMPerS())),
                power.map(e -> new Cell(e.value(), NumberText.toInterval(e))).orElseGet(() -> asSet(run.powerSetW())),
                speed.map(NumberText::withInterval).orElse("not measured"),
                power.map(NumberText::withInterval).orElse("not measured"),
                values.map(v -> new Cell(v.nuL().value(), NumberText.withInterval(v.nuL())))
                        .orElse(Cell.NONE),
                own.size(),
                own.stream().map(Finding::level).min(Level::compareTo));
    }

    private static Cell asSet(double value) {
        return Double.isFinite(value) ? new Cell(value, "set " + NumberText.plain(value)) : Cell.NONE;
    }
}
