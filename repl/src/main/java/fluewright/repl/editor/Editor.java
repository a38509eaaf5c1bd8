package fluewright.repl.editor;

import java.nio.file.Path;
import java.util.function.Consumer;
import java.util.function.Supplier;
import org.jline.reader.LineReader;
import org.jline.reader.LineReader.Option;
import org.jline.reader.LineReaderBuilder;
import org.jline.reader.UserInterruptException;
import org.jline.reader.EndOfFileException;
import org.jline.terminal.Terminal;

/** Reads inputs of one or more lines, with history, completion and colours. */
public final class Editor {
    static final String PROMPT = "flue> ";
    static final String CONTINUATION = "    > ";
    private final LineReader reader;

    /**
     * @param vocabulary asked at every key, so it must answer at once
     * @param history    the file of earlier inputs
     * @param warning    told when the history can't be kept
     */
    public Editor(Terminal terminal, Supplier<Vocabulary> vocabulary, Path history, boolean colour, Consumer<String> warning) {
        reader = LineReaderBuilder.builder().terminal(terminal).appName("fluewright")
            .parser(new InputParser()).completer(new InputCompleter(vocabulary))
            .highlighter(colour ? new InputHighlighter(vocabulary) : new NoColours())
            .history(new HistoryFile(history, warning))
            .variable(LineReader.SECONDARY_PROMPT_PATTERN, CONTINUATION)
            .variable(LineReader.LIST_MAX, 200)
            .variable(LineReader.BLINK_MATCHING_PAREN, 0)
            .option(Option.DISABLE_EVENT_EXPANSION, true)
            .option(Option.BRACKETED_PASTE, true)
            .option(Option.INSERT_TAB, false)
            .option(Option.AUTO_FRESH_LINE, false)
            .build();
    }

    /** The next input; empty after Ctrl-C, null at the end. */
    public String read() {
        try {
            return reader.readLine(PROMPT);
        } catch (UserInterruptException cleared) {
            return "";
        } catch (EndOfFileException end) {
            return null;
        }
    }

    /** Whether the prompt stands and waits for keys. */
    public boolean isReading() {
        return reader.isReading();
    }
}
