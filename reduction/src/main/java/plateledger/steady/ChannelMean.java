package plateledger.steady;

/**
 * Mean of one channel over a window.
 *
 * @param channel channel name
 * @param mean mean of the valid samples, SI
 * @param standardError standard error from the effective number of samples, SI, with a floor from the resolution
 * @param dof effective degrees of freedom of the standard error, at least 1
 * @param slopePerS fitted slope, SI per s
 * @param slopeStandardError standard error of the slope with autocorrelation, SI per s
 * @param samples valid samples used
 * @param excluded samples in the window not used
 * @param firstLine first source line used
 * @param lastLine last source line used
 * @param file log file
 */
public record ChannelMean(
        String channel,
        double mean,
        double standardError,
        double dof,
        double slopePerS,
        double slopeStandardError,
        int samples,
        int excluded,
        int firstLine,
        int lastLine,
        String file) {}
