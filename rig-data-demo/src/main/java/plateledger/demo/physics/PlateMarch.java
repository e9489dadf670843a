package plateledger.demo.physics;

/** The plate in time: implicit steps of fixed length, the foam as a ladder of layers behind each cell. */
public final class PlateMarch {
    private static final int ROUNDS = 4;
    private static final int LAYERS = 16;

    private final PlateEquations equations;
    private final StreamwiseSystem[] systems;
    private final FoamLadder foam;
    private final double capacityRate;
    private final double[][][] layers;
    private double[][] sheet;
    private final double[][] correction;
    private final double[][] modal;
    private double[][] before;

    /**
     * The plate at rest at one temperature, the foam between it and the plenum.
     *
     * @param mesh the panel in cells
     * @param convection at the face
     * @param exchangeFactor F of radiation
     * @param startK temperature of the sheet at the start, K
     * @param plenumK temperature of the plenum at the start, K
     * @param stepS length of a step, s
     */
    public PlateMarch(
            MeshedPanel mesh,
            Convection convection,
            double exchangeFactor,
            double startK,
            double plenumK,
            double stepS) {
        Panel panel = mesh.panel();
        equations = new PlateEquations(mesh, convection, exchangeFactor, startK);
        foam = new FoamLadder(panel.backWPerM2K(), panel.foamJPerM2K(), LAYERS, stepS, FoamLadder.FarSide.HELD);
        capacityRate = panel.capacityJPerM3K() * panel.thicknessM() / stepS;
        systems = equations.factorise(capacityRate + foam.stepConductance());
        sheet = equations.cells();
        before = equations.cells();
        correction = equations.cells();
        modal = equations.cells();
        layers = new double[equations.across()][equations.along()][LAYERS];
        for (double[][] row : layers) {
            for (double[] spot : row) {
                for (int k = 0; k < LAYERS; k++) {
                    spot[k] = (plenumK - startK) * (k + 0.5) / LAYERS;
                }
            }
        }
    }

    /** One step with given strip powers (W) and the surroundings at its end. */
    public PlateState step(double[] stripW, Surround around) {
        return finish(stripW, around, release(around));
    }

    /**
     * One step of a covered plate whose equal strip powers are set so that the mean sheet temperature comes out as asked
     * (not below 0 W).
     */
    public PlateState stepTo(double meanSheetK, int strips, Surround around) {
        double[][] history = release(around);
        double[] none = new double[strips];
        double[] unit = new double[strips];
        java.util.Arrays.fill(unit, 1.0 / strips);
        double idle = meanAfter(none, around, history);
        double driven = meanAfter(unit, around, history);
        double watts = Math.max(0.0, (meanSheetK - equations.referenceK() - idle) / (driven - idle));
        double[] power = new double[strips];
        java.util.Arrays.fill(power, watts / strips);
        return finish(power, around, history);
    }

    private double meanAfter(double[] stripW, Surround around, double[][] history) {
        double[][] source = copy(history);
        double[][] out = equations.cells();
        equations.addSources(stripW, around, correction, source);
        equations.solve(systems, source, modal, out);
        double sum = 0.0;
        double area = 0.0;
        for (int j = 0; j < equations.across(); j++) {
            for (int i = 0; i < equations.along(); i++) {
                double a = equations.grid().width(j) * equations.grid().length(i);
                sum += a * out[j][i];
                area += a;
            }
        }
        return sum / area;
    }

    /** Lets the foam relax over the step; returns what it and the sheet's capacity bring into the balance, W/m². */
    private double[][] release(Surround around) {
        double plenum = around.plenumK() - equations.referenceK();
        double[][] history = equations.cells();
        for (int j = 0; j < history.length; j++) {
            for (int i = 0; i < history[j].length; i++) {
                history[j][i] = foam.release(layers[j][i], plenum) + capacityRate * sheet[j][i];
            }
        }
        return history;
    }

    private PlateState finish(double[] stripW, Surround around, double[][] history) {
        double[][] spare = before;
        before = sheet;
        sheet = spare;
        double[][] flux = equations.cells();
        double[][] face = equations.cells();
        for (int round = 0; round < ROUNDS; round++) {
            double[][] source = copy(history);
            equations.addSources(stripW, around, correction, source);
            equations.solve(systems, source, modal, sheet);
            if (equations.update(sheet, around, correction, flux, face) < 1e-5) {
                break;
            }
        }
        double back = equations.panel().backWPerM2K();
        double plenum = around.plenumK() - equations.referenceK();
        double[][] stored = equations.cells();
        for (int j = 0; j < stored.length; j++) {
            for (int i = 0; i < stored[j].length; i++) {
                double t = sheet[j][i];
                double released = history[j][i] - capacityRate * before[j][i];
                double intoFoam = foam.stepConductance() * t - released;
                stored[j][i] = capacityRate * (t - before[j][i]) + intoFoam - back * (t - plenum);
                foam.complete(layers[j][i], t);
            }
        }
        return equations.state(stripW, around, sheet, flux, face, stored);
    }

    private static double[][] copy(double[][] field) {
        double[][] out = new double[field.length][];
        for (int j = 0; j < field.length; j++) {
            out[j] = field[j].clone();
        }
        return out;
    }
}
