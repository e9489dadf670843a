package plateledger.ledger;

import plateledger.ledger.RunLayout.In;
import plateledger.rig.Plate;

/**
 * The shape g(x) that the inverse step takes as smooth, METHODS.md eq. (P-2): uniform, or the h of a uniform-temperature
 * step at the start of heating in a boundary layer (laminar x^-½ [1 − (x₀/x)^¾]^-⅓, turbulent x^-⅕ [1 − (x₀/x)^(9/10)]^-1/9),
 * scaled so that ρ is near 1. Only what is called smooth depends on it; the readings decide the rest.
 */
final class HeatTransferShape {
    private static final int POINTS = 24;

    private HeatTransferShape() {}

    static double[] of(RunSetting setting, PlateGrid grid, double[] best, RunLayout layout, double adiabaticWallK) {
        double[] g = new double[grid.cells];
        boolean uniform =
                setting.plate().smoothShape() == Plate.SmoothShape.UNIFORM || setting.flow() == RunSetting.Flow.PRODUCT;
        double sum = 0.0;
        for (int i = 0; i < grid.cells; i++) {
            g[i] = uniform ? 1.0 : cellMean(setting.flow(), grid.startM, grid.faces[i], grid.faces[i + 1]);
            sum += g[i] * (grid.faces[i + 1] - grid.faces[i]);
        }
        double scale = firstGuess(setting, best, layout, adiabaticWallK) * (grid.endM - grid.startM) / sum;
        for (int i = 0; i < grid.cells; i++) {
            g[i] *= scale;
        }
        return g;
    }

    /** Mean over a cell; midpoint rule in s = ((x − x₀))^⅔, which takes out the integrable end of the law at x₀. */
    private static double cellMean(RunSetting.Flow flow, double x0, double from, double to) {
        double s0 = Math.pow(from - x0, 2.0 / 3.0);
        double s1 = Math.pow(to - x0, 2.0 / 3.0);
        double sum = 0.0;
        for (int n = 0; n < POINTS; n++) {
            double s = s0 + (n + 0.5) / POINTS * (s1 - s0);
            double x = x0 + Math.pow(s, 1.5);
            sum += law(flow, x0, x) * 1.5 * Math.sqrt(s);
        }
        return sum * (s1 - s0) / POINTS / (to - from);
    }

    private static double law(RunSetting.Flow flow, double x0, double x) {
        return flow == RunSetting.Flow.LAMINAR
                ? Math.pow(x, -0.5) * Math.pow(1.0 - Math.pow(x0 / x, 0.75), -1.0 / 3.0)
                : Math.pow(x, -0.2) * Math.pow(1.0 - Math.pow(x0 / x, 0.9), -1.0 / 9.0);
    }

    /** Rough mean h: power less a linear radiation and back loss over the mean difference. */
    private static double firstGuess(RunSetting setting, double[] best, RunLayout layout, double adiabaticWallK) {
        double power = 0.0;
        for (int j = 0; j < layout.strips(); j++) {
            power += best[layout.power(j)] - best[layout.lead(j)];
        }
        double area = (best[layout.at(In.HEATED_END)] - best[layout.at(In.HEATED_START)]) * best[layout.at(In.WIDTH)];
        double mean = 0.0;
        int count = 0;
        for (int p = 0; p < layout.junctions(); p++) {
            if (Double.isFinite(setting.sigmaK()[p])) {
                mean += best[layout.reading(p)];
                count++;
            }
        }
        mean /= count;
        double radiation =
                LossTerm.Radiation.slope(best[layout.at(In.EXCHANGE_FACTOR)], best[layout.at(In.EMISSIVITY)], mean);
        double total = power / area / (mean - adiabaticWallK);
        return Math.max(0.2 * total, total - radiation - best[layout.at(In.BACK_CONDUCTANCE)]);
    }
}
