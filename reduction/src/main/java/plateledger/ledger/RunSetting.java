package plateledger.ledger;

import java.util.Optional;
import plateledger.rig.Plate;

/**
 * What is fixed for one run before its numbers are known.
 *
 * @param plate the plate mounted
 * @param flow state of the boundary layer
 * @param tripM place of the trip wire from the leading edge, m
 * @param filmProperties true: properties at ½ (T_s + T_∞); false: at T_∞
 * @param fromLeadingEdge true: L from the leading edge; false: the heated length
 * @param fluxOverDifference true: average h is ∫q dA ÷ ∫(T_s − T_ref) dA; false: the length average of h
 * @param sigmaK random standard uncertainty of each junction's corrected reading, K; infinite for one not used
 */
public record RunSetting(
        Plate plate,
        Flow flow,
        Optional<Double> tripM,
        boolean filmProperties,
        boolean fromLeadingEdge,
        boolean fluxOverDifference,
        double[] sigmaK) {
    /** State of the boundary layer. */
    public enum Flow {
        /** Laminar to the trailing edge. */
        LAMINAR,
        /** Turbulent from the trip, or from the leading edge without one. */
        TURBULENT,
        /** No flat-plate theory applies. */
        PRODUCT
    }
}
