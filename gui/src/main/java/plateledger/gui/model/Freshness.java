package plateledger.gui.model;

/** Whether the result shown belongs to the files as last read. */
public enum Freshness {
    /** The result of the last reading of the campaign. */
    CURRENT,
    /** A result from before: a new one is being computed, or the campaign could not be reduced again. */
    FORMER
}
