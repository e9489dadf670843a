/**
 * Raw signals to physical quantities: calibration, screening, clocks, pitot tube, air probe, heater power. Pure functions
 * on SI values, used alike on samples, on window means and inside the kernel. May use {@code log}, {@code rig},
 * {@code fluid}, {@code uncertainty}, {@code numeric}, {@code quantity}, {@code finding}. Knows no campaign and no ledger.
 */
@NullMarked
package plateledger.sensor;

import org.jspecify.annotations.NullMarked;
