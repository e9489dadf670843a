/**
 * What a smooth flat plate should show: boundary-layer solutions and published correlations on plain arrays of geometry,
 * flux and temperature difference. SI; x from the leading edge in m; temperature differences are surface minus adiabatic
 * wall temperature in K. Pure functions, NaN outside their range, no state. May use {@code expression}, {@code fluid},
 * {@code numeric}, {@code quantity}, {@code finding}; knows no rig, file or log.
 */
@NullMarked
package plateledger.theory;

import org.jspecify.annotations.NullMarked;
