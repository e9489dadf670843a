/**
 * The pipeline: campaign and logs to booked heat, dimensionless numbers, theory, constants, findings; stages as pure
 * functions of the stage before. May use every package of the reduction below it; knows no screen and writes no file.
 */
@NullMarked
package plateledger.reduce;

import org.jspecify.annotations.NullMarked;
