package plateledger.report;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.finding.RefusedException;

/**
 * The folder results go to: replaced whole or left as it was. New files are written into a sibling folder first; then the
 * former folder is set aside, the new one takes its name, and the former one is deleted. Whatever happens in between, one
 * of the two is there, and the next start puts things right.
 */
public final class OutputFolder {
    /** How one file is written; handed in so that a full disk can be tried out. */
    public interface Writing {
        /** Writes a file that does not exist yet, in a folder that does. */
        void write(Path file, byte[] content) throws IOException;
    }

    /** Writes to the disk; what every start of the program uses. */
    public static final Writing TO_DISK = (file, content) -> Files.write(file, content);

    private final Path target;
    private final Path fresh;
    private final Path former;
    private final Writing writing;

    private OutputFolder(Path target, Writing writing) {
        this.target = target;
        Path name = target.getFileName();
        String last = name == null ? "out" : name.toString();
        this.fresh = target.resolveSibling("." + last + "-new");
        this.former = target.resolveSibling("." + last + "-former");
        this.writing = writing;
    }

    /**
     * Makes ready to write into a folder: puts an interrupted earlier replacement right and refuses a folder that holds
     * anything but earlier results.
     *
     * @param target the output folder; need not exist
     * @throws RefusedException if it may not be replaced
     */
    public static OutputFolder prepare(Path target) throws RefusedException {
        return prepare(target, TO_DISK);
    }

    /** As {@link #prepare(Path)}, with another way to write files. */
    public static OutputFolder prepare(Path target, Writing writing) throws RefusedException {
        Path absolute = target.toAbsolutePath().normalize();
        OutputFolder folder = new OutputFolder(absolute, writing);
        try {
            folder.restore();
            folder.check();
        } catch (IOException e) {
            throw folder.notWritable(e);
        }
        return folder;
    }

    /** The output folder, absolute. */
    public Path path() {
        return target;
    }

    private void restore() throws IOException {
        boolean here = Files.exists(target, LinkOption.NOFOLLOW_LINKS);
        if (AuditJson.marks(former)) {
            if (here) {
                delete(former);
            } else {
                Files.move(former, target, StandardCopyOption.ATOMIC_MOVE);
            }
        }
    }

    private void check() throws IOException, RefusedException {
        if (!Files.exists(target, LinkOption.NOFOLLOW_LINKS)) {
            return;
        }
        if (!Files.isDirectory(target, LinkOption.NOFOLLOW_LINKS)) {
            throw refused(
                    "OUT-NOT-A-FOLDER",
                    "something that is no folder",
                    "a folder, or nothing yet",
                    "Name another place with --out.");
        }
        if (!isEmpty(target) && !AuditJson.marks(target)) {
            throw refused(
                    "OUT-NOT-OURS",
                    "a folder that holds something else than results (no audit.json of this program)",
                    "a folder of earlier results, an empty one, or none",
                    "Name another place with --out, or empty that folder yourself.");
        }
    }

    /**
     * Replaces the folder's content.
     *
     * @param files what it shall hold, {@code audit.json} among it
     * @throws RefusedException if it cannot be written; the former content is then untouched
     */
    public void replace(List<ResultFile> files) throws RefusedException {
        if (files.stream().noneMatch(f -> f.name().equals(AuditJson.FILE))) {
            throw new IllegalArgumentException("results without " + AuditJson.FILE + " could never be replaced again");
        }
        try {
            clearFresh();
            writeAll(files);
        } catch (IOException e) {
            RefusedException why = explain(e, files);
            deleteIfPossible(fresh);
            throw why;
        } catch (RuntimeException | Error fault) {
            deleteIfPossible(fresh);
            throw fault;
        }
        boolean hadFormer = Files.exists(target, LinkOption.NOFOLLOW_LINKS);
        try {
            if (hadFormer) {
                Files.move(target, former, StandardCopyOption.ATOMIC_MOVE);
            }
            try {
                Files.move(fresh, target, StandardCopyOption.ATOMIC_MOVE);
            } catch (IOException e) {
                if (hadFormer) {
                    Files.move(former, target, StandardCopyOption.ATOMIC_MOVE);
                }
                throw e;
            }
        } catch (IOException e) {
            deleteIfPossible(fresh);
            throw notWritable(e);
        }
        if (hadFormer) { // otherwise a folder of that name is somebody else's
            deleteIfPossible(former);
        }
    }

    private void clearFresh() throws IOException, RefusedException {
        if (!Files.exists(fresh, LinkOption.NOFOLLOW_LINKS)) {
            return;
        }
        boolean left = Files.isDirectory(fresh, LinkOption.NOFOLLOW_LINKS)
                && (isEmpty(fresh) || Files.exists(fresh.resolve(AuditJson.FILE)));
        if (!left) {
            throw refused(
                    "OUT-SIBLING-NOT-OURS",
                    "beside it, " + fresh.getFileName() + " that holds something else than results",
                    "that name free for writing",
                    "Move " + fresh.getFileName() + " away.");
        }
        delete(fresh);
    }

    private void writeAll(List<ResultFile> files) throws IOException {
        Files.createDirectories(fresh);
        // The mark goes first: a folder left behind by a power cut is then known as ours.
        List<ResultFile> markFirst = new ArrayList<>(files);
        markFirst.sort(Comparator.comparing((ResultFile f) -> !f.name().equals(AuditJson.FILE)));
        for (ResultFile file : markFirst) {
            Path path = fresh.resolve(file.name());
            Path parent = path.getParent();
            if (parent != null) {
                Files.createDirectories(parent);
            }
            writing.write(path, file.content());
        }
    }

    private RefusedException explain(IOException e, List<ResultFile> files) {
        long need = files.stream().mapToLong(f -> f.content().length).sum();
        String message = String.valueOf(e.getMessage());
        long free = Long.MAX_VALUE;
        try {
            free = Files.getFileStore(fresh).getUsableSpace();
        } catch (IOException unknown) {
            message = message + " (" + unknown.getMessage() + ")";
        }
        if (message.contains("No space left") || message.contains("not enough space") || free < need) {
            return refused(
                    "OUT-DISK-FULL",
                    "the disk is full: " + e.getMessage(),
                    "about " + (need / 1024 + 1) + " kB free",
                    "Make room, or name a place on another disk with --out. Earlier results are as they were.");
        }
        return notWritable(e);
    }

    private RefusedException notWritable(IOException e) {
        return refused(
                "OUT-NOT-WRITABLE",
                "it cannot be written: " + reason(e),
                "a folder that may be made and written",
                "Give yourself the right to write there, or name another place with --out. Earlier results are as they"
                        + " were.");
    }

    /** What the system says, in words: some of its messages are a bare path. */
    private static String reason(IOException e) {
        if (e instanceof FileSystemException place && place.getFile() != null) {
            String why = place.getReason();
            String words = e instanceof AccessDeniedException
                    ? "access denied"
                    : e instanceof FileAlreadyExistsException
                            ? "a file is in the way"
                            : why == null ? e.getClass().getSimpleName() : why;
            return words + " (" + place.getFile() + ")";
        }
        return String.valueOf(e.getMessage());
    }

    private RefusedException refused(String id, String found, String expected, String remedy) {
        return new RefusedException(
                new Finding(id, Level.STOP, Place.of(target.toString()), "output folder", found, expected, remedy, ""));
    }

    private static boolean isEmpty(Path folder) throws IOException {
        try (Stream<Path> entries = Files.list(folder)) {
            return entries.findAny().isEmpty();
        }
    }

    /** Deletes what can be deleted; true if nothing is left. What is left, the next start clears away. */
    private static boolean deleteIfPossible(Path folder) {
        try {
            if (Files.exists(folder, LinkOption.NOFOLLOW_LINKS)) {
                delete(folder);
            }
            return true;
        } catch (IOException left) {
            return false;
        }
    }

    private static void delete(Path folder) throws IOException {
        List<Path> deepestFirst;
        try (Stream<Path> all = Files.walk(folder)) {
            deepestFirst = all.sorted(Comparator.reverseOrder()).toList();
        }
        for (Path path : deepestFirst) {
            Files.delete(path);
        }
    }
}
