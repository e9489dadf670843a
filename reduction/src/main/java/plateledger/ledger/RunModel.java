package plateledger.ledger;

import plateledger.ledger.RunLayout.In;
import plateledger.rig.Plate;

/**
 * The physics of one heated run: scalar inputs to booked heat, h, Nu, Re, Pr and theory. Same input, same output; keeps
 * only choices frozen at the best estimate (grid, smoothing, start of the iteration), so threads may share one instance.
 * Equations: METHODS.md, The heat ledger.
 */
public final class RunModel {
    private static final int PASSES = 12;
    private static final double FILM_MARGIN_K = 6.0;

    final RunSetting setting;
    final RunLayout layout;
    final PlateGrid grid;
    private final PlateSolver solver;
    private final PlateState start;
    final int[] stationJunction;
    private final double lowK;
    private final double highK;
    private final double effectiveParameters;
    private final double chiSquare;
    private final int used;
    final RigTheory theory;

    private RunModel(RunSetting setting, Frozen frozen) {
        this.setting = setting;
        this.layout = frozen.layout;
        this.grid = frozen.grid;
        this.solver = frozen.solver;
        this.start = frozen.state;
        this.stationJunction = stationJunctions(setting.plate());
        this.lowK = frozen.lowK;
        this.highK = frozen.highK;
        this.effectiveParameters = frozen.effectiveParameters;
        this.chiSquare = frozen.chiSquare;
        this.used = frozen.used;
        this.theory = frozen.theory;
    }

    /** The layout of the input and output vectors of a plate. */
    public static RunLayout layout(Plate plate) {
        return new RunLayout(
                plate.heaters().size(),
                plate.thermocouples().size(),
                plate.stations().size());
    }

    /** Positions of the stations in the plate's list of junctions, in order along the flow. */
    public static int[] stationJunctions(Plate plate) {
        return plate.stations().stream()
                .mapToInt(t -> plate.thermocouples().indexOf(t))
                .toArray();
    }

    /**
     * Freezes the choices that are not smooth (smoothing by the discrepancy principle, property nodes, start) at the best
     * estimate.
     *
     * @param setting what is fixed for the run
     * @param best best estimate of the inputs, in layout order
     */
    public static RunModel configure(RunSetting setting, double[] best) {
        return new RunModel(setting, Frozen.at(setting, best));
    }

    /** The layout of this model's vectors. */
    public RunLayout layout() {
        return layout;
    }

    /** Effective number of parameters of the inverse step at the best estimate. */
    public double effectiveParameters() {
        return effectiveParameters;
    }

    /** χ² of reading − model over the junctions used, at the best estimate. */
    public double chiSquare() {
        return chiSquare;
    }

    /** Degrees of freedom of {@link #chiSquare()}. */
    public double chiSquareDof() {
        return Math.max(0.0, used - effectiveParameters);
    }

    /**
     * Computes all results of the run.
     *
     * @param in inputs in layout order, SI; not written to
     * @param out outputs in layout order, SI; overwritten, NaN where out of range
     */
    public void evaluate(double[] in, double[] out) {
        java.util.Arrays.fill(out, Double.NaN);
        Stream stream = new Stream(in, layout, lowK, highK);
        double reference = adiabaticWall(in, layout, stream, setting.flow());
        PlateState state = new PlateState(grid.cells, grid.knots.length, layout.junctions());
        state.startFrom(start);
        if (solver.solve(in, reference, state, PASSES) > PASSES) {
            return; // stays NaN: the caller reports a run whose model does not converge
        }
        new Booking(this, in, out, stream, reference, state).write();
    }

    /** T_aw = T_∞ + r U²/(2 c_p), K; METHODS.md eq. (D-1). */
    static double adiabaticWall(double[] in, RunLayout layout, Stream stream, RunSetting.Flow flow) {
        double air = in[layout.at(In.AIR_TEMPERATURE)];
        double speed = in[layout.at(In.SPEED)];
        double pr = stream.prandtl(air);
        double recovery = flow == RunSetting.Flow.LAMINAR ? Math.sqrt(pr) : Math.cbrt(pr);
        return air + recovery * speed * speed / (2.0 * stream.heatCapacity(air));
    }

    /** What is frozen. */
    private record Frozen(
            RunLayout layout,
            PlateGrid grid,
            PlateSolver solver,
            PlateState state,
            double lowK,
            double highK,
            double effectiveParameters,
            double chiSquare,
            int used,
            RigTheory theory) {
        static Frozen at(RunSetting setting, double[] best) {
            Plate plate = setting.plate();
            RunLayout layout = RunModel.layout(plate);
            PlateGrid grid = PlateGrid.of(plate);
            double air = best[layout.at(In.AIR_TEMPERATURE)];
            double hottest = air;
            double coldest = air;
            for (int p = 0; p < layout.junctions(); p++) {
                if (Double.isFinite(setting.sigmaK()[p])) {
                    hottest = Math.max(hottest, best[layout.reading(p)]);
                    coldest = Math.min(coldest, best[layout.reading(p)]);
                }
            }
            double low = coldest - FILM_MARGIN_K;
            double high = hottest + FILM_MARGIN_K;
            Stream stream = new Stream(best, layout, low, high);
            double reference = adiabaticWall(best, layout, stream, setting.flow());
            Smoothing choice = Smoothing.choose(setting, layout, grid, best, reference);
            RigTheory theory = RigTheory.of(setting, layout, grid, best, stream);
            return new Frozen(
                    layout,
                    grid,
                    choice.solver(),
                    choice.state(),
                    low,
                    high,
                    choice.effectiveParameters(),
                    choice.chiSquare(),
                    choice.used(),
                    theory);
        }
    }
}
