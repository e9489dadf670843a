package plateledger.log;

import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/** Logs in the three styles that the loggers of a rig write, with values that a test can compute again. */
final class LogFixtures {
    static final LocalDateTime START = LocalDateTime.of(2026, 3, 10, 10, 20, 0);
    /** 2026-03-10T10:20:00+01:00 in s since 1970 (GNU date: {@code date -d 2026-03-10T10:20:00+01:00 +%s}). */
    static final double START_S = 1773134400.0;

    private LogFixtures() {}

    /** The value of channel c in row i, two decimals. */
    static double value(int row, int channel) {
        return 20 + channel + (row % 7) * 0.01;
    }

    /** Style (a): semicolons, decimal commas, six lines above the titles, a units row, day.month.year, CRLF. */
    static String plate(int rows, int channels) {
        StringBuilder s = new StringBuilder();
        s.append("Rig logger 7\r\nSerial: 0815; rack 2\r\nOperator: A. Person\r\nInterval: 1 s\r\nRemark:\r\n\r\n");
        s.append("Zeit");
        for (int c = 0; c < channels; c++) {
            s.append(String.format(Locale.ROOT, ";T%02d", c + 1));
        }
        s.append("\r\n-").append(";\u00b0C".repeat(channels)).append("\r\n");
        DateTimeFormatter form = DateTimeFormatter.ofPattern("dd.MM.yyyy HH:mm:ss", Locale.ROOT);
        for (int i = 0; i < rows; i++) {
            s.append(form.format(START.plusSeconds(i)));
            for (int c = 0; c < channels; c++) {
                s.append(';')
                        .append(String.format(Locale.ROOT, "%.2f", value(i, c)).replace('.', ','));
            }
            s.append("\r\n");
        }
        return s.toString();
    }

    /** Style (b): commas, ISO 8601 with zone, units in the titles, every 2 s. */
    static String power(int rows) {
        StringBuilder s = new StringBuilder("time,V1 [V],I1 [mA]\n");
        DateTimeFormatter form = DateTimeFormatter.ofPattern("yyyy-MM-dd'T'HH:mm:ss", Locale.ROOT);
        for (int i = 0; i < rows; i++) {
            s.append(form.format(START.plusSeconds(2L * i))).append("+01:00,");
            s.append(String.format(Locale.ROOT, "%.3f,%.1f%n", 5 + (i % 3) * 0.001, 1500 + (i % 5) * 0.1)
                    .replace(System.lineSeparator(), "\n"));
        }
        return s.toString();
    }

    /** Style (c): tabs, elapsed seconds from a start above the titles. */
    static String tunnel(int rows) {
        StringBuilder s = new StringBuilder("Tunnel data\nStart: 2026-03-10 10:20:00\nComment: none\n");
        s.append("Elapsed [s]\tPD [Pa]\tTA1 [\u00b0C]\tPB [hPa]\tRH [%]\n");
        for (int i = 0; i < rows; i++) {
            s.append(String.format(Locale.ROOT, "%.1f\t%.2f\t%.3f\t%.1f\t%.1f", i * 0.5, 9.5, 21.125, 981.2, 41.5))
                    .append('\n');
        }
        return s.toString();
    }

    /** The lines, each with its end. */
    static String lines(String... lines) {
        return String.join("\n", lines) + "\n";
    }

    static String write(Path folder, String file, String text, Charset charset) throws IOException {
        Files.write(folder.resolve(file), text.getBytes(charset));
        return file;
    }
}
