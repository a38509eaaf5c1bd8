package fluewright.repl;

import fluewright.engine.message.NearestName;
import java.nio.file.Path;
import java.util.List;

/**
 * What the command line asks for.
 *
 * @param expression text of {@code -e}, or null
 * @param script     the script file, or null; {@code -} stands for standard input
 * @param arguments  what follows the script file
 * @param plugins    folder of further plugins, or null
 */
public record Options(Task task, String expression, String script, List<String> arguments,
                      boolean json, Path plugins) {
    /** What is to be done. */
    public enum Task { SHELL, EXPRESSION, FILE, STANDARD_INPUT, VERSION, HELP }

    /** A command line that makes no sense; the message says why. */
    public static final class Unusable extends Exception {
        private static final long serialVersionUID = 1;

        Unusable(String message) {
            super(message);
        }
    }

    static final String HELP = """
        usage: fluewright [options] [FILE.groovy [ARGS]]

        Without a file: an interactive shell, or at the end of a pipe the piped text as a script.

          -e EXPRESSION      evaluate this text
          --json             print results as JSON
          --plugins FOLDER   load the plugins in this folder too
          --version          print the version
          --help             print this text
        """;

    private static final List<String> KNOWN = List.of("-e", "--json", "--plugins", "--version", "--help");

    /** Reads the arguments; options stand before the script file, the rest belongs to the script. */
    public static Options parse(String... arguments) throws Unusable {
        return new Reading(arguments).all();
    }

    private static final class Reading {
        private final List<String> words;
        private int at;
        private String expression;
        private String script;
        private boolean json;
        private Path plugins;
        private Task wanted;

        Reading(String... arguments) {
            words = List.of(arguments);
        }

        Options all() throws Unusable {
            while (at < words.size() && isOption(words.get(at))) {
                take(words.get(at++));
            }
            if (expression == null && at < words.size()) {
                script = words.get(at++);
            }
            return new Options(task(), expression, script, words.subList(at, words.size()), json, plugins);
        }

        private static boolean isOption(String word) {
            return word.length() > 1 && word.startsWith("-");
        }

        private void take(String option) throws Unusable {
            switch (option) {
                case "-e" -> expression = value(option, "an expression");
                case "--json" -> json = true;
                case "--plugins" -> plugins = Path.of(value(option, "a folder"));
                case "--version" -> wanted = Task.VERSION;
                case "--help", "-h" -> wanted = Task.HELP;
                default -> throw unknown(option);
            }
        }

        private String value(String option, String what) throws Unusable {
            if (at >= words.size()) {
                throw new Unusable("option " + option + " needs " + what);
            }
            return words.get(at++);
        }

        private static Unusable unknown(String option) {
            String near = NearestName.of(option, KNOWN);
            return new Unusable("unknown option " + option
                + (near.isEmpty() ? "; see fluewright --help" : "; did you mean " + near + "?"));
        }

        private Task task() {
            if (wanted != null) {
                return wanted;
            }
            if (expression != null) {
                return Task.EXPRESSION;
            }
            return script == null ? Task.SHELL : "-".equals(script) ? Task.STANDARD_INPUT : Task.FILE;
        }
    }
}
