package plateledger.demo.sensor;

import java.util.List;

/**
 * What a calibration certificate of this rig says: true value X and reading R are related by
 * X = R − b − b_i − (g + g_i)(R − R₀) − d_i.
 *
 * @param id name
 * @param kind what it measures, as the instruments file says it
 * @param unit unit of its readings
 * @param bath calibration bath; empty if none
 * @param channels its channels
 * @param gainOrigin R₀ as written
 * @param gainOriginSi R₀, SI
 * @param offset b
 * @param gain g
 * @param channelOffset b_i
 * @param channelGain g_i
 * @param dailyDrift d_i
 * @param resolution one step, as written
 * @param resolutionSi one step, SI
 * @param rangeLow lowest reading, as written
 * @param rangeHigh highest reading, as written
 * @param certificate number
 */
public record InstrumentDeclaration(
        String id,
        String kind,
        String unit,
        String bath,
        List<String> channels,
        String gainOrigin,
        double gainOriginSi,
        Declared offset,
        Declared gain,
        Declared channelOffset,
        Declared channelGain,
        Declared dailyDrift,
        String resolution,
        double resolutionSi,
        String rangeLow,
        String rangeHigh,
        String certificate) {

    /** Copies the list. */
    public InstrumentDeclaration {
        channels = List.copyOf(channels);
    }

    /** The instruments of this rig. */
    public static List<InstrumentDeclaration> standard() {
        return List.of(
                new InstrumentDeclaration(
                        "thermocouples",
                        "temperature",
                        "°C",
                        "A",
                        Channels.PLATE_AND_COVER,
                        "22 °C",
                        295.15,
                        k("0.05"),
                        pure("0.0005"),
                        k("0.03"),
                        pure("0.0005"),
                        k("0.02"),
                        "0.01 K",
                        0.01,
                        "-10 °C",
                        "150 °C",
                        "TC-26-011"),
                new InstrumentDeclaration(
                        "air-probe",
                        "temperature",
                        "°C",
                        "A",
                        List.of(Channels.AIR),
                        "22 °C",
                        295.15,
                        k("0.05"),
                        pure("0.0003"),
                        k("0.02"),
                        pure("0.0002"),
                        k("0.01"),
                        "0.001 K",
                        0.001,
                        "-10 °C",
                        "80 °C",
                        "RT-26-004"),
                new InstrumentDeclaration(
                        "voltmeter",
                        "voltage",
                        "V",
                        "",
                        Channels.VOLTAGES,
                        "0 V",
                        0.0,
                        mv("0.5"),
                        pure("0.0004"),
                        mv("0.5"),
                        pure("0.0003"),
                        mv("0.2"),
                        "1 mV",
                        0.001,
                        "-1 V",
                        "60 V",
                        "DM-26-020"),
                new InstrumentDeclaration(
                        "ammeter",
                        "current",
                        "A",
                        "",
                        Channels.CURRENTS,
                        "0 A",
                        0.0,
                        ma("0.2"),
                        pure("0.0006"),
                        ma("0.2"),
                        pure("0.0004"),
                        ma("0.1"),
                        "0.1 mA",
                        0.0001,
                        "-0.1 A",
                        "5 A",
                        "DM-26-021"),
                new InstrumentDeclaration(
                        "pitot-transducer",
                        "differential-pressure",
                        "Pa",
                        "",
                        List.of(Channels.PITOT),
                        "0 Pa",
                        0.0,
                        Declared.standard("0", "Pa", 1.0, "0.3"),
                        pure("0.003"),
                        Declared.exact("0", "Pa", 1.0),
                        Declared.exact("0", "", 1.0),
                        Declared.standard("0", "Pa", 1.0, "0.05"),
                        "0.01 Pa",
                        0.01,
                        "-20 Pa",
                        "500 Pa",
                        "DP-25-107"),
                new InstrumentDeclaration(
                        "anemometer",
                        "speed",
                        "m/s",
                        "",
                        List.of(Channels.ANEMOMETER),
                        "0 m/s",
                        0.0,
                        Declared.standard("0", "m/s", 1.0, "0.01"),
                        pure("0.005"),
                        Declared.exact("0", "m/s", 1.0),
                        Declared.exact("0", "", 1.0),
                        Declared.standard("0", "m/s", 1.0, "0.005"),
                        "0.001 m/s",
                        0.001,
                        "-0.2 m/s",
                        "30 m/s",
                        "VA-25-031"),
                new InstrumentDeclaration(
                        "barometer",
                        "absolute-pressure",
                        "hPa",
                        "",
                        List.of(Channels.PRESSURE),
                        "1000 hPa",
                        100000.0,
                        Declared.standard("0", "Pa", 1.0, "20"),
                        Declared.exact("0", "", 1.0),
                        Declared.exact("0", "Pa", 1.0),
                        Declared.exact("0", "", 1.0),
                        Declared.standard("0", "Pa", 1.0, "5"),
                        "1 Pa",
                        1.0,
                        "600 hPa",
                        "1100 hPa",
                        "BA-25-002"),
                new InstrumentDeclaration(
                        "hygrometer",
                        "relative-humidity",
                        "%",
                        "",
                        List.of(Channels.HUMIDITY),
                        "0 %",
                        0.0,
                        Declared.standard("0", "", 1.0, "0.015"),
                        Declared.exact("0", "", 1.0),
                        Declared.exact("0", "", 1.0),
                        Declared.exact("0", "", 1.0),
                        Declared.standard("0", "", 1.0, "0.005"),
                        "0.1 %",
                        0.001,
                        "0 %",
                        "100 %",
                        "HY-25-014"));
    }

    private static Declared k(String u) {
        return Declared.standard("0", "K", 1.0, u);
    }

    private static Declared pure(String u) {
        return Declared.standard("0", "", 1.0, u);
    }

    private static Declared mv(String u) {
        return Declared.standard("0", "mV", 1e-3, u);
    }

    private static Declared ma(String u) {
        return Declared.standard("0", "mA", 1e-3, u);
    }
}
