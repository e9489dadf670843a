package plateledger.log;

import java.util.Arrays;

/**
 * One channel of one log: values in SI over time. Arrays are not copied; treat them as read-only.
 *
 * @param channel channel name
 * @param unit symbol of the unit as read, e.g. {@code °C}; empty if the log states none
 * @param file log file, relative to the campaign folder
 * @param timesS times, s since 1970-01-01T00:00Z on the logger's own clock as read (before clock correction), ascending
 * @param values values in SI, NaN where a cell is invalid; same length
 * @param flags {@link Flag#code()} of each value; same length
 * @param lines source line of each value, from 1; same length
 */
public record Series(
        String channel, String unit, String file, double[] timesS, double[] values, byte[] flags, int[] lines) {
    /** Why a value is not used; {@link #VALID} if it is. */
    public enum Flag {
        /** Used. */
        VALID(0, "valid"),
        /** Cell empty or row too short. */
        EMPTY(1, "empty"),
        /** Over-range word or number. */
        OVER_RANGE(2, "over-range"),
        /** Text that is no number. */
        NOT_A_NUMBER(3, "not a number"),
        /** Outside the instrument's range. */
        OUT_OF_RANGE(4, "out of range"),
        /** A spike against its neighbours in time. */
        SPIKE(5, "spike"),
        /** Part of a stuck stretch. */
        STUCK(6, "stuck");

        private final byte code;
        private final String word;

        Flag(int code, String word) {
            this.code = (byte) code;
            this.word = word;
        }

        /** The byte that stands for this flag in {@link Series#flags()}. */
        public byte code() {
            return code;
        }

        /** The word printed. */
        public String word() {
            return word;
        }
    }

    /** Refuses arrays of different lengths. */
    public Series {
        if (timesS.length != values.length || values.length != flags.length || flags.length != lines.length) {
            throw new IllegalArgumentException("series %s: arrays differ in length".formatted(channel));
        }
    }

    /** Number of samples, invalid ones included. */
    public int size() {
        return values.length;
    }

    /** Number of samples with a flag. */
    public int count(Flag flag) {
        int n = 0;
        for (byte f : flags) {
            if (f == flag.code()) {
                n++;
            }
        }
        return n;
    }

    /** Same channel and contents. */
    @Override
    public boolean equals(Object other) {
        return other instanceof Series s
                && channel.equals(s.channel)
                && unit.equals(s.unit)
                && file.equals(s.file)
                && Arrays.equals(timesS, s.timesS)
                && Arrays.equals(values, s.values)
                && Arrays.equals(flags, s.flags)
                && Arrays.equals(lines, s.lines);
    }

    /** Hash of the contents. */
    @Override
    public int hashCode() {
        return 31 * channel.hashCode() + Arrays.hashCode(values);
    }

    /** Name, file and size. */
    @Override
    public String toString() {
        return "Series[" + channel + " from " + file + ", " + values.length + " values]";
    }
}
