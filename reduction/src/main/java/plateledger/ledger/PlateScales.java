package plateledger.ledger;

import plateledger.rig.Plate;

/** Scales of a plate at its declared values: how far conduction reaches, how much heat it stores. */
public final class PlateScales {
    private PlateScales() {}

    /**
     * The conduction length l = √(k t/h_total) of a plate, METHODS.md eq. (L-4).
     *
     * @param plate the plate
     * @param h heat transfer coefficient, W/(m² K), at least 0
     * @param surfaceK surface temperature, K
     * @return l, m
     */
    public static double conductionLengthM(Plate plate, double h, double surfaceK) {
        double total = h
                + LossTerm.Radiation.slope(1.0, plate.emissivity().value(), surfaceK)
                + plate.backConductanceWPerM2K().value();
        return SpanProfile.length(
                plate.sheet().conductivityWPerMK().value()
                        * plate.sheet().thicknessM().value(),
                total);
    }

    /** Radiation conductance of the heated area to the walls at a temperature, W/K, METHODS.md eq. (L-2) made linear. */
    public static double radiationConductanceWPerK(Plate plate, double exchangeFactor, double temperatureK) {
        double area = (plate.heatedEndM().value() - plate.heatedStartM().value())
                * plate.widthM().value();
        return area
                * LossTerm.Radiation.slope(exchangeFactor, plate.emissivity().value(), temperatureK);
    }

    /** Heat capacity of the heated area that moves with the sheet, J/K, METHODS.md eq. (L-7). */
    public static double heatCapacityJPerK(Plate plate) {
        double area = (plate.heatedEndM().value() - plate.heatedStartM().value())
                * plate.widthM().value();
        return area
                * LossTerm.Storage.capacityJPerM2K(
                        plate.sheet().heatCapacityJPerM3K().value(),
                        plate.sheet().thicknessM().value(),
                        plate.foam().heatCapacityJPerM3K().value(),
                        plate.foam().thicknessM().value());
    }
}
