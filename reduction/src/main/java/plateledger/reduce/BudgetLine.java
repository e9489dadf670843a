package plateledger.reduce;

/**
 * One line of an uncertainty budget.
 *
 * @param output what it is the budget of, e.g. {@code Nu_L}
 * @param input input name
 * @param value best estimate of the input, SI
 * @param u its standard uncertainty, SI
 * @param distribution its shape
 * @param dof its degrees of freedom
 * @param scope its scope
 * @param sensitivity ∂output/∂input
 * @param contribution sensitivity × u, in the output's unit, signed
 * @param sharePercent contribution² as a share of the output's variance, %
 */
public record BudgetLine(
        String output,
        String input,
        double value,
        double u,
        String distribution,
        double dof,
        String scope,
        double sensitivity,
        double contribution,
        double sharePercent) {}
