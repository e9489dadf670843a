/**
 * The one background runner: reduces a campaign off the event thread, with progress and stop. May use {@code gui.model} and
 * the types of {@code reduce}. Knows no view.
 */
@NullMarked
package plateledger.gui.task;

import org.jspecify.annotations.NullMarked;
