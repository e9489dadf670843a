package plateledger.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import plateledger.audit.AuditRecord;
import plateledger.audit.Program;
import plateledger.finding.RefusedException;

final class OutputFolderTest {
    private static final byte[] AUDIT = AuditJson.bytes(new AuditRecord(new Program("0", "0"), Map.of(), List.of()));

    @TempDir
    Path folder;

    private Path out = Path.of("");

    @BeforeEach
    void place() {
        out = folder.resolve("out");
    }

    private static List<ResultFile> files(String text) {
        return List.of(
                new ResultFile("runs.csv", text.getBytes(StandardCharsets.UTF_8)),
                new ResultFile("figures/a.svg", new byte[] {1}),
                new ResultFile("audit.json", AUDIT));
    }

    private List<String> beside() throws IOException {
        try (Stream<Path> entries = Files.list(folder)) {
            return entries.map(p -> String.valueOf(p.getFileName())).sorted().toList();
        }
    }

    @Test
    void writesANewFolderAndReplacesItWhole() throws Exception {
        OutputFolder.prepare(out).replace(files("first"));
        Files.writeString(out.resolve("stale.txt"), "left by an older version");
        OutputFolder.prepare(out).replace(files("second"));
        assertEquals("second", Files.readString(out.resolve("runs.csv")));
        assertTrue(Files.exists(out.resolve("figures/a.svg")));
        assertFalse(Files.exists(out.resolve("stale.txt")));
        assertEquals(List.of("out"), beside(), "nothing stays beside it");
    }

    @Test
    void takesAnEmptyFolder() throws Exception {
        Files.createDirectory(out);
        OutputFolder.prepare(out).replace(files("first"));
        assertEquals("first", Files.readString(out.resolve("runs.csv")));
        assertEquals(List.of("out"), beside());
    }

    @Test
    void makesFoldersAbove() throws Exception {
        Path deep = folder.resolve("a/b/results");
        OutputFolder.prepare(deep).replace(files("first"));
        assertTrue(Files.exists(deep.resolve("runs.csv")));
    }

    @Test
    void refusesAFolderThatHoldsSomethingElse() throws Exception {
        Files.createDirectory(out);
        Files.writeString(out.resolve("thesis.txt"), "years of work");
        RefusedException e = assertThrows(RefusedException.class, () -> OutputFolder.prepare(out));
        assertEquals("OUT-NOT-OURS", e.findings().get(0).id());
        assertTrue(e.findings().get(0).remedy().contains("--out"));
        assertEquals("years of work", Files.readString(out.resolve("thesis.txt")));
    }

    @Test
    void refusesAFolderWhoseAuditFileIsNotOurs() throws Exception {
        Files.createDirectory(out);
        for (String foreign : List.of("{\"format\": \"npm-audit/2\"}", "not json", "", "[1, 2, 3, 4, 5]")) {
            Files.writeString(out.resolve("audit.json"), foreign);
            RefusedException e = assertThrows(RefusedException.class, () -> OutputFolder.prepare(out));
            assertEquals("OUT-NOT-OURS", e.findings().get(0).id());
        }
    }

    @Test
    void refusesAFileInItsPlace() throws Exception {
        Files.writeString(out, "a file");
        RefusedException e = assertThrows(RefusedException.class, () -> OutputFolder.prepare(out));
        assertEquals("OUT-NOT-A-FOLDER", e.findings().get(0).id());
    }

    @Test
    void refusesAPlaceThatCannotBeWritten() throws Exception {
        Path file = folder.resolve("file");
        Files.writeString(file, "no folder");
        RefusedException e = assertThrows(
                RefusedException.class,
                () -> OutputFolder.prepare(file.resolve("below/out")).replace(files("x")));
        assertEquals("OUT-NOT-WRITABLE", e.findings().get(0).id());
    }

    @Test
    void aFullDiskLeavesFormerResultsUntouched() throws Exception {
        OutputFolder.prepare(out).replace(files("former"));
        OutputFolder full = OutputFolder.prepare(out, (file, content) -> {
            if (file.endsWith("runs.csv")) {
                Files.write(file, new byte[] {'h', 'a'});
                throw new IOException(file + ": No space left on device");
            }
            Files.write(file, content);
        });
        RefusedException e = assertThrows(RefusedException.class, () -> full.replace(files("new")));
        assertEquals("OUT-DISK-FULL", e.findings().get(0).id());
        assertEquals("former", Files.readString(out.resolve("runs.csv")));
        assertEquals(List.of("out"), beside(), "the half-written folder is gone");
    }

    @Test
    void anInterruptedReplacementIsPutRight() throws Exception {
        OutputFolder.prepare(out).replace(files("former"));
        Files.move(out, folder.resolve(".out-former")); // stopped between the two renames
        OutputFolder.prepare(out);
        assertEquals("former", Files.readString(out.resolve("runs.csv")));
        assertEquals(List.of("out"), beside());
    }

    @Test
    void aFormerFolderLeftBehindIsClearedAway() throws Exception {
        OutputFolder.prepare(out).replace(files("former"));
        Files.move(out, folder.resolve(".out-former")); // stopped before the former one was deleted
        Files.createDirectory(out);
        for (ResultFile file : files("new")) {
            Files.createDirectories(out.resolve("figures"));
            Files.write(out.resolve(file.name()), file.content());
        }
        OutputFolder.prepare(out);
        assertEquals("new", Files.readString(out.resolve("runs.csv")));
        assertEquals(List.of("out"), beside());
    }

    @Test
    void aFormerFolderThatIsNotOursIsNeverTouched() throws Exception {
        Path stranger = folder.resolve(".out-former");
        Files.createDirectory(stranger);
        Files.writeString(stranger.resolve("thesis.txt"), "years of work");
        OutputFolder.prepare(out).replace(files("first"));
        assertEquals("years of work", Files.readString(stranger.resolve("thesis.txt")));
        RefusedException e = assertThrows(
                RefusedException.class, () -> OutputFolder.prepare(out).replace(files("second")));
        assertEquals("OUT-NOT-WRITABLE", e.findings().get(0).id());
        assertEquals("first", Files.readString(out.resolve("runs.csv")));
    }

    @Test
    void aHalfWrittenSiblingOfAnEarlierCrashIsReplaced() throws Exception {
        Path fresh = folder.resolve(".out-new");
        Files.createDirectory(fresh);
        Files.write(fresh.resolve("audit.json"), AUDIT);
        Files.writeString(fresh.resolve("stations.csv"), "half");
        OutputFolder.prepare(out).replace(files("first"));
        assertFalse(Files.exists(out.resolve("stations.csv")));
        assertEquals(List.of("out"), beside());
    }

    @Test
    void aNameThatLeavesTheFolderIsABrokenContract() {
        assertThrows(IllegalArgumentException.class, () -> new ResultFile("../x", new byte[0]));
    }
}
