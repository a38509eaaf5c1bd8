package fluewright.support;

import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;

import fluewright.engine.calculation.Catalog;
import fluewright.engine.calculation.Outcome;
import fluewright.engine.calculation.Reading;
import fluewright.engine.fuel.Fuel;
import fluewright.engine.message.InputException;
import fluewright.engine.message.Message;
import fluewright.engine.quantity.UnitSystem;
import fluewright.engine.quantity.Value;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Short ways to run the catalog's calculations and to read their results. */
public final class Bench {

    /** The catalog of all calculations on the class path. */
    public static final Catalog CATALOG = Catalog.of(Bench.class.getClassLoader());

    /** Reads no bare numbers and no names of fuels. */
    private static final Reading STRICT = new Reading() {
        @Override
        public Optional<UnitSystem> bareNumbers() {
            return Optional.empty();
        }

        @Override
        public Optional<Object> read(Class<?> type, String text) {
            return Optional.empty();
        }
    };

    private Bench() {
    }

    /** Runs a calculation on a fuel; the rest are names and values by turns: {@code "o2", "3 %"}. */
    public static Outcome run(String calculation, Fuel fuel, Object... named) {
        return CATALOG.run(calculation, List.of(fuel), arguments(named), STRICT);
    }

    /** Runs a calculation without a fuel. */
    public static Outcome run(String calculation, Object... named) {
        return CATALOG.run(calculation, List.of(), arguments(named), STRICT);
    }

    /** Runs a calculation on unnamed values. */
    public static Outcome runOn(String calculation, List<?> unnamed, Object... named) {
        return CATALOG.run(calculation, unnamed, arguments(named), STRICT);
    }

    private static Map<String, Object> arguments(Object... named) {
        Map<String, Object> arguments = new LinkedHashMap<>();
        for (int i = 0; i < named.length; i += 2) {
            arguments.put((String) named[i], named[i + 1]);
        }
        return arguments;
    }

    /** Returns a number of a result in a unit. */
    public static double in(String unit, Outcome outcome, String component) {
        return ((Value<?>) outcome.get(component)).to(unit).number();
    }

    /** Returns a number of a result in coherent SI units. */
    public static double si(Outcome outcome, String component) {
        return ((Value<?>) outcome.get(component)).si();
    }

    /** Returns a share of a composition in percent, zero when it is not there. */
    public static double percent(Outcome outcome, String composition, String species) {
        Object part = ((Map<?, ?>) outcome.get(composition)).get(species);
        return part instanceof Value<?> value ? value.to("pct").number() : 0;
    }

    /** Returns the exception of an input that must be refused for this reason. */
    public static InputException refused(Message reason, Runnable run) {
        InputException refusal = assertThrows(InputException.class, run::run);
        assertSame(reason, refusal.reason(), refusal::getMessage);
        return refusal;
    }
}
