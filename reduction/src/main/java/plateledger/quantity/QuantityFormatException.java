package plateledger.quantity;

/** A text is not the quantity it should be: says what was found, what was expected and what to do. */
public final class QuantityFormatException extends Exception {
    private static final long serialVersionUID = 1L;

    /** What is wrong with the text. */
    public enum Fault {
        /** There is no number, or one that cannot be read. */
        NUMBER,
        /** The unit is missing or unknown. */
        UNIT,
        /** The unit belongs to another dimension. */
        DIMENSION,
        /** An uncertainty is missing, or stands where none may stand, or is no positive number. */
        UNCERTAINTY,
        /** The number after ± does not say what it is. */
        MEANING
    }

    private final Fault fault;
    private final String found;
    private final String expected;
    private final String remedy;

    QuantityFormatException(Fault fault, String found, String expected, String remedy) {
        super("found " + found + "; expected " + expected + (remedy.isEmpty() ? "" : ". " + remedy));
        this.fault = fault;
        this.found = found;
        this.expected = expected;
        this.remedy = remedy;
    }

    /** What is wrong. */
    public Fault fault() {
        return fault;
    }

    /** What was found. */
    public String found() {
        return found;
    }

    /** What was expected. */
    public String expected() {
        return expected;
    }

    /** What to do. */
    public String remedy() {
        return remedy;
    }
}
