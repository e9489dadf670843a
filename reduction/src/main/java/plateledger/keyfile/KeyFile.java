package plateledger.keyfile;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.tomlj.Toml;
import org.tomlj.TomlArray;
import org.tomlj.TomlParseError;
import org.tomlj.TomlParseResult;
import org.tomlj.TomlPosition;
import org.tomlj.TomlTable;
import org.tomlj.TomlVersion;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;

/**
 * One key file being read. Ask for every key through {@link #root()}, then call {@link #refuseUnknownKeys()}: what
 * nobody asked for is unknown. Findings go to the collection given at the start; equal ones are dropped. Not for use by
 * several threads.
 */
public final class KeyFile {
    private static final int CLOSE_ENOUGH_TO_LIST = 12; // a longer list of known keys helps nobody

    private final Node.Table root;
    private final boolean dry;
    private final Collection<Finding> findings;
    private final Map<String, Key> accepted = new LinkedHashMap<>();
    private final List<KeyTable> opened = new ArrayList<>();

    private KeyFile(Node.Table root, boolean dry, Collection<Finding> findings) {
        this.root = root;
        this.dry = dry;
        this.findings = findings;
    }

    /**
     * Reads a file of a folder.
     *
     * @param folder the campaign folder
     * @param name name of the file in it, shown in places
     * @param findings where findings go, best a set that keeps its order
     * @return the file; empty if it is missing, no UTF-8 text or no TOML, with findings that say so
     */
    public static Optional<KeyFile> read(Path folder, String name, Collection<Finding> findings) {
        return Decoding.text(folder.resolve(name), name, findings).flatMap(text -> parse(text, name, findings));
    }

    /** Reads a text as if it were the file of that name. */
    public static Optional<KeyFile> parse(String text, String name, Collection<Finding> findings) {
        TomlParseResult parsed = Toml.parse(text, TomlVersion.LATEST);
        for (TomlParseError error : parsed.errors()) {
            findings.add(new Finding(
                    "FILE-SYNTAX",
                    Level.STOP,
                    place(name, error.position()),
                    name,
                    String.valueOf(error.getMessage()),
                    "TOML: key = value, one per line, texts and quantities in quotation marks",
                    "Correct this line.",
                    ""));
        }
        return parsed.hasErrors()
                ? Optional.empty()
                : Optional.of(new KeyFile(table(parsed, name, Place.of(name), ""), false, findings));
    }

    /**
     * An empty file for asking a reader which keys it accepts: every table, named or not, is visited once though it is
     * absent, and nothing is refused. Give it to the reader and then ask {@link #accepted()}.
     */
    public static KeyFile dry() {
        return new KeyFile(new Node.Table(Map.of(), Place.NOWHERE, "", true), true, new ArrayList<>());
    }

    /** The table at the top. */
    public KeyTable root() {
        return open(root, "", () -> {});
    }

    /** The keys asked for until now, in the order of asking. */
    public List<Key> accepted() {
        return List.copyOf(accepted.values());
    }

    /** Adds a finding for every key that nobody asked for, with the closest known key. */
    public void refuseUnknownKeys() {
        opened.forEach(table -> table.unasked().forEach((key, node) -> unknown(table, key, node)));
    }

    private void unknown(KeyTable table, String key, Node node) {
        Set<String> known = new TreeSet<>(table.asked());
        String expected = known.size() <= CLOSE_ENOUGH_TO_LIST ? "one of: " + String.join(", ", known) : "a known key";
        Optional<String> meant = Closest.to(key, known);
        meant.ifPresent(table::isMistyped);
        String remedy = meant.map(close -> "Did you mean " + close + "?")
                .orElse("Remove it; the manual of campaign files lists all keys.");
        add(new Finding("KEY-UNKNOWN", Level.STOP, node.place(), node.path(), "unknown key", expected, remedy, ""));
    }

    KeyTable open(Node.Table table, String pattern, Runnable onFault) {
        KeyTable opening = new KeyTable(this, table, pattern, onFault);
        opened.add(opening);
        return opening;
    }

    boolean isDry() {
        return dry;
    }

    void accept(Key key) {
        accepted.putIfAbsent(key.path(), key);
    }

    void add(Finding finding) {
        if (!findings.contains(finding)) {
            findings.add(finding);
        }
    }

    void withdraw(String id, String subject) {
        findings.removeIf(
                finding -> finding.id().equals(id) && finding.subject().equals(subject));
    }

    private static Node.Table table(TomlTable table, String file, Place place, String path) {
        Map<String, Node> entries = new LinkedHashMap<>();
        for (String key : table.keySet()) {
            Object raw = table.get(List.of(key));
            TomlPosition position = table.inputPositionOf(List.of(key));
            if (raw != null && position != null) {
                String name = path.isEmpty() ? key : path + "." + key;
                entries.put(key, node(raw, file, place(file, position), name));
            }
        }
        return new Node.Table(entries, place, path, false);
    }

    private static Node node(Object raw, String file, Place place, String path) {
        if (raw instanceof TomlTable inner) {
            return table(inner, file, place, path);
        }
        if (raw instanceof TomlArray array) {
            List<Node> items = new ArrayList<>();
            for (int i = 0; i < array.size(); i++) {
                TomlPosition position = array.inputPositionOf(i);
                Place at = position == null ? place : place(file, position);
                Object item = array.get(i);
                if (item != null) {
                    items.add(node(item, file, at, path + "[" + (i + 1) + "]"));
                }
            }
            return new Node.Items(items, place, path);
        }
        return new Node.Value(raw, place, path);
    }

    private static Place place(String file, TomlPosition position) {
        return new Place(file, position.line(), position.column());
    }
}
