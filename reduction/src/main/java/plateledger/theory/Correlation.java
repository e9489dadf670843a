package plateledger.theory;

import java.util.List;

/**
 * Published power laws for a smooth flat plate, for comparison beside the tool's own forms in {@link FlatPlate}:
 * <pre>
 *   Nu = C Re^m Pr^n / [1 + (d/Pr)^(2/3)]^(1/4),   d = 0 for all but the two Churchill–Ozoe forms
 * </pre>
 * Nu and Re with x (local) or L (average); no unheated length, no pressure gradient. Deviations from the exact solution
 * were computed with the similarity solution. "from memory" marks ranges and sources that were not re-read.
 *
 * @param name short name
 * @param kind what it is for
 * @param law its numbers
 * @param range its published range
 * @param deviation how far it is from the exact solution, or its published scatter
 * @param source where it was published
 */
public record Correlation(String name, Kind kind, Law law, Range range, String deviation, String source) {
    /** 0.332 Re^½ Pr^⅓. */
    public static final Correlation POHLHAUSEN_LOCAL = new Correlation(
            "pohlhausen-local",
            kind(LayerLaw.LAMINAR, Wall.TEMPERATURE, Extent.LOCAL),
            law(0.332, 0.5, 1.0 / 3.0, 0.0),
            range(0.0, 5e5, 0.6, 50.0),
            "exact solution +1.1 % at Pr 0.6, +0.7 % at 0.7, -1.7 % at 7",
            "Pohlhausen, Z. angew. Math. Mech. 1 (1921) 115, from memory; texts");
    /** 0.664 Re_L^½ Pr^⅓. */
    public static final Correlation POHLHAUSEN_AVERAGE = new Correlation(
            "pohlhausen-average",
            kind(LayerLaw.LAMINAR, Wall.TEMPERATURE, Extent.AVERAGE),
            law(0.664, 0.5, 1.0 / 3.0, 0.0),
            range(0.0, 5e5, 0.6, 50.0),
            "as the local form",
            "texts");
    /** 0.453 Re^½ Pr^⅓. */
    public static final Correlation KAYS_FLUX_LOCAL = new Correlation(
            "kays-flux-local",
            kind(LayerLaw.LAMINAR, Wall.FLUX, Extent.LOCAL),
            law(0.453, 0.5, 1.0 / 3.0, 0.0),
            range(0.0, 5e5, 0.6, 50.0),
            "exact solution -0.7 to -2.3 %, -0.9 % at Pr 0.7",
            "Kays, Crawford & Weigand, Convective Heat and Mass Transfer, 4th ed. 2005");
    /** 0.4587 Re^½ Pr^⅓. */
    public static final Correlation LIENHARD_FLUX_LOCAL = new Correlation(
            "lienhard-flux-local",
            kind(LayerLaw.LAMINAR, Wall.FLUX, Extent.LOCAL),
            law(0.4587, 0.5, 1.0 / 3.0, 0.0),
            range(0.0, 5e5, 0.6, 1e4),
            "exact solution +0.6 to -1.1 %, +0.3 % at Pr 0.7",
            "Lienhard, J. Heat Transfer 142 (2020) 061805, constant from memory");
    /** 0.6795 Re_L^½ Pr^⅓, flux over mean difference. */
    public static final Correlation FLUX_AVERAGE_OVER_DIFFERENCE = new Correlation(
            "flux-average-over-difference",
            kind(LayerLaw.LAMINAR, Wall.FLUX, Extent.AVERAGE),
            law(0.6795, 0.5, 1.0 / 3.0, 0.0),
            range(0.0, 5e5, 0.6, 50.0),
            "1.5 times the local 0.453; flux over mean temperature difference",
            "texts");
    /** 0.906 Re_L^½ Pr^⅓, mean of h. */
    public static final Correlation FLUX_AVERAGE_OF_H = new Correlation(
            "flux-average-of-h",
            kind(LayerLaw.LAMINAR, Wall.FLUX, Extent.AVERAGE),
            law(0.906, 0.5, 1.0 / 3.0, 0.0),
            range(0.0, 5e5, 0.6, 50.0),
            "2 times the local 0.453; mean of the local h",
            "integral of the local form");
    /** 0.3387 Re^½ Pr^⅓/[1 + (0.0468/Pr)^⅔]^¼. */
    public static final Correlation CHURCHILL_OZOE_TEMPERATURE = new Correlation(
            "churchill-ozoe-temperature",
            kind(LayerLaw.LAMINAR, Wall.TEMPERATURE, Extent.LOCAL),
            law(0.3387, 0.5, 1.0 / 3.0, 0.0468),
            range(0.0, 5e5, 0.001, 1e4),
            "exact solution -1.1 to +1.4 %; needs Re Pr > 100",
            "Churchill & Ozoe, J. Heat Transfer 95 (1973) 416, page from memory");
    /** 0.4637 Re^½ Pr^⅓/[1 + (0.02052/Pr)^⅔]^¼. */
    public static final Correlation CHURCHILL_OZOE_FLUX = new Correlation(
            "churchill-ozoe-flux",
            kind(LayerLaw.LAMINAR, Wall.FLUX, Extent.LOCAL),
            law(0.4637, 0.5, 1.0 / 3.0, 0.02052),
            range(0.0, 5e5, 0.001, 1e4),
            "exact solution -0.9 to +1.6 %; needs Re Pr > 100",
            "Churchill & Ozoe, J. Heat Transfer 95 (1973) 78, from memory");
    /** 0.0296 Re^0.8 Pr^⅓. */
    public static final Correlation COLBURN_LOCAL = new Correlation(
            "colburn-local",
            kind(LayerLaw.TURBULENT, Wall.TEMPERATURE, Extent.LOCAL),
            law(0.0296, 0.8, 1.0 / 3.0, 0.0),
            range(5e5, 1e7, 0.6, 60.0),
            "texts: 15 to 25 %; 10 % above the form with Pr^0.6 at Pr 0.7",
            "Colburn 1933; texts");
    /** 0.037 Re_L^0.8 Pr^⅓. */
    public static final Correlation COLBURN_AVERAGE = new Correlation(
            "colburn-average",
            kind(LayerLaw.TURBULENT, Wall.TEMPERATURE, Extent.AVERAGE),
            law(0.037, 0.8, 1.0 / 3.0, 0.0),
            range(5e5, 1e8, 0.6, 60.0),
            "as the local form; turbulent from the leading edge",
            "texts");
    /** 0.036 Re_L^0.8 Pr^⅓. */
    public static final Correlation KREITH_AVERAGE = new Correlation(
            "kreith-average",
            kind(LayerLaw.TURBULENT, Wall.TEMPERATURE, Extent.AVERAGE),
            law(0.036, 0.8, 1.0 / 3.0, 0.0),
            range(5e5, 1e7, 0.5, 60.0),
            "turbulent from the leading edge",
            "Kreith, Manglik & Bohn, Principles of Heat Transfer, 7th ed., ch. 4");
    /** 0.0287 Re^0.8 Pr^0.6. */
    public static final Correlation KAYS_CRAWFORD_TEMPERATURE = new Correlation(
            "kays-crawford-temperature",
            kind(LayerLaw.TURBULENT, Wall.TEMPERATURE, Extent.LOCAL),
            law(LayerLaw.TURBULENT_COEFFICIENT, 0.8, 0.6, 0.0),
            range(5e5, 5e6, 0.5, 1.0),
            "gases; the spread of friction laws alone is 4.8 %",
            "Kays & Crawford, from memory");
    /** 0.0296 Re^0.8 Pr^0.6. */
    public static final Correlation GAS_TEMPERATURE = new Correlation(
            "gas-temperature",
            kind(LayerLaw.TURBULENT, Wall.TEMPERATURE, Extent.LOCAL),
            law(0.0296, 0.8, 0.6, 0.0),
            range(2e5, 5e6, 0.5, 1.0),
            "air 11 % (abstract)",
            "Lienhard, J. Heat Transfer 142 (2020) 061805, formula from memory");
    /** 0.0308 Re^0.8 Pr^⅓. */
    public static final Correlation COLBURN_FLUX = new Correlation(
            "colburn-flux",
            kind(LayerLaw.TURBULENT, Wall.FLUX, Extent.LOCAL),
            law(0.0308, 0.8, 1.0 / 3.0, 0.0),
            range(5e5, 1e8, 0.6, 60.0),
            "4.05 % above COLBURN_LOCAL",
            "texts, from memory");
    /** 0.0300 Re^0.8 Pr^0.6. */
    public static final Correlation KAYS_CRAWFORD_FLUX = new Correlation(
            "kays-crawford-flux",
            kind(LayerLaw.TURBULENT, Wall.FLUX, Extent.LOCAL),
            law(0.0300, 0.8, 0.6, 0.0),
            range(5e5, 5e6, 0.5, 1.0),
            "gases; 4.5 % above KAYS_CRAWFORD_TEMPERATURE",
            "Kays & Crawford, from memory");

    /** What is uniform along the wall. */
    public enum Wall {
        /** Uniform wall temperature. */
        TEMPERATURE,
        /** Uniform flux. */
        FLUX
    }

    /** Local value at x or average from the leading edge to L. */
    public enum Extent {
        /** At x. */
        LOCAL,
        /** From the leading edge to L. */
        AVERAGE
    }

    /**
     * What a law is for.
     *
     * @param layer state of the layer
     * @param wall what is uniform along the wall
     * @param extent local or average
     */
    public record Kind(LayerLaw layer, Wall wall, Extent extent) {}

    /**
     * The numbers of a law.
     *
     * @param coefficient C
     * @param reynoldsExponent m
     * @param prandtlExponent n
     * @param blend d
     */
    public record Law(double coefficient, double reynoldsExponent, double prandtlExponent, double blend) {}

    /**
     * Published range.
     *
     * @param lowestReynolds lowest Re
     * @param highestReynolds highest Re
     * @param lowestPrandtl lowest Pr
     * @param highestPrandtl highest Pr
     */
    public record Range(double lowestReynolds, double highestReynolds, double lowestPrandtl, double highestPrandtl) {
        /** True if both numbers lie inside. */
        public boolean holds(double reynolds, double prandtl) {
            return reynolds >= lowestReynolds
                    && reynolds <= highestReynolds
                    && prandtl >= lowestPrandtl
                    && prandtl <= highestPrandtl;
        }
    }

    /** All of them. */
    public static final List<Correlation> ALL = List.of(
            POHLHAUSEN_LOCAL,
            POHLHAUSEN_AVERAGE,
            KAYS_FLUX_LOCAL,
            LIENHARD_FLUX_LOCAL,
            FLUX_AVERAGE_OVER_DIFFERENCE,
            FLUX_AVERAGE_OF_H,
            CHURCHILL_OZOE_TEMPERATURE,
            CHURCHILL_OZOE_FLUX,
            COLBURN_LOCAL,
            COLBURN_AVERAGE,
            KREITH_AVERAGE,
            KAYS_CRAWFORD_TEMPERATURE,
            GAS_TEMPERATURE,
            COLBURN_FLUX,
            KAYS_CRAWFORD_FLUX);

    private static Kind kind(LayerLaw layer, Wall wall, Extent extent) {
        return new Kind(layer, wall, extent);
    }

    private static Law law(double coefficient, double reynoldsExponent, double prandtlExponent, double blend) {
        return new Law(coefficient, reynoldsExponent, prandtlExponent, blend);
    }

    private static Range range(double lowRe, double highRe, double lowPr, double highPr) {
        return new Range(lowRe, highRe, lowPr, highPr);
    }

    /** Nu inside the published range, NaN outside. */
    public double nusselt(double reynolds, double prandtl) {
        return range.holds(reynolds, prandtl) ? extrapolated(reynolds, prandtl) : Double.NaN;
    }

    /** Nu whether inside the published range or not. */
    public double extrapolated(double reynolds, double prandtl) {
        double power = law.coefficient()
                * Math.pow(reynolds, law.reynoldsExponent())
                * Math.pow(prandtl, law.prandtlExponent());
        return law.blend() == 0.0 ? power : power / Math.sqrt(Math.sqrt(1.0 + blend(prandtl)));
    }

    private double blend(double prandtl) {
        double root = Math.cbrt(law.blend() / prandtl);
        return root * root;
    }
}
