package plateledger.rig;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import plateledger.keyfile.Form;
import plateledger.keyfile.KeyTable;
import plateledger.quantity.Dimension;
import plateledger.quantity.Estimate;
import plateledger.quantity.Rounded;
import plateledger.quantity.Stated;
import plateledger.quantity.Unit;

/** Reads one {@code [plate.<id>]} of {@code rig.toml}. */
final class PlateReader {
    /** Strip edges closer than this are the same edge; far below what anyone can measure on a plate. */
    private static final double SAME_EDGE_M = 1e-6;

    private final KeyTable table;
    private final ChannelUse channels;
    private final Set<String> heaterIds = new HashSet<>();
    private final List<Strip> strips = new ArrayList<>();
    private double startM = Double.NEGATIVE_INFINITY; // limits that are not known do not refuse anything
    private double endM = Double.POSITIVE_INFINITY;
    private double widthM = Double.POSITIVE_INFINITY;
    private double sheetM = Double.POSITIVE_INFINITY;

    private PlateReader(KeyTable table, ChannelUse channels) {
        this.table = table;
        this.channels = channels;
    }

    private record Strip(KeyTable table, Plate.Heater heater) {}

    /** The plate, with placeholders where findings say so. */
    static Plate read(String id, KeyTable table, ChannelUse channels) {
        return new PlateReader(table, channels).plate(id);
    }

    private Plate plate(String id) {
        String description = table.need("description", Form.text());
        Plate.Orientation orientation =
                table.need("orientation", Form.choice(Plate.Orientation.class, InstrumentReader::word));
        Stated length = positive(table, "length", Dimension.LENGTH);
        Stated width = positive(table, "width", Dimension.LENGTH);
        Stated start = table.need("heated_start", Form.measured(Dimension.LENGTH));
        Stated end = positive(table, "heated_end", Dimension.LENGTH);
        checkSpan(length, width, start, end);
        Plate.Sheet sheet = table.needTable("sheet", this::sheet);
        Plate.Coat coat = table.needTable("coat", PlateReader::coat);
        Plate.Foam foam = table.needTable("foam", PlateReader::foam);
        Stated emissivity = table.need("emissivity", Form.measured(Dimension.NUMBER));
        table.require(emissivity.value() > 0.0 && emissivity.value() <= 1.0, "emissivity", "above 0, at most 1");
        List<Plate.Heater> heaters = table.needTables("heater", this::heater);
        checkStrips();
        return new Plate(
                id,
                description,
                orientation,
                length,
                width,
                start,
                end,
                sheet,
                coat,
                foam,
                emissivity,
                positive(table, "back_conductance", Dimension.CONDUCTANCE_PER_AREA),
                notNegative(table, "edge_conductance", Dimension.CONDUCTIVITY),
                notNegative(table, "nose_conductance", Dimension.CONDUCTANCE),
                notNegative(table, "tail_conductance", Dimension.CONDUCTANCE),
                positive(table, "cover_conductance", Dimension.CONDUCTANCE),
                table.need("smooth_shape", Form.choice(Plate.SmoothShape.class, InstrumentReader::word)),
                heaters.stream()
                        .sorted(Comparator.comparingDouble(Plate.Heater::fromM))
                        .toList(),
                table.needTables("thermocouple", this::thermocouple));
    }

    private void checkSpan(Stated length, Stated width, Stated start, Stated end) {
        if (table.sound("heated_start")) {
            table.require(start.value() >= 0.0, "heated_start", "0 or more, measured from the leading edge");
        }
        if (table.sound("heated_start", "heated_end")) {
            table.require(end.value() > start.value(), "heated_end", "more than heated_start, " + mm(start.value()));
        }
        if (table.sound("length", "heated_end")) {
            table.require(end.value() <= length.value(), "heated_end", "at most the length, " + mm(length.value()));
        }
        if (table.sound("heated_start", "heated_end")) {
            startM = start.value();
            endM = end.value();
        }
        if (table.sound("width")) {
            widthM = width.value();
        }
    }

    private Plate.Sheet sheet(KeyTable t) {
        Plate.Sheet sheet = new Plate.Sheet(
                t.need("material", Form.text()),
                positive(t, "thickness", Dimension.LENGTH),
                positive(t, "conductivity", Dimension.CONDUCTIVITY),
                positive(t, "heat_capacity", Dimension.HEAT_CAPACITY_PER_VOLUME));
        if (t.sound("thickness")) {
            sheetM = sheet.thicknessM().value();
        }
        return sheet;
    }

    private static Plate.Coat coat(KeyTable t) {
        return new Plate.Coat(
                t.need("material", Form.text()),
                positive(t, "thickness", Dimension.LENGTH),
                positive(t, "conductivity", Dimension.CONDUCTIVITY));
    }

    private static Plate.Foam foam(KeyTable t) {
        return new Plate.Foam(
                t.need("material", Form.text()),
                positive(t, "thickness", Dimension.LENGTH),
                positive(t, "heat_capacity", Dimension.HEAT_CAPACITY_PER_VOLUME));
    }

    private Plate.Heater heater(KeyTable t) {
        Plate.Heater heater = new Plate.Heater(
                t.need("id", Form.text()),
                t.need("from", Form.setting(Dimension.LENGTH)),
                t.need("to", Form.setting(Dimension.LENGTH)),
                notNegative(t, "lead_resistance", Dimension.RESISTANCE),
                t.need("voltage", Form.text()),
                t.need("current", Form.text()),
                t.need("rated", Form.setting(Dimension.POWER)));
        t.require(heater.ratedW() > 0.0, "rated", "above 0 W");
        if (t.sound("id") && !heaterIds.add(heater.id())) {
            t.refuse("id", "RIG-ID-TWICE", "an id of its own on this plate", "");
        }
        channels.use(t, "voltage", heater.voltageChannel(), Instrument.SignalKind.VOLTAGE);
        channels.use(t, "current", heater.currentChannel(), Instrument.SignalKind.CURRENT);
        if (t.sound("from", "to")) {
            t.require(heater.toM() > heater.fromM(), "to", "more than from, " + mm(heater.fromM()));
            String span = "strips within the heated span, " + mm(startM) + " to " + mm(endM);
            if (heater.fromM() < startM - SAME_EDGE_M) {
                t.refuse("from", "RIG-STRIP-OUTSIDE", span, "");
            }
            if (heater.toM() > endM + SAME_EDGE_M) {
                t.refuse("to", "RIG-STRIP-OUTSIDE", span, "");
            }
        }
        if (t.sound("from", "to")) {
            strips.add(new Strip(t, heater));
        }
        return heater;
    }

    /** Strips in order along the flow meet edge to edge. */
    private void checkStrips() {
        strips.sort(Comparator.comparingDouble(strip -> strip.heater().fromM()));
        for (int i = 1; i < strips.size(); i++) {
            Plate.Heater former = strips.get(i - 1).heater();
            Strip next = strips.get(i);
            double gapM = next.heater().fromM() - former.toM();
            String expected = "the end of strip " + former.id() + ", " + mm(former.toM());
            if (gapM < -SAME_EDGE_M) {
                next.table().refuse("from", "RIG-STRIP-OVERLAP", expected, "Strips must not overlap.");
            } else if (gapM > SAME_EDGE_M) {
                next.table()
                        .refuse(
                                "from",
                                "RIG-STRIP-GAP",
                                expected,
                                "Strips must meet; declare an unheated strip with a rating and channels of its own.");
            }
        }
    }

    private Plate.Thermocouple thermocouple(KeyTable t) {
        Plate.Thermocouple junction = new Plate.Thermocouple(
                t.need("channel", Form.text()),
                t.need("x", Form.measured(Dimension.LENGTH)),
                t.need("z", Form.setting(Dimension.LENGTH)),
                notNegative(t, "depth", Dimension.LENGTH),
                notNegative(t, "stem_fraction", Dimension.NUMBER));
        channels.use(t, "channel", junction.channel(), Instrument.SignalKind.TEMPERATURE);
        double x = junction.xM().value();
        if (t.sound("x") && (x < startM || x > endM)) {
            t.refuse(
                    "x",
                    "RIG-SENSOR-OUTSIDE",
                    "junction " + junction.channel() + " at " + mm(x),
                    "a junction on the heated sheet, " + mm(startM) + " to " + mm(endM) + " from the leading edge",
                    "Correct x, or heated_start and heated_end of the plate.");
        }
        if (t.sound("z") && Math.abs(junction.zM()) > widthM / 2.0) {
            t.refuse(
                    "z",
                    "RIG-SENSOR-OUTSIDE",
                    "junction " + junction.channel() + " at " + mm(junction.zM()),
                    "within " + mm(widthM / 2.0) + " of the centre line",
                    "Correct z, or the width of the plate.");
        }
        t.require(junction.depthM().value() <= sheetM, "depth", "at most the thickness of the sheet, " + mm(sheetM));
        t.require(junction.stemFraction().value() < 1.0, "stem_fraction", "0 or more, below 1");
        return junction;
    }

    private static Stated positive(KeyTable t, String key, Dimension dimension) {
        Stated stated = t.need(key, Form.measured(dimension));
        t.require(stated.value() > 0.0, key, "a value above 0");
        return stated;
    }

    private static Stated notNegative(KeyTable t, String key, Dimension dimension) {
        Stated stated = t.need(key, Form.measured(dimension));
        t.require(stated.value() >= 0.0, key, "a value of 0 or more");
        return stated;
    }

    private static String mm(double lengthM) {
        return Rounded.text(Estimate.of(lengthM, 0.0), Unit.MILLIMETRE);
    }
}
