package plateledger.rig;

import java.time.LocalDate;
import java.util.Optional;

/**
 * A declared protective measure of the rig.
 *
 * @param kind which one
 * @param declared true if the rig file says it is there
 * @param setting its setting in words, e.g. {@code 80 °C, hand reset}; empty if not stated
 * @param tested date of its last test
 */
public record Protection(Kind kind, boolean declared, String setting, Optional<LocalDate> tested) {
    /** The measures the tool asks for. */
    public enum Kind {
        /** Heater power only while true flow is sensed. */
        FLOW_INTERLOCK,
        /** Over-temperature cut-out with its own sensor and relay. */
        CUT_OUT,
        /** Residual-current device. */
        RESIDUAL_CURRENT_DEVICE,
        /** Plate earthed. */
        EARTH,
        /** Guards at the fan. */
        FAN_GUARD
    }
}
