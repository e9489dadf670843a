/**
 * Physical quantities at the edges of the program: units as people write them, values with their uncertainty as stated,
 * and estimates with a standard uncertainty. Inside the program everything is a double in SI; this package is where
 * text becomes SI and SI becomes text. Uses nothing of ours; knows no file and no locale.
 */
@NullMarked
package plateledger.quantity;

import org.jspecify.annotations.NullMarked;
