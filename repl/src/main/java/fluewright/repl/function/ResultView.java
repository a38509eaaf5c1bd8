package fluewright.repl.function;

import fluewright.engine.calculation.Outcome;
import fluewright.engine.message.Note;
import fluewright.engine.quantity.UnitSystem;
import java.util.List;
import java.util.function.Supplier;

/** A result as the shell's language sees it: its components are properties, in the units of the session. */
public final class ResultView {

    private final Outcome outcome;
    private final Supplier<UnitSystem> units;

    ResultView(Outcome outcome, Supplier<UnitSystem> units) {
        this.outcome = outcome;
        this.units = units;
    }

    /** Returns the outcome behind the view. */
    public Outcome outcome() {
        return outcome;
    }

    /**
     * Returns a component, which Groovy takes for a property, as a quantity, a map of quantities or a text; {@code notes} are its notes, one a line.
     *
     * @throws fluewright.engine.message.InputException when the result has no such component
     */
    public Object get(String name) {
        if (name.equals("notes") && !outcome.names().contains(name)) {
            List<Note> notes = outcome.notes();
            return notes.stream().map(Note::text).toList();
        }
        return outcome.get(name, units.get());
    }

    @Override
    public String toString() {
        return outcome.declaration().name() + " " + outcome.names();
    }
}
