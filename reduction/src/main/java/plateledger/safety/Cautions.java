package plateledger.safety;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** The general cautions printed in every report. They defer to local codes and licensed practice. */
public final class Cautions {
    /** Stands under every list of findings. */
    public static final String NOT_A_PROOF = "A missing finding does not mean safe.";

    private Cautions() {}

    /**
     * One caution.
     *
     * @param topic what it is about
     * @param text the caution
     * @param source where it comes from
     */
    public record Caution(String topic, String text, String source) {}

    /** All general cautions in the order to be printed. */
    public static List<Caution> general() {
        List<Caution> cautions = new ArrayList<>();
        for (String line : lines("cautions.txt")) {
            String[] parts = line.split(" \\| ", -1);
            if (parts.length != 3) {
                throw new IllegalStateException("caution without three parts: " + line);
            }
            cautions.add(new Caution(parts[0], parts[1], parts[2]));
        }
        return List.copyOf(cautions);
    }

    /** The lines of a table beside this class, comments left out. */
    private static List<String> lines(String name) {
        try (InputStream stream = Cautions.class.getResourceAsStream(name)) {
            if (stream == null) {
                throw new IllegalStateException("the program lacks its table " + name);
            }
            BufferedReader reader = new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8));
            return reader.lines()
                    .filter(line -> !line.isBlank() && !line.startsWith("#"))
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
