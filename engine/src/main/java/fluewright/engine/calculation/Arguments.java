package fluewright.engine.calculation;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.UnitSystem;
import fluewright.engine.quantity.Value;
import fluewright.engine.quantity.ValueText;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Makes a checked input record of what a caller gave: named and unnamed values. */
final class Arguments {

    private final Declaration<?, ?> declaration;
    private final Reading reading;
    private final Notes notes;

    Arguments(Declaration<?, ?> declaration, Reading reading, Notes notes) {
        this.declaration = declaration;
        this.reading = reading;
        this.notes = notes;
    }

    /** Unnamed values go to the inputs that are no numbers, in order: to the fuel, as a rule. */
    List<Object> values(List<?> unnamed, Map<String, ?> named) {
        named.keySet().forEach(declaration::argument);
        Deque<Object> waiting = new ArrayDeque<>(unnamed);
        List<Object> values = new ArrayList<>();
        for (Term term : declaration.input().terms()) {
            Object given = named.get(term.name());
            if (given == null && takesUnnamed(term) && !waiting.isEmpty()) {
                given = waiting.poll();
            }
            values.add(given == null ? absent(term) : checked(term, given));
        }
        if (!waiting.isEmpty()) {
            throw new InputException(EngineMessage.TOO_MANY_VALUES, Detail.at(declaration.name()).found(waiting.peek())
                    .expected("named arguments: " + String.join(", ", declaration.input().names())));
        }
        return values;
    }

    private static boolean takesUnnamed(Term term) {
        return !term.isNumber() && !term.type().isEnum() && term.type() != boolean.class && term.type() != Stated.class;
    }

    private Object absent(Term term) {
        if (!term.byDefault().isEmpty()) {
            return term.isNumber() ? (Object) term.defaultNumber() : checked(term, term.byDefault());
        }
        if (!term.isOptional()) {
            throw new InputException(EngineMessage.ARGUMENT_MISSING,
                    Detail.at(declaration.name()).found("no " + term.name()).expected(term.name() + ": " + expected(term)));
        }
        return null;
    }

    private Object checked(Term term, Object given) {
        if (term.isNumber()) {
            return number(term, term.kind(), given);
        }
        if (term.type() == Stated.class) {
            return stated(term, given);
        }
        return term.type().isEnum() ? choice(term, given) : object(term, given);
    }

    private Stated stated(Term term, Object given) {
        Value<?> value = value(term, term.kind(), given);
        Kind kind = term.kinds().stream().filter(k -> k.accepts(value.named())).findFirst().orElseThrow(() -> wrongUnit(term, value));
        requirePossible(term, value.si(), value);
        return new Stated(kind, value.si(), value.basis());
    }

    private double number(Term term, Kind kind, Object given) {
        Value<?> value = value(term, kind, given);
        if (!kind.accepts(value.named())) {
            throw wrongUnit(term, value);
        }
        if (!value.basis().agreesWith(term.basis())) {
            throw new InputException(EngineMessage.WRONG_BASIS, at(term).found(value).expected(expected(term)));
        }
        requirePossible(term, value.si(), value);
        if (!term.valid().contains(value.si())) {
            notes.warn(EngineMessage.OUTSIDE_VALID_RANGE, Detail.at(term.name()).found(value).expected("valid " + term.valid().text()));
        }
        return value.si();
    }

    private void requirePossible(Term term, double si, Object shown) {
        if (!term.possible().contains(si)) {
            throw new InputException(EngineMessage.IMPOSSIBLE, at(term).found(shown).expected(term.possible().text()));
        }
    }

    private Value<?> value(Term term, Kind kind, Object given) {
        if (given instanceof Value<?> value) {
            return value;
        }
        if (given instanceof Number number) {
            return bare(term, kind, number);
        }
        if (given instanceof CharSequence text) {
            return ValueText.parse(text.toString());
        }
        throw new InputException(EngineMessage.WRONG_TYPE, at(term).found(describe(given)).expected(expected(term)));
    }

    private Value<?> bare(Term term, Kind kind, Number number) {
        if (kind.isPure()) {
            return Value.of(number.doubleValue(), kind.si());
        }
        UnitSystem system = reading.bareNumbers().orElseThrow(() -> new InputException(EngineMessage.UNIT_MISSING,
                at(term).found(number).expected(expected(term)).nearest(TermText.withUnit(term.name(), number, kind))));
        return Value.of(number.doubleValue(), kind.shown(system));
    }

    private Object choice(Term term, Object given) {
        if (term.type().isInstance(given)) {
            return given;
        }
        for (Object constant : term.type().getEnumConstants()) {
            if (Term.word(constant).equals(String.valueOf(given))) {
                return constant;
            }
        }
        throw new InputException(EngineMessage.WRONG_TYPE, at(term).found(describe(given))
                .expected(expected(term)).nearest(NearestName.of(String.valueOf(given), term.choices())));
    }

    private Object object(Term term, Object given) {
        if (term.type().isInstance(given) || term.type() == boolean.class && given instanceof Boolean) {
            return given;
        }
        Optional<Object> read = given instanceof CharSequence text ? reading.read(term.type(), text.toString()) : Optional.empty();
        return read.orElseThrow(() -> new InputException(EngineMessage.WRONG_TYPE, at(term).found(describe(given)).expected(expected(term))));
    }

    private InputException wrongUnit(Term term, Value<?> value) {
        return new InputException(EngineMessage.WRONG_UNIT, at(term).found(value).expected(expected(term)));
    }

    private Detail at(Term term) {
        return Detail.at(declaration.name() + " " + term.name());
    }

    private static String expected(Term term) {
        return TermText.expects(term);
    }

    private static String describe(Object given) {
        String type = given == null ? "nothing" : given.getClass().getSimpleName();
        return given instanceof CharSequence ? "'" + given + "'" : given + " (" + type + ")";
    }
}
