package plateledger.fit;

/**
 * One source of error that several points share: what one standard uncertainty of it does to each point.
 *
 * @param name input name
 * @param scope scope as written in budgets
 * @param dLnRe change of ln Re of each point, in point order
 * @param dLnY change of ln(Nu/Pr^n) of each point, in point order
 * @param dof degrees of freedom of the source
 */
public record SharedSource(String name, String scope, double[] dLnRe, double[] dLnY, double dof) {}
