package plateledger.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.Map;
import plateledger.audit.AuditRecord;

/** {@code audit.json} (the same bytes from the same input) and {@code written.json} (when, how long, where). */
final class AuditJson {
    static final String FILE = "audit.json";
    static final String FORMAT = "plateledger-audit/1";
    static final String WRITTEN_FORMAT = "plateledger-written/1";
    private static final int FIRST_TOKENS = 4; // {, field name "format", its value; one to spare

    private AuditJson() {}

    /** The bytes of {@code audit.json}. */
    static byte[] bytes(AuditRecord audit) {
        return JsonText.write(json -> {
            json.writeStartObject();
            json.writeStringField("format", FORMAT);
            json.writeStringField("version", audit.program().version());
            json.writeStringField("build", audit.program().build());
            json.writeNullField("random_seed"); // nothing in a reduction is drawn at random
            json.writeObjectFieldStart("settings");
            for (Map.Entry<String, String> setting : audit.settings().entrySet()) {
                json.writeStringField(setting.getKey(), setting.getValue());
            }
            json.writeEndObject();
            json.writeArrayFieldStart("files");
            for (AuditRecord.HashedFile file : audit.files()) {
                json.writeStartObject();
                json.writeStringField("name", file.name());
                json.writeNumberField("bytes", file.bytes());
                json.writeStringField("sha256", file.sha256());
                json.writeEndObject();
            }
            json.writeEndArray();
            json.writeEndObject();
        });
    }

    /**
     * The bytes of {@code written.json}, which a comparison of results leaves out.
     *
     * @param when moment of writing
     * @param took time since the start
     * @param campaign campaign folder, absolute
     */
    static byte[] written(Instant when, Duration took, Path campaign) {
        return JsonText.write(json -> {
            json.writeStartObject();
            json.writeStringField("format", WRITTEN_FORMAT);
            json.writeStringField("written", when.toString());
            json.writeNumberField("seconds", took.toMillis() / 1000.0);
            json.writeStringField("campaign", campaign.toString());
            json.writeStringField("java", System.getProperty("java.vm.name") + " " + Runtime.version());
            json.writeStringField("system", System.getProperty("os.name") + " " + System.getProperty("os.arch"));
            json.writeEndObject();
        });
    }

    /** True if the folder holds an {@code audit.json} that this program (any version of it) wrote. */
    static boolean marks(Path folder) {
        Path file = folder.resolve(FILE);
        if (!Files.isRegularFile(file)) {
            return false;
        }
        try (JsonParser parser = new JsonFactory().createParser(file.toFile())) {
            for (int i = 0; i < FIRST_TOKENS; i++) {
                JsonToken token = parser.nextToken();
                if (token == JsonToken.VALUE_STRING) {
                    return "format".equals(parser.currentName())
                            && parser.getText().startsWith("plateledger-audit/");
                }
            }
            return false;
        } catch (IOException notJson) {
            return false; // somebody else's file of that name
        }
    }
}
