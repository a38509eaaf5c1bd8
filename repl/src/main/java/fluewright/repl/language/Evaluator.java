package fluewright.repl.language;

import groovy.lang.Script;
import java.util.Queue;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Consumer;
import org.codehaus.groovy.runtime.InvokerHelper;

/**
 * Evaluates texts one after the other with the same variables. Each runs on a thread of its own
 * and can be interrupted from another.
 */
public final class Evaluator {
    private final Names names;
    private final ResultSink sink;
    private final ErrorPrinter errors;
    private final FutureTask<ShellBinding> binding;
    private final ScriptCompiler compiler;
    private final Interruptible thread = new Interruptible();
    private final Queue<Consumer<ShellBinding>> preparations = new ConcurrentLinkedQueue<>();
    private final AtomicInteger count = new AtomicInteger();
    private volatile Outcome outcome = Outcome.DONE;

    /** @param acknowledge whether the sink is told of an assignment that ends an input */
    public Evaluator(Names names, ResultSink sink, ErrorPrinter errors, boolean acknowledge) {
        this.names = names;
        this.sink = sink;
        this.errors = errors;
        binding = new FutureTask<>(() -> new ShellBinding(names, sink));
        Preload.start(binding, names::prepare);
        compiler = new ScriptCompiler(names, acknowledge);
    }

    public ShellBinding variables() {
        try {
            return binding.get();
        } catch (InterruptedException stopped) {
            Thread.currentThread().interrupt();
            throw new CancellationException("stopped");
        } catch (ExecutionException failure) {
            throw new IllegalStateException(failure.getCause());
        }
    }

    /** Prepares the variables, before the first evaluation uses them. */
    public void whenReady(Consumer<ShellBinding> preparation) {
        preparations.add(preparation);
    }

    /** Evaluates the text; its results go to the sink, its failure to the error printer. */
    public Outcome evaluate(String title, String text) {
        SourceText source = new SourceText(title, "Input" + count.incrementAndGet() + ".groovy", text);
        outcome = Outcome.STOPPED;
        try {
            Outcome end = thread.run(() -> outcome = attempt(source));
            return end == Outcome.DONE ? outcome : end;
        } catch (InterruptedException shellEnds) {
            Thread.currentThread().interrupt();
            return Outcome.STOPPED;
        }
    }

    /** Ends the running evaluation, if there is one. */
    public void interrupt() {
        thread.interrupt();
    }

    private Outcome attempt(SourceText source) {
        try {
            run(source);
            return Outcome.DONE;
        } catch (ThreadDeath end) {
            throw end;
        } catch (Throwable failure) {
            if (!thread.isInterrupted()) {
                errors.print(failure, source);
            }
            return Outcome.FAILED;
        }
    }

    private void run(SourceText source) {
        Class<?> compiled = compiler.compile(source);
        if (compiled == null) {
            return;
        }
        ShellBinding variables = prepared(variables());
        Script script = InvokerHelper.createScript(compiled, variables);
        if (script instanceof ShellScript shellScript) {
            shellScript.connect(names, sink);
            compiler.declaredMethods(compiled)
                .forEach(name -> variables.setVariable(name, InvokerHelper.getMethodPointer(script, name)));
        }
        script.run();
    }

    private ShellBinding prepared(ShellBinding variables) {
        for (Consumer<ShellBinding> next = preparations.poll(); next != null; next = preparations.poll()) {
            next.accept(variables);
        }
        return variables;
    }
}
