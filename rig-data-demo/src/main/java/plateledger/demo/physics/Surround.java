package plateledger.demo.physics;

/**
 * Temperatures around the plate at one instant, K.
 *
 * @param adiabaticK adiabatic wall temperature of the stream; in a loss run the cover's room-side face
 * @param wallK tunnel walls the face radiates to
 * @param plenumK still air behind the foam
 * @param frameK frame at the side edges
 * @param noseK nose piece
 * @param tailK tail piece
 */
public record Surround(double adiabaticK, double wallK, double plenumK, double frameK, double noseK, double tailK) {}
