package plateledger.reduce;

import plateledger.sensor.InstrumentEquation;

/**
 * One channel in one run: where its mean and its instrument's errors stand in the input vector.
 *
 * @param mean position of the mean reading
 * @param shared position of the error common to the bath or instrument
 * @param own position of the channel's own offset
 * @param gain position of the instrument's gain error
 * @param ownGain position of the channel's own gain error
 * @param drift position of the drift since the day's zero
 * @param origin reading at which gain errors vanish, SI
 */
record Signal(int mean, int shared, int own, int gain, int ownGain, int drift, double origin) {
    /** The reading itself. */
    double raw(Reads in) {
        return in.get(mean);
    }

    /** True value by the certificate: X = R − b − b_i − (g + g_i)(R − R₀) − d_i. */
    double value(Reads in) {
        double r = in.get(mean);
        return InstrumentEquation.trueValue(
                r, origin, in.get(shared) + in.get(own), in.get(gain) + in.get(ownGain), in.get(drift));
    }

    /** True value against a zero taken in place: X = R − o − (g + g_i)(R − R_zero) − d_i. */
    double againstZero(Reads in, double offset, double zeroReading) {
        double r = in.get(mean);
        return InstrumentEquation.trueValue(r, zeroReading, offset, in.get(gain) + in.get(ownGain), in.get(drift));
    }

    static double mean(Reads in, Signal[] signals) {
        double sum = 0.0;
        for (Signal signal : signals) {
            sum += signal.value(in);
        }
        return sum / signals.length;
    }
}
