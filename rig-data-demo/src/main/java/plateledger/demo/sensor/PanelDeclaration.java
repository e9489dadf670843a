package plateledger.demo.sensor;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * What is declared about a panel. Keys and places as in the campaign's rig file.
 *
 * @param length leading to trailing edge
 * @param width span
 * @param heatedStart start of the heated part
 * @param heatedEnd its end
 * @param emissivity of the coat
 * @param back conductance to the plenum
 * @param edge conductance of a side edge
 * @param nose conductance of the upstream end
 * @param tail conductance of the downstream end
 * @param cover conductance of the loss-run cover
 * @param sheetThickness sheet
 * @param sheetConductivity sheet
 * @param sheetCapacity sheet
 * @param coatThickness coat
 * @param coatConductivity coat
 * @param foamThickness foam
 * @param foamCapacity foam
 * @param leadResistance of each strip between the sense points
 * @param depth of each junction
 * @param stemFraction of each junction
 * @param strips strips in flow order
 * @param junctions junctions
 */
public record PanelDeclaration(
        Declared length,
        Declared width,
        Declared heatedStart,
        Declared heatedEnd,
        Declared emissivity,
        Declared back,
        Declared edge,
        Declared nose,
        Declared tail,
        Declared cover,
        Declared sheetThickness,
        Declared sheetConductivity,
        Declared sheetCapacity,
        Declared coatThickness,
        Declared coatConductivity,
        Declared foamThickness,
        Declared foamCapacity,
        Declared leadResistance,
        Declared depth,
        Declared stemFraction,
        List<Strip> strips,
        List<Junction> junctions) {

    /**
     * One heater strip.
     *
     * @param number from 1
     * @param fromMm upstream edge, mm
     * @param toMm downstream edge, mm
     */
    public record Strip(int number, int fromMm, int toMm) {}

    /**
     * One junction.
     *
     * @param channel its channel
     * @param x place along the flow
     * @param zMm place across the flow, mm
     */
    public record Junction(String channel, Declared x, int zMm) {}

    /** Copies the lists. */
    public PanelDeclaration {
        strips = List.copyOf(strips);
        junctions = List.copyOf(junctions);
    }

    /** The panel of this rig: both panels are built alike. */
    public static PanelDeclaration standard() {
        double mm = 1e-3;
        List<Strip> strips = new ArrayList<>();
        for (int s = 0; s < 8; s++) {
            strips.add(new Strip(s + 1, 100 + 50 * s, 150 + 50 * s));
        }
        List<Junction> junctions = new ArrayList<>();
        for (int t = 0; t < 16; t++) {
            junctions.add(junction(t + 1, String.format(Locale.ROOT, "%.1f", 112.5 + 25.0 * t), 0));
        }
        int[] across = {100, -120, 130, -140};
        for (int t = 0; t < 4; t++) {
            junctions.add(junction(17 + t, Integer.toString(175 + 100 * t), across[t]));
        }
        return new PanelDeclaration(
                Declared.limits("500", "mm", mm, "0.5"),
                Declared.limits("300", "mm", mm, "0.5"),
                Declared.limits("100", "mm", mm, "0.2"),
                Declared.limits("500", "mm", mm, "0.3"),
                Declared.standard("0.95", "", 1.0, "0.015"),
                Declared.relative("0.46", "W/m2K", 1.0, "15"),
                Declared.relative("0.05", "W/mK", 1.0, "30"),
                Declared.relative("0.05", "W/K", 1.0, "20"),
                Declared.relative("0.05", "W/K", 1.0, "20"),
                Declared.relative("0.075", "W/K", 1.0, "4"),
                Declared.limits("0.5", "mm", mm, "0.015"),
                Declared.relative("14.9", "W/mK", 1.0, "3"),
                Declared.relative("3.77e6", "J/m3K", 1.0, "3"),
                Declared.limits("50", "um", 1e-6, "15"),
                Declared.relative("0.2", "W/mK", 1.0, "10"),
                Declared.limits("50", "mm", mm, "1"),
                Declared.relative("6.6e4", "J/m3K", 1.0, "15"),
                Declared.limits("0.010", "ohm", 1.0, "0.004"),
                Declared.limits("0.5", "mm", mm, "0.1"),
                Declared.limits("0.002", "", 1.0, "0.001"),
                strips,
                junctions);
    }

    private static Junction junction(int number, String xMm, int zMm) {
        String channel = String.format(Locale.ROOT, "T%02d", number);
        return new Junction(channel, Declared.limits(xMm, "mm", 1e-3, "0.3"), zMm);
    }
}
