package plateledger.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;

/** JSON as this program writes it: UTF-8, two blanks of indentation, LF on every machine, null for what is no number. */
final class JsonText {
    private static final JsonFactory FACTORY = new JsonFactory();

    /** Writes one document. */
    interface Body {
        /** Writes to the generator. */
        void write(JsonGenerator json) throws IOException;
    }

    private JsonText() {}

    /** The document's bytes, with a newline at the end. */
    static byte[] write(Body body) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (JsonGenerator json = FACTORY.createGenerator(bytes)) {
            DefaultIndenter indenter = new DefaultIndenter("  ", "\n");
            json.setPrettyPrinter(
                    new DefaultPrettyPrinter().withObjectIndenter(indenter).withArrayIndenter(indenter));
            body.write(json);
            json.writeRaw('\n');
        } catch (IOException e) {
            throw new UncheckedIOException(e); // a byte array does not fail
        }
        return bytes.toByteArray();
    }

    /** A number field, null where it is not finite. */
    static void number(JsonGenerator json, String name, double value) throws IOException {
        json.writeFieldName(name);
        number(json, value);
    }

    /** A number, null where it is not finite. */
    static void number(JsonGenerator json, double value) throws IOException {
        if (Double.isFinite(value)) {
            json.writeNumber(value);
        } else {
            json.writeNull();
        }
    }

    /** A field that holds an array of two numbers. */
    static void pair(JsonGenerator json, String name, double first, double second) throws IOException {
        json.writeFieldName(name);
        row(json, first, second);
    }

    /** An array of two numbers. */
    static void row(JsonGenerator json, double first, double second) throws IOException {
        json.writeStartArray();
        number(json, first);
        number(json, second);
        json.writeEndArray();
    }
}
