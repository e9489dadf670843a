package plateledger.demo.physics;

import java.util.Optional;

/** The plate in time: implicit steps of fixed length, the foam as a ladder of layers behind each cell
 * along the flow. */
public final class PlateMarch {
    private static final int ROUNDS = 12;
    private static final int LAYERS = 16;

    private final PlateEquations equations;
    private final StreamwiseSystem system;
    private final FoamLadder foam;
    private final double capacityRate;
    private final double[][] layers;
    private final double[] correction;
    private final Optional<HeldStrips> held;
    private double[] sheet;
    private double[] before;

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
        system = equations.factorise(capacityRate + foam.stepConductance());
        held = convection instanceof Convection.Cover
                ? Optional.of(new HeldStrips(equations, system))
                : Optional.empty();
        int n = equations.along();
        sheet = new double[n];
        before = new double[n];
        correction = new double[n];
        layers = new double[n][LAYERS];
        for (double[] spot : layers) {
            for (int k = 0; k < LAYERS; k++) {
                spot[k] = (plenumK - startK) * (k + 0.5) / LAYERS;
            }
        }
    }

    /** One step with given strip powers (W) and the surroundings at its end. */
    public PlateState step(double[] stripW, Surround around) {
        return finish(stripW, around, release(around));
    }

    /**
     * One step in which the controllers of a covered plate bring the centre line to a temperature, as far as heating alone
     * can.
     */
    public PlateState stepTo(double centreK, Surround around) {
        HeldStrips controllers = held.orElseThrow();
        double[] history = release(around);
        double[] idle = history.clone();
        equations.addSources(new double[controllers.strips()], around, correction, idle);
        system.solve(idle);
        double[] powers = controllers.powers(idle, centreK, around);
        return finish(powers, around, history);
    }

    /** Lets the foam relax over the step; returns what it and the sheet's capacity bring into the balance, W/m². */
    private double[] release(Surround around) {
        double plenum = around.plenumK() - equations.referenceK();
        double[] history = new double[layers.length];
        for (int i = 0; i < history.length; i++) {
            history[i] = foam.release(layers[i], plenum) + capacityRate * sheet[i];
        }
        return history;
    }

    private PlateState finish(double[] stripW, Surround around, double[] history) {
        double[] spare = before;
        before = sheet;
        sheet = spare;
        int n = equations.along();
        double[] flux = new double[n];
        double[] face = new double[n];
        for (int round = 0; round < ROUNDS; round++) {
            System.arraycopy(history, 0, sheet, 0, n);
            equations.addSources(stripW, around, correction, sheet);
            system.solve(sheet);
            if (equations.update(sheet, around, correction, flux, face) < 1e-8) {
                break;
            }
        }
        double back = equations.panel().backWPerM2K();
        double plenum = around.plenumK() - equations.referenceK();
        double[] stored = new double[n];
        for (int i = 0; i < n; i++) {
            double released = history[i] - capacityRate * before[i];
            double intoFoam = foam.stepConductance() * sheet[i] - released;
            stored[i] = capacityRate * (sheet[i] - before[i]) + intoFoam - back * (sheet[i] - plenum);
            foam.complete(layers[i], sheet[i]);
        }
        return equations.state(stripW, around, sheet, flux, face, stored);
    }
}
