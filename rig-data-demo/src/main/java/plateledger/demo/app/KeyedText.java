package plateledger.demo.app;

import java.util.List;
import java.util.Locale;
import plateledger.demo.sensor.Declared;

/** Builds keyed text: one key per line, values quoted. */
final class KeyedText {
    private final StringBuilder out = new StringBuilder();

    KeyedText comment(String text) {
        out.append("# ").append(text).append('\n');
        return this;
    }

    KeyedText blank() {
        out.append('\n');
        return this;
    }

    KeyedText table(String name) {
        out.append("\n[").append(name).append("]\n");
        return this;
    }

    KeyedText entry(String name) {
        out.append("\n[[").append(name).append("]]\n");
        return this;
    }

    KeyedText quoted(String key, String value) {
        return bare(key, '"' + value + '"');
    }

    KeyedText quantity(String key, Declared value) {
        return quoted(key, value.text());
    }

    KeyedText list(String key, List<String> values) {
        return bare(key, "[\"" + String.join("\", \"", values) + "\"]");
    }

    /** A setting: a number and its unit, without uncertainty. */
    KeyedText setting(String key, double value, int decimals, String unit) {
        return quoted(key, String.format(Locale.ROOT, "%." + decimals + "f %s", value, unit));
    }

    KeyedText bare(String key, String value) {
        out.append(key).append(" = ").append(value).append('\n');
        return this;
    }

    String text() {
        return out.toString();
    }
}
