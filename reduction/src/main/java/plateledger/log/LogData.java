package plateledger.log;

import java.util.List;
import java.util.Optional;
import plateledger.finding.Finding;

/**
 * One log file as read.
 *
 * @param file path relative to the campaign folder
 * @param format the format it was read with
 * @param rows number of data rows
 * @param intervalS median sampling interval, s
 * @param startS first time, s since 1970-01-01T00:00Z on the logger's clock
 * @param endS last time
 * @param zoned true if the stamps carried their zone
 * @param series the channels in column order
 * @param findings what was odd, counted per channel and reason
 */
public record LogData(
        String file,
        LogFormat format,
        int rows,
        double intervalS,
        double startS,
        double endS,
        boolean zoned,
        List<Series> series,
        List<Finding> findings) {
    /** Copies the lists. */
    public LogData {
        series = List.copyOf(series);
        findings = List.copyOf(findings);
    }

    /** The series of a channel. */
    public Optional<Series> channel(String name) {
        return series.stream().filter(s -> s.channel().equals(name)).findFirst();
    }
}
