package plateledger.theory;

import java.util.List;

/**
 * How well the theory itself is known, relative to Nu, apart from its inputs (U, ν, x …, which are inputs of the run).
 * The totals are declared: 1.5 % laminar and 6 % turbulent, taken as expanded uncertainties with k = 2, so standard
 * uncertainties of 0.75 % and 3 %. The parts say what is behind them; the last part of each is the rest of the declared
 * total, an allowance for how the real layer differs from the ideal one. METHODS.md (T-15).
 */
public final class TheoryUncertainty {
    private static final double LAMINAR_TOTAL = 0.0075;
    private static final double TURBULENT_TOTAL = 0.03;
    private static final double ROOT_3 = Math.sqrt(3.0);

    private TheoryUncertainty() {}

    /**
     * One source of uncertainty of the theory.
     *
     * @param name what it is
     * @param standard relative standard uncertainty of Nu
     * @param source why it has that size
     */
    public record Part(String name, double standard, String source) {}

    /** Relative standard uncertainty of Nu_theory; fully shared by all stations and runs of the same layer. */
    public static double standard(LayerLaw law) {
        return law == LayerLaw.LAMINAR ? LAMINAR_TOTAL : TURBULENT_TOTAL;
    }

    /** The parts of {@link #standard}, whose squares add up to its square. */
    public static List<Part> parts(LayerLaw law) {
        return law == LayerLaw.LAMINAR
                ? complete(
                        LAMINAR_TOTAL,
                        List.of(
                                new Part(
                                        "superposition",
                                        0.001 / ROOT_3,
                                        "within 0.1 % of the marched energy equation for steps and strips at Pr 0.7 and 7"),
                                new Part(
                                        "properties at film temperature",
                                        0.0025 / ROOT_3,
                                        "air, exact layers with variable properties: 0.06 to 0.22 % for 20 to 80 K; "
                                                + "not valid for liquids, where it is 1.4 % at 5 K")),
                        "leading edge, residual pressure gradient and turbulence of the stream; a velocity gradient "
                                + "(x/U) dU/dx of 0.005 changes h by 0.7 % (Falkner-Skan solution, computed)")
                : complete(
                        TURBULENT_TOTAL,
                        List.of(
                                new Part(
                                        "level of the law",
                                        0.048 / ROOT_3,
                                        "published friction laws differ by 4.8 % at Re 2.5e6; 0.0287 and 0.0296 by 3.1 %"),
                                new Part(
                                        "uniform flux against uniform temperature",
                                        0.01 / ROOT_3,
                                        "published ratios 1.0386 to 1.0453, computed 1.051 to 1.057")),
                        "variable properties, and the history of the layer behind the trip");
    }

    private static List<Part> complete(double total, List<Part> known, String restSource) {
        double rest = total * total;
        for (Part part : known) {
            rest -= part.standard() * part.standard();
        }
        return List.of(known.get(0), known.get(1), new Part("real layer", Math.sqrt(rest), restSource));
    }
}
