package plateledger.validation;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;

/** Reads a table of published values from the test resources: comma separated, titles in the first row, {@code #} comments. */
public final class PublishedTable {
    private PublishedTable() {}

    /**
     * The rows of a table beside a test.
     *
     * @param test class in whose package the resource lies
     * @param name file name
     */
    public static List<CSVRecord> rows(Class<?> test, String name) {
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        InputStream stream = test.getResourceAsStream(name);
        if (stream == null) {
            throw new IllegalArgumentException("no test resource " + name + " beside " + test.getName());
        }
        try (Reader reader = new InputStreamReader(stream, StandardCharsets.UTF_8)) {
            return format.parse(reader).getRecords();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** A cell as a number. */
    public static double number(CSVRecord row, String column) {
        return Double.parseDouble(row.get(column));
    }
}
