package plateledger.finding;

/**
 * Where a finding lies.
 *
 * @param file path relative to the campaign folder with '/' separators, or an empty string where there is no file
 * @param line line from 1; 0 where it does not apply
 * @param column column (in a text file) or cell number (in a table) from 1; 0 where it does not apply
 */
public record Place(String file, long line, int column) {
    /** No place. */
    public static final Place NOWHERE = new Place("", 0, 0);

    /** A whole file. */
    public static Place of(String file) {
        return new Place(file, 0, 0);
    }

    /** {@code file:line:column} without the parts that do not apply. */
    @Override
    public String toString() {
        return file + (line > 0 ? ":" + line : "") + (line > 0 && column > 0 ? ":" + column : "");
    }
}
