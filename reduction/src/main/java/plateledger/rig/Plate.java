package plateledger.rig;

import java.util.List;
import plateledger.quantity.Stated;

/**
 * One instrumented plate (a panel under test). Lengths along the flow are measured from the leading edge, across the
 * flow from the centre line; SI throughout.
 *
 * @param id name of the panel, used as its scope
 * @param description one line for the report
 * @param orientation how the heated face lies
 * @param lengthM leading edge to trailing edge, m
 * @param widthM span of the heated sheet, m
 * @param heatedStartM where the heated sheet starts, m from the leading edge (the unheated length)
 * @param heatedEndM where it ends, m from the leading edge
 * @param sheet the conducting sheet
 * @param coat the coat on the wetted face
 * @param foam the insulation behind
 * @param emissivity total hemispherical emissivity of the coat, 0..1
 * @param backConductanceWPerM2K declared conductance sheet to plenum, W/(m² K), a prior for the loss runs
 * @param edgeConductanceWPerMK declared conductance of each side edge, sheet edge to frame, W/(m K), a prior
 * @param noseConductanceWPerK conductance from the sheet's upstream end to the nose sensor, whole span, W/K
 * @param tailConductanceWPerK the same at the downstream end, W/K
 * @param coverConductanceWPerK conductance of the loss-run cover between its two faces, whole heated area, W/K
 * @param smoothShape the shape of h(x) that the inverse step takes as smooth
 * @param heaters strips in order along the flow, without gaps or overlaps
 * @param thermocouples junctions on the sheet
 */
public record Plate(
        String id,
        String description,
        Orientation orientation,
        Stated lengthM,
        Stated widthM,
        Stated heatedStartM,
        Stated heatedEndM,
        Sheet sheet,
        Coat coat,
        Foam foam,
        Stated emissivity,
        Stated backConductanceWPerM2K,
        Stated edgeConductanceWPerMK,
        Stated noseConductanceWPerK,
        Stated tailConductanceWPerK,
        Stated coverConductanceWPerK,
        SmoothShape smoothShape,
        List<Heater> heaters,
        List<Thermocouple> thermocouples) {

    /** How the heated face lies. */
    public enum Orientation {
        /** Horizontal, heated face up. */
        FACE_UP,
        /** Horizontal, heated face down. */
        FACE_DOWN,
        /** Vertical, flow upward. */
        VERTICAL
    }

    /** The shape of h(x) on which the inverse step puts no penalty. */
    public enum SmoothShape {
        /** h of a uniform-temperature step in a boundary layer of the run's regime. */
        BOUNDARY_LAYER,
        /** h uniform over the heated length. */
        UNIFORM
    }

    /**
     * The conducting sheet.
     *
     * @param material name, for the report and the material limits
     * @param thicknessM thickness, m
     * @param conductivityWPerMK conductivity, W/(m K)
     * @param heatCapacityJPerM3K volumetric heat capacity, J/(m³ K)
     */
    public record Sheet(String material, Stated thicknessM, Stated conductivityWPerMK, Stated heatCapacityJPerM3K) {}

    /**
     * The coat on the wetted face.
     *
     * @param material name
     * @param thicknessM thickness, m
     * @param conductivityWPerMK conductivity, W/(m K)
     */
    public record Coat(String material, Stated thicknessM, Stated conductivityWPerMK) {}

    /**
     * The insulation behind the sheet.
     *
     * @param material name, for the report and the material limits
     * @param thicknessM thickness, m
     * @param heatCapacityJPerM3K volumetric heat capacity, J/(m³ K)
     */
    public record Foam(String material, Stated thicknessM, Stated heatCapacityJPerM3K) {}

    /**
     * One heater strip over the full width.
     *
     * @param id name, e.g. {@code H3}
     * @param fromM upstream edge, m from the leading edge, exact
     * @param toM downstream edge, m from the leading edge, exact
     * @param leadResistanceOhm resistance between the sense points and the active strip, Ω
     * @param voltageChannel channel of the voltage at the sense points
     * @param currentChannel channel of the current
     * @param ratedW largest permitted power, W
     */
    public record Heater(
            String id,
            double fromM,
            double toM,
            Stated leadResistanceOhm,
            String voltageChannel,
            String currentChannel,
            double ratedW) {}

    /**
     * One junction on the sheet.
     *
     * @param channel its channel name, e.g. {@code T05}
     * @param xM place along the flow, m from the leading edge
     * @param zM place across the flow, m from the centre line, signed, exact
     * @param depthM depth of the junction below the metal's coated face, m
     * @param stemFraction part of (sheet − plenum) by which the wires make the junction read low, dimensionless
     */
    public record Thermocouple(String channel, Stated xM, double zM, Stated depthM, Stated stemFraction) {
        /** True on the centre line, where the stations are. */
        public boolean onCentreLine() {
            return zM == 0.0;
        }
    }

    /** Copies the lists. */
    public Plate {
        heaters = List.copyOf(heaters);
        thermocouples = List.copyOf(thermocouples);
    }

    /** Junctions on the centre line in order along the flow: the stations. */
    public List<Thermocouple> stations() {
        return thermocouples.stream()
                .filter(Thermocouple::onCentreLine)
                .sorted(java.util.Comparator.comparingDouble(t -> t.xM().value()))
                .toList();
    }

    /** Junctions off the centre line, in the order declared. */
    public List<Thermocouple> offCentre() {
        return thermocouples.stream().filter(t -> !t.onCentreLine()).toList();
    }
}
