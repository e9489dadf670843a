package plateledger.campaign;

/**
 * What the dimensionless numbers of this campaign mean; printed with every result.
 *
 * @param properties temperature at which fluid properties are taken
 * @param length length in Re and Nu of a run average
 * @param average how h is averaged over the heated area
 * @param prandtlExponent n of Pr^n held fixed in the fit
 */
public record Definitions(
        PropertyTemperature properties, ReferenceLength length, Average average, double prandtlExponent) {
    /** Temperature at which fluid properties are taken. */
    public enum PropertyTemperature {
        /** ½ (T_s + T_∞), local at stations, of the mean surface temperature for run averages. */
        FILM("film"),
        /** T_∞. */
        STREAM("stream");

        private final String word;

        PropertyTemperature(String word) {
            this.word = word;
        }

        /** The word in the campaign file. */
        public String word() {
            return word;
        }
    }

    /** Length in Re_L and Nu_L. */
    public enum ReferenceLength {
        /** Leading edge to the end of the heated part. */
        LEADING_EDGE("leading-edge"),
        /** Heated length. */
        HEATED("heated");

        private final String word;

        ReferenceLength(String word) {
            this.word = word;
        }

        /** The word in the campaign file. */
        public String word() {
            return word;
        }
    }

    /** Average of h over the heated area. */
    public enum Average {
        /** ∫q dA ÷ ∫(T_s − T_ref) dA. */
        FLUX_OVER_DIFFERENCE("flux-over-difference"),
        /** (1/L) ∫ h dx. */
        MEAN_H("mean-h");

        private final String word;

        Average(String word) {
            this.word = word;
        }

        /** The word in the campaign file. */
        public String word() {
            return word;
        }
    }
}
