/**
 * Forward model of the demo rig: air flow over a heated plate, conduction in sheet and foam, radiation, losses. Written
 * apart from the reduction by other numerical means (marching, finite differences), so that it can prove it. SI and
 * kelvin throughout. May use {@code plateledger.fluid} and nothing else of ours; knows no file, clock or sensor.
 */
@NullMarked
package plateledger.demo.physics;

import org.jspecify.annotations.NullMarked;
