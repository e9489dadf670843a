package plateledger.reduce;

/** The work was stopped on request; nothing was written. */
public final class CancelledException extends Exception {
    private static final long serialVersionUID = 1L;

    /** A request to stop that was followed. */
    public CancelledException() {
        super("cancelled on request");
    }
}
