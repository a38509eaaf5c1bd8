package fluewright.repl.language;

/** Does on the second core what an evaluation needs only after its text has been parsed. */
final class Preload {
    private static final String[] CLASS_WRITER = {"ClassWriter", "SymbolTable", "MethodWriter", "Frame", "Label",
        "Type", "CurrentFrame", "FieldWriter", "AnnotationWriter"};

    private Preload() {
    }

    /** Starts the work, then loads the classes that write classes, and returns at once. */
    static void start(Runnable work) {
        Thread thread = new Thread(() -> run(work), "preload");
        thread.setDaemon(true);
        thread.start();
    }

    private static void run(Runnable work) {
        work.run();
        try {
            for (String name : CLASS_WRITER) {
                Class.forName("groovyjarjarasm.asm." + name);
            }
        } catch (ClassNotFoundException otherGroovy) {
            // Then the first evaluation loads what it needs.
        }
    }
}
