package fluewright.repl.function;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.quantity.UnitSystem;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** {@code units us}: the unit system in which results are shown and bare numbers are read. */
final class UnitsFunction implements ShellFunction {

    private final Workbench workbench;

    UnitsFunction(Workbench workbench) {
        this.workbench = workbench;
    }

    @Override
    public String name() {
        return "units";
    }

    @Override
    public String title() {
        return "shows results, and reads bare numbers, in a unit system: si or us";
    }

    @Override
    public List<ArgumentDoc> arguments() {
        return List.of();
    }

    @Override
    public List<String> examples() {
        return List.of("units us", "units si");
    }

    @Override
    public Object call(List<Object> unnamed, Map<Object, Object> named) {
        Unnamed.noNames(name(), named);
        String word = Unnamed.one(name(), unnamed, "si or us").toString().toUpperCase(Locale.ROOT);
        for (UnitSystem system : UnitSystem.values()) {
            if (system.name().equals(word)) {
                workbench.use(system);
                return "results are shown and bare numbers read in " + system.name() + " units";
            }
        }
        throw new InputException(EngineMessage.WRONG_TYPE, Detail.at("units").found(unnamed.get(0)).expected("si or us"));
    }
}
