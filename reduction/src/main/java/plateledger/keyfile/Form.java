package plateledger.keyfile;

import java.time.DateTimeException;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import plateledger.quantity.Dimension;
import plateledger.quantity.QuantityFormatException;
import plateledger.quantity.QuantityText;
import plateledger.quantity.Stated;
import plateledger.quantity.Temperature;

/**
 * What a key holds and how it becomes a value of type {@code T}. A form that cannot read what it finds says what it found,
 * expected and advises; {@link KeyTable} adds the place.
 *
 * @param <T> the type of value
 */
public final class Form<T> {
    private static final int LONGEST_SHOWN = 60;

    /** Reads a node. */
    private interface Conversion<T> {

        T read(Node node) throws Refusal;
    }

    private final String type;
    private final String unit;
    private final String expected;
    private final T placeholder;
    private final Conversion<T> conversion;

    private Form(String type, String unit, String expected, T placeholder, Conversion<T> conversion) {
        this.type = type;
        this.unit = unit;
        this.expected = expected;
        this.placeholder = placeholder;
        this.conversion = conversion;
    }

    /** A text that is not blank. */
    public static Form<String> text() {
        return of(
                "text",
                "a text in quotation marks",
                "",
                text -> Optional.of(text).filter(t -> !t.isBlank()));
    }

    /** A text that may be blank. */
    public static Form<String> anyText() {
        return of("text", "a text in quotation marks", "", Optional::of);
    }

    /** A text that a function turns into a value; an empty result refuses the text. */
    public static <T> Form<T> of(String type, String expected, T placeholder, Function<String, Optional<T>> reading) {
        return new Form<>(type, "", expected, placeholder, node -> {
            if (raw(node) instanceof String text) {
                return reading.apply(text).orElseThrow(() -> new Refusal("KEY-VALUE", shown(node), expected, ""));
            }
            throw new Refusal("KEY-TYPE", shown(node), expected, "");
        });
    }

    /** A measured quantity: a value with its unit and its uncertainty. */
    public static Form<Stated> measured(Dimension dimension) {
        String want = dimension.word() + " with its uncertainty, in " + dimension.units();
        return new Form<>(
                "measured", unitOf(dimension), want, Stated.exact(1.0), node -> stated(node, dimension, want));
    }

    /** A setting: a value with its unit and no uncertainty. */
    public static Form<Double> setting(Dimension dimension) {
        String want = dimension.word() + " in " + dimension.units();
        return new Form<>("setting", unitOf(dimension), want, 1.0, node -> {
            try {
                return QuantityText.setting(quantityText(node, want), dimension);
            } catch (QuantityFormatException e) {
                throw refusal(e);
            }
        });
    }

    /** A temperature without uncertainty. */
    public static Form<Temperature> temperature() {
        Form<Double> kelvin = setting(Dimension.TEMPERATURE);
        return new Form<>(
                kelvin.type,
                kelvin.unit,
                kelvin.expected,
                new Temperature(kelvin.placeholder),
                node -> new Temperature(kelvin.read(node)));
    }

    /** A number, or a text such as {@code "1/3"} that is a fraction of two. */
    public static Form<Double> fraction() {
        String want = "a number, or a fraction such as \"1/3\"";
        return new Form<>("number", "", want, 1.0, node -> {
            String text = String.valueOf(raw(node));
            int bar = text.indexOf('/');
            try {
                double value = bar < 0
                        ? Double.parseDouble(text)
                        : Double.parseDouble(text.substring(0, bar)) / Double.parseDouble(text.substring(bar + 1));
                if (Double.isFinite(value)) {
                    return value;
                }
            } catch (NumberFormatException e) {
                // said below, as for an infinite value
            }
            throw new Refusal("KEY-TYPE", shown(node), want, "");
        });
    }

    /** A text, or a date without quotation marks, which is taken as a text. */
    public static Form<String> textOrDate() {
        String want = "a text or a date";
        return new Form<>("text or date", "", want, "", node -> {
            Object raw = raw(node);
            if (raw instanceof String || raw instanceof LocalDate) {
                return raw.toString();
            }
            throw new Refusal("KEY-TYPE", shown(node), want, "");
        });
    }

    /** A plain number. */
    public static Form<Double> number() {
        return new Form<>("number", "", "a number", 0.0, node -> {
            if (raw(node) instanceof Number number && Double.isFinite(number.doubleValue())) {
                return number.doubleValue();
            }
            throw new Refusal("KEY-TYPE", shown(node), "a number without quotation marks", "");
        });
    }

    /** A whole number, not below a lowest one. */
    public static Form<Integer> whole(int lowest) {
        String want = "a whole number, " + lowest + " or more, without quotation marks";
        return new Form<>("whole number", "", want, lowest, node -> {
            if (raw(node) instanceof Long number && number >= lowest && number <= Integer.MAX_VALUE) {
                return Math.toIntExact(number);
            }
            throw new Refusal("KEY-TYPE", shown(node), want, "");
        });
    }

    /** {@code true} or {@code false}. */
    public static Form<Boolean> flag() {
        return new Form<>("true or false", "", "true or false without quotation marks", false, node -> {
            if (raw(node) instanceof Boolean flag) {
                return flag;
            }
            throw new Refusal("KEY-TYPE", shown(node), "true or false without quotation marks", "");
        });
    }

    /** A date, {@code 2026-03-10}, with or without quotation marks. */
    public static Form<LocalDate> date() {
        String want = "a date such as 2026-03-10";
        return new Form<>("date", "", want, LocalDate.EPOCH, node -> {
            Object raw = raw(node);
            try {
                return raw instanceof LocalDate date ? date : LocalDate.parse(String.valueOf(raw));
            } catch (DateTimeParseException e) {
                throw new Refusal("KEY-TYPE", shown(node), want, "");
            }
        });
    }

    /** A time with its date; where it carries no zone it is in the one given. */
    public static Form<Instant> time(ZoneId zone) {
        String want = "a time such as \"2026-03-10T10:20:00\"";
        return new Form<>("time", "", want, Instant.EPOCH, node -> {
            String text = String.valueOf(raw(node));
            try {
                return OffsetDateTime.parse(text).toInstant();
            } catch (DateTimeParseException zoneless) {
                try {
                    return LocalDateTime.parse(text).atZone(zone).toInstant();
                } catch (DateTimeParseException e) {
                    throw new Refusal("KEY-TYPE", shown(node), want, "");
                }
            }
        });
    }

    /** A time zone by its region name. */
    public static Form<ZoneId> zone() {
        String want = "a time zone such as \"Europe/Vienna\" or \"UTC\"";
        return of("time zone", want, ZoneId.of("UTC"), text -> {
            try {
                return Optional.of(ZoneId.of(text));
            } catch (DateTimeException e) {
                return Optional.empty();
            }
        });
    }

    /** One of the constants of an enumeration, by its word. */
    public static <E extends Enum<E>> Form<E> choice(Class<E> kind, Function<E, String> word) {
        return choice(Arrays.stream(kind.getEnumConstants())
                .collect(Collectors.toMap(word, Function.identity(), (a, b) -> a, LinkedHashMap::new)));
    }

    /** One of several values, by its word; the first is the placeholder. */
    public static <T> Form<T> choice(Map<String, T> byWord) {
        Map<String, T> words = new LinkedHashMap<>(byWord);
        String list = words.keySet().stream()
                .map(word -> "\"" + word.replace("\t", "\\t") + "\"")
                .collect(Collectors.joining(" "));
        String want = "one of: " + list;
        T first = words.values().iterator().next();
        return new Form<>("choice", list, want, first, node -> {
            if (raw(node) instanceof String text) {
                return Optional.ofNullable(words.get(text)).orElseThrow(() -> {
                    String remedy = Closest.to(text, words.keySet())
                            .map(close -> "Did you mean " + close + "?")
                            .orElse("");
                    return new Refusal("KEY-VALUE", shown(node), want, remedy);
                });
            }
            throw new Refusal("KEY-TYPE", shown(node), want, "");
        });
    }

    /** A list, each item of one form. */
    public static <T> Form<List<T>> listOf(Form<T> item) {
        String want = "a list in square brackets, each item " + item.expected;
        return new Form<>("list of " + item.type, item.unit, want, List.of(), node -> {
            if (!(node instanceof Node.Items items)) {
                throw new Refusal("KEY-TYPE", shown(node), want, "");
            }
            List<T> read = new ArrayList<>();
            for (Node element : items.items()) {
                read.add(item.read(element));
            }
            return List.copyOf(read);
        });
    }

    /** The same form, its unit described in words for the list of keys. */
    public Form<T> unitWord(String words) {
        return new Form<>(type, words, expected, placeholder, conversion);
    }

    T read(Node node) throws Refusal {
        return conversion.read(node);
    }

    String type() {
        return type;
    }

    String unit() {
        return unit;
    }

    String expected() {
        return expected;
    }

    T placeholder() {
        return placeholder;
    }

    /** What stands at a node, short enough for a message. */
    static String shown(Node node) {
        if (node instanceof Node.Table) {
            return "a table";
        }
        if (node instanceof Node.Items) {
            return "a list";
        }
        Object raw = raw(node);
        String text = raw instanceof String words ? "\"" + words + "\"" : String.valueOf(raw);
        return text.length() > LONGEST_SHOWN ? text.substring(0, LONGEST_SHOWN) + "…" : text;
    }

    private static Object raw(Node node) {
        return node instanceof Node.Value value ? value.raw() : node;
    }

    private static Stated stated(Node node, Dimension dimension, String want) throws Refusal {
        try {
            return QuantityText.parse(quantityText(node, want), dimension);
        } catch (QuantityFormatException e) {
            throw refusal(e);
        }
    }

    /** A number without quotation marks is read as if it had them: what it lacks is then said. */
    private static String quantityText(Node node, String want) throws Refusal {
        Object raw = raw(node);
        if (raw instanceof String || raw instanceof Number) {
            return raw.toString();
        }
        throw new Refusal("KEY-TYPE", shown(node), want, "");
    }

    private static Refusal refusal(QuantityFormatException e) {
        String id = "KEY-" + e.fault().name().toUpperCase(Locale.ROOT);
        return new Refusal(id, e.found(), e.expected(), e.remedy());
    }

    private static String unitOf(Dimension dimension) {
        return dimension.siUnit().symbol();
    }
}
