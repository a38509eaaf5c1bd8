package fluewright.repl.language;

import java.util.List;
import org.codehaus.groovy.control.CompilationFailedException;
import org.codehaus.groovy.control.MultipleCompilationErrorsException;
import org.codehaus.groovy.control.messages.Message;
import org.codehaus.groovy.control.messages.SyntaxErrorMessage;
import org.codehaus.groovy.syntax.SyntaxException;

/** Renders the first error of a text that does not compile: what, where, and a caret below it. */
final class SyntaxLines {
    private SyntaxLines() {
    }

    static List<String> of(CompilationFailedException failure, SourceText source) {
        if (failure instanceof MultipleCompilationErrorsException many
            && firstError(many) instanceof SyntaxErrorMessage message) {
            return rendered(message.getCause(), source);
        }
        return List.of(firstLine(failure.getMessage()));
    }

    private static Message firstError(MultipleCompilationErrorsException many) {
        List<? extends Message> errors = many.getErrorCollector().getErrors();
        return errors == null || errors.isEmpty() ? null : errors.get(0);
    }

    private static List<String> rendered(SyntaxException error, SourceText source) {
        String what = what(error.getOriginalMessage());
        int line = error.getStartLine();
        String where = source.title() + " line " + line + ", column " + error.getStartColumn() + ": " + what;
        String text = source.line(line);
        if (text.isBlank()) {
            return List.of(where);
        }
        return List.of(where, "  " + text, "  " + " ".repeat(Math.max(0, error.getStartColumn() - 1)) + "^");
    }

    private static String what(String message) {
        String first = firstLine(message);
        int position = first.indexOf(" @ line ");
        return position > 0 ? first.substring(0, position) : first;
    }

    private static String firstLine(String message) {
        return message == null ? "the text does not compile" : message.lines().findFirst().orElse("");
    }
}
