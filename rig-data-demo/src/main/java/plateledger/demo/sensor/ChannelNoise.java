package plateledger.demo.sensor;

import java.util.Random;

/**
 * First-order autoregressive noise of a channel: e(t + Δt) = φ^(Δt/τ₁) e(t) + …, stated at one second.
 *
 * @param deviation standard deviation, SI
 * @param perSecond correlation of two values one second apart
 */
public record ChannelNoise(double deviation, double perSecond) {
    /** The noise of a channel whose true value is {@code level} (SI). */
    public static ChannelNoise of(String channel, double level) {
        char kind = channel.charAt(0);
        if (channel.equals(Channels.PITOT)) {
            return new ChannelNoise(0.05 + 0.008 * Math.abs(level), 0.7);
        } else if (channel.equals(Channels.ANEMOMETER)) {
            return new ChannelNoise(0.004 + 0.01 * Math.abs(level), 0.8);
        } else if (channel.equals(Channels.AIR)) {
            return new ChannelNoise(0.02, 0.9);
        } else if (channel.equals(Channels.PRESSURE)) {
            return new ChannelNoise(2.0, 0.9);
        } else if (channel.equals(Channels.HUMIDITY)) {
            return new ChannelNoise(0.001, 0.9);
        } else if (kind == 'V') {
            return new ChannelNoise(0.0003 + 0.0002 * Math.abs(level), 0.3);
        } else if (kind == 'I') {
            return new ChannelNoise(0.00005 + 0.0002 * Math.abs(level), 0.3);
        }
        return new ChannelNoise(0.02, 0.85);
    }

    /** Standard error of the mean of samples {@code intervalS} apart over {@code spanS}. */
    public double standardError(double spanS, double intervalS) {
        double phi = Math.pow(perSecond, intervalS);
        double n = spanS / intervalS;
        return deviation * Math.sqrt((1.0 + phi) / (1.0 - phi) / n);
    }

    /** A sequence of this noise with unit deviation. */
    public Sequence sequence(Random random, double intervalS) {
        return new Sequence(random, Math.pow(perSecond, intervalS));
    }

    /** Successive values of unit deviation. */
    public static final class Sequence {
        private final Random random;
        private final double phi;
        private final double fresh;
        private double value;

        private Sequence(Random random, double phi) {
            this.random = random;
            this.phi = phi;
            fresh = Math.sqrt(1.0 - phi * phi);
            value = random.nextGaussian();
        }

        /** The next value. */
        public double next() {
            double now = value;
            value = phi * value + fresh * random.nextGaussian();
            return now;
        }
    }
}
