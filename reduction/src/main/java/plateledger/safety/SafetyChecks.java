package plateledger.safety;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plateledger.campaign.Campaign;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.finding.Finding;
import plateledger.log.Series;
import plateledger.rig.Plate;

/**
 * Every safety check the tool knows, each a finding with its source. A screening, not a safety assessment: print
 * {@link Cautions#NOT_A_PROOF} under any list of findings and the {@linkplain Cautions#general() general cautions} with every
 * report.
 */
public final class SafetyChecks {
    private SafetyChecks() {}

    /**
     * Checks rig, plans and logs.
     *
     * @param campaign the campaign
     * @param seriesByRun the screened series of each run by its id, values in SI, times on the loggers' own clocks as read;
     *     a run that is absent or empty has no values to be checked, which is said
     * @return the findings, gravest first; never null, empty when nothing was found
     */
    public static List<Finding> findings(Campaign campaign, Map<String, List<Series>> seriesByRun) {
        Findings findings = new Findings();
        List<RunLog> logs = logs(campaign, seriesByRun, findings);
        for (RunLog log : logs) {
            TemperatureChecks.check(log, findings);
            FlowChecks.check(log, findings);
            SensorChecks.check(log, findings);
            PowerChecks.check(log, findings);
        }
        TemperatureChecks.checkCampaign(campaign.rig().limits(), logs, findings);
        PowerChecks.checkCampaign(campaign.rig().plates(), logs, findings);
        ProtectionChecks.check(campaign, logs, findings);
        PlanChecks.flowFailure(campaign, logs, findings);
        PlanChecks.planned(campaign, findings);
        return findings.sorted();
    }

    private static List<RunLog> logs(Campaign campaign, Map<String, List<Series>> seriesByRun, Findings findings) {
        List<RunLog> logs = new ArrayList<>();
        for (Run run : campaign.runs()) {
            Optional<Plate> plate = campaign.rig().plate(run.plate());
            if (run.planned() || plate.isEmpty()) {
                continue;
            }
            List<Series> series = seriesByRun.getOrDefault(run.id(), List.of());
            if (series.isEmpty()) {
                if (run.type() == RunType.HEATED || run.type() == RunType.LOSS) {
                    findings.notChecked(
                            "RUN-LOG",
                            run.place(),
                            "run " + run.id(),
                            "none of its logs could be used",
                            "Mend the logs, then check again");
                }
                continue;
            }
            logs.add(new RunLog(campaign, run, plate.get(), series));
        }
        return logs;
    }
}
