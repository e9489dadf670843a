package plateledger.demo.app;

/** The room over the test days: everything drifts, slowly. Times are s since 1970-01-01T00:00Z. */
final class Climate {
    private static final double DAY_S = 86400.0;

    private Climate() {}

    /** Room temperature, K: at most 0.24 K/h. */
    static double roomK(double timeS) {
        double turn = 2.0 * Math.PI * timeS / DAY_S;
        return 294.75 + 0.9 * Math.sin(turn - 2.1) + 0.05 * Math.sin(6.0 * turn + 0.4);
    }

    /** Rate of the room's temperature, K/s. */
    static double roomSlopeKPerS(double timeS) {
        return (roomK(timeS + 300.0) - roomK(timeS - 300.0)) / 600.0;
    }

    /** Barometric pressure, Pa. */
    static double pressurePa(double timeS) {
        return 98150.0 + 180.0 * Math.sin(2.0 * Math.PI * timeS / (3.1 * DAY_S));
    }

    /** Relative humidity at the stream's temperature, 0..1. */
    static double humidity(double timeS) {
        return 0.41 + 0.03 * Math.sin(2.0 * Math.PI * timeS / DAY_S + 1.0);
    }
}
