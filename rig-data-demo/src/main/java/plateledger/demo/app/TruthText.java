package plateledger.demo.app;

import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import plateledger.demo.app.RunPlan.Flow;
import plateledger.demo.app.RunPlan.Kind;
import plateledger.demo.physics.HeatBooks;
import plateledger.demo.physics.Panel;
import plateledger.demo.sensor.TrueRig;

/** The text of {@code truth.json}: what the loggers tried to measure. */
final class TruthText {
    private final StringBuilder out = new StringBuilder();
    private String indent = "";
    private boolean first = true;

    private TruthText() {}

    static String truth(SimulatedCampaign.Drawn drawn, Map<String, RunTruth> truths) {
        TruthText text = new TruthText();
        text.open("", '{');
        text.word("about", "True values of the simulated campaign, SI. Only tests read this file.");
        text.word(
                "definitions",
                "properties at (T_s + T_inf)/2 (runs: area mean T_s), length from the leading edge to the end of the heated"
                        + " part, h = flux over difference to T_aw; stations at the junctions' true places");
        text.open("product", '{');
        text.number("C", drawn.law().c());
        text.number("m", drawn.law().m());
        text.number("prandtl_exponent", 1.0 / 3.0);
        text.close('}');
        text.fit("baseline_laminar_fit", drawn, truths, Flow.LAMINAR);
        text.fit("baseline_turbulent_fit", drawn, truths, Flow.TRIPPED);
        text.rig(drawn.rig());
        text.open("runs", '{');
        for (RunPlan plan : drawn.plans()) {
            RunTruth truth = truths.get(plan.id());
            if (truth != null) {
                text.run(plan, truth);
            }
        }
        text.close('}');
        text.close('}');
        return text.out.append('\n').toString();
    }

    /** Straight line through the true points of one regime at the runs' own Re: ln Nu − ⅓ ln Pr over ln Re. */
    private void fit(String key, SimulatedCampaign.Drawn drawn, Map<String, RunTruth> truths, Flow flow) {
        double n = 0.0;
        double sx = 0.0;
        double sy = 0.0;
        double sxx = 0.0;
        double sxy = 0.0;
        for (RunPlan plan : drawn.plans()) {
            RunTruth truth = truths.get(plan.id());
            if (truth != null && plan.kind() == Kind.HEATED && plan.flow() == flow) {
                double x = Math.log(truth.reynolds());
                double y = Math.log(truth.nusselt()) - Math.log(truth.prandtl()) / 3.0;
                n += 1.0;
                sx += x;
                sy += y;
                sxx += x * x;
                sxy += x * y;
            }
        }
        if (n > 0.0) {
            double slope = (n * sxy - sx * sy) / (n * sxx - sx * sx);
            open(key, '{');
            number("C", Math.exp((sy - slope * sx) / n));
            number("m", slope);
            close('}');
        }
    }

    private void rig(TrueRig rig) {
        open("rig", '{');
        number("exchange_factor", rig.exchangeFactor());
        number("blockage", rig.blockage());
        number("pitot_factor", rig.pitotFactor());
        number("anemometer_factor", rig.anemometerFactor());
        number("air_probe_recovery_factor", rig.probeRecovery());
        number("air_probe_radiation_fraction", rig.probeRadiation());
        number("density_factor", rig.air().density());
        number("viscosity_factor", rig.air().viscosity());
        number("conductivity_factor", rig.air().conductivity());
        number("heat_capacity_factor", rig.air().heatCapacity());
        open("plates", '{');
        new TreeMap<>(rig.panels()).forEach((id, mounted) -> plate(id, mounted.panel()));
        close('}');
        close('}');
    }

    private void plate(String id, Panel panel) {
        open(id, '{');
        number("heated_start_m", panel.startM());
        number("heated_end_m", panel.endM());
        number("width_m", panel.widthM());
        number("emissivity", panel.emissivity());
        number("back_conductance_W_per_m2K", panel.backWPerM2K());
        number("edge_conductance_W_per_mK", panel.edgeWPerMK());
        number("nose_conductance_W_per_K", panel.noseWPerK());
        number("tail_conductance_W_per_K", panel.tailWPerK());
        number("cover_conductance_W_per_K", panel.coverWPerK());
        number("sheet_thickness_m", panel.thicknessM());
        number("sheet_conductivity_W_per_mK", panel.conductivityWPerMK());
        number("sheet_heat_capacity_J_per_m3K", panel.capacityJPerM3K());
        number("coat_resistance_m2K_per_W", panel.coatM2KPerW());
        number("foam_heat_capacity_J_per_m2K", panel.foamJPerM2K());
        close('}');
    }

    private void run(RunPlan plan, RunTruth truth) {
        open(plan.id(), '{');
        word("type", plan.kind().word());
        word("plate", plan.panel());
        word("regime", plan.flow().word());
        number("start_s", plan.startS());
        number("window_start_s", truth.fromS());
        number("window_end_s", truth.toS());
        number("U_m_per_s", truth.speedMPerS());
        number("T_inf_K", truth.streamK());
        number("T_aw_K", truth.adiabaticK());
        number("T_surface_mean_K", truth.meanFaceK());
        if (plan.kind() == Kind.HEATED) {
            number("h_W_per_m2K", truth.coefficient());
            number("Re_L", truth.reynolds());
            number("Nu_L", truth.nusselt());
            number("Pr", truth.prandtl());
        }
        HeatBooks books = truth.books();
        open("ledger_W", '{');
        number("electrical", books.electrical());
        number("convection", books.convection());
        number("radiation", books.radiation());
        number("cover", books.cover());
        number("back", books.back());
        number("edge", books.edge());
        number("conduction_nose", books.nose());
        number("conduction_tail", books.tail());
        number("storage", books.storage());
        number("lead", truth.leadW());
        close('}');
        if (plan.kind() == Kind.HEATED) {
            open("stations", '{');
            for (StationTruth s : truth.stations()) {
                open(s.channel(), '{');
                number("x_m", s.xM());
                number("T_surface_K", s.faceK());
                number("q_conv_W_per_m2", s.convectionWPerM2());
                number("h_W_per_m2K", s.coefficient());
                number("Re_x", s.reynolds());
                number("Nu_x", s.nusselt());
                number("Pr", s.prandtl());
                close('}');
            }
            close('}');
        }
        close('}');
    }

    private void open(String key, char bracket) {
        key(key);
        out.append(bracket);
        indent += "  ";
        first = true;
    }

    private void close(char bracket) {
        indent = indent.substring(2);
        out.append('\n').append(indent).append(bracket);
        first = false;
    }

    private void word(String key, String value) {
        key(key);
        out.append('"').append(value).append('"');
    }

    private void number(String key, double value) {
        key(key);
        // Ten digits: far below what any instrument here resolves, and the same on every machine.
        out.append(String.format(Locale.ROOT, "%.9e", value));
    }

    private void key(String key) {
        if (!first) {
            out.append(',');
        }
        if (out.length() > 0) {
            out.append('\n').append(indent);
        }
        if (!key.isEmpty()) {
            out.append('"').append(key).append("\": ");
        }
        first = false;
    }
}
