package fluewright.repl;

import fluewright.repl.editor.Vocabulary;
import fluewright.repl.language.Names;
import fluewright.repl.language.ResultSink;
import java.util.Map;

/** What the shell is about: its names, how its results look and what the editor can complete. */
public interface Session {
    Names names();

    ResultSink sink();

    /** Tells the session of the user's variables, before the first evaluation uses them; the map changes with them. */
    void use(Map<?, ?> variables);

    /** Returns what the editor can complete and colour. */
    Vocabulary vocabulary();

    /** Loads what a first evaluation would wait for; runs behind the prompt. */
    default void warmUp() {
    }

    /** The session that the options ask for. */
    static Session open(Options options, Output output) {
        return new WorkbenchSession(options, output);
    }
}
