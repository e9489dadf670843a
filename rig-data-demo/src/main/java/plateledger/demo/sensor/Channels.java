package plateledger.demo.sensor;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Names of the rig's channels, by logger. */
public final class Channels {
    /** Junctions on the sheet. */
    public static final List<String> JUNCTIONS = numbered("T%02d", 20);
    /** Plate logger without the cover. */
    public static final List<String> PLATE =
            joined(JUNCTIONS, List.of("TN1", "TT1", "TW1", "TW2", "TP1", "TF1", "TF2"));
    /** The cover's thermocouples: two on the plate side, two on the room side. */
    public static final List<String> COVER = List.of("TC1", "TC2", "TC3", "TC4");
    /** Plate logger in a loss run. */
    public static final List<String> PLATE_AND_COVER = joined(PLATE, COVER);
    /** Voltages of the strips. */
    public static final List<String> VOLTAGES = numbered("V%d", 8);
    /** Currents of the strips. */
    public static final List<String> CURRENTS = numbered("I%d", 8);
    /** Pitot pressure difference. */
    public static final String PITOT = "PD";
    /** Thermal anemometer. */
    public static final String ANEMOMETER = "VA";
    /** Air probe. */
    public static final String AIR = "TA1";
    /** Barometer. */
    public static final String PRESSURE = "PB";
    /** Hygrometer. */
    public static final String HUMIDITY = "RH";
    /** Power logger. */
    public static final List<String> POWER = joined(VOLTAGES, CURRENTS);
    /** Tunnel logger. */
    public static final List<String> TUNNEL = List.of(PITOT, ANEMOMETER, AIR, PRESSURE, HUMIDITY);

    private Channels() {}

    private static List<String> numbered(String pattern, int count) {
        List<String> names = new ArrayList<>();
        for (int i = 1; i <= count; i++) {
            names.add(String.format(Locale.ROOT, pattern, i));
        }
        return List.copyOf(names);
    }

    private static List<String> joined(List<String> first, List<String> second) {
        List<String> all = new ArrayList<>(first);
        all.addAll(second);
        return List.copyOf(all);
    }
}
