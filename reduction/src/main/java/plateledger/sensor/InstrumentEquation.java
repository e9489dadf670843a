package plateledger.sensor;

import java.util.List;
import plateledger.quantity.Stated;
import plateledger.rig.Instrument;

/**
 * From a reading to the true value by what the calibration says.
 *
 * <pre>
 *   R = a₀ + a₁ raw + a₂ raw² + …              R = raw without a polynomial
 *   X = R − b − b_i − (g + g_i)(R − R₀) − d_i
 *   R   reading after the calibration polynomial        SI
 *   R₀  origin of the gain errors                       SI
 *   b, b_i   offsets: common, own to the channel        SI
 *   g, g_i   gain errors: common, own to the channel    -
 *   d_i      change since the day's zero                SI
 * </pre>
 *
 * Meaning of the terms: {@link Instrument}.
 */
public final class InstrumentEquation {
    private InstrumentEquation() {}

    /**
     * The calibration polynomial.
     *
     * @param coefficients a₀, a₁, …, SI; empty for the identity
     * @param raw value from the log, SI
     * @return R, SI
     */
    public static double polynomial(List<Double> coefficients, double raw) {
        if (coefficients.isEmpty()) {
            return raw;
        }
        double sum = 0.0;
        for (int i = coefficients.size() - 1; i >= 0; i--) {
            sum = sum * raw + coefficients.get(i);
        }
        return sum;
    }

    /**
     * The true value for a reading and given errors.
     *
     * @param reading R after the polynomial, SI
     * @param origin R₀, SI
     * @param offset b + b_i, SI
     * @param gain g + g_i, dimensionless
     * @param drift d_i, SI
     * @return X, SI
     */
    public static double trueValue(double reading, double origin, double offset, double gain, double drift) {
        return reading - offset - gain * (reading - origin) - drift;
    }

    /**
     * The best estimate: polynomial, then the errors at their stated values.
     *
     * @param instrument the instrument
     * @param raw value from the log, SI
     * @return X, SI
     */
    public static double bestEstimate(Instrument instrument, double raw) {
        double reading = polynomial(instrument.polynomial(), raw);
        return trueValue(
                reading,
                instrument.gainOrigin(),
                instrument.offset().value() + instrument.channelOffset().value(),
                instrument.gain().value() + instrument.channelGain().value(),
                instrument.dailyDrift().value());
    }

    /**
     * Standard uncertainty of one reading from the calibration statement and the resolution q (q/√12, JCGM 100:2008,
     * F.2.2.1), all terms independent; the scatter of the reading is not in it.
     *
     * @param instrument the instrument
     * @param raw value from the log, SI
     * @return u(X), SI
     */
    public static double standardUncertainty(Instrument instrument, double raw) {
        double distance = polynomial(instrument.polynomial(), raw) - instrument.gainOrigin();
        return Math.sqrt(square(instrument.offset(), 1.0)
                + square(instrument.channelOffset(), 1.0)
                + square(instrument.gain(), distance)
                + square(instrument.channelGain(), distance)
                + square(instrument.dailyDrift(), 1.0)
                + instrument.resolution() * instrument.resolution() / 12.0);
    }

    private static double square(Stated stated, double sensitivity) {
        double contribution = stated.standardUncertainty() * sensitivity;
        return contribution * contribution;
    }
}
