package plateledger.report;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import plateledger.audit.AuditRecord;
import plateledger.reduce.CampaignResult;
import plateledger.safety.Cautions;

/** All files of one reduction. The same result and audit give the same bytes, {@code written.json} excepted. */
public final class ResultFiles {
    /**
     * When, how long and where: what {@code written.json} holds.
     *
     * @param when moment of writing
     * @param took time since the start of the reduction
     * @param campaign campaign folder
     */
    public record Written(Instant when, Duration took, Path campaign) {}

    private ResultFiles() {}

    /**
     * The files of a reduction, {@code audit.json} first.
     *
     * @param result what the reduction came to
     * @param audit what it came from
     * @param written when, how long, where
     */
    public static List<ResultFile> of(CampaignResult result, AuditRecord audit, Written written) {
        List<Figures.Figure> figures = new Figures(result).all();
        List<ResultFile> files = new ArrayList<>();
        files.add(new ResultFile(AuditJson.FILE, AuditJson.bytes(audit)));
        files.add(new ResultFile(
                "written.json",
                AuditJson.written(
                        written.when(),
                        written.took(),
                        written.campaign().toAbsolutePath().normalize())));
        files.add(new ResultFile("stations.csv", ResultTables.stations(result)));
        files.add(new ResultFile("runs.csv", ResultTables.runs(result)));
        files.add(new ResultFile("budget.csv", ResultTables.budget(result)));
        files.add(new ResultFile("findings.csv", ResultTables.findings(result.findings())));
        files.add(new ResultFile("fit.json", FitJson.bytes(result)));
        for (Figures.Figure figure : figures) {
            files.add(new ResultFile(
                    "figures/" + figure.name() + ".svg",
                    SvgDrawing.standalone(figure.svg()).getBytes(StandardCharsets.UTF_8)));
        }
        files.add(new ResultFile("report.html", new ReportPage(result, audit, figures, Cautions.general()).bytes()));
        return files;
    }
}
