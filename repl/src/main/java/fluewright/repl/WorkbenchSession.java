package fluewright.repl;

import fluewright.engine.message.Detail;
import fluewright.engine.message.InputException;
import fluewright.repl.editor.Vocabulary;
import fluewright.repl.function.Workbench;
import fluewright.repl.language.Names;
import fluewright.repl.language.ResultSink;
import fluewright.repl.output.JsonLine;
import fluewright.repl.output.Printer;
import java.util.Collections;
import java.util.Map;
import java.util.ServiceConfigurationError;

/** The session of a workbench. The workbench is made at the first need, so that a prompt stands before it. */
final class WorkbenchSession implements Session {

    private final Options options;
    private final Output output;
    private volatile Map<?, ?> variables = Collections.emptyMap();
    private Workbench workbench;

    WorkbenchSession(Options options, Output output) {
        this.options = options;
        this.output = output;
    }

    private synchronized Workbench workbench() {
        if (workbench == null) {
            workbench = open();
        }
        return workbench;
    }

    /** A plugin that cannot be loaded ends a script; a person at the prompt is told and goes on without the plugins. */
    private Workbench open() {
        try {
            return new Workbench(PluginFolder.loader(options.plugins()), name -> variables.get(name));
        } catch (ServiceConfigurationError | LinkageError | InputException failure) {
            InputException refused = failure instanceof InputException known ? known : new InputException(ShellMessage.BAD_PLUGIN,
                    Detail.at(String.valueOf(options.plugins())).found(failure.getMessage()).expected("jars built against this version"), failure);
            if (!output.interactive() || options.plugins() == null) {
                throw refused;
            }
            refused.lines().forEach(output.err()::println);
            return new Workbench(PluginFolder.loader(null), name -> variables.get(name));
        }
    }

    @Override
    public Names names() {
        return new WorkbenchNames(this::workbench);
    }

    @Override
    public ResultSink sink() {
        Printer printer = new Printer(() -> workbench().shown());
        return options.json() ? new JsonSink(new JsonLine(() -> workbench().shown()), output) : new TextSink(printer, output);
    }

    @Override
    public void use(Map<?, ?> sessionVariables) {
        this.variables = sessionVariables;
    }

    @Override
    public Vocabulary vocabulary() {
        return new WorkbenchVocabulary(this::workbench, variables, new Printer(() -> workbench().shown()));
    }

    @Override
    public void warmUp() {
        WarmUp.completion(workbench());
    }
}
