package plateledger.demo.physics;

/** The plate when all its temperatures rise at one slow common rate (0 if steady), the foam keeping up. */
public final class SteadyPlate {
    private static final int MOST_ROUNDS = 60;
    private static final double TIGHT_W_PER_M2 = 1e-8;

    private final PlateEquations equations;
    private final StreamwiseSystem system;

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
        system = equations.factorise(mesh.panel().backWPerM2K());
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
        int n = equations.along();
        double[] sheet = new double[n];
        double[] flux = new double[n];
        double[] face = new double[n];
        double[] correction = new double[n];
        double[] stored = new double[n];
        // A foam that follows a slow rise takes a third of its capacity from the warm side (flat-slab conduction).
        double storing = slopeKPerS * (panel.capacityJPerM3K() * panel.thicknessM() + panel.foamJPerM2K() / 3.0);
        double back = panel.backWPerM2K() * (around.plenumK() - equations.referenceK());
        java.util.Arrays.fill(stored, storing);
        for (int round = 0; round < MOST_ROUNDS; round++) {
            java.util.Arrays.fill(sheet, back - storing);
            equations.addSources(stripW, around, correction, sheet);
            system.solve(sheet);
            if (equations.update(sheet, around, correction, flux, face) < TIGHT_W_PER_M2) {
                return equations.state(stripW, around, sheet, flux, face, stored);
            }
        }
        throw new IllegalStateException("radiation did not converge in " + MOST_ROUNDS + " rounds");
    }

    /** Solves a covered plate whose strips are held at one centre-line temperature, steady. */
    public PlateState solveHeld(double centreK, Surround around) {
        HeldStrips held = new HeldStrips(equations, system);
        double[] idle = new double[equations.along()];
        java.util.Arrays.fill(idle, equations.panel().backWPerM2K() * (around.plenumK() - equations.referenceK()));
        equations.addSources(new double[held.strips()], around, new double[equations.along()], idle);
        system.solve(idle);
        return solve(held.powers(idle, centreK, around), around, 0.0);
    }
}
