/** Tests. */
@NullMarked
package plateledger.gui.model;

import org.jspecify.annotations.NullMarked;
