package fluewright.repl;

import fluewright.engine.quantity.Units;
import fluewright.engine.quantity.Value;
import fluewright.repl.function.FunctionHandle;
import fluewright.repl.function.ShellFunction;
import fluewright.repl.function.Workbench;
import fluewright.repl.language.Names;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Supplier;

/**
 * The names of the language: functions, units (so that {@code 45.4.MJ/kg} works) and the words that arguments take (so
 * that {@code by: volume} needs no quotes). The user's variables go before them, except for function calls.
 */
final class WorkbenchNames implements Names {

    private static final Set<String> UNIT_SYSTEMS = Set.of("si", "us");

    private final Supplier<Workbench> workbench;

    WorkbenchNames(Supplier<Workbench> workbench) {
        this.workbench = workbench;
    }

    @Override
    public Object resolve(String name) {
        ShellFunction function = workbench.get().function(name).orElse(null);
        if (function != null) {
            return new FunctionHandle(function);
        }
        if (Units.isUnit(name)) {
            return Value.of(1, name);
        }
        return UNIT_SYSTEMS.contains(name) || isChoice(name) ? name : null;
    }

    private boolean isChoice(String word) {
        return workbench.get().functions().stream().flatMap(function -> function.arguments().stream())
                .anyMatch(argument -> argument.choices().contains(word));
    }

    @Override
    public boolean isFunction(String name) {
        return workbench.get().function(name).isPresent();
    }

    @Override
    public Object call(String name, Object[] arguments) {
        ShellFunction function = workbench.get().function(name).orElseThrow();
        boolean hasNamed = arguments.length > 0 && arguments[0] instanceof Map;
        Map<Object, Object> named = new LinkedHashMap<>();
        if (hasNamed) {
            ((Map<?, ?>) arguments[0]).forEach((key, value) -> named.put(key instanceof CharSequence ? key.toString() : key, value));
        }
        List<Object> unnamed = new ArrayList<>(Arrays.asList(arguments).subList(hasNamed ? 1 : 0, arguments.length));
        return function.call(unnamed, named);
    }

    @Override
    public void prepare() {
        try {
            WarmUp.firstResult(workbench.get());
        } catch (RuntimeException | LinkageError toldWhenUsed) {
            // The text that needs it meets the same failure and tells it.
        }
    }

    @Override
    public Collection<String> known() {
        return workbench.get().functions().stream().map(ShellFunction::name).toList();
    }
}
