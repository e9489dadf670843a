package plateledger.ledger;

import java.util.ArrayList;
import java.util.List;
import plateledger.rig.Plate;

/**
 * The frozen grid of one plate along the flow: cells with faces on the strip boundaries, finer toward the two ends of the
 * heated length; knots of the fitted h; places of the junctions. Built once; the kernel stretches it linearly when the
 * ends of the heated length are perturbed.
 */
final class PlateGrid {
    /** Finest cell at an end of the heated length, m; far below the conduction length of any sheet of interest. */
    private static final double FIRST_CELL_M = 0.6e-3;

    private static final double GROWTH = 1.35;
    private static final double LARGEST_CELL_M = 5.0e-3;

    final double startM;
    final double endM;
    final int cells;
    final double[] faces;
    final double[] centres;
    final int[] strip;
    final double[] knots;
    final int[] knotLeft;
    final double[] knotWeight;
    final int strips;

    private PlateGrid(double[] faces, int[] strip, double[] knots, int strips) {
        this.faces = faces;
        this.strip = strip;
        this.knots = knots;
        this.strips = strips;
        this.cells = strip.length;
        this.startM = faces[0];
        this.endM = faces[cells];
        this.centres = new double[cells];
        this.knotLeft = new int[cells];
        this.knotWeight = new double[cells];
        for (int i = 0; i < cells; i++) {
            centres[i] = 0.5 * (faces[i] + faces[i + 1]);
            int k = 0;
            while (k < knots.length - 2 && knots[k + 1] < centres[i]) {
                k++;
            }
            knotLeft[i] = k;
            knotWeight[i] = (knots[k + 1] - centres[i]) / (knots[k + 1] - knots[k]);
        }
    }

    /** The grid of a plate by its declared geometry. */
    static PlateGrid of(Plate plate) {
        List<Double> faces = new ArrayList<>();
        List<Integer> strip = new ArrayList<>();
        int n = plate.heaters().size();
        double[] knots = new double[n + 2];
        faces.add(plate.heaters().get(0).fromM());
        for (int j = 0; j < n; j++) {
            Plate.Heater heater = plate.heaters().get(j);
            double width = heater.toM() - heater.fromM();
            knots[j + 1] = heater.fromM() + 0.5 * width;
            for (double dx : widths(width, j == 0, j == n - 1)) {
                faces.add(faces.get(faces.size() - 1) + dx);
                strip.add(j);
            }
            faces.set(faces.size() - 1, heater.toM());
        }
        knots[0] = faces.get(0);
        knots[n + 1] = faces.get(faces.size() - 1);
        return new PlateGrid(
                faces.stream().mapToDouble(Double::doubleValue).toArray(),
                strip.stream().mapToInt(Integer::intValue).toArray(),
                knots,
                n);
    }

    /** Cell widths of one strip; fine at its upstream or downstream side where the heated length ends there. */
    private static List<Double> widths(double width, boolean fineFirst, boolean fineLast) {
        List<Double> head = new ArrayList<>();
        double rest = width;
        if (fineFirst || fineLast) {
            double dx = FIRST_CELL_M;
            while (dx < LARGEST_CELL_M && rest - dx > 2.0 * LARGEST_CELL_M) {
                head.add(dx);
                rest -= dx;
                dx *= GROWTH;
            }
        }
        int even = Math.max(1, (int) Math.ceil(rest / LARGEST_CELL_M - 1e-9));
        List<Double> all = new ArrayList<>(head);
        for (int i = 0; i < even; i++) {
            all.add(rest / even);
        }
        if (fineLast && !fineFirst) {
            java.util.Collections.reverse(all);
        }
        return all;
    }

    /** First of the three neighbouring cells from which a value at x is interpolated. */
    int stencil(double xM) {
        int i = 0;
        while (i < cells - 1 && centres[i + 1] < xM) {
            i++;
        }
        int nearest = i < cells - 1 && xM - centres[i] > centres[i + 1] - xM ? i + 1 : i;
        return Math.max(0, Math.min(cells - 3, nearest - 1));
    }
}
