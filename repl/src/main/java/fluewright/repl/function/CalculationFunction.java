package fluewright.repl.function;

import fluewright.engine.calculation.Declaration;
import fluewright.engine.calculation.Term;
import fluewright.engine.calculation.TermText;
import fluewright.engine.fuel.Fuel;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A calculation of the catalog as a function of the shell: everything follows from its declaration. */
final class CalculationFunction implements ShellFunction {

    private final Workbench workbench;
    private final Declaration<?, ?> declaration;

    CalculationFunction(Workbench workbench, String name) {
        this.workbench = workbench;
        this.declaration = workbench.catalog().declaration(name);
    }

    @Override
    public String name() {
        return declaration.name();
    }

    @Override
    public String title() {
        return declaration.title();
    }

    @Override
    public List<ArgumentDoc> arguments() {
        return declaration.input().terms().stream().map(term -> new ArgumentDoc(term.name(), TermText.expects(term), plainUnit(term), term.doc(),
                term.byDefault(), term.choices(), term.isOptional())).toList();
    }

    @Override
    public List<String> examples() {
        return declaration.example().isEmpty() ? List.of() : List.of(declaration.example());
    }

    @Override
    public List<String> remarks() {
        List<String> lines = new ArrayList<>();
        lines.add("gives");
        for (Term term : declaration.result().terms()) {
            lines.add(String.format("  %-20s %s%s", term.name(), term.doc(), unit(term)));
        }
        if (!declaration.sources().isEmpty()) {
            lines.add("by");
            declaration.sources().forEach(source -> lines.add("  " + source));
        }
        return lines;
    }

    private String plainUnit(Term term) {
        return term.kinds().isEmpty() || term.kind().isPure() ? "" : term.shown(workbench.shown()).symbol();
    }

    private String unit(Term term) {
        if (term.kinds().isEmpty() || term.kind().isPure()) {
            return "";
        }
        return " [" + (term.shown(workbench.shown()).label() + " " + term.basis().label()).strip() + "]";
    }

    @Override
    public boolean takesFuel() {
        return declaration.input().terms().stream().anyMatch(term -> term.type() == Fuel.class);
    }

    @Override
    public Object call(List<Object> unnamed, Map<Object, Object> named) {
        Map<String, Object> byName = new LinkedHashMap<>();
        named.forEach((name, value) -> byName.put(String.valueOf(name), plain(value)));
        return new ResultView(workbench.catalog().run(name(), unnamed.stream().map(CalculationFunction::plain).toList(), byName, workbench),
                workbench::shown);
    }

    private static Object plain(Object value) {
        return value instanceof CharSequence text ? text.toString() : value;
    }
}
