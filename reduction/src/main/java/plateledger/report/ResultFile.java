package plateledger.report;

/**
 * One file to be written.
 *
 * @param name path relative to the output folder, with '/'
 * @param content its bytes, not copied; treat as read-only
 */
public record ResultFile(String name, byte[] content) {
    /** Refuses a name that would leave the folder. */
    public ResultFile {
        if (name.startsWith("/") || name.contains("..") || name.isEmpty()) {
            throw new IllegalArgumentException("not a name inside the output folder: " + name);
        }
    }
}
