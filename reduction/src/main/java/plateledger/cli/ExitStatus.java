package plateledger.cli;

/** What the program's exit status means. */
public final class ExitStatus {
    /** Done. */
    public static final int DONE = 0;
    /** Written (or checked) with at least one finding at stop, or with a run that was not reduced. */
    public static final int DONE_WITH_STOPS = 1;
    /** Nothing written: wrong usage, input that cannot be used, output not writable. */
    public static final int NOTHING_WRITTEN = 2;
    /** A fault in the program. */
    public static final int FAULT = 3;

    private ExitStatus() {}
}
