/**
 * What the rig is: plates with their layers, heaters and sensors, the tunnel around them, the instruments with their
 * calibration statements, limits and protections; read from {@code rig.toml} and {@code instruments.toml}. May use
 * {@code keyfile}, {@code fluid}, {@code uncertainty}, {@code quantity}, {@code finding}. Knows no run and no log.
 */
@NullMarked
package plateledger.rig;

import org.jspecify.annotations.NullMarked;
