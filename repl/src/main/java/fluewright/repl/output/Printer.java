package fluewright.repl.output;

import fluewright.engine.fuel.Fuel;
import fluewright.engine.message.Note;
import fluewright.engine.quantity.UnitSystem;
import fluewright.engine.quantity.Value;
import fluewright.repl.function.FuelEntry;
import fluewright.repl.function.FunctionHandle;
import fluewright.repl.function.HelpText;
import fluewright.repl.function.ResultView;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;

/** Turns values into lines for people. The usual caution is printed with the first result that leads to a setting. */
public final class Printer {

    private final Supplier<UnitSystem> system;
    private boolean cautioned;

    /** Makes a printer for the units in use. */
    public Printer(Supplier<UnitSystem> system) {
        this.system = system;
    }

    /** Returns a value as lines no longer than the width, where a word does not force it. */
    public List<String> lines(Object value, int width) {
        List<String> lines = new ArrayList<>();
        for (String line : unwrapped(value)) {
            lines.addAll(Wrap.line(line, width));
        }
        return lines;
    }

    /** Returns a value on one line, for the acknowledgement of an assignment. */
    public String oneLine(Object value) {
        if (value instanceof Fuel fuel) {
            return new FuelText(fuel, system.get()).oneLine();
        }
        if (value instanceof ResultView view) {
            return new OutcomeText(view.outcome(), system.get()).lines().get(0);
        }
        return unwrapped(value).stream().findFirst().orElse("");
    }

    private List<String> unwrapped(Object value) {
        if (value instanceof ResultView view) {
            List<String> lines = new ArrayList<>(new OutcomeText(view.outcome(), system.get()).lines());
            lines.addAll(notes(view.outcome().notes()));
            return lines;
        }
        if (value instanceof Fuel fuel) {
            List<String> lines = new ArrayList<>(new FuelText(fuel, system.get()).lines());
            lines.addAll(notes(fuel.notes()));
            return lines;
        }
        if (value instanceof FunctionHandle handle) {
            return unwrapped(handle.shown());
        }
        if (value instanceof HelpText text) {
            return text.lines();
        }
        if (value instanceof Object[] parts) {
            return unwrapped(Arrays.asList(parts));
        }
        if (value instanceof Value<?> number) {
            return List.of(OutcomeText.rounded(number));
        }
        return value instanceof Map<?, ?> || value instanceof Collection<?> ? many(value) : List.of(String.valueOf(value).split("\n", -1));
    }

    private List<String> many(Object value) {
        List<String> lines = new ArrayList<>();
        if (value instanceof Map<?, ?> map) {
            TableText table = new TableText();
            map.forEach((name, part) -> table.row("  " + name, oneLine(part)));
            lines.addAll(table.lines(1));
        } else {
            ((Collection<?>) value).forEach(part -> lines.add("  " + listed(part)));
        }
        return lines;
    }

    private String listed(Object part) {
        return part instanceof FuelEntry fuel ? String.format("%-22s %-7s %s", fuel.id(), fuel.phase(), fuel.title()) : oneLine(part);
    }

    private List<String> notes(List<Note> notes) {
        List<String> lines = new ArrayList<>();
        for (Note note : notes) {
            boolean caution = note.level() == Note.Level.CAUTION;
            if (!caution || !cautioned) {
                lines.add(label(note.level()) + note.text());
            }
            cautioned |= caution;
        }
        return lines;
    }

    private static String label(Note.Level level) {
        return switch (level) {
            case REMARK -> "  note: ";
            case WARNING -> "  warning: ";
            case CAUTION -> "  caution: ";
        };
    }
}
