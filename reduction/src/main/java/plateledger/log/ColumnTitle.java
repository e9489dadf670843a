package plateledger.log;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Title of one column, split into name and unit.
 *
 * @param name title without surrounding blanks and without a trailing unit in brackets
 * @param unit unit from the brackets or from the units row; empty if none is written
 */
record ColumnTitle(String name, String unit) {
    private static final Pattern WITH_UNIT = Pattern.compile("^(.*\\S)\\s*(?:\\[([^\\[\\]]*)\\]|\\(([^()]*)\\))\\s*$");

    /** Splits a title; round brackets count as unit only if a known unit stands in them. */
    static ColumnTitle of(String title) {
        Matcher m = WITH_UNIT.matcher(title);
        if (m.matches()) {
            String square = m.group(2);
            String round = m.group(3);
            if (square != null) {
                return new ColumnTitle(m.group(1).strip(), square.strip());
            }
            if (round != null && LogUnit.of(round).isPresent()) {
                return new ColumnTitle(m.group(1).strip(), round.strip());
            }
        }
        return new ColumnTitle(title.strip(), "");
    }

    /** Titles of a row with the units of the row below, where there is one; a unit in the title counts if the cell is empty. */
    static List<ColumnTitle> row(List<String> titles, List<String> units) {
        List<ColumnTitle> row = new ArrayList<>(titles.size());
        for (int i = 0; i < titles.size(); i++) {
            ColumnTitle t = of(titles.get(i));
            String below = i < units.size() ? LogUnit.bare(units.get(i)) : "";
            row.add(below.isEmpty() ? t : new ColumnTitle(t.name(), below));
        }
        return row;
    }
}
