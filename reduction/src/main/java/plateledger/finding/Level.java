package plateledger.finding;

/** How grave a finding is, gravest first. The words are those printed. */
public enum Level {
    /** A limit that protects people, the rig or the result is passed, or the result cannot be had. */
    STOP("stop"),
    /** Usable only with the measure named in the finding. */
    CAUTION("caution"),
    /** Worth knowing. */
    NOTE("note"),
    /** An input is missing, so the check could not be made; never counted as passed. */
    NOT_CHECKED("not checked");

    private final String word;

    Level(String word) {
        this.word = word;
    }

    /** The word printed for this level. */
    public String word() {
        return word;
    }
}
