package fluewright.repl;

import fluewright.repl.editor.Vocabulary;
import fluewright.repl.language.Names;
import fluewright.repl.language.ResultSink;
import java.util.Collection;
import java.util.List;
import java.util.Map;

/** A session with Groovy only. */
final class PlainSession implements Session {
    private final Output output;

    PlainSession(Output output) {
        this.output = output;
    }

    @Override
    public Names names() {
        return new NoNames();
    }

    @Override
    public ResultSink sink() {
        return new Lines(output);
    }

    @Override
    public Vocabulary vocabulary(Map<?, ?> variables) {
        return new VariableWords(variables);
    }

    private record Lines(Output output) implements ResultSink {
        @Override
        public void show(Object value) {
            output.out().println(value);
        }

        @Override
        public void assigned(String name, Object value) {
            if (output.interactive()) {
                output.out().println(name + " = " + value);
            }
        }

        @Override
        public void note(String text) {
            output.err().println("note: " + text);
        }
    }

    private static final class NoNames implements Names {
        @Override
        public Object resolve(String name) {
            return null;
        }

        @Override
        public boolean isFunction(String name) {
            return false;
        }

        @Override
        public Object call(String name, Object[] arguments) {
            throw new IllegalArgumentException("no function " + name);
        }

        @Override
        public Collection<String> known() {
            return List.of();
        }
    }

    private record VariableWords(Map<?, ?> variables) implements Vocabulary {
        @Override
        public List<Word> variableWords() {
            return variables.entrySet().stream()
                .map(entry -> new Word(entry.getKey().toString(), String.valueOf(entry.getValue()))).toList();
        }
    }
}
