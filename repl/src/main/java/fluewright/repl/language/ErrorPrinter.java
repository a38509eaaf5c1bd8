package fluewright.repl.language;

/** Tells the user why an evaluation failed. */
public interface ErrorPrinter {
    void print(Throwable failure, SourceText source);
}
