package plateledger.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;
import plateledger.uncertainty.Effects;
import plateledger.uncertainty.Input;

/**
 * Turns propagated effects on Re, Nu and Pr of runs into a fit problem. An input that reaches one point only is random for
 * the fit; one that reaches several is a shared source, whatever its scope is called. METHODS.md eq. (F-1).
 */
public final class PointsFromEffects {
    private PointsFromEffects() {}

    /**
     * A run to be fitted.
     *
     * @param id run
     * @param set set point name; empty if it is no repeat
     * @param block its block in the effects
     */
    public record RunBlock(String id, String set, int block) {}

    /**
     * Places of the outputs in each block.
     *
     * @param re Reynolds number
     * @param nu Nusselt number
     * @param pr Prandtl number
     */
    public record Outputs(int re, int nu, int pr) {}

    /**
     * The fit problem of some runs.
     *
     * @param id name of the fit
     * @param prandtlExponent n
     * @param effects propagated effects; Re, Nu and Pr in natural units, not logarithms
     * @param runs the runs, in the order wanted
     * @param outputs where Re, Nu and Pr are
     */
    public static FitProblem problem(
            String id, double prandtlExponent, Effects effects, List<RunBlock> runs, Outputs outputs) {
        TreeMap<Integer, List<Integer>> reach = new TreeMap<>();
        for (int p = 0; p < runs.size(); p++) {
            for (int input : effects.inputsOf(runs.get(p).block())) {
                reach.computeIfAbsent(input, key -> new ArrayList<>()).add(p);
            }
        }
        double[] varX = new double[runs.size()];
        double[] varY = new double[runs.size()];
        double[] covXY = new double[runs.size()];
        List<SharedSource> sources = new ArrayList<>();
        reach.forEach((input, points) -> {
            double[] dx = new double[runs.size()];
            double[] dy = new double[runs.size()];
            int reached = 0;
            int last = 0;
            for (int p : points) {
                int block = runs.get(p).block();
                dx[p] = relative(effects, block, outputs.re(), input);
                dy[p] = relative(effects, block, outputs.nu(), input)
                        - prandtlExponent * relative(effects, block, outputs.pr(), input);
                if (dx[p] != 0.0 || dy[p] != 0.0) {
                    reached++;
                    last = p;
                }
            }
            if (reached == 1) {
                varX[last] += dx[last] * dx[last];
                varY[last] += dy[last] * dy[last];
                covXY[last] += dx[last] * dy[last];
            } else if (reached > 1) {
                Input source = effects.inputs().get(input);
                sources.add(new SharedSource(source.name(), source.scope().toString(), dx, dy, source.dof()));
            }
        });
        List<FitPoint> points = new ArrayList<>();
        for (int p = 0; p < runs.size(); p++) {
            RunBlock run = runs.get(p);
            double ux = Math.sqrt(varX[p]);
            double uy = Math.sqrt(varY[p]);
            double r = ux > 0.0 && uy > 0.0 ? Math.max(-1.0, Math.min(1.0, covXY[p] / (ux * uy))) : 0.0;
            points.add(new FitPoint(
                    run.id(),
                    run.set(),
                    effects.value(run.block(), outputs.re()),
                    effects.value(run.block(), outputs.nu()),
                    effects.value(run.block(), outputs.pr()),
                    ux,
                    uy,
                    r));
        }
        return new FitProblem(id, prandtlExponent, points, sources);
    }

    private static double relative(Effects effects, int block, int output, int input) {
        return effects.effect(block, output, input) / effects.value(block, output);
    }
}
