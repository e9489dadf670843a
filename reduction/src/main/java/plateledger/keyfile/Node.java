package plateledger.keyfile;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import plateledger.finding.Place;

/** A piece of a key file with the place and the full name of the key that holds it. */
sealed interface Node {
    /** Where its key stands. */
    Place place();

    /** Full dotted name, e.g. {@code plate.baseline.heater[2].from}; elements count from 1. */
    String path();

    /** A text, number, date or truth value. */
    record Value(Object raw, Place place, String path) implements Node {}

    /** An array. */
    record Items(List<Node> items, Place place, String path) implements Node {
        public Items {
            items = List.copyOf(items);
        }
    }

    /**
     * A table, in the order of the file.
     *
     * @param derived true if it was completed from another table, so that a key missing here is missing there and is
     *     reported there
     */
    record Table(Map<String, Node> entries, Place place, String path, boolean derived) implements Node {
        public Table {
            entries = Collections.unmodifiableMap(new LinkedHashMap<>(entries));
        }

        /** This table with all that it does not state taken from another: tables merged, arrays replaced whole. */
        Table over(Table base) {
            Map<String, Node> merged = new LinkedHashMap<>(base.entries);
            entries.forEach((key, own) -> {
                Node other = base.entries.get(key);
                merged.put(key, own instanceof Table o && other instanceof Table b ? o.over(b) : own);
            });
            return new Table(merged, place, path, true);
        }

        /** This table, keys missing in it or in the tables inside not to be reported. */
        Table muted() {
            Map<String, Node> inner = new LinkedHashMap<>(entries);
            inner.replaceAll((key, value) -> value instanceof Table table ? table.muted() : value);
            return new Table(inner, place, path, true);
        }

        /** The name of a key of this table. */
        String pathOf(String key) {
            return path.isEmpty() ? key : path + "." + key;
        }
    }
}
