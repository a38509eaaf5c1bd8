package fluewright.repl;

import fluewright.repl.language.ResultSink;
import fluewright.repl.output.Printer;

/** Prints results for people. */
final class TextSink implements ResultSink {

    private final Printer printer;
    private final Output output;

    TextSink(Printer printer, Output output) {
        this.printer = printer;
        this.output = output;
    }

    @Override
    public void show(Object value) {
        printer.lines(value, output.width().getAsInt()).forEach(output.out()::println);
    }

    @Override
    public void assigned(String name, Object value) {
        show(name + " = " + printer.oneLine(value));
    }

    @Override
    public void note(String text) {
        output.err().println("note: " + text);
    }
}
