package fluewright.repl.language;

import groovy.lang.Script;

/**
 * What every input is compiled to. The compiler calls {@link #show}, {@link #assigned} and
 * {@link #callFunction}; the user need not.
 */
public abstract class ShellScript extends Script {
    static final String LAST = "_";
    private Names names;
    private ResultSink sink;

    final void connect(Names knownNames, ResultSink resultSink) {
        names = knownNames;
        sink = resultSink;
    }

    /** Tells a statement's value and keeps it as the last one. Gives null, so it is never told twice. */
    public final Object show(Object value) {
        if (value != null) {
            getBinding().setVariable(LAST, value);
            sink.show(value);
        }
        return null;
    }

    /** Tells an assignment that ends an input. */
    public final Object assigned(String name, Object value) {
        sink.assigned(name, value);
        return null;
    }

    /** Calls one of the shell's functions, whatever else bears its name. */
    public final Object callFunction(String name, Object[] arguments) {
        return names.call(name, arguments);
    }

    /** Called in every loop, closure and method. */
    public static void checkInterrupt() throws InterruptedException {
        if (Thread.interrupted()) {
            throw new InterruptedException("stopped");
        }
    }

    /** Reaches functions that a call names only at run time. */
    @Override
    public Object invokeMethod(String name, Object arguments) {
        return names != null && names.isFunction(name)
            ? names.call(name, arguments instanceof Object[] array ? array : new Object[] {arguments})
            : super.invokeMethod(name, arguments);
    }
}
