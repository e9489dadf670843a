package plateledger.demo.physics;

/**
 * A panel cut into cells.
 *
 * @param panel the panel
 * @param grid its cells
 */
public record MeshedPanel(Panel panel, PlateGrid grid) {
    /** Cuts a panel into cells. */
    public static MeshedPanel of(Panel panel, PlateGrid.Fineness fineness) {
        return new MeshedPanel(panel, PlateGrid.of(panel.stripEdgesM(), panel.widthM(), fineness));
    }
}
