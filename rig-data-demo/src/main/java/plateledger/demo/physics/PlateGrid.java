package plateledger.demo.physics;

import java.util.ArrayList;
import java.util.List;

/**
 * Cells of the sheet: along the flow with faces on the strip edges and small cells at both ends, across half the span
 * with small cells at the side edge. Index i runs along the flow, j from the centre line to the edge.
 *
 * @param faces cell faces along the flow, m from the leading edge
 * @param spanFaces cell faces across the span, m from the centre line
 */
public record PlateGrid(double[] faces, double[] spanFaces) {
    /** How fine. */
    public enum Fineness {
        /** For thousands of campaigns. */
        FAST(6, 1.45, 14, 0.0016),
        /** For the logs. */
        NORMAL(10, 1.22, 24, 0.0012),
        /** For the proof that the others are fine enough. */
        FINE(24, 1.08, 48, 0.0006);

        private final int perStrip;
        private final double growth;
        private final int across;
        private final double smallest;

        Fineness(int perStrip, double growth, int across, double smallest) {
            this.perStrip = perStrip;
            this.growth = growth;
            this.across = across;
            this.smallest = smallest;
        }
    }

    /** The grid of a panel. */
    public static PlateGrid of(double[] stripEdges, double width, Fineness fineness) {
        int strips = stripEdges.length - 1;
        List<Double> faces = new ArrayList<>();
        faces.add(stripEdges[0]);
        for (int s = 0; s < strips; s++) {
            double from = stripEdges[s];
            double to = stripEdges[s + 1];
            double common = (to - from) / fineness.perStrip;
            List<Double> sizes = new ArrayList<>();
            if (s == 0 || s == strips - 1) {
                double sum = 0.0;
                for (double size = 0.1 * common; sum < to - from; size = Math.min(common, size * fineness.growth)) {
                    sizes.add(size);
                    sum += size;
                }
                double fit = (to - from) / sum;
                sizes.replaceAll(size -> size * fit);
                if (s == strips - 1) {
                    java.util.Collections.reverse(sizes);
                }
            } else {
                for (int i = 0; i < fineness.perStrip; i++) {
                    sizes.add(common);
                }
            }
            double at = from;
            for (int i = 0; i < sizes.size() - 1; i++) {
                at += sizes.get(i);
                faces.add(at);
            }
            faces.add(to);
        }
        double[] span = new double[fineness.across + 1];
        double ratio = ratio(0.5 * width / fineness.smallest, fineness.across);
        double size = fineness.smallest;
        span[fineness.across] = 0.5 * width;
        for (int j = fineness.across - 1; j >= 1; j--) {
            span[j] = span[j + 1] - size;
            size *= ratio;
        }
        return new PlateGrid(faces.stream().mapToDouble(Double::doubleValue).toArray(), span);
    }

    /** Number of cells along the flow. */
    public int along() {
        return faces.length - 1;
    }

    /** Number of cells across half the span. */
    public int across() {
        return spanFaces.length - 1;
    }

    /** Length of cell i, m. */
    public double length(int i) {
        return faces[i + 1] - faces[i];
    }

    /** Place of the centre of cell i, m from the leading edge. */
    public double x(int i) {
        return 0.5 * (faces[i] + faces[i + 1]);
    }

    /** Width of cell j, m. */
    public double width(int j) {
        return spanFaces[j + 1] - spanFaces[j];
    }

    /** Distance of the centre of cell j from the centre line, m; cell −1 − j mirrors cell j. */
    public double z(int j) {
        return j < 0 ? -z(-1 - j) : 0.5 * (spanFaces[j] + spanFaces[j + 1]);
    }

    /**
     * A cell field at a place, by cubic interpolation both ways, even about the centre line.
     *
     * @param field values [j][i]
     */
    public double at(double[][] field, double x, double z) {
        double side = Math.abs(z);
        int j = 0;
        while (j < across() - 1 && z(j) < side) {
            j++;
        }
        int first = Math.max(-2, Math.min(across() - 4, j - 2));
        double[] weights = weights(side, z(first), z(first + 1), z(first + 2), z(first + 3));
        double sum = 0.0;
        for (int k = 0; k < 4; k++) {
            int cell = first + k;
            sum += weights[k] * along(field[cell < 0 ? -1 - cell : cell], x);
        }
        return sum;
    }

    /** A field along the flow at a place, by cubic interpolation. */
    public double along(double[] field, double x) {
        int low = 0;
        int high = along() - 1;
        while (high - low > 1) {
            int middle = (low + high) >>> 1;
            if (x(middle) <= x) {
                low = middle;
            } else {
                high = middle;
            }
        }
        int first = Math.max(0, Math.min(along() - 4, low - 1));
        double[] w = weights(x, x(first), x(first + 1), x(first + 2), x(first + 3));
        return w[0] * field[first] + w[1] * field[first + 1] + w[2] * field[first + 2] + w[3] * field[first + 3];
    }

    private static double[] weights(double x, double a, double b, double c, double d) {
        return new double[] {
            (x - b) * (x - c) * (x - d) / ((a - b) * (a - c) * (a - d)),
            (x - a) * (x - c) * (x - d) / ((b - a) * (b - c) * (b - d)),
            (x - a) * (x - b) * (x - d) / ((c - a) * (c - b) * (c - d)),
            (x - a) * (x - b) * (x - c) / ((d - a) * (d - b) * (d - c))
        };
    }

    /** Growth ratio for which n cells from 1 on add up to {@code total}. */
    private static double ratio(double total, int n) {
        double low = 1.0;
        double high = 4.0;
        for (int k = 0; k < 60; k++) {
            double ratio = 0.5 * (low + high);
            double sum = 0.0;
            double size = 1.0;
            for (int i = 0; i < n; i++) {
                sum += size;
                size *= ratio;
            }
            if (sum < total) {
                low = ratio;
            } else {
                high = ratio;
            }
        }
        return 0.5 * (low + high);
    }
}
