package plateledger.fluid;

/**
 * A second virial coefficient and its curvature; together, since they share their powers of temperature.
 *
 * @param value B, m³/mol
 * @param curvature T² d²B/dT², m³/mol: what c_p needs
 */
record Virial(double value, double curvature) {}
