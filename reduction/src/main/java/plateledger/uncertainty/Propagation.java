package plateledger.uncertainty;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;

/**
 * Propagation of uncertainty by finite perturbation, JCGM 100:2008, 5.1.3 note 2. METHODS.md eq. (U-1).
 *
 * <pre>
 *   g_i = c_i u_i = [f(x_i + s) − f(x_i − s)]/2 · u_i/s      s = max(u_i, 64 ulp(x_i))
 *   curvature     = |f(x_i + s) + f(x_i − s) − 2 f(x)|/2 · (u_i/s)²
 * </pre>
 *
 * Where one side gives NaN the other is used with f(x); where both do, the effect is NaN and so is the uncertainty. Each
 * effect is computed by one call sequence of its own, so the result does not depend on the number of threads.
 */
public final class Propagation {
    private static final double FLOOR_ULPS = 64.0;

    private final SparseModel model;
    private final InputList inputs;
    private final double[] best;
    private final double[][] values;
    private final int[][] reach;
    private final double[][][] effects;
    private final float[][][] curvatures;

    private Propagation(SparseModel model, InputList inputs) {
        if (model.inputs() != inputs.size()) {
            throw new IllegalArgumentException(
                    "the model has " + model.inputs() + " inputs, the list " + inputs.size());
        }
        this.model = model;
        this.inputs = inputs;
        best = inputs.values();
        values = new double[model.blocks()][];
        reach = reach(model, inputs);
        effects = new double[model.blocks()][][];
        curvatures = new float[model.blocks()][][];
        for (int b = 0; b < values.length; b++) {
            values[b] = new double[model.outputs(b)];
            effects[b] = new double[reach[b].length][];
            curvatures[b] = new float[reach[b].length][];
        }
    }

    /** Effects of all inputs on all outputs of a plain function, as block 0, on the calling thread. */
    public static Effects jacobianTimesU(Model model, int outputs, InputList inputs) {
        return run(new OneBlock(model, inputs.size(), outputs), inputs, 1, () -> false, fraction -> {});
    }

    /**
     * Effects of all inputs on all blocks.
     *
     * @param model the function
     * @param inputs its inputs
     * @param threads number of threads, at least 1 (the calling thread alone)
     * @param cancelled asked between evaluations; called from worker threads
     * @param progress told the share done, 0..1, not decreasing; one call at a time, from worker threads
     * @throws CancellationException if cancelled
     */
    public static Effects run(
            SparseModel model, InputList inputs, int threads, BooleanSupplier cancelled, DoubleConsumer progress) {
        if (threads < 1) {
            throw new IllegalArgumentException("number of threads must be at least 1, found " + threads);
        }
        if (threads == 1) {
            return new Propagation(model, inputs).walk(Runnable::run, 1, cancelled, progress);
        }
        ExecutorService executor = Executors.newFixedThreadPool(threads, task -> {
            Thread thread = new Thread(task, "propagation");
            thread.setDaemon(true);
            return thread;
        });
        try {
            return new Propagation(model, inputs).walk(executor, threads, cancelled, progress);
        } finally {
            executor.shutdownNow();
        }
    }

    /**
     * The same on an executor of the caller's. Must not be called from a task of that executor.
     *
     * @param tasks number of tasks to hand to the executor, at least 1
     * @throws CancellationException if cancelled
     */
    public static Effects run(
            SparseModel model,
            InputList inputs,
            ExecutorService executor,
            int tasks,
            BooleanSupplier cancelled,
            DoubleConsumer progress) {
        return new Propagation(model, inputs).walk(executor, tasks, cancelled, progress);
    }

    private static int[][] reach(SparseModel model, InputList inputs) {
        List<List<Integer>> lists = new ArrayList<>();
        for (int b = 0; b < model.blocks(); b++) {
            lists.add(new ArrayList<>());
        }
        for (int i = 0; i < inputs.size(); i++) {
            if (inputs.get(i).u() > 0.0) {
                for (int b : model.blocksOf(i)) {
                    lists.get(b).add(i);
                }
            }
        }
        return lists.stream()
                .map(list -> list.stream().mapToInt(Integer::intValue).toArray())
                .toArray(int[][]::new);
    }

    private Effects walk(
            java.util.concurrent.Executor executor, int tasks, BooleanSupplier cancelled, DoubleConsumer progress) {
        SparseModel.At centre = model.at(best.clone());
        for (int b = 0; b < values.length; b++) {
            refuseIf(cancelled);
            centre.evaluate(b, values[b]);
        }
        int[] order = heaviestFirst();
        Done done = new Done(Arrays.stream(reach).mapToLong(r -> r.length).sum(), progress);
        AtomicInteger next = new AtomicInteger();
        AtomicBoolean failed = new AtomicBoolean();
        Runnable worker = () -> {
            try {
                for (int k = next.getAndIncrement(); k < order.length && !failed.get(); k = next.getAndIncrement()) {
                    perturb(order[k], cancelled);
                    done.add(model.blocksOf(order[k]).length);
                }
            } catch (RuntimeException | Error failure) {
                failed.set(true);
                throw failure;
            }
        };
        CompletableFuture<?>[] futures = new CompletableFuture<?>[tasks];
        for (int t = 0; t < tasks; t++) {
            futures[t] = CompletableFuture.runAsync(worker, executor);
        }
        try {
            CompletableFuture.allOf(futures).join();
        } catch (CompletionException failure) {
            throw unwrapped(failure);
        }
        Effects.Block[] blocks = new Effects.Block[values.length];
        for (int b = 0; b < blocks.length; b++) {
            blocks[b] = new Effects.Block(values[b], reach[b], effects[b], curvatures[b]);
        }
        return new Effects(inputs, blocks);
    }

    /** A shared input takes as long as all the blocks it reaches: started first, it does not end last. */
    private int[] heaviestFirst() {
        List<Integer> order = new ArrayList<>();
        for (int i = 0; i < inputs.size(); i++) {
            if (inputs.get(i).u() > 0.0 && model.blocksOf(i).length > 0) {
                order.add(i);
            }
        }
        order.sort(Comparator.comparingInt((Integer i) -> -model.blocksOf(i).length));
        return order.stream().mapToInt(Integer::intValue).toArray();
    }

    private void perturb(int input, BooleanSupplier cancelled) {
        double u = inputs.get(input).u();
        double x = best[input];
        double step = Math.max(u, FLOOR_ULPS * Math.ulp(x));
        double[] up = best.clone();
        double[] down = best.clone();
        up[input] = x + step;
        down[input] = x - step;
        SparseModel.At above = model.at(up);
        SparseModel.At below = model.at(down);
        // the steps that were really taken, after rounding
        double plus = (up[input] - x) / u;
        double minus = (x - down[input]) / u;
        for (int b : model.blocksOf(input)) {
            refuseIf(cancelled);
            int n = values[b].length;
            double[] high = new double[n];
            double[] low = new double[n];
            above.evaluate(b, high);
            below.evaluate(b, low);
            float[] curvature = new float[n];
            for (int o = 0; o < n; o++) {
                double f = values[b][o];
                curvature[o] = (float) (Math.abs(high[o] + low[o] - 2.0 * f) / (2.0 * plus * minus));
                high[o] = effect(f, high[o], low[o], plus, minus);
            }
            int slot = Arrays.binarySearch(reach[b], input);
            effects[b][slot] = high;
            curvatures[b][slot] = curvature;
        }
    }

    private static double effect(double f, double high, double low, double plus, double minus) {
        if (Double.isNaN(f)) {
            return Double.NaN;
        }
        if (Double.isNaN(low)) {
            return (high - f) / plus;
        }
        if (Double.isNaN(high)) {
            return (f - low) / minus;
        }
        return (high - low) / (plus + minus);
    }

    private static void refuseIf(BooleanSupplier cancelled) {
        if (cancelled.getAsBoolean()) {
            throw new CancellationException("propagation cancelled");
        }
    }

    private static RuntimeException unwrapped(CompletionException failure) {
        Throwable cause = failure.getCause();
        if (cause instanceof Error error) {
            throw error;
        }
        return cause instanceof RuntimeException runtime ? runtime : failure;
    }

    /** Counts what is done; one caller at a time, so that the reported share never falls. */
    private static final class Done {
        private final long total;
        private final DoubleConsumer progress;
        private long done;

        Done(long total, DoubleConsumer progress) {
            this.total = total;
            this.progress = progress;
        }

        synchronized void add(int blocks) {
            done += blocks;
            progress.accept((double) done / total);
        }
    }

    /** A plain function seen as one block that every input reaches. */
    private record OneBlock(Model model, int inputs, int outputCount) implements SparseModel {
        private static final int[] BLOCK = {0};

        @Override
        public int blocks() {
            return 1;
        }

        @Override
        public int outputs(int block) {
            return outputCount;
        }

        @Override
        public int[] blocksOf(int input) {
            return BLOCK;
        }

        @Override
        public void evaluateBlock(int block, double[] in, double[] out) {
            model.evaluate(in, out);
        }
    }
}
