package fluewright.repl.language;

import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.util.Arrays;
import java.util.Set;
import java.util.stream.Stream;
import org.codehaus.groovy.control.CompilerConfiguration;

/** Compiles inputs; classes that one input declares are known to the next. */
final class ScriptCompiler {
    private final InputLoader loader;
    private final ImportMemory imports = new ImportMemory();

    ScriptCompiler(Names names, boolean acknowledge) {
        CompilerConfiguration configuration = new CompilerConfiguration();
        configuration.setScriptBaseClass(ShellScript.class.getName());
        // Fetching libraries by annotation is no part of this shell, and looking for it takes time.
        configuration.setDisabledGlobalASTTransformations(Set.of("groovy.grape.GrabAnnotationTransformation"));
        // Plain call sites start faster than invokedynamic ones, and most inputs run once.
        configuration.getOptimizationOptions().put(CompilerConfiguration.INVOKEDYNAMIC, false);
        configuration.addCompilationCustomizers(imports, new StatementRewriter(names, acknowledge));
        loader = new InputLoader(ScriptCompiler.class.getClassLoader(), configuration);
    }

    /** The script's class, or null when the text only declares classes. */
    Class<?> compile(SourceText source) {
        Class<?> compiled = loader.compile(source);
        imports.keep();
        return compiled;
    }

    /** The methods that a script declares itself. */
    Stream<String> declaredMethods(Class<?> script) {
        return Arrays.stream(script.getDeclaredMethods())
            .filter(method -> !method.isSynthetic() && !Modifier.isStatic(method.getModifiers()))
            .map(Method::getName)
            .filter(name -> !"run".equals(name) && name.indexOf('$') < 0)
            .distinct();
    }
}
