package plateledger.reduce;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import plateledger.campaign.Regime;
import plateledger.ledger.RunLayout;
import plateledger.ledger.RunLayout.Out;
import plateledger.ledger.RunLayout.StationOut;
import plateledger.ledger.RunModel;
import plateledger.quantity.Estimate;
import plateledger.rig.Plate;
import plateledger.theory.LayerLaw;
import plateledger.theory.TheoryUncertainty;
import plateledger.uncertainty.Budget;
import plateledger.uncertainty.Coverage;
import plateledger.uncertainty.Effects;

/** Turns the effects of one heated block into the numbers of a run. */
final class ValuesBuilder {
    /** Budget lines below this share of the variance are left to the sum, %. */
    private static final double SMALLEST_SHARE = 0.01;

    /** h of a station is given only where |T_s − T_ref| is at least so many of its standard uncertainties. */
    static final double LEAST_DIFFERENCE = 5.0;

    private static final Map<LedgerTerm, Out> TERMS = Map.ofEntries(
            Map.entry(LedgerTerm.ELECTRICAL, Out.Q_ELECTRICAL),
            Map.entry(LedgerTerm.CONVECTION, Out.Q_CONVECTION),
            Map.entry(LedgerTerm.RADIATION, Out.Q_RADIATION),
            Map.entry(LedgerTerm.BACK, Out.Q_BACK),
            Map.entry(LedgerTerm.EDGE, Out.Q_EDGE),
            Map.entry(LedgerTerm.NOSE, Out.Q_NOSE),
            Map.entry(LedgerTerm.TAIL, Out.Q_TAIL),
            Map.entry(LedgerTerm.GUARD, Out.Q_GUARD),
            Map.entry(LedgerTerm.LEAD, Out.Q_LEAD),
            Map.entry(LedgerTerm.STORAGE, Out.Q_STORAGE),
            Map.entry(LedgerTerm.RESIDUAL, Out.Q_RESIDUAL));

    private final CampaignModel model;
    private final Effects effects;
    private final int block;
    private final RunLayout layout;

    ValuesBuilder(CampaignModel model, Effects effects, int block) {
        this.model = model;
        this.effects = effects;
        this.block = block;
        this.layout = model.layout(block);
    }

    private Estimate at(int output) {
        double value = effects.value(block, output);
        return Double.isNaN(value)
                ? new Estimate(Double.NaN, Double.NaN, Double.POSITIVE_INFINITY)
                : effects.combined(block, output).estimate();
    }

    private Estimate at(Out output) {
        return at(layout.at(output));
    }

    /** True if the kernel gave a number. */
    boolean converged() {
        return Double.isFinite(effects.value(block, layout.at(Out.NU_L)));
    }

    RunResult.Values build() {
        RunModel kernel = model.kernel(block);
        Regime regime = model.index(block).means.run().regime();
        Map<LedgerTerm, Estimate> ledger = new EnumMap<>(LedgerTerm.class);
        TERMS.forEach((term, out) -> ledger.put(term, at(out)));
        Estimate lnRatio = at(Out.LN_RATIO);
        return new RunResult.Values(
                at(Out.SPEED),
                at(Out.AIR_TEMPERATURE),
                at(Out.PRESSURE),
                at(Out.VAPOUR_FRACTION),
                at(Out.MEAN_SURFACE),
                at(Out.RE_L),
                at(Out.NU_L),
                at(Out.NU_L_MEAN_H),
                at(Out.PR),
                at(Out.H),
                theory(at(Out.NU_L_THEORY), regime),
                lnRatio,
                en(lnRatio, regime),
                ledger,
                stations(regime),
                effects.value(block, layout.at(Out.MISFIT)),
                kernel.chiSquare(),
                kernel.chiSquareDof(),
                kernel.effectiveParameters(),
                budget());
    }

    private static Estimate theory(Estimate value, Regime regime) {
        return value.isKnown()
                ? Estimate.of(value.value(), value.value() * TheoryUncertainty.standard(law(regime)))
                : value;
    }

    private static LayerLaw law(Regime regime) {
        return regime == Regime.LAMINAR ? LayerLaw.LAMINAR : LayerLaw.TURBULENT;
    }

    /** E_n = ln ratio ÷ √(U_joint² + U_theory²), both at 95 %; METHODS.md eq. (D-7). */
    private static double en(Estimate lnRatio, Regime regime) {
        if (!lnRatio.isKnown()) {
            return Double.NaN;
        }
        double joint = Coverage.factor(lnRatio.dof()) * lnRatio.u();
        double own = Coverage.NORMAL_95 * TheoryUncertainty.standard(law(regime));
        return lnRatio.value() / Math.hypot(joint, own);
    }

    private List<StationResult> stations(Regime regime) {
        List<StationResult> list = new ArrayList<>();
        List<Plate.Thermocouple> stations = model.index(block).plate.stations();
        for (int j = 0; j < stations.size(); j++) {
            if (reported(j)) {
                list.add(station(j, stations.get(j).channel(), regime));
            }
        }
        return list;
    }

    /** True if h is known there: T_s − T_ref stands clear of its uncertainty and heat flows the way it drives. */
    private boolean reported(int j) {
        int surface = layout.at(j, StationOut.SURFACE);
        int reference = layout.at(j, StationOut.REFERENCE);
        double difference = Math.abs(effects.value(block, surface) - effects.value(block, reference));
        double variance = effects.covariance(block, surface, block, surface)
                + effects.covariance(block, reference, block, reference)
                - 2.0 * effects.covariance(block, surface, block, reference);
        return effects.value(block, layout.at(j, StationOut.H)) > 0.0
                && difference * difference >= LEAST_DIFFERENCE * LEAST_DIFFERENCE * variance;
    }

    private StationResult station(int j, String channel, Regime regime) {
        Estimate lnRatio = at(layout.at(j, StationOut.LN_RATIO));
        return new StationResult(
                channel,
                at(layout.at(j, StationOut.X)),
                at(layout.at(j, StationOut.SURFACE)),
                at(layout.at(j, StationOut.REFERENCE)),
                at(layout.at(j, StationOut.FILM)),
                at(layout.at(j, StationOut.Q_ELECTRICAL)),
                at(layout.at(j, StationOut.Q_RADIATION)),
                at(layout.at(j, StationOut.Q_BACK)),
                at(layout.at(j, StationOut.Q_CONDUCTION)),
                at(layout.at(j, StationOut.Q_CONVECTION)),
                at(layout.at(j, StationOut.Q_CONVECTION_LOCAL)),
                at(layout.at(j, StationOut.H)),
                at(layout.at(j, StationOut.H_EQUIVALENT)),
                at(layout.at(j, StationOut.RE_X)),
                at(layout.at(j, StationOut.NU_X)),
                at(layout.at(j, StationOut.PR)),
                theory(at(layout.at(j, StationOut.NU_X_THEORY)), regime),
                at(layout.at(j, StationOut.NU_X_TEXTBOOK)),
                lnRatio,
                en(lnRatio, regime),
                effects.value(block, layout.at(j, StationOut.RELIANCE)));
    }

    private List<BudgetLine> budget() {
        List<BudgetLine> lines = new ArrayList<>();
        for (Budget.Line line : Budget.of(effects, block, layout.at(Out.NU_L)).lines()) {
            if (line.sharePercent() >= SMALLEST_SHARE) {
                lines.add(new BudgetLine(
                        "Nu_L",
                        line.input().name(),
                        line.input().value(),
                        line.input().u(),
                        line.input().distribution().word(),
                        line.input().dof(),
                        line.input().scope().toString(),
                        line.sensitivity(),
                        line.contribution(),
                        line.sharePercent()));
            }
        }
        return lines;
    }
}
