package plateledger.demo.app;

import java.util.List;
import java.util.Locale;
import plateledger.demo.app.RunPlan.Flow;
import plateledger.demo.app.RunPlan.Kind;
import plateledger.demo.sensor.LoggerClock;

/** The text of {@code campaign.toml}. */
final class CampaignText {
    private CampaignText() {}

    static String campaign(List<RunPlan> runs) {
        KeyedText text = new KeyedText();
        text.comment("Demo campaign, simulated: a small maker of outdoor cabinets has its door panel tested.")
                .comment(
                        "First day: a smooth baseline plate, to show that the rig meets theory. Second day: the panel.")
                .comment("What was really true stands in truth.json, which only tests read.")
                .quoted("title", "Cabinet door panel in the low-speed tunnel")
                .quoted("zone", Schedule.ZONE.getId());
        text.table("texts")
                .quoted("laboratory", "Thermal test house, wind tunnel hall")
                .quoted("customer", "Maker of outdoor cabinets (invented)")
                .quoted("object", "Cabinet door panel with shallow ribs, and smooth baseline plate")
                .quoted("report_number", "2026-017")
                .quoted("author", "Test engineer")
                .quoted("reviewer", "Head of test house")
                .quoted("purpose", "Heat transfer of the door panel from 2 to 20 m/s")
                .quoted("issued", "2026-03-20")
                .quoted("tested", "2026-03-10 and 2026-03-12");
        text.table("definitions")
                .quoted("properties", "film")
                .quoted("length", "leading-edge")
                .quoted("average", "flux-over-difference")
                .quoted("prandtl_exponent", "1/3");
        text.table("steady")
                .quoted("storage_share", "1 %")
                .quoted("storage_share_loss", "0.5 %")
                .quoted("minimum", "10 min");
        loggers(text);
        for (RunPlan run : runs) {
            run(text, run);
        }
        fit(text, "product", "product", Flow.PRODUCT);
        fit(text, "baseline-laminar", "baseline", Flow.LAMINAR);
        fit(text, "baseline-turbulent", "baseline", Flow.TRIPPED);
        return text.text();
    }

    private static void loggers(KeyedText text) {
        text.table("logger.plate");
        clock(text, LoggerClock.PLATE);
        text.table("logger.plate.format")
                .quoted("delimiter", ";")
                .quoted("decimal_mark", ",")
                .bare("header_line", "7")
                .bare("units_row", "true")
                .quoted("time", "pattern")
                .quoted("time_pattern", "dd.MM.yyyy HH:mm:ss");
        text.table("logger.power")
                .comment("Stamps carry their zone. Nobody compared this clock; its text format is left to detection.");
        clock(text, LoggerClock.POWER);
        text.table("logger.tunnel");
        clock(text, LoggerClock.TUNNEL);
        text.table("logger.tunnel.format")
                .quoted("delimiter", "\\t")
                .quoted("decimal_mark", ".")
                .bare("header_line", "4")
                .bare("units_row", "false")
                .quoted("time", "elapsed-s")
                .quoted("start_key", "Start");
    }

    private static void clock(KeyedText text, LoggerClock clock) {
        clock.offset().ifPresent(offset -> text.quantity("clock_offset", offset));
        clock.rate().ifPresent(rate -> text.quantity("clock_rate", rate));
    }

    private static void run(KeyedText text, RunPlan run) {
        text.entry("run")
                .quoted("id", run.id())
                .quoted("type", run.kind().word())
                .quoted("day", run.day())
                .quoted("plate", run.panel())
                .quoted("regime", run.flow().word());
        if (run.kind() == Kind.HEATED || run.kind() == Kind.ZERO) {
            text.setting("speed", run.speedSetMPerS(), 1, "m/s");
        }
        if (run.kind() == Kind.HEATED) {
            text.setting("power", 8.0 * run.stripSetW(), 1, "W").quoted("set", run.set());
        }
        if (run.flow() == Flow.TRIPPED && (run.kind() == Kind.HEATED || run.kind() == Kind.ZERO)) {
            text.bare("trip", "{ x = \"50 mm\", wire = \"1.7 mm\" }");
        }
        StringBuilder logs = new StringBuilder("{ ");
        for (LogText.Style style : LogText.Style.values()) {
            logs.append(style.id()).append(" = \"").append(style.file(run.id())).append("\", ");
        }
        logs.setLength(logs.length() - 2);
        text.bare("logs", logs.append(" }").toString());
        if (run.kind() == Kind.LOSS) {
            text.quoted(
                    "note",
                    String.format(
                            Locale.ROOT, "cover on, no flow, held %.0f K above the room by the supplies", run.riseK()));
        }
    }

    private static void fit(KeyedText text, String id, String plate, Flow flow) {
        text.entry("fit").quoted("id", id).quoted("plate", plate).quoted("regime", flow.word());
    }
}
