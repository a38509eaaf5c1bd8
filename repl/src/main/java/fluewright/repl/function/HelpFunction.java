package fluewright.repl.function;

import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.NearestName;
import fluewright.engine.quantity.Units;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** {@code help}: the functions, one of them, or all help that holds a word. */
final class HelpFunction implements ShellFunction {

    private final Workbench workbench;

    HelpFunction(Workbench workbench) {
        this.workbench = workbench;
    }

    @Override
    public String name() {
        return "help";
    }

    @Override
    public String title() {
        return "the functions; help losses: one of them; help 'dew': all help that holds a word";
    }

    @Override
    public List<ArgumentDoc> arguments() {
        return List.of();
    }

    @Override
    public List<String> examples() {
        return List.of("help", "help 'losses'", "help 'dew'");
    }

    @Override
    public boolean isCalledByName() {
        return true;
    }

    @Override
    public Object call(List<Object> unnamed, Map<Object, Object> named) {
        Unnamed.noNames(name(), named);
        Unnamed.atMost(name(), unnamed, 1);
        if (unnamed.isEmpty()) {
            return overview();
        }
        if (unnamed.get(0) instanceof FunctionHandle handle) {
            return page(handle.function());
        }
        String word = unnamed.get(0).toString();
        return workbench.function(word).map(HelpFunction::page).orElseGet(() -> search(word));
    }

    private HelpText overview() {
        List<String> lines = new ArrayList<>();
        lines.add("functions");
        workbench.functions().forEach(function -> lines.add(entry(function)));
        lines.add("");
        lines.add("A number carries its unit: 3.pct 180.degC 45.4.MJ/kg. A result answers its rows by name: _.lambda");
        lines.add("help losses shows one function; help 'dew' searches; Tab completes; Ctrl-C stops; Ctrl-D leaves.");
        lines.add("");
        lines.add("Caution: " + EngineMessage.SETTING_CAUTION.sentence() + ".");
        return new HelpText(lines);
    }

    private static String entry(ShellFunction function) {
        return String.format("  %-12s %s", function.name(), function.title());
    }

    static HelpText page(ShellFunction function) {
        List<String> lines = new ArrayList<>();
        lines.add(function.name() + ": " + function.title());
        function.examples().forEach(example -> lines.add("  " + example));
        if (!function.arguments().isEmpty()) {
            lines.add("arguments");
            function.arguments().forEach(argument -> addArgument(lines, argument));
        }
        lines.addAll(function.remarks());
        return new HelpText(lines);
    }

    private static void addArgument(List<String> lines, ArgumentDoc argument) {
        String needed = argument.optional() ? "" : " (needed)";
        String byDefault = argument.byDefault().isEmpty() ? "" : "; default " + argument.byDefault();
        lines.add(String.format("  %-16s %s%s", argument.name(), argument.doc(), needed));
        lines.add(String.format("  %-16s   %s%s", "", argument.expects(), byDefault));
    }

    private HelpText search(String word) {
        String folded = word.toLowerCase(Locale.ROOT);
        List<String> lines = new ArrayList<>();
        for (ShellFunction function : workbench.functions()) {
            List<String> found = page(function).lines().stream().filter(line -> line.toLowerCase(Locale.ROOT).contains(folded)).toList();
            if (!found.isEmpty()) {
                lines.add(function.name());
                found.forEach(line -> lines.add("  " + line.strip()));
            }
        }
        List<String> units = Units.docs().entrySet().stream().map(unit -> unit.getKey() + "  " + unit.getValue())
                .filter(line -> line.toLowerCase(Locale.ROOT).contains(folded)).toList();
        if (!units.isEmpty()) {
            lines.add("units");
            units.forEach(unit -> lines.add("  " + unit));
        }
        return lines.isEmpty() ? nothing(word) : new HelpText(lines);
    }

    private HelpText nothing(String word) {
        String nearest = NearestName.of(word, workbench.functions().stream().map(ShellFunction::name).toList());
        return new HelpText(List.of("no help holds '" + word + "'" + (nearest.isEmpty() ? "" : "; nearest: " + nearest)));
    }
}
