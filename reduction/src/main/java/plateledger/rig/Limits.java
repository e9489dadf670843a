package plateledger.rig;

import plateledger.quantity.Temperature;

/**
 * Limits declared for the rig.
 *
 * @param surface highest permitted temperature of the heated surface
 * @param touchable true if a person can reach the surface while it is hot
 * @param surfaceClass class of surface in the contact-burn table: {@code bare metal}, {@code coated metal},
 *     {@code ceramic, glass, stone}, {@code plastic}, {@code wood}
 * @param lowestMaterial lowest-rated material in the build-up, in words
 * @param lowestMaterialLimit its limit
 * @param flowPresentMPerS speed at or above which flow counts as present, m/s
 */
public record Limits(
        Temperature surface,
        boolean touchable,
        String surfaceClass,
        String lowestMaterial,
        Temperature lowestMaterialLimit,
        double flowPresentMPerS) {}
