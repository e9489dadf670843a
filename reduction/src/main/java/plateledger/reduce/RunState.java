package plateledger.reduce;

/** What became of a run. The words are those shown everywhere. */
public enum RunState {
    /** No logs yet. */
    PLANNED("planned"),
    /** Not reduced so far. */
    WAITING("waiting"),
    /** Reduced. */
    REDUCED("reduced"),
    /** No steady window found. */
    NOT_STEADY("not steady"),
    /** Takes no part, with a reason: a person said so, or its type is not used. */
    LEFT_OUT("left out"),
    /** Input cannot be used. */
    REFUSED("refused"),
    /** Something upstream changed since. */
    OUT_OF_DATE("out of date");

    private final String word;

    RunState(String word) {
        this.word = word;
    }

    /** The word shown. */
    public String word() {
        return word;
    }
}
