package plateledger.campaign;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.finding.RefusedException;
import plateledger.keyfile.Form;
import plateledger.keyfile.Key;
import plateledger.keyfile.KeyFile;
import plateledger.keyfile.KeyTable;
import plateledger.quantity.Dimension;
import plateledger.rig.Instrument;
import plateledger.rig.InstrumentReader;
import plateledger.rig.RigReader;

/** Reads a campaign folder: {@code campaign.toml}, {@code rig.toml} and {@code instruments.toml}. Opens no log. */
public final class CampaignReader {
    /** Name of the campaign file in the folder. */
    public static final String FILE = "campaign.toml";

    private static final List<String> TEXT_KEYS = List.of(
            "laboratory", "customer", "object", "report_number", "author", "reviewer", "purpose", "issued", "tested");

    private static final double THIRD = 1.0 / 3.0;
    private static final Campaign.SteadyLimits USUAL_LIMITS = new Campaign.SteadyLimits(0.01, 0.005, 600.0);

    private final Path folder;
    private final Optional<InstrumentReader.Reading> instruments;
    private final Optional<RigReader.Reading> rig;
    private final Collection<Finding> findings;

    private CampaignReader(
            Path folder,
            Optional<InstrumentReader.Reading> instruments,
            Optional<RigReader.Reading> rig,
            Collection<Finding> findings) {
        this.folder = folder;
        this.instruments = instruments;
        this.rig = rig;
        this.findings = findings;
    }

    /**
     * A campaign that can be used.
     *
     * @param campaign the campaign
     * @param notes findings that do not forbid its use, gravest first
     */
    public record Outcome(Campaign campaign, List<Finding> notes) {
        /** Copies the list. */
        public Outcome {
            notes = List.copyOf(notes);
        }
    }

    /**
     * Reads the three files of a folder.
     *
     * @throws RefusedException with every finding of all three files if anything makes the campaign unusable
     */
    public static Outcome read(Path folder) throws RefusedException {
        if (!Files.isDirectory(folder)) {
            throw new RefusedException(noFolder(folder));
        }
        Set<Finding> findings = new LinkedHashSet<>();
        Optional<InstrumentReader.Reading> instruments = InstrumentReader.read(folder, findings);
        Optional<RigReader.Reading> rig =
                RigReader.read(folder, instruments.map(InstrumentReader.Reading::instruments), findings);
        CampaignReader reader = new CampaignReader(folder, instruments, rig, findings);
        Optional<Campaign> campaign = KeyFile.read(folder, FILE, findings).flatMap(reader::campaign);
        List<Finding> sorted = findings.stream().sorted(Finding.ORDER).toList();
        if (campaign.isEmpty() || sorted.stream().anyMatch(finding -> finding.level() == Level.STOP)) {
            throw new RefusedException(sorted);
        }
        return new Outcome(campaign.get(), sorted);
    }

    private static Finding noFolder(Path folder) {
        boolean file = Files.exists(folder);
        return new Finding(
                "CAMPAIGN-FOLDER",
                Level.STOP,
                Place.of(folder.toString()),
                "campaign folder",
                file ? "a file" : "no such folder",
                "a folder that holds " + FILE + ", " + RigReader.FILE + " and " + InstrumentReader.FILE,
                file ? "Name the folder that the file lies in." : "Correct the name, or make the folder with new.",
                "");
    }

    /** Every key accepted in {@code campaign.toml}. */
    public static List<Key> keys() {
        KeyFile file = KeyFile.dry();
        CampaignReader reader =
                new CampaignReader(Path.of(""), Optional.empty(), Optional.empty(), new LinkedHashSet<>());
        reader.readAll(file.root());
        return file.accepted();
    }

    /** The campaign; empty where there is no rig for it, which findings say already. */
    private Optional<Campaign> campaign(KeyFile file) {
        Parts parts = readAll(file.root());
        file.refuseUnknownKeys();
        noteOverdue(parts.runs);
        return rig.map(reading -> new Campaign(
                parts.title,
                parts.texts,
                parts.zone,
                reading.rig(),
                parts.definitions,
                parts.steady,
                parts.loggers,
                parts.runs,
                parts.fits));
    }

    private record Parts(
            String title,
            Map<String, String> texts,
            ZoneId zone,
            Definitions definitions,
            Campaign.SteadyLimits steady,
            List<Logger> loggers,
            List<Run> runs,
            List<FitRequest> fits) {}

    private Parts readAll(KeyTable root) {
        String title = root.need("title", Form.text());
        ZoneId zone = root.need("zone", Form.zone());
        Map<String, String> texts =
                root.findTable("texts", CampaignReader::texts).orElseGet(Map::of);
        Definitions definitions =
                root.findTable("definitions", CampaignReader::definitions).orElseGet(CampaignReader::usualDefinitions);
        Campaign.SteadyLimits steady =
                root.findTable("steady", CampaignReader::steady).orElse(USUAL_LIMITS);
        List<Logger> loggers = root.findNamed("logger", "id", (id, t) -> LoggerReader.read(id, t, zone, findings));
        Set<String> loggerIds = loggers.stream().map(Logger::id).collect(Collectors.toSet());
        RunReader runReader = new RunReader(folder, zone, rig, loggerIds, findings);
        List<Run> runs = root.needTables("run", runReader::run);
        Set<String> fitIds = new LinkedHashSet<>();
        List<FitRequest> fits = root.findTables("fit", t -> fit(t, fitIds, runs));
        return new Parts(title, texts, zone, definitions, steady, loggers, runs, fits);
    }

    private static Map<String, String> texts(KeyTable t) {
        Map<String, String> texts = new LinkedHashMap<>();
        for (String key : TEXT_KEYS) {
            Form<String> form = key.equals("issued") || key.equals("tested") ? Form.textOrDate() : Form.anyText();
            t.find(key, form).ifPresent(text -> texts.put(key, text));
        }
        return texts;
    }

    private static Definitions usualDefinitions() {
        return new Definitions(
                Definitions.PropertyTemperature.FILM,
                Definitions.ReferenceLength.LEADING_EDGE,
                Definitions.Average.FLUX_OVER_DIFFERENCE,
                THIRD);
    }

    private static Definitions definitions(KeyTable t) {
        Definitions usual = usualDefinitions();
        Definitions stated = new Definitions(
                t.take(
                        "properties",
                        Form.choice(Definitions.PropertyTemperature.class, Definitions.PropertyTemperature::word),
                        usual.properties(),
                        "film"),
                t.take(
                        "length",
                        Form.choice(Definitions.ReferenceLength.class, Definitions.ReferenceLength::word),
                        usual.length(),
                        "leading-edge"),
                t.take(
                        "average",
                        Form.choice(Definitions.Average.class, Definitions.Average::word),
                        usual.average(),
                        "flux-over-difference"),
                t.take("prandtl_exponent", Form.fraction(), THIRD, "1/3"));
        t.require(
                stated.prandtlExponent() >= 0.0 && stated.prandtlExponent() <= 1.0,
                "prandtl_exponent",
                "between 0 and 1");
        return stated;
    }

    private static Campaign.SteadyLimits steady(KeyTable t) {
        Campaign.SteadyLimits limits = new Campaign.SteadyLimits(
                t.take("storage_share", Form.setting(Dimension.NUMBER), USUAL_LIMITS.storageShare(), "1 %"),
                t.take("storage_share_loss", Form.setting(Dimension.NUMBER), USUAL_LIMITS.storageShareLoss(), "0.5 %"),
                t.take("minimum", Form.setting(Dimension.TIME), USUAL_LIMITS.minimumS(), "10 min"));
        t.require(isShare(limits.storageShare()), "storage_share", "above 0, below 1");
        t.require(isShare(limits.storageShareLoss()), "storage_share_loss", "above 0, below 1");
        t.require(limits.minimumS() > 0.0, "minimum", "above 0 s");
        return limits;
    }

    private static boolean isShare(double share) {
        return share > 0.0 && share < 1.0;
    }

    private FitRequest fit(KeyTable t, Set<String> ids, List<Run> runs) {
        FitRequest fit = new FitRequest(
                t.need("id", Form.text()),
                t.need("plate", Form.text()),
                t.need("regime", Form.choice(Regime.class, Regime::word)));
        if (t.sound("id") && !ids.add(fit.id())) {
            t.refuse("id", "CAMPAIGN-ID-TWICE", "an id of its own", "");
        }
        rig.ifPresent(reading -> RunReader.checkPlate(t, "plate", fit.plate(), reading));
        boolean any = runs.stream()
                .anyMatch(run -> run.type() == RunType.HEATED
                        && run.plate().equals(fit.plate())
                        && run.regime() == fit.regime());
        if (t.sound() && !any) {
            findings.add(new Finding(
                    "CAMPAIGN-FIT-EMPTY",
                    Level.CAUTION,
                    t.place(),
                    t.path(),
                    "no heated run of plate " + fit.plate() + " and regime "
                            + fit.regime().word(),
                    "runs to fit",
                    "Correct plate or regime of the fit or of the runs.",
                    ""));
        }
        return fit;
    }

    /** One caution for each instrument whose calibration was overdue on the day of a run; today's date plays no part. */
    private void noteOverdue(List<Run> runs) {
        instruments.ifPresent(reading -> reading.instruments()
                .forEach(instrument -> instrument
                        .due()
                        .flatMap(due -> firstAfter(due, runs))
                        .ifPresent(run -> {
                            Place place =
                                    reading.places().getOrDefault(instrument.id(), Place.of(InstrumentReader.FILE));
                            findings.add(overdue(instrument, run, place));
                        })));
    }

    private static Optional<Run> firstAfter(LocalDate due, List<Run> runs) {
        return runs.stream()
                .filter(run -> LocalDate.parse(run.day()).isAfter(due))
                .min(Comparator.comparing(Run::day));
    }

    private static Finding overdue(Instrument instrument, Run run, Place place) {
        return new Finding(
                "INSTRUMENT-OVERDUE",
                Level.CAUTION,
                place,
                "instrument." + instrument.id() + ".due",
                "due " + instrument.due().orElseThrow() + ", run " + run.id() + " on " + run.day(),
                "a calibration that was valid on the day of every run",
                "Enter the newer certificate, or widen the statement of drift.",
                "");
    }
}
