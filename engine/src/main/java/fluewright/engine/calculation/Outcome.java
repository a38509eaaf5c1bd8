package fluewright.engine.calculation;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import fluewright.engine.message.Note;
import fluewright.engine.quantity.UnitSystem;
import fluewright.engine.quantity.Value;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * What a calculation gave: its declaration, the checked input, the result and its notes. It answers the components of
 * the result by name, as quantities.
 *
 * @param declaration the calculation's declaration
 * @param input       the checked input
 * @param result      the result
 * @param notes       what the result has to say about itself
 */
public record Outcome(Declaration<?, ?> declaration, Record input, Record result, List<Note> notes) {

    /** Copies the notes. */
    public Outcome {
        notes = List.copyOf(notes);
    }

    /** Returns the names of the components that the result has a value for. */
    public Collection<String> names() {
        return terms().keySet();
    }

    /** Returns the components that the result has a value for, by name. */
    public Map<String, Term> terms() {
        Map<String, Term> present = new LinkedHashMap<>();
        for (Term term : declaration.result().terms()) {
            if (term.read(result) != null) {
                present.put(term.name(), term);
            }
        }
        return present;
    }

    /**
     * Returns a component of the result: a {@link Value}, a map of values for a breakdown, or the object itself.
     *
     * @throws InputException when the result has no such component
     */
    public Object get(String name) {
        return get(name, UnitSystem.SI);
    }

    /** Returns a component of the result in the units of a system. */
    public Object get(String name, UnitSystem system) {
        Term term = declaration.result().find(name).orElse(null);
        Object value = term == null ? null : term.read(result);
        if (value == null) {
            throw new InputException(EngineMessage.UNKNOWN_COMPONENT, Detail.at(declaration.name()).found(name)
                    .expected("one of " + String.join(", ", names())).nearest(NearestName.of(name, names())));
        }
        return shown(term, value, system);
    }

    /** Returns an input: a {@link Value} in the unit its kind is shown in, the object itself, or null when it was left out. */
    public Object inputValue(Term term) {
        Object value = term.read(input);
        if (value instanceof Stated stated) {
            return Value.ofSi(stated.value(), stated.kind().shown(UnitSystem.SI), stated.basis().or(term.basis()));
        }
        return value == null ? null : shown(term, value, UnitSystem.SI);
    }

    /** Tells whether an input has the value of its default. */
    public boolean isDefault(Term term) {
        Object value = term.read(input);
        if (term.byDefault().isEmpty()) {
            return false;
        }
        return term.isNumber() ? term.defaultNumber() == (Double) value : Term.word(value).equals(term.byDefault());
    }

    private static Object shown(Term term, Object value, UnitSystem system) {
        if (value instanceof Breakdown breakdown) {
            Map<String, Value<?>> parts = new LinkedHashMap<>();
            breakdown.parts().forEach((name, number) -> parts.put(name, value(term, number, system)));
            return parts;
        }
        return value instanceof Double number ? value(term, number, system) : value;
    }

    private static Value<?> value(Term term, double si, UnitSystem system) {
        return Value.ofSi(si, term.shown(system), term.basis());
    }
}
