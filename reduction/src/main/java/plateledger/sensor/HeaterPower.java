package plateledger.sensor;

import java.util.Arrays;
import plateledger.log.Series;

/**
 * Power of one heater strip from voltage and current sampled together. The mean power is the mean of the products, not the
 * product of the means: with a switched or rippling supply the two differ by the covariance.
 *
 * @param meanVoltage mean of V, V; NaN without samples
 * @param meanCurrent mean of I, A
 * @param covariance mean of V I less the product of the means (divisor n), W
 * @param currentVariance mean of I² less the square of the mean (divisor n), A²
 * @param samples sample pairs used
 */
public record HeaterPower(
        double meanVoltage, double meanCurrent, double covariance, double currentVariance, int samples) {
    /** Stamps of one row may differ by rounding. */
    private static final double SAME_TIME_S = 1e-6;

    /** Mean of V I, W. */
    public double meanPower() {
        return meanVoltage * meanCurrent + covariance;
    }

    /** Mean power less the heat in the leads, mean(V I) − R mean(I²), W, for a lead resistance in Ω. */
    public double stripPower(double leadResistance) {
        return meanPower() - leadResistance * (meanCurrent * meanCurrent + currentVariance);
    }

    /**
     * Means over the samples of which both V and I are valid.
     *
     * @param voltage V, in V
     * @param current I, in A, of the same log
     * @param fromS first time used, on the log's own clock, s
     * @param toS last time used, s
     * @return the means; NaN where no pair is valid
     */
    public static HeaterPower over(Series voltage, Series current, double fromS, double toS) {
        double[][] pairs = pairs(voltage, current);
        int n = 0;
        double sumV = 0.0;
        double sumI = 0.0;
        for (int k = 0; k < pairs[0].length; k++) {
            if (pairs[0][k] >= fromS && pairs[0][k] <= toS) {
                sumV += pairs[1][k];
                sumI += pairs[2][k];
                n++;
            }
        }
        double meanV = sumV / n;
        double meanI = sumI / n;
        double productSum = 0.0;
        double squareSum = 0.0;
        for (int k = 0; k < pairs[0].length; k++) {
            if (pairs[0][k] >= fromS && pairs[0][k] <= toS) {
                double dI = pairs[2][k] - meanI;
                productSum += (pairs[1][k] - meanV) * dI;
                squareSum += dI * dI;
            }
        }
        return new HeaterPower(
                n > 0 ? meanV : Double.NaN,
                n > 0 ? meanI : Double.NaN,
                n > 0 ? productSum / n : Double.NaN,
                n > 0 ? squareSum / n : Double.NaN,
                n);
    }

    /**
     * The power sample by sample.
     *
     * @param channel name of the new series
     * @param voltage V, in V
     * @param current I, in A, of the same log
     * @return V I in W at the times both are valid, all flagged valid, with the source lines of V
     */
    public static Series series(String channel, Series voltage, Series current) {
        double[][] pairs = pairs(voltage, current);
        int n = pairs[0].length;
        double[] watts = new double[n];
        int[] lines = new int[n];
        for (int k = 0; k < n; k++) {
            watts[k] = pairs[1][k] * pairs[2][k];
            lines[k] = voltage.lines()[(int) pairs[3][k]];
        }
        return new Series(channel, "W", voltage.file(), pairs[0], watts, new byte[n], lines);
    }

    /** Times, voltages, currents and positions in V of the samples where both are valid. */
    private static double[][] pairs(Series voltage, Series current) {
        double[][] found = new double[4][Math.min(voltage.size(), current.size())];
        int n = 0;
        int j = 0;
        for (int i = 0; i < voltage.size(); i++) {
            double t = voltage.timesS()[i];
            while (j < current.size() && current.timesS()[j] < t - SAME_TIME_S) {
                j++;
            }
            if (j == current.size()) {
                break;
            }
            boolean same = current.timesS()[j] <= t + SAME_TIME_S;
            byte valid = Series.Flag.VALID.code();
            if (same && voltage.flags()[i] == valid && current.flags()[j] == valid) {
                found[0][n] = t;
                found[1][n] = voltage.values()[i];
                found[2][n] = current.values()[j];
                found[3][n] = i;
                n++;
            }
            if (same) {
                j++;
            }
        }
        for (int k = 0; k < found.length; k++) {
            found[k] = Arrays.copyOf(found[k], n);
        }
        return found;
    }
}
