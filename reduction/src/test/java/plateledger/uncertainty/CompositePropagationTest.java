package plateledger.uncertainty;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;

/** Effects carried through arguments, against derivatives worked out by hand. */
final class CompositePropagationTest {
    private static final double INF = Double.POSITIVE_INFINITY;
    private static final int GAIN = 0;
    private static final int OFFSET = 1;
    private static final int FACTOR = 2;
    private static final int FIRST_READING = 3;

    /**
     * Two runs with readings r = 10 and 11. Arguments a₀ = g (r − o), a₁ = e (g + o²); outputs a₀ a₁, ln a₀, and a₀ up to a
     * little above its value, no number beyond.
     */
    private static final class TwoRuns implements CompositeModel {
        static InputList inputList() {
            InputList.Builder builder = new InputList.Builder();
            builder.add(new Input("gain", 1.0, 0.01, Distribution.NORMAL, INF, Scope.CAMPAIGN));
            builder.add(new Input("offset", 0.3, 0.02, Distribution.NORMAL, INF, Scope.CAMPAIGN));
            builder.add(new Input("factor", 1.0, 0.0, Distribution.EXACT, INF, Scope.CAMPAIGN));
            builder.add(new Input("reading0", 10.0, 0.2, Distribution.NORMAL, INF, Scope.run("0")));
            builder.add(new Input("reading1", 11.0, 0.2, Distribution.NORMAL, INF, Scope.run("1")));
            return builder.build();
        }

        @Override
        public int inputs() {
            return 5;
        }

        @Override
        public int blocks() {
            return 2;
        }

        @Override
        public int arguments(int block) {
            return 2;
        }

        @Override
        public int outputs(int block) {
            return 3;
        }

        @Override
        public int[] blocksOf(int input) {
            return input < FIRST_READING ? new int[] {0, 1} : new int[] {input - FIRST_READING};
        }

        @Override
        public At at(double[] in) {
            return (block, arguments) -> {
                arguments[0] = in[GAIN] * (in[FIRST_READING + block] - in[OFFSET]);
                arguments[1] = in[FACTOR] * (in[GAIN] + in[OFFSET] * in[OFFSET]);
            };
        }

        @Override
        public void evaluate(int block, double[] arguments, double[] out) {
            out[0] = arguments[0] * arguments[1];
            out[1] = Math.log(arguments[0]);
            out[2] = arguments[0] > 9.71 + block ? Double.NaN : arguments[0];
        }
    }

    private static Effects run(int threads) {
        return CompositePropagation.run(new TwoRuns(), TwoRuns.inputList(), threads, () -> false, done -> {});
    }

    /** ∂(a₀a₁)/∂g = (r − o) a₁ + a₀ and so on, times u. Linear in each argument: exact but for rounding. */
    @Test
    void effectsOfAProductAreThoseWorkedByHand() {
        Effects effects = run(1);
        assertEquals(9.7 * 1.09, effects.value(0, 0), 1e-12);
        assertEquals(0.01 * (9.7 * 1.09 + 9.7), effects.effect(0, 0, GAIN), 1e-12);
        assertEquals(0.02 * (-1.09 + 9.7 * 0.6), effects.effect(0, 0, OFFSET), 1e-12);
        assertEquals(0.2 * 1.09, effects.effect(0, 0, FIRST_READING), 1e-12);
        assertEquals(0.01 * (10.7 * 1.09 + 10.7), effects.effect(1, 0, GAIN), 1e-12);
    }

    /** The step of a₀ is 2.3 % of it: a central difference of the logarithm is off by a third of its square, 1.8e-4. */
    @Test
    void effectsOfALogarithmAreThoseWorkedByHand() {
        Effects effects = run(1);
        assertEquals(0.01, effects.effect(0, 1, GAIN), 0.01 * 2e-4);
        assertEquals(-0.02 / 9.7, effects.effect(0, 1, OFFSET), 0.02 / 9.7 * 2e-4);
        assertEquals(0.2 / 9.7, effects.effect(0, 1, FIRST_READING), 0.2 / 9.7 * 2e-4);
    }

    /** The plain form, every input perturbed through everything, is the second route to the same numbers. */
    @Test
    void agreesWithPerturbingEveryInput() {
        TwoRuns model = new TwoRuns();
        Model flat = (in, out) -> {
            double[] arguments = new double[2];
            model.at(in).arguments(0, arguments);
            double[] three = new double[3];
            model.evaluate(0, arguments, three);
            out[0] = three[0];
            out[1] = three[1];
        };
        Effects plain = Propagation.jacobianTimesU(flat, 2, TwoRuns.inputList());
        Effects effects = run(1);
        for (int input : new int[] {GAIN, OFFSET, FIRST_READING}) {
            for (int output = 0; output < 2; output++) {
                double expected = plain.effect(0, output, input);
                assertEquals(expected, effects.effect(0, output, input), 4e-4 * Math.abs(expected));
            }
        }
    }

    @Test
    void runsAreCorrelatedByWhatTheyShareOnly() {
        Effects effects = run(1);
        assertEquals(0.0, effects.effect(0, 0, FIRST_READING + 1));
        assertEquals(0.0, effects.effect(0, 0, FACTOR));
        double gain = 0.01 * (9.7 * 1.09 + 9.7) * 0.01 * (10.7 * 1.09 + 10.7);
        double offset = 0.02 * (-1.09 + 9.7 * 0.6) * 0.02 * (-1.09 + 10.7 * 0.6);
        assertEquals(gain + offset, effects.covariance(0, 0, 1, 0), 1e-12);
    }

    /** Above the estimate there is no number: the side below gives the slope, 1. */
    @Test
    void oneSideIsEnough() {
        assertEquals(0.01 * 9.7, run(1).effect(0, 2, GAIN), 1e-12);
    }

    @Test
    void threadsChangeNothing() {
        Effects one = run(1);
        Effects three = run(3);
        for (int block = 0; block < 2; block++) {
            for (int output = 0; output < 3; output++) {
                for (int input = 0; input < 5; input++) {
                    assertEquals(one.effect(block, output, input), three.effect(block, output, input), 0.0);
                }
            }
        }
    }

    @Test
    void tellsHowFarItIsAndStopsWhenAsked() {
        List<Double> seen = new ArrayList<>();
        CompositePropagation.run(new TwoRuns(), TwoRuns.inputList(), 2, () -> false, seen::add);
        assertEquals(seen.stream().sorted().toList(), seen);
        assertEquals(1.0, seen.get(seen.size() - 1));
        assertThrows(
                CancellationException.class,
                () -> CompositePropagation.run(new TwoRuns(), TwoRuns.inputList(), 1, () -> true, done -> {}));
    }
}
