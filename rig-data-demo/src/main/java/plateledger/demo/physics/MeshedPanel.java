package plateledger.demo.physics;

/** A panel cut into cells, with what depends on nothing else worked out once. */
public final class MeshedPanel {
    private final Panel panel;
    private final PlateGrid grid;
    private final SpanModes modes;

    /** Cuts a panel into cells. */
    public MeshedPanel(Panel panel, PlateGrid.Fineness fineness) {
        this(panel, PlateGrid.of(panel.stripEdgesM(), panel.widthM(), fineness));
    }

    MeshedPanel(Panel panel, PlateGrid grid) {
        this.panel = panel;
        this.grid = grid;
        modes = new SpanModes(grid, panel.sheetWPerK(), panel.edgeWPerMK());
    }

    /** The panel. */
    public Panel panel() {
        return panel;
    }

    /** Its cells. */
    public PlateGrid grid() {
        return grid;
    }

    SpanModes modes() {
        return modes;
    }
}
