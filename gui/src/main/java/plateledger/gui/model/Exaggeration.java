package plateledger.gui.model;

/** Factors by which thin layers are drawn thicker than to scale; always 1, 2 or 5 times a power of ten. */
public final class Exaggeration {
    private Exaggeration() {}

    /**
     * The factor for a layer: the one of 1, 2, 5, 10, … (or …, 0.2, 0.5, 1) whose drawing comes nearest to a wanted
     * height, in ratio.
     *
     * @param thicknessMm thickness, mm, positive
     * @param pixelsPerMm scale along the plate, positive
     * @param wantedPixels wanted drawn height, positive
     */
    public static double factor(double thicknessMm, double pixelsPerMm, double wantedPixels) {
        double exact = wantedPixels / (thicknessMm * pixelsPerMm);
        double decade = Math.pow(10.0, Math.floor(Math.log10(exact)));
        double best = decade;
        for (double step : new double[] {1.0, 2.0, 5.0, 10.0}) {
            if (Math.abs(Math.log(step * decade / exact)) < Math.abs(Math.log(best / exact))) {
                best = step * decade;
            }
        }
        return best;
    }

    /** E.g. {@code ×20}; {@code to scale} for 1. */
    public static String words(double factor) {
        return factor == 1.0 ? "to scale" : "×" + NumberText.plain(factor);
    }
}
