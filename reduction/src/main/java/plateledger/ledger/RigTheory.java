package plateledger.ledger;

import plateledger.ledger.RunLayout.In;
import plateledger.theory.FlatPlate;
import plateledger.theory.Influence;
import plateledger.theory.LayerLaw;

/**
 * What theory says for this rig: the measured flux distribution, unheated length and trip put into the superposition,
 * METHODS.md eqs. (T-8) to (T-10). The geometry is worked out once at the best estimate; a moved start of heating and a
 * moved virtual origin enter through a difference with a second geometry, since both move by far less than a cell. The
 * effect of the end of the heated length is on the flux only.
 */
final class RigTheory {
    private static final double START_STEP_M = 0.2e-3;
    private static final double ORIGIN_STEP_M = 0.5e-3;

    private final RunLayout layout;
    private final int cells;
    private final LayerLaw law;
    private final boolean applies;
    private final double startM;
    private final double tripM;
    private final double originM;
    private final Influence base;
    private final Influence startMoved;
    private final Influence originMoved;

    private RigTheory(
            RunLayout layout,
            PlateGrid grid,
            LayerLaw law,
            boolean applies,
            double startM,
            double tripM,
            double originM) {
        this.layout = layout;
        this.cells = grid.cells;
        this.law = law;
        this.applies = applies;
        this.startM = startM;
        this.tripM = tripM;
        this.originM = originM;
        base = influence(grid, law, startM, originM);
        startMoved = applies ? influence(grid, law, startM + START_STEP_M, originM) : base;
        originMoved = applies && tripM > 0.0 ? influence(grid, law, startM, originM - ORIGIN_STEP_M) : base;
    }

    static RigTheory of(RunSetting setting, RunLayout layout, PlateGrid grid, double[] best, Stream stream) {
        boolean laminar = setting.flow() == RunSetting.Flow.LAMINAR;
        LayerLaw law = laminar ? LayerLaw.LAMINAR : LayerLaw.TURBULENT;
        boolean applies = setting.flow() != RunSetting.Flow.PRODUCT;
        double start = best[layout.at(In.HEATED_START)];
        double trip = applies && !laminar ? setting.tripM().orElse(0.0) : 0.0;
        double air = best[layout.at(In.AIR_TEMPERATURE)];
        double perMetre = best[layout.at(In.SPEED)] / stream.kinematicViscosity(air);
        double origin = trip > 0.0 ? FlatPlate.virtualOrigin(trip, perMetre) : 0.0;
        return new RigTheory(layout, grid, law, applies, start, trip, origin);
    }

    private static Influence influence(PlateGrid grid, LayerLaw law, double startM, double originM) {
        double stretch = (grid.endM - startM) / (grid.endM - grid.startM);
        double[] edges = new double[grid.cells + 1];
        double[] centres = new double[grid.cells];
        for (int i = 0; i <= grid.cells; i++) {
            edges[i] = startM + stretch * (grid.faces[i] - grid.startM);
        }
        for (int i = 0; i < grid.cells; i++) {
            centres[i] = startM + stretch * (grid.centres[i] - grid.startM);
        }
        return Influence.of(edges, centres, originM, law);
    }

    /** T_s − T_aw in each cell for the flux of each cell, K; NaN where no theory applies. */
    double[] wallDifference(double[] in, Stream stream, double filmK, double[] flux) {
        double[] out = new double[cells];
        if (!applies) {
            java.util.Arrays.fill(out, Double.NaN);
            return out;
        }
        double speed = in[layout.at(In.SPEED)];
        double perMetre = speed / stream.kinematicViscosity(filmK);
        double pr = stream.prandtl(filmK);
        double k = stream.conductivity(filmK);
        base.wallDifference(flux, perMetre, pr, k, out);
        add(startMoved, (in[layout.at(In.HEATED_START)] - startM) / START_STEP_M, flux, perMetre, pr, k, out);
        if (tripM > 0.0) {
            double air = in[layout.at(In.AIR_TEMPERATURE)];
            double origin = FlatPlate.virtualOrigin(tripM, speed / stream.kinematicViscosity(air));
            add(originMoved, (originM - origin) / ORIGIN_STEP_M, flux, perMetre, pr, k, out);
        }
        return out;
    }

    private void add(Influence moved, double share, double[] flux, double perMetre, double pr, double k, double[] out) {
        if (share != 0.0) {
            double[] at = new double[cells];
            double[] here = new double[cells];
            moved.wallDifference(flux, perMetre, pr, k, at);
            base.wallDifference(flux, perMetre, pr, k, here);
            for (int i = 0; i < cells; i++) {
                out[i] += share * (at[i] - here[i]);
            }
        }
    }

    /** Nu_x of the uniform-temperature formula without unheated length; NaN where no theory applies. */
    double textbook(double reX, double prandtl) {
        return applies ? law.uniformTemperature(prandtl) * Math.pow(reX, law.reynoldsExponent()) : Double.NaN;
    }

    /** Expected h of a uniform wall temperature from the start of heating on, in each cell, W/(m² K). */
    static double[] uniformTemperatureH(
            RunSetting setting, RunLayout layout, PlateGrid grid, double[] best, Stream stream) {
        LayerLaw law = setting.flow() == RunSetting.Flow.LAMINAR ? LayerLaw.LAMINAR : LayerLaw.TURBULENT;
        double air = best[layout.at(In.AIR_TEMPERATURE)];
        double perMetre = best[layout.at(In.SPEED)] / stream.kinematicViscosity(air);
        double pr = stream.prandtl(air);
        double k = stream.conductivity(air);
        double start = best[layout.at(In.HEATED_START)];
        double[] h = new double[grid.cells];
        for (int i = 0; i < grid.cells; i++) {
            double x = grid.centres[i];
            double plain = law.uniformTemperature(pr) * Math.pow(perMetre * x, law.reynoldsExponent()) * k / x;
            h[i] = plain * Math.pow(1.0 - Math.pow(start / x, law.a()), -law.b());
        }
        return h;
    }
}
