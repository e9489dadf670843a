package plateledger.gui.app;

import java.awt.Component;
import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.Transferable;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.awt.dnd.DnDConstants;
import java.awt.dnd.DropTarget;
import java.awt.dnd.DropTargetAdapter;
import java.awt.dnd.DropTargetDropEvent;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;

/** Opens a campaign folder that is dropped onto the window. */
final class FolderDrop {
    private final Consumer<Path> onFolder;
    private final Consumer<String> onProblem;

    FolderDrop(Consumer<Path> onFolder, Consumer<String> onProblem) {
        this.onFolder = onFolder;
        this.onProblem = onProblem;
    }

    /** Accepts drops on a component and all it holds. */
    void on(Component component) {
        component.setDropTarget(new DropTarget(component, DnDConstants.ACTION_COPY, new DropTargetAdapter() {
            @Override
            public void drop(DropTargetDropEvent event) {
                event.acceptDrop(DnDConstants.ACTION_COPY);
                event.dropComplete(dropped(event.getTransferable()));
            }
        }));
    }

    /** Opens what was dropped: a folder, or the folder of a file such as campaign.toml. */
    boolean dropped(Transferable what) {
        try {
            if (what.isDataFlavorSupported(DataFlavor.javaFileListFlavor)
                    && what.getTransferData(DataFlavor.javaFileListFlavor) instanceof List<?> files) {
                Optional<Path> folder = folderOf(files);
                folder.ifPresent(onFolder);
                if (folder.isPresent()) {
                    return true;
                }
            }
            onProblem.accept("What was dropped is no campaign folder. Drop the folder that holds campaign.toml.");
        } catch (UnsupportedFlavorException | IOException problem) {
            onProblem.accept("What was dropped cannot be read: " + problem.getMessage());
        }
        return false;
    }

    private static Optional<Path> folderOf(List<?> files) {
        if (files.size() != 1 || !(files.get(0) instanceof File file)) {
            return Optional.empty();
        }
        Path path = file.toPath();
        return Files.isDirectory(path) ? Optional.of(path) : Optional.ofNullable(path.getParent());
    }
}
