package plateledger.theory;

import plateledger.numeric.IncompleteBetaTable;

/**
 * The surface temperature that a distribution of flux gives, by superposition of steps, METHODS.md (T-8) to (T-10):
 * <pre>
 *   T_s − T_aw (x) = 1/(k Re_X^p) Σ_j g_j(Pr) ∫ q(ξ) [1 − (Ξ/X)^a]^(b − 1 + j) dξ,   X = x − x_v, Ξ = ξ − x_v,
 *   k      conductivity of the fluid                    W/(m K)
 *   Re_X   U X/ν                                         -
 *   q      convective flux, piecewise constant on cells  W/m²
 *   x_v    virtual origin, 0 for a layer from the leading edge
 * </pre>
 * Laminar: three terms, against an independent solution of the energy equation within 0.1 % for steps and strips at Pr
 * 0.7 and 7. Turbulent: the classical kernel, one term. Pure functions; the calls of this class allocate nothing.
 */
public final class Superposition {
    private Superposition() {}

    /**
     * T_s − T_aw at points for piecewise-constant flux.
     *
     * @param cellEdges edges of the cells, m from the leading edge, ascending, none upstream of the virtual origin,
     *     length n + 1; no flux outside
     * @param flux flux of each cell, W/m², length n
     * @param x points, m from the leading edge, in any order
     * @param virtualOrigin where the layer would have started, m from the leading edge; 0 for the leading edge
     * @param law the layer
     * @param reynoldsPerMetre U/ν, 1/m, above 0
     * @param prandtl Pr
     * @param conductivity k of the fluid, W/(m K)
     * @param out T_s − T_aw at each point, K; NaN where Pr is out of range, the point is not downstream of the virtual
     *     origin, or a heated edge lies upstream of it
     */
    public static void wallDifference(
            double[] cellEdges,
            double[] flux,
            double[] x,
            double virtualOrigin,
            LayerLaw law,
            double reynoldsPerMetre,
            double prandtl,
            double conductivity,
            double[] out) {
        double g0 = law.fluxKernel(0, prandtl);
        double g1 = law.fluxKernel(1, prandtl);
        double g2 = law.fluxKernel(2, prandtl);
        superpose(cellEdges, flux, x, virtualOrigin, law, reynoldsPerMetre, conductivity, g0, g1, g2, out);
    }

    /**
     * The same with the classical one-term kernel and a given coefficient C of Nu_x = C Re_x^p, as textbooks have it; for
     * comparison only.
     *
     * @param coefficient C, e.g. 0.332 Pr^⅓ or 0.0296 Pr^0.6
     */
    static void classical(
            double[] cellEdges,
            double[] flux,
            double[] x,
            LayerLaw law,
            double reynoldsPerMetre,
            double coefficient,
            double conductivity,
            double[] out) {
        double g0 = law.classicalConstant() / coefficient;
        superpose(cellEdges, flux, x, 0.0, law, reynoldsPerMetre, conductivity, g0, 0.0, 0.0, out);
    }

    private static void superpose(
            double[] cellEdges,
            double[] flux,
            double[] x,
            double virtualOrigin,
            LayerLaw law,
            double reynoldsPerMetre,
            double conductivity,
            double g0,
            double g1,
            double g2,
            double[] out) {
        int cells = flux.length;
        if (cellEdges.length != cells + 1 || out.length < x.length) {
            throw new IllegalArgumentException("cells " + cells + ", edges " + cellEdges.length + ", points " + x.length
                    + ", results " + out.length + ": expected one edge more than cells and a result per point");
        }
        IncompleteBetaTable table = StepIntegral.table(law);
        boolean originFits = cellEdges[0] >= virtualOrigin;
        for (int i = 0; i < x.length; i++) {
            double reach = x[i] - virtualOrigin;
            if (!originFits || !(reach > 0.0)) {
                out[i] = Double.NaN;
                continue;
            }
            // Σ q_c (Φ_{c+1} − Φ_c) summed by edges: each edge counts with the jump of flux across it.
            double inverse = 1.0 / reach;
            double sum = 0.0;
            double upstream = 0.0;
            for (int c = 0; c <= cells; c++) {
                double left = x[i] - cellEdges[c];
                if (left <= 0.0) {
                    break;
                }
                double jump = (c < cells ? flux[c] : 0.0) - upstream;
                upstream += jump;
                double s = (cellEdges[c] - virtualOrigin) * inverse;
                sum -= jump * table.sum(s, left * inverse, g0, g1, g2);
            }
            sum += upstream * table.sum(1.0, 0.0, g0, g1, g2);
            out[i] = reach / (conductivity * power(reynoldsPerMetre * reach, law)) * sum;
        }
    }

    /** Re^p; NaN for Re not above 0. */
    static double power(double reynolds, LayerLaw law) {
        return reynolds > 0.0
                ? law == LayerLaw.LAMINAR ? Math.sqrt(reynolds) : Math.pow(reynolds, law.reynoldsExponent())
                : Double.NaN;
    }
}
