package plateledger.log;

/**
 * How a logger writes its text.
 *
 * @param delimiter field separator: {@code ','}, {@code ';'} or tab
 * @param decimalMark {@code '.'} or {@code ','}
 * @param headerLine line of the column titles, from 1; the lines above are preamble
 * @param unitsRow true if the line after the titles holds units
 * @param time how time is written
 * @param timePattern pattern of an absolute time stamp in {@link java.time.format.DateTimeFormatter} letters; empty for
 *     ISO 8601 and for elapsed time
 * @param startKey for elapsed time: the preamble key after which the start time stands; empty otherwise
 */
public record LogFormat(
        char delimiter,
        char decimalMark,
        int headerLine,
        boolean unitsRow,
        TimeForm time,
        String timePattern,
        String startKey) {
    /** How time is written. */
    public enum TimeForm {
        /** ISO 8601, with or without zone. */
        ISO("iso"),
        /** A pattern of its own, local time. */
        PATTERN("pattern"),
        /** Seconds since a start time in the preamble. */
        ELAPSED_S("elapsed-s");

        private final String word;

        TimeForm(String word) {
            this.word = word;
        }

        /** The word in the campaign file. */
        public String word() {
            return word;
        }
    }
}
