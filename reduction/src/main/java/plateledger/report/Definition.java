package plateledger.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import plateledger.campaign.Campaign;
import plateledger.campaign.Definitions;
import plateledger.quantity.Stated;
import plateledger.rig.Plate;
import plateledger.rig.Rig;

/** What the numbers mean, in sentences, and what the plates are. */
final class Definition {
    private Definition() {}

    /** One sentence per definition, as term and meaning. */
    static List<Map<String, Object>> sentences(Campaign campaign) {
        Definitions d = campaign.definitions();
        List<Map<String, Object>> list = new ArrayList<>();
        add(list, "T ref", "adiabatic wall temperature T∞ + r U²/(2 cₚ), in measurement and theory alike");
        add(
                list,
                "Properties",
                switch (d.properties()) {
                    case FILM ->
                        "at the film temperature ½ (Tₛ + T∞): local at stations, with the area mean of Tₛ for"
                                + " run averages; at the stream's water content";
                    case STREAM -> "at the stream temperature T∞ and the stream's water content";
                });
        add(
                list,
                "Length",
                switch (d.length()) {
                    case LEADING_EDGE ->
                        "run averages: leading edge to the end of the heated part; stations: x from the"
                                + " leading edge";
                    case HEATED -> "run averages: heated length; stations: x from the leading edge";
                });
        add(
                list,
                "Average",
                switch (d.average()) {
                    case FLUX_OVER_DIFFERENCE -> "h = ∫ q dA ÷ ∫ (Tₛ − T ref) dA over the heated area";
                    case MEAN_H -> "h = (1/L) ∫ h dx over the heated length";
                });
        add(list, "Area", "the heated area, over its whole span: leading edge of the first strip to end of the last");
        add(list, "Surface", "the outer face of the coat, which is what the air touches");
        add(list, "Prandtl exponent", Shown.exponent(d.prandtlExponent()) + ", held fixed in the fit");
        add(list, "±", "one standard uncertainty in tables; intervals, bars and bands are 95 %");
        return list;
    }

    private static void add(List<Map<String, Object>> list, String term, String meaning) {
        list.add(Map.of("term", term, "meaning", meaning));
    }

    /** The plates in one table. */
    static Map<String, Object> plates(Rig rig) {
        Grid grid = new Grid(
                "plate",
                "what it is",
                "heated face",
                "#heated, mm from the edge",
                "#width, mm",
                "sheet",
                "coat",
                "insulation",
                "#emissivity",
                "#strips",
                "#junctions");
        for (Plate plate : rig.plates()) {
            grid.row(
                    plate.id(),
                    plate.description(),
                    plate.orientation().name().toLowerCase(Locale.ROOT).replace('_', ' '),
                    mm(plate.heatedStartM()) + " to " + mm(plate.heatedEndM()),
                    mm(plate.widthM()),
                    mm(plate.sheet().thicknessM()) + "\u00a0mm " + plate.sheet().material(),
                    mm(plate.coat().thicknessM()) + "\u00a0mm " + plate.coat().material(),
                    mm(plate.foam().thicknessM()) + "\u00a0mm " + plate.foam().material(),
                    Shown.pm(plate.emissivity().estimate()),
                    String.valueOf(plate.heaters().size()),
                    String.valueOf(plate.thermocouples().size()));
        }
        return grid.model();
    }

    private static String mm(Stated metres) {
        return Shown.value(Shown.times(metres.estimate(), 1000.0));
    }
}
