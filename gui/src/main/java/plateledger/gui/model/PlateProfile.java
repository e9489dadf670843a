package plateledger.gui.model;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plateledger.quantity.Estimate;
import plateledger.quantity.Temperature;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.RunResult;
import plateledger.reduce.StationResult;
import plateledger.rig.Plate;

/**
 * One run along the plate: its section, the temperatures above it and the heat booked below it. Lengths in mm from the
 * leading edge, temperatures in °C, fluxes in W/m²; intervals are half-widths at 95 %.
 *
 * @param runId run
 * @param section the plate's section
 * @param stations the stations in order along the flow; empty for a run without numbers
 */
public record PlateProfile(String runId, PlateSection section, List<Station> stations) {
    private static final double MM_PER_M = 1000.0;

    /**
     * One station.
     *
     * @param channel its junction's channel
     * @param xMm place, mm
     * @param surfaceC T_s, °C
     * @param surfaceU its interval, K
     * @param referenceC T_ref, °C
     * @param referenceU its interval, K
     * @param theoryC T_s that theory gives for the same convected flux, °C; NaN without theory
     * @param electrical heater flux, W/m²
     * @param parts booked fluxes, W/m²
     * @param partsU their intervals, W/m²
     */
    public record Station(
            String channel,
            double xMm,
            double surfaceC,
            double surfaceU,
            double referenceC,
            double referenceU,
            double theoryC,
            double electrical,
            Map<HeatPart, Double> parts,
            Map<HeatPart, Double> partsU) {
        /** Copies the maps. */
        public Station {
            parts = Map.copyOf(parts);
            partsU = Map.copyOf(partsU);
        }

        /** A part's flux, W/m²; NaN where it is not known. */
        public double part(HeatPart part) {
            return parts.getOrDefault(part, Double.NaN);
        }

        /** Half-width of a part's interval, W/m². */
        public double partU(HeatPart part) {
            return partsU.getOrDefault(part, Double.NaN);
        }
    }

    /** Copies the list. */
    public PlateProfile {
        stations = List.copyOf(stations);
    }

    /** The profile of a run; empty if the run has no plate. */
    public static Optional<PlateProfile> of(CampaignResult result, RunResult run) {
        return result.campaign().rig().plate(run.run().plate()).map(plate -> of(plate, run));
    }

    private static PlateProfile of(Plate plate, RunResult run) {
        List<Station> stations = run.values().map(RunResult.Values::stations).orElse(List.of()).stream()
                .map(PlateProfile::station)
                .toList();
        return new PlateProfile(run.run().id(), PlateSection.of(plate), stations);
    }

    /** True if at least one station has a theoretical surface temperature. */
    public boolean hasTheory() {
        return stations.stream().anyMatch(s -> Double.isFinite(s.theoryC()));
    }

    private static Station station(StationResult s) {
        Map<HeatPart, Double> parts = new EnumMap<>(HeatPart.class);
        Map<HeatPart, Double> partsU = new EnumMap<>(HeatPart.class);
        for (HeatPart part : HeatPart.values()) {
            Estimate flux = part.of(s);
            parts.put(part, flux.value());
            partsU.put(part, NumberText.u95(flux));
        }
        return new Station(
                s.channel(),
                s.x().value() * MM_PER_M,
                celsius(s.surface().value()),
                NumberText.u95(s.surface()),
                celsius(s.reference().value()),
                NumberText.u95(s.reference()),
                celsius(theoryK(s)),
                s.qElectrical().value(),
                parts,
                partsU);
    }

    private static double celsius(double kelvin) {
        return kelvin > 0.0 && kelvin < Double.POSITIVE_INFINITY ? new Temperature(kelvin).celsius() : Double.NaN;
    }

    /** Same flux, h of theory: T_ref + (T_s − T_ref) Nu_x / Nu_x,theory, since q = h (T_s − T_ref). */
    private static double theoryK(StationResult s) {
        double differenceK = s.surface().value() - s.reference().value();
        double ratio = s.nuX().value() / s.nuXTheory().value();
        return s.reference().value() + differenceK * ratio;
    }
}
