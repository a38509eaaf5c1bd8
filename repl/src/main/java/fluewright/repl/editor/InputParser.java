package fluewright.repl.editor;

import org.jline.reader.EOFError;
import org.jline.reader.ParsedLine;
import org.jline.reader.Parser;

/** Tells the line editor whether an input is finished, and which word a completion replaces. */
final class InputParser implements Parser {
    @Override
    public ParsedLine parse(String line, int cursor, ParseContext context) {
        if (context == ParseContext.ACCEPT_LINE && Completeness.needsMore(line)) {
            throw new EOFError(-1, cursor, "more is needed");
        }
        return new Word(line, cursor, Site.wordStart(line, cursor));
    }

    @Override
    public boolean isEscapeChar(char c) {
        return false;
    }
}
