/**
 * Keyed text files with the place of every key: decoding, typed access that collects a finding for each thing that is
 * wrong, and the list of keys that a reader accepts. The only user of the TOML library. May use {@code quantity} and
 * {@code finding}. Knows no rig and no campaign, and never writes.
 */
@NullMarked
package plateledger.keyfile;

import org.jspecify.annotations.NullMarked;
