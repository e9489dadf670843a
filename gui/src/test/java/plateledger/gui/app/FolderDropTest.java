package plateledger.gui.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.StringSelection;
import java.awt.datatransfer.Transferable;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class FolderDropTest {
    @TempDir
    Path folder = Path.of(".");

    private final List<Path> opened = new ArrayList<>();
    private final List<String> problems = new ArrayList<>();
    private final FolderDrop drop = new FolderDrop(opened::add, problems::add);

    @Test
    void opensAFolderOrTheFolderOfAFile() throws IOException {
        assertTrue(drop.dropped(files(folder)));
        assertTrue(drop.dropped(files(Files.createFile(folder.resolve("campaign.toml")))));
        assertEquals(List.of(folder, folder), opened);
    }

    @Test
    void saysWhatToDropInstead() {
        assertFalse(drop.dropped(new StringSelection("text")));
        assertFalse(drop.dropped(files(folder, folder)));
        assertTrue(opened.isEmpty());
        assertEquals(
                "What was dropped is no campaign folder. Drop the folder that holds campaign.toml.", problems.get(1));
    }

    private static Transferable files(Path... paths) {
        List<File> files = java.util.Arrays.stream(paths).map(Path::toFile).toList();
        return new Transferable() {
            @Override
            public DataFlavor[] getTransferDataFlavors() {
                return new DataFlavor[] {DataFlavor.javaFileListFlavor};
            }

            @Override
            public boolean isDataFlavorSupported(DataFlavor flavor) {
                return DataFlavor.javaFileListFlavor.equals(flavor);
            }

            @Override
            public Object getTransferData(DataFlavor flavor) {
                return files;
            }
        };
    }
}
