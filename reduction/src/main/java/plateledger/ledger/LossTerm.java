package plateledger.ledger;

/**
 * One way in which heat leaves the heated sheet without being convected into the stream. The functions are the ones the
 * kernel calls; the texts are the ones the report prints.
 */
public sealed interface LossTerm
        permits LossTerm.Radiation,
                LossTerm.Back,
                LossTerm.Edge,
                LossTerm.EndConduction,
                LossTerm.Lead,
                LossTerm.Storage {

    /** Name shown. */
    String label();

    /** Equation with its symbols, as printed in the report; numbered as in METHODS.md. */
    String equation();

    /** Where the equation comes from. */
    String source();

    /** All terms booked by this ledger, in the order printed. */
    static java.util.List<LossTerm> all() {
        return java.util.List.of(
                new Radiation(), new Back(), new Edge(), new EndConduction(), new Lead(), new Storage());
    }

    /**
     * Grey-diffuse exchange of the coat with the tunnel walls through a declared exchange factor. METHODS.md eq. (L-2).
     *
     * <pre>
     *   q = F ε σ (T_s⁴ − T_w⁴)
     *   q      net flux, plate to walls                      W/m²
     *   F      exchange factor of the enclosure              -        0 .. 1
     *   ε      total hemispherical emissivity of the coat    -        0 .. 1
     *   σ      Stefan–Boltzmann constant, 5.670374419e-8     W/(m² K⁴)   CODATA 2018, exact, cut
     *   T_s, T_w   coat face, mean of the walls              K
     * </pre>
     */
    record Radiation() implements LossTerm {
        /** Stefan–Boltzmann constant, W/(m² K⁴), CODATA 2018 (exact by the SI of 2019, digits cut). */
        public static final double STEFAN_BOLTZMANN = 5.670374419e-8;

        /** Flux, W/m². */
        public static double flux(double exchange, double emissivity, double surfaceK, double wallK) {
            double s2 = surfaceK * surfaceK;
            double w2 = wallK * wallK;
            return exchange * emissivity * STEFAN_BOLTZMANN * (s2 * s2 - w2 * w2);
        }

        /** ∂flux/∂T_s, W/(m² K). */
        public static double slope(double exchange, double emissivity, double surfaceK) {
            return 4.0 * exchange * emissivity * STEFAN_BOLTZMANN * surfaceK * surfaceK * surfaceK;
        }

        @Override
        public String label() {
            return "radiation";
        }

        @Override
        public String equation() {
            return "q = F ε σ (T_s⁴ − T_w⁴)   (L-2)";
        }

        @Override
        public String source() {
            return "Stefan–Boltzmann law with a grey-diffuse exchange factor; σ from CODATA 2018";
        }
    }

    /**
     * Conduction through the insulation to the plenum, METHODS.md eq. (L-3): q = U_b (T − T_plenum), U_b in W/(m² K)
     * identified by the loss runs.
     */
    record Back() implements LossTerm {
        /** Flux, W/m². */
        public static double flux(double conductanceWPerM2K, double sheetK, double plenumK) {
            return conductanceWPerM2K * (sheetK - plenumK);
        }

        @Override
        public String label() {
            return "back";
        }

        @Override
        public String equation() {
            return "q = U_b (T − T_plenum)   (L-3)";
        }

        @Override
        public String source() {
            return "steady conduction through layers in series; U_b from the loss runs";
        }
    }

    /** Heat out of the two side edges, METHODS.md eq. (L-4), with the span profile of {@link SpanProfile}. */
    record Edge() implements LossTerm {
        /** Rate of both edges per metre along the flow, W/m. */
        public static double rateWPerM(double conductanceWPerMK, double edgeK, double frameK) {
            return 2.0 * conductanceWPerMK * (edgeK - frameK);
        }

        @Override
        public String label() {
            return "edges";
        }

        @Override
        public String equation() {
            return "dQ/dx = 2 G (T_edge − T_frame), T(z) = T₁ − β (T₁ − T_frame) cosh(z/l)/cosh(W/2l)   (L-4)";
        }

        @Override
        public String source() {
            return "fin across the span with a conductance at its edges (common practice, closed form derived in METHODS)";
        }
    }

    /** Conduction out of the upstream and downstream ends of the sheet, METHODS.md eq. (L-5): Q = G_n (T_end − T_nose). */
    record EndConduction() implements LossTerm {
        /** Rate, W. */
        public static double rateW(double conductanceWPerK, double endK, double neighbourK) {
            return conductanceWPerK * (endK - neighbourK);
        }

        @Override
        public String label() {
            return "nose and tail ends";
        }

        @Override
        public String equation() {
            return "Q = G_n (T(x₀) − T_nose), Q = G_t (T(x₁) − T_tail)   (L-5)";
        }

        @Override
        public String source() {
            return "steady conduction through a declared conductance";
        }
    }

    /** Heat made in the leads between the sense points and the strip, METHODS.md eq. (L-6): Q = I² R. */
    record Lead() implements LossTerm {
        /** Rate, W. */
        public static double rateW(double currentA, double resistanceOhm) {
            return currentA * currentA * resistanceOhm;
        }

        @Override
        public String label() {
            return "leads";
        }

        @Override
        public String equation() {
            return "Q = I² R_lead   (L-6)";
        }

        @Override
        public String source() {
            return "Joule's law";
        }
    }

    /**
     * Heat stored in the sheet and, for a slow common drift, in a third of the insulation, METHODS.md eq. (L-7):
     * q = (c_s t + c_f L_f/3) dT/dt. A third, since the temperature falls linearly to the plenum side. After a start from
     * cold the insulation also takes up heat while the sheet looks steady: its slowest mode, 2 U_b E (T − T_plenum) with
     * E = a exp(−t/τ_f), τ_f = c_f L_f/(π² U_b) (slab with one face stepped and the other held: Carslaw and Jaeger, Conduction
     * of Heat in Solids, 3.4, from memory), a = 1/(1 − τ_s/τ_f) for a sheet that itself approaches with τ_s.
     */
    record Storage() implements LossTerm {
        /** Heat capacity per area, J/(m² K). */
        public static double capacityJPerM2K(double sheetJPerM3K, double sheetM, double foamJPerM3K, double foamM) {
            return sheetJPerM3K * sheetM + foamJPerM3K * foamM / 3.0;
        }

        /** Conductance of what the insulation still takes up, W/(m² K). */
        public static double soakWPerM2K(double backWPerM2K, double share) {
            return 2.0 * backWPerM2K * share;
        }

        /**
         * Mean of E over a window.
         *
         * @param backWPerM2K U_b, W/(m² K), above 0
         * @param foamJPerM2K c_f L_f, J/(m² K), above 0
         * @param sheetS τ_s of the sheet, s
         * @param fromS window start since the heater was switched on, s; infinite for a plate long in balance
         * @param toS window end since then, s
         */
        public static double soakShare(
                double backWPerM2K, double foamJPerM2K, double sheetS, double fromS, double toS) {
            if (Double.isInfinite(fromS)) {
                return 0.0;
            }
            double tau = foamJPerM2K / (Math.PI * Math.PI * backWPerM2K);
            double mean = tau * (Math.exp(-fromS / tau) - Math.exp(-toS / tau)) / (toS - fromS);
            return mean / (1.0 - Math.min(0.5, sheetS / tau));
        }

        @Override
        public String label() {
            return "storage";
        }

        @Override
        public String equation() {
            return "q = (c_s t + c_f L_f/3) dT/dt + 2 U_b E (T − T_plenum)   (L-7)";
        }

        @Override
        public String source() {
            return "one-dimensional conduction in the insulation with its far face held: slow drift and slowest mode";
        }
    }
}
