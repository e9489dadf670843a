package plateledger.gui.model;

import java.util.List;
import java.util.Locale;
import plateledger.rig.Plate;

/**
 * The plate cut along its centre line, as it is drawn. Lengths in mm from the leading edge.
 *
 * @param name plate
 * @param orientation how the heated face lies, in words
 * @param lengthMm leading edge to trailing edge
 * @param heatedFromMm start of the heated sheet
 * @param heatedToMm its end
 * @param layers from the wetted face down: coat, sheet, foam
 * @param strips heater strips in order along the flow
 * @param junctions junctions in the sheet
 */
public record PlateSection(
        String name,
        String orientation,
        double lengthMm,
        double heatedFromMm,
        double heatedToMm,
        List<Layer> layers,
        List<Strip> strips,
        List<Junction> junctions) {
    private static final double MM_PER_M = 1000.0;

    /** What a layer is. */
    public enum LayerKind {
        /** Coat on the wetted face. */
        COAT,
        /** Conducting sheet with the heaters. */
        SHEET,
        /** Insulation. */
        FOAM
    }

    /**
     * One layer.
     *
     * @param kind what it is
     * @param material its material, in words
     * @param thicknessMm its thickness, mm
     */
    public record Layer(LayerKind kind, String material, double thicknessMm) {
        /** E.g. {@code coat 50 µm matt black paint}. */
        public String words() {
            String thickness = thicknessMm < 0.1
                    ? NumberText.plain(thicknessMm * MM_PER_M) + " µm"
                    : NumberText.plain(thicknessMm) + " mm";
            return kind.name().toLowerCase(Locale.ROOT) + " " + thickness + " " + material;
        }
    }

    /**
     * One heater strip.
     *
     * @param id name
     * @param fromMm upstream edge
     * @param toMm downstream edge
     */
    public record Strip(String id, double fromMm, double toMm) {}

    /**
     * One junction.
     *
     * @param channel its channel
     * @param xMm place along the flow
     * @param zMm place across the flow, 0 on the centre line
     * @param depthMm depth below the sheet's wetted face
     */
    public record Junction(String channel, double xMm, double zMm, double depthMm) {}

    /** Copies the lists. */
    public PlateSection {
        layers = List.copyOf(layers);
        strips = List.copyOf(strips);
        junctions = List.copyOf(junctions);
    }

    /** The section of a plate. */
    public static PlateSection of(Plate plate) {
        return new PlateSection(
                plate.id(),
                orientation(plate.orientation()),
                plate.lengthM().value() * MM_PER_M,
                plate.heatedStartM().value() * MM_PER_M,
                plate.heatedEndM().value() * MM_PER_M,
                List.of(
                        layer(
                                LayerKind.COAT,
                                plate.coat().material(),
                                plate.coat().thicknessM().value()),
                        layer(
                                LayerKind.SHEET,
                                plate.sheet().material(),
                                plate.sheet().thicknessM().value()),
                        layer(
                                LayerKind.FOAM,
                                plate.foam().material(),
                                plate.foam().thicknessM().value())),
                plate.heaters().stream()
                        .map(h -> new Strip(h.id(), h.fromM() * MM_PER_M, h.toM() * MM_PER_M))
                        .toList(),
                plate.thermocouples().stream()
                        .map(t -> new Junction(
                                t.channel(),
                                t.xM().value() * MM_PER_M,
                                t.zM() * MM_PER_M,
                                t.depthM().value() * MM_PER_M))
                        .toList());
    }

    /** The strip over which a place lies; the place itself as a strip of no width where there is none. */
    public Strip stripAt(double xMm) {
        return strips.stream()
                .filter(s -> s.fromMm() <= xMm && xMm <= s.toMm())
                .findFirst()
                .orElse(new Strip("", xMm, xMm));
    }

    private static Layer layer(LayerKind kind, String material, double thicknessM) {
        return new Layer(kind, material, thicknessM * MM_PER_M);
    }

    private static String orientation(Plate.Orientation orientation) {
        return switch (orientation) {
            case FACE_UP -> "heated face up";
            case FACE_DOWN -> "heated face down (drawn face up)";
            case VERTICAL -> "vertical (drawn lying)";
        };
    }
}
