/** Tests of what a reduction leaves behind. */
@NullMarked
package plateledger.report;

import org.jspecify.annotations.NullMarked;
