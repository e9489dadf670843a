/**
 * Constants with covariance from points whose errors in Re and Nu are correlated, within a point and between points. May
 * use {@code expression}, {@code uncertainty}, {@code numeric}, {@code quantity}, {@code finding}. Knows no plate.
 */
@NullMarked
package plateledger.fit;

import org.jspecify.annotations.NullMarked;
