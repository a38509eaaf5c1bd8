package fluewright.repl.editor;

import java.util.List;

/** What the editor can complete and colour. Every answer must come at once. */
public interface Vocabulary {
    /** A word with a line about it. */
    record Word(String text, String about) {
    }

    /**
     * A named argument of a function.
     *
     * @param unit   the unit of a plain number, or empty
     * @param values what it may be, if that is a short list of words; else empty
     */
    record Argument(String name, String unit, String about, List<String> values) {
    }

    default List<Word> functions() {
        return List.of();
    }

    default boolean isFunction(String name) {
        return false;
    }

    default List<Argument> arguments(String function) {
        return List.of();
    }

    default List<Word> variableWords() {
        return List.of();
    }

    /** Units that can follow a number and a dot. */
    default List<Word> units() {
        return List.of();
    }

    /** Units that can follow a number given to an argument; empty where nothing is known of it. */
    default List<Word> units(String function, String argument) {
        return List.of();
    }

    /** Texts for the first positional string of a function, such as names of fuels. */
    default List<Word> texts(String function) {
        return List.of();
    }

    /** What can follow a variable, or a path such as {@code result.products}, and a dot. */
    default List<Word> members(String path) {
        return List.of();
    }
}
