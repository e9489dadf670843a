/**
 * Checks of logs, plans and rig against published and declared limits; every result is a finding with its source. Pure
 * functions; knows no file but its own tables of limits and cautions, no screen and no clock. May use {@code campaign},
 * {@code rig}, {@code log}, {@code sensor}, {@code steady}, {@code fluid}, {@code theory}, {@code ledger},
 * {@code uncertainty}, {@code numeric}, {@code quantity}, {@code finding}.
 */
@NullMarked
package plateledger.safety;

import org.jspecify.annotations.NullMarked;
