package plateledger.gui.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class UserSettingsTest {
    @TempDir
    Path folder = Path.of(".");

    @Test
    void remembersCampaignAndAppearance() throws IOException {
        Path file = folder.resolve("deep").resolve("window.properties");
        Path campaign = Files.createDirectories(folder.resolve("Tür – door"));
        new UserSettings(file).rememberCampaign(campaign);
        new UserSettings(file).rememberAppearance(Appearance.DARK);

        UserSettings again = new UserSettings(file);
        assertEquals(Optional.of(campaign.toAbsolutePath()), again.lastCampaign());
        assertEquals(Appearance.DARK, again.appearance());
    }

    @Test
    void aMissingOrDamagedFileCountsAsEmpty() throws IOException {
        assertEquals(Optional.empty(), new UserSettings(folder.resolve("none")).lastCampaign());
        Path damaged = Files.write(folder.resolve("damaged"), new byte[] {(byte) 0xff, (byte) 0xfe, 0x5c, 0x75, 0x7a});
        assertEquals(Appearance.LIGHT, new UserSettings(damaged).appearance());
    }

    @Test
    void aCampaignThatIsGoneIsNotOffered() throws IOException {
        UserSettings settings = new UserSettings(folder.resolve("s"));
        settings.rememberCampaign(folder.resolve("gone"));
        assertEquals(Optional.empty(), settings.lastCampaign());
    }

    @Test
    void whatCannotBeWrittenIsTold() throws IOException {
        Path file = Files.createFile(folder.resolve("a-file"));
        UserSettings settings = new UserSettings(file.resolve("below").resolve("window.properties"));
        assertThrows(IOException.class, () -> settings.rememberAppearance(Appearance.DARK));
    }

    @Test
    void liesWhereTheSystemKeepsSuchFiles() {
        Path home = Path.of("home");
        Path end = Path.of("plateledger", "window.properties");
        assertEquals(home.resolve(".config").resolve(end), UserSettings.fileFor("Linux", "home", Map.of()));
        assertEquals(
                Path.of("conf").resolve(end), UserSettings.fileFor("Linux", "home", Map.of("XDG_CONFIG_HOME", "conf")));
        assertEquals(
                Path.of("roaming").resolve(end),
                UserSettings.fileFor("Windows 11", "home", Map.of("APPDATA", "roaming")));
        assertEquals(
                home.resolve("Library").resolve("Application Support").resolve(end),
                UserSettings.fileFor("Mac OS X", "home", Map.of()));
    }
}
