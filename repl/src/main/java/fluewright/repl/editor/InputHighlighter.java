package fluewright.repl.editor;

import java.util.function.Supplier;
import org.jline.reader.Highlighter;
import org.jline.reader.LineReader;
import org.jline.utils.AttributedString;
import org.jline.utils.AttributedStringBuilder;
import org.jline.utils.AttributedStyle;

/** Colours the typed text, with few of the sixteen colours that every terminal has. */
final class InputHighlighter implements Highlighter {
    private static final AttributedStyle PLAIN = AttributedStyle.DEFAULT;
    private final Supplier<Vocabulary> vocabulary;

    InputHighlighter(Supplier<Vocabulary> vocabulary) {
        this.vocabulary = vocabulary;
    }

    @Override
    public AttributedString highlight(LineReader reader, String text) {
        AttributedStringBuilder line = new AttributedStringBuilder(text.length());
        int at = 0;
        for (Token token : TextScan.of(text).tokens()) {
            line.styled(PLAIN, text.substring(at, token.start()));
            line.styled(style(token, text), token.in(text));
            at = token.end();
        }
        line.styled(PLAIN, text.substring(at));
        return line.toAttributedString();
    }

    private AttributedStyle style(Token token, String text) {
        return switch (token.kind()) {
            case NUMBER -> PLAIN.foreground(AttributedStyle.CYAN);
            case STRING, OPEN_STRING -> PLAIN.foreground(AttributedStyle.GREEN);
            case COMMENT, OPEN_COMMENT -> PLAIN.foreground(AttributedStyle.BRIGHT + AttributedStyle.BLACK);
            case NAMED_ARGUMENT -> PLAIN.foreground(AttributedStyle.MAGENTA);
            case STRAY -> PLAIN.foreground(AttributedStyle.RED).bold();
            case NAME -> vocabulary.get().isFunction(token.in(text)) ? PLAIN.foreground(AttributedStyle.BLUE) : PLAIN;
            default -> PLAIN;
        };
    }
}
