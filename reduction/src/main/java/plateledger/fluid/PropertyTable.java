package plateledger.fluid;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.finding.RefusedException;
import plateledger.quantity.Temperature;

/**
 * The properties of a fluid at one state as a table for people: value, unit, standard uncertainty of the formulation,
 * source. The uncertainties are those of the formulation alone; temperature, pressure and humidity are taken as given.
 *
 * @param title one line naming fluid and state
 * @param rows the rows in order
 */
public record PropertyTable(String title, List<Row> rows) {
    private static final String LEMMON_2000 =
            "Lemmon et al., J. Phys. Chem. Ref. Data 29 (2000) 331, virial form; IAPWS G9-12";
    private static final String LEMMON_2004 =
            "Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21; IAPWS R12-08; Wilke 1950";
    private static final String MASON_SAXENA =
            "Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21; IAPWS R15-11; Mason and Saxena 1958";
    private static final String DERIVED = "from ρ, c_p, μ, k above";
    private static final String HUMID = "IAPWS SR1-86(1992); enhancement factor of CIPM-2007";

    /**
     * One property.
     *
     * @param name name in words
     * @param symbol symbol
     * @param value value, SI
     * @param standardUncertainty standard uncertainty of the formulation, same unit; NaN where none is stated
     * @param unit unit
     * @param source published source
     */
    public record Row(
            String name, String symbol, double value, double standardUncertainty, String unit, String source) {}

    /** Copies the rows. */
    public PropertyTable {
        rows = List.copyOf(rows);
    }

    /**
     * The table at one state.
     *
     * @param fluid name of the fluid; {@code air} is known
     * @param temperature temperature
     * @param pressurePa absolute pressure, Pa
     * @param relativeHumidity relative humidity over liquid water, 0 .. 1, at that temperature; 0 for dry air
     * @return the table
     * @throws RefusedException for an unknown fluid or a state outside the range, with one finding for each fault
     */
    public static PropertyTable of(String fluid, Temperature temperature, double pressurePa, double relativeHumidity)
            throws RefusedException {
        List<Finding> faults = new ArrayList<>();
        if (!fluid.equals("air")) {
            faults.add(fault("fluid", '"' + fluid + '"', "air", "Name a fluid that is known"));
        }
        double t = temperature.kelvin();
        if (!MoistAir.inRange(t, 101325.0, 0.0)) {
            faults.add(fault("temperature", format(temperature.celsius(), "°C"), "0.01 °C to 226.85 °C", RANGE));
        }
        if (!MoistAir.inRange(300.0, pressurePa, 0.0)) {
            faults.add(fault("pressure", format(pressurePa / 1e3, "kPa"), "50 kPa to 200 kPa, absolute", RANGE));
        }
        if (!(relativeHumidity >= 0.0 && relativeHumidity <= 1.0)) {
            faults.add(fault("humidity", format(relativeHumidity * 100.0, "%"), "0 % to 100 %", RANGE));
        }
        if (!faults.isEmpty()) {
            throw new RefusedException(faults);
        }
        double x = relativeHumidity == 0.0 ? 0.0 : Humidity.vapourFraction(t, pressurePa, relativeHumidity);
        if (!MoistAir.inRange(t, pressurePa, x)) {
            throw new RefusedException(fault(
                    "humidity",
                    String.format(
                            Locale.ROOT,
                            "%s at %s: mole fraction of water %.3g",
                            format(relativeHumidity * 100.0, "%"),
                            format(temperature.celsius(), "°C"),
                            x),
                    "a mole fraction of water up to 0.2",
                    "The humidity is meant at the temperature given; give that of the air before it was heated"));
        }
        String title = String.format(
                Locale.ROOT,
                "air at %.2f °C, %.3f kPa, relative humidity %.1f %%",
                temperature.celsius(),
                pressurePa / 1e3,
                relativeHumidity * 100.0);
        return new PropertyTable(title, airRows(t, pressurePa, x));
    }

    private static final String RANGE = "State a value within the range of the formulation";

    private static List<Row> airRows(double t, double p, double x) {
        FluidState air = MoistAir.state(t, p, x);
        FormulationUncertainty u = FormulationUncertainty.of(t, p, x);
        double nu = Math.hypot(u.viscosity(), u.density());
        double alpha = Math.hypot(u.conductivity(), Math.hypot(u.density(), u.heatCapacity()));
        double pr = Math.hypot(u.viscosity(), Math.hypot(u.heatCapacity(), u.conductivity()));
        List<Row> rows = new ArrayList<>();
        rows.add(row("density", "ρ", air.density(), u.density(), "kg/m³", LEMMON_2000));
        rows.add(row("heat capacity", "c_p", air.heatCapacity(), u.heatCapacity(), "J/(kg K)", LEMMON_2000));
        rows.add(row("viscosity", "μ", air.viscosity(), u.viscosity(), "Pa s", LEMMON_2004));
        rows.add(row("conductivity", "k", air.conductivity(), u.conductivity(), "W/(m K)", MASON_SAXENA));
        rows.add(row("kinematic viscosity", "ν", air.kinematicViscosity(), nu, "m²/s", DERIVED));
        rows.add(row("thermal diffusivity", "α", air.diffusivity(), alpha, "m²/s", DERIVED));
        rows.add(row("Prandtl number", "Pr", air.prandtl(), pr, "1", DERIVED));
        rows.add(new Row("mole fraction of water", "x_v", x, Double.NaN, "1", HUMID));
        if (x > 0.0) {
            double dewK = MoistAir.dewPointK(p, x);
            String name = dewK < Humidity.TRIPLE_POINT_K ? "frost point" : "dew point";
            double dewC = new Temperature(dewK).celsius();
            rows.add(new Row(name, "t_d", dewC, Double.NaN, "°C", HUMID));
        }
        return rows;
    }

    private static Row row(String name, String symbol, double value, double relative, String unit, String source) {
        return new Row(name, symbol, value, Math.abs(value) * relative, unit, source);
    }

    private static Finding fault(String subject, String found, String expected, String remedy) {
        return new Finding("FLUID-RANGE", Level.STOP, Place.NOWHERE, subject, found, expected, remedy, LEMMON_2000);
    }

    private static String format(double value, String unit) {
        return String.format(Locale.ROOT, "%.4g %s", value, unit);
    }

    /**
     * The table as lines of text in columns, the title first, then a head row; values rounded to two digits of their
     * uncertainty, or to five digits where none is stated.
     */
    public List<String> lines() {
        List<String[]> cells = new ArrayList<>();
        cells.add(new String[] {"property", "", "value", "std. uncertainty", "unit", "source"});
        for (Row row : rows) {
            boolean stated = Double.isFinite(row.standardUncertainty()) && row.standardUncertainty() > 0.0;
            cells.add(new String[] {
                row.name(),
                row.symbol(),
                stated
                        ? rounded(row.value(), row.standardUncertainty())
                        : String.format(Locale.ROOT, "%.5g", row.value()),
                stated ? rounded(row.standardUncertainty(), row.standardUncertainty()) : "-",
                row.unit(),
                row.source()
            });
        }
        int columns = 6;
        int[] width = new int[columns];
        for (String[] line : cells) {
            for (int i = 0; i < columns; i++) {
                width[i] = Math.max(width[i], line[i].length());
            }
        }
        List<String> lines = new ArrayList<>();
        lines.add(title);
        for (String[] line : cells) {
            StringBuilder text = new StringBuilder();
            for (int i = 0; i < columns; i++) {
                text.append(line[i]).append(" ".repeat(width[i] - line[i].length() + 2));
            }
            lines.add(text.toString().stripTrailing());
        }
        lines.add(
                "Uncertainties are those of the formulation alone; temperature, pressure and humidity are taken as given.");
        return lines;
    }

    /** The value with the digits that two digits of its uncertainty leave, with a power of ten below 1e-4. */
    private static String rounded(double value, double uncertainty) {
        int exponent = (int) Math.floor(Math.log10(Math.abs(value)));
        int last = (int) Math.floor(Math.log10(uncertainty)) - 1;
        if (exponent < -4) {
            return String.format(Locale.ROOT, "%." + Math.max(1, exponent - last) + "e", value);
        }
        return String.format(Locale.ROOT, "%." + Math.max(0, -last) + "f", value);
    }
}
