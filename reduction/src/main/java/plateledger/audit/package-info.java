/**
 * Proof of what came from what: the identity of the program, the settings and the SHA-256 of every file read. Holds no
 * time and no path of the machine, so that a repeat gives the same bytes; a clock, where one is needed, is handed in. May
 * use {@code reduce} and all below it.
 */
@NullMarked
package plateledger.audit;

import org.jspecify.annotations.NullMarked;
