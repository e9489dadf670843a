package plateledger.ledger;

/** The fitted sheet of one evaluation: what {@link PlateSolver} leaves behind for the book-keeping. Reused, not shared. */
final class PlateState {
    final double[] rho;
    final double[] sheetK;
    final double[] surfaceK;
    final double[] h;
    final double[] qSurface;
    final double[] surfaceSlope;
    final double[] junctionK;
    double endUpK;
    double endDownK;

    PlateState(int cells, int knots, int junctions) {
        rho = new double[knots];
        sheetK = new double[cells];
        surfaceK = new double[cells];
        h = new double[cells];
        qSurface = new double[cells];
        surfaceSlope = new double[cells];
        junctionK = new double[junctions];
    }

    /** Copies the unknowns of another state as a start. */
    void startFrom(PlateState other) {
        System.arraycopy(other.rho, 0, rho, 0, rho.length);
        System.arraycopy(other.sheetK, 0, sheetK, 0, sheetK.length);
        System.arraycopy(other.surfaceK, 0, surfaceK, 0, surfaceK.length);
        System.arraycopy(other.surfaceSlope, 0, surfaceSlope, 0, surfaceSlope.length);
    }
}
