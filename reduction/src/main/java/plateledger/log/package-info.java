/**
 * Logger files to time series: text as loggers really write it, read in one streaming pass; every value keeps its source
 * line, every value not used has a reason that is counted. Channels are known by name, never by index. May use
 * {@code quantity}, {@code numeric}, {@code finding}. Knows no rig, no campaign, no zone of the machine.
 */
@NullMarked
package plateledger.log;

import org.jspecify.annotations.NullMarked;
