package fluewright.repl.language;

/** Loads the parser and the class writer beside the start of everything else, on the second core. */
public final class Preload {
    private static final String[] CLASSES = {"org.apache.groovy.parser.antlr4.GroovyLexer",
        "org.apache.groovy.parser.antlr4.GroovyParser", "groovyjarjarasm.asm.ClassWriter",
        "groovyjarjarasm.asm.SymbolTable", "groovyjarjarasm.asm.MethodWriter", "groovyjarjarasm.asm.Frame",
        "groovyjarjarasm.asm.Label", "groovyjarjarasm.asm.Type", "groovyjarjarasm.asm.CurrentFrame"};

    private Preload() {
    }

    /** Starts loading and returns at once. */
    public static void start() {
        Thread thread = new Thread(Preload::load, "preload");
        thread.setDaemon(true);
        thread.start();
    }

    private static void load() {
        try {
            for (String name : CLASSES) {
                Class.forName(name);
            }
        } catch (ClassNotFoundException otherGroovy) {
            // Then the first evaluation loads what it needs.
        }
    }
}
