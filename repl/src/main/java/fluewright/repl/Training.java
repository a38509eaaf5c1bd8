package fluewright.repl;

import fluewright.repl.editor.Terminals;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PipedInputStream;
import java.io.PipedOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.jline.terminal.Attributes;
import org.jline.terminal.Terminal;

/**
 * Run once at the end of a build, while the virtual machine records which classes are used, so that
 * the archive it writes holds those of the prompt, of completion and of an evaluation.
 */
public final class Training {
    private static final List<String> KEYS = List.of("x = [1, 2.5].collect { it * 2 }.sum()\r", "x.\t\u0003", "pr\t\u0003", "bu\t\u0003", "losses 'natural-gas', \t\u0003", "3.d\t\u0003", "fuel 'na\t\u0003",
        "ng = fuel 'natural-gas'\r", "burn ng, excessAir: 15.pct, humidity: 60.pct\r", "_.dry.CO2 - 9.pct\r", "help losses\r",
        "f = { a -> a + 1 }\r", "f(x) / 3\r", "nowhere\r", "1 +* 2\r", "'text'\r", "\u0010\r", "(1 +\r", "2)\r");
    private static final String END = "\u0003\u0004";
    private static final int PAUSE_MILLIS = 120;
    private static final int LONGEST_MILLIS = 60_000;

    private Training() {
    }

    /** @param arguments a folder for the files of the trial run */
    public static void main(String[] arguments) throws Exception {
        Path home = Files.createTempDirectory(Path.of(arguments[0]), "training");
        System.setProperty("fluewright.home", home.toString());
        PrintStream quiet = new PrintStream(OutputStream.nullOutputStream(), true, StandardCharsets.UTF_8);
        inBackground(Training::endLate);
        batch(quiet);
        shell(quiet);
        nativeTerminal();
        // The command's own way in and out, with the classes that nothing else touches.
        Main.main(new String[] {"--version"});
    }

    private static void batch(PrintStream quiet) throws Options.Unusable {
        Output output = new Output(quiet, quiet, false, false);
        for (String text : List.of("1 + 1", "[1, 2].sum()", "nowhere", "def twice(a) { a * 2 }; twice 3.5",
                "losses fuel('natural-gas'), o2: 3.pct, stack: 180.degC, air: 20.degC", "losses fuel('no-2-oil'), o2: 3, stack: 350.degF",
                "correct nox: 45.ppm, at: 5.2.pct, to: 3.pct, fuel: 'propane'", "gas CH4: 91.2.pct, C2H6: 5.pct, N2: 3.8.pct, hhv: 38.MJ/Sm3")) {
            new Batch(Options.parse("-e", text), output).run();
            new Batch(Options.parse("--json", "-e", text), output).run();
        }
    }

    private static void shell(PrintStream quiet) throws IOException, Options.Unusable {
        PipedOutputStream keys = new PipedOutputStream();
        InputStream in = new PipedInputStream(keys, 4096);
        try (Terminal terminal = Terminals.ofStreams(in, OutputStream.nullOutputStream())) {
            inBackground(() -> type(keys));
            new Interactive(Options.parse(), new Output(quiet, quiet, true, true)).run(terminal);
        }
    }

    /** The classes of a real terminal, if the build runs the training in one. */
    private static void nativeTerminal() throws IOException {
        try (Terminal terminal = Terminals.ofProcess(false)) {
            terminal.handle(Terminal.Signal.INT, Terminal.SignalHandler.SIG_IGN);
            Attributes before = terminal.enterRawMode();
            terminal.reader().peek(1);
            terminal.setAttributes(before);
        }
    }

    /** Types slowly, for a key that arrives during an evaluation is not the editor's. */
    private static void type(OutputStream keys) {
        try {
            for (int at = 0; ; at++) {
                Thread.sleep(PAUSE_MILLIS);
                keys.write((at < KEYS.size() ? KEYS.get(at) : END).getBytes(StandardCharsets.UTF_8));
                keys.flush();
            }
        } catch (IOException | InterruptedException shellEnded) {
            // Nobody reads any more.
        }
    }

    private static void endLate() {
        try {
            Thread.sleep(LONGEST_MILLIS);
            Runtime.getRuntime().halt(1);
        } catch (InterruptedException unexpected) {
            Thread.currentThread().interrupt();
        }
    }

    private static void inBackground(Runnable work) {
        Thread thread = new Thread(work);
        thread.setDaemon(true);
        thread.start();
    }
}
