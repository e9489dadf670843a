package plateledger.theory;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;

/** Whether the layer over the plate can be what the campaign says it is. */
public final class LayerChecks {
    /** Smallest U d/ν of a wire that trips the layer at once. */
    static final double WIRE_REYNOLDS = 850.0;

    /** Smallest momentum-thickness Reynolds number of a turbulent layer. */
    static final double LOWEST_TURBULENT = 320.0;

    /** Re_x up to which a layer in a quiet stream is usually laminar. */
    static final double LAMINAR_LIMIT = 5e5;

    private static final String WIRE_SOURCE =
            "wire fully effective from U d/nu of about 850 (Gibbings 1959: 826), from memory";
    private static final String TURBULENT_SOURCE =
            "Preston, J. Fluid Mech. 3 (1958) 373: Re_theta of about 320, from memory";
    private static final String LAMINAR_SOURCE =
            "texts: Re_x 5e5; onset observed from 5e4 (turbulence 5 %) to 3e6 (below 0.1 %)";

    private LayerChecks() {}

    /**
     * Checks of a tripped layer.
     *
     * @param subject what is judged, e.g. a run's name
     * @param place where it is declared
     * @param tripM trip, m from the leading edge
     * @param wireM wire diameter, m
     * @param firstStationM first station used, m from the leading edge
     * @param reynoldsPerMetre U/ν, 1/m
     */
    public static List<Finding> tripped(
            String subject, Place place, double tripM, double wireM, double firstStationM, double reynoldsPerMetre) {
        List<Finding> findings = new ArrayList<>();
        double wire = reynoldsPerMetre * wireM;
        if (!(wire >= WIRE_REYNOLDS)) {
            findings.add(new Finding(
                    "THEORY-TRIP-WIRE",
                    Level.CAUTION,
                    place,
                    subject,
                    format("trip wire Reynolds number %.0f", wire),
                    format("at least about %.0f", WIRE_REYNOLDS),
                    format("Use a wire of %.1f mm or more, or a higher speed", 1e3 * WIRE_REYNOLDS / reynoldsPerMetre),
                    WIRE_SOURCE));
        }
        double origin = FlatPlate.virtualOrigin(tripM, reynoldsPerMetre);
        double atStation = reynoldsPerMetre
                * FlatPlate.momentumThickness(LayerLaw.TURBULENT, firstStationM - origin, reynoldsPerMetre);
        if (!(atStation >= LOWEST_TURBULENT)) {
            findings.add(new Finding(
                    "THEORY-RE-THETA",
                    Level.NOTE,
                    place,
                    subject,
                    format("momentum-thickness Reynolds number %.0f at x = %.0f mm", atStation, 1e3 * firstStationM),
                    format("at least about %.0f for a developed turbulent layer", LOWEST_TURBULENT),
                    format(
                            "Trust the turbulent theory from x = %.0f mm on; the wire's own drag, which helps, is left out",
                            1e3 * developedFrom(origin, reynoldsPerMetre)),
                    TURBULENT_SOURCE));
        }
        return List.copyOf(findings);
    }

    /**
     * Check of a layer declared laminar to the end of the heated part.
     *
     * @param subject what is judged
     * @param place where it is declared
     * @param endM end of the heated part, m from the leading edge
     * @param reynoldsPerMetre U/ν, 1/m
     */
    public static List<Finding> laminar(String subject, Place place, double endM, double reynoldsPerMetre) {
        double reynolds = endM * reynoldsPerMetre;
        if (reynolds <= LAMINAR_LIMIT) {
            return List.of();
        }
        return List.of(new Finding(
                "THEORY-LAMINAR-RE",
                Level.CAUTION,
                place,
                subject,
                format("Re_x = %.3g at the end of a layer declared laminar", reynolds),
                format("at most about %.0e", LAMINAR_LIMIT),
                "Show that the layer is laminar (slope of Nu over Re), or trip it",
                LAMINAR_SOURCE));
    }

    /** Where 0.037 Re_X^0.8 reaches the lowest turbulent Re_θ, m from the leading edge. */
    private static double developedFrom(double origin, double reynoldsPerMetre) {
        return origin + Math.pow(LOWEST_TURBULENT / FlatPlate.TURBULENT_MOMENTUM, 1.25) / reynoldsPerMetre;
    }

    private static String format(String text, Object... values) {
        return String.format(Locale.ROOT, text, values);
    }
}
