/** Tests of the command line. */
@NullMarked
package plateledger.cli;

import org.jspecify.annotations.NullMarked;
