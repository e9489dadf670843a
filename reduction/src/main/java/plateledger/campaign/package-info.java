/**
 * What was tested: the runs with their types, plates and log files, the loggers with their formats and clocks, and the
 * choices of reduction; read from {@code campaign.toml}. May use {@code keyfile}, {@code log} (format declarations),
 * {@code rig}, {@code fluid}, {@code uncertainty}, {@code expression}, {@code quantity}, {@code finding}. Opens no log.
 */
@NullMarked
package plateledger.campaign;

import org.jspecify.annotations.NullMarked;
