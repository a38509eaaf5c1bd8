package fluewright.repl.function;

import fluewright.engine.calculation.Reading;
import fluewright.engine.calculation.TermText;
import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.UnitSystem;
import fluewright.engine.quantity.Value;
import fluewright.engine.quantity.ValueText;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** The named values of a call whose names are open, such as the components of a gas; each is taken out as it is used. */
final class NamedValues {

    private final String function;
    private final Reading reading;
    private final Map<Object, Object> rest;

    NamedValues(String function, Reading reading, Map<Object, Object> named) {
        this.function = function;
        this.reading = reading;
        this.rest = new LinkedHashMap<>(named);
    }

    /** Returns a text, or a default. */
    String text(String name, String byDefault) {
        Object given = rest.remove(name);
        return given == null ? byDefault : given.toString();
    }

    /** Returns one of the words of an enum. */
    <E extends Enum<E>> E choice(String name, E byDefault) {
        Object given = rest.remove(name);
        if (given == null) {
            return byDefault;
        }
        List<String> words = words(byDefault.getDeclaringClass());
        for (E constant : byDefault.getDeclaringClass().getEnumConstants()) {
            if (constant == given || word(constant).equals(given.toString())) {
                return constant;
            }
        }
        throw new InputException(EngineMessage.WRONG_TYPE, Detail.at(function + " " + name).found(given)
                .expected("one of " + String.join(", ", words)).nearest(NearestName.of(given.toString(), words)));
    }

    static <E extends Enum<E>> List<String> words(Class<E> type) {
        return Arrays.stream(type.getEnumConstants()).map(NamedValues::word).toList();
    }

    private static String word(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** Returns a quantity of one of some kinds, if it was given. */
    Optional<Value<?>> value(String name, Kind... kinds) {
        Object given = rest.remove(name);
        return given == null ? Optional.empty() : Optional.of(value(name, given, kinds));
    }

    /** Returns what is left, as shares by name [-]. */
    Map<Object, Double> shares() {
        if (rest.isEmpty()) {
            throw new InputException(EngineMessage.ARGUMENT_MISSING, Detail.at(function).found("no shares").expected("shares such as CH4: 95.pct"));
        }
        Map<Object, Double> shares = new LinkedHashMap<>();
        rest.forEach((name, given) -> shares.put(name, value(String.valueOf(name), given, Kind.SHARE).si()));
        return shares;
    }

    /** Returns what is left, as shares by text. */
    Map<String, Double> sharesByName() {
        Map<String, Double> shares = new LinkedHashMap<>();
        shares().forEach((name, share) -> shares.put(String.valueOf(name), share));
        return shares;
    }

    private Value<?> value(String name, Object given, Kind... kinds) {
        Value<?> value = read(name, given, kinds[0]);
        for (Kind kind : kinds) {
            if (kind.accepts(value.named())) {
                return value;
            }
        }
        throw new InputException(EngineMessage.WRONG_UNIT, Detail.at(function + " " + name).found(value).expected(example(kinds[0])));
    }

    private Value<?> read(String name, Object given, Kind kind) {
        if (given instanceof Value<?> value) {
            return value;
        }
        if (given instanceof Number number) {
            UnitSystem system = reading.bareNumbers().orElseThrow(() -> new InputException(EngineMessage.UNIT_MISSING,
                    Detail.at(function + " " + name).found(number).expected(example(kind)).nearest(TermText.withUnit(name, number, kind))));
            return Value.of(number.doubleValue(), kind.shown(system));
        }
        if (given instanceof CharSequence text) {
            return ValueText.parse(text.toString());
        }
        throw new InputException(EngineMessage.WRONG_TYPE, Detail.at(function + " " + name).found(given).expected(example(kind)));
    }

    private static String example(Kind kind) {
        return kind.title() + " such as 1." + kind.shown(UnitSystem.SI).symbol();
    }
}
