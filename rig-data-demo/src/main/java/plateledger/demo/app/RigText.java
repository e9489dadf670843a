package plateledger.demo.app;

import java.util.List;
import java.util.Locale;
import plateledger.demo.sensor.InstrumentDeclaration;
import plateledger.demo.sensor.PanelDeclaration;
import plateledger.demo.sensor.RigDeclaration;

/** The texts of {@code rig.toml} and {@code instruments.toml}, from the declarations that the true rig is drawn from. */
final class RigText {
    private RigText() {}

    static String rig() {
        RigDeclaration rig = RigDeclaration.standard();
        KeyedText text = new KeyedText();
        text.comment("The rig of the demo campaign: simulated, all names invented.")
                .comment(
                        "A heated plate, face up, flush in the false floor of a low-speed tunnel, boundary layer bled off")
                .comment("ahead of its leading edge, still plenum behind the foam.")
                .quoted("title", "Low-speed tunnel, heated-plate insert");
        surroundings(text, rig);
        limits(text);
        PanelDeclaration panel = PanelDeclaration.standard();
        text.table("plate.baseline")
                .quoted("description", "smooth baseline plate, matt black, to qualify the rig")
                .quoted("orientation", "face-up");
        plate(text, panel);
        text.table("plate.product")
                .comment("Built like the baseline plate, its sheet with shallow ribs along the flow.")
                .quoted("like", "baseline")
                .quoted("description", "cabinet door panel with shallow ribs")
                .quoted("smooth_shape", "uniform");
        return text.text();
    }

    private static void surroundings(KeyedText text, RigDeclaration rig) {
        text.table("surroundings")
                .list("walls", List.of("TW1", "TW2"))
                .list("plenum", List.of("TP1"))
                .list("frame", List.of("TF1", "TF2"))
                .list("nose", List.of("TN1"))
                .list("tail", List.of("TT1"))
                .list("cover_inner", List.of("TC1", "TC2"))
                .list("cover_outer", List.of("TC3", "TC4"))
                .quoted("air", "TA1")
                .quoted("pressure", "PB")
                .quoted("humidity", "RH")
                .quantity("exchange_factor", rig.exchangeFactor())
                .quantity("blockage", rig.blockage());
        text.table("surroundings.air_probe")
                .quantity("recovery_factor", rig.probeRecovery())
                .quantity("radiation_fraction", rig.probeRadiation());
        text.entry("surroundings.speed_meter")
                .quoted("channel", "PD")
                .quoted("principle", "pitot")
                .quantity("factor", rig.pitotFactor())
                .setting("from", rig.changeOverMPerS(), 0, "m/s")
                .quoted("to", "40 m/s");
        text.entry("surroundings.speed_meter")
                .quoted("channel", "VA")
                .quoted("principle", "thermal")
                .quantity("factor", rig.anemometerFactor())
                .quoted("from", "0 m/s")
                .setting("to", rig.changeOverMPerS(), 0, "m/s");
    }

    private static void limits(KeyedText text) {
        text.table("limits")
                .quoted("surface", "75 °C")
                .bare("touchable", "false")
                .quoted("surface_class", "coated metal")
                .quoted("lowest_material", "acrylic adhesive")
                .quoted("lowest_material_limit", "120 °C")
                .quoted("flow_present", "1 m/s");
        protection(text, "flow_interlock", "heater supply drops out below 1.2 m/s");
        protection(text, "cut_out", "80 °C, own sensor and relay, hand reset");
        protection(text, "residual_current_device", "30 mA");
        protection(text, "earth", "sheet and frame bonded");
        protection(text, "fan_guard", "mesh, both sides");
    }

    private static void protection(KeyedText text, String kind, String setting) {
        text.table("protection." + kind)
                .bare("declared", "true")
                .quoted("setting", setting)
                .bare("tested", "2026-02-20");
    }

    private static void plate(KeyedText text, PanelDeclaration panel) {
        text.quantity("length", panel.length())
                .quantity("width", panel.width())
                .quantity("heated_start", panel.heatedStart())
                .quantity("heated_end", panel.heatedEnd())
                .quantity("emissivity", panel.emissivity())
                .quantity("back_conductance", panel.back())
                .quantity("edge_conductance", panel.edge())
                .quantity("nose_conductance", panel.nose())
                .quantity("tail_conductance", panel.tail())
                .quantity("cover_conductance", panel.cover())
                .quoted("smooth_shape", "boundary-layer");
        text.table("plate.baseline.sheet")
                .quoted("material", "stainless steel")
                .quantity("thickness", panel.sheetThickness())
                .quantity("conductivity", panel.sheetConductivity())
                .quantity("heat_capacity", panel.sheetCapacity());
        text.table("plate.baseline.coat")
                .quoted("material", "matt black paint")
                .quantity("thickness", panel.coatThickness())
                .quantity("conductivity", panel.coatConductivity());
        text.table("plate.baseline.foam")
                .quoted("material", "polyisocyanurate")
                .quantity("thickness", panel.foamThickness())
                .quantity("heat_capacity", panel.foamCapacity());
        for (PanelDeclaration.Strip strip : panel.strips()) {
            text.entry("plate.baseline.heater")
                    .quoted("id", "H" + strip.number())
                    .quoted("from", strip.fromMm() + " mm")
                    .quoted("to", strip.toMm() + " mm")
                    .quantity("lead_resistance", panel.leadResistance())
                    .quoted("voltage", "V" + strip.number())
                    .quoted("current", "I" + strip.number())
                    .quoted("rated", "40 W");
        }
        for (PanelDeclaration.Junction junction : panel.junctions()) {
            text.entry("plate.baseline.thermocouple")
                    .quoted("channel", junction.channel())
                    .quantity("x", junction.x())
                    .quoted("z", junction.zMm() + " mm")
                    .quantity("depth", panel.depth())
                    .quantity("stem_fraction", panel.stemFraction());
        }
    }

    static String instruments() {
        KeyedText text = new KeyedText();
        text.comment(
                        "Instruments of the demo campaign and what their certificates say; simulated, all numbers invented.")
                .comment(
                        "True value X and reading R: X = R - b - b_i - (g + g_i)(R - R0) - d_i, with b offset, g gain,")
                .comment("b_i channel_offset, g_i channel_gain, R0 gain_origin, d_i daily_drift since the day's zero.");
        for (InstrumentDeclaration i : InstrumentDeclaration.standard()) {
            text.table("instrument." + i.id()).quoted("kind", i.kind()).quoted("unit", i.unit());
            if (!i.bath().isEmpty()) {
                text.quoted("bath", i.bath());
            }
            text.list("channels", i.channels())
                    .quantity("offset", i.offset())
                    .quantity("gain", i.gain())
                    .quantity("channel_offset", i.channelOffset())
                    .quantity("channel_gain", i.channelGain())
                    .quantity("daily_drift", i.dailyDrift())
                    .quoted("gain_origin", i.gainOrigin())
                    .quoted("resolution", i.resolution())
                    .list("range", List.of(i.rangeLow(), i.rangeHigh()))
                    .quoted("certificate", i.certificate())
                    .bare("calibrated", String.format(Locale.ROOT, "2026-01-%02d", 12 + i.id().length() % 8))
                    .bare("due", String.format(Locale.ROOT, "2027-01-%02d", 12 + i.id().length() % 8));
        }
        return text.text();
    }
}
