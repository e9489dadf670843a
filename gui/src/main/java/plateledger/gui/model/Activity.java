package plateledger.gui.model;

import java.nio.file.Path;

/** What the program is doing besides being looked at. */
public sealed interface Activity {
    /** True while a reduction runs. */
    boolean busy();

    /** Nothing. */
    record Idle() implements Activity {
        @Override
        public boolean busy() {
            return false;
        }
    }

    /**
     * A reduction runs.
     *
     * @param folder campaign being reduced
     * @param what what is being done, a few words
     * @param fraction 0..1 of the whole
     * @param stopping true once it was asked to stop
     */
    record Working(Path folder, String what, double fraction, boolean stopping) implements Activity {
        @Override
        public boolean busy() {
            return true;
        }
    }
}
