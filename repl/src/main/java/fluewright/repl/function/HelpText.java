package fluewright.repl.function;

import java.util.List;

/**
 * Text for people, shown as it stands.
 *
 * @param lines the lines
 */
public record HelpText(List<String> lines) {
}
