package fluewright.repl.output;

import fluewright.engine.calculation.Breakdown;
import fluewright.engine.calculation.Outcome;
import fluewright.engine.calculation.Term;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.quantity.NamedUnit;
import fluewright.engine.quantity.Numbers;
import fluewright.engine.quantity.UnitSystem;
import fluewright.engine.quantity.Value;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.stream.IntStream;

/** A result as text: what was asked, a row for each component, compositions side by side. */
final class OutcomeText {

    static final int DIGITS = 5;

    private final Outcome outcome;
    private final UnitSystem system;

    OutcomeText(Outcome outcome, UnitSystem system) {
        this.outcome = outcome;
        this.system = system;
    }

    List<String> lines() {
        List<String> lines = new ArrayList<>();
        lines.add(heading());
        lines.addAll(numbers());
        lines.addAll(compositions());
        return lines;
    }

    /** The calculation and the inputs that are not at their defaults. */
    private String heading() {
        List<String> inputs = new ArrayList<>();
        for (Term term : outcome.declaration().input().terms()) {
            Object value = outcome.inputValue(term);
            if (value instanceof Fuel fuel) {
                inputs.add(0, fuel.id());
            } else if (value != null && !outcome.isDefault(term)) {
                inputs.add(term.name() + " " + shown(value));
            }
        }
        return outcome.declaration().name() + ": " + String.join(", ", inputs);
    }

    private String shown(Object value) {
        return value instanceof Value<?> v ? rounded(v) : String.valueOf(value);
    }

    private List<String> numbers() {
        TableText table = new TableText();
        outcome.terms().forEach((name, term) -> {
            Object value = outcome.get(name, system);
            if (value instanceof Value<?> v) {
                table.row("  " + name, Numbers.rounded(v.number(), DIGITS), v.named().label(), v.basis().label());
            } else if (!(value instanceof Map)) {
                table.row("  " + name, String.valueOf(value));
            }
        });
        return table.lines(1);
    }

    private List<String> compositions() {
        Map<String, Map<?, ?>> columns = new LinkedHashMap<>();
        Map<String, String> units = new LinkedHashMap<>();
        outcome.terms().forEach((name, term) -> {
            if (term.type() == Breakdown.class) {
                NamedUnit unit = term.shown(system);
                columns.put(name, (Map<?, ?>) outcome.get(name, system));
                units.put(name, unit.label());
            }
        });
        return columns.isEmpty() ? List.of() : sideBySide(columns, units);
    }

    private static List<String> sideBySide(Map<String, Map<?, ?>> columns, Map<String, String> units) {
        TableText table = new TableText();
        List<String> heads = new ArrayList<>(List.of("  composition"));
        columns.keySet().forEach(name -> heads.add(name + " " + units.get(name)));
        table.row(heads.toArray(String[]::new));
        Set<Object> parts = new LinkedHashSet<>();
        columns.values().forEach(column -> parts.addAll(column.keySet()));
        for (Object part : parts) {
            List<String> cells = new ArrayList<>(List.of("    " + part));
            columns.values().forEach(column -> cells.add(cell(column.get(part))));
            table.row(cells.toArray(String[]::new));
        }
        return table.lines(IntStream.rangeClosed(1, columns.size()).toArray());
    }

    private static String cell(Object value) {
        return Objects.isNull(value) ? "" : Numbers.rounded(((Value<?>) value).number(), DIGITS);
    }

    /** Returns a quantity rounded for reading, with unit and basis. */
    static String rounded(Value<?> value) {
        String text = Numbers.rounded(value.number(), DIGITS) + " " + value.named().label() + " " + value.basis().label();
        return text.strip().replace("  ", " ");
    }
}
