package plateledger.keyfile;

import java.util.HashSet;
import java.util.Optional;
import java.util.Set;
import plateledger.finding.Finding;
import plateledger.finding.Level;

/** Completes a table from the one it says it is like, and that from the one which it is like in turn. */
final class Likeness {
    private static final String LIKE = "like";

    private Likeness() {}

    /** The table completed; where the chain is broken, what is there, with a finding. */
    static Node.Table complete(Node.Table own, Node.Table all, KeyFile file) {
        return complete(own, all, file, new HashSet<>());
    }

    private static Node.Table complete(Node.Table own, Node.Table all, KeyFile file, Set<String> seen) {
        Optional<String> base = base(own);
        if (base.isEmpty()) {
            return own;
        }
        seen.add(own.path());
        if (!(all.entries().get(base.get()) instanceof Node.Table other)) {
            String names = String.join(", ", all.entries().keySet());
            refuse(own, file, "\"" + base.get() + "\", which is not there", "one of: " + names);
            return own.muted();
        }
        if (seen.contains(other.path())) {
            refuse(
                    own,
                    file,
                    "\"" + base.get() + "\", which closes a ring",
                    "a table that is not like this one in turn");
            return own.muted();
        }
        return own.over(complete(other, all, file, seen));
    }

    private static Optional<String> base(Node.Table table) {
        return table.entries().get(LIKE) instanceof Node.Value value && value.raw() instanceof String text
                ? Optional.of(text)
                : Optional.empty();
    }

    private static void refuse(Node.Table own, KeyFile file, String found, String expected) {
        Node like = own.entries().getOrDefault(LIKE, own);
        file.add(new Finding("KEY-LIKE", Level.STOP, like.place(), like.path(), found, expected, "", ""));
    }
}
