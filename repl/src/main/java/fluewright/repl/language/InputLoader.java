package fluewright.repl.language;

import groovy.lang.GroovyClassLoader;
import org.codehaus.groovy.control.CompilationUnit;
import org.codehaus.groovy.control.CompilerConfiguration;
import org.codehaus.groovy.control.Phases;
import org.codehaus.groovy.control.SourceUnit;

/** Compiles and keeps classes like its parent, but without a digest of every text for a cache of texts. */
final class InputLoader extends GroovyClassLoader {
    private final CompilerConfiguration configuration;

    InputLoader(ClassLoader parent, CompilerConfiguration configuration) {
        super(parent, configuration);
        this.configuration = configuration;
    }

    /** The script's own class, or null when the text only declares classes; all of them are kept. */
    Class<?> compile(SourceText source) {
        CompilationUnit unit = createCompilationUnit(configuration, null);
        SourceUnit text = unit.addSource(source.unit(), source.text());
        ClassCollector collector = createCollector(unit, text);
        unit.setClassgenCallback(collector);
        unit.compile(Phases.CLASS_GENERATION);
        String wanted = source.unit().substring(0, source.unit().indexOf('.'));
        Class<?> script = null;
        for (Object loaded : collector.getLoadedClasses()) {
            Class<?> type = (Class<?>) loaded;
            setClassCacheEntry(type);
            script = type.getName().equals(wanted) ? type : script;
        }
        return script;
    }
}
