package plateledger.validation;

import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.lang.management.ManagementFactory;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVPrinter;
import org.apache.commons.csv.CSVRecord;

/**
 * One recorded line: what was checked, how many values, how far off the worst one was.
 *
 * @param head what was checked
 * @param values number of values
 * @param largestRelative largest relative deviation; NaN if none was relative
 * @param largestAbsolute largest absolute deviation; NaN if none was absolute
 */
record ValidationLine(Head head, int values, double largestRelative, double largestAbsolute) {
    /**
     * What was checked.
     *
     * @param section heading
     * @param what what was checked
     * @param source published source
     * @param test class of the test
     */
    record Head(String section, String what, String source, String test) {
        String fileName() {
            String words = (section + "-" + what).toLowerCase(Locale.ROOT);
            return words.replaceAll("[^a-z0-9]+", "-") + ".csv";
        }
    }

    static Path recordFolder() {
        return Path.of("target", "validation");
    }

    static Path document() {
        return Path.of("docs", "VALIDATION.md");
    }

    String csv() {
        StringWriter text = new StringWriter();
        try (CSVPrinter printer = new CSVPrinter(text, CSVFormat.RFC4180)) {
            printer.printRecord("section", "what", "source", "test", "values", "largest_relative", "largest_absolute");
            printer.printRecord(
                    head.section(), head.what(), head.source(), head.test(), values, largestRelative, largestAbsolute);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return text.toString();
    }

    /** Deviations as printed, two digits. */
    String deviation() {
        List<String> parts = new ArrayList<>();
        if (!Double.isNaN(largestRelative)) {
            parts.add(String.format(Locale.ROOT, "%.1e", largestRelative));
        }
        if (!Double.isNaN(largestAbsolute)) {
            parts.add(String.format(Locale.ROOT, "%.1e (absolute)", largestAbsolute));
        }
        return String.join("; ", parts);
    }

    /** The row of the document. */
    String row() {
        return "| " + String.join(" | ", cell(head.what()), cell(head.source()), Integer.toString(values), deviation())
                + " | `"
                + head.test().replaceFirst("^plateledger\\.", "") + "` |";
    }

    private static String cell(String text) {
        return text.replace("|", "\\|").replace('\n', ' ');
    }

    /** The lines recorded since this virtual machine started, by section and subject; former runs' records are left aside. */
    static List<ValidationLine> recorded() throws IOException {
        Path folder = recordFolder();
        if (!Files.isDirectory(folder)) {
            return List.of();
        }
        long started = ManagementFactory.getRuntimeMXBean().getStartTime();
        List<Path> files;
        try (Stream<Path> list = Files.list(folder)) {
            files = list.sorted().toList();
        }
        List<ValidationLine> lines = new ArrayList<>();
        for (Path file : files) {
            if (Files.getLastModifiedTime(file).toMillis() < started) {
                continue;
            }
            CSVFormat format = CSVFormat.RFC4180
                    .builder()
                    .setHeader()
                    .setSkipHeaderRecord(true)
                    .get();
            try (CSVParser parser = CSVParser.parse(file, StandardCharsets.UTF_8, format)) {
                for (CSVRecord row : parser) {
                    Head head = new Head(row.get("section"), row.get("what"), row.get("source"), row.get("test"));
                    lines.add(new ValidationLine(
                            head,
                            Integer.parseInt(row.get("values")),
                            Double.parseDouble(row.get("largest_relative")),
                            Double.parseDouble(row.get("largest_absolute"))));
                }
            }
        }
        lines.sort(Comparator.comparing((ValidationLine line) -> line.head().section())
                .thenComparing(line -> line.head().what()));
        return lines;
    }
}
