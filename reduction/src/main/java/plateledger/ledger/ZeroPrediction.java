package plateledger.ledger;

/**
 * What the junctions of an unheated plate in the stream should read: the ledger's own balance without power (recovery,
 * exchange with the walls, back, edges, ends, lag to a drift), METHODS.md eq. (Z-1). The reading less this prediction is
 * the junction's offset, so the zero run does not pretend that the plate is at the stream's temperature.
 */
public final class ZeroPrediction {
    private static final int PASSES = 25;
    private static final double MARGIN_K = 8.0;

    private final RunSetting setting;
    private final RunLayout layout;
    private final PlateGrid grid;
    private final PlateSolver solver;
    private final double lowK;
    private final double highK;

    private ZeroPrediction(RunSetting setting, double[] best) {
        this.setting = setting;
        this.layout = RunModel.layout(setting.plate());
        this.grid = PlateGrid.of(setting.plate());
        double air = best[layout.at(RunLayout.In.AIR_TEMPERATURE)];
        lowK = air - MARGIN_K;
        highK = air + MARGIN_K;
        double[] z = setting.plate().thermocouples().stream()
                .mapToDouble(t -> t.zM())
                .toArray();
        Stream stream = new Stream(best, layout, lowK, highK);
        double[] h = RigTheory.uniformTemperatureH(setting, layout, grid, best, stream);
        solver = new PlateSolver(grid, layout, h, z, new double[z.length], 0.0);
    }

    /** Freezes grid and expected h at the best estimate of the zero run's inputs. */
    public static ZeroPrediction configure(RunSetting setting, double[] best) {
        return new ZeroPrediction(setting, best);
    }

    /**
     * Predicts the junction temperatures.
     *
     * @param in inputs in layout order (powers zero); not written to
     * @param hFactor factor on the expected h, dimensionless; its uncertainty stands for not knowing h
     * @param junctionK predicted temperature of each junction, K; overwritten
     */
    public void evaluate(double[] in, double hFactor, double[] junctionK) {
        Stream stream = new Stream(in, layout, lowK, highK);
        double reference = RunModel.adiabaticWall(in, layout, stream, setting.flow());
        PlateState state = new PlateState(grid.cells, grid.knots.length, layout.junctions());
        java.util.Arrays.fill(state.rho, hFactor);
        java.util.Arrays.fill(state.sheetK, reference);
        java.util.Arrays.fill(state.surfaceK, reference);
        solver.forward(in, reference, state, PASSES);
        System.arraycopy(state.junctionK, 0, junctionK, 0, junctionK.length);
    }
}
