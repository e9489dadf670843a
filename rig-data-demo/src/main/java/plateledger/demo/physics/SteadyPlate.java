package plateledger.demo.physics;

/** The plate when all its temperatures rise at one slow common rate (0 if steady), the foam keeping up. */
public final class SteadyPlate {
    private static final int MOST_ROUNDS = 40;
    private static final double TIGHT_W_PER_M2 = 1e-7;

    private final PlateEquations equations;
    private final StreamwiseSystem[] systems;

    /**
     * The plate.
     *
     * @param mesh the panel in cells
     * @param convection at the face
     * @param exchangeFactor F of radiation
     * @param referenceK near the surroundings' temperature, K
     */
    public SteadyPlate(MeshedPanel mesh, Convection convection, double exchangeFactor, double referenceK) {
        equations = new PlateEquations(mesh, convection, exchangeFactor, referenceK);
        systems = equations.factorise(mesh.panel().backWPerM2K());
    }

    /**
     * Solves the plate.
     *
     * @param stripW heat into each strip, W
     * @param around surroundings
     * @param slopeKPerS common rate of rise, K/s
     */
    public PlateState solve(double[] stripW, Surround around, double slopeKPerS) {
        Panel panel = equations.panel();
        double[][] sheet = equations.cells();
        double[][] flux = equations.cells();
        double[][] face = equations.cells();
        double[][] correction = equations.cells();
        double[][] modal = equations.cells();
        double[][] source = equations.cells();
        double[][] stored = equations.cells();
        // A foam that follows a slow rise takes a third of its capacity from the warm side (flat-slab conduction).
        double storing = slopeKPerS * (panel.capacityJPerM3K() * panel.thicknessM() + panel.foamJPerM2K() / 3.0);
        double back = panel.backWPerM2K() * (around.plenumK() - equations.referenceK());
        for (double[] row : stored) {
            java.util.Arrays.fill(row, storing);
        }
        for (int round = 0; round < MOST_ROUNDS; round++) {
            for (double[] row : source) {
                java.util.Arrays.fill(row, back - storing);
            }
            equations.addSources(stripW, around, correction, source);
            equations.solve(systems, source, modal, sheet);
            if (equations.update(sheet, around, correction, flux, face) < TIGHT_W_PER_M2) {
                return equations.state(stripW, around, sheet, flux, face, stored);
            }
        }
        throw new IllegalStateException("radiation did not converge in " + MOST_ROUNDS + " rounds");
    }
}
