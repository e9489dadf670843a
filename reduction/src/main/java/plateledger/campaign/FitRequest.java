package plateledger.campaign;

/**
 * One fit asked for: C and m of Nu = C Re^m Pr^n over run averages of one plate and regime.
 *
 * @param id name, e.g. {@code product}
 * @param plate plate whose heated runs are used
 * @param regime regime whose runs are used
 */
public record FitRequest(String id, String plate, Regime regime) {}
