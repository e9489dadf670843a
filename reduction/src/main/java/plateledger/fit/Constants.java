package plateledger.fit;

/**
 * Constants of ln(Nu/Pr^n) = a + m (ln Re − x_g), with a = ln C + m x_g, and their absolute covariance (not scaled by the
 * residuals).
 *
 * @param xg centre x_g: ln of the geometric mean of Re
 * @param a value of ln(Nu/Pr^n) at x_g
 * @param m exponent
 * @param varA variance of a
 * @param varM variance of m
 * @param covAM covariance of a and m
 */
public record Constants(double xg, double a, double m, double varA, double varM, double covAM) {
    /** C = exp(a − m x_g). */
    public double c() {
        return Math.exp(a - m * xg);
    }

    /** Standard uncertainty of ln C. */
    public double uLnC() {
        return Math.sqrt(Math.max(0.0, varA - 2.0 * xg * covAM + xg * xg * varM));
    }

    /** Standard uncertainty of m. */
    public double uM() {
        return Math.sqrt(varM);
    }

    /** ln(Nu/Pr^n) of the curve at a Reynolds number. */
    public double lnY(double re) {
        return a + m * (Math.log(re) - xg);
    }

    /** Standard uncertainty of ln(Nu/Pr^n) of the curve at a Reynolds number. */
    public double uLnY(double re) {
        double d = Math.log(re) - xg;
        return Math.sqrt(Math.max(0.0, varA + 2.0 * d * covAM + d * d * varM));
    }
}
