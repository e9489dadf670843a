package plateledger.uncertainty;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * The uncertainty budget of one output: what each input brings.
 *
 * @param combined value, standard uncertainty and effective degrees of freedom of the output
 * @param lines inputs with an effect, largest first
 */
public record Budget(Combined combined, List<Line> lines) {
    /** Copies the list. */
    public Budget {
        lines = List.copyOf(lines);
    }

    /**
     * One input's part.
     *
     * @param input the input
     * @param sensitivity ∂output/∂input as found by the perturbation
     * @param contribution sensitivity × u, signed
     * @param sharePercent contribution² as a share of the output's variance, %
     * @param curvature |f(+u) + f(−u) − 2f|/2, the second-order part; NaN where one side could not be evaluated
     */
    public record Line(Input input, double sensitivity, double contribution, double sharePercent, double curvature) {}

    /** The budget of an output; inputs without effect are left out. Equal contributions keep the order of the list. */
    public static Budget of(Effects effects, int block, int output) {
        Combined combined = effects.combined(block, output);
        double variance = combined.u() * combined.u();
        List<Line> lines = new ArrayList<>();
        for (int position : effects.inputsOf(block)) {
            double contribution = effects.effect(block, output, position);
            if (contribution != 0.0) {
                Input input = effects.inputs().get(position);
                lines.add(new Line(
                        input,
                        contribution / input.u(),
                        contribution,
                        100.0 * contribution * contribution / variance,
                        effects.curvature(block, output, position)));
            }
        }
        lines.sort(Comparator.comparingDouble((Line line) -> Math.abs(line.contribution()))
                .reversed());
        return new Budget(combined, lines);
    }
}
