package fluewright.repl;

import fluewright.repl.editor.Vocabulary;
import fluewright.repl.language.ErrorPrinter;
import fluewright.repl.language.Evaluator;
import fluewright.repl.language.Names;
import fluewright.repl.language.PlainErrors;
import fluewright.repl.language.ResultSink;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;

/** A session together with the evaluator that serves it. */
final class Workspace {
    private final Session session;
    private final Evaluator evaluator;
    private Vocabulary vocabulary;

    private Workspace(Options options, Output output) {
        session = Session.open(options, output);
        Names names = session.names();
        evaluator = new Evaluator(names, session.sink(), errors(names, output), output.interactive());
        evaluator.whenReady(variables -> {
            variables.setVariable("args", options.arguments().toArray(String[]::new));
            session.use(variables.getVariables());
        });
    }

    static Workspace open(Options options, Output output) {
        return new Workspace(options, output);
    }

    private ErrorPrinter errors(Names names, Output output) {
        return new PlainErrors(() -> allNames(names), lines -> tell(output, lines));
    }

    private Collection<String> allNames(Names names) {
        List<String> all = new ArrayList<>(names.known());
        Map<?, ?> variables = evaluator.variables().getVariables();
        variables.keySet().forEach(name -> all.add(name.toString()));
        return all;
    }

    private static void tell(Output output, List<String> lines) {
        output.out().flush();
        for (int at = 0; at < lines.size(); at++) {
            output.err().println(at == 0 && output.interactive() ? "error: " + lines.get(at) : lines.get(at));
        }
    }

    /** Loads behind the prompt what the first evaluation needs. */
    void warmUp() {
        ResultSink silent = value -> { };
        new Evaluator(session.names(), silent, (failure, source) -> { }, true)
            .evaluate("warm-up", "warm = [1, 2.5].collect { it * 2 }; warm.sum()");
        session.warmUp();
    }

    Evaluator evaluator() {
        return evaluator;
    }

    /** Made at the first call, for only the prompt needs it. */
    synchronized Vocabulary vocabulary() {
        if (vocabulary == null) {
            session.use(evaluator.variables().getVariables());
            vocabulary = session.vocabulary();
        }
        return vocabulary;
    }
}
