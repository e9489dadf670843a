package plateledger.demo.physics;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** Reads the small comma tables of published and independently computed checks. */
final class Table {
    private Table() {}

    /** Rows without comment and title lines. */
    static List<List<String>> rows(String name) {
        try (InputStream in = Table.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalArgumentException("no resource " + name);
            }
            List<List<String>> rows = new ArrayList<>();
            BufferedReader reader = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8));
            boolean titles = true;
            for (String line = reader.readLine(); line != null; line = reader.readLine()) {
                if (line.startsWith("#")) {
                    continue;
                }
                if (!titles) {
                    rows.add(cells(line));
                }
                titles = false;
            }
            return rows;
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    private static List<String> cells(String line) {
        List<String> cells = new ArrayList<>();
        StringBuilder cell = new StringBuilder();
        boolean quoted = false;
        for (int i = 0; i < line.length(); i++) {
            char c = line.charAt(i);
            if (c == '"') {
                quoted = !quoted;
            } else if (c == ',' && !quoted) {
                cells.add(cell.toString());
                cell.setLength(0);
            } else {
                cell.append(c);
            }
        }
        cells.add(cell.toString());
        return cells;
    }
}
