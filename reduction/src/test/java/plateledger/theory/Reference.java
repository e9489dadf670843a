package plateledger.theory;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/** Tables of expected values beside the tests; where each comes from stands in its first lines. */
final class Reference {
    private Reference() {}

    static List<CSVRecord> rows(String name) {
        CSVFormat format = CSVFormat.DEFAULT
                .builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        try (Reader reader = new InputStreamReader(
                        Objects.requireNonNull(Reference.class.getResourceAsStream(name), name),
                        StandardCharsets.UTF_8);
                CSVParser parser = CSVParser.parse(reader, format)) {
            return parser.getRecords();
        } catch (IOException problem) {
            throw new UncheckedIOException(problem);
        }
    }

    static double number(CSVRecord row, String column) {
        return Double.parseDouble(row.get(column));
    }

    /** Value of a row of worked-cases.csv by id, for ids that name one row. */
    static double worked(String id) {
        List<CSVRecord> found = rows("worked-cases.csv").stream()
                .filter(row -> row.get("id").equals(id))
                .toList();
        if (found.size() != 1) {
            throw new IllegalArgumentException(id + " names " + found.size() + " rows");
        }
        return number(found.get(0), "value");
    }
}
