package plateledger.uncertainty;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

/** Perturbing arguments instead of inputs must give what perturbing inputs gives. */
final class ArgumentPerturbationTest {
    private static final double INF = Double.POSITIVE_INFINITY;

    private static InputList list(double[] values, double[] u) {
        InputList.Builder builder = new InputList.Builder();
        for (int i = 0; i < values.length; i++) {
            builder.add(new Input("x" + i, values[i], u[i], Distribution.NORMAL, INF, Scope.CAMPAIGN));
        }
        return builder.build();
    }

    private static Effects run(CompositeModel model, InputList inputs, int threads) {
        return CompositePropagation.run(model, inputs, threads, () -> false, share -> {});
    }

    /** Step one: arguments of one block from all inputs. */
    @FunctionalInterface
    private interface Step {
        void apply(double[] from, double[] to);
    }

    /** One block that every input reaches. */
    private record OneBlock(int inputs, int argumentCount, int outputCount, Step first, Step second)
            implements CompositeModel {
        @Override
        public int blocks() {
            return 1;
        }

        @Override
        public int arguments(int block) {
            return argumentCount;
        }

        @Override
        public int outputs(int block) {
            return outputCount;
        }

        @Override
        public int[] blocksOf(int input) {
            return new int[] {0};
        }

        @Override
        public At at(double[] in) {
            return (block, arguments) -> first.apply(in, arguments);
        }

        @Override
        public void evaluate(int block, double[] arguments, double[] out) {
            second.apply(arguments, out);
        }
    }

    /** Ten curved blocks: x0 and x1 act everywhere, x(2+b) in block b alone. */
    private static final class Curved implements CompositeModel {
        private static final int BLOCKS = 10;

        @Override
        public int inputs() {
            return 2 + BLOCKS;
        }

        @Override
        public int blocks() {
            return BLOCKS;
        }

        @Override
        public int arguments(int block) {
            return 2;
        }

        @Override
        public int outputs(int block) {
            return 2;
        }

        @Override
        public int[] blocksOf(int input) {
            return input < 2 ? new int[] {0, 1, 2, 3, 4, 5, 6, 7, 8, 9} : new int[] {input - 2};
        }

        private static void first(int block, double[] in, double[] a) {
            a[0] = in[0] * in[2 + block] + 0.1 * in[1] * in[1];
            a[1] = Math.sqrt(in[1] + in[2 + block]);
        }

        private static void second(double[] a, double[] out) {
            out[0] = a[0] * Math.exp(0.3 * a[1]);
            out[1] = Math.log(a[0]) - a[1] * a[1] * a[1];
        }

        @Override
        public CompositeModel.At at(double[] in) {
            return (block, arguments) -> first(block, in, arguments);
        }

        @Override
        public void evaluate(int block, double[] arguments, double[] out) {
            second(arguments, out);
        }

        static InputList list(double scale) {
            double[] values = new double[2 + BLOCKS];
            double[] u = new double[2 + BLOCKS];
            values[0] = 1.5;
            values[1] = 0.8;
            u[0] = 0.10 * scale;
            u[1] = 0.15 * scale;
            for (int b = 0; b < BLOCKS; b++) {
                values[2 + b] = 2.0 + 0.3 * b;
                u[2 + b] = b == 4 ? 0.0 : 0.2 * scale;
            }
            return ArgumentPerturbationTest.list(values, u);
        }
    }

    /** The same function in one step: the inputs are the arguments. */
    private record Plain(Curved curved) implements CompositeModel {
        @Override
        public int inputs() {
            return curved.inputs();
        }

        @Override
        public int blocks() {
            return curved.blocks();
        }

        @Override
        public int arguments(int block) {
            return curved.inputs();
        }

        @Override
        public int outputs(int block) {
            return curved.outputs(block);
        }

        @Override
        public int[] blocksOf(int input) {
            return curved.blocksOf(input);
        }

        @Override
        public CompositeModel.At at(double[] in) {
            return (block, arguments) -> System.arraycopy(in, 0, arguments, 0, in.length);
        }

        @Override
        public void evaluate(int block, double[] arguments, double[] out) {
            double[] a = new double[2];
            Curved.first(block, arguments, a);
            Curved.second(a, out);
        }
    }

    /** y₀ = 5 a₀ − a₁, y₁ = a₀ + 4 a₁ with a₀ = 2 x₀ + 3 x₁, a₁ = x₁ − x₂; u = 0.1, 0.2, 0.3: worked by hand. */
    @Test
    void aLinearFunctionIsExact() {
        OneBlock model = new OneBlock(
                3,
                2,
                2,
                (x, a) -> {
                    a[0] = 2.0 * x[0] + 3.0 * x[1];
                    a[1] = x[1] - x[2];
                },
                (a, y) -> {
                    y[0] = 5.0 * a[0] - a[1];
                    y[1] = a[0] + 4.0 * a[1];
                });
        Effects effects = run(model, list(new double[] {1.0, 2.0, 4.0}, new double[] {0.1, 0.2, 0.3}), 1);
        assertEquals(42.0, effects.value(0, 0), 1e-12);
        assertEquals(0.0, effects.value(0, 1), 1e-12);
        double[][] byHand = {{1.0, 0.2}, {2.8, 1.4}, {0.3, -1.2}};
        for (int i = 0; i < 3; i++) {
            for (int o = 0; o < 2; o++) {
                assertEquals(byHand[i][o], effects.effect(0, o, i), 1e-12, "x" + i + " on y" + o);
                assertEquals(0.0, effects.curvature(0, o, i), 1e-12);
            }
        }
        assertEquals(Math.sqrt(8.93), effects.combined(0, 0).u(), 1e-12);
        assertEquals(3.76, effects.covariance(0, 0, 0, 1), 1e-12);
    }

    /** Both are exact to second order, so that halving every u must make their difference about eight times smaller. */
    @Test
    void agreesWithPlainPropagationToSecondOrder() {
        double whole = largestDifference(1.0);
        double half = largestDifference(0.5);
        assertTrue(whole > 0.0 && whole < 0.02, "largest difference as a share of u: " + whole);
        assertTrue(half < whole / 3.5, whole + " falls to " + half + " as a share of u"); // a share falls as u²
    }

    private static double largestDifference(double scale) {
        Curved model = new Curved();
        InputList inputs = Curved.list(scale);
        Effects composite = run(model, inputs, 1);
        Effects plain = CompositePropagation.run(new Plain(model), inputs, 1, () -> false, share -> {});
        double largest = 0.0;
        for (int b = 0; b < model.blocks(); b++) {
            for (int o = 0; o < 2; o++) {
                assertEquals(plain.value(b, o), composite.value(b, o), 0.0);
                double u = plain.combined(b, o).u();
                for (int i = 0; i < model.inputs(); i++) {
                    double difference = composite.effect(b, o, i) - plain.effect(b, o, i);
                    largest = Math.max(largest, Math.abs(difference) / u);
                }
            }
        }
        return largest;
    }

    @Test
    void theNumberOfThreadsChangesNoBit() {
        Curved model = new Curved();
        InputList inputs = Curved.list(1.0);
        Effects one = run(model, inputs, 1);
        for (int threads : new int[] {2, 4}) {
            Effects other = run(model, inputs, threads);
            for (int b = 0; b < model.blocks(); b++) {
                for (int o = 0; o < 2; o++) {
                    for (int i = 0; i < model.inputs(); i++) {
                        assertEquals(
                                Double.doubleToLongBits(one.effect(b, o, i)),
                                Double.doubleToLongBits(other.effect(b, o, i)));
                        assertEquals(
                                Double.doubleToLongBits(one.curvature(b, o, i)),
                                Double.doubleToLongBits(other.curvature(b, o, i)));
                    }
                }
            }
        }
        assertTrue(Math.abs(one.effect(3, 0, 0)) > 0.1, "the effects compared are not all zero");
    }

    @Test
    void anExactInputHasNoEffectAndAnotherBlockNone() {
        Effects effects = run(new Curved(), Curved.list(1.0), 2);
        assertEquals(0.0, effects.effect(4, 0, 6), 0.0);
        assertEquals(0.0, effects.effect(3, 0, 4), 0.0);
        assertTrue(Math.abs(effects.effect(2, 0, 4)) > 0.1);
    }

    @Test
    void stopsWhenCancelled() {
        for (int threads : new int[] {1, 2}) {
            AtomicInteger asked = new AtomicInteger();
            List<Double> shares = new ArrayList<>();
            assertThrows(
                    CancellationException.class,
                    () -> CompositePropagation.run(
                            new Curved(),
                            Curved.list(1.0),
                            threads,
                            () -> asked.incrementAndGet() > 5,
                            share -> shares.add(share)));
            assertTrue(shares.size() <= 5, shares.size() + " pieces of work were finished");
        }
    }

    @Test
    void tellsAShareThatRisesToOne() {
        List<Double> shares = new ArrayList<>();
        CompositePropagation.run(new Curved(), Curved.list(1.0), 2, () -> false, share -> shares.add(share));
        for (int k = 1; k < shares.size(); k++) {
            assertTrue(shares.get(k) >= shares.get(k - 1));
        }
        assertEquals(1.0, shares.get(shares.size() - 1), 1e-12);
        assertEquals(11 + Curved.BLOCKS, shares.size()); // eleven uncertain inputs, ten blocks
    }

    @Test
    void refusesAListOfAnotherLengthAndNoThread() {
        InputList two = list(new double[] {1.0, 2.0}, new double[] {0.1, 0.1});
        assertThrows(IllegalArgumentException.class, () -> run(new Curved(), two, 1));
        assertThrows(IllegalArgumentException.class, () -> run(new Curved(), Curved.list(1.0), 0));
    }

    /** y = a² about 1 with u = 0.1: 1.21 − 1 above, 1 − 0.81 below. */
    @Test
    void theSideThatGivesANumberIsUsed() {
        Step same = (x, a) -> a[0] = x[0];
        InputList input = list(new double[] {1.0}, new double[] {0.1});
        Step fromBelow = (a, y) -> y[0] = a[0] > 1.05 ? Double.NaN : a[0] * a[0];
        Step fromAbove = (a, y) -> y[0] = a[0] < 0.95 ? Double.NaN : a[0] * a[0];
        Step nowhere = (a, y) -> y[0] = Math.abs(a[0] - 1.0) > 0.05 ? Double.NaN : a[0] * a[0];
        assertEquals(0.19, run(new OneBlock(1, 1, 1, same, fromBelow), input, 1).effect(0, 0, 0), 1e-12);
        assertEquals(0.21, run(new OneBlock(1, 1, 1, same, fromAbove), input, 1).effect(0, 0, 0), 1e-12);
        Combined combined = run(new OneBlock(1, 1, 1, same, nowhere), input, 1).combined(0, 0);
        assertEquals(1.0, combined.value(), 0.0);
        assertTrue(Double.isNaN(combined.u()));
    }

    /** The argument √x at x = 0.05, u = 0.1 has no value below: √0.15 − √0.05 = 0.163 691 5; above likewise by mirror. */
    @Test
    void anArgumentWithoutAValueOnOneSide() {
        InputList inputs = list(new double[] {0.05, 3.0}, new double[] {0.1, 0.2});
        Step first = (x, a) -> {
            a[0] = Math.sqrt(x[0]);
            a[1] = x[1];
        };
        Step second = (a, y) -> y[0] = 2.0 * a[0] + a[1];
        Effects below = run(new OneBlock(2, 2, 1, first, second), inputs, 1);
        assertEquals(2.0 * 0.1636915, below.effect(0, 0, 0), 2e-7);
        assertEquals(0.2, below.effect(0, 0, 1), 1e-12);
        InputList mirror = list(new double[] {-0.05, 3.0}, new double[] {0.1, 0.2});
        Step mirrored = (x, a) -> {
            a[0] = Math.sqrt(-x[0]);
            a[1] = x[1];
        };
        Effects above = run(new OneBlock(2, 2, 1, mirrored, second), mirror, 1);
        assertEquals(-2.0 * 0.1636915, above.effect(0, 0, 0), 2e-7);
    }

    /** An argument that has no value at all makes the output and its uncertainty unknown, not the program fail. */
    @Test
    void anArgumentWithoutAnyValue() {
        InputList inputs = list(new double[] {1.0, 3.0}, new double[] {0.1, 0.2});
        Step around = (x, a) -> {
            a[0] = Math.abs(x[0] - 1.0) > 0.05 ? Double.NaN : x[0];
            a[1] = x[1];
        };
        Step sum = (a, y) -> y[0] = a[0] + a[1];
        Combined unsure = run(new OneBlock(2, 2, 1, around, sum), inputs, 1).combined(0, 0);
        assertEquals(4.0, unsure.value(), 1e-12);
        assertTrue(Double.isNaN(unsure.u()));
        Step never = (x, a) -> {
            a[0] = Double.NaN;
            a[1] = x[1];
        };
        Combined unknown = run(new OneBlock(2, 2, 1, never, sum), inputs, 1).combined(0, 0);
        assertTrue(Double.isNaN(unknown.value()) && Double.isNaN(unknown.u()));
    }
}
