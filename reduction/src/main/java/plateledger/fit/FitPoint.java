package plateledger.fit;

/**
 * One run average as the fit sees it.
 *
 * @param id run
 * @param set set point name; points with the same name are repeats
 * @param re Reynolds number
 * @param nu Nusselt number
 * @param pr Prandtl number
 * @param uLnReRandom standard uncertainty of ln Re from what is drawn anew in each run
 * @param uLnYRandom the same of ln(Nu/Pr^n)
 * @param correlationRandom correlation of those two, −1..1
 */
public record FitPoint(
        String id,
        String set,
        double re,
        double nu,
        double pr,
        double uLnReRandom,
        double uLnYRandom,
        double correlationRandom) {}
