package plateledger.demo.proof;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/** The numbers of a {@code truth.json}, by their path with '/' between keys. */
final class Truth {
    private final Map<String, Double> numbers = new LinkedHashMap<>();

    private Truth() {}

    static Truth read(Path file) {
        Truth truth = new Truth();
        try (JsonParser parser = new JsonFactory().createParser(file.toFile())) {
            parser.nextToken();
            truth.object(parser, "");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return truth;
    }

    private void object(JsonParser parser, String path) throws IOException {
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String here = path + parser.currentName();
            JsonToken value = parser.nextToken();
            if (value == JsonToken.START_OBJECT) {
                object(parser, here + "/");
            } else if (value.isNumeric()) {
                numbers.put(here, parser.getDoubleValue());
            }
        }
    }

    Optional<Double> find(String path) {
        return Optional.ofNullable(numbers.get(path));
    }

    double get(String path) {
        return find(path).orElseThrow(() -> new IllegalArgumentException("no number " + path + " in the truth file"));
    }
}
