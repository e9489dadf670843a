package plateledger.reduce;

import plateledger.quantity.Estimate;

/**
 * Results at one station (a centre-line junction), SI.
 *
 * @param channel channel of the junction
 * @param x place from the leading edge, m
 * @param surface temperature of the outer face of the coat, K
 * @param reference adiabatic wall temperature, K
 * @param film property temperature, K
 * @param qElectrical heater flux, W/m²
 * @param qRadiation radiated flux, W/m²
 * @param qBack flux through the back, W/m²
 * @param qConduction net flux carried off along the sheet, W/m² (positive when heat leaves the station)
 * @param qConvection convected flux of the fitted model, W/m²
 * @param qConvectionLocal convected flux of the plain local balance (differences of neighbouring readings), W/m²
 * @param h heat transfer coefficient, W/(m² K)
 * @param hEquivalentUniform h ÷ the rig's superposition factor, W/(m² K); NaN without theory
 * @param reX Reynolds number
 * @param nuX Nusselt number
 * @param pr Prandtl number
 * @param nuXTheory Nusselt number of theory for this rig; NaN without theory; its u is the theory's own
 * @param nuXTextbook Nusselt number of the uniform-temperature formula without unheated length, for comparison
 * @param lnRatio ln(Nu_x/Nu_x,theory) with its joint uncertainty
 * @param en E_n number of the comparison at 95 %; NaN without theory
 * @param reliance share of the local flux that the conduction model moved, dimensionless
 */
public record StationResult(
        String channel,
        Estimate x,
        Estimate surface,
        Estimate reference,
        Estimate film,
        Estimate qElectrical,
        Estimate qRadiation,
        Estimate qBack,
        Estimate qConduction,
        Estimate qConvection,
        Estimate qConvectionLocal,
        Estimate h,
        Estimate hEquivalentUniform,
        Estimate reX,
        Estimate nuX,
        Estimate pr,
        Estimate nuXTheory,
        Estimate nuXTextbook,
        Estimate lnRatio,
        double en,
        double reliance) {}
