/** Tests. */
@NullMarked
package plateledger.gui.chart;

import org.jspecify.annotations.NullMarked;
