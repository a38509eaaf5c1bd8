package fluewright.engine.message;

import java.util.ArrayList;
import java.util.List;

/**
 * The circumstances of a message.
 *
 * @param where    the place: an argument, or file, line and column; empty when there is none
 * @param found    what stood there; empty when there is none
 * @param expected what is accepted there; empty when there is nothing to say
 * @param nearest  the nearest valid name or a way out; empty when there is none
 */
public record Detail(String where, String found, String expected, String nearest) {

    /** No circumstances. */
    public static final Detail NONE = new Detail("", "", "", "");

    /** Returns the detail of a place. */
    public static Detail at(String where) {
        return new Detail(where, "", "", "");
    }

    /** Returns this detail with what was found. */
    public Detail found(Object value) {
        return new Detail(where, String.valueOf(value), expected, nearest);
    }

    /** Returns this detail with what is accepted. */
    public Detail expected(String text) {
        return new Detail(where, found, text, nearest);
    }

    /** Returns this detail with the nearest valid name, or a way out. */
    public Detail nearest(String text) {
        return new Detail(where, found, expected, text);
    }

    /** Returns the circumstances one a line, the empty ones left out. */
    public List<String> lines() {
        List<String> lines = new ArrayList<>(4);
        add(lines, "where", where);
        add(lines, "found", found);
        add(lines, "expected", expected);
        add(lines, "try", nearest);
        return lines;
    }

    private static void add(List<String> lines, String label, String text) {
        if (!text.isEmpty()) {
            lines.add(String.format("%-8s %s", label, text));
        }
    }
}
