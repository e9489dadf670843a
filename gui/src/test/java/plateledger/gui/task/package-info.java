/** Tests. */
@NullMarked
package plateledger.gui.task;

import org.jspecify.annotations.NullMarked;
