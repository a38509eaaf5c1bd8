package fluewright.repl.editor;

import fluewright.repl.editor.Token.Kind;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Set;

/**
 * Splits a typed text into pieces, for colours, completion and the question whether the text goes
 * on. It accepts anything, also half a statement, and never fails.
 */
public final class TextScan {
    private static final Set<String> KEYWORDS = Set.of("def", "var", "final", "if", "else", "for", "while", "do",
        "switch", "case", "default", "break", "continue", "return", "try", "catch", "finally", "throw", "new", "in",
        "as", "instanceof", "import", "class", "enum", "interface", "static", "assert", "true", "false", "null", "this");
    private static final Set<String> VALUES = Set.of("true", "false", "null", "this");

    private final String text;
    private final List<Token> tokens = new ArrayList<>();
    private final Deque<Character> open = new ArrayDeque<>();
    private boolean stray;
    private int at;

    private TextScan(String text) {
        this.text = text;
    }

    /** Scans a text. */
    public static TextScan of(String text) {
        TextScan scan = new TextScan(text);
        while (scan.at < text.length()) {
            scan.next();
        }
        return scan;
    }

    public List<Token> tokens() {
        return tokens;
    }

    String text() {
        return text;
    }

    /** How many brackets wait for their end. */
    int openBrackets() {
        return open.size();
    }

    /** Whether a bracket is closed that was never opened, or opened as another. */
    boolean hasStray() {
        return stray;
    }

    private void next() {
        char c = text.charAt(at);
        if (c == '\n') {
            add(Kind.NEWLINE, at + 1);
        } else if (Character.isWhitespace(c)) {
            at++;
        } else if (Character.isJavaIdentifierStart(c) && !text.startsWith("$/", at)) {
            name();
        } else if (Character.isDigit(c)) {
            add(Kind.NUMBER, new NumberEnd(text).after(at));
        } else if (!comment() && !string()) {
            symbol(c);
        }
    }

    private void name() {
        int end = at + 1;
        while (end < text.length() && Character.isJavaIdentifierPart(text.charAt(end))) {
            end++;
        }
        boolean member = endsWith(".");
        String word = text.substring(at, end);
        Kind kind = !member && isArgumentColon(end) ? Kind.NAMED_ARGUMENT
            : !member && KEYWORDS.contains(word) ? Kind.KEYWORD : Kind.NAME;
        add(kind, end);
    }

    /** A colon makes a name an argument unless it belongs to {@code a ? b : c} or {@code ::}. */
    private boolean isArgumentColon(int end) {
        int colon = end;
        while (colon < text.length() && text.charAt(colon) == ' ') {
            colon++;
        }
        boolean single = text.startsWith(":", colon) && !text.startsWith("::", colon);
        Token before = tokens.isEmpty() ? null : tokens.get(tokens.size() - 1);
        return single && before != null
            && (before.is(Kind.NAME) || before.is(Kind.OPENING) || before.is(Kind.NEWLINE) || endsWith(","));
    }

    private boolean comment() {
        if (text.startsWith("//", at) || at == 0 && text.startsWith("#!")) {
            int end = text.indexOf('\n', at);
            add(Kind.COMMENT, end < 0 ? text.length() : end);
            return true;
        }
        if (text.startsWith("/*", at)) {
            int end = text.indexOf("*/", at + 2);
            add(end < 0 ? Kind.OPEN_COMMENT : Kind.COMMENT, end < 0 ? text.length() : end + 2);
            return true;
        }
        return false;
    }

    private boolean string() {
        StringEnd found = StringEnd.find(text, at, !afterValue());
        if (found == null) {
            return false;
        }
        add(found.closed() ? Kind.STRING : Kind.OPEN_STRING, found.end());
        return true;
    }

    /** Whether a slash here would divide what stands before it. */
    private boolean afterValue() {
        if (tokens.isEmpty()) {
            return false;
        }
        Token last = tokens.get(tokens.size() - 1);
        return switch (last.kind()) {
            case NUMBER, STRING, CLOSING, STRAY -> true;
            case NAME -> !isRegexAfterName(last);
            case KEYWORD -> VALUES.contains(last.in(text));
            default -> false;
        };
    }

    /** {@code fn /x/} is a text, {@code a / b} and {@code a/b} are divisions. */
    private boolean isRegexAfterName(Token name) {
        return at > name.end() && at + 1 < text.length() && !Character.isWhitespace(text.charAt(at + 1))
            && text.indexOf('/', at + 1) > 0;
    }

    private void symbol(char c) {
        if ("([{".indexOf(c) >= 0) {
            open.push(c);
            add(Kind.OPENING, at + 1);
        } else if (")]}".indexOf(c) >= 0) {
            add(closes(c) ? Kind.CLOSING : Kind.STRAY, at + 1);
        } else {
            add(Kind.OPERATOR, at + 1);
        }
    }

    private boolean closes(char c) {
        if (!open.isEmpty() && "([{".indexOf(open.peek()) == ")]}".indexOf(c)) {
            open.pop();
            return true;
        }
        stray = true;
        return false;
    }

    private boolean endsWith(String operator) {
        Token last = tokens.isEmpty() ? null : tokens.get(tokens.size() - 1);
        return last != null && last.is(Kind.OPERATOR) && last.in(text).equals(operator);
    }

    private void add(Kind kind, int end) {
        tokens.add(new Token(kind, at, end));
        at = end;
    }
}
