package plateledger.demo.physics;

/**
 * Fields of the plate at one instant, cells [j][i] of half the span, the edges included, with what surrounds it.
 *
 * @param panel the panel
 * @param grid the cells
 * @param sheet temperature at the back of the sheet, K
 * @param face temperature of the coat's outer face, K
 * @param flux leaving through the face, W/m²
 * @param radiation part of {@code flux}, W/m²
 * @param surround temperatures around
 * @param books where the heat of the whole area went
 * @param covered true in a loss run
 * @param stripW heat into each strip, W
 */
public record PlateState(
        Panel panel,
        PlateGrid grid,
        double[][] sheet,
        double[][] face,
        double[][] flux,
        double[][] radiation,
        Surround surround,
        HeatBooks books,
        boolean covered,
        double[] stripW) {

    /** Area mean of the face temperature, K. */
    public double meanFaceK() {
        return mean(face);
    }

    /** Area mean of the sheet temperature, K. */
    public double meanSheetK() {
        return mean(sheet);
    }

    /** ∫q_conv dA ÷ ∫(T_s − T_aw) dA, W/(m² K). */
    public double meanCoefficient() {
        return books.convection() / (panel.areaM2() * (meanFaceK() - surround.adiabaticK()));
    }

    /** Temperature of a junction {@code depthM} below the metal's coated face, K. */
    public double junctionK(double x, double z, double depthM) {
        double metal = panel.coatM2KPerW() + depthM / panel.conductivityWPerMK();
        return grid.at(face, x, z) + grid.at(flux, x, z) * metal;
    }

    /** Face temperature, K. */
    public double faceK(double x, double z) {
        return grid.at(face, x, z);
    }

    /** Heat leaving through the face, W/m². */
    public double fluxWPerM2(double x, double z) {
        return grid.at(flux, x, z);
    }

    /** Radiation, W/m². */
    public double radiationWPerM2(double x, double z) {
        return grid.at(radiation, x, z);
    }

    private double mean(double[][] field) {
        double sum = 0.0;
        double area = 0.0;
        for (int j = 0; j < grid.across(); j++) {
            for (int i = 0; i < grid.along(); i++) {
                double a = grid.width(j) * grid.length(i);
                sum += a * field[j][i];
                area += a;
            }
        }
        return sum / area;
    }
}
