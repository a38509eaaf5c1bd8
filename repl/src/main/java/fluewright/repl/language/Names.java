package fluewright.repl.language;

import java.util.Collection;

/** The names that the shell knows besides the user's own variables. */
public interface Names {
    /** The value behind a name, or null if the name is unknown. */
    Object resolve(String name);

    /** Whether the name can be called like a function. */
    boolean isFunction(String name);

    /** Calls a function; named arguments come first, as one map. */
    Object call(String name, Object[] arguments);

    /** Does what a first call will need; called on another thread while a text is compiled. */
    default void prepare() {
    }

    /** Every known name, for suggestions. */
    Collection<String> known();
}
