package fluewright.repl.language;

import java.util.List;

/**
 * A text to evaluate.
 *
 * @param title what the user knows it by: a file name, or a word such as "input"
 * @param unit  the name it is compiled under, which is also what stack frames say
 */
public record SourceText(String title, String unit, String text) {
    /** One line of the text, counted from 1; empty when there is no such line. */
    public String line(int number) {
        List<String> lines = text.lines().toList();
        return number >= 1 && number <= lines.size() ? lines.get(number - 1) : "";
    }

    public boolean isOneLine() {
        return text.strip().indexOf('\n') < 0;
    }
}
