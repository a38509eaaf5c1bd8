package fluewright.repl.function;

import fluewright.engine.calculation.Catalog;
import fluewright.engine.calculation.Reading;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.fuel.FuelLibrary;
import fluewright.engine.message.InputException;
import fluewright.engine.quantity.UnitSystem;
import fluewright.fuels.FuelFile;
import java.nio.file.Path;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

/** What the functions of a session share: catalog, fuels, the units in use, and the functions themselves. */
public final class Workbench implements Reading {

    private final Catalog catalog;
    private final FuelLibrary fuels;
    private final Function<String, Object> variables;
    private final Map<String, ShellFunction> functions = new LinkedHashMap<>();
    private volatile UnitSystem shown = UnitSystem.SI;
    private volatile Optional<UnitSystem> bareNumbers = Optional.empty();

    /**
     * Makes the workbench of the calculations and fuels that a class loader provides.
     *
     * @param variables gives the session's variable of a name, or null
     */
    public Workbench(ClassLoader loader, Function<String, Object> variables) {
        this.catalog = Catalog.of(loader);
        this.fuels = FuelLibrary.of(loader);
        this.variables = variables;
        List.of(new FuelFunction(this), new FuelListFunction(this), new GasFunction(this), AnalysisFunction.liquid(this),
                AnalysisFunction.solid(this), new BlendFunction(this)).forEach(this::add);
        catalog.names().forEach(name -> add(new CalculationFunction(this, name)));
        add(new UnitsFunction(this));
        add(new HelpFunction(this));
    }

    private void add(ShellFunction function) {
        functions.put(function.name(), function);
    }

    /** Returns the calculations. */
    public Catalog catalog() {
        return catalog;
    }

    /** Returns the functions in the order of help. */
    public Collection<ShellFunction> functions() {
        return functions.values();
    }

    /** Returns the function of a name. */
    public Optional<ShellFunction> function(String name) {
        return Optional.ofNullable(functions.get(name));
    }

    /** Returns the ids of all fuels. */
    public Collection<String> fuelIds() {
        return fuels.ids();
    }

    /** Returns a fuel as it stands in lists; a file of the user's that cannot be read does not spoil the list. */
    public FuelEntry fuelEntry(String id) {
        try {
            Fuel fuel = fuels.get(id);
            return new FuelEntry(id, fuel.phase().label(), fuel.title());
        } catch (InputException unreadable) {
            return new FuelEntry(id, "", unreadable.getMessage());
        }
    }

    /** Returns the units that results are shown in. */
    public UnitSystem shown() {
        return shown;
    }

    /** Shows results, and reads bare numbers, in a unit system from here on. */
    void use(UnitSystem system) {
        this.shown = system;
        this.bareNumbers = Optional.of(system);
    }

    @Override
    public Optional<UnitSystem> bareNumbers() {
        return bareNumbers;
    }

    @Override
    public Optional<Object> read(Class<?> type, String text) {
        return type == Fuel.class ? Optional.of(fuel(text)) : Optional.empty();
    }

    /** Returns the fuel of an id, of a file, or of the session's variable of that name. */
    Fuel fuel(String text) {
        if (variables.apply(text) instanceof Fuel fuel) {
            return fuel;
        }
        boolean file = text.contains("/") || text.endsWith(".yaml") || text.endsWith(".yml");
        return file ? FuelFile.read(Path.of(text)) : fuels.get(text);
    }
}
