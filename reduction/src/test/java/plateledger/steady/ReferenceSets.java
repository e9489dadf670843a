package plateledger.steady;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;

/** The synthetic sets and check values in the test resources; their first lines say where they come from. */
final class ReferenceSets {
    private ReferenceSets() {}

    /** A column of a set, from 0. */
    static double[] column(String file, int column) throws IOException {
        return rows(file).stream()
                .skip(1)
                .mapToDouble(row -> Double.parseDouble(row.get(column)))
                .toArray();
    }

    /** The expected value of a check, as written. */
    static String expected(String check, String quantity) throws IOException {
        return rows("worked-cases.csv").stream()
                .filter(row -> row.get(0).equals(check) && row.get(3).equals(quantity))
                .map(row -> row.get(4))
                .findFirst()
                .orElseThrow();
    }

    static double value(String check, String quantity) throws IOException {
        return Double.parseDouble(expected(check, quantity));
    }

    private static List<List<String>> rows(String file) throws IOException {
        InputStream in = Objects.requireNonNull(ReferenceSets.class.getResourceAsStream("/statistics/" + file), file);
        List<List<String>> rows = new ArrayList<>();
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
            String line = reader.readLine();
            while (line != null) {
                if (!line.startsWith("#")) {
                    rows.add(cells(line));
                }
                line = reader.readLine();
            }
        }
        return rows;
    }

    private static List<String> cells(String line) {
        String[] parts = line.split("\"", -1); // odd parts stand in quotes
        List<String> cells = new ArrayList<>(List.of(""));
        for (int i = 0; i < parts.length; i++) {
            List<String> piece = i % 2 == 1 ? List.of(parts[i]) : Arrays.asList(parts[i].split(",", -1));
            int last = cells.size() - 1;
            cells.set(last, cells.get(last) + piece.get(0));
            cells.addAll(piece.subList(1, piece.size()));
        }
        return cells;
    }
}
