package fluewright.repl.editor;

import java.util.List;

/** Where a string ends, and whether it was closed there. */
record StringEnd(int end, boolean closed) {
    /** The ways to write a string: how it opens and closes, and whether it may span lines. */
    private record Form(String opening, String closing, char escape, boolean lines, boolean embeds) {
    }

    private static final List<Form> FORMS = List.of(
        new Form("'''", "'''", '\\', true, false), new Form("\"\"\"", "\"\"\"", '\\', true, true),
        new Form("$/", "/$", '$', true, true), new Form("'", "'", '\\', false, false),
        new Form("\"", "\"", '\\', false, true), new Form("/", "/", '\\', false, true));

    /**
     * The end of the string that starts at a place, or null if none does.
     *
     * @param slashes whether a slash can start a string here
     */
    static StringEnd find(String text, int start, boolean slashes) {
        for (Form form : FORMS) {
            if (text.startsWith(form.opening, start)) {
                StringEnd end = "/".equals(form.opening) && !slashes ? null : scan(text, start, form);
                return "/".equals(form.opening) && end != null && !end.closed ? null : end;
            }
        }
        return null;
    }

    private static StringEnd scan(String text, int start, Form form) {
        int at = start + form.opening.length();
        while (at < text.length()) {
            char c = text.charAt(at);
            if (text.startsWith(form.closing, at)) {
                return new StringEnd(at + form.closing.length(), true);
            }
            if (c == '\n' && !form.lines) {
                return new StringEnd(at, false);
            }
            if (form.embeds && text.startsWith("${", at)) {
                at = afterEmbedded(text, at + 2, form.lines);
            } else {
                at += c == form.escape && at + 1 < text.length() ? 2 : 1;
            }
        }
        return new StringEnd(text.length(), false);
    }

    /** Skips an expression in braces, which may hold braces and strings itself. */
    private static int afterEmbedded(String text, int start, boolean lines) {
        int depth = 1;
        int at = start;
        while (at < text.length() && depth > 0 && (lines || text.charAt(at) != '\n')) {
            StringEnd inner = find(text, at, false);
            if (inner != null) {
                at = inner.end;
                continue;
            }
            depth += text.charAt(at) == '{' ? 1 : text.charAt(at) == '}' ? -1 : 0;
            at++;
        }
        return at;
    }
}
