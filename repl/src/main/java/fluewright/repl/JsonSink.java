package fluewright.repl;

import fluewright.repl.language.ResultSink;
import fluewright.repl.output.JsonLine;

/** Prints results for programs: one JSON object a line. */
final class JsonSink implements ResultSink {

    private final JsonLine json;
    private final Output output;

    JsonSink(JsonLine json, Output output) {
        this.json = json;
        this.output = output;
    }

    @Override
    public void show(Object value) {
        output.out().println(json.of(value));
    }

    @Override
    public void note(String text) {
        output.err().println("note: " + text);
    }
}
