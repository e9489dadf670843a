package plateledger.reduce;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CancellationException;
import plateledger.campaign.Campaign;
import plateledger.campaign.FitRequest;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.RefusedException;
import plateledger.fit.FitProblem;
import plateledger.fit.FitResult;
import plateledger.fit.PowerLawFit;
import plateledger.ledger.LossCalibration;
import plateledger.quantity.Estimate;
import plateledger.uncertainty.CompositePropagation;
import plateledger.uncertainty.Effects;
import plateledger.uncertainty.InputList;

/**
 * From window means to results: everything after the logs. A pure function; the whole reduction and simulated campaigns
 * go through it alike.
 *
 * @param values numbers of each heated run that was reduced, by run id
 * @param refused reason by run id
 * @param warnings what had to be assumed, by run id
 * @param losses loss calibration per panel
 * @param fits the fits asked for that could be made
 * @param repeats spread within repeated set points
 * @param findings of fits and results
 */
public record MeansReduction(
        Map<String, RunResult.Values> values,
        Map<String, String> refused,
        Map<String, String> warnings,
        List<LossResult> losses,
        List<FitResult> fits,
        List<RepeatSpread> repeats,
        List<Finding> findings) {
    /** Copies the collections. */
    public MeansReduction {
        values = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(values));
        refused = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(refused));
        warnings = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(warnings));
        losses = List.copyOf(losses);
        fits = List.copyOf(fits);
        repeats = List.copyOf(repeats);
        findings = List.copyOf(findings);
    }

    /**
     * Reduces.
     *
     * @param campaign the campaign
     * @param runs window means of all runs that have some
     * @param threads number of threads; the result does not depend on it
     * @param progress told how far the work is
     */
    public static MeansReduction of(Campaign campaign, List<RunMeans> runs, int threads, Progress progress)
            throws CancelledException {
        CampaignModel.Built built = CampaignModel.build(campaign, runs);
        CampaignModel model = built.model();
        Effects effects;
        try {
            effects = CompositePropagation.run(
                    model,
                    model.list(),
                    threads,
                    progress::cancelled,
                    share -> progress.step("propagating uncertainty", share));
        } catch (CancellationException e) {
            CancelledException cancelled = new CancelledException();
            cancelled.initCause(e);
            throw cancelled;
        }
        Map<String, String> refused = new LinkedHashMap<>(built.refused());
        Map<String, RunResult.Values> values = new LinkedHashMap<>();
        List<String> ids = model.heatedIds();
        for (int b = 0; b < ids.size(); b++) {
            ValuesBuilder builder = new ValuesBuilder(model, effects, b);
            if (builder.converged()) {
                values.put(ids.get(b), builder.build());
            } else {
                refused.put(ids.get(b), "the plate model finds no solution for its readings");
            }
        }
        List<Finding> findings = new ArrayList<>();
        FitBuilder fitBuilder =
                new FitBuilder(model, effects, campaign.definitions().prandtlExponent());
        List<FitResult> fits = fits(campaign, fitBuilder, findings);
        return new MeansReduction(
                values,
                refused,
                built.warnings(),
                losses(model, effects),
                fits,
                Repeats.of(campaign, fitBuilder, fits),
                findings);
    }

    private static List<FitResult> fits(Campaign campaign, FitBuilder builder, List<Finding> findings) {
        List<FitResult> fits = new ArrayList<>();
        for (FitRequest request : campaign.fits()) {
            FitProblem problem = builder.problem(request);
            try {
                FitResult fit = PowerLawFit.fit(problem);
                fits.add(fit);
                findings.addAll(fit.findings());
            } catch (RefusedException e) {
                findings.addAll(e.findings().stream()
                        .map(f -> new Finding(
                                f.id(),
                                Level.CAUTION,
                                f.place(),
                                "fit " + request.id(),
                                f.found(),
                                f.expected(),
                                f.remedy(),
                                f.source()))
                        .toList());
            }
        }
        return fits;
    }

    private static List<LossResult> losses(CampaignModel model, Effects effects) {
        List<LossResult> results = new ArrayList<>();
        int first = model.heatedIds().size();
        InputList inputs = model.list();
        for (int l = 0; l < model.lossStages().size(); l++) {
            LossStage stage = model.lossStages().get(l);
            int[] prior = stage.first().panel.prior();
            List<LossResult.Parameter> parameters = new ArrayList<>();
            for (LossCalibration.Parameter p : LossCalibration.Parameter.values()) {
                int a = parameters.size();
                var before = inputs.get(prior[a]);
                parameters.add(new LossResult.Parameter(
                        p.label(),
                        p.unit(),
                        new Estimate(before.value(), before.u(), before.dof()),
                        effects.combined(first + l, a).estimate()));
            }
            // emissivity takes no part in a covered run: stated, so that nobody believes it was measured
            var emissivity = inputs.get(stage.first().panel.emissivity());
            Estimate unmoved = new Estimate(emissivity.value(), emissivity.u(), emissivity.dof());
            parameters.add(new LossResult.Parameter("emissivity", "1", unmoved, unmoved));
            results.add(new LossResult(stage.plate().id(), stage.runIds(), parameters, model.lossResiduals(l)));
        }
        return results;
    }
}
