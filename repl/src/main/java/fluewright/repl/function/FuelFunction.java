package fluewright.repl.function;

import fluewright.engine.fuel.Fuel;
import java.util.List;
import java.util.Map;

/** {@code fuel 'natural-gas'}: the fuel of an id or of a file. */
final class FuelFunction implements ShellFunction {

    private final Workbench workbench;

    FuelFunction(Workbench workbench) {
        this.workbench = workbench;
    }

    @Override
    public String name() {
        return "fuel";
    }

    @Override
    public String title() {
        return "a fuel by its id, or by the path of its file";
    }

    @Override
    public List<ArgumentDoc> arguments() {
        return List.of();
    }

    @Override
    public List<String> examples() {
        return List.of("fuel 'natural-gas'");
    }

    @Override
    public boolean takesFuel() {
        return true;
    }

    @Override
    public Object call(List<Object> unnamed, Map<Object, Object> named) {
        Unnamed.noNames(name(), named);
        Object given = Unnamed.one(name(), unnamed, "the id of a fuel, such as 'natural-gas'");
        return given instanceof Fuel ? given : workbench.fuel(given.toString());
    }
}
