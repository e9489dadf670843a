package plateledger.keyfile;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.BiFunction;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;

/**
 * One table of a key file. Each way of asking remembers the key, so that what was never asked for is known to be unknown.
 * A key that is missing or wrong leaves a finding and a placeholder value; ask {@link #sound} before using such values
 * for further checks.
 */
public final class KeyTable {
    private final KeyFile file;
    private final Node.Table node;
    private final String pattern;
    private final Runnable onFault;
    private final Set<String> asked = new TreeSet<>();
    private final Set<String> faulty = new HashSet<>();
    private final Set<String> missing = new HashSet<>();
    private boolean anyKey;

    KeyTable(KeyFile file, Node.Table node, String pattern, Runnable onFault) {
        this.file = file;
        this.node = node;
        this.pattern = pattern;
        this.onFault = onFault;
    }

    /** The value of a key that must be there. */
    public <T> T need(String key, Form<T> form) {
        ask(key, form.type(), form.unit(), Key.REQUIRED);
        Node found = node.entries().get(key);
        if (found == null) {
            missing(key, form.expected(), "Add " + key + (node.path().isEmpty() ? "." : " to " + node.path() + "."));
            return form.placeholder();
        }
        return read(key, found, form).orElse(form.placeholder());
    }

    /** The value of a key, or the fallback where it is absent; {@code fallbackWord} is how the fallback is written. */
    public <T> T take(String key, Form<T> form, T fallback, String fallbackWord) {
        ask(key, form.type(), form.unit(), fallbackWord);
        Node found = node.entries().get(key);
        return found == null ? fallback : read(key, found, form).orElse(fallback);
    }

    /** The value of a key that may be absent. */
    public <T> Optional<T> find(String key, Form<T> form) {
        ask(key, form.type(), form.unit(), Key.NONE);
        Node found = node.entries().get(key);
        return found == null ? Optional.empty() : read(key, found, form);
    }

    /** A table that must be there. */
    public <T> T needTable(String key, Function<KeyTable, T> reader) {
        ask(key, "table", "", Key.REQUIRED);
        Node found = node.entries().get(key);
        if (found == null) {
            missing(key, "a table", "Add the table [" + node.pathOf(key) + "] with its keys.");
        }
        return reader.apply(child(key, found));
    }

    /** A table that may be absent. */
    public <T> Optional<T> findTable(String key, Function<KeyTable, T> reader) {
        ask(key, "table", "", Key.NONE);
        Node found = node.entries().get(key);
        return found == null && !file.isDry() ? Optional.empty() : Optional.of(reader.apply(child(key, found)));
    }

    /** The elements of an array of tables that must be there, at least one. */
    public <T> List<T> needTables(String key, Function<KeyTable, T> reader) {
        if (!node.entries().containsKey(key)) {
            missing(key, "one table or more", "Add tables [[" + node.pathOf(key) + "]].");
        }
        return tables(key, Key.REQUIRED, reader);
    }

    /** The elements of an array of tables, none where it is absent. */
    public <T> List<T> findTables(String key, Function<KeyTable, T> reader) {
        return tables(key, Key.NONE, reader);
    }

    /** The tables of a table whose keys are names that the user chooses, in the order of the file; at least one. */
    public <T> List<T> needNamed(String key, String placeholderName, BiFunction<String, KeyTable, T> reader) {
        missingNamed(key, placeholderName);
        return family(key, Key.REQUIRED, placeholderName, Optional.empty(), reader);
    }

    /** As {@link #needNamed}, none where the key is absent. */
    public <T> List<T> findNamed(String key, String placeholderName, BiFunction<String, KeyTable, T> reader) {
        return family(key, Key.NONE, placeholderName, Optional.empty(), reader);
    }

    /**
     * As {@link #needNamed}, where a table may say by the key {@code like} that all it does not state is as in another of
     * these tables: inner tables are merged, arrays are replaced as a whole.
     */
    public <T> List<T> needNamedLike(String key, String placeholderName, BiFunction<String, KeyTable, T> reader) {
        missingNamed(key, placeholderName);
        return family(key, Key.REQUIRED, placeholderName, Optional.of("like"), reader);
    }

    /** A table of texts whose keys are names that the user chooses; empty where it is absent. */
    public Map<String, String> textsByName(String key, String placeholderName) {
        return findTable(key, table -> table.texts(placeholderName)).orElse(Map.of());
    }

    /** True if the key is stated, or taken over from a table that this one is like. */
    public boolean has(String key) {
        return node.entries().containsKey(key);
    }

    /** Where a key stands; where the table stands if the key is absent. */
    public Place place(String key) {
        Node found = node.entries().get(key);
        return found == null ? node.place() : found.place();
    }

    /** Where the table stands. */
    public Place place() {
        return node.place();
    }

    /** Full name of the table. */
    public String path() {
        return node.path();
    }

    /** True if none of these keys, asked for before, left a finding, nor anything in the tables they hold. */
    public boolean sound(String... keys) {
        return !file.isDry() && Collections.disjoint(faulty, List.of(keys));
    }

    /** True if no key asked for left a finding, in this table and those inside. */
    public boolean sound() {
        return !file.isDry() && faulty.isEmpty();
    }

    /** Refuses the value of a key, unless it is refused already. */
    public void refuse(String key, String id, String expected, String remedy) {
        Node found = node.entries().get(key);
        refuse(key, id, found == null ? "nothing" : Form.shown(found), expected, remedy);
    }

    /** Refuses the value of a key with words of one's own for what was found, unless it is refused already. */
    public void refuse(String key, String id, String foundWords, String expected, String remedy) {
        if (sound(key)) {
            fault(key);
            Node found = node.entries().get(key);
            String subject = found == null ? node.pathOf(key) : found.path();
            file.add(new Finding(id, Level.STOP, place(key), subject, foundWords, expected, remedy, ""));
        }
    }

    /** Refuses the value of a sound key unless a condition holds. */
    public void require(boolean holds, String key, String expected) {
        if (!holds) {
            refuse(key, "KEY-RANGE", expected, "");
        }
    }

    Set<String> asked() {
        return Collections.unmodifiableSet(asked);
    }

    Map<String, Node> unasked() {
        if (anyKey) {
            return Map.of();
        }
        Map<String, Node> rest = new LinkedHashMap<>(node.entries());
        rest.keySet().removeAll(asked);
        return rest;
    }

    private void fault(String key) {
        faulty.add(key);
        onFault.run();
    }

    private KeyTable open(String key, Node.Table inner, String innerPattern) {
        return file.open(inner, innerPattern, () -> fault(key));
    }

    private void ask(String key, String type, String unit, String fallback) {
        asked.add(key);
        file.accept(new Key(patternOf(key), type, unit, fallback));
    }

    private String patternOf(String key) {
        return pattern.isEmpty() ? key : pattern + "." + key;
    }

    private <T> Optional<T> read(String key, Node found, Form<T> form) {
        try {
            return Optional.of(form.read(found));
        } catch (Refusal e) {
            refuse(key, e.id(), e.found(), e.expected(), e.remedy());
            return Optional.empty();
        }
    }

    private void missing(String key, String expected, String remedy) {
        if (node.derived()) {
            fault(key);
        } else {
            refuse(key, "KEY-MISSING", "no such key", expected, remedy);
            missing.add(key);
        }
    }

    /** Takes back that a key is missing, since it stands there mistyped. */
    void isMistyped(String key) {
        if (missing.remove(key)) {
            file.withdraw("KEY-MISSING", node.pathOf(key));
        }
    }

    private void missingNamed(String key, String placeholderName) {
        if (!node.entries().containsKey(key)) {
            missing(key, "one table or more", "Add a table [" + node.pathOf(key) + ".<" + placeholderName + ">].");
        }
    }

    private KeyTable child(String key, @Nullable Node found) {
        if (found instanceof Node.Table table) {
            return open(key, table, patternOf(key));
        }
        if (found != null) {
            refuse(key, "KEY-TYPE", "a table [" + node.pathOf(key) + "]", "");
        }
        return open(key, absent(node.pathOf(key)), patternOf(key));
    }

    private Node.Table absent(String path) {
        return new Node.Table(Map.of(), node.place(), path, true);
    }

    private <T> List<T> tables(String key, String fallback, Function<KeyTable, T> reader) {
        ask(key, "tables", "", fallback);
        String inner = patternOf(key) + "[]";
        List<T> read = new ArrayList<>();
        Node found = node.entries().get(key);
        if (found instanceof Node.Items items) {
            for (Node item : items.items()) {
                if (item instanceof Node.Table table) {
                    read.add(reader.apply(open(key, table, inner)));
                } else {
                    refuse(key, "KEY-TYPE", "tables [[" + node.pathOf(key) + "]]", "");
                }
            }
        } else if (found != null) {
            refuse(key, "KEY-TYPE", "tables [[" + node.pathOf(key) + "]] with two brackets", "");
        } else if (file.isDry()) {
            read.add(reader.apply(open(key, absent(node.pathOf(key)), inner)));
        }
        return List.copyOf(read);
    }

    private <T> List<T> family(
            String key,
            String fallback,
            String placeholderName,
            Optional<String> like,
            BiFunction<String, KeyTable, T> reader) {
        ask(key, "named tables", "", fallback);
        String inner = patternOf(key) + ".<" + placeholderName + ">";
        List<T> read = new ArrayList<>();
        Node found = node.entries().get(key);
        if (found instanceof Node.Table all) {
            all.entries().forEach((name, member) -> {
                if (member instanceof Node.Table own) {
                    KeyTable table = open(key, like.isPresent() ? Likeness.complete(own, all, file) : own, inner);
                    like.ifPresent(word -> table.find(word, Form.text()));
                    read.add(reader.apply(name, table));
                } else {
                    refuse(key, "KEY-TYPE", Form.shown(member), "a table [" + all.pathOf(name) + "]", "");
                }
            });
        } else if (found != null) {
            refuse(key, "KEY-TYPE", "tables [" + node.pathOf(key) + ".<" + placeholderName + ">]", "");
        } else if (file.isDry()) {
            KeyTable table = open(key, absent(node.pathOf(key)), inner);
            like.ifPresent(word -> table.find(word, Form.text()));
            read.add(reader.apply(placeholderName, table));
        }
        return List.copyOf(read);
    }

    private Map<String, String> texts(String placeholderName) {
        anyKey = true;
        file.accept(new Key(patternOf("<" + placeholderName + ">"), "text", "", Key.NONE));
        Map<String, String> read = new LinkedHashMap<>();
        node.entries().forEach((name, value) -> read(name, value, Form.text()).ifPresent(text -> read.put(name, text)));
        return read;
    }
}
