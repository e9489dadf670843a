package plateledger.safety;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.quantity.Temperature;

/** Collects findings while the checks run. */
final class Findings {
    private final List<Finding> list = new ArrayList<>();

    void add(
            String id,
            Level level,
            Place place,
            String subject,
            String found,
            String expected,
            String remedy,
            String source) {
        list.add(new Finding(id, level, place, subject, found, expected, remedy, source));
    }

    void notChecked(String id, Place place, String subject, String missing, String remedy) {
        add(id, Level.NOT_CHECKED, place, subject, "not checked: " + missing, "", remedy, "");
    }

    List<Finding> sorted() {
        return list.stream().sorted(Finding.ORDER).toList();
    }

    static String celsius(double kelvin) {
        return String.format(Locale.ROOT, "%.1f °C", new Temperature(kelvin).celsius());
    }

    static String watts(double watts) {
        return String.format(Locale.ROOT, "%.1f W", watts);
    }

    static String seconds(double seconds) {
        return String.format(Locale.ROOT, "%.0f s", seconds);
    }
}
