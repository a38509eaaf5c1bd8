package fluewright.repl.editor;

import fluewright.repl.editor.Token.Kind;
import java.util.List;
import java.util.Set;

/** Decides whether a typed text is finished or goes on in a further line. */
public final class Completeness {
    private static final Set<String> HEADS = Set.of("if", "while", "for", "switch");
    private static final Set<String> JOINERS = Set.of("in", "instanceof", "as", "new", "else", "do", "try", "finally");
    private static final String BINARY = "+-*/%=<&|^,.?:~";

    private final TextScan scan;
    private final String text;
    private final List<Token> tokens;

    private Completeness(TextScan scan) {
        this.scan = scan;
        text = scan.text();
        tokens = scan.tokens().stream()
            .filter(token -> !token.is(Kind.NEWLINE) && !token.is(Kind.COMMENT)).toList();
    }

    /** Whether the text needs another line. A text that can't become right needs none. */
    public static boolean needsMore(String text) {
        return new Completeness(TextScan.of(text)).needsMore();
    }

    private boolean needsMore() {
        if (scan.hasStray()) {
            return false;
        }
        if (text.stripTrailing().endsWith("\\")) {
            return true;
        }
        return !tokens.isEmpty() && (openAtEnd() || scan.openBrackets() > 0 || endsJoining() || endsWithHead());
    }

    private boolean openAtEnd() {
        Token last = last();
        return last.is(Kind.OPEN_COMMENT) || last.is(Kind.OPEN_STRING) && spansLines(last.in(text));
    }

    private static boolean spansLines(String string) {
        return string.startsWith("'''") || string.startsWith("\"\"\"") || string.startsWith("$/");
    }

    private boolean endsJoining() {
        Token last = last();
        String word = last.in(text);
        if (last.is(Kind.KEYWORD)) {
            return JOINERS.contains(word);
        }
        return last.is(Kind.OPERATOR) && BINARY.contains(word) && !isStep() && !isStarImport();
    }

    /** {@code i++} and {@code i--} are finished. */
    private boolean isStep() {
        String word = last().in(text);
        return "+-".contains(word) && tokens.size() > 1 && tokens.get(tokens.size() - 2).in(text).equals(word);
    }

    private boolean isStarImport() {
        int line = tokens.size() - 1;
        while (line >= 0 && !tokens.get(line).in(text).equals("import")) {
            line--;
        }
        return line >= 0 && text.endsWith("*") && text.indexOf('\n', tokens.get(line).start()) < 0;
    }

    /** {@code if (x)} alone waits for what is to be done. */
    private boolean endsWithHead() {
        if (!last().in(text).equals(")")) {
            return false;
        }
        int depth = 0;
        for (int at = tokens.size() - 1; at >= 0; at--) {
            depth += tokens.get(at).is(Kind.CLOSING) ? 1 : tokens.get(at).is(Kind.OPENING) ? -1 : 0;
            if (depth == 0) {
                return at > 0 && HEADS.contains(tokens.get(at - 1).in(text)) && !endsDoLoop(at - 1);
            }
        }
        return false;
    }

    private boolean endsDoLoop(int head) {
        return head > 0 && tokens.get(head).in(text).equals("while") && tokens.get(head - 1).in(text).equals("}");
    }

    private Token last() {
        return tokens.get(tokens.size() - 1);
    }
}
