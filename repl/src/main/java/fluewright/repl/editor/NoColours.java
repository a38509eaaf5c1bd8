package fluewright.repl.editor;

import org.jline.reader.Highlighter;
import org.jline.reader.LineReader;
import org.jline.utils.AttributedString;

/** Leaves the typed text as it is. */
final class NoColours implements Highlighter {
    @Override
    public AttributedString highlight(LineReader reader, String text) {
        return new AttributedString(text);
    }
}
