package plateledger.demo.physics;

/**
 * Where the heat of the whole heated area went, W, positive when it leaves the sheet.
 *
 * @param electrical into the sheet
 * @param convection to the stream
 * @param radiation to the walls
 * @param cover through the cover of a loss run
 * @param back U_b (T − T_plenum) over the area
 * @param edge to the frame at both sides
 * @param nose out of the upstream end
 * @param tail out of the downstream end
 * @param storage into sheet and foam: sheet capacity × dT/dt plus what enters the foam beyond {@code back}
 */
public record HeatBooks(
        double electrical,
        double convection,
        double radiation,
        double cover,
        double back,
        double edge,
        double nose,
        double tail,
        double storage) {
    /** What the books do not explain, W: 0 but for rounding. */
    public double residual() {
        return electrical - convection - radiation - cover - back - edge - nose - tail - storage;
    }
}
