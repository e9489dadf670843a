package plateledger.theory;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Time of one superposition for a plate of 40 cells and 16 stations, and of one step integral. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class SuperpositionBenchmark {
    private static final int CELLS = 40;
    private static final int STATIONS = 16;

    private final double[] edges = new double[CELLS + 1];
    private final double[] flux = new double[CELLS];
    private final double[] stations = new double[STATIONS];
    private final double[] out = new double[STATIONS];
    private double x = 0.3;

    /** Lays out the plate. */
    public SuperpositionBenchmark() {
        for (int i = 0; i <= CELLS; i++) {
            edges[i] = 0.1 + 0.01 * i;
        }
        for (int i = 0; i < CELLS; i++) {
            flux[i] = 400.0 + i;
        }
        for (int i = 0; i < STATIONS; i++) {
            stations[i] = 0.1125 + 0.025 * i;
        }
    }

    private final Influence influence = Influence.of(edges, stations, 0.0, LayerLaw.LAMINAR);

    /** Laminar, from the edges. */
    @Benchmark
    public double[] laminar() {
        Superposition.wallDifference(edges, flux, stations, 0.0, LayerLaw.LAMINAR, 4e5, 0.71, 0.026, out);
        return out;
    }

    /** Turbulent, from the edges, with a virtual origin. */
    @Benchmark
    public double[] turbulent() {
        Superposition.wallDifference(edges, flux, stations, 0.02, LayerLaw.TURBULENT, 1e6, 0.71, 0.026, out);
        return out;
    }

    /** Laminar, geometry worked out before. */
    @Benchmark
    public double[] laminarPrepared() {
        influence.wallDifference(flux, 4e5, 0.71, 0.026, out);
        return out;
    }

    /** One step integral, two looked-up values. */
    @Benchmark
    public double stepIntegral() {
        x = x < 0.5 ? x + 1e-4 : 0.3;
        return StepIntegral.between(LayerLaw.LAMINAR, 0.12, 0.13, x);
    }
}
