package plateledger.campaign;

/** Declared state of the boundary layer over the heated part. */
public enum Regime {
    /** Laminar to the trailing edge. */
    LAMINAR("laminar"),
    /** Turbulent from the trip. */
    TURBULENT("turbulent"),
    /** A product surface with no flat-plate theory of its own. */
    PRODUCT("product");

    private final String word;

    Regime(String word) {
        this.word = word;
    }

    /** The word in the campaign file. */
    public String word() {
        return word;
    }
}
