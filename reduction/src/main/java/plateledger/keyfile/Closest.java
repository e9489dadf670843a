package plateledger.keyfile;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;

/** The known word that a mistyped one was probably meant to be. */
final class Closest {
    private Closest() {}

    /** The known word with the fewest edits, if these are at most a third of its length (and at least one is allowed). */
    static Optional<String> to(String word, Collection<String> known) {
        return known.stream()
                .filter(candidate -> edits(word, candidate) <= Math.max(1, candidate.length() / 3))
                .min(Comparator.<String>comparingInt(candidate -> edits(word, candidate))
                        .thenComparing(Comparator.naturalOrder()));
    }

    /** Insertions, deletions and substitutions from one word to the other, letters compared without case. */
    private static int edits(String from, String to) {
        String a = from.toLowerCase(Locale.ROOT);
        String b = to.toLowerCase(Locale.ROOT);
        int[] previous = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            previous[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int[] row = new int[b.length() + 1];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int change = previous[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                row[j] = Math.min(change, Math.min(previous[j], row[j - 1]) + 1);
            }
            previous = row;
        }
        return previous[b.length()];
    }
}
