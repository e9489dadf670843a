package plateledger.campaign;

import java.time.ZoneId;
import java.util.Map;
import java.util.Optional;
import plateledger.log.LogFormat;
import plateledger.quantity.Stated;

/**
 * One logger: its text format, its clock, and which of its columns are which channels.
 *
 * @param id name, e.g. {@code plate}
 * @param format declared text format; empty to detect it in each file
 * @param zone zone of its time stamps where they carry none
 * @param clockOffsetS logger clock minus true time at the start of each file, s
 * @param clockRate relative rate error, (logger seconds − true seconds) per true second
 * @param clockDeclared false if the offset was not declared but assumed to be zero
 * @param columns channel name by column title, for columns whose title is not the channel name
 */
public record Logger(
        String id,
        Optional<LogFormat> format,
        ZoneId zone,
        Stated clockOffsetS,
        Stated clockRate,
        boolean clockDeclared,
        Map<String, String> columns) {
    /** Copies the map. */
    public Logger {
        columns = Map.copyOf(columns);
    }
}
