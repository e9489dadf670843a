/** Tests. */
@NullMarked
package plateledger.gui.app;

import org.jspecify.annotations.NullMarked;
