package plateledger.demo.physics;

/**
 * One panel as it really is (not as declared). SI.
 *
 * @param stripEdgesM edges of the heater strips from the leading edge, the first and last being the sheet's ends, m
 * @param widthM span of the sheet, m
 * @param thicknessM sheet thickness, m
 * @param conductivityWPerMK sheet conductivity, W/(m K)
 * @param capacityJPerM3K sheet heat capacity per volume, J/(m³ K)
 * @param coatM2KPerW resistance of the coat, m² K/W
 * @param emissivity of the coat
 * @param backWPerM2K conductance sheet to plenum, W/(m² K)
 * @param foamJPerM2K heat capacity of the foam per area, J/(m² K)
 * @param edgeWPerMK conductance of each side edge to the frame, W/(m K)
 * @param noseWPerK conductance of the upstream end over the whole span, W/K
 * @param tailWPerK the same downstream, W/K
 * @param coverWPerK conductance of the cover used in loss runs over the whole heated area, W/K
 */
public record Panel(
        double[] stripEdgesM,
        double widthM,
        double thicknessM,
        double conductivityWPerMK,
        double capacityJPerM3K,
        double coatM2KPerW,
        double emissivity,
        double backWPerM2K,
        double foamJPerM2K,
        double edgeWPerMK,
        double noseWPerK,
        double tailWPerK,
        double coverWPerK) {

    /** Start of the heated part, m from the leading edge. */
    public double startM() {
        return stripEdgesM[0];
    }

    /** End of the heated part, m from the leading edge. */
    public double endM() {
        return stripEdgesM[stripEdgesM.length - 1];
    }

    /** Heated area, m². */
    public double areaM2() {
        return widthM * (endM() - startM());
    }

    /** Conductivity times thickness, W/K. */
    public double sheetWPerK() {
        return conductivityWPerMK * thicknessM;
    }

    /** Resistance from the back of the sheet, where its temperature is counted, to the coat's face, m² K/W. */
    public double faceM2KPerW() {
        return coatM2KPerW + thicknessM / conductivityWPerMK;
    }
}
