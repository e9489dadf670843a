package plateledger.report;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import plateledger.campaign.Campaign;
import plateledger.campaign.FitRequest;
import plateledger.fit.Constants;
import plateledger.fit.FitPoint;
import plateledger.fit.FitProblem;
import plateledger.fit.FitResult;
import plateledger.fit.SharedSource;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.RunResult;

/**
 * {@code fit.json}: the fitted constants with all that is needed to use them.
 *
 * <pre>
 *   format                 "plateledger-fit/1"; changes when a field changes its meaning
 *   definitions            what Re, Nu and Pr mean in this campaign
 *   fits[]                 one entry per fit asked for and made
 *     id, plate, regime    which runs
 *     form                 "Nu = C Re^m Pr^n"
 *     constants            C, m and n with standard uncertainties (u_ln_C, u_m), the 95 % intervals (that of C formed in
 *                          ln C), the coverage factor
 *     covariance           of (ln C, m), absolute, not scaled by the residuals
 *     centred              the same curve as a + m (ln Re − x_g): x_g, a, var_a, var_m, cov_a_m
 *     range                smallest and largest Re and Pr of the points: outside it the constants claim nothing
 *     reference_Re         exp(x_g), the geometric mean Re, where a and m are nearly uncorrelated
 *     random_only          u_ln_C, u_m of the random parts alone
 *     generalised          C, m, u_ln_C, u_m of generalised least squares, for comparison
 *     diagnostics          chi_square, dof, probability, lack_of_fit_F, lack_of_fit_probability, repeat_scatter
 *     sources[]            each shared source: name, scope, shift of a and of m for one u, pull in the generalised fit
 *     points[]             used: run, set, Re, Nu, Pr, u_ln_Re_random, u_ln_Y_random, residual_ln_Y
 *     left_out[]           runs of the plate and regime not used: run, reason
 * </pre>
 *
 * A number that does not exist (no repeats, so no lack-of-fit test) is null.
 */
final class FitJson {
    static final String FORMAT = "plateledger-fit/1";

    private FitJson() {}

    /** The file's bytes. */
    static byte[] bytes(CampaignResult result) {
        return JsonText.write(json -> write(json, result));
    }

    private static void write(JsonGenerator json, CampaignResult result) throws IOException {
        json.writeStartObject();
        json.writeStringField("format", FORMAT);
        Campaign campaign = result.campaign();
        json.writeObjectFieldStart("definitions");
        json.writeStringField("properties", campaign.definitions().properties().word());
        json.writeStringField("length", campaign.definitions().length().word());
        json.writeStringField("average", campaign.definitions().average().word());
        JsonText.number(json, "prandtl_exponent", campaign.definitions().prandtlExponent());
        json.writeEndObject();
        json.writeArrayFieldStart("fits");
        for (FitResult fit : result.fits()) {
            writeFit(json, result, fit);
        }
        json.writeEndArray();
        json.writeEndObject();
    }

    private static void writeFit(JsonGenerator json, CampaignResult result, FitResult fit) throws IOException {
        FitProblem problem = fit.problem();
        json.writeStartObject();
        json.writeStringField("id", problem.id());
        List<FitRequest> requests = result.campaign().fits().stream()
                .filter(r -> r.id().equals(problem.id()))
                .toList();
        for (FitRequest request : requests) {
            json.writeStringField("plate", request.plate());
            json.writeStringField("regime", request.regime().word());
        }
        json.writeStringField("form", "Nu = C Re^m Pr^n");
        writeConstants(json, fit);
        writeRange(json, problem.points(), fit.twoStep());
        json.writeObjectFieldStart("random_only");
        JsonText.number(json, "u_ln_C", fit.randomOnly().uLnC());
        JsonText.number(json, "u_m", fit.randomOnly().uM());
        json.writeEndObject();
        json.writeObjectFieldStart("generalised");
        JsonText.number(json, "C", fit.generalised().c());
        JsonText.number(json, "m", fit.generalised().m());
        JsonText.number(json, "u_ln_C", fit.generalised().uLnC());
        JsonText.number(json, "u_m", fit.generalised().uM());
        json.writeEndObject();
        json.writeObjectFieldStart("diagnostics");
        JsonText.number(json, "chi_square", fit.chiSquare());
        json.writeNumberField("dof", fit.dof());
        JsonText.number(json, "probability", fit.chiSquareProbability());
        JsonText.number(json, "lack_of_fit_F", fit.lackOfFitF());
        JsonText.number(json, "lack_of_fit_probability", fit.lackOfFitProbability());
        JsonText.number(json, "repeat_scatter", fit.repeatScatter());
        json.writeEndObject();
        writeSources(json, fit);
        writePoints(json, fit);
        json.writeArrayFieldStart("left_out");
        for (FitRequest request : requests) {
            writeLeftOut(json, result, request, problem);
        }
        json.writeEndArray();
        json.writeEndObject();
    }

    private static void writeConstants(JsonGenerator json, FitResult fit) throws IOException {
        Constants c = fit.twoStep();
        double k = fit.coverageFactor();
        json.writeObjectFieldStart("constants");
        JsonText.number(json, "C", c.c());
        JsonText.number(json, "u_ln_C", c.uLnC());
        JsonText.pair(json, "C_interval_95", c.c() * Math.exp(-k * c.uLnC()), c.c() * Math.exp(k * c.uLnC()));
        JsonText.number(json, "m", c.m());
        JsonText.number(json, "u_m", c.uM());
        JsonText.pair(json, "m_interval_95", c.m() - k * c.uM(), c.m() + k * c.uM());
        JsonText.number(json, "n", fit.problem().prandtlExponent());
        json.writeBooleanField("n_fitted", false);
        JsonText.number(json, "coverage_factor", k);
        json.writeEndObject();
        double covLnCM = c.covAM() - c.xg() * c.varM();
        json.writeObjectFieldStart("covariance");
        json.writeArrayFieldStart("order");
        json.writeString("ln_C");
        json.writeString("m");
        json.writeEndArray();
        json.writeArrayFieldStart("matrix");
        JsonText.row(json, c.uLnC() * c.uLnC(), covLnCM);
        JsonText.row(json, covLnCM, c.varM());
        json.writeEndArray();
        json.writeEndObject();
        json.writeObjectFieldStart("centred");
        JsonText.number(json, "x_g", c.xg());
        JsonText.number(json, "a", c.a());
        JsonText.number(json, "var_a", c.varA());
        JsonText.number(json, "var_m", c.varM());
        JsonText.number(json, "cov_a_m", c.covAM());
        json.writeEndObject();
    }

    private static void writeRange(JsonGenerator json, List<FitPoint> points, Constants c) throws IOException {
        json.writeObjectFieldStart("range");
        JsonText.pair(
                json,
                "Re",
                points.stream().mapToDouble(FitPoint::re).min().orElse(Double.NaN),
                points.stream().mapToDouble(FitPoint::re).max().orElse(Double.NaN));
        JsonText.pair(
                json,
                "Pr",
                points.stream().mapToDouble(FitPoint::pr).min().orElse(Double.NaN),
                points.stream().mapToDouble(FitPoint::pr).max().orElse(Double.NaN));
        json.writeEndObject();
        JsonText.number(json, "reference_Re", Math.exp(c.xg()));
    }

    private static void writeSources(JsonGenerator json, FitResult fit) throws IOException {
        json.writeArrayFieldStart("sources");
        List<SharedSource> sources = fit.problem().sources();
        for (int i = 0; i < sources.size(); i++) {
            json.writeStartObject();
            json.writeStringField("name", sources.get(i).name());
            json.writeStringField("scope", sources.get(i).scope());
            JsonText.number(json, "shift_a", fit.sourceShifts()[i][0]);
            JsonText.number(json, "shift_m", fit.sourceShifts()[i][1]);
            JsonText.number(json, "pull", fit.pulls()[i]);
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    private static void writePoints(JsonGenerator json, FitResult fit) throws IOException {
        json.writeArrayFieldStart("points");
        List<FitPoint> points = fit.problem().points();
        for (int i = 0; i < points.size(); i++) {
            FitPoint point = points.get(i);
            json.writeStartObject();
            json.writeStringField("run", point.id());
            json.writeStringField("set", point.set());
            JsonText.number(json, "Re", point.re());
            JsonText.number(json, "Nu", point.nu());
            JsonText.number(json, "Pr", point.pr());
            JsonText.number(json, "u_ln_Re_random", point.uLnReRandom());
            JsonText.number(json, "u_ln_Y_random", point.uLnYRandom());
            JsonText.number(json, "residual_ln_Y", fit.residuals()[i]);
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    private static void writeLeftOut(JsonGenerator json, CampaignResult result, FitRequest request, FitProblem problem)
            throws IOException {
        for (RunResult run : FitRuns.of(result, request)) {
            if (problem.points().stream().noneMatch(p -> p.id().equals(run.run().id()))) {
                json.writeStartObject();
                json.writeStringField("run", run.run().id());
                json.writeStringField("reason", FitRuns.reason(run));
                json.writeEndObject();
            }
        }
    }
}
