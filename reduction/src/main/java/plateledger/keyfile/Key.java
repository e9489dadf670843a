package plateledger.keyfile;

/**
 * A key that a reader accepts.
 *
 * @param path full name with {@code <…>} for a name the user chooses and {@code []} for each element of an array, e.g.
 *     {@code plate.<id>.heater[].from}
 * @param type what it holds, in words: {@code text}, {@code measured}, {@code setting}, {@code number}, {@code table} …
 * @param unit the SI unit of a quantity or the words of a choice; empty where neither applies
 * @param fallback what is taken where the key is absent: {@code required}, {@code none} or the value
 */
public record Key(String path, String type, String unit, String fallback) {
    /** The {@link #fallback} of a key that must be there. */
    public static final String REQUIRED = "required";
    /** The {@link #fallback} of a key that may be absent without anything taking its place. */
    public static final String NONE = "none";
}
