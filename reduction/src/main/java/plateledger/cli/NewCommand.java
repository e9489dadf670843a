package plateledger.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import plateledger.campaign.Skeleton;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.finding.RefusedException;
import plateledger.log.LogData;
import plateledger.log.LogReader;

/** Writes the skeleton of a campaign. */
@Command(
        name = "new",
        mixinStandardHelpOptions = true,
        description = {
            "Writes a commented campaign skeleton into a new folder.",
            "From given logs it fills in how they are written and which columns they hold."
        },
        footerHeading = "%nExamples:%n",
        footer = {
            "  plateledger new spring-panel",
            "  plateledger new spring-panel --from first-plate.txt power.csv tunnel.tsv",
        })
final class NewCommand implements Callable<Integer> {
    private final Terminal terminal;

    @Parameters(paramLabel = "FOLDER", description = "folder to be made; must not exist, or be empty")
    private Path folder = Path.of("");

    @Option(
            names = "--from",
            arity = "1..*",
            paramLabel = "LOG",
            description = "log files to take formats and columns from; they are read, not copied")
    private List<Path> logs = new ArrayList<>();

    NewCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        try {
            List<LogData> read = new ArrayList<>();
            for (Path log : logs) {
                read.add(read(log));
            }
            Map<String, String> files = Skeleton.files(read);
            write(files);
            terminal.out()
                    .println("Wrote " + folder.resolve("campaign.toml") + ", rig.toml, instruments.toml and the"
                            + " folder logs. Lines that say \"replace\" hold invented values: put yours there.");
            terminal.out().println("Then: plateledger check " + folder);
            terminal.out().flush();
            return ExitStatus.DONE;
        } catch (RefusedException e) {
            FindingList.full().print(terminal.err(), e.findings());
            terminal.err().println("Nothing was written.");
            return ExitStatus.NOTHING_WRITTEN;
        }
    }

    private static LogData read(Path log) throws RefusedException {
        Path absolute = log.toAbsolutePath().normalize();
        Path parent = absolute.getParent();
        Path name = absolute.getFileName();
        if (parent == null || name == null) {
            throw refused(log.toString(), "a folder", "a log file", "Name a file.");
        }
        return LogReader.read(parent, name.toString(), Optional.empty(), ZoneOffset.UTC, Map.of());
    }

    private void write(Map<String, String> files) throws RefusedException {
        try {
            if (Files.exists(folder) && !isEmptyFolder()) {
                throw refused(
                        folder.toString(),
                        "something in its place",
                        "no such folder, or an empty one",
                        "Name another.");
            }
            Files.createDirectories(folder.resolve("logs"));
            for (Map.Entry<String, String> file : files.entrySet()) {
                Files.write(folder.resolve(file.getKey()), file.getValue().getBytes(StandardCharsets.UTF_8));
            }
        } catch (IOException e) {
            throw refused(
                    folder.toString(),
                    "it cannot be written (" + e + ")",
                    "a folder that may be made",
                    "Give yourself the right to write there, or name another.");
        }
    }

    private boolean isEmptyFolder() throws IOException {
        if (!Files.isDirectory(folder)) {
            return false;
        }
        try (Stream<Path> entries = Files.list(folder)) {
            return entries.findAny().isEmpty();
        }
    }

    private static RefusedException refused(String place, String found, String expected, String remedy) {
        return new RefusedException(
                new Finding("NEW-FOLDER", Level.STOP, Place.of(place), "new folder", found, expected, remedy, ""));
    }
}
