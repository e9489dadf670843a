/**
 * The few numerical pieces that the mathematics library does not offer in the form the kernel needs: a small dense
 * Cholesky factor that works in place, and a fast table of an incomplete beta function. Pure numbers in, pure numbers
 * out; no physics, no units. Uses nothing of ours.
 */
@NullMarked
package plateledger.numeric;

import org.jspecify.annotations.NullMarked;
