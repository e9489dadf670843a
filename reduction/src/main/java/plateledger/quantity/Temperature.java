package plateledger.quantity;

/**
 * A thermodynamic temperature in K. Only this type knows the Celsius offset; a temperature difference is a double named
 * {@code …DiffK}.
 *
 * @param kelvin the temperature, K, finite and above 0
 */
public record Temperature(double kelvin) {
    private static final double CELSIUS_ZERO_K = 273.15; // exact, SI Brochure 9th ed.

    /** Refuses values that are not finite and above 0 K (NaN included). */
    public Temperature {
        if (!(kelvin > 0.0) || Double.isInfinite(kelvin)) {
            throw new IllegalArgumentException("temperature must be finite and above 0 K, found " + kelvin + " K");
        }
    }

    /** The temperature for a reading in °C. */
    public static Temperature ofCelsius(double celsius) {
        return new Temperature(celsiusToKelvin(celsius));
    }

    /** K for °C without any check, for readings that may be nonsense. */
    static double celsiusToKelvin(double celsius) {
        return celsius + CELSIUS_ZERO_K;
    }

    /** °C for K without any check. */
    static double kelvinToCelsius(double kelvin) {
        return kelvin - CELSIUS_ZERO_K;
    }

    /** This temperature in °C. */
    public double celsius() {
        return kelvinToCelsius(kelvin);
    }
}
