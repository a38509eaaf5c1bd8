package fluewright.fuels;

import fluewright.engine.message.Detail;
import fluewright.engine.message.InputException;
import fluewright.engine.message.Message;
import java.util.Collection;
import java.util.Optional;
import org.snakeyaml.engine.v2.exceptions.Mark;

/**
 * A place in a fuel file.
 *
 * @param file   the file, for people
 * @param line   the line, counted from one
 * @param column the column, counted from one
 */
record FilePosition(String file, int line, int column) {

    /** Returns the place of a parser's mark; the beginning of the file where there is none. */
    static FilePosition of(String file, Optional<Mark> mark) {
        return mark.map(m -> new FilePosition(file, m.getLine() + 1, m.getColumn() + 1)).orElse(start(file));
    }

    /** Returns the beginning of a file. */
    static FilePosition start(String file) {
        return new FilePosition(file, 1, 1);
    }

    /** Returns the place just behind a text that begins the file. */
    static FilePosition after(String file, String text) {
        String[] lines = text.split("\r\n|\r|\n", -1);
        String last = lines[lines.length - 1];
        return new FilePosition(file, lines.length, last.codePointCount(0, last.length()) + 1);
    }

    /** Returns an error at this place. */
    InputException error(Message reason, Object found, String expected) {
        return new InputException(reason, detail(found, expected));
    }

    /** Returns an error at this place that lists the valid names and knows the nearest. */
    InputException error(Message reason, String found, Collection<String> valid, String nearest) {
        return new InputException(reason, detail(found, "one of " + String.join("; ", valid)).nearest(nearest));
    }

    /** Returns an error of the engine with this place in front of its own. */
    InputException relocated(InputException error) {
        Detail detail = error.detail();
        String where = detail.where().isEmpty() ? toString() : this + ": " + detail.where();
        return new InputException(error.reason(), new Detail(where, detail.found(), detail.expected(), detail.nearest()), error);
    }

    private Detail detail(Object found, String expected) {
        return Detail.at(toString()).found(found).expected(expected);
    }

    @Override
    public String toString() {
        return file + ", line " + line + ", column " + column;
    }
}
