package fluewright.repl;

import fluewright.repl.editor.Vocabulary;
import fluewright.repl.language.Names;
import fluewright.repl.language.ResultSink;
import java.util.Map;

/** What the shell is about: its names, how its results look and what the editor can complete. */
public interface Session {
    Names names();

    ResultSink sink();

    /** @param variables the user's variables, as they change */
    Vocabulary vocabulary(Map<?, ?> variables);

    /** Loads what a first evaluation would wait for; runs behind the prompt. */
    default void warmUp() {
    }

    /** The session that the options ask for. */
    static Session open(Options options, Output output) {
        return new WorkbenchSession(options, output);
    }
}
