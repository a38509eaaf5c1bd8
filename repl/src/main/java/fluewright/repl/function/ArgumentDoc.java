package fluewright.repl.function;

import java.util.List;

/**
 * An argument of a function of the shell, for help and completion.
 *
 * @param name      its name
 * @param expects   what it takes, with units
 * @param unit      the unit of a plain number, empty when it takes none
 * @param doc       one line saying what it is
 * @param byDefault its default, empty when there is none
 * @param choices   the words it may have, empty when it is no choice
 * @param optional  whether it may be left out
 */
public record ArgumentDoc(String name, String expects, String unit, String doc, String byDefault, List<String> choices, boolean optional) {

    /** Returns an optional argument without default or choices. */
    static ArgumentDoc optional(String name, String expects, String doc) {
        return new ArgumentDoc(name, expects, "", doc, "", List.of(), true);
    }

    /** Returns an argument that takes one of some words. */
    static ArgumentDoc choice(String name, String doc, String byDefault, List<String> choices) {
        return new ArgumentDoc(name, "one of " + String.join(", ", choices), "", doc, byDefault, choices, true);
    }
}
