/**
 * Panels that show a state and forward gestures; they decide nothing. May use {@code gui.model} and {@code gui.chart}, and
 * the findings. Swing parts are composed, not extended.
 */
@NullMarked
package plateledger.gui.view;

import org.jspecify.annotations.NullMarked;
