package plateledger.uncertainty;

/** The shape of what is known about an input (JCGM 100:2008, 4.3). */
public enum Distribution {
    /** Known exactly. */
    EXACT("exact"),
    /** Normal. */
    NORMAL("normal"),
    /** Scaled and shifted t with the input's degrees of freedom. */
    T("t"),
    /** Rectangular, half-width √3 u. */
    RECTANGULAR("rectangular");

    private final String word;

    Distribution(String word) {
        this.word = word;
    }

    /** The word printed in budgets. */
    public String word() {
        return word;
    }
}
