/**
 * Thermophysical properties of the fluid, with the uncertainty of each formulation: dry and moist air. Pure functions on
 * SI values, no state, no tables read at run time; NaN outside the stated range. May use {@code quantity},
 * {@code numeric}, {@code finding}. Knows no rig and no run.
 */
@NullMarked
package plateledger.fluid;

import org.jspecify.annotations.NullMarked;
