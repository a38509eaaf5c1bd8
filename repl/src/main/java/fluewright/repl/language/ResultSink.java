package fluewright.repl.language;

/** Takes what an evaluation has to tell. */
public interface ResultSink {
    /** The value of one statement, as soon as it is computed; never null. */
    void show(Object value);

    /** The input ended with an assignment; only told in the interactive shell. */
    default void assigned(String name, Object value) {
    }

    /** A remark that is neither result nor failure. */
    default void note(String text) {
    }
}
