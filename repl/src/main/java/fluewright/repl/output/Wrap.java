package fluewright.repl.output;

import java.util.ArrayList;
import java.util.List;

/** Breaks long lines between words; what goes on is indented a little more. */
final class Wrap {

    private Wrap() {
    }

    static List<String> line(String line, int width) {
        List<String> lines = new ArrayList<>();
        String indent = " ".repeat(Math.min(line.length() - line.stripLeading().length() + 4, width / 2));
        String rest = line;
        while (rest.length() > width) {
            int cut = rest.lastIndexOf(' ', width);
            if (cut <= rest.length() - rest.stripLeading().length()) {
                break;
            }
            lines.add(rest.substring(0, cut).stripTrailing());
            rest = indent + rest.substring(cut).strip();
        }
        lines.add(rest);
        return lines;
    }
}
