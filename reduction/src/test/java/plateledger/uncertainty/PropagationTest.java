package plateledger.uncertainty;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.Size;
import org.junit.jupiter.api.Test;

final class PropagationTest {
    private static final double INF = Double.POSITIVE_INFINITY;

    private static Input input(String name, double value, double u) {
        return new Input(name, value, u, Distribution.NORMAL, INF, Scope.CAMPAIGN);
    }

    private static InputList list(Input... inputs) {
        InputList.Builder builder = new InputList.Builder();
        for (Input input : inputs) {
            builder.add(input);
        }
        return builder.build();
    }

    /** Runs b of a small campaign: out = {shared gain × own reading, own reading − shared offset³, own reading}. */
    private static final class SmallCampaign implements CompositeModel {
        private final int runs;
        private final AtomicInteger evaluations = new AtomicInteger();

        SmallCampaign(int runs) {
            this.runs = runs;
        }

        InputList inputList() {
            InputList.Builder builder = new InputList.Builder();
            builder.add(input("gain", 1.0, 0.01));
            builder.add(input("offset", 0.3, 0.1));
            builder.add(new Input("exact", 2.0, 0.0, Distribution.EXACT, INF, Scope.CAMPAIGN));
            for (int b = 0; b < runs; b++) {
                builder.add(input("reading" + b, 10.0 + b, 0.2));
            }
            return builder.build();
        }

        @Override
        public int inputs() {
            return 3 + runs;
        }

        @Override
        public int blocks() {
            return runs;
        }

        @Override
        public int outputs(int block) {
            return 3;
        }

        @Override
        public int[] blocksOf(int input) {
            if (input >= 3) {
                return new int[] {input - 3};
            }
            int[] all = new int[runs];
            for (int b = 0; b < runs; b++) {
                all[b] = b;
            }
            return all;
        }

        @Override
        public int arguments(int block) {
            return 3;
        }

        @Override
        public At at(double[] in) {
            return (block, arguments) -> {
                arguments[0] = in[0];
                arguments[1] = in[1];
                arguments[2] = in[3 + block];
            };
        }

        @Override
        public void evaluate(int block, double[] arguments, double[] out) {
            evaluations.incrementAndGet();
            double reading = arguments[2];
            out[0] = arguments[0] * reading;
            out[1] = reading - arguments[1] * arguments[1] * arguments[1];
            out[2] = reading;
        }
    }

    @Test
    void effectsOfAProductAreWhatTheDerivativeSays() {
        Effects effects = CompositePropagation.ofFunction(
                (in, out) -> out[0] = in[0] * in[1], 1, list(input("x", 3.0, 0.1), input("y", -5.0, 0.2)));
        assertEquals(-15.0, effects.value(0, 0), 0.0);
        assertEquals(-0.5, effects.effect(0, 0, 0), 1e-14);
        assertEquals(0.6, effects.effect(0, 0, 1), 1e-14);
        assertEquals(Math.sqrt(0.61), effects.combined(0, 0).u(), 1e-14);
    }

    @Test
    void anInputReachesOnlyItsBlocksAndSharedOnesCorrelateRuns() {
        SmallCampaign model = new SmallCampaign(4);
        Effects effects = CompositePropagation.run(model, model.inputList(), 1, () -> false, fraction -> {});
        // 4 at the centre, in each of four blocks 2 for each of its three arguments
        assertEquals(4 + 4 * 2 * 3, model.evaluations.get());
        assertArrayEquals(new int[] {0, 1, 5}, effects.inputsOf(2));
        assertEquals(0.0, effects.effect(2, 0, 4), 0.0);
        // shared gain: (0.01·10)(0.01·12), by hand
        assertEquals(0.1 * 0.12, effects.covariance(0, 0, 2, 0), 1e-14);
        // offset³ at 0.3 ± 0.1: half of 0.4³ − 0.2³
        assertEquals(0.028 * 0.028, effects.covariance(0, 1, 2, 1), 1e-14);
        assertEquals(0.0, effects.covariance(0, 2, 2, 2), 0.0);
        assertEquals(0.2 * 0.2, effects.covariance(1, 0, 1, 2), 1e-14);
        // 0.4³ + 0.2³ − 2·0.3³ = 0.018
        assertEquals(0.009, effects.curvature(0, 1, 1), 1e-9);
    }

    @Property(tries = 20)
    void theNumberOfThreadsChangesNothing(@ForAll @IntRange(min = 2, max = 6) int threads) {
        SmallCampaign model = new SmallCampaign(9);
        InputList inputs = model.inputList();
        Effects one = CompositePropagation.run(model, inputs, 1, () -> false, fraction -> {});
        Effects many = CompositePropagation.run(model, inputs, threads, () -> false, fraction -> {});
        for (int b = 0; b < 9; b++) {
            for (int o = 0; o < 3; o++) {
                assertEquals(one.combined(b, o), many.combined(b, o));
                for (int i = 0; i < inputs.size(); i++) {
                    assertEquals(one.effect(b, o, i), many.effect(b, o, i), 0.0);
                }
            }
        }
    }

    @Test
    void progressRisesToOne() {
        SmallCampaign model = new SmallCampaign(6);
        List<Double> seen = new ArrayList<>();
        CompositePropagation.run(model, model.inputList(), 2, () -> false, seen::add);
        for (int k = 1; k < seen.size(); k++) {
            assertTrue(seen.get(k) >= seen.get(k - 1));
        }
        assertEquals(1.0, seen.get(seen.size() - 1), 0.0);
    }

    @Test
    void cancellingStopsTheWork() {
        SmallCampaign model = new SmallCampaign(50);
        AtomicInteger asked = new AtomicInteger();
        assertThrows(
                CancellationException.class,
                () -> CompositePropagation.run(
                        model, model.inputList(), 2, () -> asked.incrementAndGet() > 60, fraction -> {}));
        // 350 evaluations in all; 52 inputs are moved first, then at most two for each question answered no
        assertTrue(model.evaluations.get() <= 2 * 12);
    }

    @Test
    void aFaultInTheModelComesOut() {
        Model faulty = (in, out) -> {
            throw new IllegalStateException("fault");
        };
        InputList inputs = list(input("x", 1.0, 0.1));
        IllegalStateException seen =
                assertThrows(IllegalStateException.class, () -> CompositePropagation.ofFunction(faulty, 1, inputs));
        assertEquals("fault", seen.getMessage());
    }

    /** √x at 0.04 ± 0.05: below 0 it has no value, so the upper side alone speaks: √0.09 − √0.04. */
    @Test
    void oneSideIsUsedWhereTheOtherHasNoValue() {
        Effects effects = CompositePropagation.ofFunction(
                (in, out) -> {
                    out[0] = Math.sqrt(in[0]);
                    out[1] = Math.sqrt(in[0] - 1.0);
                },
                2,
                list(input("x", 0.04, 0.05)));
        assertEquals(0.1, effects.effect(0, 0, 0), 1e-15);
        assertTrue(Double.isNaN(effects.curvature(0, 0, 0)));
        assertEquals(0.0, effects.largestCurvature(0, 0), 0.0);
        assertTrue(Double.isNaN(effects.combined(0, 1).value()));
        assertTrue(Double.isNaN(effects.combined(0, 1).u()));
    }

    /** u far below the spacing of doubles at 300 K: the step is 64 spacings, the effect is still c·u. */
    @Test
    void aStepBelowTheSpacingOfNumbersIsWidened() {
        Effects effects =
                CompositePropagation.ofFunction((in, out) -> out[0] = 2.0 * in[0], 1, list(input("x", 300.0, 1e-20)));
        assertEquals(2e-20, effects.effect(0, 0, 0), 1e-32);
    }

    @Test
    void welchSatterthwaiteByHand() {
        // u² = 9 + 16 = 25; ν = 625/(81/4 + 256/8)
        Combined combined = Combined.of(1.0, new double[] {3.0, -4.0}, new double[] {4.0, 8.0});
        assertEquals(5.0, combined.u(), 1e-15);
        assertEquals(625.0 / (81.0 / 4.0 + 256.0 / 8.0), combined.dof(), 1e-12);
        assertEquals(
                INF, Combined.of(1.0, new double[] {3.0}, new double[] {INF}).dof(), 0.0);
        assertEquals(INF, Combined.of(1.0, new double[0], new double[0]).dof(), 0.0);
    }

    @Test
    void listAndModelMustAgree() {
        SmallCampaign model = new SmallCampaign(2);
        InputList tooShort = list(input("x", 0.0, 1.0));
        assertThrows(
                IllegalArgumentException.class,
                () -> CompositePropagation.run(model, tooShort, 1, () -> false, fraction -> {}));
    }

    @Property
    void sharesOfABudgetSumToAHundred(
            @ForAll @Size(min = 1, max = 8) List<@DoubleRange(min = -3.0, max = 3.0) Double> slopes) {
        Input[] inputs = new Input[slopes.size()];
        for (int i = 0; i < inputs.length; i++) {
            inputs[i] = input("x" + i, i, 0.5 + i);
        }
        Effects effects = CompositePropagation.ofFunction(
                (in, out) -> {
                    out[0] = 1.0; // one input that always acts, so that there is something to share out
                    for (int i = 0; i < in.length; i++) {
                        out[0] += (slopes.get(i) + (i == 0 ? 4.0 : 0.0)) * in[i];
                    }
                },
                1,
                list(inputs));
        Budget budget = Budget.of(effects, 0, 0);
        double sum = 0.0;
        double previous = INF;
        for (Budget.Line line : budget.lines()) {
            sum += line.sharePercent();
            assertTrue(Math.abs(line.contribution()) <= previous);
            previous = Math.abs(line.contribution());
            assertEquals(line.contribution(), line.sensitivity() * line.input().u(), 1e-12);
        }
        assertEquals(100.0, sum, 1e-9);
    }
}
