package plateledger.reduce;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plateledger.campaign.Run;
import plateledger.quantity.Estimate;
import plateledger.steady.SteadyWindow;

/**
 * What one run came to.
 *
 * @param run the run as declared
 * @param state what became of it
 * @param reason why, if it was not reduced; empty otherwise
 * @param window the window used
 * @param values the numbers, if it is a heated run that was reduced
 */
public record RunResult(
        Run run, RunState state, String reason, Optional<SteadyWindow> window, Optional<Values> values) {

    /**
     * The numbers of a reduced heated run, SI.
     *
     * @param speed stream speed over the plate, m/s
     * @param airTemperature T_∞, K
     * @param pressure static pressure, Pa
     * @param vapourFraction mole fraction of water
     * @param meanSurface area mean of the surface temperature, K
     * @param reL Reynolds number of the run average
     * @param nuL Nusselt number by the campaign's average
     * @param nuLMeanH Nusselt number of the length average of h
     * @param pr Prandtl number
     * @param h average heat transfer coefficient by the campaign's definition, W/(m² K)
     * @param nuLTheory theory for this rig; NaN without theory; its u is the theory's own
     * @param lnRatio ln(Nu_L/Nu_L,theory) with its joint uncertainty
     * @param en E_n number; NaN without theory
     * @param ledger booked heat, W
     * @param stations results at the stations in order along the flow
     * @param misfit root mean square of (reading − model) over all junctions, K
     * @param misfitChiSquare χ² of those differences against their random uncertainties
     * @param misfitDof its degrees of freedom
     * @param effectiveParameters effective number of parameters of the inverse step
     * @param budgets budget lines of Nu_L, largest first
     */
    public record Values(
            Estimate speed,
            Estimate airTemperature,
            Estimate pressure,
            Estimate vapourFraction,
            Estimate meanSurface,
            Estimate reL,
            Estimate nuL,
            Estimate nuLMeanH,
            Estimate pr,
            Estimate h,
            Estimate nuLTheory,
            Estimate lnRatio,
            double en,
            Map<LedgerTerm, Estimate> ledger,
            List<StationResult> stations,
            double misfit,
            double misfitChiSquare,
            double misfitDof,
            double effectiveParameters,
            List<BudgetLine> budgets) {
        /** Copies the collections. */
        public Values {
            ledger = java.util.Collections.unmodifiableMap(new EnumMap<>(ledger));
            stations = List.copyOf(stations);
            budgets = List.copyOf(budgets);
        }

        /** A ledger entry. */
        public Estimate ledger(LedgerTerm term) {
            Estimate value = ledger.get(term);
            return value == null ? Estimate.of(0.0, 0.0) : value;
        }
    }
}
