package plateledger.reduce;

/** The entries of the run ledger in the order they are printed; column names as in {@code runs.csv}. */
public enum LedgerTerm {
    /** Power at the sense points. */
    ELECTRICAL("Q_electrical_W", "electrical"),
    /** Convected from the heated area. */
    CONVECTION("Q_convection_W", "convection"),
    /** Radiated. */
    RADIATION("Q_radiation_W", "radiation"),
    /** Through the back. */
    BACK("Q_back_W", "back"),
    /** Through the side edges. */
    EDGE("Q_edge_W", "edges"),
    /** Conducted out of the upstream end. */
    NOSE("Q_conduction_nose_W", "nose end"),
    /** Conducted out of the downstream end. */
    TAIL("Q_conduction_tail_W", "tail end"),
    /** Exchanged with a guard heater; zero on a rig without one. */
    GUARD("Q_guard_W", "guard"),
    /** Lost in leads between the sense points and the strips. */
    LEAD("Q_lead_W", "leads"),
    /** Stored. */
    STORAGE("Q_storage_W", "storage"),
    /** Power less all of the above. */
    RESIDUAL("Q_residual_W", "residual");

    private final String column;
    private final String label;

    LedgerTerm(String column, String label) {
        this.column = column;
        this.label = label;
    }

    /** Column name in {@code runs.csv}. */
    public String column() {
        return column;
    }

    /** Word shown. */
    public String label() {
        return label;
    }
}
