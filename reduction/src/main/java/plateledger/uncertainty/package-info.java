/**
 * What is uncertain, what is shared between channels and runs, and what that does to a result: the list of inputs with
 * their scopes, propagation by finite perturbation, budgets. May use {@code quantity}, {@code numeric}, {@code finding}.
 * Knows no plate, no fluid and no file.
 */
@NullMarked
package plateledger.uncertainty;

import org.jspecify.annotations.NullMarked;
