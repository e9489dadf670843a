package plateledger.ledger;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import plateledger.ledger.RunLayout.In;
import plateledger.ledger.RunLayout.Out;
import plateledger.ledger.RunLayout.StationOut;
import plateledger.rig.Plate;

/** The kernel against an independent two-dimensional sheet ({@link FineSheet}) with every loss in its full form. */
final class RunModelTest {
    private static final double SIGMA_K = 0.02;

    private record Case(Plate plate, double[] in, FineSheet truth, RunModel model, double[] out, RunLayout layout) {
        double get(Out name) {
            return out[layout.at(name)];
        }
    }

    private static Case solve(Plate.SmoothShape shape, double speed, double stripW, DoubleUnaryOperator h) {
        Plate plate = TestPlates.plate(shape);
        double[] in = TestPlates.inputs(plate, speed, stripW);
        RunLayout l = RunModel.layout(plate);
        RunSetting.Flow flow = shape == Plate.SmoothShape.UNIFORM ? RunSetting.Flow.PRODUCT : RunSetting.Flow.LAMINAR;
        // T_aw by hand: r U²/(2 c_p) with r = Pr^½ or Pr^⅓, Pr 0.71, c_p 1012 J/(kg K) for air of 1 % water
        double r = flow == RunSetting.Flow.LAMINAR ? Math.sqrt(0.71) : Math.cbrt(0.71);
        double taw = 295.15 + r * speed * speed / (2.0 * 1012.0);
        FineSheet truth = new FineSheet(plate, in, taw, h, 400, 30);
        for (int p = 0; p < l.junctions(); p++) {
            Plate.Thermocouple t = plate.thermocouples().get(p);
            in[l.reading(p)] = truth.junction(t.xM().value(), t.zM(), 0.002);
        }
        double[] sigma = new double[l.junctions()];
        Arrays.fill(sigma, SIGMA_K);
        RunModel model = RunModel.configure(new RunSetting(plate, flow, Optional.empty(), true, true, true, sigma), in);
        double[] out = new double[l.outputs()];
        model.evaluate(in, out);
        return new Case(plate, in, truth, model, out, l);
    }

    /** Average h, area mean temperature and every booked watt; tolerance from the fine grid and the span profile. */
    @Test
    void recoversUniformHAndItsLedger() {
        for (double[] c : new double[][] {{2.0, 3.5, 6.0}, {20.0, 22.0, 60.0}}) {
            double h = c[2];
            Case s = solve(Plate.SmoothShape.UNIFORM, c[0], c[1], x -> h);
            assertEquals(h, s.get(Out.H), 3e-3 * h, "average h");
            double area = s.truth.dx * s.truth.dz * 2.0;
            double conv = 0.0;
            double rad = 0.0;
            double back = 0.0;
            double edge = 0.0;
            double surface = 0.0;
            for (int i = 0; i < s.truth.nx; i++) {
                for (int j = 0; j < s.truth.nz; j++) {
                    conv += area * s.truth.conv(i, j);
                    rad += area * s.truth.radiation(s.truth.ts[i][j]);
                    back += area * 0.46 * (s.truth.t[i][j] - 296.15);
                    surface += area * s.truth.ts[i][j] / 0.12;
                }
                double last = s.truth.t[i][s.truth.nz - 1];
                double kt = 14.9 * 0.5e-3;
                double g = 1.0 / (1.0 / 0.05 + 0.5 * s.truth.dz / kt);
                edge += 2.0 * s.truth.dx * g * (last - 295.65);
            }
            double power = s.get(Out.Q_ELECTRICAL);
            assertEquals(conv, s.get(Out.Q_CONVECTION), 2e-3 * power, "convection");
            assertEquals(rad, s.get(Out.Q_RADIATION), 1e-3 * power, "radiation");
            assertEquals(back, s.get(Out.Q_BACK), 1e-3 * power, "back");
            assertEquals(edge, s.get(Out.Q_EDGE), 2e-3 * power, "edges");
            assertEquals(surface, s.get(Out.MEAN_SURFACE), 0.03, "mean surface");
            assertEquals(0.0, s.get(Out.Q_RESIDUAL), 2e-3 * power, "residual");
        }
    }

    /** Interior stations recover a falling h(x) within 1 %. */
    @Test
    void recoversFallingH() {
        DoubleUnaryOperator h =
                x -> 5.5 * Math.pow(x / 0.5, -0.5) * Math.pow(1.0 - Math.pow(0.1 / x, 0.75), -1.0 / 3.0);
        Case s = solve(Plate.SmoothShape.BOUNDARY_LAYER, 2.0, 3.5, h);
        for (int j = 0; j < 16; j++) {
            double x = s.out[s.layout.at(j, StationOut.X)];
            double found = s.out[s.layout.at(j, StationOut.H)];
            assertEquals(h.applyAsDouble(x), found, (j < 2 ? 0.03 : 0.01) * found, "station " + (j + 1));
        }
    }

    /** Scaling power and every temperature difference alike leaves h; only radiation is not linear, so it is switched off. */
    @Test
    void scalingPowerAndDifferencesLeavesH() {
        Plate plate = TestPlates.plate(Plate.SmoothShape.UNIFORM);
        double[] in = TestPlates.inputs(plate, 5.0, 6.0);
        RunLayout l = RunModel.layout(plate);
        in[l.at(In.EMISSIVITY)] = 1e-12;
        FineSheet truth = new FineSheet(plate, in, 295.15, x -> 15.0, 200, 20);
        for (int p = 0; p < l.junctions(); p++) {
            in[l.reading(p)] =
                    truth.junction(in[l.place(p)], plate.thermocouples().get(p).zM(), 0.002);
        }
        double[] sigma = new double[l.junctions()];
        Arrays.fill(sigma, SIGMA_K);
        RunSetting setting = new RunSetting(plate, RunSetting.Flow.PRODUCT, Optional.empty(), true, true, true, sigma);
        double[] out = new double[l.outputs()];
        RunModel model = RunModel.configure(setting, in);
        model.evaluate(in, out);
        double taw = out[l.at(0, StationOut.REFERENCE)];
        double[] twice = in.clone();
        for (int j = 0; j < l.strips(); j++) {
            twice[l.power(j)] = 2.0 * in[l.power(j)];
            twice[l.lead(j)] = 2.0 * in[l.lead(j)];
        }
        twice[l.at(In.DRIFT)] = 2.0 * in[l.at(In.DRIFT)];
        for (In t : new In[] {In.PLENUM_TEMPERATURE, In.FRAME_TEMPERATURE, In.NOSE_TEMPERATURE, In.TAIL_TEMPERATURE}) {
            twice[l.at(t)] = taw + 2.0 * (in[l.at(t)] - taw);
        }
        for (int p = 0; p < l.junctions(); p++) {
            twice[l.reading(p)] = taw + 2.0 * (in[l.reading(p)] - taw);
        }
        // the smoothing weighs readings by their uncertainty, so that scales too
        double[] doubled = new double[l.junctions()];
        Arrays.fill(doubled, 2.0 * SIGMA_K);
        RunSetting scaled = new RunSetting(plate, RunSetting.Flow.PRODUCT, Optional.empty(), true, true, true, doubled);
        double[] other = new double[l.outputs()];
        RunModel.configure(scaled, twice).evaluate(twice, other);
        assertEquals(out[l.at(Out.H)], other[l.at(Out.H)], 1e-6 * out[l.at(Out.H)]);
        assertTrue(out[l.at(Out.H)] > 10.0);
    }
}
