package plateledger.demo.physics;

/** How heat leaves the outer face apart from radiation. */
public sealed interface Convection {
    /**
     * One coefficient everywhere; the face radiates to the walls.
     *
     * @param coefficient h, W/(m² K)
     */
    record Uniform(double coefficient) implements Convection {}

    /**
     * A boundary layer: flux per cell = matrix × (wall temperature above T_aw); the face radiates to the walls.
     *
     * @param matrix lower triangular, W/(m² K)
     */
    record Layer(double[][] matrix) implements Convection {}

    /**
     * The loss run's cover lies on the face: no flow, no radiation.
     *
     * @param coefficient conductance of the cover per area, W/(m² K)
     */
    record Cover(double coefficient) implements Convection {}
}
