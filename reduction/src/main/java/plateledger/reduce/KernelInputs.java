package plateledger.reduce;

import plateledger.ledger.LossTerm;
import plateledger.ledger.RunLayout;
import plateledger.ledger.RunLayout.In;

/** Fills a kernel input vector from a run's readings and the errors of its instruments. */
final class KernelInputs {
    private KernelInputs() {}

    /** Plate constants and surroundings, powers, junction places and stems; readings and stream are put by the caller. */
    static void plate(Reads v, RunIndex run, RunLayout layout, double[] in) {
        InputBook.PlateIndex p = run.panel;
        in[layout.at(In.HEATED_START)] = v.get(p.start());
        in[layout.at(In.HEATED_END)] = v.get(p.end());
        in[layout.at(In.WIDTH)] = v.get(p.width());
        in[layout.at(In.SHEET_THICKNESS)] = v.get(p.sheetThickness());
        in[layout.at(In.SHEET_CONDUCTIVITY)] = v.get(p.sheetConductivity());
        in[layout.at(In.SHEET_HEAT_CAPACITY)] = v.get(p.sheetCapacity());
        in[layout.at(In.COAT_THICKNESS)] = v.get(p.coatThickness());
        in[layout.at(In.COAT_CONDUCTIVITY)] = v.get(p.coatConductivity());
        in[layout.at(In.JUNCTION_DEPTH)] = v.get(p.depth());
        in[layout.at(In.EMISSIVITY)] = v.get(p.emissivity());
        in[layout.at(In.FOAM_THICKNESS)] = v.get(p.foamThickness());
        in[layout.at(In.FOAM_HEAT_CAPACITY)] = v.get(p.foamCapacity());
        in[layout.at(In.SMOOTHING)] = v.get(p.smoothing());
        in[layout.at(In.PLENUM_TEMPERATURE)] = Signal.mean(v, run.plenum);
        in[layout.at(In.FRAME_TEMPERATURE)] = Signal.mean(v, run.frame);
        in[layout.at(In.NOSE_TEMPERATURE)] = Signal.mean(v, run.nose);
        in[layout.at(In.TAIL_TEMPERATURE)] = Signal.mean(v, run.tail);
        in[layout.at(In.DRIFT)] = v.get(run.drift);
        for (int t = 0; t < layout.junctions(); t++) {
            in[layout.place(t)] = v.get(p.place()[t]);
            in[layout.stem(t)] = v.get(p.stem()[t]);
        }
    }

    /** Powers and lead losses; zero for a run without power. */
    static void power(Reads v, RunIndex run, RunLayout layout, boolean heated, double[] in) {
        for (int j = 0; j < layout.strips(); j++) {
            double power = 0.0;
            double lead = 0.0;
            if (heated) {
                double current = run.current[j].value(v);
                double covariance =
                        run.means.powerCovarianceW().length > j ? run.means.powerCovarianceW()[j] : 0.0;
                power = run.voltage[j].value(v) * current + covariance;
                lead = LossTerm.Lead.rateW(current, v.get(run.panel.lead()[j]));
            }
            in[layout.power(j)] = power;
            in[layout.lead(j)] = lead;
        }
    }

    /** Stream, walls and fluid factors. */
    static void stream(
            Reads v, RunIndex run, InputBook.TunnelIndex tunnel, StreamStage.State s, RunLayout layout, double[] in) {
        in[layout.at(In.SPEED)] = s.speed();
        in[layout.at(In.AIR_TEMPERATURE)] = s.airK();
        in[layout.at(In.PRESSURE)] = s.pressure();
        in[layout.at(In.VAPOUR_FRACTION)] = s.vapourFraction();
        in[layout.at(In.WALL_TEMPERATURE)] = Signal.mean(v, run.wall);
        in[layout.at(In.EXCHANGE_FACTOR)] = v.get(tunnel.exchange());
        in[layout.at(In.DENSITY_FACTOR)] = v.get(tunnel.density());
        in[layout.at(In.VISCOSITY_FACTOR)] = v.get(tunnel.viscosity());
        in[layout.at(In.CONDUCTIVITY_FACTOR)] = v.get(tunnel.conductivity());
        in[layout.at(In.HEAT_CAPACITY_FACTOR)] = v.get(tunnel.heatCapacity());
    }

    /** The declared conductances, or those of the loss runs. */
    static void conductances(double[] four, RunLayout layout, double[] in) {
        in[layout.at(In.BACK_CONDUCTANCE)] = four[0];
        in[layout.at(In.EDGE_CONDUCTANCE)] = four[1];
        in[layout.at(In.NOSE_CONDUCTANCE)] = four[2];
        in[layout.at(In.TAIL_CONDUCTANCE)] = four[3];
    }

    /** Junction readings corrected by the zero run: offsets are {@code [0..m)} predictions' misses, {@code [m..2m)} zero readings. */
    static void readings(Reads v, RunIndex run, RunLayout layout, double[] zero, double[] in) {
        int m = layout.junctions();
        for (int t = 0; t < m; t++) {
            if (run.junctions.get(t).isEmpty()) {
                in[layout.reading(t)] = in[layout.at(In.AIR_TEMPERATURE)]; // weight 0; any finite number
                continue;
            }
            Signal signal = run.junctions.get(t).get();
            boolean zeroed = zero.length == 2 * m && Double.isFinite(zero[t]);
            in[layout.reading(t)] = zeroed ? signal.againstZero(v, zero[t], zero[m + t]) : signal.value(v);
        }
    }

    /** What the insulation still takes up, from the time since the heater was switched on. */
    static void soak(RunIndex run, RunLayout layout, double[] in) {
        double flux = 0.0;
        for (int j = 0; j < layout.strips(); j++) {
            flux += in[layout.power(j)] - in[layout.lead(j)];
        }
        double sheet = 0.0;
        int used = 0;
        for (int t = 0; t < layout.junctions(); t++) {
            if (run.used[t]) {
                sheet += in[layout.reading(t)];
                used++;
            }
        }
        double area = (in[layout.at(In.HEATED_END)] - in[layout.at(In.HEATED_START)]) * in[layout.at(In.WIDTH)];
        double perK = flux / area / (sheet / used - in[layout.at(In.AIR_TEMPERATURE)]);
        double tau = in[layout.at(In.SHEET_HEAT_CAPACITY)] * in[layout.at(In.SHEET_THICKNESS)] / perK;
        in[layout.at(In.SOAK)] = LossTerm.Storage.soakShare(
                in[layout.at(In.BACK_CONDUCTANCE)],
                in[layout.at(In.FOAM_HEAT_CAPACITY)] * in[layout.at(In.FOAM_THICKNESS)],
                tau,
                run.means.heatedFromS(),
                run.means.heatedToS());
    }

    /** Declared conductances in parameter order. */
    static double[] prior(Reads v, RunIndex run) {
        int[] at = run.panel.prior();
        double[] prior = new double[at.length];
        for (int a = 0; a < at.length; a++) {
            prior[a] = v.get(at[a]);
        }
        return prior;
    }
}
