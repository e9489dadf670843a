package plateledger.gui.app;

import java.io.IOException;
import java.io.Reader;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Properties;

/** What is remembered between starts, in one small text file of the user's own. A file that cannot be read counts as empty. */
final class UserSettings {
    private static final String CAMPAIGN = "last.campaign";
    private static final String APPEARANCE = "appearance";

    private final Path file;

    /** Settings in a file, which need not exist. */
    UserSettings(Path file) {
        this.file = file;
    }

    /** The settings file where each operating system keeps such files (XDG Base Directory Specification 0.8 on Unix). */
    static Path fileFor(String osName, String home, Map<String, String> environment) {
        String os = osName.toLowerCase(Locale.ROOT);
        Path folder;
        if (os.contains("win") && !os.contains("darwin")) {
            folder = Path.of(environment.getOrDefault("APPDATA", home));
        } else if (os.contains("mac")) {
            folder = Path.of(home, "Library", "Application Support");
        } else {
            String config = environment.getOrDefault("XDG_CONFIG_HOME", "");
            folder = config.isEmpty() ? Path.of(home, ".config") : Path.of(config);
        }
        return folder.resolve("plateledger").resolve("window.properties");
    }

    /** The campaign that was open last, if its folder is still there. */
    Optional<Path> lastCampaign() {
        String written = read().getProperty(CAMPAIGN, "");
        try {
            return written.isEmpty()
                    ? Optional.empty()
                    : Optional.of(Path.of(written)).filter(Files::isDirectory);
        } catch (InvalidPathException notAPathHere) {
            return Optional.empty();
        }
    }

    /** The appearance chosen last. */
    Appearance appearance() {
        return Appearance.of(read().getProperty(APPEARANCE, ""));
    }

    /**
     * Remembers the campaign.
     *
     * @throws IOException if the file cannot be written
     */
    void rememberCampaign(Path folder) throws IOException {
        put(CAMPAIGN, folder.toAbsolutePath().toString());
    }

    /**
     * Remembers the appearance.
     *
     * @throws IOException if the file cannot be written
     */
    void rememberAppearance(Appearance appearance) throws IOException {
        put(APPEARANCE, appearance.word());
    }

    private void put(String key, String value) throws IOException {
        Properties all = read();
        all.setProperty(key, value);
        Path folder = file.toAbsolutePath().getParent();
        if (folder != null) {
            Files.createDirectories(folder);
        }
        try (Writer out = Files.newBufferedWriter(file, StandardCharsets.UTF_8)) {
            all.store(out, "plateledger: remembered between starts");
        }
    }

    private Properties read() {
        Properties all = new Properties();
        if (Files.isRegularFile(file)) {
            try (Reader in = Files.newBufferedReader(file, StandardCharsets.UTF_8)) {
                all.load(in);
            } catch (IOException | IllegalArgumentException unreadable) {
                return new Properties(); // nothing here is needed to work
            }
        }
        return all;
    }
}
