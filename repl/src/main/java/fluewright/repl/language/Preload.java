package fluewright.repl.language;

import org.codehaus.groovy.ast.ClassHelper;

/** Does on the second core what an evaluation needs only after its text has been parsed. */
final class Preload {
    private static final String[] CLASS_WRITER = {"ClassWriter", "SymbolTable", "MethodWriter", "Frame", "Label",
        "Type", "CurrentFrame", "FieldWriter", "AnnotationWriter"};
    /** Groovy initialises it for every class it completes, though a script that is not checked has no use for it. */
    private static final String STATIC_CHECKER = "org.codehaus.groovy.transform.stc.StaticTypeCheckingVisitor";

    private Preload() {
    }

    /**
     * Starts the work, loads the classes that complete and write classes, then starts the rest, and returns at once. All
     * on one thread: with more of them the compiler would have to share its core.
     */
    static void start(Runnable work, Runnable rest) {
        Thread thread = new Thread(() -> run(work, rest), "preload");
        thread.setDaemon(true);
        thread.start();
    }

    private static void run(Runnable work, Runnable rest) {
        work.run();
        loadClasses();
        rest.run();
    }

    private static void loadClasses() {
        try {
            ClassHelper.make(ShellScript.class).getAllDeclaredMethods();
            Class.forName(STATIC_CHECKER);
            for (String name : CLASS_WRITER) {
                Class.forName("groovyjarjarasm.asm." + name);
            }
        } catch (ClassNotFoundException otherGroovy) {
            // Then the first evaluation loads what it needs.
        }
    }
}
