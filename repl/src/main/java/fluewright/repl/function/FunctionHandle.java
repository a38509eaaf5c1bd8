package fluewright.repl.function;

import java.util.List;
import java.util.Map;

/**
 * A function named without being called: what {@code help losses} passes on. Shown, it gives the function's help, or its
 * result when its name alone is a call.
 *
 * @param function the function
 */
public record FunctionHandle(ShellFunction function) {

    /** Returns what is shown when the name stands alone. */
    public Object shown() {
        return function.isCalledByName() ? function.call(List.of(), Map.of()) : HelpFunction.page(function);
    }

    @Override
    public String toString() {
        return function.name();
    }
}
