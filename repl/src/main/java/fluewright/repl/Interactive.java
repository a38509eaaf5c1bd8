package fluewright.repl;

import fluewright.repl.editor.Editor;
import fluewright.repl.editor.Terminals;
import fluewright.repl.editor.Vocabulary;
import fluewright.repl.language.Outcome;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Set;
import java.util.concurrent.CompletableFuture;
import org.jline.terminal.Terminal;

/** The shell at a terminal: reads an input, evaluates it, and so on until the end. */
final class Interactive {
    private static final Vocabulary NOTHING_YET = new Vocabulary() { };
    private static final Set<String> LEAVE = Set.of("exit", "quit");

    private final Options options;
    private final Output output;
    private final CompletableFuture<Workspace> workspace = new CompletableFuture<>();

    Interactive(Options options, Output output) {
        this.options = options;
        this.output = output;
    }

    int run() {
        try (Terminal terminal = Terminals.ofProcess(Output.isDumb())) {
            return run(terminal);
        } catch (IOException noTerminal) {
            output.err().println("fluewright: cannot use the terminal: " + noTerminal.getMessage());
            return Main.FAILED;
        }
    }

    int run(Terminal terminal) {
        terminal.handle(Terminal.Signal.INT, signal -> interrupt());
        Editor editor = new Editor(terminal, this::vocabulary, historyFile(), output.colour(), this::warn);
        terminal.writer().print("Fluewright " + Main.version() + ", combustion stoichiometry\n"
            + "Tab completes, Ctrl-C stops, Ctrl-D leaves\n");
        startBehind(editor, terminal);
        for (String input = editor.read(); input != null && !leaves(input); input = editor.read()) {
            evaluate(input);
        }
        return 0;
    }

    /** A terminal that does not tell its width is taken to be as wide as most. */
    private static int columns(Terminal terminal) {
        int columns = terminal.getSize().getColumns();
        return columns > 0 ? columns : 80;
    }

    /** In the folder that HOME names; Java's own idea of a home ignores HOME. */
    private static Path historyFile() {
        String home = System.getenv("HOME");
        String usual = home == null || home.isEmpty() ? System.getProperty("user.home") : home;
        return Path.of(System.getProperty("fluewright.home", usual), ".fluewright", "history");
    }

    private void warn(String text) {
        output.err().println("warning: " + text);
    }

    private void startBehind(Editor editor, Terminal terminal) {
        Thread start = new Thread(() -> open(editor, terminal), "warm-up");
        start.setDaemon(true);
        start.start();
    }

    /** Waits for the prompt first: until it stands, everything else would only delay it. */
    private void open(Editor editor, Terminal terminal) {
        try {
            while (!editor.isReading()) {
                Thread.sleep(5);
            }
            Thread.sleep(10);
            Terminals.listen(terminal);
            Workspace opened = Workspace.open(options, output.within(() -> columns(terminal)));
            workspace.complete(opened);
            opened.warmUp();
        } catch (InterruptedException | RuntimeException | Error failure) {
            workspace.completeExceptionally(failure);
        }
    }

    private Vocabulary vocabulary() {
        boolean ready = workspace.isDone() && !workspace.isCompletedExceptionally();
        return ready ? workspace.join().vocabulary() : NOTHING_YET;
    }

    private void interrupt() {
        if (workspace.isDone() && !workspace.isCompletedExceptionally()) {
            workspace.join().evaluator().interrupt();
        }
    }

    private boolean leaves(String input) {
        return LEAVE.contains(input.strip());
    }

    private void evaluate(String input) {
        if (input.isBlank()) {
            return;
        }
        Outcome outcome = workspace.join().evaluator().evaluate("input", input);
        if (outcome == Outcome.STOPPED) {
            output.out().println("\nstopped");
        } else if (outcome == Outcome.ABANDONED) {
            output.out().println("\nit does not stop; it goes on in the background");
        }
    }
}
