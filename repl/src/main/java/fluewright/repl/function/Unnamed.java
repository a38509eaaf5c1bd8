package fluewright.repl.function;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import java.util.List;
import java.util.Map;

/** Checks the unnamed values of a call. */
final class Unnamed {

    private Unnamed() {
    }

    /** Returns the only value. */
    static Object one(String function, List<Object> values, String expected) {
        if (values.isEmpty()) {
            throw new InputException(EngineMessage.ARGUMENT_MISSING, Detail.at(function).found("nothing").expected(expected));
        }
        atMost(function, values, 1);
        return values.get(0);
    }

    /** Refuses more values than a function takes. */
    static void atMost(String function, List<Object> values, int most) {
        if (values.size() > most) {
            throw new InputException(EngineMessage.TOO_MANY_VALUES,
                    Detail.at(function).found(values.get(most)).expected("at most " + most));
        }
    }

    /** Refuses named values where a function takes none. */
    static void noNames(String function, Map<Object, Object> named) {
        if (!named.isEmpty()) {
            throw new InputException(EngineMessage.UNKNOWN_ARGUMENT,
                    Detail.at(function).found(named.keySet().iterator().next()).expected("no named arguments"));
        }
    }
}
