package plateledger.safety;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import plateledger.quantity.Temperature;

/** The published limits by their identifier. */
final class LimitTable {
    private static final Map<String, Limit> ALL = read();

    private LimitTable() {}

    /**
     * One limit.
     *
     * @param id identifier, e.g. {@code TOUCH-B1-1s}
     * @param appliesTo material, surface class or supply
     * @param value the limit in {@code unit}; NaN where the table holds words
     * @param unit unit as printed in the table; {@code C} for °C
     * @param text the sentence for people
     * @param source published source
     * @param provenance how the value was obtained: published, secondary print, from memory, computed, own choice
     */
    record Limit(
            String id, String appliesTo, double value, String unit, String text, String source, String provenance) {
        /** The limit as a temperature. */
        Temperature temperature() {
            return Temperature.ofCelsius(value);
        }

        /** The source with its provenance. */
        String citation() {
            return provenance.equals("published") ? source : source + " (" + provenance + ")";
        }
    }

    /** The limit of that identifier; an unknown one is a fault of the program. */
    static Limit get(String id) {
        Limit limit = ALL.get(id);
        if (limit == null) {
            throw new IllegalArgumentException("no limit named " + id);
        }
        return limit;
    }

    /**
     * The contact-burn limit of a surface class.
     *
     * @param surfaceClass class as declared: {@code bare metal}, {@code coated metal}, …
     * @param contact {@code 1s}, {@code 1min}, {@code 8h}
     * @return the limit; empty for an unknown class
     */
    static Optional<Limit> contact(String surfaceClass, String contact) {
        String wanted = surfaceClass.strip().toLowerCase(Locale.ROOT);
        return ALL.values().stream()
                .filter(limit -> limit.id().startsWith("TOUCH-B") && limit.id().endsWith("-" + contact))
                .filter(limit ->
                        limit.appliesTo().equals(wanted) || limit.appliesTo().startsWith(wanted + " ("))
                .findFirst();
    }

    /** The service limit of a material whose name in the table holds the declared name, or is held by it. */
    static Optional<Limit> material(String material) {
        String wanted = material.strip().toLowerCase(Locale.ROOT);
        if (wanted.isEmpty()) {
            return Optional.empty();
        }
        return ALL.values().stream()
                .filter(limit -> limit.id().startsWith("OVER-") && limit.unit().equals("C"))
                .filter(limit -> {
                    String name = limit.appliesTo().toLowerCase(Locale.ROOT);
                    return name.contains(wanted) || wanted.contains(name);
                })
                .findFirst();
    }

    private static Map<String, Limit> read() {
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        try (InputStream stream = LimitTable.class.getResourceAsStream("limits.csv")) {
            if (stream == null) {
                throw new IllegalStateException("the program lacks its table limits.csv");
            }
            try (Reader reader = new InputStreamReader(stream, StandardCharsets.UTF_8)) {
                Map<String, Limit> limits = new LinkedHashMap<>();
                for (CSVRecord row : format.parse(reader)) {
                    limits.put(row.get("check_id"), limit(row));
                }
                return Collections.unmodifiableMap(limits); // keeps the order of the table
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Limit limit(CSVRecord row) {
        String text = row.get("limit");
        double value = text.matches("[0-9.]+") ? Double.parseDouble(text) : Double.NaN;
        return new Limit(
                row.get("check_id"),
                row.get("applies_to"),
                value,
                row.get("unit"),
                row.get("finding_text"),
                row.get("source"),
                row.get("provenance"));
    }
}
