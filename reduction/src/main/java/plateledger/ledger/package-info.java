/**
 * The heat ledger of one run: pure functions from inputs to booked heat, h, Nu, Re, Pr, and what theory says for the same
 * rig; loss calibration; the zero run's prediction.
 *
 * <p>Rates in W, fluxes in W/m², positive when heat leaves the plate. Convection is never measured: it is what remains.
 * Knows no file, screen, clock, locale or random source. May use {@code rig}, {@code fluid}, {@code theory},
 * {@code uncertainty}, {@code numeric}, {@code quantity}, {@code finding}.
 */
@NullMarked
package plateledger.ledger;

import org.jspecify.annotations.NullMarked;
