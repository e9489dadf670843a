package plateledger.demo.badinput;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** A few runs of the demo campaign in a folder of their own, to be broken. */
final class SmallCampaign {
    /** The demo campaign, from the module's folder. */
    static final Path DEMO = Path.of("cabinet-door");

    /** Baseline plate: a fan-off zero, a zero run, the loss runs, one laminar and one tripped heated run. */
    static final Set<String> RUNS = Set.of("BZ1", "BZ2", "BL1", "BL2", "BL3", "B01", "B09");

    private static final Pattern ID = Pattern.compile("(?m)^id = \"(.+)\"$");

    private final Path folder;

    private SmallCampaign(Path folder) {
        this.folder = folder;
    }

    /** Cuts the demo campaign down to {@link #RUNS}, without fits. */
    static SmallCampaign cutFromDemo(Path folder) throws IOException {
        Files.createDirectories(folder.resolve("logs"));
        for (String file : List.of("rig.toml", "instruments.toml")) {
            Files.copy(DEMO.resolve(file), folder.resolve(file));
        }
        String whole = Files.readString(DEMO.resolve("campaign.toml"));
        String[] tables = whole.split("(?m)^(?=\\[\\[(?:run|fit)]])", -1);
        StringBuilder kept = new StringBuilder(tables[0]);
        for (String table : tables) {
            Matcher id = ID.matcher(table);
            if (table.startsWith("[[run]]") && id.find() && RUNS.contains(id.group(1))) {
                kept.append(table);
            }
        }
        Files.writeString(folder.resolve("campaign.toml"), kept);
        try (Stream<Path> logs = Files.list(DEMO.resolve("logs"))) {
            for (Path log : logs.toList()) {
                String name = log.getFileName().toString();
                if (RUNS.contains(name.substring(0, name.indexOf('-')))) {
                    Files.copy(log, folder.resolve("logs").resolve(name));
                }
            }
        }
        return new SmallCampaign(folder);
    }

    /** A copy with everything in it, results too. */
    SmallCampaign copy(Path to) throws IOException {
        try (Stream<Path> all = Files.walk(folder)) {
            for (Path path : all.toList()) {
                Files.copy(path, to.resolve(folder.relativize(path).toString()));
            }
        }
        return new SmallCampaign(to);
    }

    Path folder() {
        return folder;
    }

    Path out() {
        return folder.resolve("out");
    }

    /** Replaces a text that must be there, at its first place. */
    SmallCampaign edit(String file, String from, String to) throws IOException {
        Path path = folder.resolve(file);
        String text = Files.readString(path, charset(file));
        assertTrue(text.contains(from), () -> file + " does not hold: " + from);
        Files.writeString(path, text.replaceFirst(Pattern.quote(from), Matcher.quoteReplacement(to)), charset(file));
        return this;
    }

    /** Replaces every match of a pattern, of which there must be some. */
    SmallCampaign editAll(String file, String pattern, String to) throws IOException {
        Path path = folder.resolve(file);
        String text = Files.readString(path, charset(file));
        String edited = text.replaceAll(pattern, to);
        assertTrue(!edited.equals(text), () -> file + " does not hold: " + pattern);
        Files.writeString(path, edited, charset(file));
        return this;
    }

    /** Keeps the first lines only. */
    SmallCampaign cut(String file, int lines) throws IOException {
        List<String> all = Files.readAllLines(folder.resolve(file), charset(file));
        assertTrue(all.size() > lines, () -> file + " has only " + all.size() + " lines");
        Files.write(folder.resolve(file), new ArrayList<>(all.subList(0, lines)), charset(file));
        return this;
    }

    /** Line number of the first line that holds a text. */
    int line(String file, String text) throws IOException {
        List<String> lines = Files.readAllLines(folder.resolve(file), charset(file));
        for (int i = 0; i < lines.size(); i++) {
            if (lines.get(i).contains(text)) {
                return i + 1;
            }
        }
        throw new AssertionError(file + " does not hold: " + text);
    }

    /** Every file and folder below a folder with its bytes, hidden ones too. */
    static Map<String, String> everything(Path folder) throws IOException {
        try (Stream<Path> all = Files.walk(folder)) {
            return all.collect(Collectors.toMap(
                    path -> folder.relativize(path).toString(), SmallCampaign::bytes, (a, b) -> a, TreeMap::new));
        }
    }

    private static String bytes(Path path) {
        try {
            return Files.isDirectory(path)
                    ? "folder"
                    : HexFormat.of()
                            .formatHex(java.security.MessageDigest.getInstance("SHA-256")
                                    .digest(Files.readAllBytes(path)));
        } catch (IOException | java.security.NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }

    private static Charset charset(String file) {
        return file.endsWith(".txt") ? StandardCharsets.ISO_8859_1 : StandardCharsets.UTF_8;
    }
}
