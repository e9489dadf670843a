/**
 * What the demo rig declares about itself and how it really is: every declared quantity is stated once, here, both
 * as the text that goes into the campaign's files and as the distribution that the true value is drawn from. Also the
 * instruments' errors, noise and clocks. May use {@code demo.physics} and {@code plateledger.fluid}; writes no file.
 */
@NullMarked
package plateledger.demo.sensor;

import org.jspecify.annotations.NullMarked;
