package plateledger.report;

import freemarker.core.HTMLOutputFormat;
import freemarker.template.Configuration;
import freemarker.template.TemplateException;
import freemarker.template.TemplateExceptionHandler;
import java.io.IOException;
import java.io.InputStream;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Base64;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import plateledger.audit.AuditRecord;
import plateledger.campaign.Campaign;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.fit.FitResult;
import plateledger.ledger.LossTerm;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.RunResult;
import plateledger.reduce.RunState;
import plateledger.safety.Cautions;

/** {@code report.html}: the test report in one file, without scripts, with its own typeface and figures. */
final class ReportPage {
    private static final Map<String, String> TITLE_FIELDS = titleFields();

    private static final String DATA = "url(data:font/ttf;base64,";

    /** Stand where a face goes once the page's characters are known. */
    private static final String REGULAR_MARK = DATA + "@regular@)";

    private static final String BOLD_MARK = DATA + "@bold@)";

    /** Findings of one kind and level that are shown in full; a stop always is. */
    private static final int SHOWN_OF_A_KIND = 6;

    private final CampaignResult result;
    private final AuditRecord audit;
    private final List<Figures.Figure> figures;
    private final List<Cautions.Caution> cautions;
    private final List<RunGroup> groups;

    ReportPage(
            CampaignResult result, AuditRecord audit, List<Figures.Figure> figures, List<Cautions.Caution> cautions) {
        this.result = result;
        this.audit = audit;
        this.figures = List.copyOf(figures);
        this.cautions = List.copyOf(cautions);
        this.groups = RunGroup.of(result);
    }

    /** The page's bytes. */
    byte[] bytes() {
        Configuration configuration = new Configuration(Configuration.VERSION_2_3_33);
        configuration.setClassForTemplateLoading(ReportPage.class, "");
        configuration.setDefaultEncoding("UTF-8");
        configuration.setLocale(Locale.ROOT);
        configuration.setNumberFormat("computer");
        configuration.setOutputFormat(HTMLOutputFormat.INSTANCE);
        configuration.setTemplateExceptionHandler(TemplateExceptionHandler.RETHROW_HANDLER);
        configuration.setLogTemplateExceptions(false);
        configuration.setWrapUncheckedExceptions(true);
        StringWriter page = new StringWriter();
        try {
            configuration.getTemplate("report.ftlh").process(model(), page);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (TemplateException e) {
            throw new IllegalStateException("the report's template does not fit its data", e);
        }
        return withTypeface(page.toString()).getBytes(StandardCharsets.UTF_8);
    }

    /** Puts the typeface in, cut down to the characters that the page turned out to use. */
    private static String withTypeface(String page) {
        String complete = page;
        for (Map.Entry<String, String> face : Map.of(REGULAR_MARK, "DejaVuSans.ttf", BOLD_MARK, "DejaVuSans-Bold.ttf")
                .entrySet()) {
            byte[] cut = FontSubset.of(Fonts.bytes(face.getValue()), page);
            complete =
                    complete.replace(face.getKey(), DATA + Base64.getEncoder().encodeToString(cut) + ")");
        }
        return complete;
    }

    private Map<String, Object> model() throws IOException {
        Campaign campaign = result.campaign();
        Map<String, Object> model = new LinkedHashMap<>();
        model.put(
                "fonts",
                List.of(Map.of("weight", 400, "data", REGULAR_MARK), Map.of("weight", 700, "data", BOLD_MARK)));
        model.put("css", css());
        model.put("title", campaign.title());
        model.put("rig", campaign.rig().title());
        model.put("fields", fields(campaign));
        model.put(
                "program",
                Map.of(
                        "version",
                        audit.program().version(),
                        "build",
                        audit.program().build()));
        model.put("summary", summary());
        model.put("fitLines", fitLines());
        model.put("figures", byName());
        model.put("definitions", Definition.sentences(campaign));
        model.put("plates", Definition.plates(campaign.rig()));
        model.put("matrix", RunSections.matrix(result));
        model.put("averages", RunSections.averages(result));
        model.put("ledger", new LedgerSection(result).model());
        model.put("terms", terms());
        model.put("stations", RunSections.stations(result));
        model.put("theory", ComparisonSections.theory(groups));
        model.put("losses", ComparisonSections.losses(result));
        model.put("fits", FitSection.model(result, figures));
        model.put("repeats", ComparisonSections.repeats(result));
        model.put("budgets", ComparisonSections.budgets(groups));
        model.put("windows", RunSections.windows(result));
        model.put("clocks", RunSections.clocks(campaign));
        model.put("findings", findings());
        model.put(
                "cautions",
                cautions.stream()
                        .map(c -> Map.of("topic", c.topic(), "text", c.text(), "source", c.source()))
                        .toList());
        model.put("notAProof", Cautions.NOT_A_PROOF);
        model.put("deviations", RunSections.deviations(result));
        model.put("notUsed", RunSections.notUsed(result));
        model.put("audit", auditTable());
        model.put("settings", settings());
        return model;
    }

    /** How each loss is booked: the texts stand with the functions that the kernel calls. */
    private static List<Map<String, String>> terms() {
        return LossTerm.all().stream()
                .map(t -> Map.of("label", t.label(), "equation", t.equation(), "source", t.source()))
                .toList();
    }

    private static String css() throws IOException {
        try (InputStream in = ReportPage.class.getResourceAsStream("report.css")) {
            if (in == null) {
                throw new IOException("report.css is missing from the program");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    private static Map<String, String> titleFields() {
        Map<String, String> fields = new LinkedHashMap<>();
        fields.put("report_number", "Report number");
        fields.put("laboratory", "Laboratory");
        fields.put("customer", "Customer");
        fields.put("object", "Object tested");
        fields.put("purpose", "Purpose");
        fields.put("tested", "Tested");
        fields.put("issued", "Issued");
        fields.put("author", "Author");
        fields.put("reviewer", "Reviewer");
        return fields;
    }

    private static List<Map<String, Object>> fields(Campaign campaign) {
        List<Map<String, Object>> fields = new ArrayList<>();
        for (Map.Entry<String, String> field : TITLE_FIELDS.entrySet()) {
            String text = campaign.texts().get(field.getKey());
            boolean stated = text != null && !text.isBlank();
            fields.add(Map.of("label", field.getValue(), "value", stated ? text : "not stated", "stated", stated));
        }
        return fields;
    }

    private List<String> summary() {
        List<String> lines = new ArrayList<>();
        long reduced =
                result.runs().stream().filter(r -> r.values().isPresent()).count();
        long heated = result.runs().stream()
                .filter(r -> r.run().type() == plateledger.campaign.RunType.HEATED)
                .count();
        StringBuilder first = new StringBuilder();
        first.append(reduced).append(" of ").append(heated).append(" heated runs were reduced");
        long others = result.runs().stream()
                .filter(r -> r.values().isEmpty() && r.state() == RunState.REDUCED)
                .count();
        if (others > 0) {
            first.append(", with ").append(others).append(others == 1 ? " zero or loss run" : " zero and loss runs");
        }
        lines.add(first.append('.').toString());
        groups.stream().filter(g -> !g.compared().isEmpty()).forEach(g -> lines.add(ComparisonSections.verdict(g)));
        largestLoss().ifPresent(lines::add);
        lines.add(counts());
        return lines;
    }

    private java.util.Optional<String> largestLoss() {
        double worst = 0.0;
        String run = "";
        for (RunResult r : result.runs()) {
            if (r.values().isEmpty()) {
                continue;
            }
            RunResult.Values v = r.values().get();
            double share = 1.0
                    - v.ledger(plateledger.reduce.LedgerTerm.CONVECTION).value()
                            / v.ledger(plateledger.reduce.LedgerTerm.ELECTRICAL).value();
            if (share > worst) {
                worst = share;
                run = r.run().id();
            }
        }
        return run.isEmpty()
                ? java.util.Optional.empty()
                : java.util.Optional.of("Convection never carried less than " + Shown.percent(1.0 - worst, 0)
                        + " of the heater power (run " + run + ").");
    }

    private String counts() {
        List<String> parts = new ArrayList<>();
        for (Level level : Level.values()) {
            parts.add(result.findings().stream().filter(f -> f.level() == level).count() + " " + level.word());
        }
        return "Findings: " + String.join(", ", parts) + ".";
    }

    private List<Map<String, Object>> fitLines() {
        List<Map<String, Object>> lines = new ArrayList<>();
        for (FitResult fit : result.fits()) {
            lines.add(Map.of(
                    "id",
                    fit.problem().id(),
                    "c",
                    FitSection.cValue(fit.twoStep()),
                    "m",
                    Shown.value(plateledger.quantity.Estimate.of(
                            fit.twoStep().m(), fit.twoStep().uM())),
                    "n",
                    Shown.exponent(fit.problem().prandtlExponent()),
                    "cInterval",
                    FitSection.cInterval(fit.twoStep(), fit.coverageFactor()),
                    "mInterval",
                    FitSection.mInterval(fit.twoStep(), fit.coverageFactor()),
                    "reLow",
                    Shown.digits(FitSection.lowest(fit), 3),
                    "reHigh",
                    Shown.digits(FitSection.highest(fit), 3),
                    "runs",
                    fit.problem().points().size()));
        }
        return lines;
    }

    private Map<String, Object> byName() {
        Map<String, Object> byName = new LinkedHashMap<>();
        figures.forEach(f -> byName.put(f.name(), Map.of("svg", f.svg(), "caption", f.caption())));
        return byName;
    }

    private List<Map<String, Object>> findings() {
        List<Map<String, Object>> levels = new ArrayList<>();
        for (Level level : Level.values()) {
            List<Map<String, Object>> items = new ArrayList<>();
            Map<String, Integer> kinds = new java.util.TreeMap<>();
            for (Finding f : result.findings()) {
                if (f.level() != level) {
                    continue;
                }
                if (kinds.merge(f.id(), 1, Integer::sum) <= SHOWN_OF_A_KIND || level == Level.STOP) {
                    items.add(Map.of(
                            "id", f.id(),
                            "subject", f.subject(),
                            "place", f.place().toString(),
                            "found", f.found(),
                            "expected", f.expected(),
                            "remedy", f.remedy(),
                            "source", f.source()));
                }
            }
            List<String> folded = new ArrayList<>();
            kinds.forEach((id, n) -> {
                if (n > SHOWN_OF_A_KIND && level != Level.STOP) {
                    folded.add((n - SHOWN_OF_A_KIND) + " more of " + id + " in findings.csv");
                }
            });
            levels.add(Map.of(
                    "folded",
                    folded,
                    "count",
                    kinds.values().stream().mapToInt(Integer::intValue).sum(),
                    "word",
                    level.word(),
                    "mark",
                    level.name().toLowerCase(Locale.ROOT).replace('_', '-'),
                    "colour",
                    Palette.hex(Palette.of(level)),
                    "items",
                    items));
        }
        return levels;
    }

    private Map<String, Object> auditTable() {
        Grid grid = new Grid("file", "#bytes", "SHA-256");
        audit.files().forEach(f -> grid.row(f.name(), String.valueOf(f.bytes()), f.sha256()));
        return grid.model();
    }

    private Map<String, Object> settings() {
        Grid grid = new Grid("setting", "value");
        audit.settings().forEach(grid::row);
        return grid.model();
    }
}
