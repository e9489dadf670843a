package plateledger.demo.app;

/**
 * The truth at one centre-line junction, by the campaign's definitions: local film temperature, x from the leading edge.
 *
 * @param channel its channel
 * @param xM its true place, m
 * @param faceK T_s
 * @param convectionWPerM2 q_conv
 * @param coefficient h, W/(m² K)
 * @param reynolds Re_x
 * @param nusselt Nu_x
 * @param prandtl Pr
 */
public record StationTruth(
        String channel,
        double xM,
        double faceK,
        double convectionWPerM2,
        double coefficient,
        double reynolds,
        double nusselt,
        double prandtl) {}
