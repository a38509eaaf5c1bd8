package fluewright.repl;

import fluewright.repl.language.Outcome;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

/** Evaluates one text without a prompt: an expression, a script file or standard input. */
final class Batch {
    private final Options options;
    private final Output output;

    Batch(Options options, Output output) {
        this.options = options;
        this.output = output;
    }

    int run() {
        try {
            return switch (options.task()) {
                case EXPRESSION -> evaluate("expression", options.expression());
                case FILE -> evaluate(options.script(), withoutMark(Files.readString(Path.of(options.script()))));
                default -> evaluate("standard input", standardInput());
            };
        } catch (IOException unreadable) {
            output.err().println("fluewright: cannot read " + options.script() + ": " + reason(unreadable));
            return Main.UNUSABLE;
        }
    }

    private int evaluate(String title, String text) {
        Workspace workspace = Workspace.open(options, output);
        Outcome outcome = workspace.evaluator().evaluate(title, text);
        return outcome == Outcome.DONE ? 0 : Main.FAILED;
    }

    private static String standardInput() throws IOException {
        return new String(System.in.readAllBytes(), StandardCharsets.UTF_8);
    }

    /** Some editors put a byte-order mark before a text. */
    private static String withoutMark(String text) {
        return text.startsWith("\uFEFF") ? text.substring(1) : text;
    }

    private static String reason(IOException failure) {
        if (failure instanceof NoSuchFileException) {
            return "no such file";
        }
        if (failure instanceof AccessDeniedException) {
            return "not permitted";
        }
        return failure instanceof java.nio.charset.CharacterCodingException ? "not UTF-8 text" : failure.getMessage();
    }
}
