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
            .nativeSignals(true).signalHandler(Terminal.SignalHandler.SIG_IGN).build();
        return sized(terminal);
    }

    /** Without this the description of even a common terminal comes from another program. */
    private static void useBuiltInDescription(String type) {
        String description = type == null ? null : InfoCmp.getDefaultInfoCmp(type);
        if (description != null) {
            InfoCmp.setLoadedInfoCmp(type, description);
        }
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
