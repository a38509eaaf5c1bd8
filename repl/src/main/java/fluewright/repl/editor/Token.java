package fluewright.repl.editor;

/** A piece of a typed text, from {@code start} up to but without {@code end}. */
public record Token(Kind kind, int start, int end) {
    /** What a piece is. */
    public enum Kind { NAME, KEYWORD, NAMED_ARGUMENT, NUMBER, STRING, OPEN_STRING, COMMENT, OPEN_COMMENT,
        OPENING, CLOSING, STRAY, OPERATOR, NEWLINE }

    public String in(String text) {
        return text.substring(start, end);
    }

    boolean is(Kind wanted) {
        return kind == wanted;
    }
}
