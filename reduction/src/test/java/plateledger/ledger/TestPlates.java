package plateledger.ledger;

import java.util.ArrayList;
import java.util.List;
import plateledger.ledger.RunLayout.In;
import plateledger.quantity.Stated;
import plateledger.rig.Plate;

/** A plate like those of small wind tunnels, with invented numbers, for tests of the kernel. */
final class TestPlates {
    private TestPlates() {}

    static Plate plate(Plate.SmoothShape shape) {
        List<Plate.Heater> heaters = new ArrayList<>();
        List<Plate.Thermocouple> junctions = new ArrayList<>();
        for (int j = 0; j < 8; j++) {
            double from = 0.1 + 0.05 * j;
            heaters.add(new Plate.Heater(
                    "H" + (j + 1), from, from + 0.05, Stated.exact(0.01), "V" + (j + 1), "I" + (j + 1), 60.0));
            for (double d : new double[] {0.0125, 0.0375}) {
                junctions.add(junction(junctions.size() + 1, from + d, 0.0));
            }
        }
        junctions.add(junction(17, 0.175, 0.10));
        junctions.add(junction(18, 0.275, -0.12));
        junctions.add(junction(19, 0.375, 0.13));
        junctions.add(junction(20, 0.475, -0.14));
        return new Plate(
                "test",
                "invented",
                Plate.Orientation.FACE_UP,
                Stated.exact(0.5),
                Stated.exact(0.3),
                Stated.exact(0.1),
                Stated.exact(0.5),
                new Plate.Sheet("steel", Stated.exact(0.5e-3), Stated.exact(14.9), Stated.exact(3.77e6)),
                new Plate.Coat("paint", Stated.exact(50e-6), Stated.exact(0.2)),
                new Plate.Foam("foam", Stated.exact(0.05), Stated.exact(6.6e4)),
                Stated.exact(0.95),
                Stated.exact(0.46),
                Stated.exact(0.05),
                Stated.exact(0.05),
                Stated.exact(0.05),
                Stated.exact(0.075),
                shape,
                heaters,
                junctions);
    }

    private static Plate.Thermocouple junction(int n, double x, double z) {
        return new Plate.Thermocouple(
                "T%02d".formatted(n), Stated.exact(x), z, Stated.exact(0.5e-3), Stated.exact(0.002));
    }

    /** Inputs without readings: 22 °C air, walls 0.5 K warmer, plenum 23 °C, frame 22.5 °C, nose 24 °C, tail 26 °C. */
    static double[] inputs(Plate plate, double speed, double stripW) {
        RunLayout l = RunModel.layout(plate);
        double[] in = new double[l.inputs()];
        in[l.at(In.HEATED_START)] = 0.1;
        in[l.at(In.HEATED_END)] = 0.5;
        in[l.at(In.WIDTH)] = 0.3;
        in[l.at(In.SHEET_THICKNESS)] = 0.5e-3;
        in[l.at(In.SHEET_CONDUCTIVITY)] = 14.9;
        in[l.at(In.SHEET_HEAT_CAPACITY)] = 3.77e6;
        in[l.at(In.COAT_THICKNESS)] = 50e-6;
        in[l.at(In.COAT_CONDUCTIVITY)] = 0.2;
        in[l.at(In.JUNCTION_DEPTH)] = 0.5e-3;
        in[l.at(In.EMISSIVITY)] = 0.95;
        in[l.at(In.EXCHANGE_FACTOR)] = 0.97;
        in[l.at(In.BACK_CONDUCTANCE)] = 0.46;
        in[l.at(In.EDGE_CONDUCTANCE)] = 0.05;
        in[l.at(In.NOSE_CONDUCTANCE)] = 0.05;
        in[l.at(In.TAIL_CONDUCTANCE)] = 0.05;
        in[l.at(In.FOAM_THICKNESS)] = 0.05;
        in[l.at(In.FOAM_HEAT_CAPACITY)] = 6.6e4;
        in[l.at(In.DENSITY_FACTOR)] = 1.0;
        in[l.at(In.VISCOSITY_FACTOR)] = 1.0;
        in[l.at(In.CONDUCTIVITY_FACTOR)] = 1.0;
        in[l.at(In.HEAT_CAPACITY_FACTOR)] = 1.0;
        in[l.at(In.SPEED)] = speed;
        in[l.at(In.AIR_TEMPERATURE)] = 295.15;
        in[l.at(In.PRESSURE)] = 98000.0;
        in[l.at(In.VAPOUR_FRACTION)] = 0.01;
        in[l.at(In.WALL_TEMPERATURE)] = 295.65;
        in[l.at(In.PLENUM_TEMPERATURE)] = 296.15;
        in[l.at(In.FRAME_TEMPERATURE)] = 295.65;
        in[l.at(In.NOSE_TEMPERATURE)] = 297.15;
        in[l.at(In.TAIL_TEMPERATURE)] = 299.15;
        in[l.at(In.DRIFT)] = 2e-5;
        for (int j = 0; j < l.strips(); j++) {
            in[l.power(j)] = stripW * (1.0 + 0.01 * (j % 3 - 1));
            in[l.lead(j)] = 0.01;
        }
        for (int p = 0; p < l.junctions(); p++) {
            in[l.place(p)] = plate.thermocouples().get(p).xM().value();
            in[l.stem(p)] = 0.002;
        }
        return in;
    }
}
