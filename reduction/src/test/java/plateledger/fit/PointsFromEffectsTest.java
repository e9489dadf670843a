package plateledger.fit;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import plateledger.uncertainty.CompositeModel;
import plateledger.uncertainty.CompositePropagation;
import plateledger.uncertainty.Distribution;
import plateledger.uncertainty.Effects;
import plateledger.uncertainty.Input;
import plateledger.uncertainty.InputList;
import plateledger.uncertainty.Scope;

final class PointsFromEffectsTest {
    /** Three runs: Re = gain · speed, Nu = Re^0.5 (1 + zero), Pr = 0.7; the zero of a day reaches run 2 alone. */
    private static final class Runs implements CompositeModel {
        @Override
        public int inputs() {
            return 5;
        }

        @Override
        public int blocks() {
            return 3;
        }

        @Override
        public int outputs(int block) {
            return 3;
        }

        @Override
        public int[] blocksOf(int input) {
            return input == 0 ? new int[] {0, 1, 2} : new int[] {Math.min(input - 1, 2)};
        }

        @Override
        public int arguments(int block) {
            return 3;
        }

        @Override
        public At at(double[] in) {
            return (block, arguments) -> {
                arguments[0] = in[0];
                arguments[1] = in[1 + block];
                arguments[2] = block == 2 ? in[4] : 0.0;
            };
        }

        @Override
        public void evaluate(int block, double[] arguments, double[] out) {
            out[0] = arguments[0] * arguments[1];
            out[1] = Math.sqrt(out[0]) * (1.0 + arguments[2]);
            out[2] = 0.7;
        }
    }

    private static Input input(String name, double value, double u, double dof, Scope scope) {
        return new Input(name, value, u, Distribution.NORMAL, dof, scope);
    }

    @Test
    void whatReachesOneRunIsRandomAndTheRestIsShared() {
        InputList.Builder list = new InputList.Builder();
        list.add(input("gain", 2.0, 0.002, 12.0, Scope.instrument("pitot")));
        list.add(input("R1/speed", 1e5, 100.0, 20.0, Scope.run("R1")));
        list.add(input("R2/speed", 2e5, 200.0, 20.0, Scope.run("R2")));
        list.add(input("R3/speed", 4e5, 400.0, 20.0, Scope.run("R3")));
        list.add(input("zero", 0.0, 0.003, 5.0, Scope.day("2026-03-11")));
        Effects effects = CompositePropagation.run(new Runs(), list.build(), 1, () -> false, fraction -> {});
        FitProblem problem = PointsFromEffects.problem(
                "product",
                1.0 / 3.0,
                effects,
                List.of(
                        new PointsFromEffects.RunBlock("R3", "H", 2),
                        new PointsFromEffects.RunBlock("R1", "L", 0),
                        new PointsFromEffects.RunBlock("R2", "M", 1)),
                new PointsFromEffects.Outputs(0, 1, 2));
        assertEquals(1, problem.sources().size());
        SharedSource gain = problem.sources().get(0);
        assertEquals("gain", gain.name());
        assertEquals("instrument:pitot", gain.scope());
        assertEquals(12.0, gain.dof(), 0.0);
        assertArrayEquals(new double[] {1e-3, 1e-3, 1e-3}, gain.dLnRe(), 1e-12);
        // √ by central differences with a relative step of 1e-3: 0.5e-3 (1 + 1e-6/8)
        assertArrayEquals(new double[] {0.5e-3, 0.5e-3, 0.5e-3}, gain.dLnY(), 1e-9);
        FitPoint r3 = problem.points().get(0);
        assertEquals(8e5, r3.re(), 1e-6);
        assertEquals(1e-3, r3.uLnReRandom(), 1e-12);
        // speed 0.5e-3 and the day's zero 3e-3, independent
        assertEquals(Math.hypot(0.5e-3, 3e-3), r3.uLnYRandom(), 1e-9);
        assertEquals(0.5e-3 / Math.hypot(0.5e-3, 3e-3), r3.correlationRandom(), 1e-6);
        assertEquals(1.0, problem.points().get(1).correlationRandom(), 1e-12);
    }
}
