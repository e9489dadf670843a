package plateledger.demo.app;

/**
 * One run as it is driven.
 *
 * @param id its name
 * @param kind what it is for
 * @param day test day
 * @param panel panel mounted
 * @param flow state of the flow over it
 * @param speedSetMPerS set speed, m/s
 * @param speedMPerS true speed at the meters, m/s
 * @param stripSetW power set for each strip, W; 0 where none or where it is controlled
 * @param riseK rise above the room: held in a loss run, expected in a heated run, K
 * @param set name of the set point
 * @param startS heater on (or start), s since 1970-01-01T00:00Z
 * @param durationS from the start to the end, s
 */
public record RunPlan(
        String id,
        Kind kind,
        String day,
        String panel,
        Flow flow,
        double speedSetMPerS,
        double speedMPerS,
        double stripSetW,
        double riseK,
        String set,
        double startS,
        double durationS) {

    /** What a run is for. */
    public enum Kind {
        /** Fan and heater off, before the day's runs. */
        FAN_OFF_BEFORE("fan-off zero"),
        /** Fan and heater off, after the day's runs. */
        FAN_OFF_AFTER("fan-off zero"),
        /** Highest speed, heater off. */
        ZERO("zero"),
        /** Covered and heated. */
        LOSS("loss"),
        /** Heated in the stream. */
        HEATED("heated");

        private final String word;

        Kind(String word) {
            this.word = word;
        }

        /** The word in the campaign file. */
        public String word() {
            return word;
        }
    }

    /** State of the flow. */
    public enum Flow {
        /** Smooth plate, no trip. */
        LAMINAR("laminar"),
        /** Smooth plate behind a trip wire. */
        TRIPPED("turbulent"),
        /** Product panel. */
        PRODUCT("product");

        private final String word;

        Flow(String word) {
            this.word = word;
        }

        /** The regime's word in the campaign file. */
        public String word() {
            return word;
        }
    }

    /** Place of the trip wire, m from the leading edge. */
    public static final double TRIP_M = 0.050;

    /** Length of the window at the end of a run over which the truth is averaged, s. */
    public static final double TRUTH_WINDOW_S = 900.0;

    /** Sampling interval of the plate and power loggers, s. */
    public double intervalS() {
        return kind == Kind.LOSS ? 10.0 : 2.0;
    }

    /** Sampling interval of the tunnel logger, s. */
    public double tunnelIntervalS() {
        return kind == Kind.LOSS ? 10.0 : 1.0;
    }

    /** Start of the window over which the truth is averaged, s after the start. */
    public double truthFromS() {
        return Math.max(0.0, durationS - TRUTH_WINDOW_S);
    }
}
