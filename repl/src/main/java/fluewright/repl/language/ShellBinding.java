package fluewright.repl.language;

import groovy.lang.Binding;
import java.util.HashSet;
import java.util.Set;

/** The user's variables; a name that is not among them is looked up in {@link Names}. */
public final class ShellBinding extends Binding {
    private final Names names;
    private final ResultSink sink;
    private final Set<String> remarked = new HashSet<>();

    public ShellBinding(Names names, ResultSink sink) {
        this.names = names;
        this.sink = sink;
    }

    @Override
    public Object getVariable(String name) {
        if (super.hasVariable(name)) {
            return super.getVariable(name);
        }
        Object known = names.resolve(name);
        return known != null ? known : super.getVariable(name);
    }

    @Override
    public void setVariable(String name, Object value) {
        super.setVariable(name, value);
        if (names.isFunction(name) && remarked.add(name)) {
            sink.note("'" + name + "' is also a function: " + name + "(...) still calls it, "
                + name + " alone is now your variable");
        }
    }
}
