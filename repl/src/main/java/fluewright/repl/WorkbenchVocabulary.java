package fluewright.repl;

import fluewright.engine.calculation.Term;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.quantity.Kind;
import fluewright.engine.quantity.Units;
import fluewright.repl.editor.Vocabulary;
import fluewright.repl.function.ResultView;
import fluewright.repl.function.ShellFunction;
import fluewright.repl.function.Workbench;
import fluewright.repl.output.Printer;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;

/** What the editor can complete and colour: all of it from the functions' own declarations. */
final class WorkbenchVocabulary implements Vocabulary {

    private final Supplier<Workbench> workbench;
    private final Map<?, ?> variables;
    private final Printer printer;

    WorkbenchVocabulary(Supplier<Workbench> workbench, Map<?, ?> variables, Printer printer) {
        this.workbench = workbench;
        this.variables = variables;
        this.printer = printer;
    }

    @Override
    public List<Word> functions() {
        return workbench.get().functions().stream().map(function -> new Word(function.name(), function.title())).toList();
    }

    @Override
    public boolean isFunction(String name) {
        return workbench.get().function(name).isPresent();
    }

    @Override
    public List<Argument> arguments(String function) {
        return workbench.get().function(function).map(WorkbenchVocabulary::argumentsOf).orElse(List.of());
    }

    private static List<Argument> argumentsOf(ShellFunction function) {
        List<Argument> arguments = new ArrayList<>();
        function.arguments().forEach(a -> arguments.add(new Argument(a.name(), a.unit(), a.doc(), a.choices())));
        function.openNames().forEach((name, about) -> arguments.add(new Argument(name, "pct", about, List.of())));
        return arguments;
    }

    @Override
    public List<Word> variableWords() {
        return variables.entrySet().stream().map(e -> new Word(String.valueOf(e.getKey()), printer.oneLine(e.getValue()))).toList();
    }

    @Override
    public List<Word> units() {
        return Units.docs().entrySet().stream().map(unit -> new Word(unit.getKey(), unit.getValue())).toList();
    }

    @Override
    public List<Word> units(String function, String argument) {
        boolean calculation = workbench.get().catalog().has(function);
        List<Kind> kinds = !calculation ? List.of()
                : workbench.get().catalog().declaration(function).input().find(argument).map(Term::kinds).orElse(List.of());
        return units().stream().filter(unit -> kinds.stream().anyMatch(kind -> kind.accepts(Units.of(unit.text())))).toList();
    }

    @Override
    public List<Word> texts(String function) {
        boolean fuel = workbench.get().function(function).map(ShellFunction::takesFuel).orElse(false);
        return fuel ? workbench.get().fuelIds().stream().map(id -> new Word(id, workbench.get().fuelEntry(id).title())).toList() : List.of();
    }

    @Override
    public List<Word> members(String path) {
        String[] names = path.split("\\.");
        Object value = variables.get(names[0]);
        for (int i = 1; i < names.length && value != null; i++) {
            value = member(value, names[i]);
        }
        return membersOf(value);
    }

    private static Object member(Object value, String name) {
        if (value instanceof ResultView view) {
            return view.outcome().names().contains(name) ? view.get(name) : null;
        }
        return value instanceof Map<?, ?> map ? map.get(name) : null;
    }

    private List<Word> membersOf(Object value) {
        if (value instanceof ResultView view) {
            return view.outcome().terms().values().stream().map(this::componentWord).toList();
        }
        if (value instanceof Map<?, ?> map) {
            return map.entrySet().stream().map(e -> new Word(String.valueOf(e.getKey()), printer.oneLine(e.getValue()))).toList();
        }
        return value instanceof Fuel ? List.of(new Word("title", "the name in words"), new Word("id", "the short name")) : List.of();
    }

    private Word componentWord(Term term) {
        String unit = term.kinds().isEmpty() ? "" : (term.shown(workbench.get().shown()).label() + " " + term.basis().label()).strip();
        return new Word(term.name(), unit.isEmpty() ? term.doc() : term.doc() + " [" + unit + "]");
    }
}
