package fluewright.repl.editor;

import fluewright.repl.editor.Token.Kind;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.function.Predicate;

/** What stands around the place where a completion is asked for. */
final class Site {
    private final String text;
    private final List<Token> before;
    private final int start;

    private Site(String text, int start, List<Token> before) {
        this.text = text;
        this.start = start;
        this.before = before;
    }

    /** Looks at the text up to the cursor; what follows does not matter. */
    static Site at(String line, int cursor) {
        String head = line.substring(0, cursor);
        int start = wordStart(line, cursor);
        List<Token> before = TextScan.of(head).tokens().stream().filter(token -> token.end() <= start).toList();
        return new Site(head, start, before);
    }

    /** Where the word begins that ends at the cursor; inside a string, behind its quote. */
    static int wordStart(String line, int cursor) {
        List<Token> tokens = TextScan.of(line.substring(0, cursor)).tokens();
        if (tokens.isEmpty() || tokens.get(tokens.size() - 1).end() < cursor) {
            return cursor;
        }
        Token last = tokens.get(tokens.size() - 1);
        return switch (last.kind()) {
            case NAME, KEYWORD, NAMED_ARGUMENT -> last.start();
            case OPEN_STRING -> last.start() + 1;
            default -> cursor;
        };
    }

    boolean inString() {
        return start > 0 && "'\"".indexOf(text.charAt(start - 1)) >= 0
            && TextScan.of(text).tokens().stream().anyMatch(token -> token.is(Kind.OPEN_STRING) && token.start() == start - 1);
    }

    boolean inComment() {
        List<Token> all = TextScan.of(text).tokens();
        Token last = all.isEmpty() ? null : all.get(all.size() - 1);
        return last != null && last.end() >= start && (last.is(Kind.COMMENT) || last.is(Kind.OPEN_COMMENT));
    }

    boolean afterNumberDot() {
        return isBefore(1, ".") && before.size() > 1 && before.get(before.size() - 2).is(Kind.NUMBER);
    }

    /** The path before a dot, such as {@code result.products}; empty when there is none. */
    String path() {
        int at = before.size();
        while (at > 1 && word(at - 1).equals(".") && before.get(at - 2).is(Kind.NAME)) {
            at -= 2;
        }
        return at == before.size() ? "" : text.substring(before.get(at).start(), before.get(before.size() - 1).start());
    }

    boolean afterDot() {
        return isBefore(1, ".");
    }

    /** Whether nothing of a word is typed yet. */
    boolean isAtWordStart() {
        return start == text.length();
    }

    /** The named argument whose value is being typed; empty when there is none. */
    String argumentBeingSet() {
        int behind = afterNumberDot() ? 2 : 0;
        int colon = before.size() - 1 - behind;
        boolean set = colon > 0 && word(colon).equals(":") && before.get(colon - 1).is(Kind.NAMED_ARGUMENT);
        return set ? word(colon - 1) : "";
    }

    /** The innermost function call around the place, or null. */
    Call call(Predicate<String> isFunction) {
        int depth = 0;
        for (int at = before.size() - 1; at >= 0; at--) {
            Token token = before.get(at);
            depth += token.is(Kind.CLOSING) ? 1 : token.is(Kind.OPENING) ? -1 : 0;
            if (depth < 0 && (at == 0 || !word(at).equals("(") || !isCallee(at - 1, isFunction))) {
                return null;
            }
            if (depth < 0) {
                return new Call(word(at - 1), at + 1);
            }
            if (depth == 0 && isCommand(at, isFunction)) {
                return new Call(word(at), at + 1);
            }
            if (depth == 0 && endsStatement(at)) {
                return null;
            }
        }
        return null;
    }

    private boolean isCallee(int at, Predicate<String> isFunction) {
        return before.get(at).is(Kind.NAME) && isFunction.test(word(at));
    }

    /** A function's name followed by its arguments without brackets. */
    private boolean isCommand(int at, Predicate<String> isFunction) {
        boolean bracket = at + 1 < before.size() && before.get(at + 1).is(Kind.OPENING) && word(at + 1).equals("(");
        boolean separate = before.get(at).end() < text.length() && text.charAt(before.get(at).end()) == ' ';
        return isCallee(at, isFunction) && !bracket && separate && startsExpression(at);
    }

    private boolean startsExpression(int at) {
        return at == 0 || before.get(at - 1).is(Kind.NEWLINE) || Set.of("=", ";", "{", "(", "->").contains(word(at - 1));
    }

    private boolean endsStatement(int at) {
        return word(at).equals(";") || before.get(at).is(Kind.NEWLINE) && !(at > 0 && word(at - 1).equals(","));
    }

    private boolean isBefore(int back, String symbol) {
        return before.size() >= back && word(before.size() - back).equals(symbol);
    }

    private String word(int at) {
        return before.get(at).in(text);
    }

    /** A call and where in the tokens its arguments begin. */
    final class Call {
        final String function;
        private final int first;

        Call(String function, int first) {
            this.function = function;
            this.first = first;
        }

        /** The named arguments that are already given. */
        List<String> given() {
            List<String> names = new ArrayList<>();
            for (int at = first; at < before.size(); at++) {
                if (before.get(at).is(Kind.NAMED_ARGUMENT)) {
                    names.add(word(at));
                }
            }
            return names;
        }

        boolean atFirstArgument() {
            return first == before.size();
        }
    }
}
