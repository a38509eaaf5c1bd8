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

    /** The class of the script itself; others that the text declares are kept as well. */
    Class<?> compile(SourceText source) throws ClassNotFoundException {
        CompilationUnit unit = createCompilationUnit(configuration, null);
        SourceUnit text = unit.addSource(source.unit(), source.text());
        ClassCollector collector = createCollector(unit, text);
        unit.setClassgenCallback(collector);
        unit.compile(Phases.CLASS_GENERATION);
        for (Object loaded : collector.getLoadedClasses()) {
            setClassCacheEntry((Class<?>) loaded);
        }
        return loadClass(source.unit().substring(0, source.unit().indexOf('.')));
    }
}
