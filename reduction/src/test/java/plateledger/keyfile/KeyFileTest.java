package plateledger.keyfile;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import plateledger.finding.Finding;
import plateledger.finding.Place;
import plateledger.quantity.Dimension;
import plateledger.quantity.Stated;

/** Decoding, places, and what is said of keys that are missing, unknown or of the wrong type. */
final class KeyFileTest {
    private final List<Finding> findings = new ArrayList<>();

    @TempDir
    private Path folder;

    @Test
    void stripsAByteOrderMark() throws Exception {
        Files.writeString(folder.resolve("a.toml"), "\uFEFFtitle = \"x\"\n");
        KeyTable root = KeyFile.read(folder, "a.toml", findings).orElseThrow().root();
        assertEquals("x", root.need("title", Form.text()));
        assertEquals(new Place("a.toml", 1, 1), root.place("title"));
        assertEquals(List.of(), findings);
    }

    @Test
    void namesTheFirstByteThatIsNotUtf8WithItsLine() throws Exception {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        bytes.write("title = \"ü\"\nlimit = \"75 ".getBytes(StandardCharsets.UTF_8));
        bytes.write(0xB0); // ° of ISO 8859-1
        bytes.write("C\"\n".getBytes(StandardCharsets.UTF_8));
        Files.write(folder.resolve("a.toml"), bytes.toByteArray());
        assertTrue(KeyFile.read(folder, "a.toml", findings).isEmpty());
        assertEquals(1, findings.size());
        assertEquals("FILE-BYTES", findings.get(0).id());
        assertEquals(new Place("a.toml", 2, 13), findings.get(0).place());
        assertTrue(findings.get(0).found().contains("0xB0"), findings.get(0).found());
    }

    @Test
    void aCharacterCutOffAtTheEndIsFound() throws Exception {
        Files.write(folder.resolve("a.toml"), new byte[] {'a', '=', '1', '\n', '#', (byte) 0xC2});
        assertTrue(KeyFile.read(folder, "a.toml", findings).isEmpty());
        assertEquals(new Place("a.toml", 2, 2), findings.get(0).place());
    }

    @Test
    void aMissingFileIsOneFinding() {
        assertTrue(KeyFile.read(folder, "rig.toml", findings).isEmpty());
        assertEquals("FILE-MISSING", findings.get(0).id());
        assertEquals("rig.toml", findings.get(0).place().file());
    }

    @Test
    void allSyntaxErrorsAreListedWithTheirPlaces() {
        assertTrue(
                KeyFile.parse("a = 12 mm\nb = 3\nc = 1,5\n", "a.toml", findings).isEmpty());
        assertEquals(
                List.of(new Place("a.toml", 1, 8), new Place("a.toml", 3, 6)),
                findings.stream().map(Finding::place).toList());
    }

    @Test
    void anUnknownKeySuggestsTheClosestKnownOne() {
        KeyFile file = parse("emisivity = 1\n[sheet]\nx = 2\n");
        assertTrue(file.root().find("emissivity", Form.number()).isEmpty());
        file.refuseUnknownKeys();
        assertEquals(2, findings.size());
        assertEquals("KEY-UNKNOWN", findings.get(0).id());
        assertEquals(new Place("a.toml", 1, 1), findings.get(0).place());
        assertEquals("Did you mean emissivity?", findings.get(0).remedy());
        assertEquals("sheet", findings.get(1).subject());
        assertFalse(
                findings.get(1).remedy().contains("Did you mean"),
                findings.get(1).remedy());
    }

    @Test
    void aMissingKeySaysWhereToAddIt() {
        KeyTable root = parse("[plate.a]\n").root();
        root.findNamed("plate", "id", (id, t) -> t.need("length", Form.measured(Dimension.LENGTH)));
        Finding missing = findings.get(0);
        assertEquals("KEY-MISSING", missing.id());
        assertEquals("plate.a.length", missing.subject());
        assertEquals(new Place("a.toml", 1, 1), missing.place());
        assertEquals("Add length to plate.a.", missing.remedy());
    }

    @Test
    void quantitiesWithoutQuotationMarksAreToldWhatTheyLack() {
        KeyTable root = parse("length = 3\nemissivity = 0.95\nshare = 0.01\n").root();
        root.need("length", Form.measured(Dimension.LENGTH));
        root.need("emissivity", Form.measured(Dimension.NUMBER));
        assertEquals(0.01, root.need("share", Form.setting(Dimension.NUMBER)));
        assertEquals(
                List.of("KEY-UNIT", "KEY-UNCERTAINTY"),
                findings.stream().map(Finding::id).toList());
        assertFalse(root.sound("length"));
        assertTrue(root.sound("share"));
    }

    @Test
    void wrongTypesNameWhatWasFound() {
        KeyTable root = parse("a = 1\nb = \"yes\"\nc = \"x\"\nd = \"2026-02-30\"\ne = [1]\nf = 1\n")
                .root();
        root.need("a", Form.text());
        root.need("b", Form.flag());
        root.need("c", Form.listOf(Form.text()));
        root.need("d", Form.date());
        root.need("e", Form.listOf(Form.text()));
        root.findTable("f", t -> t.path());
        assertEquals(
                List.of("1", "\"yes\"", "\"x\"", "\"2026-02-30\"", "1", "1"),
                findings.stream().map(Finding::found).toList());
        assertTrue(findings.stream().allMatch(finding -> finding.id().equals("KEY-TYPE")), findings.toString());
    }

    @Test
    void aFaultInATableMakesTheTablesAroundItUnsound() {
        KeyTable root = parse("[a.b]\nc = 1\n[d]\n").root();
        root.needTable("a", a -> a.needTable("b", b -> b.need("c", Form.text())));
        root.needTable("d", KeyTable::path);
        assertFalse(root.sound("a"));
        assertTrue(root.sound("d"));
    }

    @Test
    void likeCompletesTablesAndReplacesArrays() {
        KeyTable root = parse("""
                        [plate.c]
                        like = "b"
                        [plate.a]
                        length = "1 m (exact)"
                        list = ["x", "y"]
                        sheet = { k = "1 m (exact)", t = "2 m (exact)" }
                        [plate.b]
                        like = "a"
                        list = ["z"]
                        sheet = { t = "3 m (exact)" }
                        """).root();
        List<List<Object>> read = root.needNamedLike(
                "plate",
                "id",
                (id, t) -> List.of(
                        id,
                        t.need("length", metres()),
                        t.need("list", Form.listOf(Form.text())),
                        t.needTable("sheet", sheet -> List.of(sheet.need("k", metres()), sheet.need("t", metres())))));
        Stated one = Stated.exact(1.0);
        List<Object> b = List.of("b", one, List.of("z"), List.of(one, Stated.exact(3.0)));
        assertEquals(List.of("c", one, List.of("z"), List.of(one, Stated.exact(3.0))), read.get(0));
        assertEquals(List.of("a", one, List.of("x", "y"), List.of(one, Stated.exact(2.0))), read.get(1));
        assertEquals(b, read.get(2));
        assertEquals(List.of(), findings);
    }

    @Test
    void likeNamesWhatIsNotThereAndRings() {
        KeyTable root = parse("[p.a]\nlike = \"b\"\n[p.b]\nlike = \"a\"\n[p.c]\nlike = \"d\"\n")
                .root();
        root.needNamedLike("p", "id", (id, t) -> t.need("x", metres()));
        assertTrue(findings.stream().allMatch(finding -> finding.id().equals("KEY-LIKE")), findings.toString());
        assertEquals(
                List.of(2L, 4L, 6L),
                findings.stream()
                        .map(finding -> finding.place().line())
                        .sorted()
                        .distinct()
                        .toList());
    }

    @Test
    void aDryFileVisitsEveryTableOnceAndRefusesNothing() {
        KeyFile dry = KeyFile.dry();
        dry.root().needNamed("plate", "id", (id, t) -> t.findTables("heater", h -> h.need("from", metres())));
        assertEquals(
                List.of("plate", "plate.<id>.heater", "plate.<id>.heater[].from"),
                dry.accepted().stream().map(Key::path).toList());
        assertEquals(
                new Key("plate.<id>.heater[].from", "measured", "m", "required"),
                dry.accepted().get(2));
    }

    private static Form<Stated> metres() {
        return Form.measured(Dimension.LENGTH);
    }

    private KeyFile parse(String text) {
        return KeyFile.parse(text, "a.toml", findings).orElseThrow();
    }
}
