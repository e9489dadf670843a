package plateledger.fit;

import static org.junit.jupiter.api.Assertions.assertNotNull;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** Data sets of the fit tests. */
final class Points {
    private static final String[] SOURCES = {"U", "nu", "L", "q", "k", "dT"};

    private Points() {}

    /** Rows of a table in the test resources without comments and title. */
    static List<double[]> table(String name) {
        List<double[]> rows = new ArrayList<>();
        try (InputStream in = Points.class.getResourceAsStream(name)) {
            assertNotNull(in, name);
            BufferedReader reader = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8));
            for (String line = reader.readLine(); line != null; line = reader.readLine()) {
                if (!line.isEmpty() && Character.isDigit(line.charAt(0))) {
                    String[] cells = line.split(",", -1);
                    double[] row = new double[cells.length];
                    for (int i = 0; i < row.length; i++) {
                        row[i] = Double.parseDouble(cells[i]);
                    }
                    rows.add(row);
                }
            }
        } catch (IOException unreadable) {
            throw new IllegalStateException(unreadable);
        }
        return rows;
    }

    static FitPoint point(String id, String set, double lnRe, double lnNu, double ux, double uy, double r) {
        return new FitPoint(id, set, Math.exp(lnRe), Math.exp(lnNu), 0.71, ux, uy, r);
    }

    /** The 24 runs with their six shared sources; Nu is fitted as it stands (n = 0). */
    static FitProblem nufit() {
        return nufit(table("nufit.csv"));
    }

    static FitProblem nufit(List<double[]> rows) {
        List<FitPoint> points = new ArrayList<>();
        for (double[] row : rows) {
            points.add(point("R" + (int) row[0], "L" + ((int) row[0] + 2) / 3, row[1], row[2], row[4], row[5], 0.0));
        }
        List<SharedSource> sources = new ArrayList<>();
        int[] columnX = {6, 7, 8, -1, -1, -1};
        int[] columnY = {-1, -1, 8, 9, 10, 11};
        for (int s = 0; s < SOURCES.length; s++) {
            double[] dx = new double[rows.size()];
            double[] dy = new double[rows.size()];
            for (int i = 0; i < rows.size(); i++) {
                dx[i] = columnX[s] < 0 ? 0.0 : rows.get(i)[columnX[s]];
                dy[i] = columnY[s] < 0 ? 0.0 : rows.get(i)[columnY[s]];
            }
            sources.add(new SharedSource(SOURCES[s], "campaign", dx, dy, Double.POSITIVE_INFINITY));
        }
        return new FitProblem("nufit", 0.0, points, sources);
    }

    /** The replicates with one standard uncertainty of ln Nu and none of ln Re: ordinary least squares. */
    static FitProblem replicates(double uLnNu) {
        List<FitPoint> points = new ArrayList<>();
        for (double[] row : table("replicates.csv")) {
            points.add(point("R" + points.size(), "L" + (int) row[0], row[1], row[2], 0.0, uLnNu, 0.0));
        }
        return new FitProblem("replicates", 0.0, points, List.of());
    }
}
