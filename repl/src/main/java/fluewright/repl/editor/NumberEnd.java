package fluewright.repl.editor;

/** Finds where a number ends; {@code 1..5} and {@code 20.degC} end before the dot. */
record NumberEnd(String text) {
    int after(int start) {
        int end = digits(start);
        if (isChar(end, '.') && isDigit(end + 1)) {
            end = digits(end + 1);
        }
        if (end < text.length() && "eE".indexOf(text.charAt(end)) >= 0) {
            end = exponent(end);
        }
        return end < text.length() && "gGlLiIdDfF".indexOf(text.charAt(end)) >= 0 ? end + 1 : end;
    }

    private int exponent(int letter) {
        int digit = isChar(letter + 1, '-') || isChar(letter + 1, '+') ? letter + 2 : letter + 1;
        return isDigit(digit) ? digits(digit) : letter;
    }

    private int digits(int from) {
        int end = from;
        while (isDigit(end) || isChar(end, '_') || isHexadecimal(from, end)) {
            end++;
        }
        return end;
    }

    private boolean isHexadecimal(int from, int at) {
        return at > from && at < text.length() && text.charAt(from) == '0' && (isChar(from + 1, 'x') || isChar(from + 1, 'X'))
            && (at == from + 1 || Character.digit(text.charAt(at), 16) >= 0);
    }

    private boolean isDigit(int at) {
        return at < text.length() && Character.isDigit(text.charAt(at));
    }

    private boolean isChar(int at, char wanted) {
        return at < text.length() && text.charAt(at) == wanted;
    }
}
