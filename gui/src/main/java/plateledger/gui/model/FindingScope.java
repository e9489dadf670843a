package plateledger.gui.model;

/** Which findings are listed. */
public enum FindingScope {
    /** Those that belong to the chosen run. */
    CHOSEN_RUN("this run"),
    /** All of the campaign. */
    CAMPAIGN("whole campaign");

    private final String word;

    FindingScope(String word) {
        this.word = word;
    }

    /** The words shown. */
    public String word() {
        return word;
    }
}
