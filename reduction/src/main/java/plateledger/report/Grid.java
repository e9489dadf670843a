package plateledger.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** A table of the report. A title that begins with {@code #} heads a column of numbers, set flush right. */
final class Grid {
    private final List<Map<String, Object>> head = new ArrayList<>();
    private final List<List<String>> rows = new ArrayList<>();

    Grid(String... titles) {
        this(List.of(titles));
    }

    Grid(List<String> titles) {
        for (String title : titles) {
            boolean number = title.startsWith("#");
            head.add(Map.of("title", number ? title.substring(1) : title, "number", number));
        }
    }

    /** Adds a row, a cell per column. */
    Grid row(String... cells) {
        return row(List.of(cells));
    }

    /** Adds a row, a cell per column. */
    Grid row(List<String> cells) {
        if (cells.size() != head.size()) {
            throw new IllegalArgumentException("row has " + cells.size() + " cells, the table " + head.size());
        }
        rows.add(List.copyOf(cells));
        return this;
    }

    /** What the template reads. */
    Map<String, Object> model() {
        return Map.of("head", head, "rows", rows);
    }
}
