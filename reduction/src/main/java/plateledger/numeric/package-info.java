/**
 * The few numerical pieces that the mathematics library does not offer in the form the kernel needs: a tridiagonal
 * solve, a small dense Cholesky factor that works in place, and a fast table of an incomplete beta function. Pure
 * numbers in, pure numbers out; no physics, no units, no allocation where a caller hands in the work arrays. Uses
 * nothing of ours.
 */
@NullMarked
package plateledger.numeric;

import org.jspecify.annotations.NullMarked;
