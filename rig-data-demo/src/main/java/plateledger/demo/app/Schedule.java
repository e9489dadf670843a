package plateledger.demo.app;

import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import plateledger.demo.app.RunPlan.Flow;
import plateledger.demo.app.RunPlan.Kind;
import plateledger.demo.sensor.Draws;

/** The runs of the two test days, in the order driven. */
public final class Schedule {
    /** Zone of the test house. */
    public static final ZoneId ZONE = ZoneId.of("Europe/Vienna");
    /** Day of the baseline plate. */
    public static final String BASELINE_DAY = "2026-03-10";
    /** Day of the product panel. */
    public static final String PRODUCT_DAY = "2026-03-12";

    private static final double[] LAMINAR = {2.0, 2.6, 3.4, 4.4, 5.8, 7.6, 10.0, 4.4};
    private static final double[] TRIPPED = {8.0, 9.4, 11.0, 12.8, 14.9, 17.3, 20.0, 12.8};
    private static final double[] PRODUCT = {
        2.0, 2.4, 2.9, 3.5, 4.3, 5.3, 6.4, 7.7, 9.3, 11.2, 13.6, 16.5, 20.0, 2.9, 7.7, 16.5
    };
    private static final double[] LOSS_RISE_K = {12.0, 24.0, 36.0};
    private static final double HIGHEST_SPEED = 20.0;
    private static final double AREA_M2 = 0.12;
    private static final double PAUSE_S = 720.0;

    private final Draws draws;
    private final List<RunPlan> runs = new ArrayList<>();
    private double clock;

    private Schedule(Draws draws) {
        this.draws = draws;
    }

    /** All runs of both days. */
    public static List<RunPlan> full(Draws draws) {
        Schedule schedule = new Schedule(draws);
        schedule.day(BASELINE_DAY, "baseline", "B");
        schedule.day(PRODUCT_DAY, "product", "P");
        return List.copyOf(schedule.runs);
    }

    /** The runs of the product's day. */
    public static List<RunPlan> productOnly(Draws draws) {
        Schedule schedule = new Schedule(draws);
        schedule.day(PRODUCT_DAY, "product", "P");
        return List.copyOf(schedule.runs);
    }

    private void day(String day, String panel, String letter) {
        boolean baseline = panel.equals("baseline");
        Flow zeroFlow = baseline ? Flow.TRIPPED : Flow.PRODUCT;
        clock = LocalDateTime.parse(day + "T00:05:00").atZone(ZONE).toEpochSecond();
        add(letter + "Z1", Kind.FAN_OFF_BEFORE, day, panel, zeroFlow, 0.0, 0.0, 0.0, "", 300.0);
        add(letter + "Z2", Kind.ZERO, day, panel, zeroFlow, HIGHEST_SPEED, 0.0, 0.0, "", 1500.0);
        // The loss runs need no hand: the supplies hold the panel under its cover through the night.
        for (int i = 0; i < LOSS_RISE_K.length; i++) {
            add(letter + "L" + (i + 1), Kind.LOSS, day, panel, zeroFlow, 0.0, 0.0, LOSS_RISE_K[i], "", 6000.0);
        }
        if (baseline) {
            heated(day, panel, letter, Flow.LAMINAR, LAMINAR, 1);
            heated(day, panel, letter, Flow.TRIPPED, TRIPPED, 1 + LAMINAR.length);
        } else {
            heated(day, panel, letter, Flow.PRODUCT, PRODUCT, 1);
        }
        add(letter + "Z3", Kind.FAN_OFF_AFTER, day, panel, zeroFlow, 0.0, 0.0, 0.0, "", 300.0);
    }

    private void heated(String day, String panel, String letter, Flow flow, double[] speeds, int first) {
        for (int i = 0; i < speeds.length; i++) {
            double speed = speeds[i];
            double rise = flow == Flow.PRODUCT ? 20.0 : 18.0;
            double perStrip = (expected(flow, speed) + 6.3) * AREA_M2 * rise / 8.0;
            double minutes = speed < 5.0 ? 60.0 : flow == Flow.TRIPPED ? 40.0 : 45.0;
            String set = String.format(
                    Locale.ROOT,
                    "%s%d",
                    flow == Flow.LAMINAR ? "L" : flow == Flow.TRIPPED ? "T" : "P",
                    Math.round(10.0 * speed));
            add(
                    String.format(Locale.ROOT, "%s%02d", letter, first + i),
                    Kind.HEATED,
                    day,
                    panel,
                    flow,
                    speed,
                    Math.rint(10.0 * perStrip) / 10.0,
                    rise,
                    set,
                    60.0 * minutes);
        }
    }

    /** What an engineer would expect of h, to set the power: W/(m² K). */
    private static double expected(Flow flow, double speed) {
        return switch (flow) {
            case LAMINAR -> 6.2 * Math.sqrt(speed);
            case TRIPPED -> 73.0 * Math.pow(speed / HIGHEST_SPEED, 0.8);
            case PRODUCT -> 60.0 * Math.pow(speed / HIGHEST_SPEED, 0.7);
        };
    }

    private void add(
            String id,
            Kind kind,
            String day,
            String panel,
            Flow flow,
            double speed,
            double stripW,
            double rise,
            String set,
            double duration) {
        // The fan is set by hand and comes within half a percent.
        double achieved = speed * (1.0 + 0.004 * draws.even(id + "/speed set"));
        runs.add(new RunPlan(id, kind, day, panel, flow, speed, achieved, stripW, rise, set, clock, duration));
        clock += duration + (kind == Kind.HEATED || kind == Kind.LOSS ? PAUSE_S : 180.0);
    }

    /** Local time of an instant, for text. */
    static LocalDateTime local(long epochS) {
        ZoneOffset offset = ZONE.getRules().getOffset(java.time.Instant.ofEpochSecond(epochS));
        return LocalDateTime.ofEpochSecond(epochS, 0, offset);
    }
}
