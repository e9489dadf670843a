package plateledger.audit;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.finding.RefusedException;

/**
 * What a result came from. Holds no time and no path of the machine.
 *
 * @param program the program
 * @param settings choices made outside the campaign's files, by name, e.g. {@code runs = all}
 * @param files every file read, relative to the campaign folder, in alphabetical order
 */
public record AuditRecord(Program program, Map<String, String> settings, List<HashedFile> files) {
    /**
     * One file read.
     *
     * @param name path relative to the campaign folder, with '/'
     * @param bytes its size
     * @param sha256 SHA-256 of its bytes, hexadecimal
     */
    public record HashedFile(String name, long bytes, String sha256) {}

    /** Copies the collections. */
    public AuditRecord {
        settings = Collections.unmodifiableMap(new TreeMap<>(settings));
        files = List.copyOf(files);
    }

    /**
     * Hashes the files of a campaign.
     *
     * @param folder campaign folder
     * @param names files read, relative to it, with '/'; in any order
     * @param settings choices made outside the campaign's files
     * @throws RefusedException if a file cannot be read any more
     */
    public static AuditRecord of(Path folder, List<String> names, Map<String, String> settings)
            throws RefusedException {
        List<HashedFile> files = new ArrayList<>();
        List<Finding> unreadable = new ArrayList<>();
        for (String name : names.stream().distinct().sorted().toList()) {
            Path file = folder.resolve(name);
            try {
                files.add(new HashedFile(name, java.nio.file.Files.size(file), Digests.sha256(file)));
            } catch (IOException e) {
                unreadable.add(new Finding(
                        "AUDIT-UNREADABLE",
                        Level.STOP,
                        Place.of(name),
                        "input file",
                        "it can no longer be read: " + e.getMessage(),
                        "the file that was read a moment ago",
                        "Leave the campaign folder alone during a reduction and start again.",
                        ""));
            }
        }
        if (!unreadable.isEmpty()) {
            throw new RefusedException(unreadable);
        }
        return new AuditRecord(Program.running(), settings, files);
    }
}
