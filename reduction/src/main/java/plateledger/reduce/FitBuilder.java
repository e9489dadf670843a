package plateledger.reduce;

import java.util.ArrayList;
import java.util.List;
import plateledger.campaign.FitRequest;
import plateledger.campaign.Run;
import plateledger.fit.FitProblem;
import plateledger.fit.PointsFromEffects;
import plateledger.ledger.RunLayout;
import plateledger.ledger.RunLayout.Out;
import plateledger.uncertainty.Effects;

/** Chooses the runs of a fit and hands their effects on. */
final class FitBuilder {
    private final CampaignModel model;
    private final Effects effects;
    private final double prandtlExponent;

    FitBuilder(CampaignModel model, Effects effects, double prandtlExponent) {
        this.model = model;
        this.effects = effects;
        this.prandtlExponent = prandtlExponent;
    }

    /** The problem of a request: every reduced heated run of its plate and regime. */
    FitProblem problem(FitRequest request) {
        List<PointsFromEffects.RunBlock> blocks = new ArrayList<>();
        PointsFromEffects.Outputs outputs = new PointsFromEffects.Outputs(0, 0, 0);
        List<String> ids = model.heatedIds();
        for (int b = 0; b < ids.size(); b++) {
            Run run = model.index(b).means.run();
            RunLayout layout = model.layout(b);
            boolean known = Double.isFinite(effects.value(b, layout.at(Out.NU_L)));
            if (run.plate().equals(request.plate()) && run.regime() == request.regime() && known) {
                blocks.add(new PointsFromEffects.RunBlock(run.id(), run.set(), b));
                outputs = new PointsFromEffects.Outputs(layout.at(Out.RE_L), layout.at(Out.NU_L), layout.at(Out.PR));
            }
        }
        return PointsFromEffects.problem(request.id(), prandtlExponent, effects, blocks, outputs);
    }
}
