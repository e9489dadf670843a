/**
 * What is chosen and shown in the window, as immutable states, and the numbers of its charts in the units shown. May use
 * {@code reduce} and {@code report} and the types they return. Knows no Swing and no AWT, so that all of it is tested
 * without a display.
 */
@NullMarked
package plateledger.gui.model;

import org.jspecify.annotations.NullMarked;
