/** Tests of the desktop program as a whole, and the sample they share. */
@NullMarked
package plateledger.gui;

import org.jspecify.annotations.NullMarked;
