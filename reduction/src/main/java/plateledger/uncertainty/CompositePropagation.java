package plateledger.uncertainty;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import java.util.function.IntConsumer;

/**
 * Propagation of uncertainty through a {@link CompositeModel}, METHODS.md eq. (U-7).
 *
 * <pre>
 *   δa_ij = [a_j(x_i + u_i) − a_j(x_i − u_i)]/2         what input i does to argument j
 *   s_j   = √(Σ_i δa_ij²)                               the step of argument j: its own standard uncertainty
 *   g_j   = [f(a + s_j e_j) − f(a − s_j e_j)]/2         what that does to the outputs
 *   c_i u_i = Σ_j g_j δa_ij/s_j
 * </pre>
 *
 * <p>Exact to second order, as plain central perturbation of the inputs is; the number of calls of the dear step is twice
 * the number of arguments, whatever the number of inputs. The result does not depend on the number of threads.
 */
public final class CompositePropagation {
    /** Smallest step in spacings of floating-point numbers, so that a tiny u still moves the argument. */
    private static final double FLOOR_ULPS = 64.0;

    private final CompositeModel model;
    private final InputList inputs;
    private final double[] best;
    private final int[][] reach;
    private final double[][] centre;
    private final double[][][] moves;

    private CompositePropagation(CompositeModel model, InputList inputs) {
        if (model.inputs() != inputs.size()) {
            throw new IllegalArgumentException(
                    "the model has %d inputs, the list %d".formatted(model.inputs(), inputs.size()));
        }
        this.model = model;
        this.inputs = inputs;
        best = inputs.values();
        reach = reach();
        centre = new double[model.blocks()][];
        moves = new double[model.blocks()][][];
        CompositeModel.At at = model.at(best.clone());
        for (int b = 0; b < centre.length; b++) {
            centre[b] = new double[model.arguments(b)];
            at.arguments(b, centre[b]);
            moves[b] = new double[reach[b].length][];
        }
    }

    private int[][] reach() {
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

    /** Effects of all inputs on all outputs of a plain function, as block 0, on the calling thread: eq. (U-1). */
    public static Effects ofFunction(Model function, int outputs, InputList inputs) {
        return run(new OneBlock(function, inputs.size(), outputs), inputs, 1, () -> false, share -> {});
    }

    /**
     * Effects of all inputs on all blocks.
     *
     * @param model the function
     * @param inputs its inputs
     * @param threads number of threads, at least 1
     * @param cancelled asked between evaluations; called from worker threads
     * @param progress told the share done, 0..1; one call at a time
     * @throws CancellationException if cancelled
     */
    public static Effects run(
            CompositeModel model, InputList inputs, int threads, BooleanSupplier cancelled, DoubleConsumer progress) {
        CompositePropagation p = new CompositePropagation(model, inputs);
        int[] moved = p.movedInputs();
        int work = moved.length + model.blocks() * 20; // a block costs about as much as twenty inputs
        Share share = new Share(work, progress);
        each(moved.length, threads, cancelled, k -> {
            p.move(moved[k]);
            share.add(1);
        });
        Effects.Block[] blocks = new Effects.Block[model.blocks()];
        each(blocks.length, threads, cancelled, b -> {
            blocks[b] = p.block(b, cancelled);
            share.add(20);
        });
        return new Effects(inputs, blocks);
    }

    private int[] movedInputs() {
        return java.util.stream.IntStream.range(0, inputs.size())
                .filter(i -> inputs.get(i).u() > 0.0 && model.blocksOf(i).length > 0)
                .toArray();
    }

    /** What one input does to the arguments of every block it reaches. */
    private void move(int input) {
        double u = inputs.get(input).u();
        double step = Math.max(u, FLOOR_ULPS * Math.ulp(best[input]));
        double[] up = best.clone();
        double[] down = best.clone();
        up[input] = best[input] + step;
        down[input] = best[input] - step;
        double raised = (up[input] - best[input]) / u; // after rounding
        double lowered = (best[input] - down[input]) / u;
        CompositeModel.At above = model.at(up);
        CompositeModel.At below = model.at(down);
        for (int b : model.blocksOf(input)) {
            double[] high = new double[centre[b].length];
            double[] low = new double[centre[b].length];
            above.arguments(b, high);
            below.arguments(b, low);
            for (int j = 0; j < high.length; j++) {
                high[j] = effect(centre[b][j], high[j], low[j], raised, lowered);
            }
            moves[b][Arrays.binarySearch(reach[b], input)] = high;
        }
    }

    private Effects.Block block(int b, BooleanSupplier cancelled) {
        int n = model.outputs(b);
        double[] value = new double[n];
        model.evaluate(b, centre[b], value);
        double[] step = steps(b);
        double[][] gain = new double[step.length][];
        double[][] bend = new double[step.length][];
        for (int j = 0; j < step.length; j++) {
            if (cancelled.getAsBoolean()) {
                throw new CancellationException("propagation cancelled");
            }
            if (step[j] != 0.0) { // NaN too: an argument without a value makes the outputs' uncertainty unknown
                perturb(b, j, step[j], value, gain, bend);
            }
        }
        double[][] effects = new double[reach[b].length][n];
        float[][] curvatures = new float[reach[b].length][n];
        for (int i = 0; i < effects.length; i++) {
            double[] move = moves[b][i];
            for (int j = 0; j < step.length; j++) {
                if (move[j] != 0.0) {
                    double w = move[j] / step[j];
                    for (int o = 0; o < n; o++) {
                        effects[i][o] += w * gain[j][o];
                        curvatures[i][o] += (float) (w * w * bend[j][o]);
                    }
                }
            }
        }
        moves[b] = new double[0][];
        return new Effects.Block(value, reach[b], effects, curvatures);
    }

    /** s_j. */
    private double[] steps(int b) {
        double[] step = new double[centre[b].length];
        for (double[] move : moves[b]) {
            for (int j = 0; j < step.length; j++) {
                step[j] += move[j] * move[j];
            }
        }
        for (int j = 0; j < step.length; j++) {
            step[j] = Math.sqrt(step[j]);
        }
        return step;
    }

    private void perturb(int b, int j, double u, double[] value, double[][] gain, double[][] bend) {
        int n = value.length;
        double step = Math.max(u, FLOOR_ULPS * Math.ulp(centre[b][j]));
        double[] arguments = centre[b].clone();
        double[] high = new double[n];
        double[] low = new double[n];
        arguments[j] = centre[b][j] + step;
        double up = arguments[j] - centre[b][j];
        model.evaluate(b, arguments, high);
        arguments[j] = centre[b][j] - step;
        double down = centre[b][j] - arguments[j];
        model.evaluate(b, arguments, low);
        gain[j] = new double[n];
        bend[j] = new double[n];
        for (int o = 0; o < n; o++) {
            gain[j][o] = effect(value[o], high[o], low[o], up, down) * u;
            bend[j][o] = 0.5 * Math.abs(high[o] + low[o] - 2.0 * value[o]) * (u / up) * (u / down);
        }
    }

    /** Slope by both sides, or by the one that gives a number. */
    private static double effect(double f, double high, double low, double up, double down) {
        if (Double.isNaN(low)) {
            return (high - f) / up;
        }
        if (Double.isNaN(high)) {
            return (f - low) / down;
        }
        return (high - low) / (up + down);
    }

    /** Runs tasks 0..n−1 on some threads; each task is its own, so the order does not matter. */
    private static void each(int n, int threads, BooleanSupplier cancelled, IntConsumer task) {
        if (threads < 1) {
            throw new IllegalArgumentException("number of threads must be at least 1, found " + threads);
        }
        AtomicInteger next = new AtomicInteger();
        Runnable worker = () -> {
            for (int k = next.getAndIncrement(); k < n; k = next.getAndIncrement()) {
                if (cancelled.getAsBoolean()) {
                    throw new CancellationException("propagation cancelled");
                }
                task.accept(k);
            }
        };
        if (threads == 1) {
            worker.run();
            return;
        }
        ExecutorService executor = Executors.newFixedThreadPool(threads, r -> {
            Thread thread = new Thread(r, "propagation");
            thread.setDaemon(true);
            return thread;
        });
        try {
            List<Future<?>> futures = new ArrayList<>();
            for (int t = 0; t < threads; t++) {
                futures.add(executor.submit(worker));
            }
            for (Future<?> future : futures) {
                future.get();
            }
        } catch (ExecutionException e) {
            if (e.getCause() instanceof RuntimeException runtime) {
                throw runtime;
            }
            throw new IllegalStateException("propagation failed", e.getCause());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            CancellationException cancelledHere = new CancellationException("propagation interrupted");
            cancelledHere.initCause(e);
            throw cancelledHere;
        } finally {
            executor.shutdownNow();
        }
    }

    /** Counts what is done; one caller at a time, so that the reported share never falls. */
    private static final class Share {
        private final double total;
        private final DoubleConsumer progress;
        private double done;

        Share(double total, DoubleConsumer progress) {
            this.total = total;
            this.progress = progress;
        }

        synchronized void add(double part) {
            done += part;
            progress.accept(Math.min(1.0, done / total));
        }
    }

    /** A plain function seen as one block whose arguments are the inputs. */
    private record OneBlock(Model function, int inputs, int outputCount) implements CompositeModel {
        private static final int[] BLOCK = {0};

        @Override
        public int blocks() {
            return 1;
        }

        @Override
        public int arguments(int block) {
            return inputs;
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
        public At at(double[] in) {
            return (block, arguments) -> System.arraycopy(in, 0, arguments, 0, in.length);
        }

        @Override
        public void evaluate(int block, double[] arguments, double[] out) {
            function.evaluate(arguments, out);
        }
    }
}
