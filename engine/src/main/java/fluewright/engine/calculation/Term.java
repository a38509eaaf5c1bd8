package fluewright.engine.calculation;

import fluewright.engine.quantity.Basis;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.NamedUnit;
import fluewright.engine.quantity.UnitSystem;
import fluewright.engine.quantity.Units;
import fluewright.engine.quantity.ValueText;
import java.lang.reflect.Method;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A declared component of an input or result record, as the catalog's users see it. Its intervals are read when first
 * asked for: a start of the shell needs few of them.
 */
public final class Term {

    private final String name;
    private final Class<?> type;
    private final boolean optional;
    private final Component declared;
    private final List<Method> path;
    private Interval possible;
    private Interval valid;
    private final double defaultNumber;

    Term(String name, Class<?> type, boolean optional, Component declared, List<Method> path) {
        this.name = name;
        this.type = type;
        this.optional = optional;
        this.declared = declared;
        this.path = path;
        this.defaultNumber = isNumber() && !byDefault().isEmpty() ? ValueText.parse(byDefault()).si() : Double.NaN;
    }

    /** Returns the name. */
    public String name() {
        return name;
    }

    /** Returns the type: {@code double} for numbers, else the class of its values, an {@code Optional} taken off. */
    public Class<?> type() {
        return type;
    }

    /** Tells whether it is a plain number. */
    public boolean isNumber() {
        return type == double.class;
    }

    /** Tells whether it may be left out. */
    public boolean isOptional() {
        return optional || !declared.byDefault().isEmpty();
    }

    /** Returns the line for help and completion. */
    public String doc() {
        return declared.doc();
    }

    /** Returns the kind of number. */
    public Kind kind() {
        return declared.kind();
    }

    /** Returns all kinds of number that are accepted. */
    public List<Kind> kinds() {
        List<Kind> kinds = new ArrayList<>();
        if (isNumber() || type == Stated.class || type == Breakdown.class) {
            kinds.add(declared.kind());
            kinds.addAll(List.of(declared.also()));
        }
        return kinds;
    }

    /** Returns the unit that the number is shown in. */
    public NamedUnit shown(UnitSystem system) {
        return declared.shown().isEmpty() ? declared.kind().shown(system) : Units.of(declared.shown());
    }

    /** Returns what the number refers to. */
    public Basis basis() {
        return declared.basis();
    }

    /** Returns the default with its unit, empty when there is none. */
    public String byDefault() {
        return declared.byDefault();
    }

    /** Returns the default of a number in the coherent SI unit; NaN when there is none. */
    double defaultNumber() {
        return defaultNumber;
    }

    /** Returns the interval outside which an input is impossible. */
    public Interval possible() {
        if (possible == null) {
            possible = Interval.parse(declared.possible());
        }
        return possible;
    }

    /** Returns the method's valid interval. */
    public Interval valid() {
        if (valid == null) {
            valid = Interval.parse(declared.valid());
        }
        return valid;
    }

    /** Returns the words that an argument of an enum type may have, nothing for other types. */
    public List<String> choices() {
        List<String> words = new ArrayList<>();
        if (type.isEnum()) {
            for (Object constant : type.getEnumConstants()) {
                words.add(word(constant));
            }
        }
        return words;
    }

    /** Returns the word that stands for a constant in the shell. */
    static String word(Object constant) {
        return constant instanceof Enum<?> named ? named.name().toLowerCase(Locale.ROOT).replace('_', '-') : String.valueOf(constant);
    }

    /** Returns the component's value in a record: a {@code Double}, an object, or null when it is left out. */
    Object read(Object record) {
        try {
            Object value = record;
            for (Method accessor : path) {
                value = accessor.invoke(value);
            }
            return unwrapped(value);
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException("cannot read " + name, e);
        }
    }

    private static Object unwrapped(Object value) {
        if (value instanceof OptionalDouble number) {
            return number.isPresent() ? (Object) number.getAsDouble() : null;
        }
        return value instanceof Optional<?> object ? object.orElse(null) : value;
    }
}
