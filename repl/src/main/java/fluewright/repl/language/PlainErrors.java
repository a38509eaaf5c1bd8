package fluewright.repl.language;

import fluewright.engine.message.InputException;
import fluewright.engine.message.NearestName;
import groovy.lang.MissingMethodException;
import groovy.lang.MissingPropertyException;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Supplier;
import org.codehaus.groovy.control.CompilationFailedException;
import org.codehaus.groovy.control.MultipleCompilationErrorsException;

/** Tells a failure in at most five lines, with the line of the user's text and near names. */
public final class PlainErrors implements ErrorPrinter {
    private static final int MOST_LINES = 5;
    private final Supplier<Collection<String>> names;
    private final Consumer<List<String>> out;

    /**
     * @param names every name that the user could have meant
     * @param out   where the lines go
     */
    public PlainErrors(Supplier<Collection<String>> names, Consumer<List<String>> out) {
        this.names = names;
        this.out = out;
    }

    @Override
    public void print(Throwable failure, SourceText source) {
        out.accept(lines(failure, source).stream().limit(MOST_LINES).toList());
    }

    List<String> lines(Throwable failure, SourceText source) {
        InputException refused = refusal(failure);
        if (refused == null && failure instanceof CompilationFailedException syntax) {
            return SyntaxLines.of(syntax, source);
        }
        List<String> lines = new ArrayList<>(refused == null ? described(root(failure)) : refused.lines());
        int line = lineOf(failure, source);
        if (line > 0 && !source.isOneLine()) {
            String where = source.title() + " line " + line + ": " + source.line(line).strip();
            lines.add(Math.min(lines.size(), MOST_LINES - 1), "  at " + where);
        }
        return lines;
    }

    /** What the engine or the shell refused, however wrapped; null if it is something else. */
    private static InputException refusal(Throwable failure) {
        for (Throwable at = failure; at != null; at = at.getCause()) {
            if (at instanceof InputException refused) {
                return refused;
            }
            if (at instanceof MultipleCompilationErrorsException compiling
                && compiling.getErrorCollector().getErrorCount() > 0 && compiling.getErrorCollector().getException(0) != null) {
                return refusal(compiling.getErrorCollector().getException(0));
            }
        }
        return null;
    }

    /** The failure itself, out of the wrappings that reflection puts around it. */
    private static Throwable root(Throwable failure) {
        boolean wrapped = failure instanceof org.codehaus.groovy.runtime.InvokerInvocationException
            || failure instanceof java.lang.reflect.UndeclaredThrowableException
            || failure instanceof ExceptionInInitializerError;
        return wrapped && failure.getCause() != null ? root(failure.getCause()) : failure;
    }

    private List<String> described(Throwable failure) {
        if (failure instanceof MissingPropertyException missing) {
            return unknown(missing.getProperty(), missing.getType());
        }
        if (failure instanceof MissingMethodException missing) {
            return unknownCall(missing);
        }
        if (failure instanceof StackOverflowError) {
            return List.of("the calls nest too deeply (does a function call itself without end?)");
        }
        return List.of(plain(failure));
    }

    private static String plain(Throwable failure) {
        String name = failure.getClass().getSimpleName();
        String message = failure.getMessage();
        return message == null || message.isBlank() ? name : message.lines().findFirst().orElse(name) + " (" + name + ")";
    }

    private List<String> unknown(String name, Class<?> type) {
        if (type != null && !ShellScript.class.isAssignableFrom(type)) {
            return List.of(typeName(type) + " has no property '" + name + "'");
        }
        return withNear("unknown name '" + name + "'", name);
    }

    private List<String> unknownCall(MissingMethodException missing) {
        if (ShellScript.class.isAssignableFrom(missing.getType())) {
            return withNear("unknown function '" + missing.getMethod() + "'", missing.getMethod());
        }
        return List.of(typeName(missing.getType()) + " has no method '" + missing.getMethod() + "' for ("
            + argumentTypes(missing.getArguments()) + ")");
    }

    private List<String> withNear(String text, String name) {
        String near = NearestName.of(name, names.get());
        return List.of(near.isEmpty() ? text : text + "; did you mean " + near + "?");
    }

    private static String argumentTypes(Object[] arguments) {
        List<String> types = new ArrayList<>();
        for (Object argument : arguments == null ? new Object[0] : arguments) {
            types.add(argument == null ? "null" : typeName(argument.getClass()));
        }
        return String.join(", ", types);
    }

    private static String typeName(Class<?> type) {
        return type.getSimpleName().isEmpty() ? type.getName() : type.getSimpleName();
    }

    private static int lineOf(Throwable failure, SourceText source) {
        for (Throwable at = failure; at != null; at = at.getCause()) {
            for (StackTraceElement frame : at.getStackTrace()) {
                if (source.unit().equals(frame.getFileName()) && frame.getLineNumber() > 0) {
                    return frame.getLineNumber();
                }
            }
        }
        return 0;
    }
}
