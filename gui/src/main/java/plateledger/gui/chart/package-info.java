/**
 * The numbers of {@code gui.model} as charts, and charts as pictures. The only package of the desktop program that uses the
 * chart library. May use {@code gui.model}. Computes no physics.
 */
@NullMarked
package plateledger.gui.chart;

import org.jspecify.annotations.NullMarked;
