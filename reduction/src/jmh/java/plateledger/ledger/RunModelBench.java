package plateledger.ledger;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
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
import plateledger.ledger.RunLayout.In;
import plateledger.quantity.Stated;
import plateledger.rig.Plate;

/**
 * Time of one call of the kernel, the unit in which a propagation is counted. Bytes allocated per call are told by JMH's own
 * profiler: {@code -Dexec.args="RunModelBench -prof gc"}, line {@code gc.alloc.rate.norm}.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 3, time = 1)
@Fork(1)
public class RunModelBench {
    /** State of the layer: theory is superposed but for a product. */
    @Param({"LAMINAR", "TURBULENT", "PRODUCT"})
    public String flow = "";

    private final Plate plate = plate();
    private final RunLayout layout = RunModel.layout(plate);
    private final double[] in = new double[layout.inputs()];
    private final double[] out = new double[layout.outputs()];
    private RunModel model = model(RunSetting.Flow.PRODUCT);

    /** Configures the model. */
    @Setup
    public void configure() {
        model = model(RunSetting.Flow.valueOf(flow));
    }

    /** One call at the best estimate. */
    @Benchmark
    public double[] bestEstimate() {
        model.evaluate(in, out);
        return out;
    }

    /** One call with a perturbed power, as a propagation makes it. */
    @Benchmark
    public double[] perturbed() {
        double[] moved = in.clone();
        moved[layout.power(3)] *= 1.001;
        model.evaluate(moved, out);
        return out;
    }

    /** The choices frozen once per run. */
    @Benchmark
    public RunModel configured() {
        return model(RunSetting.Flow.valueOf(flow));
    }

    private RunModel model(RunSetting.Flow state) {
        fill(20.0, 8.0);
        double[] sigma = new double[layout.junctions()];
        Arrays.fill(sigma, 0.02);
        return RunModel.configure(new RunSetting(plate, state, Optional.of(0.05), true, true, true, sigma), in);
    }

    private void set(In name, double value) {
        in[layout.at(name)] = value;
    }

    /** An invented run at a uniform flux; readings follow a falling h well enough to be a usual case. */
    private void fill(double speed, double stripW) {
        set(In.HEATED_START, 0.1);
        set(In.HEATED_END, 0.5);
        set(In.WIDTH, 0.3);
        set(In.SHEET_THICKNESS, 0.5e-3);
        set(In.SHEET_CONDUCTIVITY, 14.9);
        set(In.SHEET_HEAT_CAPACITY, 3.77e6);
        set(In.COAT_THICKNESS, 50e-6);
        set(In.COAT_CONDUCTIVITY, 0.2);
        set(In.JUNCTION_DEPTH, 0.5e-3);
        set(In.EMISSIVITY, 0.95);
        set(In.EXCHANGE_FACTOR, 0.97);
        set(In.BACK_CONDUCTANCE, 0.46);
        set(In.EDGE_CONDUCTANCE, 0.05);
        set(In.NOSE_CONDUCTANCE, 0.05);
        set(In.TAIL_CONDUCTANCE, 0.05);
        set(In.FOAM_THICKNESS, 0.05);
        set(In.FOAM_HEAT_CAPACITY, 6.6e4);
        for (In factor :
                new In[] {In.DENSITY_FACTOR, In.VISCOSITY_FACTOR, In.CONDUCTIVITY_FACTOR, In.HEAT_CAPACITY_FACTOR}) {
            set(factor, 1.0);
        }
        set(In.SPEED, speed);
        set(In.AIR_TEMPERATURE, 295.15);
        set(In.PRESSURE, 98_000.0);
        set(In.VAPOUR_FRACTION, 0.01);
        set(In.WALL_TEMPERATURE, 295.65);
        set(In.PLENUM_TEMPERATURE, 296.15);
        set(In.FRAME_TEMPERATURE, 295.65);
        set(In.NOSE_TEMPERATURE, 297.15);
        set(In.TAIL_TEMPERATURE, 299.15);
        for (int j = 0; j < layout.strips(); j++) {
            in[layout.power(j)] = stripW;
            in[layout.lead(j)] = 0.01;
        }
        for (int p = 0; p < layout.junctions(); p++) {
            double x = plate.thermocouples().get(p).xM().value();
            in[layout.place(p)] = x;
            in[layout.stem(p)] = 0.002;
            double h = 40.0 * Math.pow(x / 0.3, -0.3);
            in[layout.reading(p)] = 295.3 + stripW / 0.015 / (h + 6.0);
        }
    }

    private static Plate plate() {
        List<Plate.Heater> heaters = new ArrayList<>();
        List<Plate.Thermocouple> junctions = new ArrayList<>();
        for (int j = 0; j < 8; j++) {
            double from = 0.1 + 0.05 * j;
            heaters.add(new Plate.Heater("H" + j, from, from + 0.05, Stated.exact(0.01), "V" + j, "I" + j, 60.0));
            junctions.add(junction(from + 0.0125));
            junctions.add(junction(from + 0.0375));
        }
        Stated end = Stated.exact(0.05);
        return new Plate(
                "bench",
                "invented",
                Plate.Orientation.FACE_UP,
                Stated.exact(0.5),
                Stated.exact(0.3),
                Stated.exact(0.1),
                Stated.exact(0.5),
                new Plate.Sheet("steel", Stated.exact(0.5e-3), Stated.exact(14.9), Stated.exact(3.77e6)),
                new Plate.Coat("paint", Stated.exact(50e-6), Stated.exact(0.2)),
                new Plate.Foam("foam", Stated.exact(0.05), Stated.exact(6.6e4)),
                Stated.exact(0.95),
                Stated.exact(0.46),
                end,
                end,
                end,
                Stated.exact(0.075),
                Plate.SmoothShape.BOUNDARY_LAYER,
                heaters,
                junctions);
    }

    private static Plate.Thermocouple junction(double x) {
        return new Plate.Thermocouple(
                "T" + Math.round(1e4 * x), Stated.exact(x), 0.0, Stated.exact(0.5e-3), Stated.exact(0.002));
    }
}
