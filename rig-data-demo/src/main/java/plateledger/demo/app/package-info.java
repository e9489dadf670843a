/**
 * The demo campaign: which runs were driven, what the loggers wrote, what was true; written as a campaign folder, or
 * as window means for coverage studies. May use the other demo packages and {@code plateledger.fluid}.
 */
@NullMarked
package plateledger.demo.app;

import org.jspecify.annotations.NullMarked;
