/** The command line on the demo campaign. */
@NullMarked
package plateledger.demo.command;

import org.jspecify.annotations.NullMarked;
