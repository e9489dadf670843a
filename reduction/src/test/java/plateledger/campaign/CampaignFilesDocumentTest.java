package plateledger.campaign;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.tomlj.Toml;
import org.tomlj.TomlArray;
import org.tomlj.TomlTable;
import plateledger.keyfile.Key;
import plateledger.quantity.Unit;
import plateledger.rig.InstrumentReader;
import plateledger.rig.RigReader;

/** The manual of campaign files says what the readers do: same keys, types, units and defaults, in both directions. */
final class CampaignFilesDocumentTest {
    private static final Path DOCUMENT = Path.of("docs/CAMPAIGN-FILES.md");

    private enum File {
        CAMPAIGN(CampaignReader.FILE, CampaignReader.keys()),
        RIG(RigReader.FILE, RigReader.keys()),
        INSTRUMENTS(InstrumentReader.FILE, InstrumentReader.keys());

        private final String file;

        @SuppressWarnings("ImmutableEnumChecker") // List.copyOf of records of texts
        private final List<Key> keys;

        File(String file, List<Key> keys) {
            this.file = file;
            this.keys = List.copyOf(keys);
        }
    }

    @ParameterizedTest
    @EnumSource
    void keysTypesUnitsAndDefaultsAreThoseOfTheReader(File file) throws IOException {
        Set<String> documented = new TreeSet<>();
        for (List<String> cells : rows("## " + file.file)) {
            documented.add(String.join(" | ", cells.subList(0, 4)));
        }
        Set<String> accepted = new TreeSet<>();
        for (Key key : file.keys) {
            accepted.add(String.join(" | ", "`" + key.path() + "`", key.type(), key.unit(), key.fallback()));
        }
        assertTrue(accepted.size() > 10, "the reader lists its keys");
        assertEquals(String.join("\n", accepted), String.join("\n", documented));
    }

    @ParameterizedTest
    @EnumSource
    void everyKeyHasAMeaningAndStandsInTheExample(File file) throws IOException {
        Set<String> used = new TreeSet<>();
        for (Key key : file.keys) {
            used.add(key.path());
        }
        used.removeAll(used(Toml.parse(block(file.file)), "", new TreeSet<>()));
        used.removeIf(path -> path.contains("<")); // named tables: looked at below, by the last part
        assertEquals(Set.of(), used);
        for (List<String> cells : rows("## " + file.file)) {
            assertTrue(cells.get(4).length() > 2, cells.toString());
        }
    }

    /** Keys inside named tables, by their last part, since the name in between is free. */
    @ParameterizedTest
    @EnumSource
    void keysOfNamedTablesStandInTheExample(File file) throws IOException {
        Set<String> parts = new TreeSet<>();
        for (String path : used(Toml.parse(block(file.file)), "", new TreeSet<>())) {
            parts.add(path.substring(path.lastIndexOf('.') + 1));
        }
        for (Key key : file.keys) {
            String last = key.path().substring(key.path().lastIndexOf('.') + 1);
            assertTrue(last.startsWith("<") || parts.contains(last), key.path());
        }
    }

    @ParameterizedTest
    @EnumSource
    void theExampleOfTheDocumentIsTheOneThatIsTested(File file) throws IOException {
        assertEquals(Files.readString(ExampleFolder.EXAMPLE.resolve(file.file)), block(file.file));
    }

    @Test
    void unitsAreThoseOfTheProgram() throws IOException {
        Set<String> documented = new TreeSet<>();
        rows("## Units").forEach(cells -> documented.add(String.join(" | ", cells)));
        Set<String> known = new TreeSet<>();
        for (Unit unit : Unit.values()) {
            List<String> other =
                    unit.otherSpellings().stream().map(s -> "`" + s + "`").toList();
            known.add("`" + unit.symbol() + "` | " + String.join(", ", other) + " | "
                    + unit.dimension().word());
        }
        assertEquals(String.join("\n", known), String.join("\n", documented));
    }

    private static Set<String> used(TomlTable table, String path, Set<String> found) {
        for (String key : table.keySet()) {
            String own = path.isEmpty() ? key : path + "." + key;
            found.add(own);
            Object value = table.get(List.of(key));
            if (value instanceof TomlTable inner) {
                used(inner, own, found);
            } else if (value instanceof TomlArray array) {
                for (int i = 0; i < array.size(); i++) {
                    if (array.get(i) instanceof TomlTable inner) {
                        used(inner, own + "[]", found);
                    }
                }
            }
        }
        return found;
    }

    /** The cells of the table rows between a heading and the next one of the same level. */
    private static List<List<String>> rows(String heading) throws IOException {
        List<List<String>> rows = new ArrayList<>();
        for (String line : section(heading).lines().toList()) {
            if (line.startsWith("| `")) {
                List<String> cells =
                        List.of(line.substring(1, line.length() - 1).split("\\|", -1));
                rows.add(cells.stream().map(String::strip).toList());
            }
        }
        assertTrue(rows.size() > 1, () -> "no table under " + heading);
        return rows;
    }

    private static String block(String file) throws IOException {
        String section = section("### " + file);
        int start = section.indexOf("```toml\n") + "```toml\n".length();
        return section.substring(start, section.indexOf("```", start));
    }

    private static String section(String heading) throws IOException {
        String text = Files.readString(DOCUMENT);
        int start = text.indexOf("\n" + heading + "\n");
        assertTrue(start >= 0, () -> "no heading " + heading);
        int end = text.indexOf("\n" + heading.substring(0, heading.indexOf(' ')) + " ", start + heading.length());
        return end < 0 ? text.substring(start) : text.substring(start, end);
    }
}
