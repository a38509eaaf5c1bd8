package fluewright.repl.editor;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import org.jline.terminal.Size;
import org.jline.terminal.Terminal;
import org.jline.terminal.TerminalBuilder;
import org.jline.terminal.impl.ExternalTerminal;
import org.jline.utils.InfoCmp;
import org.jline.utils.Signals;

/** Opens terminals without asking them questions, for every question costs a wait for the answer. */
public final class Terminals {
    private static final int COLUMNS = 80;
    private static final int ROWS = 24;

    private Terminals() {
    }

    /** The terminal that this process runs in. */
    public static Terminal ofProcess(boolean dumb) throws IOException {
        useBuiltInDescription(System.getenv("TERM"));
        Terminal terminal = TerminalBuilder.builder().name("fluewright").provider(TerminalBuilder.PROP_PROVIDER_JNI)
            .encoding(StandardCharsets.UTF_8).graphemeCluster(false).dumb(true).system(true).type(dumb ? Terminal.TYPE_DUMB : null)
            .nativeSignals(false).signalHandler(Terminal.SignalHandler.SIG_IGN).build();
        return sized(terminal);
    }

    /** Passes the process's signals on. Not done by opening, because it can wait until the prompt stands. */
    public static void listen(Terminal terminal) {
        for (Terminal.Signal signal : new Terminal.Signal[] {Terminal.Signal.INT, Terminal.Signal.WINCH, Terminal.Signal.CONT}) {
            Signals.register(signal.name(), () -> terminal.raise(signal));
        }
        // A dump of threads, or a pause with the terminal in the editor's hands, would help nobody.
        Signals.register(Terminal.Signal.QUIT.name(), () -> { });
        Signals.register(Terminal.Signal.TSTP.name(), () -> { });
    }

    /** Without this the description of even a common terminal comes from another program. */
    private static void useBuiltInDescription(String type) {
        String description = type == null ? null : InfoCmp.getDefaultInfoCmp(type);
        if (description != null) {
            InfoCmp.setLoadedInfoCmp(type, withoutFunctionKeys(description));
        }
    }

    /** Some sixty keys that no editor command is bound to take longer to read than all the rest. */
    private static String withoutFunctionKeys(String description) {
        StringBuilder rest = new StringBuilder(description.length());
        for (int at = 0; at < description.length();) {
            int comma = description.indexOf(", ", at);
            int end = comma < 0 ? description.length() : comma + 2;
            if (!description.startsWith("kf", at)) {
                rest.append(description, at, end);
            }
            at = end;
        }
        return rest.toString();
    }

    /** Some devices do not know their size; nothing can be shown in no columns. */
    private static Terminal sized(Terminal terminal) {
        if (terminal.getColumns() <= 0 || terminal.getRows() <= 0) {
            terminal.setSize(Size.of(COLUMNS, ROWS));
        }
        return terminal;
    }

    /** A terminal behind two streams, of the kind that most people have; no device is needed for it. */
    public static Terminal ofStreams(InputStream in, OutputStream out) throws IOException {
        return sized(new ExternalTerminal("fluewright", "xterm-256color", in, out, StandardCharsets.UTF_8));
    }
}
