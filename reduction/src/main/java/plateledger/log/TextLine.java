package plateledger.log;

import java.util.ArrayList;
import java.util.List;

/** Splits one line of delimited text, quotes respected; for titles and detection, where speed does not matter. */
final class TextLine {
    private TextLine() {}

    /** One cell of a line without splitting the rest; empty if there are fewer. Quotes around earlier cells are respected. */
    static String cell(String line, char delimiter, int column) {
        int start = 0;
        int at = 0;
        boolean quoted = false;
        for (int i = 0; i < line.length(); i++) {
            char c = line.charAt(i);
            if (c == '"') {
                quoted = !quoted;
            } else if (c == delimiter && !quoted) {
                if (at == column) {
                    return line.substring(start, i).replace("\"", "");
                }
                at++;
                start = i + 1;
            }
        }
        return at == column ? line.substring(start).replace("\"", "") : "";
    }

    /** The cells of a line. A doubled quote inside quotes is one quote. */
    static List<String> split(String line, char delimiter) {
        List<String> cells = new ArrayList<>();
        StringBuilder cell = new StringBuilder();
        boolean quoted = false;
        for (int i = 0; i < line.length(); i++) {
            char c = line.charAt(i);
            if (c == '"') {
                if (quoted && i + 1 < line.length() && line.charAt(i + 1) == '"') {
                    cell.append('"');
                    i++;
                } else {
                    quoted = !quoted;
                }
            } else if (c == delimiter && !quoted) {
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
