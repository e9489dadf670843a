/**
 * The desktop program: start, window, menus, appearance, what is remembered between starts, and the wiring of the rest. May
 * use all packages of the desktop program and {@code cli}.
 */
@NullMarked
package plateledger.gui.app;

import org.jspecify.annotations.NullMarked;
