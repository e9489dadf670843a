package plateledger.demo.proof;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plateledger.fit.FitResult;
import plateledger.quantity.Estimate;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.LedgerTerm;
import plateledger.reduce.RunResult;
import plateledger.reduce.StationResult;
import plateledger.uncertainty.Coverage;

/** One reduced campaign against its truth file. */
final class DemoScore {
    private static final Map<LedgerTerm, String> NAMES = Map.of(
            LedgerTerm.ELECTRICAL, "electrical",
            LedgerTerm.CONVECTION, "convection",
            LedgerTerm.RADIATION, "radiation",
            LedgerTerm.BACK, "back",
            LedgerTerm.EDGE, "edge",
            LedgerTerm.NOSE, "conduction_nose",
            LedgerTerm.TAIL, "conduction_tail",
            LedgerTerm.LEAD, "lead",
            LedgerTerm.STORAGE, "storage");

    final Score firstStations = new Score();
    final Score middleStations = new Score();
    final Score lastStation = new Score();
    final Score nu = new Score();
    final Score re = new Score();
    final Map<LedgerTerm, int[]> ledgerWithin2u = new EnumMap<>(LedgerTerm.class);
    final int[] residualWithin2u = new int[2];
    final CampaignResult result;
    final Truth truth;

    DemoScore(CampaignResult result, Truth truth) {
        this.result = result;
        this.truth = truth;
        for (RunResult run : result.runs()) {
            run.values().ifPresent(values -> score(run.run().id(), values));
        }
    }

    private void score(String id, RunResult.Values v) {
        String at = "runs/" + id + "/";
        add(nu, v.nuL(), truth.get(at + "Nu_L"));
        add(re, v.reL(), truth.get(at + "Re_L"));
        List<StationResult> stations = v.stations();
        for (int j = 0; j < stations.size(); j++) {
            StationResult s = stations.get(j);
            Score score = j < 2 ? firstStations : j == stations.size() - 1 ? lastStation : middleStations;
            add(score, s.nuX(), truth.get(at + "stations/" + s.channel() + "/Nu_x"));
        }
        NAMES.forEach((term, name) -> {
            Estimate booked = v.ledger(term);
            int[] count = ledgerWithin2u.computeIfAbsent(term, t -> new int[2]);
            count[1]++;
            // the truth file's electrical power is that of the strips, the ledger's is that at the sense points
            double leads = term == LedgerTerm.ELECTRICAL ? truth.get(at + "ledger_W/lead") : 0.0;
            double was = truth.get(at + "ledger_W/" + name) + leads;
            if (Math.abs(booked.value() - was) <= 2.0 * booked.u()) {
                count[0]++;
            }
        });
        residualWithin2u[1]++;
        if (Math.abs(v.ledger(LedgerTerm.RESIDUAL).value())
                <= 2.0 * v.ledger(LedgerTerm.RESIDUAL).u()) {
            residualWithin2u[0]++;
        }
    }

    private static void add(Score score, Estimate estimate, double truth) {
        score.add(estimate.value() / truth - 1.0, estimate.u() / truth, Coverage.factor(estimate.dof()));
    }

    Optional<FitResult> fit(String id) {
        return result.fits().stream().filter(f -> f.problem().id().equals(id)).findFirst();
    }
}
