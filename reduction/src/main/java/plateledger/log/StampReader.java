package plateledger.log;

/** Turns a time cell into seconds since 1970-01-01T00:00Z on the logger's clock. One instance per file and thread. */
interface StampReader {
    /**
     * Reads one stamp.
     *
     * @param text holds the cell
     * @param offset where it begins
     * @param length its length
     * @param previous the stamp before, s; NaN at the start. Decides which of two hours a repeated local hour is
     * @return s since 1970-01-01T00:00Z, NaN if the cell holds no time of this form
     */
    double seconds(char[] text, int offset, int length, double previous);

    /** True if the last stamp read carried its zone. */
    boolean zoned();

    /** What the cell should hold, for messages. */
    String expected();

    /** Reads a stamp from a string. */
    default double seconds(String text) {
        char[] c = text.toCharArray();
        return seconds(c, 0, c.length, Double.NaN);
    }
}
