package plateledger.sensor;

import static plateledger.validation.PublishedTable.number;

import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import plateledger.log.Series;
import plateledger.validation.PublishedTable;
import plateledger.validation.ValidationRecorder;

/** Sensor conversions against worked cases computed elsewhere with 40 digits; twelve digits are printed. */
@Tag("validation")
final class SensorValidationTest {
    private static final double TWELVE_DIGITS = 1e-11;

    private static ValidationRecorder check(String what, String source) {
        return ValidationRecorder.of(SensorValidationTest.class, "Sensors", what, source);
    }

    private static double expected(String id, String quantity) {
        for (CSVRecord row : PublishedTable.rows(SensorValidationTest.class, "worked-cases.csv")) {
            if (row.get("case").equals(id) && row.get("quantity").startsWith(quantity)) {
                return number(row, "expected");
            }
        }
        throw new IllegalArgumentException("no row " + id + " " + quantity);
    }

    private static Series series(String channel, double... values) {
        int n = values.length;
        double[] times = new double[n];
        int[] lines = new int[n];
        for (int i = 0; i < n; i++) {
            times[i] = i;
            lines[i] = i + 2;
        }
        return new Series(channel, "", "log", times, values, new byte[n], lines);
    }

    /** p 100 800 Pa, T 295.65 K, R 287.05 J/(kg K), γ 1.4; Δp 250 and 4000 Pa. */
    @Test
    void pitotTube() {
        double p = 100800.0;
        double rho = expected("VEL-1", "rho");
        try (ValidationRecorder check = check(
                "pitot tube, incompressible and isentropic",
                "40-digit computation; isentropic relation as in ISO 3966 scope, sign and probe coefficient included")) {
            check.relative(
                    expected("VEL-1", "V incompressible"), PitotTube.speed(250, rho, 1.0), TWELVE_DIGITS, "VEL-1");
            check.relative(expected("VEL-1", "V with"), PitotTube.speed(250, rho, 0.998), TWELVE_DIGITS, "VEL-1 C");
            check.relative(expected("VEL-2", "Mach"), PitotTube.mach(250, p, 1.4), TWELVE_DIGITS, "VEL-2 M");
            check.relative(
                    expected("VEL-2", "V exact"),
                    PitotTube.compressibleSpeed(250, p, rho, 1.4, 1.0),
                    TWELVE_DIGITS,
                    "VEL-2");
            check.relative(expected("VEL-3", "Mach"), PitotTube.mach(4000, p, 1.4), TWELVE_DIGITS, "VEL-3 M");
            check.relative(
                    expected("VEL-3", "V exact"),
                    PitotTube.compressibleSpeed(4000, p, rho, 1.4, 1.0),
                    TWELVE_DIGITS,
                    "VEL-3");
            check.relative(
                    expected("VEL-3", "V incompressible"), PitotTube.speed(4000, rho, 1.0), TWELVE_DIGITS, "VEL-3 inc");
            check.relative(expected("VEL-5", "V in water"), PitotTube.speed(180, 998.2, 1.0), TWELVE_DIGITS, "VEL-5");
            double mean = 0.5 * (PitotTube.speed(100, 1.2, 1.0) + PitotTube.speed(400, 1.2, 1.0));
            check.relative(expected("VEL-10", "bias"), mean, TWELVE_DIGITS, "VEL-10");
        }
    }

    @Test
    void airProbe() {
        try (ValidationRecorder check = check("recovery of an air probe", "40-digit computation")) {
            double stream = AirProbe.streamK(298.15, 0.0, 30.0, 0.86, 0.0, 1006.0) - 273.15;
            check.absolute(expected("AIR-1", "static T"), stream, 1e-9, "AIR-1");
        }
    }

    /** The product of the means (row marked WRONG in the table) must not be returned. */
    @Test
    void heaterPower() {
        try (ValidationRecorder check = check("heater power, lead loss, switched supply", "40-digit computation")) {
            HeaterPower steady = HeaterPower.over(series("V", 24.137), series("I", 3.8126), 0.0, 0.0);
            check.relative(expected("PWR-1", "DC power"), steady.meanPower(), TWELVE_DIGITS, "PWR-1");
            HeaterPower supply = HeaterPower.over(series("V", 24.500), series("I", 3.8126), 0.0, 0.0);
            check.relative(
                    expected("PWR-4", "heater power after lead loss"),
                    supply.stripPower(0.0952),
                    TWELVE_DIGITS,
                    "PWR-4");
            // 48 V on 12 Ω, on for 7 of 20 samples: duty 0.35.
            double[] volts = new double[20];
            double[] amps = new double[20];
            for (int i = 0; i < 7; i++) {
                volts[i] = 48.0;
                amps[i] = 4.0;
            }
            HeaterPower chopped = HeaterPower.over(series("V", volts), series("I", amps), 0.0, 19.0);
            check.relative(expected("PWR-5", "PWM true"), chopped.meanPower(), TWELVE_DIGITS, "PWR-5");
            HeaterPower noisy = HeaterPower.over(
                    series("V", 24.0, 0.1, 24.2, 23.9, 0.0), series("I", 3.80, 0.01, 3.82, 3.79, 0.00), 0.0, 4.0);
            check.relative(expected("PWR-6", "mean(v*i)"), noisy.meanPower(), TWELVE_DIGITS, "PWR-6");
            check.relative(expected("PWR-6", "covariance"), noisy.covariance(), TWELVE_DIGITS, "PWR-6 cov");
        }
    }
}
