/**
 * Steady windows and honest standard errors of their means. May use {@code log}, {@code sensor}, {@code rig},
 * {@code uncertainty}, {@code numeric}, {@code quantity}, {@code finding}. Knows no fluid and no ledger: the heat capacity
 * and power that the storage test needs are handed in.
 */
@NullMarked
package plateledger.steady;

import org.jspecify.annotations.NullMarked;
