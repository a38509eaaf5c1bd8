package fluewright.engine.calculation;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import fluewright.engine.message.Notes;
import java.util.Collection;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.ServiceLoader;
import java.util.TreeMap;

/** The calculations by name: all that the class path and the plugins provide as services. */
public final class Catalog {

    private final Map<String, Calculation<?, ?>> calculations;

    private Catalog(Map<String, Calculation<?, ?>> calculations) {
        this.calculations = Collections.unmodifiableMap(calculations);
    }

    /**
     * Returns the catalog of the calculations that a class loader provides.
     *
     * @throws InputException when two have the same name
     */
    public static Catalog of(ClassLoader loader) {
        Map<String, Calculation<?, ?>> found = new TreeMap<>();
        for (Calculation<?, ?> calculation : ServiceLoader.load(Calculation.class, loader)) {
            Calculation<?, ?> other = found.put(calculation.declaration().name(), calculation);
            if (other != null) {
                throw new InputException(EngineMessage.DUPLICATE_CALCULATION, Detail.at(calculation.declaration().name())
                        .found(other.getClass().getName() + " and " + calculation.getClass().getName()).expected("one"));
            }
        }
        return new Catalog(found);
    }

    /** Returns the names, sorted. */
    public Collection<String> names() {
        return calculations.keySet();
    }

    /** Tells whether a calculation has this name. */
    public boolean has(String name) {
        return calculations.containsKey(name);
    }

    /**
     * Returns the declaration of a calculation.
     *
     * @throws InputException when there is none of this name
     */
    public Declaration<?, ?> declaration(String name) {
        return calculation(name).declaration();
    }

    /**
     * Runs a calculation on a caller's values.
     *
     * @param name    its name
     * @param unnamed values for the inputs that are no numbers, in order
     * @param named   values by argument: quantities, numbers, texts, objects
     * @param reading how values are read where the declaration does not say it
     * @throws InputException when a value cannot be used
     */
    public Outcome run(String name, List<?> unnamed, Map<String, ?> named, Reading reading) {
        return run(calculation(name), unnamed, named, reading);
    }

    private static <I extends Record, R extends Record> Outcome run(Calculation<I, R> calculation, List<?> unnamed,
                                                                    Map<String, ?> named, Reading reading) {
        Declaration<I, R> declaration = calculation.declaration();
        Notes notes = new Notes();
        List<Object> values = new Arguments(declaration, reading, notes).values(unnamed, named);
        I input = declaration.input().make(values.iterator());
        R result = calculation.calculate(input, notes);
        if (declaration.isSetting()) {
            notes.caution(EngineMessage.SETTING_CAUTION, Detail.NONE);
        }
        return new Outcome(declaration, input, result, notes.list());
    }

    private Calculation<?, ?> calculation(String name) {
        Calculation<?, ?> calculation = calculations.get(name);
        if (calculation == null) {
            throw new InputException(EngineMessage.UNKNOWN_CALCULATION, Detail.at("catalog").found(name)
                    .expected("one of " + String.join(", ", names())).nearest(NearestName.of(name, names())));
        }
        return calculation;
    }
}
