/** Keeps a record of what was checked against which published source, for the validation document. */
@NullMarked
package plateledger.validation;

import org.jspecify.annotations.NullMarked;
