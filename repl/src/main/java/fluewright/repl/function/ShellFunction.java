package fluewright.repl.function;

import java.util.List;
import java.util.Map;

/** A function of the shell's language. */
public interface ShellFunction {

    /** Returns the name it is called by. */
    String name();

    /** Returns one line saying what it does. */
    String title();

    /** Returns its arguments. */
    List<ArgumentDoc> arguments();

    /** Returns calls that work as they stand. */
    List<String> examples();

    /** Returns further help: results, sources, remarks. */
    default List<String> remarks() {
        return List.of();
    }

    /** Returns names that its open arguments may have, with a word about each, such as the components of a gas. */
    default Map<String, String> openNames() {
        return Map.of();
    }

    /** Tells whether its first unnamed value is a fuel, whose id completion offers. */
    default boolean takesFuel() {
        return false;
    }

    /** Tells whether its bare name alone is a call. */
    default boolean isCalledByName() {
        return false;
    }

    /**
     * Calls it.
     *
     * @param unnamed the unnamed values in order
     * @param named   the named ones; keys are texts, or objects where the function says so
     * @throws fluewright.engine.message.InputException when a value cannot be used
     */
    Object call(List<Object> unnamed, Map<Object, Object> named);
}
