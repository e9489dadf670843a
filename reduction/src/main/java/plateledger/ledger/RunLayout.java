package plateledger.ledger;

import java.util.ArrayList;
import java.util.List;

/**
 * Names and positions of the kernel's scalar inputs and outputs for a plate with a number of strips, junctions and
 * stations. The names are those of budgets.
 */
public final class RunLayout {
    /** Scalar inputs in vector order; lengths in m, temperatures in K, SI throughout. */
    public enum In {
        /** Start of the heated length. */
        HEATED_START,
        /** End of the heated length. */
        HEATED_END,
        /** Span of the sheet. */
        WIDTH,
        /** Sheet thickness. */
        SHEET_THICKNESS,
        /** Sheet conductivity. */
        SHEET_CONDUCTIVITY,
        /** Sheet heat capacity per volume. */
        SHEET_HEAT_CAPACITY,
        /** Coat thickness. */
        COAT_THICKNESS,
        /** Coat conductivity. */
        COAT_CONDUCTIVITY,
        /** Depth of the junction plane below the coat. */
        JUNCTION_DEPTH,
        /** Emissivity of the coat. */
        EMISSIVITY,
        /** Exchange factor to the walls. */
        EXCHANGE_FACTOR,
        /** Back conductance, W/(m² K). */
        BACK_CONDUCTANCE,
        /** Edge conductance, W/(m K). */
        EDGE_CONDUCTANCE,
        /** Conductance to the nose, W/K. */
        NOSE_CONDUCTANCE,
        /** Conductance to the tail, W/K. */
        TAIL_CONDUCTANCE,
        /** Insulation thickness. */
        FOAM_THICKNESS,
        /** Insulation heat capacity per volume. */
        FOAM_HEAT_CAPACITY,
        /** Factor on the density of the formulation. */
        DENSITY_FACTOR,
        /** Factor on the viscosity of the formulation. */
        VISCOSITY_FACTOR,
        /** Factor on the conductivity of the formulation. */
        CONDUCTIVITY_FACTOR,
        /** Factor on the heat capacity of the formulation. */
        HEAT_CAPACITY_FACTOR,
        /** Smoothing against the chosen one, decades. */
        SMOOTHING,
        /** Speed over the plate. */
        SPEED,
        /** Stream temperature. */
        AIR_TEMPERATURE,
        /** Static pressure. */
        PRESSURE,
        /** Mole fraction of water. */
        VAPOUR_FRACTION,
        /** Mean wall temperature. */
        WALL_TEMPERATURE,
        /** Plenum temperature. */
        PLENUM_TEMPERATURE,
        /** Frame temperature. */
        FRAME_TEMPERATURE,
        /** Nose temperature. */
        NOSE_TEMPERATURE,
        /** Tail temperature. */
        TAIL_TEMPERATURE,
        /** Common drift of the sheet, K/s. */
        DRIFT,
        /** Share E of the insulation's slowest mode still to come, METHODS.md eq. (L-7). */
        SOAK;

        private static final In[] ALL = values();
    }

    /** Scalar outputs in vector order. */
    public enum Out {
        /** Re_L. */
        RE_L,
        /** Nu_L by the campaign's average. */
        NU_L,
        /** Nu_L of the length average of h. */
        NU_L_MEAN_H,
        /** Pr. */
        PR,
        /** Average h, W/(m² K). */
        H,
        /** Area mean of the surface temperature, K. */
        MEAN_SURFACE,
        /** Nu_L of theory for this rig. */
        NU_L_THEORY,
        /** ln(Nu_L/Nu_L,theory). */
        LN_RATIO,
        /** Speed over the plate, m/s. */
        SPEED,
        /** Stream temperature, K. */
        AIR_TEMPERATURE,
        /** Static pressure, Pa. */
        PRESSURE,
        /** Mole fraction of water. */
        VAPOUR_FRACTION,
        /** Power at the sense points, W. */
        Q_ELECTRICAL,
        /** Convected, W. */
        Q_CONVECTION,
        /** Radiated, W. */
        Q_RADIATION,
        /** Through the back, W. */
        Q_BACK,
        /** Through the edges, W. */
        Q_EDGE,
        /** Out of the upstream end, W. */
        Q_NOSE,
        /** Out of the downstream end, W. */
        Q_TAIL,
        /** Guard exchange, W. */
        Q_GUARD,
        /** Leads, W. */
        Q_LEAD,
        /** Stored, W. */
        Q_STORAGE,
        /** Remainder, W. */
        Q_RESIDUAL,
        /** Root mean square of reading − model, K. */
        MISFIT;

        private static final Out[] ALL = values();
    }

    /** Outputs at each station in vector order. */
    public enum StationOut {
        /** Place, m. */
        X,
        /** Surface temperature, K. */
        SURFACE,
        /** Adiabatic wall temperature, K. */
        REFERENCE,
        /** Property temperature, K. */
        FILM,
        /** Heater flux, W/m². */
        Q_ELECTRICAL,
        /** Radiated flux, W/m². */
        Q_RADIATION,
        /** Back flux, W/m². */
        Q_BACK,
        /** Conducted along the sheet, W/m². */
        Q_CONDUCTION,
        /** Convected flux, W/m². */
        Q_CONVECTION,
        /** Convected flux of the plain local balance, W/m². */
        Q_CONVECTION_LOCAL,
        /** h, W/(m² K). */
        H,
        /** h ÷ superposition factor, W/(m² K). */
        H_EQUIVALENT,
        /** Re_x. */
        RE_X,
        /** Nu_x. */
        NU_X,
        /** Pr. */
        PR,
        /** Nu_x of theory for this rig. */
        NU_X_THEORY,
        /** Nu_x of the uniform-temperature formula. */
        NU_X_TEXTBOOK,
        /** ln(Nu_x/Nu_x,theory). */
        LN_RATIO,
        /** |q_conduction|/q_electrical. */
        RELIANCE;

        private static final StationOut[] ALL = values();
    }

    private final int strips;
    private final int junctions;
    private final int stations;

    /** A layout; numbers of strips, junctions (all) and stations (those on the centre line). */
    public RunLayout(int strips, int junctions, int stations) {
        this.strips = strips;
        this.junctions = junctions;
        this.stations = stations;
    }

    /** Length of the input vector. */
    public int inputs() {
        return In.ALL.length + 2 * strips + 3 * junctions;
    }

    /** Length of the output vector. */
    public int outputs() {
        return Out.ALL.length + stations * StationOut.ALL.length;
    }

    /** Position of a scalar input. */
    public int at(In input) {
        return positionOf(input);
    }

    /** Position of the power of a strip at its sense points, W. */
    public int power(int strip) {
        return In.ALL.length + strip;
    }

    /** Position of the lead loss of a strip, W. */
    public int lead(int strip) {
        return In.ALL.length + strips + strip;
    }

    /** Position of a junction's place along the flow, m. */
    public int place(int junction) {
        return In.ALL.length + 2 * strips + junction;
    }

    /** Position of a junction's corrected reading, K. */
    public int reading(int junction) {
        return In.ALL.length + 2 * strips + junctions + junction;
    }

    /** Position of a junction's stem fraction. */
    public int stem(int junction) {
        return In.ALL.length + 2 * strips + 2 * junctions + junction;
    }

    /** Position of a scalar output. */
    public int at(Out output) {
        return positionOf(output);
    }

    /** Position of a station output. */
    public int at(int station, StationOut output) {
        return Out.ALL.length + station * StationOut.ALL.length + positionOf(output);
    }

    /** Names of all outputs in order, stations by number from 1. */
    public List<String> outputNames() {
        List<String> names = new ArrayList<>();
        for (Out out : Out.ALL) {
            names.add(out.name());
        }
        for (int s = 0; s < stations; s++) {
            for (StationOut out : StationOut.ALL) {
                names.add("station " + (s + 1) + " " + out.name());
            }
        }
        return names;
    }

    /** Number of strips. */
    public int strips() {
        return strips;
    }

    /** Number of junctions. */
    public int junctions() {
        return junctions;
    }

    /** Number of stations. */
    public int stations() {
        return stations;
    }

    @SuppressWarnings("EnumOrdinal") // the declared order is the vector order, by definition of this class
    private static int positionOf(Enum<?> one) {
        return one.ordinal();
    }
}
