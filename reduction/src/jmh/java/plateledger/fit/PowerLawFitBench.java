package plateledger.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import plateledger.finding.RefusedException;

/** Time of one whole fit: 200 points with 30 shared sources, and a campaign of 16 points with 200. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 3, time = 1)
@Fork(1)
public class PowerLawFitBench {
    /** Points and sources. */
    @Param({"200/30", "16/200"})
    public String size = "";

    private FitProblem problem = new FitProblem("none", 0.0, List.of(), List.of());

    /** Draws the points. */
    @Setup
    public void draw() {
        String[] parts = size.split("/", -1);
        int n = Integer.parseInt(parts[0]);
        int count = Integer.parseInt(parts[1]);
        SplittableRandom random = new SplittableRandom(7L);
        List<FitPoint> points = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            double lnRe = 11.0 + 3.0 * i / n;
            double lnNu = -3.5 + 0.8 * lnRe + 0.006 * random.nextGaussian();
            points.add(new FitPoint(
                    "R" + i,
                    "L" + i / 2,
                    Math.exp(lnRe + 0.008 * random.nextGaussian()),
                    Math.exp(lnNu),
                    0.71,
                    0.008,
                    0.006,
                    0.2));
        }
        List<SharedSource> sources = new ArrayList<>();
        for (int s = 0; s < count; s++) {
            double[] dx = new double[n];
            double[] dy = new double[n];
            double tilt = random.nextDouble();
            for (int i = 0; i < n; i++) {
                dx[i] = 0.001 * (1.0 + tilt * i / n);
                dy[i] = 0.002 * (1.0 - tilt * i / n);
            }
            sources.add(new SharedSource("s" + s, "campaign", dx, dy, 50.0));
        }
        problem = new FitProblem("bench", 1.0 / 3.0, points, sources);
    }

    /** One fit. */
    @Benchmark
    public FitResult fit() throws RefusedException {
        return PowerLawFit.fit(problem);
    }
}
